package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.Problem;
import evensun.spi.Roughness;
import evensun.spi.Side;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.List;

/** Makes plans for a problem, with any number of slices; decides once how rough faces are taken. */
final class Planner {

  private final Problem problem;
  private final List<RoughFace> faces;

  /**
   * Checks the features and decides on the rough faces.
   *
   * @param problem the problem
   * @param start the stack as drawn
   * @throws UnsupportedProblem where features of a layer do not go together
   */
  Planner(Problem problem, Design start) {
    this.problem = problem;
    for (int l = 0; l < problem.layerCount(); l++) {
      check(l);
    }
    Plan smooth = new Plan(problem, bodies(1), List.of());
    Fit fit = new Fit(smooth);
    fit.update(start);
    FaceOptics optics = new FaceOptics(smooth, fit, start);
    List<RoughFace> found = new ArrayList<>();
    for (int l = 0; l < problem.layerCount(); l++) {
      for (Feature feature : problem.layers().get(l).features()) {
        if (feature instanceof Roughness roughness) {
          found.add(face(roughness.face() == Side.FRONT ? l : l + 1, roughness, optics));
        }
      }
    }
    faces = List.copyOf(found);
  }

  private RoughFace face(int below, Roughness roughness, FaceOptics optics) {
    RoughFace face = new RoughFace(below, roughness, RoughFace.Model.MIXED_LAYER);
    int w = Scales.meanWavelength(problem);
    double ratio =
        Scales.ratio(problem, w, roughness.correlationLengthNm(), optics.larger(face, w));
    boolean fine = ratio < Scales.MIDDLE;
    return fine ? face : new RoughFace(below, roughness, RoughFace.Model.SCATTERING);
  }

  private void check(int l) {
    Layer layer = problem.layers().get(l);
    int bodies = 0;
    int fronts = 0;
    for (Feature feature : layer.features()) {
      bodies += feature instanceof Mixture || feature instanceof Grading ? 1 : 0;
      fronts += feature instanceof Roughness r && r.face() == Side.FRONT ? 1 : 0;
      if (feature instanceof Roughness r && r.face() == Side.REAR) {
        refuse(
            l != problem.layerCount() - 1,
            layer,
            "the rear face of an inner layer is the front"
                + " face of the next; give roughness to that layer");
      }
      refuse(
          feature instanceof Grading && !layer.coherent(),
          layer,
          "a graded layer must be coherent; leave coherence out");
      requireRows(layer, feature);
    }
    refuse(bodies > 1, layer, "a layer takes one mixture or grading, not several; split the layer");
    refuse(fronts > 1, layer, "a face takes one roughness; leave the others out");
  }

  private void requireRows(Layer layer, Feature feature) {
    int largest = -1;
    if (feature instanceof Mixture mixture) {
      for (Mixture.Component component : mixture.components()) {
        largest = Math.max(largest, component.material());
      }
    } else if (feature instanceof Grading grading) {
      largest = Math.max(grading.upper().material(), grading.lower().material());
    }
    refuse(
        largest >= problem.materialCount(),
        layer,
        "material " + largest + " is none of the " + problem.materialCount() + " of the problem");
  }

  private static void refuse(boolean condition, Layer layer, String message) {
    if (condition) {
      throw new UnsupportedProblem("layer \"" + layer.name() + "\": " + message);
    }
  }

  List<RoughFace> faces() {
    return faces;
  }

  /** Whether any layer is graded. */
  boolean hasGrading() {
    return tolerance() < Double.POSITIVE_INFINITY;
  }

  /** Smallest tolerance of all graded layers; infinite without one. */
  double tolerance() {
    return problem.layers().stream()
        .flatMap(layer -> layer.features().stream())
        .filter(Grading.class::isInstance)
        .mapToDouble(feature -> ((Grading) feature).tolerance())
        .min()
        .orElse(Double.POSITIVE_INFINITY);
  }

  /** A plan with that many slices in every graded layer. */
  Plan plan(int slices) {
    return new Plan(problem, bodies(slices), faces);
  }

  private List<Body> bodies(int slices) {
    return problem.layers().stream().map(layer -> body(layer, slices)).toList();
  }

  private static Body body(Layer layer, int slices) {
    for (Feature feature : layer.features()) {
      if (feature instanceof Mixture mixture) {
        return new Body.Mixed(mixture);
      }
      if (feature instanceof Grading grading) {
        return new Body.Graded(grading, Slices.of(grading.profile(), slices));
      }
    }
    return new Body.Plain();
  }

  Problem problem() {
    return problem;
  }
}
