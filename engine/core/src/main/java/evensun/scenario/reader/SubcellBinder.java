package evensun.scenario.reader;

import evensun.scenario.DiodeSpec;
import evensun.scenario.Place;
import evensun.scenario.SubcellSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Shown;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Binds {@code subcells}. */
final class SubcellBinder {

  private final Fields root;
  private final StackBinder.Stack stack;
  private final Map<String, Place> names = new HashMap<>();
  private final Map<String, String> ownerOf = new LinkedHashMap<>();

  private SubcellBinder(Fields root, StackBinder.Stack stack) {
    this.root = root;
    this.stack = stack;
  }

  static List<SubcellSpec> bind(Fields root, StackBinder.Stack stack) {
    root.require("subcells", "at least one, such as - {name: top, absorbers: [perovskite]}");
    List<Node> items = root.list("subcells");
    if (items.isEmpty() && root.node("subcells").isPresent()) {
      root.fault(root.place("subcells"), "subcells must have at least one entry");
    }
    SubcellBinder binder = new SubcellBinder(root, stack);
    List<SubcellSpec> subcells = new ArrayList<>();
    for (int i = 0; i < items.size(); i++) {
      binder.one(items.get(i), i).ifPresent(subcells::add);
    }
    binder.checkOrder(subcells);
    return subcells;
  }

  private Optional<SubcellSpec> one(Node node, int index) {
    if (!(node instanceof Mapping mapping)) {
      if (!(node instanceof Broken)) {
        root.fault(
            node.place(),
            "subcells entry "
                + (index + 1)
                + " must be {name: …, absorbers: […]} but was "
                + node.described());
      }
      return Optional.empty();
    }
    Fields fields = new Fields(who(mapping, index), mapping, root.faults());
    String name = name(fields);
    List<String> absorbers = absorbers(fields, name);
    DiodeSpec diode = DiodeBinder.bind(fields);
    fields.finish();
    return Optional.of(new SubcellSpec(name, absorbers, diode, fields.place()));
  }

  private static String who(Mapping mapping, int index) {
    return mapping.entries().stream()
        .filter(e -> e.key().equals("name") && e.value() instanceof Scalar s && !s.isNothing())
        .findFirst()
        .map(e -> "subcell " + Shown.quoted(((Scalar) e.value()).text()))
        .orElse("subcells entry " + (index + 1));
  }

  private String name(Fields fields) {
    String name =
        fields.requiredName("name", "a name for the subcell", NameRule.ELEMENT).orElse("");
    Place first = name.isEmpty() ? null : names.putIfAbsent(name, fields.place("name"));
    if (first != null) {
      fields.fault(
          fields.place("name"),
          "the name is used twice (first in line " + first.line() + "); names are unique");
    }
    return name;
  }

  private List<String> absorbers(Fields fields, String subcell) {
    fields.require("absorbers", "the layers whose absorbed light is its current, such as [wafer]");
    List<Node> items = fields.list("absorbers");
    if (items.isEmpty()
        && fields.node("absorbers").filter(Node.Sequence.class::isInstance).isPresent()) {
      fields.fault(
          fields.place("absorbers"),
          "absorbers must name at least one layer but was an empty list");
    }
    List<String> absorbers = new ArrayList<>();
    for (Node item : items) {
      NameRule.ABSORBER
          .read(fields.who() + ": absorbers", item, root.faults())
          .filter(name -> exists(fields, item, name))
          .filter(name -> isFree(fields, item, name, subcell))
          .ifPresent(absorbers::add);
    }
    return absorbers;
  }

  private boolean exists(Fields fields, Node item, String absorber) {
    String layer = layerOf(absorber);
    if (stack.excuses(layer) || (stack.position(layer) >= 0 && layer.equals(absorber))) {
      return true;
    }
    if (stack.position(layer) < 0) {
      boolean medium = layer.equals(stack.incident().material());
      fields.fault(
          item.place(),
          "absorbers names "
              + Shown.quoted(layer)
              + (medium
                  ? ", the medium the light comes from; it cannot be an absorber"
                  : ", but there is no such layer" + Nearest.hint(layer, stack.names())));
      return false;
    }
    return componentExists(fields, item, layer, absorber.substring(layer.length() + 1));
  }

  private boolean componentExists(Fields fields, Node item, String layer, String component) {
    List<String> components = Components.of(stack, layer);
    if (components.contains(component)) {
      return true;
    }
    fields.fault(
        item.place(),
        "absorbers names the component "
            + Shown.quoted(component)
            + " of layer "
            + Shown.quoted(layer)
            + (components.isEmpty()
                ? ", but that layer is not mixed"
                : ", but it has no such component" + Nearest.hint(component, components)));
    return false;
  }

  /** A layer and a component of it cannot be counted for two subcells, nor twice for one. */
  private boolean isFree(Fields fields, Node item, String absorber, String subcell) {
    for (Map.Entry<String, String> taken : ownerOf.entrySet()) {
      boolean same = taken.getKey().equals(absorber);
      boolean within =
          layerOf(taken.getKey()).equals(layerOf(absorber))
              && (taken.getKey().equals(layerOf(absorber)) || absorber.equals(layerOf(absorber)));
      if (same || within) {
        fields.fault(
            item.place(),
            "layer "
                + Shown.quoted(absorber)
                + " is an absorber of subcell "
                + Shown.quoted(taken.getValue())
                + " already; a layer belongs to at most one subcell, and once");
        return false;
      }
    }
    ownerOf.put(absorber, subcell);
    return true;
  }

  private void checkOrder(List<SubcellSpec> subcells) {
    for (int i = 1; i < subcells.size(); i++) {
      SubcellSpec upper = subcells.get(i - 1);
      SubcellSpec lower = subcells.get(i);
      if (firstPosition(upper) >= 0
          && firstPosition(lower) >= 0
          && firstPosition(lower) < firstPosition(upper)) {
        root.fault(
            lower.place(),
            "subcell "
                + Shown.quoted(lower.name())
                + ": the light meets it before subcell "
                + Shown.quoted(upper.name())
                + "; list subcells in the order the light meets them");
      }
    }
  }

  /** Where the light meets a subcell first; -1 when that is not known after other faults. */
  private int firstPosition(SubcellSpec subcell) {
    return subcell.absorbers().stream().mapToInt(a -> stack.position(layerOf(a))).min().orElse(-1);
  }

  private static String layerOf(String absorber) {
    int slash = absorber.indexOf('/');
    return slash < 0 ? absorber : absorber.substring(0, slash);
  }
}
