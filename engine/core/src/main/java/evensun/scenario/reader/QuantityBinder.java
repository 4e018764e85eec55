package evensun.scenario.reader;

import evensun.scenario.LayerSpec;
import evensun.scenario.SubcellSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.Values;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The quantities of a design that limits and aims name, and what they are of. */
final class QuantityBinder {

  private static final Interval CURRENT = Interval.closed(0, 1000, "mA cm⁻²");

  /** Whose quantity it is. */
  private enum Of {
    DEVICE,
    SUBCELLS,
    LAYERS
  }

  /** A quantity with the values that make sense. */
  private record Known(Of of, Interval in) {}

  private static final Map<String, Known> QUANTITIES = quantities();

  private final Collection<String> subcells;
  private final Collection<String> layers;

  QuantityBinder(StackBinder.Stack stack, List<SubcellSpec> subcells) {
    this.subcells = subcells.stream().map(SubcellSpec::name).toList();
    this.layers = stack.layers().stream().map(LayerSpec::name).toList();
  }

  private static Map<String, Known> quantities() {
    Map<String, Known> quantities = new LinkedHashMap<>();
    quantities.put("mismatchMaPerCm2", new Known(Of.DEVICE, CURRENT));
    quantities.put("photocurrentMaPerCm2", new Known(Of.SUBCELLS, CURRENT));
    quantities.put("thicknessNm", new Known(Of.LAYERS, Interval.closed(0, 1e9, "nm")));
    quantities.put("bandgapEv", new Known(Of.SUBCELLS, Interval.closed(0, 10, "eV")));
    quantities.put("matchedCurrentMaPerCm2", new Known(Of.DEVICE, CURRENT));
    quantities.put("currentSumMaPerCm2", new Known(Of.SUBCELLS, CURRENT));
    quantities.put("reflectedMaPerCm2", new Known(Of.DEVICE, CURRENT));
    quantities.put("transmittedMaPerCm2", new Known(Of.DEVICE, CURRENT));
    quantities.put("parasiticMaPerCm2", new Known(Of.LAYERS, CURRENT));
    quantities.put("efficiencyPercent", new Known(Of.DEVICE, Interval.closed(0, 100, "%")));
    return quantities;
  }

  /** Names of quantities, as the keys of a choice. */
  static Map<String, String> names() {
    Map<String, String> names = new LinkedHashMap<>();
    QUANTITIES.keySet().forEach(name -> names.put(name, name));
    return names;
  }

  /** What makes sense as a value of a quantity. */
  static Interval interval(String quantity) {
    Known known = QUANTITIES.get(quantity);
    return known == null ? Interval.closed(-1e9, 1e9, "") : known.in();
  }

  /** The names under {@code of}, each of them checked. */
  List<String> of(Fields fields, String quantity) {
    List<String> names = new ArrayList<>();
    for (Node node : fields.list("of")) {
      Values.text(fields.who() + ": of", node, fields.faults())
          .filter(name -> isKnown(fields, quantity, name, node))
          .ifPresent(names::add);
    }
    Known known = QUANTITIES.get(quantity);
    if (known != null && known.of() == Of.DEVICE && fields.has("of")) {
      fields.fault(fields.place("of"), "of does not go with " + quantity + ", which is of all");
    }
    return names;
  }

  /** Whether a name is one of those that have a quantity; a fault when not. */
  boolean isKnown(Fields fields, String quantity, String name, Node node) {
    Known known = QUANTITIES.get(quantity);
    if (known == null || known.of() == Of.DEVICE) {
      return true;
    }
    boolean ofLayers = known.of() == Of.LAYERS;
    Collection<String> names = ofLayers ? layers : subcells;
    if (!names.contains(name)) {
      fields.fault(
          node.place(),
          "of names no "
              + (ofLayers ? "layer with a thickness: " : "subcell: ")
              + Shown.plain(name)
              + Nearest.hint(name, names));
    }
    return names.contains(name);
  }
}
