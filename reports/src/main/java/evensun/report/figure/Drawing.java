package evensun.report.figure;

import java.util.List;

/**
 * A drawing of plain shapes.
 *
 * @param width width of the frame in px
 * @param height height of the frame in px
 * @param shapes back to front
 */
public record Drawing(double width, double height, List<Shape> shapes) {

  /** Copies the shapes. */
  public Drawing {
    shapes = List.copyOf(shapes);
  }

  /** The frame as SVG's viewBox. */
  public String viewBox() {
    return "0 0 " + Path.number(width) + " " + Path.number(height);
  }
}
