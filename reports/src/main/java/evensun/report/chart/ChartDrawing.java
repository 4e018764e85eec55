package evensun.report.chart;

import evensun.report.figure.Canvas;
import evensun.report.figure.Drawing;
import evensun.report.figure.Path;
import evensun.report.figure.Shape.Anchor;
import evensun.report.figure.Ticks;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/**
 * Draws a chart as plain shapes.
 *
 * @param chart what to draw
 */
record ChartDrawing(Chart chart) {

  private static final double TOP = 26;
  private static final double BOTTOM = 44;
  private static final double LEFT = 58;
  private static final double LABEL_ROOM_PX = 16;
  private static final double HALF_LETTER_PX = 3.6;
  private static final double BUNCHED_PX = 24;
  private static final double POINTS_PER_PX = 0.3;
  private static final int MOST_SPOTS = 60;

  /** The inner frame in px. */
  private record Frame(Chart chart, double left, double top, double width, double height) {

    double x(double value) {
      return left + chart.x().fraction(value) * width;
    }

    double[] xs() {
      double[] xs = new double[chart.xs().size()];
      for (int i = 0; i < xs.length; i++) {
        xs[i] = x(chart.xs().get(i));
      }
      return xs;
    }

    double y(double value) {
      double fraction = Math.max(-0.02, Math.min(1.02, chart.y().fraction(value)));
      return top + height - fraction * height;
    }

    double bottom() {
      return top + height;
    }

    double right() {
      return left + width;
    }
  }

  Drawing draw(double widthPx) {
    int most = (int) (widthPx * POINTS_PER_PX);
    return chart.kind() != Kind.POINTS && chart.xs().size() > most
        ? new ChartDrawing(chart.thinned(most)).drawAll(widthPx)
        : drawAll(widthPx);
  }

  private Drawing drawAll(double widthPx) {
    boolean wide = widthPx > 600;
    double high = wide ? 330 : 250;
    boolean named = chart.kind() == Kind.LINES && wide && !bunched(high - TOP - BOTTOM);
    double right = named ? 150 : 14;
    Canvas canvas = new Canvas(widthPx);
    Frame frame = new Frame(chart, LEFT, TOP, widthPx - LEFT - right, high - TOP - BOTTOM);
    axes(canvas, frame, wide);
    switch (chart.kind()) {
      case STACK -> stack(canvas, frame, wide);
      case LINES -> lines(canvas, frame, named);
      case POINTS -> points(canvas, frame);
    }
    marks(canvas, frame);
    canvas.stroke(frame.left(), frame.bottom(), frame.right(), frame.bottom(), "axis");
    return canvas.drawing(high);
  }

  private void axes(Canvas canvas, Frame frame, boolean wide) {
    for (double tick : ticks(chart.y(), 5)) {
      double y = frame.y(tick);
      canvas.stroke(frame.left(), y, frame.right(), y, "grid");
      canvas.label(frame.left() - 8, y + 4, text(chart.y(), tick, 5), Anchor.END, "tick");
    }
    int wanted = wide ? 9 : 4;
    for (double tick : ticks(chart.x(), wanted)) {
      double x = frame.x(tick);
      canvas.stroke(x, frame.bottom(), x, frame.bottom() + 5, "axis");
      canvas.label(x, frame.bottom() + 19, text(chart.x(), tick, wanted), Anchor.MIDDLE, "tick");
    }
    canvas.label(0, 13, chart.y().title(), Anchor.START, "axis-name");
    canvas.label(frame.right(), frame.bottom() + 37, chart.x().title(), Anchor.END, "axis-name");
  }

  private static List<Double> ticks(Axis axis, int wanted) {
    if (!axis.logarithmic()) {
      return Ticks.of(axis.min(), axis.max(), wanted);
    }
    List<Double> ticks = new ArrayList<>();
    double from = Math.ceil(Math.log10(axis.min()) - 1e-9);
    double to = Math.floor(Math.log10(axis.max()) + 1e-9);
    double step = Math.max(1, Math.ceil((to - from) / wanted));
    for (double power = from; power <= to; power += step) {
      ticks.add(Math.pow(10, power));
    }
    return ticks;
  }

  private static String text(Axis axis, double tick, int wanted) {
    return axis.logarithmic()
        ? Numbers.powerOfTen((int) Math.round(Math.log10(tick)))
        : Numbers.fixed(tick, Ticks.decimals(Ticks.step(axis.min(), axis.max(), wanted)));
  }

  private void stack(Canvas canvas, Frame frame, boolean wide) {
    double[] x = frame.xs();
    double[] sum = new double[x.length];
    double[] base = new double[x.length];
    Arrays.fill(base, frame.y(0));
    List<Area> areas = new ArrayList<>();
    for (Series row : chart.series()) {
      double[] top = new double[x.length];
      Path path = new Path();
      for (int i = 0; i < x.length; i++) {
        sum[i] += orZero(row.values().get(i));
        top[i] = frame.y(sum[i]);
        point(path, i, x[i], top[i]);
      }
      for (int i = x.length - 1; i >= 0; i--) {
        path.line(x[i], base[i]);
      }
      canvas.outline(path.close(), "part fill-" + row.role(), row.label());
      areas.add(new Area(row, base, top));
      base = top;
    }
    areas.forEach(area -> name(canvas, frame, area, x, wide));
  }

  private static double orZero(@Nullable Double value) {
    return value == null ? 0 : value;
  }

  private static void point(Path path, int index, double x, double y) {
    if (index == 0) {
      path.move(x, y);
    } else {
      path.line(x, y);
    }
  }

