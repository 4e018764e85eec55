package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/**
 * The stack as drawn beside the stack found, thin layers on one scale, thick ones cut short with a
 * break.
 *
 * @param drawn layers as drawn, light from above; empty to show the found stack alone
 * @param found layers as found
 */
public record StackPicture(List<Slab> drawn, List<Slab> found) implements Figure.Sketch {

  /**
   * A layer.
   *
   * @param name its name
   * @param role class of the style sheet: a subcell's, {@code parasitic} or {@code medium}
   * @param thicknessNm thickness in nm, NaN for the incident and exit medium
   * @param note further property, such as a bandgap
   * @param window thicknesses that are as good; null where it was not to vary
   */
  public record Slab(
      String name, String role, double thicknessNm, String note, @Nullable Window window) {}

  /**
   * Thicknesses that are as good as the one found.
   *
   * @param lowNm thinnest
   * @param highNm thickest
   * @param bound {@code lower} or {@code upper} where the value stands on the end of what was
   *     allowed, else empty
   */
  public record Window(double lowNm, double highNm, String bound) {

    String text() {
      String range = lowNm < highNm ? Numbers.range(lowNm, highNm, "nm") + " nm" : "";
      String end = bound.isEmpty() ? "" : bound + " bound";
      return range.isEmpty() || end.isEmpty() ? range + end : range + " · " + end;
    }
  }

  private static final double SCALED_PX = 300;
  private static final double BROKEN_PX = 56;
  private static final double MEDIUM_PX = 22;
  private static final double LEAST_PX = 3;
  private static final double BREAK_FROM_NM = 3000;
  private static final double LINE_PX = 16;

