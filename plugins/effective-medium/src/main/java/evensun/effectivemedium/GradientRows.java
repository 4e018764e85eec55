package evensun.effectivemedium;

import java.util.Arrays;

/** Derivatives by the thicknesses as drawn from those by the thicknesses of the plain layers. */
final class GradientRows {

  private final Plan plan;
  private double[] plain = new double[0];

  GradientRows(Plan plan) {
    this.plan = plan;
  }

  /** [s*plainLayers + j] a row for the solver below. */
  double[] plain(int sums) {
    int size = sums * plan.pieces().size();
    if (plain.length != size) {
      plain = new double[size];
    }
    return plain;
  }

  /**
   * Gathers. A slice is a fixed part of its layer; a rough face keeps its thickness, and takes it
   * from its neighbours whatever theirs is.
   *
   * @param from [s*plainLayers + j] derivatives by the plain thicknesses, per nm
   * @param sums number of sums
   * @param into [s*L + l] out: derivatives by the thicknesses as drawn, per nm
   */
  void gather(double[] from, int sums, double[] into) {
    int layers = plan.bodies().size();
    int pieces = plan.pieces().size();
    Arrays.fill(into, 0, sums * layers, 0);
    for (int s = 0; s < sums; s++) {
      for (int l = 0; l < layers; l++) {
        into[s * layers + l] = layer(from, s * pieces + plan.firstPiece(l), plan.body(l));
      }
    }
  }

  private static double layer(double[] from, int first, Body body) {
    if (!(body instanceof Body.Graded graded)) {
      return from[first];
    }
    double sum = 0;
    for (int i = 0; i < graded.slices().count(); i++) {
      sum += graded.slices().width(i) * from[first + i];
    }
    return sum;
  }
}
