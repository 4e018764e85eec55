package evensun.report.gaps;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Lines of equal value on a mesh by marching squares, each cell parted along both diagonals' centre
 * so that no case is ambiguous. Cells with a missing corner are left out.
 */
final class Contours {

  /** A piece of a line, in units of the mesh: column, row, column, row. */
  record Piece(double x1, double y1, double x2, double y2) {}

  private final List<List<@Nullable Double>> rows;

  /** Values as [row][column]. */
  Contours(List<List<@Nullable Double>> rows) {
    this.rows = rows;
  }

  /** The pieces of the line of a level. */
  List<Piece> at(double level) {
    List<Piece> pieces = new ArrayList<>();
    for (int r = 0; r + 1 < rows.size(); r++) {
      for (int c = 0; c + 1 < rows.get(r).size(); c++) {
        cell(r, c, level, pieces);
      }
    }
    return pieces;
  }

  private void cell(int r, int c, double level, List<Piece> pieces) {
    Double a = rows.get(r).get(c);
    Double b = rows.get(r).get(c + 1);
    Double d = rows.get(r + 1).get(c + 1);
    Double e = rows.get(r + 1).get(c);
    if (a == null || b == null || d == null || e == null) {
      return;
    }
    double low = Math.min(Math.min(a, b), Math.min(d, e));
    double high = Math.max(Math.max(a, b), Math.max(d, e));
    if (level < low || level > high) {
      return;
    }
    double[][] corner = {{c, r, a}, {c + 1, r, b}, {c + 1, r + 1, d}, {c, r + 1, e}};
    double[] centre = {c + 0.5, r + 0.5, 0.25 * (a + b + d + e)};
    for (int i = 0; i < 4; i++) {
      triangle(corner[i], corner[(i + 1) % 4], centre, level, pieces);
    }
  }

  private static void triangle(
      double[] p, double[] q, double[] s, double level, List<Piece> pieces) {
    List<double[]> ends = new ArrayList<>();
    cross(p, q, level, ends);
    cross(q, s, level, ends);
    cross(s, p, level, ends);
    if (ends.size() == 2) {
      double[] from = ends.get(0);
      double[] to = ends.get(1);
      pieces.add(new Piece(from[0], from[1], to[0], to[1]));
    }
  }

  private static void cross(double[] p, double[] q, double level, List<double[]> ends) {
    if (p[2] < level != q[2] < level) {
      double t = (level - p[2]) / (q[2] - p[2]);
      ends.add(new double[] {p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1])});
    }
  }
}
