package evensun.report.figure;

/**
 * A drawing in two sizes: one for screens and paper, one for a narrow screen.
 *
 * @param wide about 880 px
 * @param narrow about 360 px
 * @param description what it shows, in a sentence, for those who cannot see it
 */
public record Figure(Drawing wide, Drawing narrow, String description) {

  /** Width of the wide drawing in px. */
  public static final double WIDE_PX = 880;

  /** Width of the narrow drawing in px. */
  public static final double NARROW_PX = 360;

  /** Draws at both widths. */
  public static Figure of(Sketch sketch, String description) {
    return new Figure(sketch.draw(WIDE_PX), sketch.draw(NARROW_PX), description);
  }

  /** Draws at a width of its own where it stands beside something, and narrow. */
  public static Figure of(Sketch sketch, String description, double widePx) {
    return new Figure(sketch.draw(widePx), sketch.draw(NARROW_PX), description);
  }

  /** Something that can be drawn at a width. */
  @FunctionalInterface
  public interface Sketch {

    /** The drawing, so many px wide. */
    Drawing draw(double widthPx);
  }
}
