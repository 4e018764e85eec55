package evensun.material;

import java.util.ArrayList;
import java.util.Arrays;
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

  /** Curves between the shapes of these names, by rising gap. */
  static MovedEdge load(List<String> names) {
    List<EdgeShape> anchors = new ArrayList<>();
    for (String name : names) {
      anchors.add(EdgeShape.load(name));
    }
    return new MovedEdge(anchors);
  }

  @Override
  public void fill(double gapEv, double[] energyEv, double[] n, double[] k) {
    int lower = lower(gapEv);
    EdgeShape a = anchors.get(lower);
    EdgeShape b = anchors.get(Math.min(lower + 1, anchors.size() - 1));
    double share = share(a, b, gapEv);
    Arrays.fill(n, 0);
    Arrays.fill(k, 0);
    a.add(gapEv - a.bandgapEv(), 1 - share, energyEv, n, k);
    if (share > 0) {
      b.add(gapEv - b.bandgapEv(), share, energyEv, n, k);
    }
    for (int w = 0; w < energyEv.length; w++) {
      double modulus = Math.sqrt(n[w] * n[w] + k[w] * k[w]);
      n[w] = Math.sqrt(0.5 * (modulus + n[w]));
      k[w] = 0.5 * k[w] / n[w];
    }
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
