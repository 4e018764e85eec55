package evensun.search;

import evensun.search.problem.Individual;
import evensun.search.problem.Space;
import java.util.ArrayList;
import java.util.List;

/**
 * Where a front has gaps: between the designs that are neighbours in their aims but far apart. Two
 * designs are neighbours when no third lies in the ball that has them at its ends (Gabriel and
 * Sokal, Syst. Zool. 18, 259 (1969)); on a front of two aims those are the designs next to one
 * another.
 */
final class FrontGaps {

  private final Space space;
  private final List<double[]> genes = new ArrayList<>();
  private final List<double[]> aims = new ArrayList<>();

  /** The gaps of a front. */
  FrontGaps(Space space, List<Individual> front) {
    this.space = space;
    front.forEach(design -> genes.add(design.geneArray()));
    aims.addAll(List.of(Front.scaledAims(front)));
  }

  /**
   * Genes halfway across the widest gaps. A design that is not judged yet stands in with its aims
   * halfway as well, so that a wide gap is filled in several places.
   *
   * @param most how many at most
   */
  List<double[]> filled(int most) {
    List<double[]> middles = new ArrayList<>();
    while (middles.size() < most) {
      int[] widest = widest();
      if (widest[1] < 0) {
        break;
      }
      double[] middle = middle(genes.get(widest[0]), genes.get(widest[1]));
      for (int i = 0; i < middle.length; i++) {
        if (space.isChoice(i)) { // there is nothing between alternatives: one of the two
          middle[i] = genes.get(widest[middles.size() % 2])[i];
        }
      }
      middles.add(middle);
      genes.add(middle);
      aims.add(middle(aims.get(widest[0]), aims.get(widest[1])));
    }
    return middles;
  }

  private int[] widest() {
    int[] widest = {-1, -1};
    double most = 0;
    for (int a = 0; a < aims.size(); a++) {
      for (int b = a + 1; b < aims.size(); b++) {
        double gap = distance(aims.get(a), aims.get(b));
        if (gap > most && areNeighbours(a, b)) {
          most = gap;
          widest = new int[] {a, b};
        }
      }
    }
    return widest;
  }

  private static double distance(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += Math.abs(a[i] - b[i]);
    }
    return sum;
  }

  private boolean areNeighbours(int a, int b) {
    for (int c = 0; c < aims.size(); c++) {
      if (c != a && c != b && seesUnderWideAngle(aims.get(c), aims.get(a), aims.get(b))) {
        return false;
      }
    }
    return true;
  }

  /**
   * Whether a point lies in the ball over two others, from where they stand more than 90° apart.
   */
  private static boolean seesUnderWideAngle(double[] point, double[] a, double[] b) {
    double product = 0;
    for (int i = 0; i < point.length; i++) {
      product += (a[i] - point[i]) * (b[i] - point[i]);
    }
    return product < 0;
  }

  private static double[] middle(double[] a, double[] b) {
    double[] middle = new double[a.length];
    for (int i = 0; i < a.length; i++) {
      middle[i] = (a[i] + b[i]) / 2;
    }
    return middle;
  }
}
