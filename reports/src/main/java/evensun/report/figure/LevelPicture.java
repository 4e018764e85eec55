package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.Outcome;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The level picture: each subcell a vessel filled to its current, a line at the weakest, what
 * stands above it hatched.
 *
 * @param vessels in the order the light meets the subcells
 * @param levelMaPerCm2 the weakest current of a series device; null where the subcells are apart
 */
public record LevelPicture(List<Vessel> vessels, @Nullable Double levelMaPerCm2)
    implements Figure.Sketch {

  /**
   * A subcell.
   *
   * @param name its name
   * @param maPerCm2 its current
   * @param drawnMaPerCm2 its current as drawn, where that differs
   * @param standardErrorMaPerCm2 its statistical error, null where there is none
   */
  public record Vessel(
      String name,
      double maPerCm2,
      @Nullable Double drawnMaPerCm2,
      @Nullable Double standardErrorMaPerCm2) {}

  static final double TOP = 34;
  static final double DEPTH = 216;
  private static final double HEIGHT = TOP + DEPTH + 62;
  static final double LEFT = 34;
  private static final double ROOM_FOR_A_VALUE_PX = 30;
  private static final double VISIBLE_SURPLUS = 0.005;

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    double room = roomOnTheRight(widthPx);
    double slot = (widthPx - LEFT - room) / vessels.size();
    double pxPerMa = DEPTH / ceiling();
    scale(canvas, widthPx - room, ceiling());
    for (int i = 0; i < vessels.size(); i++) {
      double wide = Math.min(slot * 0.58, 150);
      vessel(canvas, i, LEFT + slot * i + (slot - wide) / 2, wide, slot, pxPerMa);
    }
    level(canvas, widthPx, room, pxPerMa);
    return canvas.drawing(HEIGHT);
  }

  private double roomOnTheRight(double widthPx) {
    return levelMaPerCm2 == null ? 8 : widthPx > 500 ? 116 : 62;
  }

  private double ceiling() {
    double largest = 0;
    for (Vessel vessel : vessels) {
      double drawn = vessel.drawnMaPerCm2() == null ? 0 : vessel.drawnMaPerCm2();
      largest = Math.max(largest, Math.max(vessel.maPerCm2(), drawn));
    }
    return Math.max(1e-9, largest * 1.04);
  }

  /** The scale at the left, up to a current. */
  static void scale(Canvas canvas, double right, double ceiling) {
    for (double tick : Ticks.of(0, ceiling, 5)) {
      double y = y(tick, DEPTH / ceiling);
      canvas.stroke(LEFT, y, right, y, "grid");
      canvas.label(LEFT - 6, y + 4, Numbers.trimmed(tick, 2), Anchor.END, "tick");
    }
    canvas.label(0, TOP - 18, Numbers.MA, Anchor.START, "tick");
  }

  /** Where a current stands. */
  static double y(double maPerCm2, double pxPerMa) {
    return TOP + DEPTH - maPerCm2 * pxPerMa;
  }

  private void vessel(
      Canvas canvas, int index, double x, double wide, double slot, double pxPerMa) {
    Vessel vessel = vessels.get(index);
    String role = Share.subcellRole(index);
    double filled = y(vessel.maPerCm2(), pxPerMa);
    double bottom = TOP + DEPTH;
    double level = levelMaPerCm2 == null ? vessel.maPerCm2() : levelMaPerCm2;
    double line = y(Math.min(level, vessel.maPerCm2()), pxPerMa);
    body(canvas, x, wide, line, filled, role);
    drawnMark(canvas, vessel, x, wide, pxPerMa);
    labels(canvas, vessel, role, x + wide / 2, slot, valueBelow(vessel, line, pxPerMa));
  }

  /**
   * A vessel with what is in it.
   *
   * @param line where the level stands in it
   * @param filled where what is above the level ends
   */
  static void body(Canvas canvas, double x, double wide, double line, double filled, String role) {
    double bottom = TOP + DEPTH;
    canvas.box(x, line, wide, bottom - line, "fill-" + role, "");
    if (line - filled > 0.5) {
      canvas.box(x, filled, wide, line - filled, "pale-" + role, "");
      canvas.hatch(x, filled, wide, line - filled, "hatch-" + role);
    }
    canvas.outline(
        new Path().move(x, TOP - 4).line(x, bottom).line(x + wide, bottom).line(x + wide, TOP - 4),
        "vessel",
        "");
  }

  private static void drawnMark(
      Canvas canvas, Vessel vessel, double x, double wide, double pxPerMa) {
    Double drawn = vessel.drawnMaPerCm2();
    if (drawn == null) {
      return;
    }
    double y = y(drawn, pxPerMa);
    canvas.stroke(x - 6, y, x + wide + 6, y, "drawn");
  }

  /** Where the number in a vessel hangs from: the level, or the mark of the stack as drawn. */
  private static double valueBelow(Vessel vessel, double line, double pxPerMa) {
    Double drawn = vessel.drawnMaPerCm2();
    double mark = drawn == null ? line : y(drawn, pxPerMa);
    return mark > line && mark < line + ROOM_FOR_A_VALUE_PX ? mark : line;
  }

  private void labels(
      Canvas canvas, Vessel vessel, String role, double centre, double slot, double line) {
    double bottom = TOP + DEPTH;
    String inside = Numbers.fixed(vessel.maPerCm2(), 2);
    canvas.label(
        centre, Math.min(line + 24, bottom - 6), inside, Anchor.MIDDLE, "value on-" + role);
    String error = Numbers.plusMinus(vessel.standardErrorMaPerCm2()).strip();
    if (!error.isEmpty() && bottom - line > 60) {
      canvas.label(centre, line + 40, error, Anchor.MIDDLE, "tick on-" + role);
    }
    String name = Clip.to(vessel.name(), (int) Math.max(4, slot / 8.5));
    canvas.label(centre, bottom + 19, name, Anchor.MIDDLE, "name");
    Double drawn = vessel.drawnMaPerCm2();
    if (drawn != null) {
      String before = "drawn " + Numbers.fixed(drawn, 2);
      canvas.label(centre, bottom + 52, before, Anchor.MIDDLE, "tick");
    }
    double surplus = levelMaPerCm2 == null ? 0 : vessel.maPerCm2() - levelMaPerCm2;
    if (surplus >= VISIBLE_SURPLUS) {
      String unused = Numbers.signed(surplus, 2) + (slot > 110 ? " unused" : "");
      canvas.label(centre, bottom + 36, unused, Anchor.MIDDLE, "tick");
    } else if (levelMaPerCm2 != null && vessels.size() > 1) {
      canvas.label(
          centre, bottom + 36, balanced() ? "balanced" : "sets the level", Anchor.MIDDLE, "tick");
    }
  }

  private boolean balanced() {
    double low = vessels.stream().mapToDouble(Vessel::maPerCm2).min().orElse(0);
    double high = vessels.stream().mapToDouble(Vessel::maPerCm2).max().orElse(0);
    return high - low < Outcome.BALANCED_MA_PER_CM2;
  }

  private void level(Canvas canvas, double widthPx, double room, double pxPerMa) {
    if (levelMaPerCm2 == null) {
      return;
    }
    double y = y(levelMaPerCm2, pxPerMa);
    canvas.stroke(LEFT, y, widthPx - room + 4, y, "level");
    boolean wide = room > 100;
    canvas.label(
        widthPx - room + 10, y - 2, wide ? "the device passes" : "passes", Anchor.START, "tick");
    canvas.label(
        widthPx - room + 10, y + 16, Numbers.fixed(levelMaPerCm2, 2), Anchor.START, "value");
    if (wide) {
      canvas.label(widthPx - room + 10, y + 32, Numbers.MA, Anchor.START, "tick");
    }
  }
}
