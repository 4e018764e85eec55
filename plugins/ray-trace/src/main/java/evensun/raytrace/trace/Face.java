package evensun.raytrace.trace;

import evensun.raytrace.geometry.Relief;
import evensun.spi.Scatter;
import java.util.Optional;

/**
 * The shape of a boundary between two thick media.
 *
 * @param relief its surface, empty where flat
 * @param scatter how it scatters, empty where it does not
 * @param ideal whether it is the limit of light trapping
 * @param rmsUm root mean square height of its coarse roughness in µm, 0 where smooth
 * @param correlationUm correlation length of that roughness in µm
 */
public record Face(
    Optional<Relief> relief,
    Optional<Scatter> scatter,
    boolean ideal,
    double rmsUm,
    double correlationUm) {

  /** A plane. */
  public static final Face FLAT = new Face(Optional.empty(), Optional.empty(), false, 0, 0);

  /** Whether light keeps one direction here. */
  public boolean isFlat() {
    return relief.isEmpty() && scatter.isEmpty() && !ideal && rmsUm == 0;
  }

  /** How far it reaches above its mean plane, in µm. */
  public double aboveMeanUm() {
    return relief.isPresent() ? relief.get().highUm() - relief.get().meanUm() : 0;
  }

  /** How far it reaches below its mean plane, in µm. */
  public double belowMeanUm() {
    return relief.isPresent() ? relief.get().meanUm() - relief.get().lowUm() : 0;
  }
}
