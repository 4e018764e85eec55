package evensun.report.gaps;

import evensun.result.BandgapMap;
import java.util.List;
import java.util.Locale;

/** Efficiency against the one gap that varies; the ridge shaded. */
final class CurveFigure {

  private CurveFigure() {}

  static String of(BandgapMap map) {
    List<Double> gaps = map.axisEv().get(0);
    double best = map.optimum().efficiencyPercent();
    Frame frame = new Frame(gaps.get(0), gaps.get(gaps.size() - 1), 0, Math.ceil(best / 5) * 5);
    StringBuilder svg =
        new StringBuilder(
            """
            <svg viewBox="0 0 %d %d" role="img" aria-labelledby="map-title">
            <title id="map-title">Efficiency against the %s bandgap: best %.2f %% at %s eV</title>
            """
                .formatted(
                    Frame.WIDTH,
                    Frame.HEIGHT,
                    map.axes().get(0),
                    best,
                    GapPage.gaps(map.optimum())));
    ridge(svg, map, frame);
    StringBuilder d = new StringBuilder();
    for (int i = 0; i < gaps.size(); i++) {
      Double value = map.efficiencyPercent().get(i).get(0);
      if (value != null) {
        d.append(d.length() == 0 ? "M" : "L").append(frame.point(gaps.get(i), value));
      }
    }
    svg.append("<path class=\"line\" d=\"").append(d).append("\"/>\n");
    svg.append(
        frame.axes("bandgap of the " + map.axes().get(0) + " junction (eV)", "efficiency (%)"));
    return svg.append("</svg>\n").toString();
  }

  private static void ridge(StringBuilder svg, BandgapMap map, Frame frame) {
    int varied = map.conditions().junctions().indexOf(map.axes().get(0));
    double from = map.ridge().get(0).gapsEv().get(varied);
    double to = map.ridge().get(map.ridge().size() - 1).gapsEv().get(varied);
    double half = 0.5 * map.conditions().stepEv();
    svg.append(
        String.format(
            Locale.ROOT,
            "<rect class=\"ridge\" x=\"%.1f\" y=\"%d\" width=\"%.1f\" height=\"%d\"/>\n",
            frame.x(from - half),
            Frame.TOP,
            frame.x(to + half) - frame.x(from - half),
            Frame.HEIGHT - Frame.TOP - Frame.BOTTOM));
  }
}
