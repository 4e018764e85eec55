package evensun.raytrace;

import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.IdealShare;
import evensun.raytrace.trace.SectionTracer;
import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.Services;

/** Coatings at one wavelength, asked one angle at a time: for drawings, not for searches. */
final class FacetOptics implements SectionTracer.Optics {

  private final Problem problem;
  private final Device device;
  private final Design design;
  private final Services services;
  private final int wavelength;

  FacetOptics(Problem problem, Device device, Design design, Services services, int wavelength) {
    this.problem = problem;
    this.device = device;
    this.design = design;
    this.services = services;
    this.wavelength = wavelength;
  }

  @Override
  public double[] at(int boundary, boolean fromBelow, double cosine) {
    if (device.boundaries().get(boundary).isIdeal()) {
      double outside = design.n[device.material(design, 0)][wavelength];
      double inside = design.n[device.material(design, 1)][wavelength];
      double leaving = IdealShare.leaving(outside, inside);
      double reflected = boundary > 0 ? 1 : fromBelow ? 1 - leaving : 0;
      return new double[] {reflected, reflected, 1 - reflected, 1 - reflected};
    }
    double[] angle = {Math.max(1e-4, cosine)};
    Angles.Table table = new Angles.Table(boundary, fromBelow, angle, 0, new int[] {wavelength});
    double[][] found = new double[wavelength + 1][];
    found[wavelength] = new double[Weighing.PER_NODE];
    try (CoatingTable coating = new CoatingTable(problem, device, table, services)) {
      coating.refresh(design, found);
    }
    return found[wavelength];
  }
}
