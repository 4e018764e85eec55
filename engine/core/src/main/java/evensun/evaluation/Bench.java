package evensun.evaluation;

import evensun.material.Composition;
import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Response;
import evensun.stack.ResolvedSubcell;
import java.util.List;
import java.util.Optional;

/**
 * Where one thread sets the numbers of a stack and asks what the light does. Setting and asking for
 * currents allocates nothing. After an exception the bench may be used on.
 */
public final class Bench implements AutoCloseable {

  private final Model model;
  private final Model.Filling filling;
  private final Design design;
  private final double[] bandgapEv;
  private final Evaluator evaluator;
  private final List<LightSum> lightSums;
  private final Response sums;
  private final Optional<Gradient> gradient;
  private final Tie[] ties;

  Bench(Model model, Model.Filling filling, List<LightSum> lightSums) {
    this.model = model;
    this.filling = filling;
    this.design = filling.drawn(Design.of(model.problem()));
    this.bandgapEv = model.stack().slots().stream().mapToDouble(s -> s.fillValue()).toArray();
    this.evaluator = model.prepared().newEvaluator();
    this.lightSums = List.copyOf(lightSums);
    this.sums = sums(model, lightSums);
    // A row that changes with a thickness is unknown to the solver, and so to its derivatives.
    this.gradient =
        filling.followsThickness() ? Optional.empty() : evaluator.ability(Gradient.class);
    this.ties = Tie.of(model.stack()).toArray(Tie[]::new);
  }

  /** The currents of the subcells first, then the further sums. */
  private static Response sums(Model model, List<LightSum> lightSums) {
    int count = model.stack().subcells().size();
    int channels = model.channels().size();
    double[] bins = model.problem().incidentMaPerCm2().toArray();
    Response response = Response.sums(count + lightSums.size(), channels);
    response.sumStandardError = null; // statistical solvers take longer to tell it
    for (int s = 0; s < count; s++) {
      weigh(response, s, model, bins);
    }
    for (int i = 0; i < lightSums.size(); i++) {
      int row = count + i;
      LightSum sum = lightSums.get(i);
      double[] weight = sum.weight().toArray();
      sum.channels().forEach(c -> response.weight[row * channels + c] = weight);
      response.transmittanceWeight[row] = sum.transmitted() ? weight : null;
    }
    return response;
  }

  /** Makes sum s of a response the photocurrent of subcell s. */
  static void weigh(Response response, int s, Model model, double[] bins) {
    ResolvedSubcell subcell = model.stack().subcells().get(s);
    List<Channel> channels = model.channels();
    for (int c = 0; c < channels.size(); c++) {
      if (model.belongsTo(channels.get(c), subcell)) {
        response.weight[s * channels.size() + c] = bins;
      }
    }
    if (model.exitBelongsTo(subcell)) {
      response.transmittanceWeight[s] = bins;
    }
  }

  /** The model this bench belongs to. */
  public Model model() {
    return model;
  }

  /** Sets one number, in the unit of the parameter, and those that are tied to it. */
  public void set(Parameter parameter, double value) {
    write(parameter, value);
    for (Tie tie : ties) {
      if (tie.leader().kind() == parameter.kind() && tie.leader().index() == parameter.index()) {
        write(tie.follower(), tie.ratio() * value);
      }
    }
  }

  private void write(Parameter parameter, double value) {
    switch (parameter.kind()) {
      case THICKNESS -> setThickness(parameter.index(), isThere(parameter.index()) ? value : 0);
      case BANDGAP -> setBandgap(parameter.index(), value);
      case COMPOSITION ->
          setBandgap(parameter.index(), composition(parameter.index()).bandgapEv(value));
      case KNOB -> design.knob[parameter.index()] = value;
    }
  }

  private boolean isThere(int layer) {
    return model.stack().layers().get(layer).spec().present();
  }

  /** The present value of a parameter, in its unit. */
  public double get(Parameter parameter) {
    return switch (parameter.kind()) {
      case THICKNESS -> design.thicknessNm[parameter.index()];
      case BANDGAP -> bandgapEv[parameter.index()];
      case COMPOSITION -> composition(parameter.index()).fraction(bandgapEv[parameter.index()]);
      case KNOB -> design.knob[parameter.index()];
    };
  }

