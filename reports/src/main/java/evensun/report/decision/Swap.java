package evensun.report.decision;

import evensun.result.Outcome;
import evensun.result.Outcome.StackEntry;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * A layer for which the search chose something else than was drawn.
 *
 * @param layer its name
 * @param drawn material as drawn, empty where the layer was absent
 * @param found material found, empty where the layer is left out
 */
public record Swap(String layer, String drawn, String found) {

  /** Every swap between a stack as drawn and as found, in the order light meets the layers. */
  public static List<Swap> between(@Nullable Outcome drawn, Outcome found) {
    if (drawn == null) {
      return List.of();
    }
    List<Swap> swaps = new ArrayList<>();
    for (StackEntry layer : drawn.stack()) {
      String now = material(found, layer.name());
      if (!now.equals(layer.material())) {
        swaps.add(new Swap(layer.name(), layer.material(), now));
      }
    }
    for (StackEntry layer : found.stack()) {
      if (material(drawn, layer.name()).isEmpty()) {
        swaps.add(new Swap(layer.name(), "", layer.material()));
      }
    }
    return List.copyOf(swaps);
  }

  private static String material(Outcome outcome, String layer) {
    Optional<StackEntry> same =
        outcome.stack().stream().filter(l -> l.name().equals(layer)).findFirst();
    return same.map(StackEntry::material).orElse("");
  }
}
