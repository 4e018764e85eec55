package evensun.raytrace.trace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Chooses the angles of a table, and looks up in it.
 *
 * <p>Where few angles occur, as on regular arrays in light from one direction, they are tabulated
 * as they are. Elsewhere tables are linear between nodes. Inside a denser medium the variable is
 * the cosine that the light has, or would have, beyond the boundary: in it, nothing has a root at
 * the critical angle.
 */
final class AngleNodes {

  /** Cosines closer than this are one. */
  static final double SAME = 1e-9;

  private static final int MOST_EXACT = 16;

  /**
   * Nodes even in the tangential index n sin θ, that films feel; in the cosine for light from a
   * thinner medium, that is reflected along the surface.
   */
  private static final int EVEN = 32;

  /** Nodes where the light is. */
  private static final int POPULAR = 14;

  /** Nodes even in the cosine beyond, inside the cone that leads there. */
  private static final int CONE = 10;

  /** Steps from one critical angle to that of another wavelength. */
  private static final int CRITICAL = 5;

  /**
   * Least cosine asked for, in place of the 1e-4 of light from all directions that runs flatter
   * still. Along its surface a medium that absorbs ever so little has its incident and its
   * reflected wave mixed strongly, which between nodes would count for light less flat.
   */
  private static final double LEAST_COSINE = 0.01;

  private final double[] critical; // [lit] cosine, 0 where there is none
  private final double index; // of the medium the light comes from, over that beyond

  /**
   * For light that goes from a medium to another.
   *
   * @param lit wavelengths
   */
  AngleNodes(Media media, int from, int to, int[] lit) {
    critical = new double[lit.length];
    double sum = 0;
    for (int i = 0; i < lit.length; i++) {
      double ratio = media.n()[from][lit[i]] / media.n()[to][lit[i]];
      boolean total = ratio > 1 && media.k()[to][lit[i]] < 0.1;
      critical[i] = total ? Math.sqrt(1 - 1 / (ratio * ratio)) : 0;
      sum += ratio;
    }
    index = sum / lit.length;
  }

  /**
   * The nodes for some meetings.
   *
   * @param met cosines, sorted, at least one
   * @param little whether so little light comes that few nodes do
   */
  double[] choose(double[] met, boolean little) {
    double[] exact = distinct(met);
    if (exact.length <= MOST_EXACT) {
      return exact;
    }
    List<Double> nodes = new ArrayList<>();
    double low = met[0];
    double high = met[met.length - 1];
    int sparing = little ? 4 : 1;
    addSpread(met, low, high, sparing, nodes);
    addCone(sparing, nodes);
    return distinct(
        nodes.stream()
            .filter(c -> c >= low && c <= high)
            .mapToDouble(Double::doubleValue)
            .sorted()
            .toArray());
  }

  private void addSpread(double[] met, double low, double high, int sparing, List<Double> into) {
    into.add(low);
    into.add(high);
    double least = Math.sqrt(1 - high * high);
    double most = Math.sqrt(1 - low * low);
    int even = EVEN / sparing;
    for (int i = 0; i <= even; i++) {
      double sine = least + (most - least) * i / even;
      into.add(index < 1 ? low + (high - low) * i / even : Math.sqrt(1 - sine * sine));
    }
    int popular = POPULAR / sparing;
    for (int i = 0; i <= popular; i++) {
      into.add(met[(int) ((met.length - 1L) * i / popular)]);
    }
  }

  /** Nodes about the critical angle and within the cone it bounds. */
  private void addCone(int sparing, List<Double> into) {
    double low = Arrays.stream(critical).min().orElse(0);
    double high = Arrays.stream(critical).max().orElse(0);
    if (high == 0) {
      return;
    }
    int steps = (CRITICAL + sparing - 1) / sparing;
    for (int i = 0; i <= steps; i++) {
      into.add(low + (high - low) * i / steps);
    }
    int cone = CONE / sparing;
    for (int i = 1; i <= cone; i++) {
      double beyond = (double) i / cone;
      into.add(Math.sqrt(1 - (1 - beyond * beyond) / (index * index)));
    }
  }

  private static double[] distinct(double[] sorted) {
    double[] found = new double[sorted.length];
    int count = 0;
    for (double cosine : sorted) {
      double value = Math.max(LEAST_COSINE, cosine);
      if (count == 0 || value > found[count - 1] + SAME) {
        found[count++] = value;
      }
    }
    return Arrays.copyOf(found, count);
  }

  /** The lower of two nodes between which a cosine lies. */
  static int lower(double[] nodes, double cosine) {
    int place = Arrays.binarySearch(nodes, cosine + SAME);
    return Math.max(0, place >= 0 ? place : -place - 2);
  }

  /**
   * The weight of the upper of two nodes. Between two nodes on both sides of the critical angle the
   * lower one stands for all angles of total reflection, so that nothing gets through there.
   *
   * @param i index of the wavelength among those of the table
   */
  double share(double[] nodes, int node, double cosine, int i) {
    if (node + 1 >= nodes.length || cosine <= nodes[node] + 2 * SAME) {
      return 0;
    }
    double border = critical[i];
    double low = nodes[node];
    double high = nodes[node + 1];
    if (border == 0) {
      return (cosine - low) / (high - low);
    }
    if (low <= border && border < high) {
      return cosine <= border ? 0 : root(cosine, border) / root(high, border);
    }
    return (root(cosine, border) - root(low, border)) / (root(high, border) - root(low, border));
  }

  /** In proportion to the cosine beyond the boundary; negative where that is imaginary. */
  private static double root(double cosine, double border) {
    double square = cosine * cosine - border * border;
    return Math.copySign(Math.sqrt(Math.abs(square)), square);
  }
}