  /** Bandgap of a row of optical constants in eV, 0 where it has none. */
  public double bandgapEv(int slot) {
    return bandgapEv[slot];
  }

  /**
   * Bandgap of each subcell's first absorber.
   *
   * @param into [subcell] eV, 0 where it has none
   */
  public void subcellGaps(double[] into) {
    List<ResolvedSubcell> subcells = model.stack().subcells();
    for (int s = 0; s < into.length; s++) {
      List<ResolvedSubcell.Absorber> absorbers = subcells.get(s).absorbers();
      into[s] = absorbers.isEmpty() ? 0 : bandgapEv[absorbers.get(0).slot()];
    }
  }

  private Composition composition(int slot) {
    return model.stack().slots().get(slot).tuning().composition().orElseThrow();
  }

  private void setBandgap(int slot, double value) {
    if (value != bandgapEv[slot]) {
      bandgapEv[slot] = value;
      filling.fill(design, slot, value);
    }
  }

  private void setThickness(int layer, double value) {
    if (value != design.thicknessNm[layer]) {
      design.thicknessNm[layer] = value;
      filling.followThickness(design, layer, bandgapEv);
    }
  }

  /** Takes over the design of another bench of the same stack. */
  public void copyFrom(Bench other) {
    for (int layer = 0; layer < design.thicknessNm.length; layer++) {
      setThickness(layer, other.design.thicknessNm[layer]);
    }
    for (int slot = 0; slot < bandgapEv.length; slot++) {
      setBandgap(slot, other.bandgapEv[slot]);
    }
    System.arraycopy(other.design.material, 0, design.material, 0, design.material.length);
    System.arraycopy(other.design.knob, 0, design.knob, 0, design.knob.length);
  }

  /** The present design; not to be written. */
  public Design design() {
    return design;
  }

  /**
   * Photocurrents of the present design.
   *
   * @param into [subcell] mA cm⁻²
   * @throws evensun.spi.EvaluationFailed when this design cannot be evaluated
   */
  public void currents(double[] into) {
    evaluator.evaluate(design, sums);
    System.arraycopy(sums.sum, 0, into, 0, into.length);
  }

  /** Standard error of each share of the light, for solvers that have one. */
  double[] standardErrors(Response shares) {
    evaluator.evaluate(design, shares);
    return shares.sumStandardError;
  }

  /**
   * Where a sum the bench was made with stands among its sums.
   *
   * @throws java.util.NoSuchElementException for a sum that it was not made with
   */
  int indexOf(LightSum wanted) {
    for (int i = 0; i < lightSums.size(); i++) {
      if (lightSums.get(i) == wanted) {
        return sums.sum.length - lightSums.size() + i;
      }
    }
    throw new java.util.NoSuchElementException("the bench takes no such sum");
  }

  /** Number of sums that {@link #currentsAndGradient} differentiates. */
  int sumCount() {
    return sums.sum.length;
  }

  /** Whether {@link #currentsAndGradient} is there. */
  public boolean hasGradient() {
    return gradient.isPresent();
  }

  /**
   * Photocurrents and their derivatives by thickness.
   *
   * @param into [subcell] mA cm⁻²
   * @param byThickness [s*L + l] mA cm⁻² per nm, of the subcells first, then of the further sums
   */
  public void currentsAndGradient(double[] into, double[] byThickness) {
    gradient.orElseThrow().evaluate(design, sums, byThickness);
    System.arraycopy(sums.sum, 0, into, 0, into.length);
  }

  /** Every spectrum of the present design. */
  public Response spectra() {
    Response response =
        Response.spectra(
            model.problem().incidences().size(),
            model.channels().size(),
            model.problem().wavelengthCount());
    response.absorptanceStandardError =
        new double[response.absorptance.length][model.problem().wavelengthCount()];
    evaluator.evaluate(design, response);
    return response;
  }

  /** A further ability of the solver. */
  public <A> Optional<A> ability(Class<A> type) {
    return evaluator.ability(type);
  }

  @Override
  public void close() {
    evaluator.close();
  }
}
