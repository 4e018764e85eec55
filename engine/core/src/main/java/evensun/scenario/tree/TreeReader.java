package evensun.scenario.tree;

import evensun.scenario.Place;
import evensun.scenario.Source;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Node.Sequence;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.TokenStreamFactory;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.dataformat.yaml.YAMLFactory;
import tools.jackson.dataformat.yaml.YAMLParser;

/** Reads YAML or JSON text into the located tree. */
public final class TreeReader {

  private static final int DEEPEST = 16;
  private static final TokenStreamFactory YAML = new YAMLFactory();
  private static final TokenStreamFactory JSON = new JsonFactory();

  private final String file;
  private final String[] lines;
  private final Faults faults;
  private final JsonParser parser;
  private final boolean json;

  private TreeReader(Source source, Faults faults, boolean json) {
    this.file = source.name();
    this.lines = source.text().split("\r\n|\r|\n", -1);
    this.faults = faults;
    this.json = json;
    this.parser = (json ? JSON : YAML).createParser(ObjectReadContext.empty(), source.text());
  }

  /**
   * Reads one document. Parts that cannot be used (aliases, tags, too deep nesting) are reported
   * and become {@link Broken}.
   *
   * @param source the text; JSON by its name, or where YAML does not accept it
   * @param faults takes what is wrong
   */
  public static Node read(Source source, Faults faults) {
    boolean json = source.name().toLowerCase(Locale.ROOT).endsWith(".json");
    Faults own = new Faults();
    Node root = new TreeReader(source, own, json).document();
    if (!json && own.count() > 0 && source.text().stripLeading().startsWith("{")) {
      Faults asJson = new Faults();
      Node second = new TreeReader(source, asJson, true).document();
      if (asJson.count() == 0) {
        return second;
      }
    }
    faults.addAll(own);
    return root;
  }

  private Node document() {
    Place start = Place.of(file);
    try (parser) {
      JsonToken first = parser.nextToken();
      if (first == null) {
        return new Scalar("", false, start);
      }
      Node root = node("", 0);
      if (parser.nextToken() != null) {
        faults.add(
            place(""),
            "a second document starts here; a file holds one scenario, give each its own file");
      }
      return root;
    } catch (JacksonException e) {
      SyntaxFaults.report(e, file, lines, faults);
      return new Broken(start);
    }
  }

  private Node node(String path, int depth) {
    Place place = place(path);
    if (depth > DEEPEST) {
      faults.add(place, "nested deeper than " + DEEPEST + " levels; no scenario needs that");
      parser.skipChildren();
      return new Broken(place);
    }
    if (isRefused(place)) {
      parser.skipChildren();
      return new Broken(place);
    }
    return switch (parser.currentToken()) {
      case START_OBJECT -> mapping(path, depth, place);
      case START_ARRAY -> sequence(path, depth, place);
      default -> new Scalar(parser.getString(), isQuoted(place), place);
    };
  }

  private boolean isRefused(Place place) {
    if (parser instanceof YAMLParser yaml && yaml.isCurrentAlias()) {
      faults.add(
          place, "*" + Shown.plain(parser.getString()) + " is an alias; write the value out here");
      return true;
    }
    if (!json && characterAt(place) == '&') {
      faults.add(place, "there is an anchor (&) here; remove it");
      return true;
    }
    if (parser.getTypeId() != null) {
      String tag = String.valueOf(parser.getTypeId()).replace("tag:yaml.org,2002:", "!");
      faults.add(place, "!" + Shown.plain(tag) + " is a tag; remove it");
      return true;
    }
    return false;
  }

  private Mapping mapping(String path, int depth, Place place) {
    List<Entry> entries = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String key = parser.currentName();
      String keyPath = path.isEmpty() ? key : path + "." + key;
      Place keyPlace = place(keyPath);
      parser.nextToken();
      entries.add(new Entry(key, keyPlace, node(keyPath, depth + 1)));
    }
    return new Mapping(entries, place);
  }

  private Sequence sequence(String path, int depth, Place place) {
    List<Node> items = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      items.add(node(path + "[" + items.size() + "]", depth + 1));
    }
    return new Sequence(items, place);
  }

  private Place place(String path) {
    TokenStreamLocation at = parser.currentTokenLocation();
    return new Place(file, Math.max(at.getLineNr(), 0), Math.max(at.getColumnNr(), 0), path);
  }

  private boolean isQuoted(Place place) {
    if (parser.currentToken() != JsonToken.VALUE_STRING) {
      return false;
    }
    return json || "\"'|>".indexOf(characterAt(place)) >= 0;
  }

  /** The parser says where a token starts, in characters, but not how it was quoted. */
  private int characterAt(Place place) {
    if (place.line() < 1 || place.line() > lines.length) {
      return ' ';
    }
    String line = lines[place.line() - 1];
    int before = place.column() - 1;
    if (before < 0 || before >= line.codePointCount(0, line.length())) {
      return ' ';
    }
    return line.codePointAt(line.offsetByCodePoints(0, before));
  }
}
