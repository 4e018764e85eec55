package evensun.raytrace;

import evensun.raytrace.geometry.Relief;
import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Slots;
import evensun.spi.Design;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Numbers about a design that rays tell. */
final class Facts {

  /** A wavelength so weakly absorbed on one way through tells how long ways are. */
  private static final double WEAK = 0.1;

  private final Problem problem;
  private final Design design;
  private final RayEvaluator evaluator;
  private final LitDevice lit;

  Facts(Problem problem, Design design, RayEvaluator evaluator) {
    this.problem = problem;
    this.design = design;
    this.evaluator = evaluator;
    lit = evaluator.ready(design, Beam.of(problem.incidences().get(0)));
  }

  List<Quantity> all() {
    List<Quantity> facts = new ArrayList<>();
    Forest forest = lit.traced().forest();
    double rays = (double) forest.rays() / problem.wavelengthCount();
    facts.add(new Quantity("rayCount", "Rays per wavelength (mean)", rays, ""));
    facts.add(
        new Quantity(
            "meetingCount", "Meetings of rays with facets", (double) forest.meetings(), ""));
    addReflectance(facts);
    addPaths(facts);
    addThicknesses(facts);
    facts.add(
        new Quantity(
            "energyBalanceErrorFraction",
            "Light lost or made by the rays, before results are made to add up (photon mean)",
            imbalance(evaluator.estimate(design, 0)),
            ""));
    return facts;
  }

  private void addReflectance(List<Quantity> facts) {
    double[] never = new double[problem.wavelengthCount()];
    double[] back = new double[problem.wavelengthCount()];
    evaluator.evaluate(design, 0, never, back);
    facts.add(
        new Quantity(
            "neverEnteredMaPerCm2", "Reflected before it entered", current(never), "mA cm⁻²"));
    facts.add(new Quantity("cameBackMaPerCm2", "Came back out", current(back), "mA cm⁻²"));
  }

  private double current(double[] share) {
    double sum = 0;
    for (int w = 0; w < share.length; w++) {
      sum += problem.incidentMaPerCm2().at(w) * share[w];
    }
    return sum;
  }

  private void addPaths(List<Quantity> facts) {
    int medium = Absorber.first(problem, lit.traced().device(), design);
    if (!lit.traced().device().isInner(medium)) {
      return;
    }
    int w = problem.wavelengthCount() - 1;
    if (Absorber.depth(problem, lit.traced().device(), design, medium, w) > WEAK) {
      return;
    }
    OptionalDouble enhancement = pathLengths(medium, w);
    enhancement.ifPresent(
        value ->
            facts.add(
                new Quantity(
                    "pathLengthEnhancement",
                    "Mean path in %s at %s nm without its absorption, in thicknesses"
                        .formatted(
                            lit.traced().device().plainName(medium), problem.wavelengthNm().at(w)),
                    value,
                    "")));
  }

  /** Mean path of the light that enters a medium, its own absorption left out, in thicknesses. */
  private OptionalDouble pathLengths(int medium, int w) {
    Forest forest = lit.traced().forest();
    LightTree tree = forest.trees().get(w);
    int slot = new Slots(lit.traced().device().mediaCount()).in(medium);
    double thickness = lit.traced().device().thicknessUm(design, medium);
    PathWalk walk = new PathWalk(lit, tree, w, slot, thickness);
    Incidence light = problem.incidences().get(0);
    double s =
        light.polarisation() == Polarisation.S
            ? 1
            : light.polarisation() == Polarisation.P ? 0 : 0.5;
    return walk.mean(s);
  }

  private void addThicknesses(List<Quantity> facts) {
    for (int b = 0; b < lit.traced().faces().size(); b++) {
      Face face = lit.traced().faces().get(b);
      if (face.relief().isPresent()) {
        double steepness = steepness(face.relief().get());
        for (int film : lit.traced().device().boundaries().get(b).films()) {
          String name = problem.layers().get(film).name();
          facts.add(
              new Quantity(
                  name + ".thicknessAlongSubstrateNormalNm",
                  "Thickness of " + name + " along the normal of the substrate (mean)",
                  design.thicknessNm[film] * steepness,
                  "nm"));
        }
      }
    }
  }

  /** Mean of 1/cos of the slope: the area of the surface over that of the substrate. */
  private static double steepness(Relief relief) {
    int samples = 400;
    double sum = 0;
    double stepX = relief.periodXUm() * 1e-6;
    double stepY = relief.periodYUm() * 1e-6;
    for (int i = 0; i < samples; i++) {
      for (int j = 0; j < samples; j++) {
        double x = (i + 0.377) / samples * relief.periodXUm();
        double y = (j + 0.623) / samples * relief.periodYUm();
        double at = relief.heightUm(x, y);
        double slopeX = (relief.heightUm(x + stepX, y) - at) / stepX;
        double slopeY = (relief.heightUm(x, y + stepY) - at) / stepY;
        sum += Math.sqrt(1 + slopeX * slopeX + slopeY * slopeY);
      }
    }
    return sum / samples / samples;
  }

  /** Photon mean of what totals miss of 1. */
  double imbalance(Estimate estimate) {
    double photons = 0;
    double off = 0;
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      photons += problem.incidentMaPerCm2().at(w);
      off += problem.incidentMaPerCm2().at(w) * Math.abs(estimate.total[w] - 1);
    }
    return photons > 0 ? off / photons : Math.abs(estimate.total[0] - 1);
  }
}
