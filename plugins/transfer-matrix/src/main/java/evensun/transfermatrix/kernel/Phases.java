package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * Phase factors exp(2iκd) of the layers, found anew only when thickness or medium changes.
 *
 * <p>The loops are written so that the JIT compiler vectorises them: no calls but rint and max, no
 * bit tricks. The angle is reduced exactly in turns; sine and cosine of its quarter are minimax
 * polynomials (error below 1e-16), doubled twice; the exponential is a polynomial for expm1 of a
 * 128th of the exponent, doubled seven times.
 */
final class Phases {

  /** [l][w] |exp(2iκd)|, which is also the share of an intensity that survives a crossing. */
  final double[][] size;

  /** [l][w] real part. */
  final double[][] re;

  /** [l][w] imaginary part. */
  final double[][] im;

  /** Exponents stop at 2⁻⁶⁴, so that nothing becomes denormal. */
  private static final double LEAST_EXPONENT = -64 * 0.6931471805599453 / MediumRows.DECAY_PARTS;

  private final long[] version; // [l] of the medium
  private final double[] thicknessNm; // [l]
  private final double[] sine; // [w] of half the angle
  private final double[] cosine;

  private final int wavelengths;

  Phases(int layers, int wavelengths) {
    this.wavelengths = wavelengths;
    size = new double[layers][wavelengths];
    re = new double[layers][wavelengths];
    im = new double[layers][wavelengths];
    version = new long[layers];
    thicknessNm = new double[layers];
    sine = new double[wavelengths];
    cosine = new double[wavelengths];
  }

  /** Makes the phase factors of all layers of a layout right. */
  void refresh(Layout layout, MediumRows media) {
    for (int j = 1; j <= layout.layerCount; j++) {
      int l = layout.layer[j];
      int x = media.place(layout, j);
      double nm = layout.thicknessNm[j];
      if (version[l] != media.version[x] || thicknessNm[l] != nm) {
        if (media.lossless[x]) {
          Arrays.fill(size[l], 1); // what decay would find
        } else {
          decay(media.decayPerNm[x], nm, size[l], wavelengths);
        }
        if (layout.coherent[j]) {
          halfAngle(media.turnsPerNm[x], nm, sine, cosine, wavelengths);
          imaginary(sine, cosine, size[l], im[l], wavelengths);
          real(sine, size[l], re[l], wavelengths);
        }
        version[l] = media.version[x];
        thicknessNm[l] = nm;
      }
    }
  }

  /** exp of an exponent given in parts: expm1 of one part, doubled five times, squared twice. */
  private static void decay(double[] decayPerNm, double nm, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = Math.max(decayPerNm[w] * nm, LEAST_EXPONENT);
    }
    for (int w = 0; w < count; w++) {
      double x = out[w];
      double m = 2.3559261160148413e-06 * x + 2.4546395978170872e-05;
      m = m * x + 0.00019832360917346924;
      m = m * x + 0.001388870657726418;
      m = m * x + 0.008333331135328286;
      m = m * x + 0.04166666651754685;
      m = m * x + 0.16666666666159283;
      m = m * x + 0.4999999999999335;
      m = m * x + 0.9999999999999999;
      out[w] = m * x;
    }
    for (int w = 0; w < count; w++) {
      double m = out[w];
      m = m * (m + 2);
      m = m * (m + 2);
      m = m * (m + 2);
      m = m * (m + 2);
      m = m * (m + 2);
      m = m + 1;
      m = m * m;
      out[w] = m * m;
    }
  }

  /** Sine and cosine of half the angle, from those of its quarter. */
  private static void halfAngle(
      double[] turnsPerNm, double nm, double[] sine, double[] cosine, int count) {
    for (int w = 0; w < count; w++) {
      double turns = turnsPerNm[w] * nm;
      cosine[w] = turns - Math.rint(turns);
    }
    for (int w = 0; w < count; w++) {
      double x = cosine[w];
      double y = x * x;
      double s = 5.633933781537854e-08 * y - 3.59864335298231e-06;
      s = s * y + 0.0001604411507421909;
      s = s * y - 0.004681754132340976;
      s = s * y + 0.07969262624604301;
      s = s * y - 0.6459640975062443;
      sine[w] = (s * y + 1.5707963267948966) * x;
    }
    for (int w = 0; w < count; w++) {
      double s = sine[w];
      double y = cosine[w] * cosine[w];
      double c = 4.6552961874867623e-07 * y - 2.520013526428479e-05;
      c = c * y + 0.000919259950041661;
      c = c * y - 0.02086348073494657;
      c = c * y + 0.25366950789986475;
      c = c * y - 1.2337005501361513;
      c = c * y + 1;
      sine[w] = 2 * s * c;
      cosine[w] = 1 - 2 * s * s;
    }
  }

  private static void imaginary(
      double[] sine, double[] cosine, double[] size, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = size[w] * (2 * sine[w] * cosine[w]);
    }
  }

  private static void real(double[] sine, double[] size, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = size[w] * (1 - 2 * sine[w] * sine[w]);
    }
  }
}
