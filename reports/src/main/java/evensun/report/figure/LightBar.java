package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The available current as one bar, split in the light's order: as drawn above, found below, and
 * between them how each part moved.
 *
 * @param drawn the upper bar; null for a single bar
 * @param found the lower bar
 */
public record LightBar(@Nullable Budget drawn, Budget found) implements Figure.Sketch {

  private static final double BAR = 46;
  private static final double GAP = 34;
  private static final double LABELS = 58;
  private static final double TITLE = 18;
  private static final double FONT = 12;

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    double y = TITLE + LABELS;
    if (drawn != null) {
      title(canvas, "as drawn", drawn, TITLE - 4);
      outsideLabels(canvas, drawn, y, true, widthPx);
      connect(canvas, drawn, found, y + BAR, y + BAR + GAP, widthPx);
      bar(canvas, drawn, y, widthPx);
      y += BAR + GAP;
    } else {
      y = 8;
    }
    bar(canvas, found, y, widthPx);
    outsideLabels(canvas, found, y + BAR, false, widthPx);
    double end = y + BAR + LABELS;
    title(canvas, drawn == null ? "" : "found", found, end + TITLE - 4);
    return canvas.drawing(end + TITLE + 2);
  }

  private static void title(Canvas canvas, String what, Budget budget, double y) {
    String total = "available " + Numbers.ma(budget.incidentMaPerCm2());
    canvas.label(0, y, what.isEmpty() ? total : what + " · " + total, Anchor.START, "tick");
  }

  private static void bar(Canvas canvas, Budget budget, double y, double widthPx) {
    double x = 0;
    for (Share share : budget.shares()) {
      double wide = px(share.maPerCm2(), budget, widthPx);
      canvas.box(
          x,
          y,
          wide,
          BAR,
          "part fill-" + share.role(),
          share.label() + " " + Numbers.ma(share.maPerCm2()));
      insideLabel(canvas, share, x, y, wide);
      x += wide;
    }
  }

  private static void insideLabel(Canvas canvas, Share share, double x, double y, double wide) {
    if (!fitsInside(share, wide)) {
      return;
    }
    String on = " on-" + share.role();
    canvas.label(x + wide / 2, y + 20, share.label(), Anchor.MIDDLE, "part-name" + on);
    canvas.label(
        x + wide / 2, y + 37, Numbers.fixed(share.maPerCm2(), 2), Anchor.MIDDLE, "part-value" + on);
  }

  private static boolean fitsInside(Share share, double wide) {
    return wide > Math.max(38, Widths.of(share.label(), FONT) + 8);
  }

  private static double px(double maPerCm2, Budget budget, double widthPx) {
    return Math.max(0, maPerCm2) / budget.incidentMaPerCm2() * widthPx;
  }

  /** Names the parts too narrow to hold their name, above or below the bar, as room allows. */
  private static void outsideLabels(
      Canvas canvas, Budget budget, double edge, boolean above, double widthPx) {
    List<Share> shares = new ArrayList<>();
    List<Double> centres = new ArrayList<>();
    double x = 0;
    for (Share share : budget.shares()) {
      double wide = px(share.maPerCm2(), budget, widthPx);
      if (!fitsInside(share, wide) && share.maPerCm2() >= 0.005) {
        shares.add(share);
        centres.add(x + wide / 2);
      }
      x += wide;
    }
    keepLargest(shares, centres, widthPx);
    placeLabels(canvas, shares, centres, edge, above ? -1 : 1, widthPx);
  }

  private static void keepLargest(List<Share> shares, List<Double> centres, double widthPx) {
    while (shares.stream().mapToDouble(LightBar::labelWidth).sum() > widthPx) {
      int smallest = 0;
      for (int i = 1; i < shares.size(); i++) {
        smallest = shares.get(i).maPerCm2() < shares.get(smallest).maPerCm2() ? i : smallest;
      }
      shares.remove(smallest);
      centres.remove(smallest);
    }
  }

  private static void placeLabels(
      Canvas canvas,
      List<Share> shares,
      List<Double> centres,
      double edge,
      int down,
      double widthPx) {
    double[] wanted = centres.stream().mapToDouble(Double::doubleValue).toArray();
    double[] size = shares.stream().mapToDouble(LightBar::labelWidth).toArray();
    double[] at = Spread.apart(wanted, size, 0, widthPx);
    for (int i = 0; i < at.length; i++) {
      Share share = shares.get(i);
      Path leader = new Path().move(wanted[i], edge + down * 2).line(wanted[i], edge + down * 8);
      canvas.outline(leader.line(at[i], edge + down * 20), "leader", "");
      double first = down > 0 ? edge + 33 : edge - 40;
      canvas.label(at[i], first, shown(share), Anchor.MIDDLE, "part-name");
      canvas.label(
          at[i], first + 15, Numbers.fixed(share.maPerCm2(), 2), Anchor.MIDDLE, "part-value");
    }
  }

  private static double labelWidth(Share share) {
    return Math.max(34, Widths.of(shown(share), FONT)) + 12;
  }

  private static String shown(Share share) {
    return Clip.to(share.label(), 26);
  }

  private static void connect(
      Canvas canvas, Budget upper, Budget lower, double y1, double y2, double widthPx) {
    double x1 = 0;
    double x2 = 0;
    for (Share share : upper.shares()) {
      double wide1 = px(share.maPerCm2(), upper, widthPx);
      double wide2 = px(lower.of(share.label()), lower, widthPx);
      if (share.collected()) {
        Path band = new Path().move(x1, y1).line(x1 + wide1, y1).line(x2 + wide2, y2);
        canvas.outline(band.line(x2, y2).close(), "band pale-" + share.role(), "");
      }
      x1 += wide1;
      x2 += wide2;
    }
  }
}
