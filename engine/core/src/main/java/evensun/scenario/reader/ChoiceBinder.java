package evensun.scenario.reader;

import evensun.scenario.LayerSpec;
import evensun.scenario.SearchSpec.ChoiceSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Sequence;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.Values;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Binds choices under {@code search.vary}: the material of a layer, and whether it is there. */
final class ChoiceBinder {

  private static final String MATERIAL = ".material";
  private static final String PRESENT = ".present";

  private static final Map<String, String> PRESENCE =
      Map.of("true", ChoiceSpec.PRESENT, "false", ChoiceSpec.ABSENT);

  private final Fields fields;
  private final StackBinder.Stack stack;
  private final List<ChoiceSpec> bound = new ArrayList<>();

  ChoiceBinder(Fields fields, StackBinder.Stack stack) {
    this.fields = fields;
    this.stack = stack;
  }

  static boolean isChoice(String key) {
    return key.endsWith(MATERIAL) || key.endsWith(PRESENT);
  }

  List<ChoiceSpec> bound() {
    return bound;
  }

  void bind(Entry entry) {
    String key = entry.key();
    String name = key.substring(0, key.lastIndexOf('.'));
    if (stack.excuses(name)) {
      return;
    }
    Optional<LayerSpec> layer =
        stack.layers().stream().filter(l -> l.name().equals(name)).findFirst();
    if (layer.isEmpty()) {
      List<String> names = stack.layers().stream().map(LayerSpec::name).toList();
      fault(entry, "names no layer with a thickness" + Nearest.hint(name, names));
      return;
    }
    List<String> alternatives = alternatives(entry);
    if (alternatives.isEmpty()) {
      return;
    }
    if (key.endsWith(PRESENT)) {
      presence(entry, layer.get(), alternatives);
    } else {
      material(entry, layer.get(), alternatives);
    }
  }

  private List<String> alternatives(Entry entry) {
    List<String> names = new ArrayList<>();
    if (entry.value() instanceof Sequence sequence) {
      for (Node item : sequence.items()) {
        Values.text(fields.who() + ": " + entry.key(), item, fields.faults()).ifPresent(names::add);
      }
    }
    if (names.isEmpty() || new HashSet<>(names).size() < names.size()) {
      fault(entry, "must be a list of different alternatives, such as " + example(entry));
      return List.of();
    }
    return names;
  }

  private static String example(Entry entry) {
    return entry.key().endsWith(PRESENT)
        ? "[true, false]"
        : "[indium-tin-oxide, aluminium-zinc-oxide]";
  }

  private void presence(Entry entry, LayerSpec layer, List<String> alternatives) {
    List<String> names = alternatives.stream().map(PRESENCE::get).toList();
    int drawn = names.indexOf(layer.present() ? ChoiceSpec.PRESENT : ChoiceSpec.ABSENT);
    if (!PRESENCE.keySet().containsAll(alternatives)) {
      fault(entry, "must be [true, false] but was " + alternatives);
    } else if (drawn < 0) {
      fault(entry, "must list what is drawn as well, which is " + layer.present());
    } else if (layer.thicknessNm() == 0) {
      fault(entry, "needs the thickness that the layer has when it is there, but thicknessNm is 0");
    } else {
      bound.add(new ChoiceSpec(entry.key(), names, drawn, entry.keyPlace()));
    }
  }

  private void material(Entry entry, LayerSpec layer, List<String> alternatives) {
    int drawn = alternatives.indexOf(layer.material());
    if (layer.material().isEmpty() || !layer.components().isEmpty()) {
      fault(entry, "cannot vary: the layer is mixed or graded and has no material of its own");
    } else if (drawn < 0) {
      fault(
          entry,
          "must list the material as drawn as well: the layer is of "
              + layer.material()
              + ", the alternatives are "
              + String.join(", ", alternatives));
    } else {
      bound.add(new ChoiceSpec(entry.key(), alternatives, drawn, entry.keyPlace()));
    }
  }

  private void fault(Entry entry, String message) {
    fields.fault(entry.keyPlace(), Shown.plain(entry.key()) + " " + message);
  }
}
