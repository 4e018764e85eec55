package evensun.raytrace;

import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.IdealShare;
import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.Services;
import java.util.ArrayList;
import java.util.List;

/** The coatings of all boundaries at the angles that occur. Owned by one thread. */
final class Coatings implements AutoCloseable {

  /** [w][4 · node + quantity] R and T of all tables, with a node to spare at the end. */
  final double[][] coating;

  /**
   * [table][w][(2 · node + polarisation) · (films + 1) + film] absorptance; after the films what
   * the medium gets that the light comes from.
   */
  final double[][][] absorbed;

  private final Device device;
  private final Angles angles;
  private final List<CoatingTable> tables = new ArrayList<>(); // null where a boundary is ideal
  private final List<CoatingTable.Target> targets = new ArrayList<>();

  Coatings(Problem problem, Device device, Angles angles, Services services) {
    this.device = device;
    this.angles = angles;
    int wavelengths = problem.wavelengthCount();
    coating = new double[wavelengths][Weighing.PER_NODE * (angles.count() + 1)];
    absorbed = new double[angles.tables().size()][][];
    for (int t = 0; t < absorbed.length; t++) {
      Angles.Table table = angles.tables().get(t);
      Device.Boundary boundary = boundary(t);
      absorbed[t] =
          new double[wavelengths][2 * table.cosines().length * (boundary.films().size() + 1)];
      targets.add(target(t));
      tables.add(boundary.isIdeal() ? null : new CoatingTable(problem, device, table, services));
    }
  }

  private Device.Boundary boundary(int table) {
    return device.boundaries().get(angles.tables().get(table).boundary());
  }

  /** Fills the tables for a design. */
  void refresh(Design design) {
    for (int t = 0; t < absorbed.length; t++) {
      if (boundary(t).isIdeal()) {
        fillIdeal(design, angles.tables().get(t));
      } else {
        tables.get(t).refresh(design, targets.get(t));
      }
    }
  }

  private CoatingTable.Target target(int table) {
    int rows = boundary(table).films().size() + 1;
    int first = angles.tables().get(table).first();
    return new CoatingTable.Target() {
      @Override
      public void coating(int node, int w, int quantity, double value) {
        coating[w][Weighing.PER_NODE * (first + node) + quantity] = value;
      }

      @Override
      public void film(int node, int w, int film, int polarisation, double value) {
        absorbed[table][w][(2 * node + polarisation) * rows + film] = value;
      }
    };
  }

  private void fillIdeal(Design design, Angles.Table table) {
    int outside = device.material(design, 0);
    int inside = device.material(design, 1);
    boolean back = table.boundary() > 0;
    for (int w = 0; w < coating.length; w++) {
      double leaving = IdealShare.leaving(design.n[outside][w], design.n[inside][w]);
      double reflected = back ? 1 : table.fromBelow() ? 1 - leaving : 0;
      int at = Weighing.PER_NODE * table.first();
      for (int polarisation = 0; polarisation < 2; polarisation++) {
        coating[w][at + polarisation] = reflected;
        coating[w][at + 2 + polarisation] = 1 - reflected;
      }
    }
  }

  @Override
  public void close() {
    for (CoatingTable table : tables) {
      if (table != null) {
        table.close();
      }
    }
  }
}
