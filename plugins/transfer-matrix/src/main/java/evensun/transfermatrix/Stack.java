package evensun.transfermatrix;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Side;
import evensun.transfermatrix.kernel.Beam;
import evensun.transfermatrix.kernel.Layout;
import java.util.Arrays;

/** Lays designs of one problem out in the order the light meets their layers, and checks them. */
final class Stack {

  private final Problem problem;
  private final int layers;
  private final boolean[] coherent;
  private final long[] checked;
  private final Layout layout;

  Stack(Problem problem) {
    this.problem = problem;
    layers = problem.layerCount();
    coherent = new boolean[layers];
    for (int l = 0; l < layers; l++) {
      coherent[l] = problem.layers().get(l).coherent();
    }
    checked = new long[problem.materialCount()];
    layout = new Layout(layers);
  }

  /** [l] whether waves interfere in a layer. */
  boolean[] coherent() {
    return coherent.clone();
  }

  /** The light of an incidence. At normal incidence s and p are one. */
  static Beam beam(Incidence incidence) {
    double cosine = incidence.angleDeg() == 0 ? 1 : Math.cos(Math.toRadians(incidence.angleDeg()));
    if (cosine == 1 || incidence.polarisation() == Polarisation.S) {
      return new Beam(cosine, 1, 0);
    }
    return incidence.polarisation() == Polarisation.P
        ? new Beam(cosine, 0, 1)
        : new Beam(cosine, 0.5, 0.5);
  }

  /**
   * The layers of a design from one side; valid until the next call.
   *
   * @param keepThin whether a coherent layer of zero thickness stays, so that one may differentiate
   *     by its thickness
   */
  Layout layout(Design design, Side side, boolean keepThin) {
    boolean front = side == Side.FRONT;
    layout.start(front ? -1 : layers, front ? problem.incidentMaterial() : problem.exitMaterial());
    for (int i = 0; i < layers; i++) {
      int l = front ? i : layers - 1 - i;
      double nm = design.thicknessNm[l];
      if (nm > 0 || (keepThin && coherent[l])) {
        layout.append(l, design.material[l], nm, coherent[l]);
      }
    }
    layout.finish(front ? layers : -1, front ? problem.exitMaterial() : problem.incidentMaterial());
    return layout;
  }

  /**
   * Checks the numbers of a design.
   *
   * @throws EvaluationFailed naming the layer or material, the rule and the value
   * @throws IllegalArgumentException if the design has another shape than the problem
   */
  void check(Design design) {
    checkShape(design);
    for (int l = 0; l < layers; l++) {
      checkLayer(design, l);
    }
    for (int m = 0; m < checked.length; m++) {
      if (checked[m] != design.revision[m] || checked[m] == 0) {
        checkMaterial(design, m);
        checked[m] = design.revision[m];
      }
    }
  }

  private void checkShape(Design design) {
    if (design.thicknessNm.length != layers
        || design.material.length != layers
        || design.n.length != checked.length
        || design.n[0].length != problem.wavelengthCount()) {
      throw new IllegalArgumentException("the design has another shape than the problem");
    }
  }

  private void checkLayer(Design design, int l) {
    double nm = design.thicknessNm[l];
    if (!(nm >= 0 && nm < Double.POSITIVE_INFINITY)) {
      throw new EvaluationFailed(
          "layer \"%s\": thicknessNm must be finite and at least 0 nm but was %s"
              .formatted(problem.layers().get(l).name(), nm));
    }
    if (design.material[l] < 0 || design.material[l] >= checked.length) {
      throw new IllegalArgumentException(
          "layer \"%s\": material must be in [0, %d) but was %d"
              .formatted(problem.layers().get(l).name(), checked.length, design.material[l]));
    }
  }

  private void checkMaterial(Design design, int m) {
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      double n = design.n[m][w];
      double k = design.k[m][w];
      if (!(n > 0 && n <= 1e6 && k >= 0 && k <= 1e6)) {
        throw new EvaluationFailed(
            "material %s at %s nm: n must be in (0, 1e6] and k in [0, 1e6] but n was %s, k %s"
                .formatted(users(design, m), problem.wavelengthNm().at(w), n, k));
      }
    }
  }

  /** Says whose material m is: solvers know materials by number only. */
  private String users(Design design, int m) {
    if (m == problem.incidentMaterial()) {
      return "of the incident medium";
    }
    if (m == problem.exitMaterial()) {
      return "of the exit medium";
    }
    int l = Arrays.stream(design.material).boxed().toList().indexOf(m);
    return l < 0 ? "number " + m : "of layer \"" + problem.layers().get(l).name() + "\"";
  }
}
