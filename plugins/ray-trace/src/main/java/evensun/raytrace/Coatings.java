package evensun.raytrace;

import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.IdealShare;
import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.Services;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.List;

/** The coatings of all boundaries at the angles that occur. Owned by one thread. */
final class Coatings implements AutoCloseable {

  /** [w][4 · node + quantity] R and T of all tables, with a node to spare at the end. */
  final double[][] coating;

  /** [table][film][w][2 · node + polarisation] absorptance; after the films what a medium gets. */
  final double[][][][] absorbed;

  private final Device device;
  private final Angles angles;
  private final List<CoatingTable> tables = new ArrayList<>(); // null where a boundary is ideal

  Coatings(Problem problem, Device device, Angles angles, Services services) {
    this.device = device;
    this.angles = angles;
    int wavelengths = problem.wavelengthCount();
    coating = new double[wavelengths][Weighing.PER_NODE * (angles.count() + 1)];
    absorbed = new double[2 * device.boundaries().size()][][][];
    for (int t = 0; t < absorbed.length; t++) {
      Device.Boundary boundary = device.boundaries().get(t / 2);
      double[] cosines = angles.cosines().get(t);
      absorbed[t] = new double[boundary.films().size() + 1][wavelengths][2 * cosines.length];
      boolean asked = !boundary.isIdeal() && angles.lit().get(t).length > 0;
      tables.add(
          asked
              ? new CoatingTable(
                  problem, device, t / 2, side(t), cosines, angles.lit().get(t), services)
              : null);
    }
  }

  private static Side side(int table) {
    return table % 2 == 0 ? Side.FRONT : Side.REAR;
  }

  /** Fills the tables for a design. */
  void refresh(Design design) {
    for (int t = 0; t < absorbed.length; t++) {
      if (device.boundaries().get(t / 2).isIdeal()) {
        fillIdeal(design, t);
      } else if (tables.get(t) != null) {
        tables.get(t).refresh(design, target(t));
      }
    }
  }

  private CoatingTable.Target target(int table) {
    return new CoatingTable.Target() {
      @Override
      public void coating(int node, int w, int quantity, double value) {
        coating[w][Weighing.PER_NODE * (angles.first()[table] + node) + quantity] = value;
      }

      @Override
      public void film(int node, int w, int film, int polarisation, double value) {
        absorbed[table][film][w][2 * node + polarisation] = value;
      }
    };
  }

  private void fillIdeal(Design design, int table) {
    int outside = device.material(design, 0);
    int inside = device.material(design, 1);
    boolean back = table / 2 > 0;
    for (int w = 0; w < coating.length; w++) {
      double leaving = IdealShare.leaving(design.n[outside][w], design.n[inside][w]);
      double reflected = back ? 1 : table % 2 == 0 ? 0 : 1 - leaving;
      int at = Weighing.PER_NODE * angles.first()[table];
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
