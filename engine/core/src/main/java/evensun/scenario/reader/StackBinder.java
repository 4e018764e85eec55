package evensun.scenario.reader;

import evensun.scenario.GapChoice;
import evensun.scenario.LayerSpec;
import evensun.scenario.LayerSpec.Coherence;
import evensun.scenario.MediumSpec;
import evensun.scenario.Place;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Shown;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Binds {@code stack}. */
final class StackBinder {

  static final Interval THICKNESS = Interval.closed(0, 1e7, "nm");
  static final Interval BANDGAP = Interval.closed(0.1, 10, "eV");

  private static final String WHAT_THICKNESS =
      "a number in " + THICKNESS + "; only the last entry, the exit medium, has none";

  private static final List<String> NOT_OF_EXIT =
      List.of("thicknessNm", "present", "coherence", "mixture", "grading", "planarises");

  private final Fields root;
  private final List<Node> entries;
  private final Map<String, Place> names = new HashMap<>();
  private final Set<String> refusedNames = new HashSet<>();
  private boolean endsTooLate;

  private StackBinder(Fields root, List<Node> entries) {
    this.root = root;
    this.entries = entries;
  }

  /**
   * The stack as far as it could be read.
   *
   * @param refusedNames names that were reported already, so that nobody complains twice
   * @param known whether it could be read at all, so that names in other sections can be checked
   */
  record Stack(
      MediumSpec incident,
      List<LayerSpec> layers,
      MediumSpec exit,
      Set<String> refusedNames,
      boolean known) {

    /** Whether a name that no layer has need not be reported. */
    boolean excuses(String layer) {
      return !known || refusedNames.contains(layer);
    }

    Optional<LayerSpec> layer(String name) {
      return layers.stream().filter(l -> l.name().equals(name)).findFirst();
    }

    /** Position in the light's way, the exit medium last; -1 when there is no such layer. */
    int position(String name) {
      for (int i = 0; i < layers.size(); i++) {
        if (layers.get(i).name().equals(name)) {
          return i;
        }
      }
      return !name.isEmpty() && exit.name().equals(name) ? layers.size() : -1;
    }

    List<String> names() {
      List<String> names = new ArrayList<>(layers.stream().map(LayerSpec::name).toList());
      names.add(exit.name());
      names.removeIf(String::isEmpty);
      return names;
    }
  }

  static Stack bind(Fields root) {
    root.require("stack", "the layers, from the medium the light comes from to the exit medium");
    List<Node> entries = root.list("stack");
    StackBinder binder = new StackBinder(root, entries);
    if (entries.size() < 2) {
      if (root.has("stack")
          && !(root.node("stack").orElse(new Broken(root.place())) instanceof Broken)) {
        root.fault(
            root.place("stack"),
            "stack must have at least two entries, {medium: air} first and the exit medium last");
      }
      MediumSpec none = new MediumSpec("", "", GapChoice.NONE, root.place("stack"));
      return new Stack(none, List.of(), none, Set.of(), false);
    }
    return binder.stack();
  }

  private Stack stack() {
    MediumSpec incident = incident(entries.get(0));
    List<LayerSpec> layers = new ArrayList<>();
    for (int i = 1; i < entries.size() - 1; i++) {
      layers.add(layer(i));
    }
    return new Stack(incident, layers, exit(), refusedNames, true);
  }

  private MediumSpec incident(Node node) {
    Optional<Fields> opened = open(0);
    if (opened.isEmpty()) {
      return new MediumSpec("", "", GapChoice.NONE, node.place());
    }
    Fields fields = opened.get();
    if (!fields.has("medium")) {
      refuseName(fields);
      fields.fault(
          fields.place(),
          "the first entry must be the medium the light comes from, such as {medium: air}");
      return new MediumSpec("", "", GapChoice.NONE, fields.place());
    }
    String material = fields.requiredName("medium", "a material", NameRule.MATERIAL).orElse("");
    fields.finish();
    return new MediumSpec(material, material, GapChoice.NONE, fields.place("medium"));
  }

  private LayerSpec layer(int index) {
    Optional<Fields> opened = open(index);
    if (opened.isEmpty()) {
      return noLayer(entries.get(index).place());
    }
    Fields fields = opened.get();
    if (fields.has("medium")) {
      fields.fault(
          fields.place("medium"),
          "only the first entry is written as medium; write {name: …, material: …, thicknessNm: …}");
      return noLayer(fields.place());
    }
    String name = name(fields);
    if (!fields.has("thicknessNm") && endsTooLate(index)) {
      endsTooLate = true;
      fields.fault(
          fields.place(),
          "thicknessNm is missing, and more entries follow; only the last entry, the exit medium,"
              + " has none: list nothing below it, or give this layer a thickness");
      fields.know("thicknessNm");
    } else {
      fields.require("thicknessNm", WHAT_THICKNESS);
    }
    boolean pure = !FeatureBinder.namesMaterials(fields);
    String material = pure ? material(fields) : "";
    GapChoice gap = pure ? GapBinder.bind(fields) : GapChoice.NONE;
    LayerSpec layer =
        new LayerSpec(
            name,
            material,
            gap,
            fields.number("thicknessNm", THICKNESS).orElse(Double.NaN),
            fields.flag("present", true),
            coherence(fields),
            FeatureBinder.bind(fields, material, gap),
            fields.place());
    fields.finish();
    return layer;
  }

