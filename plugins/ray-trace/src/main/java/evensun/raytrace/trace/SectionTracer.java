package evensun.raytrace.trace;

import evensun.raytrace.geometry.Ray;
import evensun.raytrace.geometry.Relief;
import evensun.spi.Scatter;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/**
 * Follows a few rays at their true places, with the coatings of one design, to be drawn. Both the
 * reflected and the transmitted light is followed while there is enough of it to be seen.
 */
public final class SectionTracer {

  /** Share of a ray that is no longer drawn. */
  private static final double FAINT = 0.02;

  private static final int MOST_PIECES = 60;

  /** What films do with light. */
  public interface Optics {

    /** R of s and p, then T of s and p. */
    double[] at(int boundary, boolean fromBelow, double cosine);
  }

  /**
   * A straight piece, z upwards from the mean plane of the first boundary, in µm.
   *
   * @param ray number of the ray
   */
  public record Piece(
      int ray, double startX, double startZ, double endX, double endZ, double start, double end) {}

  private final List<Face> faces;
  private final double[] planeUm; // [boundary] height of its mean plane
  private final double[] n; // [m]
  private final double[] alphaPerUm; // [m]
  private final double marginUm;
  private final Optics optics;
  private final List<Piece> pieces = new ArrayList<>();
  private final Deque<Walker> open = new ArrayDeque<>();
  private int left;

  /** A leg at its true place. */
  private static final class Walker {
    Leg leg;
    int number;
    double x;
    double y;
    double z;
  }

  /**
   * For a device.
   *
   * @param planeUm [boundary] height of its mean plane, 0 for the first, falling
   * @param n [m] index of the media
   * @param alphaPerUm [m] their absorption coefficient
   * @param marginUm how much is drawn outside
   */
  public SectionTracer(
      List<Face> faces,
      double[] planeUm,
      double[] n,
      double[] alphaPerUm,
      double marginUm,
      Optics optics) {
    this.faces = faces;
    this.planeUm = planeUm.clone();
    this.n = n.clone();
    this.alphaPerUm = alphaPerUm.clone();
    this.marginUm = marginUm;
    this.optics = optics;
  }

  /**
   * Traces rays that meet the mean plane of their first boundary evenly over a width.
   *
   * @param yUm where the section lies
   */
  public List<Piece> trace(Beam beam, int rays, double widthUm, double yUm) {
    for (int i = 0; i < rays; i++) {
      Walker walker = new Walker();
      walker.leg = new Leg();
      walker.leg.point = new double[0];
      walker.leg.key = Draws.mixed(i);
      walker.number = i;
      beam.start(walker.leg, faces.size());
      Leg leg = walker.leg;
      double edge = edge(leg.face, leg.above);
      double off = marginUm / Math.abs(leg.ray.dz);
      walker.x = (i + 0.5) / rays * widthUm - off * leg.ray.dx;
      walker.y = yUm - off * leg.ray.dy;
      walker.z = edge - off * leg.ray.dz;
      left = MOST_PIECES;
      if (moves(walker, off)) {
        open.push(walker);
      }
      while (!open.isEmpty()) {
        meet(open.pop());
      }
    }
    return pieces;
  }

  /** Height at which a boundary begins for light from one side. */
  private double edge(int face, boolean above) {
    Face shape = faces.get(face);
    return planeUm[face] + (above ? shape.aboveMeanUm() : -shape.belowMeanUm());
  }

  /** Moves to the edge of a boundary and on to the facet that is met; draws the way. */
  private boolean moves(Walker walker, double toEdgeUm) {
    double x = walker.x;
    double z = walker.z;
    double start = power(walker.leg);
    advance(walker, toEdgeUm);
    boolean met = !faces.get(walker.leg.face).relief().isPresent() || climbs(walker);
    if (met) {
      draw(walker, x, z, start);
      return power(walker.leg) >= FAINT && left > 0;
    }
    return crosses(walker, x, z, start);
  }

  private static double power(Leg leg) {
    return leg.guessS + leg.guessP;
  }

  private void advance(Walker walker, double lengthUm) {
    Leg leg = walker.leg;
    walker.x += lengthUm * leg.ray.dx;
    walker.y += lengthUm * leg.ray.dy;
    walker.z += lengthUm * leg.ray.dz;
    double kept = Math.exp(-alphaPerUm[leg.medium()] * lengthUm);
    leg.guessS *= kept;
    leg.guessP *= kept;
  }

