package evensun.report.gaps;

import evensun.result.BandgapMap;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * A map as contours: lines in one hue, darker upward; the ridge shaded; the half where the gaps
 * stand in the wrong order hatched; the optimum marked.
 */
final class MapFigure {

  private static final int MOST_LINES = 12;
  private static final int CLOSE_LINES = 4;
  private static final double LABEL_WIDTH = 40;
  private static final double LABEL_HEIGHT = 15;

  private final BandgapMap map;
  private final List<Double> across;
  private final List<Double> upward;
  private final Frame frame;
  private final List<double[]> labels = new ArrayList<>();

  private MapFigure(BandgapMap map) {
    this.map = map;
    this.upward = map.axisEv().get(0);
    this.across = map.axisEv().get(1);
    this.frame =
        new Frame(
            across.get(0),
            across.get(across.size() - 1),
            upward.get(0),
            upward.get(upward.size() - 1));
  }

  static String of(BandgapMap map) {
    return new MapFigure(map).svg();
  }

  private String svg() {
    StringBuilder svg = new StringBuilder();
    svg.append(
        """
        <svg viewBox="0 0 %d %d" role="img" aria-labelledby="map-title">
        <title id="map-title">%s</title>
        <defs><pattern id="hatch" width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><path d="M0 0V8" class="hatch"/></pattern></defs>
        """
            .formatted(Frame.WIDTH, Frame.HEIGHT, title()));
    wrongOrder(svg);
    ridge(svg);
    lines(svg);
    svg.append(frame.axes(axis(1), axis(0)));
    optimum(svg);
    return svg.append("</svg>\n").toString();
  }

  private String title() {
    return "Efficiency over the %s and %s bandgap: best %.2f %% at %s eV"
        .formatted(
            map.axes().get(0),
            map.axes().get(1),
            map.optimum().efficiencyPercent(),
            GapPage.gaps(map.optimum()));
  }

  private String axis(int index) {
    return "bandgap of the " + map.axes().get(index) + " junction (eV)";
  }

  /** Where the upper gap is not above the lower one: right of and below the diagonal. */
  private void wrongOrder(StringBuilder svg) {
    double low = Math.max(frame.fromX(), frame.fromY());
    double high = Math.min(frame.toX(), frame.toY());
    if (frame.toX() <= frame.fromY()) {
      return;
    }
    List<String> corners = new ArrayList<>();
    if (frame.fromX() < low) {
      corners.add(frame.point(low, low));
    } else {
      corners.add(frame.point(frame.fromX(), frame.fromX()));
      corners.add(frame.point(frame.fromX(), frame.fromY()));
    }
    corners.add(frame.point(frame.toX(), frame.fromY()));
    corners.add(frame.point(frame.toX(), high));
    corners.add(frame.point(high, high));
    svg.append("<path fill=\"url(#hatch)\" d=\"M")
        .append(String.join("L", corners))
        .append("Z\"/>\n")
        .append(
            String.format(
                Locale.ROOT,
                "<text class=\"note\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"end\">wrong order for the light</text>\n",
                frame.x(frame.toX()) - 14,
                frame.y(frame.fromY()) - 14));
  }

  /** The cells whose points are all equally good. */
  private void ridge(StringBuilder svg) {
    double half = 0.5;
    StringBuilder d = new StringBuilder();
    for (int r = 0; r < upward.size(); r++) {
      for (int c = 0; c < across.size(); c++) {
        Double value = map.efficiencyPercent().get(r).get(c);
        if (value != null && value >= map.ridgeFromPercent()) {
          d.append('M')
              .append(frame.point(at(across, c - half), at(upward, r - half)))
              .append('H')
              .append(String.format(Locale.ROOT, "%.1f", frame.x(at(across, c + half))))
              .append('V')
              .append(String.format(Locale.ROOT, "%.1f", frame.y(at(upward, r + half))))
              .append('H')
              .append(String.format(Locale.ROOT, "%.1f", frame.x(at(across, c - half))))
              .append('Z');
        }
      }
    }
    svg.append("<path class=\"ridge\" d=\"").append(d).append("\"/>\n");
  }

  private void lines(StringBuilder svg) {
    Contours contours = new Contours(map.efficiencyPercent());
    List<Double> levels = levels();
    for (int i = levels.size() - 1; i >= 0; i--) {
      List<Contours.Piece> pieces = contours.at(levels.get(i));
      if (!pieces.isEmpty()) {
        line(svg, levels.get(i), pieces, (i + 1.0) / levels.size());
      }
    }
  }

  private void line(StringBuilder svg, double level, List<Contours.Piece> pieces, double share) {
    String d =
        pieces.stream()
            .map(
                p ->
                    "M"
                        + frame.point(at(across, p.x1()), at(upward, p.y1()))
                        + "L"
                        + frame.point(at(across, p.x2()), at(upward, p.y2())))
            .collect(Collectors.joining());
    svg.append(
        String.format(
            Locale.ROOT,
            "<path class=\"line\" stroke-opacity=\"%.2f\" d=\"%s\"/>\n",
            0.35 + 0.65 * share,
            d));
    Contours.Piece highest = pieces.get(0);
    for (Contours.Piece piece : pieces) {
      highest = piece.y1() > highest.y1() ? piece : highest;
    }
    double x = Math.max(Frame.LEFT + 22, frame.x(at(across, highest.x1())));
    double y = Math.max(Frame.TOP + 12, frame.y(at(upward, highest.y1())) + 4);
    if (isFree(x, y)) {
      labels.add(new double[] {x, y});
      svg.append(
          String.format(
              Locale.ROOT,
              "<text class=\"level\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"middle\">%.0f %%</text>\n",
              x,
              y,
              level));
    }
  }

  private boolean isFree(double x, double y) {
    return labels.stream()
        .allMatch(
            other -> Math.abs(other[0] - x) > LABEL_WIDTH || Math.abs(other[1] - y) > LABEL_HEIGHT);
  }

  /** Whole percents close to the optimum, below them every five. */
  private List<Double> levels() {
    double top = Math.floor(map.optimum().efficiencyPercent());
    List<Double> levels = new ArrayList<>();
    for (double level = top; level > Math.max(0, top - CLOSE_LINES); level--) {
      levels.add(0, level);
    }
    double coarse = Math.ceil((top - CLOSE_LINES + 1) / 5) * 5 - 5;
    for (double level = coarse; level > 0 && levels.size() < MOST_LINES; level -= 5) {
      levels.add(0, level);
    }
    return levels;
  }

  private void optimum(StringBuilder svg) {
    int row = map.conditions().junctions().indexOf(map.axes().get(0));
    int column = map.conditions().junctions().indexOf(map.axes().get(1));
    double x = frame.x(map.optimum().gapsEv().get(column));
    double y = frame.y(map.optimum().gapsEv().get(row));
    svg.append(
        String.format(
            Locale.ROOT,
            "<path class=\"best\" d=\"M%.1f %.1fh14m-7 -7v14\"/>\n<text class=\"best-name\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"end\">%.2f %%</text>\n",
            x - 7,
            y,
            x - 12,
            y + 5,
            map.optimum().efficiencyPercent()));
  }

  /** The gap at a place between points of the mesh, or half a step beyond its ends. */
  private static double at(List<Double> axis, double index) {
    if (axis.size() == 1) {
      return axis.get(0);
    }
    int low = (int) Math.min(axis.size() - 2.0, Math.max(0, Math.floor(index)));
    double value = axis.get(low) + (index - low) * (axis.get(low + 1) - axis.get(low));
    return Math.max(axis.get(0), Math.min(axis.get(axis.size() - 1), value));
  }
}