  private MediumSpec exit() {
    int index = entries.size() - 1;
    Optional<Fields> opened = open(index);
    if (opened.isEmpty()) {
      return new MediumSpec("", "", GapChoice.NONE, entries.get(index).place());
    }
    Fields fields = opened.get();
    if (fields.has("medium")) {
      fields.fault(
          fields.place("medium"),
          "the last entry has a name for the ledger; write {name: rear, material: "
              + (value(fields, "medium").isEmpty() ? "…" : value(fields, "medium"))
              + "}");
      return new MediumSpec("", "", GapChoice.NONE, fields.place());
    }
    String name = name(fields);
    noThickness(fields);
    MediumSpec exit =
        new MediumSpec(
            name,
            material(fields),
            GapBinder.bind(fields),
            FaceBinder.bind(fields),
            fields.place());
    fields.finish();
    return exit;
  }

  private static String material(Fields fields) {
    return fields.requiredName("material", "the name of a material", NameRule.MATERIAL).orElse("");
  }

  private void noThickness(Fields exit) {
    for (String key : NOT_OF_EXIT) {
      if (exit.has(key)) {
        exit.know(key);
        if (endsTooLate) {
          return;
        }
        exit.fault(
            exit.place(key),
            "the last entry is the exit medium and takes no "
                + key
                + "; remove it, or list the exit medium below, such as {name: rear, material: air}");
        return;
      }
    }
  }

  /** Whether an entry without thickness was probably meant to be the last: the last one has one. */
  private boolean endsTooLate(int index) {
    boolean looksFinite =
        entries.get(entries.size() - 1) instanceof Mapping last
            && last.entries().stream().anyMatch(e -> e.key().startsWith("thickness"));
    boolean looksLast =
        entries.get(index) instanceof Mapping entry
            && entry.entries().stream().noneMatch(e -> e.key().startsWith("thickness"));
    return looksFinite && looksLast;
  }

  private Optional<Fields> open(int index) {
    Node node = entries.get(index);
    if (node instanceof Mapping mapping) {
      return Optional.of(new Fields(who(mapping, index), mapping, root.faults()));
    }
    if (!(node instanceof Broken)) {
      root.fault(
          node.place(),
          "stack entry "
              + (index + 1)
              + " must be a layer {name: …, material: …, thicknessNm: …} but was "
              + node.described());
    }
    return Optional.empty();
  }

  private static String who(Mapping mapping, int index) {
    for (Entry entry : mapping.entries()) {
      if (entry.key().equals("name") && entry.value() instanceof Scalar s && !s.isNothing()) {
        return "layer " + Shown.quoted(s.text());
      }
    }
    return "stack entry " + (index + 1);
  }

  private String name(Fields fields) {
    String name = fields.requiredName("name", "a name for the layer", NameRule.ELEMENT).orElse("");
    if (name.isEmpty()) {
      refuseName(fields);
    }
    Place first = name.isEmpty() ? null : names.putIfAbsent(name, fields.place("name"));
    if (first != null) {
      fields.fault(
          fields.place("name"),
          "the name is used twice (first in line " + first.line() + "); names are unique");
    }
    return name;
  }

  private void refuseName(Fields fields) {
    fields
        .node("name")
        .filter(Scalar.class::isInstance)
        .ifPresent(n -> refusedNames.add(((Scalar) n).text()));
  }

  private static String value(Fields fields, String key) {
    return fields.node(key).filter(Scalar.class::isInstance).map(Node::described).orElse("");
  }

  private static LayerSpec noLayer(Place place) {
    return new LayerSpec("", "", GapChoice.NONE, Double.NaN, Coherence.DEFAULT, place);
  }

  private static Coherence coherence(Fields fields) {
    Coherence written = fields.choice("coherence", coherences()).orElse(Coherence.DEFAULT);
    if (!fields.flag("planarises")) {
      return written;
    }
    for (String key : List.of("coherence", "grading", "texture")) {
      FeatureBinder.refuse(fields, key, "does not go with planarises: true" + why(key));
    }
    return Coherence.PLANARISES;
  }

  private static String why(String key) {
    return switch (key) {
      case "coherence" -> ", since intensities add in a film that fills a texture";
      case "texture" -> ", whose upper face is flat; the texture belongs to a layer below";
      default -> ", since its thickness differs from place to place";
    };
  }

  private static Map<String, Coherence> coherences() {
    Map<String, Coherence> choices = new LinkedHashMap<>();
    choices.put("coherent", Coherence.COHERENT);
    choices.put("incoherent", Coherence.INCOHERENT);
    return choices;
  }
}
