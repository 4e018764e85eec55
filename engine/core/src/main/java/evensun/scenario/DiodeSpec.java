package evensun.scenario;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a scenario says about the electrical side of a subcell; whatever it leaves out has a
 * default.
 *
 * @param externalRadiativeEfficiency in (0, 1]
 * @param idealityFactor of the non-radiative branch, in [0.5, 5]
 * @param shuntOhmCm2 shunt resistance in Ω cm², greater than 0
 * @param collectionFraction collected part of the absorbed light, in [0, 1)
 * @param diffusionLengthNm diffusion length in nm, greater than 0
 * @param collectingFace face at which carriers are collected, given together with the diffusion
 *     length
 * @param reverseBreakdownV reverse breakdown voltage in V as a positive number
 * @param luminescentCouplingFraction part of the recombination that the next subcell collects, in
 *     [0, 1)
 */
public record DiodeSpec(
    OptionalDouble externalRadiativeEfficiency,
    OptionalDouble idealityFactor,
    OptionalDouble shuntOhmCm2,
    OptionalDouble collectionFraction,
    OptionalDouble diffusionLengthNm,
    Optional<CollectingFace> collectingFace,
    OptionalDouble reverseBreakdownV,
    OptionalDouble luminescentCouplingFraction) {

  /** Nothing said. */
  public static final DiodeSpec DEFAULT =
      new DiodeSpec(
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          Optional.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty());

  /** The face of an absorber at which carriers are collected. */
  public enum CollectingFace {
    /** The face that the light meets first. */
    FRONT,
    /** The other one. */
    REAR
  }
}
