package evensun.spi;

import java.util.Set;

/**
 * What a solver takes and may offer.
 *
 * @param features the kinds of {@link Feature} it takes, such as {@code "texture"}; a problem with
 *     another kind is never handed to it
 * @param abilities the interfaces an {@link Evaluator} of this solver may offer, such as {@code
 *     Gradient.class}
 * @param oblique whether it takes incidences away from the normal
 * @param incoherent whether it takes incoherent layers
 * @param statistical whether its results carry a statistical error
 * @param diffuse whether it takes diffuse light, {@link Incidence#diffuse}
 */
public record Traits(
    Set<String> features,
    Set<Class<?>> abilities,
    boolean oblique,
    boolean incoherent,
    boolean statistical,
    boolean diffuse) {

  public Traits {
    features = Set.copyOf(features);
    abilities = Set.copyOf(abilities);
  }

  /** A solver that takes no diffuse light. */
  public Traits(
      Set<String> features,
      Set<Class<?>> abilities,
      boolean oblique,
      boolean incoherent,
      boolean statistical) {
    this(features, abilities, oblique, incoherent, statistical, false);
  }

  /** A solver for flat coherent layers at normal incidence, without further abilities. */
  public static Traits plain() {
    return new Traits(Set.of(), Set.of(), false, false, false);
  }
}
