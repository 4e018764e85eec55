package evensun.scenario.reader;

import java.util.List;

/** The components of mixed layers. */
final class Components {

  private Components() {}

  /** Names of the components of a layer, empty when it is not mixed. */
  static List<String> of(StackBinder.Stack stack, String layer) {
    return List.of();
  }
}
