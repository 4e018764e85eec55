package evensun.scenario.tree;

import evensun.scenario.Place;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Node.Sequence;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.OptionalLong;
import java.util.Set;

/**
 * The keys of one mapping, asked for by name. Whatever is asked for is thereby known; {@link
 * #finish} reports the rest. After a fault the methods return a stand-in (NaN, empty), so that
 * reading goes on. Not safe for threads.
 */
public final class Fields {

  private static final double LARGEST_LONG = 9007199254740991d;

  private static final Map<String, Boolean> FLAGS = flags();

  private final String who;
  private final Mapping mapping;
  private final Faults faults;
  private final Map<String, Entry> entries = new LinkedHashMap<>();
  private final Set<String> asked = new LinkedHashSet<>();
  private final Map<String, String> missing = new LinkedHashMap<>();

  /**
   * Opens a mapping; doubled keys are reported here.
   *
   * @param who what messages call it, such as {@code layer "mirror"}; empty for the whole file
   * @param mapping its keys
   * @param faults takes what is wrong
   */
  public Fields(String who, Mapping mapping, Faults faults) {
    this.who = who;
    this.mapping = mapping;
    this.faults = faults;
    for (Entry entry : mapping.entries()) {
      Entry first = entries.putIfAbsent(entry.key(), entry);
      if (first != null) {
        fault(
            entry.keyPlace(),
            Shown.plain(entry.key())
                + " is given twice (first in line "
                + first.keyPlace().line()
                + "); keep one");
      }
    }
  }

  /** Where the mapping starts. */
  public Place place() {
    return mapping.place();
  }

  /** Where the value of a key stands, or the mapping if the key is absent. */
  public Place place(String key) {
    return entries.containsKey(key) ? entries.get(key).value().place() : mapping.place();
  }

  /** The collector of faults. */
  public Faults faults() {
    return faults;
  }

  /** What messages call this mapping. */
  public String who() {
    return who;
  }

  /** Whether a key is written; asking this way does not make it known. */
  public boolean has(String key) {
    return entries.containsKey(key);
  }

  /** All keys written, in order. */
  public List<String> keys() {
    return List.copyOf(entries.keySet());
  }

  /** Reports a fault of this mapping. */
  public void fault(Place at, String message) {
    faults.add(at, who.isEmpty() ? message : who + ": " + message);
  }

  /** The value of a key, if it is written and could be read. */
  public Optional<Node> node(String key) {
    asked.add(key);
    Entry entry = entries.get(key);
    return entry == null || entry.value() instanceof Broken
        ? Optional.empty()
        : Optional.of(entry.value());
  }

  /** A number, or NaN after a fault; empty when the key is absent. */
  public OptionalDouble number(String key, Interval in) {
    Optional<Node> node = node(key);
    return node.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(Values.number(label(key), node.get(), in, faults));
  }

  /** A number that must be there; NaN after a fault. */
  public double requiredNumber(String key, Interval in) {
    require(key, "a number in " + in);
    return number(key, in).orElse(Double.NaN);
  }

  /** A whole number; empty when it is absent or after a fault. */
  public OptionalLong whole(String key, long low, long high) {
    Interval in =
        Interval.closed(
            Math.max((double) low, -LARGEST_LONG), Math.min((double) high, LARGEST_LONG), "");
    OptionalDouble number = number(key, in);
    if (number.isEmpty() || Double.isNaN(number.getAsDouble())) {
      return OptionalLong.empty();
    }
    if (number.getAsDouble() != Math.rint(number.getAsDouble())) {
      fault(place(key), key + " must be a whole number but was " + shown(key));
      return OptionalLong.empty();
    }
    return OptionalLong.of((long) number.getAsDouble());
  }

  /** A whole number up to 1e9; empty when it is absent or after a fault. */
  public OptionalInt count(String key, int low) {
    OptionalLong whole = whole(key, low, 1_000_000_000);
    return whole.isEmpty() ? OptionalInt.empty() : OptionalInt.of((int) whole.getAsLong());
  }

  /** A text; empty when it is absent or after a fault. */
  public Optional<String> text(String key) {
    return node(key).flatMap(n -> Values.text(label(key), n, faults));
  }

  /** A text that must be there; empty after a fault. */
  public Optional<String> requiredText(String key, String what) {
    require(key, what);
    return text(key);
  }

  /** A name that must be there, of letters, digits and what is allowed beside them. */
  public Optional<String> requiredName(String key, String what, NameRule rule) {
    require(key, what);
    return node(key).flatMap(n -> rule.read(label(key), n, faults));
  }

