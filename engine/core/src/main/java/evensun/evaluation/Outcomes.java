package evensun.evaluation;

import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.Parasitic;
import evensun.result.Outcome.QuantityRecord;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.Connection;
import evensun.spi.Channel;
import evensun.spi.Quantity;
import evensun.spi.ReflectanceParts;
import evensun.spi.Response;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedStack;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Turns the present design of a bench into the record that results and reports are made of. */
public final class Outcomes {

  /** End of the key under which a solver tells a film's thickness as the substrate sees it. */
  private static final String ALONG_NORMAL = ".thicknessAlongSubstrateNormalNm";

  private final Model model;
  private final Bench bench;
  private final ResolvedStack stack;
  private final Response response;
  private final double[] bins;
  private final @Nullable StandardErrors errors;
  private final double @Nullable [] neverEntered;
  private final List<Quantity> quantities;

  private Outcomes(Bench bench) {
    this.bench = bench;
    this.model = bench.model();
    this.stack = model.stack();
    this.response = bench.spectra();
    this.bins = model.problem().incidentMaPerCm2().toArray();
    Ledger.check(response, 0, model.channels().size(), stack.grid().wavelengthNm());
    this.errors = StandardErrors.of(bench, response, bins).orElse(null);
    this.neverEntered = neverEntered(bench);
    this.quantities = model.prepared().describe(bench.design());
  }

  /**
   * The outcome of the bench's present design.
   *
   * @param bench the bench
   * @param varied the quantities that a search moved, listed under {@code design}
   * @throws evensun.spi.EvaluationFailed when it cannot be evaluated or breaks the ledger
   */
  public static Outcome of(Bench bench, List<Parameter> varied) {
    return new Outcomes(bench).outcome(varied);
  }

  private static double @Nullable [] neverEntered(Bench bench) {
    double[] never = new double[bench.model().problem().wavelengthCount()];
    Optional<ReflectanceParts> parts = bench.ability(ReflectanceParts.class);
    parts.ifPresent(p -> p.evaluate(bench.design(), 0, never, new double[never.length]));
    return parts.isPresent() ? never : null;
  }

  private Outcome outcome(List<Parameter> varied) {
    boolean spectraOnly = stack.isMonochromatic();
    List<SubcellOutcome> subcells = subcells(spectraOnly);
    boolean series = stack.scenario().connection() == Connection.SERIES && !spectraOnly;
    Double matched = series ? extreme(subcells, true) : null;
    Double mismatch = series ? extreme(subcells, false) - matched : null;
    Map<String, Double> design = new LinkedHashMap<>();
    varied.forEach(parameter -> design.put(parameter.key(), bench.get(parameter)));
    if (!varied.isEmpty()) {
      Tie.of(stack).forEach(t -> design.put(t.follower().key(), bench.get(t.follower())));
    }
    return new Outcome(
        spectraOnly ? null : Arrays.stream(bins).sum(),
        subcells,
        matched,
        mismatch,
        limiting(subcells, matched, mismatch),
        spectraOnly ? null : losses(),
        design,
        entries(),
        spectral(),
        quantities.stream()
            .filter(q -> !q.key().endsWith(ALONG_NORMAL))
            .map(q -> new QuantityRecord(q.key(), q.label(), q.value(), q.unit()))
            .toList(),
        null);
  }

  private List<SubcellOutcome> subcells(boolean spectraOnly) {
    List<SubcellOutcome> outcomes = new ArrayList<>();
    for (int s = 0; s < stack.subcells().size(); s++) {
      ResolvedSubcell subcell = stack.subcells().get(s);
      double gap =
          subcell.absorbers().isEmpty() ? 0 : bench.bandgapEv(subcell.absorbers().get(0).slot());
      outcomes.add(
          new SubcellOutcome(
              subcell.name(),
              subcell.absorbers().stream().map(this::absorberName).toList(),
              gap > 0 ? gap : null,
              spectraOnly ? null : current(subcell),
              errors == null || spectraOnly ? null : errors.subcell(s),
              null));
    }
    return outcomes;
  }

  private String absorberName(ResolvedSubcell.Absorber absorber) {
    return model.channelName(new Channel(absorber.layer(), absorber.component()));
  }

  /** Photocurrent of a subcell, mA cm⁻². */
  private double current(ResolvedSubcell subcell) {
    double sum = 0;
    for (int c = 0; c < model.channels().size(); c++) {
      if (model.belongsTo(model.channels().get(c), subcell)) {
        sum += weighted(response.absorptance[c]);
      }
    }
    return model.exitBelongsTo(subcell) ? sum + weighted(response.transmittance[0]) : sum;
  }

