package evensun.material;

import java.util.List;

/**
 * Measured permittivities of one or more anchors, moved along the energy axis to the wanted gap and
 * mixed between neighbours, n following by Kramers–Kronig ({@link EdgeShape}).
 *
 * <p>The share of the upper anchor rises from 0 at the lower anchor's gap to 1 at its own as 3x² −
 * 2x³, so that n and k are smooth in the gap; at an anchor's gap its measured table is met. Beyond
 * the outermost anchors the nearest one is moved alone.
 */
final class MovedEdge implements GapCurves {

  private final List<EdgeShape> anchors;

  MovedEdge(List<EdgeShape> anchors) {
    this.anchors = List.copyOf(anchors);
  }

  @Override
  public void fill(double gapEv, double[] energyEv, double[] n, double[] k) {
    int lower = lower(gapEv);
    EdgeShape a = anchors.get(lower);
    EdgeShape b = anchors.get(Math.min(lower + 1, anchors.size() - 1));
    double share = share(a, b, gapEv);
    for (int w = 0; w < energyEv.length; w++) {
      double real = real(a, gapEv, energyEv[w]);
      double imaginary = imaginary(a, gapEv, energyEv[w]);
      if (share > 0) {
        real += share * (real(b, gapEv, energyEv[w]) - real);
        imaginary += share * (imaginary(b, gapEv, energyEv[w]) - imaginary);
      }
      double modulus = Math.sqrt(real * real + imaginary * imaginary);
      n[w] = Math.sqrt(0.5 * (modulus + real));
      k[w] = 0.5 * imaginary / n[w];
    }
  }

  private static double real(EdgeShape shape, double gapEv, double ev) {
    double shift = gapEv - shape.bandgapEv();
    return shape.resonantAt(ev - shift) + shape.antiresonantAt(ev + shift);
  }

  private static double imaginary(EdgeShape shape, double gapEv, double ev) {
    return shape.imaginaryAt(ev - (gapEv - shape.bandgapEv()));
  }

  private int lower(double gapEv) {
    int lower = 0;
    while (lower + 1 < anchors.size() && anchors.get(lower + 1).bandgapEv() <= gapEv) {
      lower++;
    }
    return lower;
  }

  private static double share(EdgeShape a, EdgeShape b, double gapEv) {
    double width = b.bandgapEv() - a.bandgapEv();
    double x = width > 0 ? (gapEv - a.bandgapEv()) / width : 0;
    double inside = Math.min(Math.max(x, 0), 1);
    return inside * inside * (3 - 2 * inside);
  }
}
