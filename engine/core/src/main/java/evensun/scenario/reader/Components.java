package evensun.scenario.reader;

import evensun.scenario.FeatureSpec.ComponentSpec;
import java.util.List;

/** The components of mixed layers. */
final class Components {

  private Components() {}

  /** Names of the components of a layer, empty when it is not mixed. */
  static List<String> of(StackBinder.Stack stack, String layer) {
    return stack
        .layer(layer)
        .map(l -> l.components().stream().map(ComponentSpec::name).toList())
        .orElse(List.of());
  }
}
