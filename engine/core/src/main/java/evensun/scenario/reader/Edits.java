package evensun.scenario.reader;

import evensun.scenario.Place;
import evensun.scenario.Source;
import evensun.scenario.tree.Faults;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Node.Sequence;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.TreeReader;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Replaces values in the tree of a scenario. */
final class Edits {

  /** Sections whose keys may themselves hold dots. */
  private static final Set<String> DOTTED = Set.of("vary", "options");

  private static final String STACK = "stack";
  private static final String SUBCELLS = "subcells";

  private Edits() {}

  /**
   * The tree with one value replaced or added; unchanged, and a fault, when the key leads nowhere.
   */
  static Mapping apply(Mapping root, Setting setting, Faults faults) {
    Optional<Node> value = parse(setting, faults);
    if (value.isEmpty()) {
      return root;
    }
    int dot = setting.key().indexOf('.');
    String head = dot < 0 ? setting.key() : setting.key().substring(0, dot);
    String rest = dot < 0 ? "" : setting.key().substring(dot + 1);
    if (head.equals(SUBCELLS) && rest.indexOf('.') > 0) {
      int second = rest.indexOf('.');
      return inSubcells(
          root,
          rest.substring(0, second),
          rest.substring(second + 1),
          setting,
          value.get(),
          faults);
    }
    boolean inList = !rest.isEmpty() && !isKeyOfSection(root, head, rest);
    if (inList && isLayer(root, head)) {
      return inList(root, STACK, head, rest, value.get());
    }
    if (inList && isSubcell(root, head)) {
      return inList(root, SUBCELLS, head, rest, value.get());
    }
    int slash = head.indexOf('/');
    if (slash > 0 && !rest.isEmpty() && isLayer(root, head.substring(0, slash))) {
      return inComponent(root, head, rest, value.get());
    }
    if (RootBinder.KEYS.contains(head) && !(dot >= 0 && rest.isEmpty())) {
      return put(root, segments(setting.key()), value.get());
    }
    faults.add(setting.place(), "names nothing in this scenario" + hint(root, setting.key()));
    return root;
  }

  /** Lists, mappings and quoted text are read as in the file; everything else stands for itself. */
  private static Optional<Node> parse(Setting setting, Faults faults) {
    if (setting.value().isEmpty() || "[{\"'".indexOf(setting.value().charAt(0)) < 0) {
      return Optional.of(new Scalar(setting.value(), false, setting.place()));
    }
    Faults own = new Faults();
    Source text = new Source("value", Path.of(""), setting.value());
    Node value = TreeReader.read(text, own);
    if (own.count() > 0 || value instanceof Broken) {
      faults.add(
          setting.place(),
          Shown.quoted(setting.value()) + " cannot be read as a value of a scenario");
      return Optional.empty();
    }
    return Optional.of(moved(value, setting.place()));
  }

  private static Node moved(Node node, Place place) {
    if (node instanceof Mapping mapping) {
      return new Mapping(
          mapping.entries().stream()
              .map(e -> new Entry(e.key(), place, moved(e.value(), place)))
              .toList(),
          place);
    }
    if (node instanceof Sequence sequence) {
      return new Sequence(sequence.items().stream().map(i -> moved(i, place)).toList(), place);
    }
    return node instanceof Scalar scalar
        ? new Scalar(scalar.text(), scalar.quoted(), place)
        : new Broken(place);
  }

  private static boolean isLayer(Mapping root, String name) {
    return names(root, STACK).contains(name);
  }

  private static boolean isSubcell(Mapping root, String name) {
    return names(root, SUBCELLS).contains(name);
  }

  private static Mapping inSubcells(
      Mapping root, String name, String rest, Setting setting, Node value, Faults faults) {
    if (isSubcell(root, name)) {
      return inList(root, SUBCELLS, name, rest, value);
    }
    String hint = Nearest.hint(name, names(root, SUBCELLS));
    faults.add(setting.place(), "there is no subcell " + Shown.quoted(name) + hint);
    return root;
  }

  /** A layer may be called "grid"; then the key behind the dot decides. */
  private static boolean isKeyOfSection(Mapping root, String head, String rest) {
    return value(root, head) instanceof Mapping section
        && section.entries().stream().anyMatch(e -> e.key().equals(segments(rest).get(0)));
  }

