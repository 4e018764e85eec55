package evensun.raytrace;

import evensun.raytrace.geometry.Relief;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.raytrace.trace.SectionTracer;
import evensun.raytrace.trace.SectionTracer.Piece;
import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.RaySection.Outline;
import evensun.spi.RaySection.Path;
import evensun.spi.RaySection.View;
import evensun.spi.Samples;
import evensun.spi.Services;
import java.util.ArrayList;
import java.util.List;

/** A vertical section along x through a device, with a few rays. */
final class Section {

  /** Width of a section where nothing repeats, against the depth of the device. */
  private static final double FLAT_WIDTH = 0.5;

  /** Shapes side by side that make a picture. */
  private static final double SHAPES = 4;

  private static final int POINTS = 256;

  private final Problem problem;
  private final Device device;
  private final List<Face> faces;
  private final Design design;
  private final Services services;

  private Section(
      Problem problem, Device device, List<Face> faces, Design design, Services services) {
    this.problem = problem;
    this.device = device;
    this.faces = faces;
    this.design = design;
    this.services = services;
  }

  static Section of(Problem problem, Traces.Traced traced, Design design, Services services) {
    return new Section(problem, traced.device(), traced.faces(), design, services);
  }

  View view(Beam beam, int w, int rays) {
    int media = device.mediaCount();
    double[] n = new double[media];
    double[] alpha = new double[media];
    double[] plane = new double[media - 1];
    for (int m = 0; m < media; m++) {
      n[m] = design.n[device.material(design, m)][w];
      double k = m == 0 ? 0 : design.k[device.material(design, m)][w];
      alpha[m] = 4 * Math.PI * k * 1000 / problem.wavelengthNm().at(w);
      if (device.isInner(m)) {
        plane[m] = plane[m - 1] - device.thicknessUm(design, m);
      }
    }
    double width = width(-plane[media - 2]);
    double margin = margin(-plane[media - 2]);
    FacetOptics optics = new FacetOptics(problem, device, design, services, w);
    SectionTracer tracer = new SectionTracer(faces, plane, n, alpha, margin, optics);
    List<Path> paths = new ArrayList<>();
    for (Piece piece : tracer.trace(beam, rays, width, yUm())) {
      paths.add(
          new Path(
              piece.ray(),
              piece.startX(),
              -piece.startZ(),
              piece.endX(),
              -piece.endZ(),
              Math.min(1, piece.start()),
              Math.min(1, piece.end())));
    }
    return new View(outlines(plane, width), paths);
  }

  /** A whole number of periods of the boundary that repeats slowest. */
  private double width(double depthUm) {
    double period = 0;
    double feature = 0;
    for (Face face : faces) {
      if (face.relief().isPresent() && face.relief().get().periodXUm() > period) {
        period = face.relief().get().periodXUm();
        feature = face.relief().get().featureUm();
      }
    }
    if (period == 0) {
      return Math.max(1, FLAT_WIDTH * depthUm);
    }
    return period * Math.max(1, Math.ceil(SHAPES * feature / period));
  }

  private double margin(double depthUm) {
    double tallest = 0;
    for (Face face : faces) {
      tallest = Math.max(tallest, face.aboveMeanUm() + face.belowMeanUm());
    }
    return tallest > 0 ? 1.5 * tallest : Math.max(1, 0.1 * depthUm);
  }

  /** Nearly through the middle of the shapes of the first relief. */
  private double yUm() {
    return faces.stream()
        .flatMap(face -> face.relief().stream())
        .findFirst()
        .map(relief -> 0.4999 * relief.periodYUm())
        .orElse(0.0);
  }

  private List<Outline> outlines(double[] planeUm, double width) {
    List<Outline> outlines = new ArrayList<>();
    for (int b = 0; b < faces.size(); b++) {
      Relief relief = faces.get(b).relief().orElse(null);
      int points = relief == null ? 1 : POINTS;
      double[] x = new double[points + 1];
      double[] z = new double[points + 1];
      for (int i = 0; i <= points; i++) {
        x[i] = width * i / points;
        z[i] = -planeUm[b];
        if (relief != null) {
          z[i] -= relief.heightUm(x[i], yUm()) - relief.meanUm();
        }
      }
      outlines.add(
          new Outline(device.plainName(b), device.plainName(b + 1), Samples.of(x), Samples.of(z)));
    }
    return outlines;
  }
}
