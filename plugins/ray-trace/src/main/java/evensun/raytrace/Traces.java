package evensun.raytrace;

import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Media;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Problem;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What rays do, kept for all threads. Rays depend on the shapes, on the indices of the thick media,
 * and, where they are given up, on which power of two the thicknesses of thick layers lie above; on
 * nothing else, and so not on which designs were asked for before.
 */
final class Traces {

  /** Traces kept for later. */
  static final int MOST_KEPT = 16;

  private final Problem problem;
  private final int[] rays; // [w] of each replicate
  private final Map<Key, Traced> kept = new LinkedHashMap<>(16, 0.75f, true);

  /** What decides a trace. */
  private record Key(
      List<Boolean> absent,
      List<Double> knobs,
      List<Long> media,
      List<Integer> octaves,
      Beam beam) {}

  /**
   * A traced beam.
   *
   * @param device the stack without its absent layers
   * @param faces the shapes
   * @param forest what rays do
   */
  record Traced(Device device, List<Face> faces, Forest forest) {}

  Traces(Problem problem, int[] rays) {
    this.problem = problem;
    this.rays = rays.clone();
  }

  /** The trace for a design, found once. */
  Traced of(Design design, Beam beam) {
    boolean[] absent = absent(problem, design);
    Device device = device(absent);
    Key key = key(design, absent, device, beam);
    synchronized (kept) {
      Traced known = kept.get(key);
      if (known != null) {
        return known;
      }
    }
    Traced traced = trace(design, device, beam);
    synchronized (kept) {
      kept.put(key, traced);
      Iterator<Key> oldest = kept.keySet().iterator();
      while (kept.size() > MOST_KEPT && oldest.hasNext()) {
        oldest.next();
        oldest.remove();
      }
    }
    return traced;
  }

  /** [l] whether an incoherent layer has no thickness. */
  static boolean[] absent(Problem problem, Design design) {
    boolean[] absent = new boolean[problem.layerCount()];
    for (int l = 0; l < absent.length; l++) {
      absent[l] = !problem.layers().get(l).coherent() && design.thicknessNm[l] == 0;
    }
    return absent;
  }

  private Device device(boolean[] absent) {
    try {
      return new Device(problem, absent);
    } catch (UnsupportedProblem e) {
      throw new EvaluationFailed(e.getMessage());
    }
  }

  private Key key(Design design, boolean[] absent, Device device, Beam beam) {
    List<Boolean> missing = new ArrayList<>();
    for (boolean a : absent) {
      missing.add(a);
    }
    List<Double> knobs = new ArrayList<>();
    for (Device.Boundary boundary : device.boundaries()) {
      boundary.texture().ifPresent(t -> knobs.add(t.facetAngleDeg().in(design)));
    }
    List<Long> media = new ArrayList<>();
    List<Integer> octaves = new ArrayList<>();
    for (int m = 0; m < device.mediaCount(); m++) {
      media.add(design.revision[device.material(design, m)]);
      octaves.add(Math.getExponent(device.thicknessUm(design, m)));
    }
    return new Key(missing, knobs, media, octaves, beam);
  }

  private Traced trace(Design design, Device device, Beam beam) {
    List<Face> faces = device.faces(design);
    new DesignCheck(problem).checkFit(design, device, faces);
    Forest forest =
        Forest.trace(faces, media(design, device), beam, Options.REPLICATES, rays, problem.seed());
    return new Traced(device, faces, forest);
  }

  private Media media(Design design, Device device) {
    int count = device.mediaCount();
    double[][] n = new double[count][];
    double[][] k = new double[count][];
    double[] leastUm = new double[count];
    for (int m = 0; m < count; m++) {
      n[m] = design.n[device.material(design, m)].clone();
      k[m] = design.k[device.material(design, m)].clone();
      leastUm[m] =
          device.isInner(m) ? Math.scalb(1.0, Math.getExponent(device.thicknessUm(design, m))) : 0;
    }
    double[] um = problem.wavelengthNm().toArray();
    for (int w = 0; w < um.length; w++) {
      um[w] /= 1000;
    }
    return new Media(um, n, k, leastUm);
  }
}