  /** The entry of that name in a list of named entries. */
  private static Mapping inList(Mapping root, String list, String name, String rest, Node value) {
    Sequence sequence = (Sequence) value(root, list);
    List<Node> items = new ArrayList<>();
    for (Node item : sequence.items()) {
      boolean meant = item instanceof Mapping entry && name.equals(text(value(entry, "name")));
      items.add(meant ? put((Mapping) item, segments(rest), value) : item);
    }
    return replace(root, list, new Sequence(items, sequence.place()), sequence.place());
  }

  /** A component of a mixed layer, or an end of a graded one. */
  private static Mapping inComponent(Mapping root, String head, String rest, Node value) {
    int slash = head.indexOf('/');
    String layer = head.substring(0, slash);
    String component = head.substring(slash + 1);
    boolean graded =
        ((Sequence) value(root, STACK))
            .items().stream()
                .filter(i -> i instanceof Mapping m && layer.equals(text(value(m, "name"))))
                .anyMatch(i -> !(value((Mapping) i, "grading") instanceof Broken));
    String section = graded ? "grading." : "mixture.components.";
    return inList(root, STACK, layer, section + component + "." + rest, value);
  }

  private static Mapping put(Mapping into, List<String> path, Node value) {
    String key = path.get(0);
    if (path.size() == 1) {
      return replace(into, key, value, value.place());
    }
    Node inner = value(into, key);
    Mapping below =
        inner instanceof Mapping mapping ? mapping : new Mapping(List.of(), value.place());
    return replace(into, key, put(below, path.subList(1, path.size()), value), value.place());
  }

  private static Mapping replace(Mapping into, String key, Node value, Place keyPlace) {
    List<Entry> entries = new ArrayList<>();
    boolean done = false;
    for (Entry entry : into.entries()) {
      boolean meant = entry.key().equals(key);
      entries.add(meant ? new Entry(key, entry.keyPlace(), value) : entry);
      done |= meant;
    }
    if (!done) {
      entries.add(new Entry(key, keyPlace, value));
    }
    return new Mapping(entries, into.place());
  }

  private static List<String> segments(String key) {
    List<String> segments = new ArrayList<>();
    String rest = key;
    while (!rest.isEmpty()) {
      int dot = rest.indexOf('.');
      boolean whole = !segments.isEmpty() && DOTTED.contains(segments.get(segments.size() - 1));
      boolean material = segments.size() == 1 && segments.get(0).equals("materials");
      int cut = whole ? -1 : material ? rest.lastIndexOf('.') : dot;
      segments.add(cut < 0 ? rest : rest.substring(0, cut));
      rest = cut < 0 ? "" : rest.substring(cut + 1);
    }
    return segments;
  }

  private static String hint(Mapping root, String key) {
    Set<String> known = new LinkedHashSet<>(names(root, STACK));
    known.addAll(names(root, SUBCELLS));
    known.addAll(RootBinder.KEYS);
    int dot = key.indexOf('.');
    String head = dot < 0 ? key : key.substring(0, dot);
    String rest = dot < 0 || dot == key.length() - 1 ? "" : key.substring(dot);
    return Nearest.of(head, known)
        .map(n -> "; did you mean " + n + rest + "?")
        .orElse(
            "; write LAYER.KEY, SUBCELL.KEY or SECTION.KEY, such as perovskite.thicknessNm or grid.stepNm");
  }

  private static List<String> names(Mapping root, String list) {
    if (!(value(root, list) instanceof Sequence sequence)) {
      return List.of();
    }
    return sequence.items().stream()
        .filter(Mapping.class::isInstance)
        .map(i -> text(value((Mapping) i, "name")))
        .filter(n -> !n.isEmpty())
        .toList();
  }

  private static Node value(Mapping mapping, String key) {
    return mapping.entries().stream()
        .filter(e -> e.key().equals(key))
        .map(Entry::value)
        .findFirst()
        .orElse(new Broken(mapping.place()));
  }

  private static String text(Node node) {
    return node instanceof Scalar scalar ? scalar.text() : "";
  }
}
