package evensun.spi;

import java.util.List;

/**
 * Something about a layer that is not flat, uniform or pure. The set is open: a solver meets kinds
 * it does not know only when it claims them in its {@link Traits}, and throws {@link
 * UnsupportedProblem} for them otherwise.
 */
public interface Feature {

  /** The kind, as in {@link Traits#features()}: {@code "mixture"}, {@code "texture"}, ... */
  String kind();

  /** Numbers of this feature that a search may move. */
  default List<Knob> knobs() {
    return List.of();
  }
}
