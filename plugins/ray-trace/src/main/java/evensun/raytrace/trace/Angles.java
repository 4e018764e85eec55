package evensun.raytrace.trace;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.kernel.Nodes;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;

/**
 * Angles at which coatings are tabulated, one table per boundary and side.
 *
 * <p>Where few angles occur, as on regular arrays in light from one direction, they are tabulated
 * as they are. Elsewhere tables are linear between nodes in the cosine, dense about the critical
 * angle.
 *
 * @param cosines [table] nodes, increasing
 * @param first [table] place of the first node among the nodes of all tables
 * @param lit [table] wavelengths at which light comes to it, increasing
 * @param nodes [w] where meetings look up
 */
public record Angles(List<double[]> cosines, int[] first, List<int[]> lit, List<Nodes> nodes) {

  private static final int MOST_EXACT = 16;
  private static final double SAME = 1e-9;

  /** Nodes where there is no critical angle. */
  private static final int PLAIN_NODES = 24;

  /** Nodes beyond the critical angle. */
  private static final int TOTAL_NODES = 14;

  /** Nodes between the normal and the critical angle. */
  private static final int CONE_NODES = 12;

  private static final double CRITICAL_STEP = 8e-4;
  private static final int MOST_CRITICAL = 24;

  /** Least cosine asked for: light along the surface is reflected. */
  private static final double LEAST_COSINE = 1e-4;

  static Angles of(List<Face> faces, Media media, List<LightTree> trees) {
    int tables = 2 * faces.size();
    List<double[]> cosines = new ArrayList<>();
    List<int[]> lit = new ArrayList<>();
    int[] first = new int[tables + 1];
    for (int t = 0; t < tables; t++) {
      int[] wavelengths = lit(trees, t);
      boolean ideal = faces.get(t / 2).ideal();
      double[] grid =
          ideal || wavelengths.length == 0 ? new double[] {1} : grid(media, trees, t, wavelengths);
      cosines.add(grid);
      lit.add(wavelengths);
      first[t + 1] = first[t] + grid.length;
    }
    List<Nodes> nodes = trees.stream().map(tree -> lookUp(tree, cosines, first)).toList();
    return new Angles(cosines, first, lit, nodes);
  }

  /** Number of nodes of all tables. */
  public int count() {
    return first[first.length - 1];
  }

  private static int[] lit(List<LightTree> trees, int table) {
    List<Integer> found = new ArrayList<>();
    for (int w = 0; w < trees.size(); w++) {
      LightTree tree = trees.get(w);
      boolean any = false;
      for (int e = 0; e < tree.count && !any; e++) {
        any = tree.table[e] == table;
      }
      if (any) {
        found.add(w);
      }
    }
    return found.stream().mapToInt(Integer::intValue).toArray();
  }

  private static double[] grid(Media media, List<LightTree> trees, int table, int[] wavelengths) {
    TreeSet<Double> met = new TreeSet<>();
    for (int w : wavelengths) {
      LightTree tree = trees.get(w);
      for (int e = 0; e < tree.count; e++) {
        if (tree.table[e] == table && isNew(met, tree.cosine[e]) && met.size() > MOST_EXACT) {
          return between(media, table, wavelengths);
        }
      }
    }
    return met.stream().mapToDouble(c -> Math.max(c, LEAST_COSINE)).toArray();
  }

  private static boolean isNew(TreeSet<Double> met, double cosine) {
    Double near = met.floor(cosine + SAME);
    return (near == null || near < cosine - SAME) && met.add(cosine);
  }

  /** Nodes for all angles. */
  private static double[] between(Media media, int table, int[] wavelengths) {
    int from = table / 2 + (table % 2);
    int to = table / 2 + 1 - (table % 2);
    double low = 1;
    double high = 0;
    for (int w : wavelengths) {
      double sine = media.n()[to][w] / media.n()[from][w];
      boolean clear = sine < 1 && media.k()[to][w] < 0.1;
      double critical = clear ? Math.sqrt(1 - sine * sine) : 0;
      low = Math.min(low, critical);
      high = Math.max(high, critical);
    }
    double[] nodes = high == 0 ? plain() : critical(low, high);
    return Arrays.stream(nodes).map(c -> Math.max(c, LEAST_COSINE)).sorted().distinct().toArray();
  }

  private static double[] plain() {
    double[] nodes = new double[PLAIN_NODES];
    for (int i = 0; i < PLAIN_NODES; i++) {
      nodes[i] = Math.pow((double) i / (PLAIN_NODES - 1), 1.25);
    }
    return nodes;
  }

  private static double[] critical(double low, double high) {
    int between = (int) Math.ceil((high - low) / CRITICAL_STEP) + 1;
    between = Math.max(2, Math.min(MOST_CRITICAL, between));
    double[] nodes = new double[TOTAL_NODES + between + CONE_NODES];
    int at = 0;
    for (int i = 0; i < TOTAL_NODES; i++) {
      double left = 1 - (double) i / TOTAL_NODES;
      nodes[at++] = low * (1 - Math.pow(left, 1.5));
    }
    for (int i = 0; i < between; i++) {
      nodes[at++] = low + (high - low) * i / (between - 1);
    }
    for (int i = 1; i <= CONE_NODES; i++) {
      double u = (double) i / CONE_NODES;
      nodes[at++] = high + (1 - high) * u * u;
    }
    return nodes;
  }

  private static Nodes lookUp(LightTree tree, List<double[]> cosines, int[] first) {
    int[] index = new int[tree.count];
    double[] share = new double[tree.count];
    for (int e = 0; e < tree.count; e++) {
      double[] grid = cosines.get(tree.table[e]);
      double cosine = Math.max(grid[0], tree.cosine[e]);
      int place = Arrays.binarySearch(grid, cosine + SAME);
      int node = Math.max(0, place >= 0 ? place : -place - 2);
      double past = cosine - grid[node];
      boolean exact = node + 1 >= grid.length || Math.abs(past) <= 2 * SAME;
      share[e] = exact ? 0 : past / (grid[node + 1] - grid[node]);
      index[e] = first[tree.table[e]] + node;
    }
    return new Nodes(index, share);
  }
}
