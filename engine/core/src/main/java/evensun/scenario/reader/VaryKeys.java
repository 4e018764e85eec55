package evensun.scenario.reader;

import evensun.scenario.FaceSpec;
import evensun.scenario.FeatureSpec;
import evensun.scenario.GapChoice;
import evensun.scenario.LayerSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Shown;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** The quantities that a search may vary, and why others may not. */
final class VaryKeys {

  private VaryKeys() {}

  /** The interval of the quantity that a key names; empty, and a fault, when it names none. */
  static Optional<Interval> interval(Fields vary, Entry entry, StackBinder.Stack stack) {
    if (stack.excuses(entry.key().replaceFirst("[./].*", ""))) {
      return Optional.empty();
    }
    Map<String, Interval> known = of(stack);
    Optional<Interval> found = Optional.ofNullable(known.get(entry.key()));
    if (found.isEmpty()) {
      vary.fault(
          entry.keyPlace(), Shown.plain(entry.key()) + " " + complaint(entry.key(), stack, known));
    }
    return found;
  }

  private static Map<String, Interval> of(StackBinder.Stack stack) {
    Map<String, Interval> known = new LinkedHashMap<>();
    for (LayerSpec layer : stack.layers()) {
      known.put(layer.name() + ".thicknessNm", StackBinder.THICKNESS);
      addGap(layer.name(), layer.gap(), known);
      layer.features().forEach(feature -> addFeature(layer.name(), feature, known));
    }
    stack.exit().faces().forEach(face -> addFeature(stack.exit().name(), face, known));
    addGap(stack.exit().name(), stack.exit().gap(), known);
    return known;
  }

  private static void addGap(String name, GapChoice gap, Map<String, Interval> known) {
    if (gap.isPresent()) {
      known.put(name + "." + gap.key().word(), GapBinder.interval(gap.key()));
    }
  }

  private static void addFeature(String layer, FeatureSpec feature, Map<String, Interval> known) {
    if (feature instanceof FaceSpec.TextureSpec texture && texture.heightMap().isEmpty()) {
      known.put(layer + ".texture.facetAngleDeg", FaceBinder.FACET_ANGLE);
      return;
    }
    boolean porous = feature instanceof FeatureSpec.MixtureSpec mixture && mixture.porous();
    if (porous) {
      known.put(layer + ".mixture.porosity", MixtureBinder.FRACTION);
      return;
    }
    for (FeatureSpec.ComponentSpec component : feature.components()) {
      String key = layer + "/" + component.name();
      if (feature instanceof FeatureSpec.MixtureSpec) {
        known.put(key + ".fraction", MixtureBinder.FRACTION);
      }
      addGap(key, component.gap(), known);
    }
  }

  private static String complaint(
      String key, StackBinder.Stack stack, Map<String, Interval> known) {
    int dot = key.indexOf('.');
    String layer = (dot < 0 ? key : key.substring(0, dot)).replaceFirst("/.*", "");
    String quantity = dot < 0 ? "" : key.substring(dot + 1);
    if (stack.position(layer) < 0) {
      return "names no layer of the stack" + Nearest.hint(layer, stack.names());
    }
    if (quantity.equals("thicknessNm")) {
      return "cannot vary: the exit medium has no thickness";
    }
    if (GapBinder.KEYS.contains(quantity)) {
      return "cannot vary: write " + quantity + " in the layer first, as the value to start from";
    }
    return "names nothing that can vary"
        + sameQuantity(key, layer, known)
            .map(meant -> "; did you mean " + meant + "?")
            .orElse(Nearest.hint(key, known.keySet()));
  }

  /** A key of the same layer for the same quantity, written another way. */
  private static Optional<String> sameQuantity(
      String key, String layer, Map<String, Interval> known) {
    String last = key.substring(Math.max(0, key.lastIndexOf('.')));
    return known.keySet().stream()
        .filter(k -> k.startsWith(layer) && "./".indexOf(k.charAt(layer.length())) >= 0)
        .filter(k -> k.endsWith(last))
        .findFirst();
  }
}