  /** An area of a stack: the y of its lower and upper edge at each point, in px. */
  private record Area(Series row, double[] base, double[] top) {}

  /** Names an area where it is thick enough for the whole name, near its middle. */
  private static void name(Canvas canvas, Frame frame, Area area, double[] x, boolean wide) {
    String text = Clip.to(area.row().label(), wide ? 34 : 16);
    int half = (int) Math.ceil(text.length() * HALF_LETTER_PX / frame.width() * x.length) + 1;
    int step = 1 + x.length / MOST_SPOTS;
    Spot best = null;
    double centre = centre(area.row());
    for (int i = half; i < x.length - half; i += step) {
      Spot spot = Spot.at(frame, area, i, half, centre);
      best =
          spot.room() > LABEL_ROOM_PX && (best == null || spot.score() > best.score())
              ? spot
              : best;
    }
    if (best != null) {
      String look = "part-name on-" + area.row().role();
      canvas.label(x[best.index()], best.y() + 4, text, Anchor.MIDDLE, look);
    }
  }

  /** Index of the middle of an area. */
  private static double centre(Series row) {
    double weight = 0;
    double moment = 0;
    for (int i = 0; i < row.values().size(); i++) {
      weight += orZero(row.values().get(i));
      moment += i * orZero(row.values().get(i));
    }
    return weight > 0 ? moment / weight : 0;
  }

  /** A place for a name: its room from edge to edge in px, and how good it is. */
  private record Spot(int index, double y, double room, double score) {

    static Spot at(Frame frame, Area area, int index, int half, double centre) {
      double low = frame.bottom();
      double high = frame.top();
      for (int k = index - half; k <= index + half; k++) {
        low = Math.min(low, area.base()[k]);
        high = Math.max(high, area.top()[k]);
      }
      double away = Math.abs(index - centre) / area.base().length * frame.height() / 10;
      return new Spot(
          index, (low + high) / 2, low - high, Math.min(low - high, frame.height() / 4) - away);
    }
  }

  private record End(Series row, double y) {}

  private void lines(Canvas canvas, Frame frame, boolean named) {
    double[] x = frame.xs();
    List<End> ends = new ArrayList<>();
    for (Series row : chart.series()) {
      Path path = new Path();
      boolean pen = false;
      double lastY = Double.NaN;
      for (int i = 0; i < x.length; i++) {
        Double value = row.values().get(i);
        if (value == null) {
          pen = false;
          continue;
        }
        lastY = frame.y(value);
        point(path, pen ? 1 : 0, x[i], lastY);
        pen = true;
      }
      canvas.outline(
          path, "line line-" + row.role() + (row.dashed() ? " dashed" : ""), row.label());
      if (!Double.isNaN(lastY)) {
        ends.add(new End(row, lastY));
      }
    }
    if (named) {
      endLabels(canvas, frame, ends);
    }
  }

  /** Whether names at the ends of lines would stand far from them; the legend has them anyway. */
  private boolean bunched(double height) {
    double edge = Double.NEGATIVE_INFINITY;
    double farthest = 0;
    for (double y :
        chart.series().stream().mapToDouble(row -> endY(row, height)).sorted().toArray()) {
      edge = Math.max(y, edge + LABEL_ROOM_PX);
      farthest = Math.max(farthest, edge - y);
    }
    return farthest > BUNCHED_PX;
  }

  private double endY(Series row, double height) {
    double last = 0;
    for (Double value : row.values()) {
      last = value == null ? last : value;
    }
    return (1 - chart.y().fraction(last)) * height;
  }

  private static void endLabels(Canvas canvas, Frame frame, List<End> ends) {
    List<End> sorted = ends.stream().sorted(Comparator.comparingDouble(End::y)).toList();
    double edge = frame.top() - 8;
    for (End end : sorted) {
      double y = Math.max(end.y(), edge + 14);
      edge = y;
      String text = Clip.to(end.row().label(), 20);
      canvas.label(
          frame.right() + 8, y + 4, text, Anchor.START, "part-name ink-" + end.row().role());
    }
  }

  /** A single point of a series stands out and is named. */
  private void points(Canvas canvas, Frame frame) {
    for (Series row : chart.series()) {
      boolean single = row.values().stream().filter(Objects::nonNull).count() == 1;
      double half = single ? 5.5 : 2.5;
      for (int i = 0; i < chart.xs().size(); i++) {
        Double value = row.values().get(i);
        if (value == null) {
          continue;
        }
        double x = frame.x(chart.xs().get(i));
        double y = frame.y(value);
        canvas.box(x - half, y - half, 2 * half, 2 * half, "dot fill-" + row.role(), row.label());
        if (single) {
          boolean left = x > (frame.left() + frame.right()) / 2;
          Anchor anchor = left ? Anchor.END : Anchor.START;
          String name = Clip.to(row.label(), 20);
          canvas.label(x + (left ? -11 : 11), y + 4, name, anchor, "part-name halo");
        }
      }
    }
  }

  private void marks(Canvas canvas, Frame frame) {
    for (Mark mark : chart.marks()) {
      double x = frame.x(mark.x());
      if (x < frame.left() - 1 || x > frame.right() + 1) {
        continue;
      }
      canvas.stroke(x, frame.top() - 4, x, frame.bottom(), "mark");
      boolean left = x > (frame.left() + frame.right()) / 2;
      canvas.label(
          x + (left ? -5 : 5),
          frame.top() - 8,
          mark.label(),
          left ? Anchor.END : Anchor.START,
          "tick halo");
    }
  }
}