  /** One of a few words; empty when it is absent or after a fault. */
  public <T> Optional<T> choice(String key, Map<String, T> choices) {
    return node(key).flatMap(n -> Values.choice(label(key), n, choices, faults));
  }

  /** Whether a key is there and true. */
  public boolean flag(String key) {
    return flag(key, false);
  }

  /** True or false, with what holds where it is not written. */
  public boolean flag(String key, boolean usual) {
    return choice(key, FLAGS).orElse(usual);
  }

  /** A mapping under a key; empty when it is absent or after a fault. */
  public Optional<Mapping> mapping(String key) {
    Optional<Node> node = node(key);
    if (node.isPresent() && !(node.get() instanceof Mapping)) {
      faults.add(place(key), label(key) + " must be a mapping (key: value) but was " + shown(key));
    }
    return node.filter(Mapping.class::isInstance).map(Mapping.class::cast);
  }

  /** The keys of a mapping under a key; empty when it is absent or after a fault. */
  public Optional<Fields> section(String key) {
    return mapping(key).map(m -> new Fields(label(key).replace(": ", "."), m, faults));
  }

  /** The items of a list under a key; empty when it is absent, empty, or after a fault. */
  public List<Node> list(String key) {
    Optional<Node> node = node(key);
    if (node.isPresent() && !(node.get() instanceof Sequence)) {
      faults.add(place(key), label(key) + " must be a list but was " + shown(key));
    }
    return node.filter(Sequence.class::isInstance)
        .map(n -> ((Sequence) n).items())
        .orElse(List.of());
  }

  /** Notes that a key must be there; {@link #finish} reports it. */
  public void require(String key, String what) {
    asked.add(key);
    if (!entries.containsKey(key)) {
      missing.put(key, what);
    }
  }

  /** Makes further keys known, for hints about misspelt ones. */
  public void know(String... keys) {
    asked.addAll(List.of(keys));
  }

  /** Reports unknown and missing keys. A missing key that is only misspelt is reported once. */
  public void finish() {
    List<String> unused = new ArrayList<>(asked);
    unused.removeAll(entries.keySet());
    String previous = "";
    for (Entry entry : entries.values()) {
      if (!asked.contains(entry.key())) {
        unknown(entry, previous, unused);
      }
      previous = entry.key();
    }
    missing.forEach((key, what) -> fault(place(), key + " is missing: " + what));
  }

  private void unknown(Entry entry, String previous, List<String> unused) {
    String key = entry.key();
    if (isDecimalPart(entry) && !previous.isEmpty()) {
      String number = shown(previous);
      fault(
          entry.keyPlace(),
          previous
              + " seems to have a decimal comma (%1$s,%2$s); write %1$s.%2$s"
                  .formatted(number, key));
      return;
    }
    String unspaced = key.replaceAll("\\h+", "");
    boolean spaced = !unspaced.equals(key) && asked.contains(unspaced);
    Optional<String> meant = spaced ? Optional.of(unspaced) : nearest(key, unused);
    meant.ifPresent(missing::remove);
    String hint =
        spaced
            ? "; it holds a space, write " + unspaced
            : meant
                .map(m -> "; did you mean " + m + "?" + unitHint(key, m))
                .orElse("; known here: " + Shown.list(asked));
    fault(entry.keyPlace(), "unknown key " + Shown.plain(key) + hint);
  }

  /** A key that is not written yet is the likelier one to have been meant. */
  private Optional<String> nearest(String key, List<String> unused) {
    return Nearest.of(key, unused).or(() -> Nearest.of(key, asked));
  }

  /** In {@code {a: 1,5}} YAML sees the key 5 with nothing as its value. */
  private static boolean isDecimalPart(Entry entry) {
    boolean digits = !entry.key().isEmpty() && entry.key().chars().allMatch(Character::isDigit);
    return digits && entry.value() instanceof Scalar s && s.isNothing();
  }

  private static Map<String, Boolean> flags() {
    Map<String, Boolean> flags = new LinkedHashMap<>();
    flags.put("true", true);
    flags.put("false", false);
    return flags;
  }

  private static String unitHint(String key, String nearest) {
    return nearest.startsWith(key) ? " (a key ends in the unit of its number)" : "";
  }

  private String shown(String key) {
    return entries.get(key).value().described();
  }

  private String label(String key) {
    return who.isEmpty() ? Shown.plain(key) : who + ": " + Shown.plain(key);
  }
}