  /** Follows the relief to the next facet; false where the light leaves. */
  private boolean climbs(Walker walker) {
    Leg leg = walker.leg;
    Relief relief = faces.get(leg.face).relief().orElseThrow();
    leg.ray.x = walker.x;
    leg.ray.y = walker.y;
    leg.ray.z = walker.z - planeUm[leg.face] + relief.meanUm();
    boolean met = relief.next(leg.ray, leg.above);
    advance(walker, leg.ray.travelledUm);
    return met;
  }

  /** Crosses a layer, or leaves the device. */
  private boolean crosses(Walker walker, double x, double z, double start) {
    Leg leg = walker.leg;
    boolean up = leg.ray.dz > 0;
    int next = up ? leg.face - 1 : leg.face + 1;
    if (up != leg.above || Math.abs(leg.ray.dz) < 1e-3) {
      return false;
    }
    if (next < 0 || next == faces.size()) {
      advance(walker, marginUm / Math.abs(leg.ray.dz));
      draw(walker, x, z, start);
      return false;
    }
    double length = (edge(next, !up) - walker.z) / leg.ray.dz;
    leg.face = next;
    leg.above = !up;
    double soFar = Math.hypot(walker.x - x, walker.z - z);
    if (soFar > 0) {
      draw(walker, x, z, start);
    }
    return moves(walker, Math.max(0, length));
  }

  private void draw(Walker walker, double x, double z, double start) {
    left--;
    pieces.add(new Piece(walker.number, x, z, walker.x, walker.z, start, power(walker.leg)));
  }

  private void meet(Walker walker) {
    Leg leg = walker.leg;
    Ray ray = leg.ray;
    if (faces.get(leg.face).relief().isEmpty()) {
      ray.normalX = 0;
      ray.normalY = 0;
      ray.normalZ = 1;
    }
    double along = ray.dx * ray.normalX + ray.dy * ray.normalY + ray.dz * ray.normalZ;
    double cosine = Math.min(1, Math.max(1e-9, leg.above ? -along : along));
    double kept = Directions.turn(leg);
    double turned = (1 - kept) * (leg.guessP - leg.guessS);
    double s = leg.guessS + turned;
    double p = leg.guessP - turned;
    double[] shares = optics.at(leg.face, !leg.above, cosine);
    int from = leg.medium();
    int to = leg.above ? from + 1 : from - 1;
    send(walker, 0, s * shares[0], p * shares[1], n[from] / n[to], cosine);
    send(walker, 1, s * shares[2], p * shares[3], n[from] / n[to], cosine);
  }

  private void send(Walker from, int which, double s, double p, double ratio, double cosine) {
    if (s + p < FAINT || left <= 0) {
      return;
    }
    Walker walker = new Walker();
    walker.number = from.number;
    walker.x = from.x;
    walker.y = from.y;
    walker.z = from.z;
    walker.leg = from.leg.next(0, which, s, p);
    if (which == 0) {
      Directions.reflect(walker.leg, from.leg.ray);
    } else {
      Directions.refract(walker.leg, from.leg.ray, ratio, cosine);
    }
    scatter(walker.leg, faces.get(from.leg.face));
    goOn(walker, from.leg.ray);
  }

  private void goOn(Walker walker, Ray facet) {
    Face face = faces.get(walker.leg.face);
    boolean goes;
    if (face.relief().isPresent()) {
      double off = (walker.leg.above ? 1e-8 : -1e-8) * face.relief().get().featureUm();
      walker.x += off * facet.normalX;
      walker.y += off * facet.normalY;
      walker.z += off * facet.normalZ;
      goes = moves(walker, 0);
    } else {
      goes = crosses(walker, walker.x, walker.z, power(walker.leg));
    }
    if (goes) {
      open.push(walker);
    }
  }

  private static void scatter(Leg leg, Face face) {
    double specular = face.ideal() ? 0 : face.scatter().map(Scatter::specularFraction).orElse(1.0);
    if (leg.draw() >= specular) {
      double power = face.scatter().map(Scatter::cosinePower).orElse(1.0);
      double cosine = Math.pow(1 - leg.draw(), 1 / (power + 1));
      Directions.around(leg, cosine, 2 * Math.PI * leg.draw(), leg.above);
    }
  }
}
