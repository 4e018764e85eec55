package evensun.raytrace;

import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.IdealShare;
import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.Services;

/** The coatings of all boundaries at the angles that occur. Owned by one thread. */
final class Coatings implements AutoCloseable {

  /** [w][4 · node + quantity] R and T of all tables, with a node to spare at the end. */
  final double[][] coating;

  private final Device device;
  private final Angles angles;
  private final CoatingTable[] tables; // null where a boundary is ideal

  Coatings(Problem problem, Device device, Angles angles, Services services) {
    this.device = device;
    this.angles = angles;
    coating = new double[problem.wavelengthCount()][Weighing.PER_NODE * (angles.count() + 1)];
    tables = new CoatingTable[angles.tables().size()];
    for (int t = 0; t < tables.length; t++) {
      Angles.Table table = angles.tables().get(t);
      tables[t] = boundary(t).isIdeal() ? null : new CoatingTable(problem, device, table, services);
    }
  }

  private Device.Boundary boundary(int table) {
    return device.boundaries().get(angles.tables().get(table).boundary());
  }

  /** Fills the tables for a design. */
  void refresh(Design design) {
    for (int t = 0; t < tables.length; t++) {
      if (tables[t] == null) {
        fillIdeal(design, angles.tables().get(t));
      } else {
        tables[t].refresh(design, coating);
      }
    }
  }

  /**
   * Keeps the light of one wavelength that met films.
   *
   * @param met [2 · node + polarisation] of all tables
   */
  void keep(int w, double[] met) {
    for (CoatingTable table : tables) {
      if (table != null) {
        table.keep(w, met);
      }
    }
  }

  /**
   * Adds what stays in films of the light that was kept at every wavelength.
   *
   * @param into [row][w] rows of {@link LitDevice#shares}
   */
  void addStaying(double[][] into) {
    for (CoatingTable table : tables) {
      if (table != null) {
        table.addStaying(into);
      }
    }
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
