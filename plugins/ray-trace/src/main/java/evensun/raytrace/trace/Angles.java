package evensun.raytrace.trace;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.kernel.Nodes;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Angles at which coatings are tabulated, in tables for a side of a boundary and some wavelengths,
 * and where meetings look up in them.
 *
 * @param tables all tables
 * @param nodes [w] where meetings look up
 * @param count number of nodes of all tables
 * @param freshBoundary the boundary that light from outside comes to first
 */
public record Angles(List<Table> tables, List<Nodes> nodes, int count, int freshBoundary) {

  /** Wavelengths with less than this share of the most meetings of a ray share another table. */
  private static final double SPARSE = 0.1;

  /**
   * A table.
   *
   * @param boundary index of the boundary
   * @param fromBelow whether light comes from below
   * @param cosines nodes, increasing
   * @param first place of its first node among the nodes of all tables
   * @param lit wavelengths of the table, increasing
   */
  public record Table(int boundary, boolean fromBelow, double[] cosines, int first, int[] lit) {}

  static Angles of(List<Face> faces, Media media, Beam beam, List<LightTree> trees) {
    Maker maker = new Maker(media, trees);
    int kinds = 2 * faces.size();
    for (int kind = 0; kind <= kinds; kind++) {
      int fresh = beam.side() == Side.FRONT ? 0 : kinds - 1;
      int like = kind == kinds ? fresh : kind;
      maker.add(kind, like / 2, like % 2 == 1, faces.get(like / 2).ideal());
    }
    return maker.make(beam.side() == Side.FRONT ? 0 : faces.size() - 1);
  }

  /** Collects tables. */
  private static final class Maker {

    private final Media media;
    private final List<LightTree> trees;
    private final List<Table> tables = new ArrayList<>();
    private final List<Nodes> nodes = new ArrayList<>();
    private int count;

    Maker(Media media, List<LightTree> trees) {
      this.media = media;
      this.trees = trees;
      for (LightTree tree : trees) {
        nodes.add(new Nodes(new int[tree.count], new float[tree.count]));
      }
    }

    void add(int kind, int boundary, boolean fromBelow, boolean ideal) {
      double[] meetings = new double[trees.size()]; // of one ray
      double most = 0;
      for (int w = 0; w < meetings.length; w++) {
        for (byte met : trees.get(w).table) {
          meetings[w] += met == kind ? 1.0 / trees.get(w).rays : 0;
        }
        most = Math.max(most, meetings[w]);
      }
      double border = SPARSE * most;
      int[] dense = wavelengths(meetings, Math.max(Double.MIN_VALUE, border), Double.MAX_VALUE);
      int[] sparse = wavelengths(meetings, Double.MIN_VALUE, border);
      for (int[] lit : List.of(dense, sparse)) {
        if (lit.length > 0) {
          AngleNodes chooser = chooser(boundary, fromBelow, lit);
          double[] cosines =
              ideal ? new double[] {1} : chooser.choose(met(kind, lit), lit == sparse);
          add(kind, new Table(boundary, fromBelow, cosines, count, lit), chooser);
        }
      }
    }

    private static int[] wavelengths(double[] meetings, double least, double below) {
      List<Integer> found = new ArrayList<>();
      for (int w = 0; w < meetings.length; w++) {
        if (meetings[w] >= least && meetings[w] < below) {
          found.add(w);
        }
      }
      return found.stream().mapToInt(Integer::intValue).toArray();
    }

    private AngleNodes chooser(int boundary, boolean fromBelow, int[] lit) {
      int upper = fromBelow ? 1 : 0;
      return new AngleNodes(media, boundary + upper, boundary + 1 - upper, lit);
    }

    private double[] met(int kind, int[] lit) {
      return Arrays.stream(lit)
          .mapToObj(w -> met(trees.get(w), kind))
          .flatMapToDouble(Arrays::stream)
          .sorted()
          .toArray();
    }

    private static double[] met(LightTree tree, int kind) {
      double[] cosines = new double[tree.count];
      int found = 0;
      for (int e = 0; e < tree.count; e++) {
        if (tree.table[e] == kind) {
          cosines[found++] = tree.cosine[e];
        }
      }
      return Arrays.copyOf(cosines, found);
    }

    private void add(int kind, Table table, AngleNodes chooser) {
      for (int i = 0; i < table.lit().length; i++) {
        int w = table.lit()[i];
        LightTree tree = trees.get(w);
        Nodes into = nodes.get(w);
        for (int e = 0; e < tree.count; e++) {
          if (tree.table[e] == kind) {
            int node = AngleNodes.lower(table.cosines(), tree.cosine[e]);
            into.index[e] = table.first() + node;
            into.share[e] = (float) chooser.share(table.cosines(), node, tree.cosine[e], i);
          }
        }
      }
      tables.add(table);
      count += table.cosines().length;
    }

    Angles make(int freshBoundary) {
      return new Angles(tables, nodes, count, freshBoundary);
    }
  }
}
