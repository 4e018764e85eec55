package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import java.util.ArrayList;
import java.util.List;

/** Collects the shapes of a drawing, back to front. */
public final class Canvas {

  private static final double HATCH_STEP_PX = 6;

  private final double width;
  private final List<Shape> shapes = new ArrayList<>();

  /** A canvas so many px wide. */
  public Canvas(double width) {
    this.width = width;
  }

  /** Adds a rectangle. */
  public void box(double x, double y, double w, double h, String look, String note) {
    shapes.add(new Shape.Box(x, y, w, h, look, note));
  }

  /** Adds a straight line. */
  public void stroke(double x1, double y1, double x2, double y2, String look) {
    shapes.add(new Shape.Stroke(x1, y1, x2, y2, look));
  }

  /** Adds a path. */
  public void outline(Path path, String look, String note) {
    if (!path.isEmpty()) {
      shapes.add(new Shape.Outline(path, look, note));
    }
  }

  /** Adds a text. */
  public void label(double x, double y, String text, Anchor anchor, String look) {
    shapes.add(new Shape.Label(x, y, text, anchor, look));
  }

  /** Hatches a rectangle with rising lines. */
  public void hatch(double x, double y, double w, double h, String look) {
    Path path = new Path();
    for (double c = HATCH_STEP_PX; c < w + h; c += HATCH_STEP_PX) {
      double x1 = Math.min(c, w);
      double y1 = c - x1;
      double y2 = Math.min(c, h);
      double x2 = c - y2;
      path.move(x + x2, y + y2).line(x + x1, y + y1);
    }
    outline(path, look, "");
  }

  /** The drawing, so many px high. */
  public Drawing drawing(double height) {
    return new Drawing(width, height, shapes);
  }
}
