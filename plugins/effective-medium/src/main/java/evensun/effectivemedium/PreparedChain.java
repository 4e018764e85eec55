package evensun.effectivemedium;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.PreparedSolver;
import evensun.spi.Quantity;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The solver made ready: a chain, and what is to be said about a design. */
final class PreparedChain implements PreparedSolver {

  private final Chain chain;
  private final Optional<SliceChoice> slices;
  private final double tolerance;
  private final boolean scatterersTaken;

  /**
   * A prepared solver.
   *
   * @param chain plan and solver below
   * @param slices how the slices were chosen, empty without graded layers
   * @param tolerance of the graded layers
   * @param scatterersTaken whether the solver below takes rough faces that scatter
   */
  PreparedChain(
      Chain chain, Optional<SliceChoice> slices, double tolerance, boolean scatterersTaken) {
    this.chain = chain;
    this.slices = slices;
    this.tolerance = tolerance;
    this.scatterersTaken = scatterersTaken;
  }

  @Override
  public List<Channel> channels() {
    return chain.channels().drawn();
  }

  @Override
  public Evaluator newEvaluator() {
    return chain.newEvaluator();
  }

  @Override
  public List<Finding> examine(Design design) {
    Plan plan = chain.plan();
    Fit fit = new Fit(plan);
    fit.update(design);
    List<Finding> findings = new ArrayList<>(Validity.examine(plan, fit, design));
    addSliceFindings(design, findings);
    addHazeFindings(design, fit, findings);
    findings.addAll(chain.below().examine(fit.plain()));
    return findings;
  }

  private void addSliceFindings(Design design, List<Finding> findings) {
    if (slices.isEmpty()) {
      return;
    }
    int count = gradedCount();
    double change = slices.get().remainder(design, count);
    if (change > tolerance) {
      findings.add(
          new Finding(
              "grading-coarse",
              Severity.WARNING,
              gradedNames(),
              Validity.text(
                  "with %d slices a spectrum is off by %.1e, more than the tolerance of %.1e; draw the"
                      + " layer nearer to this thickness and run again",
                  count, change, tolerance)));
    }
  }

  private int gradedCount() {
    return chain.plan().bodies().stream()
        .filter(Body.Graded.class::isInstance)
        .mapToInt(Body::pieces)
        .max()
        .orElse(1);
  }

  private String gradedNames() {
    List<String> names = new ArrayList<>();
    for (int l = 0; l < chain.plan().bodies().size(); l++) {
      if (chain.plan().body(l) instanceof Body.Graded) {
        names.add(chain.plan().layerName(l));
      }
    }
    return String.join(", ", names);
  }

  private void addHazeFindings(Design design, Fit fit, List<Finding> findings) {
    FaceOptics optics = new FaceOptics(chain.plan(), fit, design);
    for (RoughFace face : chain.plan().faces()) {
      if (!face.isMixedLayer() && !scatterersTaken) {
        findings.add(
            new Finding(
                "haze-not-followed",
                Severity.NOTE,
                chain.plan().layerName(face.below()),
                Validity.text(
                    "the rough face scatters %.1f %% of the light it reflects and %.1f %% of the"
                        + " light it transmits; the solver below counts it as not scattered, so"
                        + " longer paths in the layers are not included",
                    100 * optics.reflectedHaze(face), 100 * optics.transmittedHaze(face))));
      }
    }
  }

  @Override
  public List<Quantity> describe(Design design) {
    Plan plan = chain.plan();
    Fit fit = new Fit(plan);
    fit.update(design);
    List<Quantity> quantities = new ArrayList<>();
    for (int l = 0; l < plan.bodies().size(); l++) {
      addBody(plan, fit, l, quantities);
    }
    FaceOptics optics = new FaceOptics(plan, fit, design);
    for (RoughFace face : plan.faces()) {
      addFace(plan.layerName(face.below()), face, optics, quantities);
    }
    quantities.addAll(chain.below().describe(fit.plain()));
    return quantities;
  }

  private static void addBody(Plan plan, Fit fit, int l, List<Quantity> into) {
    String name = plan.layerName(l);
    Body body = plan.body(l);
    if (body instanceof Body.Graded graded) {
      into.add(
          new Quantity(name + ".sliceCount", "Slices of " + name, graded.slices().count(), ""));
    } else if (body instanceof Body.Mixed mixed) {
      Blend blend = fit.blend(l);
      int mean = Scales.meanWavelength(plan.problem());
      String at = Validity.number(plan.problem().wavelengthNm().at(mean)) + " nm";
      into.add(
          new Quantity(
              name + ".effectiveIndex",
              "Effective refractive index of " + name + " at " + at,
              blend.n(0)[mean],
              ""));
      for (int c = 0; c < mixed.mixture().components().size(); c++) {
        String component = name + "/" + mixed.mixture().components().get(c).name();
        into.add(
            new Quantity(
                component + ".fraction",
                "Volume fraction of " + component,
                blend.fraction(0, c),
                ""));
      }
    }
  }

  private static void addFace(String name, RoughFace face, FaceOptics optics, List<Quantity> into) {
    if (face.isMixedLayer()) {
      into.add(
          new Quantity(
              name + ".roughLayerNm",
              "Mixed layer for the rough face of " + name,
              Fit.THICKNESS_PER_RMS * face.roughness().rmsNm(),
              "nm"));
      return;
    }
    into.add(
        new Quantity(
            name + ".reflectedHaze",
            "Haze in reflection at " + name + " (photon mean)",
            optics.reflectedHaze(face),
            ""));
    into.add(
        new Quantity(
            name + ".transmittedHaze",
            "Haze in transmission at " + name + " (photon mean)",
            optics.transmittedHaze(face),
            ""));
  }

  @Override
  public void close() {
    chain.close();
  }
}
