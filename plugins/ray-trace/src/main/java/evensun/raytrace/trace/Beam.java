package evensun.raytrace.trace;

import evensun.spi.Incidence;
import evensun.spi.Side;

/**
 * Where light comes from; what its polarisation is does not change what it does.
 *
 * @param angleDeg angle to the normal in degrees, in the plane of x and z
 * @param diffuse whether it comes from all directions alike
 * @param side from which side
 */
public record Beam(double angleDeg, boolean diffuse, Side side) {

  /** The beam of an incidence. */
  public static Beam of(Incidence incidence) {
    return new Beam(incidence.angleDeg(), incidence.diffuse(), incidence.side());
  }

  /** Starts a ray: s polarisation along y. */
  void start(Leg leg, int faces) {
    boolean front = side == Side.FRONT;
    leg.face = front ? 0 : faces - 1;
    leg.above = front;
    leg.deepest = front ? 0 : faces;
    leg.guessS = 0.5;
    leg.guessP = 0.5;
    leg.sy = 1;
    if (diffuse) {
      double cosine = Math.sqrt(1 - leg.draw());
      Directions.around(leg, cosine, 2 * Math.PI * leg.draw(), !front);
    } else {
      double angle = Math.toRadians(angleDeg);
      leg.point(Math.sin(angle), 0, front ? -Math.cos(angle) : Math.cos(angle));
    }
  }
}
