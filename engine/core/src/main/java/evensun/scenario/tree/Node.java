package evensun.scenario.tree;

import evensun.scenario.Place;
import java.util.List;

/** A value of an input file with the place where it stands. */
public sealed interface Node {

  /** Where it starts. */
  Place place();

  /** What a person calls it, with its article. */
  String described();

  /**
   * Keys with values, in the order of the file; a doubled key is still in here twice.
   *
   * @param entries the pairs
   * @param place where it starts
   */
  record Mapping(List<Entry> entries, Place place) implements Node {

    public Mapping {
      entries = List.copyOf(entries);
    }

    @Override
    public String described() {
      return "a mapping (key: value)";
    }
  }

  /**
   * A list.
   *
   * @param items its items
   * @param place where it starts
   */
  record Sequence(List<Node> items, Place place) implements Node {

    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public String described() {
      return "a list";
    }
  }

  /**
   * A single value, as written.
   *
   * @param text its text without quotes
   * @param quoted whether it was written as text, so that {@code "5"} is no number
   * @param place where it stands
   */
  record Scalar(String text, boolean quoted, Place place) implements Node {

    /** Whether nothing was written, or the word for nothing. */
    public boolean isNothing() {
      return !quoted && (text.isEmpty() || "~".equals(text) || "null".equalsIgnoreCase(text));
    }

    @Override
    public String described() {
      return isNothing() ? "nothing" : quoted ? Shown.quoted(text) : Shown.plain(text);
    }
  }

  /**
   * Something that was reported while it was read; binders pass over it in silence.
   *
   * @param place where it stands
   */
  record Broken(Place place) implements Node {

    @Override
    public String described() {
      return "unreadable";
    }
  }

  /**
   * A key with its value.
   *
   * @param key the key
   * @param keyPlace where the key stands
   * @param value the value
   */
  record Entry(String key, Place keyPlace, Node value) {}
}