  private double weighted(double[] share) {
    double sum = 0;
    for (int w = 0; w < bins.length; w++) {
      sum += bins[w] * share[w];
    }
    return sum;
  }

  private static double extreme(List<SubcellOutcome> subcells, boolean smallest) {
    var currents = subcells.stream().mapToDouble(SubcellOutcome::photocurrentMaPerCm2);
    return (smallest ? currents.min() : currents.max()).orElse(0);
  }

  private static @Nullable String limiting(
      List<SubcellOutcome> subcells, @Nullable Double matched, @Nullable Double mismatch) {
    if (matched == null || mismatch == null || mismatch < Outcome.BALANCED_MA_PER_CM2) {
      return null;
    }
    return subcells.stream()
        .filter(subcell -> matched.equals(subcell.photocurrentMaPerCm2()))
        .map(SubcellOutcome::name)
        .findFirst()
        .orElse(null);
  }

  private Losses losses() {
    List<Parasitic> parasitic = new ArrayList<>();
    for (int c = 0; c < model.channels().size(); c++) {
      Channel channel = model.channels().get(c);
      if (stack.subcells().stream().noneMatch(s -> model.belongsTo(channel, s))) {
        parasitic.add(
            new Parasitic(
                model.channelName(channel),
                weighted(response.absorptance[c]),
                errors == null ? null : errors.channel(c)));
      }
    }
    boolean collected = stack.subcells().stream().anyMatch(model::exitBelongsTo);
    return new Losses(
        weighted(response.reflectance[0]),
        collected ? 0 : weighted(response.transmittance[0]),
        parasitic,
        errors == null ? null : errors.reflected(),
        errors == null || collected ? null : errors.transmitted(),
        neverEntered == null ? null : weighted(neverEntered));
  }

  private List<StackEntry> entries() {
    List<StackEntry> entries = new ArrayList<>();
    var incident = stack.scenario().incidentMedium();
    entries.add(entry(incident.name(), stack.incidentSlot(), "incident", null, false, -1));
    for (int l = 0; l < stack.layers().size(); l++) {
      ResolvedLayer layer = stack.layers().get(l);
      if (!layer.spec().present()) {
        continue;
      }
      double nm = bench.design().thicknessNm[l];
      entries.add(entry(layer.name(), layer.slot(), "layer", nm, layer.coherent(), l));
    }
    entries.add(
        entry(
            stack.scenario().exit().name(),
            stack.exitSlot(),
            "exit",
            null,
            false,
            stack.exitLayer()));
    return entries;
  }

  private StackEntry entry(
      String name, int slot, String role, @Nullable Double nm, boolean coherent, int layer) {
    var material = stack.slots().get(slot);
    String subcell =
        stack.subcells().stream()
            .filter(s -> s.absorbers().stream().anyMatch(a -> a.layer() == layer))
            .map(ResolvedSubcell::name)
            .findFirst()
            .orElse(null);
    boolean finite = role.equals("layer");
    ResolvedLayer drawn = finite ? stack.layers().get(layer) : null;
    return new StackEntry(
        name,
        drawn == null ? material.name() : LayerWords.material(stack, drawn),
        role,
        nm,
        material.tunable() ? bench.bandgapEv(slot) : null,
        coherent,
        subcell,
        drawn == null ? List.of() : LayerWords.features(stack, drawn, bench.design()),
        alongNormal(name));
  }

  /** What the solver says of a film on facets. */
  private @Nullable Double alongNormal(String layer) {
    return quantities.stream()
        .filter(q -> q.key().equals(layer + ALONG_NORMAL))
        .map(Quantity::value)
        .findFirst()
        .orElse(null);
  }

  private Spectral spectral() {
    return new Spectral(
        boxed(stack.grid().wavelengthNm()),
        boxed(bins),
        boxed(response.reflectance[0]),
        boxed(response.transmittance[0]),
        byChannel(response.absorptance),
        errors == null ? null : byChannel(response.absorptanceStandardError),
        neverEntered == null ? null : boxed(neverEntered));
  }

  private Map<String, List<Double>> byChannel(double[][] rows) {
    Map<String, List<Double>> named = new LinkedHashMap<>();
    for (int c = 0; c < model.channels().size(); c++) {
      named.put(model.channelName(model.channels().get(c)), boxed(rows[c]));
    }
    return named;
  }

  private static List<Double> boxed(double[] values) {
    return Arrays.stream(values).boxed().toList();
  }
}
