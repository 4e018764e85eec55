package evensun.evaluation;

import evensun.material.Material;
import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.stack.MaterialSlot;
import evensun.stack.ResolvedKnob;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedStack;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** A stack made ready for one solver; safe for threads. Each thread works on a {@link Bench}. */
public final class Model implements AutoCloseable {

  /** Standard error wanted of a photocurrent where a solver is statistical, in mA cm⁻². */
  private static final double WANTED_ERROR_MA_PER_CM2 = 0.01;

  private final ResolvedStack stack;
  private final Problem problem;
  private final PreparedSolver prepared;
  private final List<Channel> channels;

  private Model(ResolvedStack stack, Problem problem, PreparedSolver prepared) {
    this.stack = stack;
    this.problem = problem;
    this.prepared = prepared;
    this.channels = List.copyOf(prepared.channels());
  }

  /**
   * Prepares a solver for a stack, for the light of its scenario.
   *
   * @param stack the stack
   * @param solver the solver
   * @param options options of the solver
   * @param seed seed of whatever the solver draws at random
   * @param services what the host offers to it
   * @throws evensun.spi.UnsupportedProblem when the solver cannot take the stack
   */
  public static Model of(
      ResolvedStack stack,
      OpticalSolver solver,
      Map<String, String> options,
      long seed,
      Services services) {
    Incidence incidence = stack.scenario().light().incidence();
    return of(stack, solver, options, seed, services, List.of(incidence));
  }

  /** As above, for other directions of the light. */
  public static Model of(
      ResolvedStack stack,
      OpticalSolver solver,
      Map<String, String> options,
      long seed,
      Services services,
      List<Incidence> incidences) {
    Problem problem = problem(stack, options, seed, incidences);
    Design start = new Filling(stack).drawn(Design.of(problem));
    return new Model(stack, problem, solver.prepare(problem, start, services));
  }

  private static Problem problem(
      ResolvedStack stack, Map<String, String> options, long seed, List<Incidence> incidences) {
    List<Layer> layers = new ArrayList<>();
    for (ResolvedLayer layer : stack.layers()) {
      layers.add(new Layer(layer.name(), layer.coherent(), layer.features()));
    }
    return new Problem(
        Samples.of(stack.grid().wavelengthNm()),
        Samples.of(stack.spectrum().binsMaPerCm2(stack.grid())),
        layers,
        stack.incidentSlot(),
        stack.exitSlot(),
        stack.slots().size(),
        stack.knobs().size(),
        incidences,
        seed,
        WANTED_ERROR_MA_PER_CM2,
        options);
  }

  /** The stack. */
  public ResolvedStack stack() {
    return stack;
  }

  /** What the solver was prepared for. */
  public Problem problem() {
    return problem;
  }

  /** The prepared solver. */
  public PreparedSolver prepared() {
    return prepared;
  }

  /** Channels in the order of the solver's absorptance rows. */
  public List<Channel> channels() {
    return channels;
  }

  /** Name of a channel as results show it: the layer, or {@code layer/component}. */
  public String channelName(Channel channel) {
    String layer = stack.layerName(channel.layer());
    return channel.component().isEmpty() ? layer : layer + "/" + channel.component();
  }

  /** Whether a channel's light belongs to a subcell. */
  public boolean belongsTo(Channel channel, ResolvedSubcell subcell) {
    return subcell.absorbers().stream()
        .anyMatch(
            absorber ->
                absorber.layer() == channel.layer()
                    && (absorber.component().isEmpty()
                        || absorber.component().equals(channel.component())));
  }

  /** Whether the light that leaves into the exit medium belongs to a subcell. */
  public boolean exitBelongsTo(ResolvedSubcell subcell) {
    return subcell.absorbers().stream().anyMatch(a -> a.layer() == stack.exitLayer());
  }

  /** A fresh bench for one thread, set as drawn. */
  public Bench newBench() {
    return newBench(List.of());
  }

  /** The same, which takes further sums along with the currents. */
  public Bench newBench(List<LightSum> lightSums) {
    return new Bench(this, new Filling(stack), lightSums);
  }

  @Override
  public void close() {
    prepared.close();
  }

  /** Fills designs; belongs to one thread. */
  static final class Filling {

    private final ResolvedStack stack;
    private final Material.Filler[] fillers;
    private final int[] layerOf;

    Filling(ResolvedStack stack) {
      this.stack = stack;
      this.layerOf = stack.layersOfSlots();
      double[] wavelengthNm = stack.grid().wavelengthNm();
      this.fillers =
          stack.slots().stream()
              .map(slot -> slot.material().on(wavelengthNm, stack.spectrum()))
              .toArray(Material.Filler[]::new);
    }

    /** Whether a row of optical constants depends on the thickness of its layer. */
    boolean followsThickness() {
      for (Material.Filler filler : fillers) {
        if (filler.followsThickness()) {
          return true;
        }
      }
      return false;
    }

    /** Writes the rows that depend on the thickness of a layer. */
    void followThickness(Design design, int layer, double[] bandgapEv) {
      for (int slot = 0; slot < fillers.length; slot++) {
        if (fillers[slot].followsThickness() && layerOf[slot] == layer) {
          fill(design, slot, bandgapEv[slot]);
        }
      }
    }

    /** Writes the stack as drawn into a design. */
    Design drawn(Design design) {
      for (int l = 0; l < stack.layers().size(); l++) {
        design.thicknessNm[l] = stack.layers().get(l).spec().drawnNm();
        design.material[l] = stack.layers().get(l).slot();
      }
      for (ResolvedKnob knob : stack.knobs()) {
        design.knob[knob.knob().index()] = knob.drawn();
      }
      List<MaterialSlot> slots = stack.slots();
      for (int s = 0; s < slots.size(); s++) {
        fill(design, s, slots.get(s).fillValue());
      }
      return design;
    }

    /** Writes one row of optical constants. */
    void fill(Design design, int slot, double bandgapEv) {
      double thicknessNm = layerOf[slot] < 0 ? 0 : design.thicknessNm[layerOf[slot]];
      fillers[slot].fill(bandgapEv, thicknessNm, design.n[slot], design.k[slot]);
      if (slot == stack.incidentSlot()) {
        java.util.Arrays.fill(design.k[slot], 0); // below 1e-6 by the check of the resolver
      }
      design.revision[slot] = Design.nextRevision();
    }
  }
}
