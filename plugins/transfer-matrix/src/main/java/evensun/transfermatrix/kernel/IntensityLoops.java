package evensun.transfermatrix.kernel;

/** The inner loops across thick media, over wavelengths; rows as in {@link Intensities}. */
final class IntensityLoops {

  private IntensityLoops() {}

  /** What comes back of an intensity that crosses a medium, is reflected and crosses it again. */
  static void round(double[] passed, double[] below, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = passed[w] * passed[w] * below[w];
    }
  }

  /** Factor by which the round trips add up, 1/(1 − R x). */
  static void echo(double[] reflectance, double[] round, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = 1 / (1 - reflectance[w] * round[w]);
    }
  }

  /** Reflectance of a packet with all that lies below it. */
  static void gather(
      double[] reflectance,
      double[] onward,
      double[] backward,
      double[] round,
      double[] echo,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      out[w] = reflectance[w] + onward[w] * backward[w] * round[w] * echo[w];
    }
  }

  /** Absorbed in a thick medium: from two crossings, and mixed at both faces. */
  static void absorbed(
      double[] passed,
      double[] entering,
      double[] falling,
      double[] below,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      out[w] = (1 - passed[w]) * (entering[w] + falling[w] * below[w]);
    }
  }

  /** Adds the mixed terms at both faces. */
  static void addMixed(
      double[] falling,
      double[] mixedBelow,
      double[] returning,
      double[] mixedAbove,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      out[w] += falling[w] * mixedBelow[w] + returning[w] * mixedAbove[w];
    }
  }
}