  /** Copies the lists. */
  public StackPicture {
    drawn = List.copyOf(drawn);
    found = List.copyOf(found);
  }

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    double column = widthPx > 600 ? 118 : 54;
    double pxPerNm = pxPerNm();
    double height = Math.max(height(drawn, pxPerNm), height(found, pxPerNm));
    height = Math.max(height, found.size() * LINE_PX);
    if (drawn.isEmpty()) {
      double x = widthPx / 2 - column;
      column(canvas, found, x, column, pxPerNm);
      namesLeft(canvas, found, x, height, pxPerNm, false, widthPx);
      valuesRight(canvas, found, List.of(), x + column, height, pxPerNm, widthPx);
    } else {
      both(canvas, widthPx, column, height, pxPerNm);
    }
    return canvas.drawing(TOP + height + 6);
  }

  private static final double TOP = 24;

  private void both(Canvas canvas, double widthPx, double column, double height, double pxPerNm) {
    double gap = widthPx > 600 ? 90 : 26;
    double left = widthPx * (widthPx > 600 ? 0.5 : 0.52) - column - gap / 2;
    double right = left + column + gap;
    joints(canvas, left + column, right, pxPerNm);
    column(canvas, drawn, left, column, pxPerNm);
    column(canvas, found, right, column, pxPerNm);
    canvas.label(left + column / 2, 13, "as drawn", Anchor.MIDDLE, "name");
    canvas.label(right + column / 2, 13, "found", Anchor.MIDDLE, "name");
    if (widthPx > 600 && found.stream().anyMatch(slab -> slab.window() != null)) {
      canvas.label(right + column + 100, 13, "equally good", Anchor.START, "tick");
    }
    brackets(canvas, right - 6, pxPerNm);
    namesLeft(canvas, drawn, left, height, pxPerNm, true, widthPx);
    valuesRight(canvas, found, drawn, right + column, height, pxPerNm, widthPx);
  }

  private double pxPerNm() {
    double thickest = Math.max(scaledNm(drawn), scaledNm(found));
    return thickest > 0 ? SCALED_PX / thickest : 1;
  }

  private static double scaledNm(List<Slab> slabs) {
    return slabs.stream().mapToDouble(Slab::thicknessNm).filter(nm -> nm < BREAK_FROM_NM).sum();
  }

  private static double px(Slab slab, double pxPerNm) {
    if (Double.isNaN(slab.thicknessNm())) {
      return MEDIUM_PX;
    }
    if (slab.thicknessNm() >= BREAK_FROM_NM) {
      return BROKEN_PX;
    }
    return slab.thicknessNm() == 0 ? 0 : Math.max(LEAST_PX, slab.thicknessNm() * pxPerNm);
  }

  private static double height(List<Slab> slabs, double pxPerNm) {
    return slabs.stream().mapToDouble(slab -> px(slab, pxPerNm)).sum();
  }

  private static void column(
      Canvas canvas, List<Slab> slabs, double x, double column, double pxPerNm) {
    double y = TOP;
    for (Slab slab : slabs) {
      double high = px(slab, pxPerNm);
      canvas.box(x, y, column, high, "part fill-" + slab.role(), slab.name() + " " + value(slab));
      if (slab.thicknessNm() >= BREAK_FROM_NM) {
        zigzag(canvas, x, y + high / 2, column);
      }
      y += high;
    }
  }

  private static void zigzag(Canvas canvas, double x, double y, double column) {
    Path path = new Path().move(x, y);
    int teeth = (int) (column / 9);
    for (int i = 1; i <= teeth; i++) {
      path.line(x + column * i / teeth, y + (i % 2 == 0 ? 0 : 6));
    }
    canvas.outline(path, "break", "");
  }

  private void joints(Canvas canvas, double x1, double x2, double pxPerNm) {
    Map<String, double[]> there = new java.util.HashMap<>();
    double y = TOP;
    for (Slab slab : found) {
      there.put(slab.name(), new double[] {y, y += px(slab, pxPerNm)});
    }
    y = TOP;
    for (Slab slab : drawn) {
      double end = y + px(slab, pxPerNm);
      double[] to = there.get(slab.name());
      if (to != null && slab.role().startsWith("sub")) {
        Path band = new Path().move(x1, y).line(x2, to[0]).line(x2, to[1]).line(x1, end).close();
        canvas.outline(band, "band pale-" + slab.role(), "");
      }
      y = end;
    }
  }

  /** To scale: from the upper face of a layer, where its lower face may lie. */
  private void brackets(Canvas canvas, double x, double pxPerNm) {
    double y = TOP;
    for (Slab slab : found) {
      Window window = slab.window();
      if (window != null
          && window.lowNm() < window.highNm()
          && slab.thicknessNm() < BREAK_FROM_NM) {
        double from = y + window.lowNm() * pxPerNm;
        double to = y + window.highNm() * pxPerNm;
        canvas.outline(
            new Path().move(x + 4, from).line(x, from).line(x, to).line(x + 4, to),
            "bracket",
            slab.name() + " " + window.text());
      }
      y += px(slab, pxPerNm);
    }
  }

  private static double[] centres(List<Slab> slabs, double pxPerNm) {
    double[] centres = new double[slabs.size()];
    double y = TOP;
    for (int i = 0; i < centres.length; i++) {
      double high = px(slabs.get(i), pxPerNm);
      centres[i] = y + high / 2;
      y += high;
    }
    return centres;
  }

  private static double[] spread(double[] wanted, double height) {
    double[] size = new double[wanted.length];
    java.util.Arrays.fill(size, LINE_PX);
    return Spread.apart(wanted, size, TOP - 2, TOP + height + 2);
  }

  private static void namesLeft(
      Canvas canvas,
      List<Slab> slabs,
      double x,
      double height,
      double pxPerNm,
      boolean withValue,
      double widthPx) {
    double[] wanted = centres(slabs, pxPerNm);
    double[] at = spread(wanted, height);
    boolean wide = widthPx > 600;
    for (int i = 0; i < at.length; i++) {
      Slab slab = slabs.get(i);
      leader(canvas, x, wanted[i], -14, at[i]);
      if (withValue && wide) {
        canvas.label(x - 18, at[i] + 4, value(slab), Anchor.END, "tick");
      }
      double end = withValue && wide ? x - 128 : x - 18;
      String name = Clip.to(slab.name(), wide ? 30 : (int) (end / 7));
      canvas.label(end, at[i] + 4, name, Anchor.END, "part-name");
    }
  }

  private static void valuesRight(
      Canvas canvas,
      List<Slab> slabs,
      List<Slab> before,
      double x,
      double height,
      double pxPerNm,
      double widthPx) {
    double[] wanted = centres(slabs, pxPerNm);
    double[] at = spread(wanted, height);
    boolean wide = widthPx > 600;
    for (int i = 0; i < at.length; i++) {
      Slab slab = slabs.get(i);
      OptionalDouble old =
          before.stream()
              .filter(b -> b.name().equals(slab.name()))
              .mapToDouble(Slab::thicknessNm)
              .findFirst();
      boolean moved = old.isPresent() && Math.abs(old.getAsDouble() - slab.thicknessNm()) >= 0.05;
      leader(canvas, x, wanted[i], 14, at[i]);
      String look = moved ? "part-value" : "tick";
      Window window = slab.window();
      boolean onBound = window != null && !window.bound().isEmpty();
      String value = value(slab) + (onBound && !wide ? ", bound" : "");
      canvas.label(x + 18, at[i] + 4, value, Anchor.START, look);
      List<String> more = new ArrayList<>();
      if (window != null && !window.text().isEmpty()) {
        more.add(window.text());
      } else if (moved) {
        more.add(Numbers.change(slab.thicknessNm() - old.getAsDouble(), "nm"));
      }
      if (!slab.note().isEmpty()) {
        more.add(slab.note());
      }
      if (wide && !more.isEmpty()) {
        canvas.label(x + 100, at[i] + 4, String.join(" · ", more), Anchor.START, "tick");
      }
    }
  }

  private static void leader(Canvas canvas, double x, double from, double dx, double to) {
    if (Math.abs(from - to) > 1) {
      canvas.outline(
          new Path().move(x, from).line(x + dx / 2, from).line(x + dx, to), "leader", "");
    } else {
      canvas.stroke(x, from, x + dx, to, "leader");
    }
  }

  private static String value(Slab slab) {
    return Double.isNaN(slab.thicknessNm()) ? "" : Numbers.thickness(slab.thicknessNm());
  }
}
