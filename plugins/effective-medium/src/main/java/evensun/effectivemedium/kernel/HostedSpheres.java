package evensun.effectivemedium.kernel;

import java.util.Arrays;

/**
 * Spheres polarised in a medium h: (ε − h)/(ε + 2h) = Σ fᵢ (εᵢ − h)/(εᵢ + 2h), which with Σ fᵢ = 1
 * is ε = 1/F − 2h, F = Σ fᵢ/(εᵢ + 2h). Maxwell Garnett where h is a component, Lorentz–Lorenz where
 * h is vacuum.
 */
public final class HostedSpheres {

  private HostedSpheres() {}

  /**
   * Mixes the components, the host among them.
   *
   * @param epsRe [c][w] real parts of the permittivities
   * @param epsIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions, at least 0, of sum 1
   * @param hostRe [w] real part of the host's permittivity
   * @param hostIm [w] imaginary part of the host's permittivity, at least 0
   * @param re [w] out: real part of the effective permittivity; not one of the inputs
   * @param im [w] out: imaginary part of the effective permittivity; not one of the inputs
   */
  public static void mix(
      double[][] epsRe,
      double[][] epsIm,
      double[] fraction,
      double[] hostRe,
      double[] hostIm,
      double[] re,
      double[] im) {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
    for (int c = 0; c < fraction.length; c++) {
      addInverse(epsRe[c], epsIm[c], fraction[c], hostRe, hostIm, re, im);
    }
    for (int w = 0; w < re.length; w++) {
      double inverse = 1 / (re[w] * re[w] + im[w] * im[w]);
      re[w] = re[w] * inverse - 2 * hostRe[w];
      im[w] = -im[w] * inverse - 2 * hostIm[w];
    }
  }

  private static void addInverse(
      double[] epsRe,
      double[] epsIm,
      double fraction,
      double[] hostRe,
      double[] hostIm,
      double[] re,
      double[] im) {
    for (int w = 0; w < re.length; w++) {
      double xRe = epsRe[w] + 2 * hostRe[w];
      double xIm = epsIm[w] + 2 * hostIm[w];
      double scale = fraction / (xRe * xRe + xIm * xIm);
      re[w] += xRe * scale;
      im[w] -= xIm * scale;
    }
  }
}
