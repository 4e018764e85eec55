package evensun.report.figure;

/**
 * A shape of a drawing. Coordinates in px of its frame; {@code look} is a class of the style sheet.
 */
public sealed interface Shape {

  /** Class of the style sheet that gives colour and stroke. */
  String look();

  /**
   * A rectangle.
   *
   * @param note shown on hover, empty for none
   */
  record Box(double x, double y, double width, double height, String look, String note)
      implements Shape {

    /** Never a negative size, which browsers report as an error. */
    public Box {
      width = Math.max(0, width);
      height = Math.max(0, height);
    }
  }

  /** A straight line. */
  record Stroke(double x1, double y1, double x2, double y2, String look) implements Shape {}

  /**
   * A path.
   *
   * @param path its commands
   * @param note shown on hover, empty for none
   */
  record Outline(Path path, String look, String note) implements Shape {}

  /** Where a text is anchored. */
  enum Anchor {
    START,
    MIDDLE,
    END;

    /** As SVG spells it. */
    public String css() {
      return name().toLowerCase(java.util.Locale.ROOT);
    }
  }

  /** A line of text. */
  record Label(double x, double y, String text, Anchor anchor, String look) implements Shape {}
}
