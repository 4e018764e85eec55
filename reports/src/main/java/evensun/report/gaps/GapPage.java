package evensun.report.gaps;

import evensun.result.BandgapMap;
import evensun.result.BandgapMap.Conditions;
import evensun.result.BandgapMap.Point;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** A bandgap map as one page: no script, nothing loaded, every number in words or a table. */
public final class GapPage {

  private GapPage() {}

  /** The page. */
  public static String html(BandgapMap map) {
    StringBuilder page = new StringBuilder();
    page.append(
        """
        <!DOCTYPE html>
        <html lang="en"><head><meta charset="utf-8">
        <meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'">
        <meta name="viewport" content="width=device-width, initial-scale=1">
        <meta name="color-scheme" content="light">
        <title>Bandgap map</title>
        <style>
        body{font:16px/1.5 system-ui,sans-serif;margin:2rem auto;max-width:820px;padding:0 1rem;color:#18222d;background:#fbfaf6}
        h1,h2{font-family:Charter,"Sitka Text","Palatino Linotype",Palatino,Georgia,serif;font-weight:600}
        h1{font-size:1.5rem;line-height:1.25;margin-bottom:.4rem} h2{margin:2rem 0 .3rem;font-size:1.1rem}
        svg{width:100%;height:auto} text{font-size:13px;fill:#535e6a} .name{font-size:14px;fill:#18222d}
        .axis,.tick{stroke:#535e6a;fill:none} .hatch{stroke:#a8a29e;stroke-width:2}
        .line{fill:none;stroke:#27619c;stroke-width:1.5} .ridge{fill:#9ecae1;stroke:none}
        .level{fill:#27619c;font-weight:600;paint-order:stroke;stroke:#fbfaf6;stroke-width:4px}
        .note{fill:#535e6a;paint-order:stroke;stroke:#fbfaf6;stroke-width:5px}
        .best{stroke:#18222d;stroke-width:2;fill:none} .best-name{fill:#18222d;font-weight:700;paint-order:stroke;stroke:#fbfaf6;stroke-width:4px}
        table{border-collapse:collapse;font-variant-numeric:tabular-nums} td,th{padding:.15rem .8rem;text-align:right;border-bottom:1px solid #d9d4c8} th{font-weight:600} .word{text-align:left}
        .small{color:#535e6a;font-size:.9rem}
        </style></head><body><main>
        """);
    page.append("<h1>").append(headline(map)).append("</h1>\n");
    page.append("<p>").append(ridgeSentence(map)).append("</p>\n");
    page.append(figure(map));
    page.append("<p class=\"small\">").append(legend(map)).append("</p>\n");
    ridgeTable(page, map);
    conditions(page, map.conditions());
    page.append(
        """
        <h2>How far to trust it</h2>
        <p>Detailed balance: every junction absorbs and emits like a step at its bandgap, one side only (Shockley and Queisser, J. Appl. Phys. 32, 510 (1961)). It is a limit of idealised physics and says which gaps to aim at, not what a device will reach; it says nothing about materials, stability or lifetime and replaces no measurement.</p>
        """);
    return page.append("</main></body></html>\n").toString();
  }

  private static String figure(BandgapMap map) {
    return switch (map.axes().size()) {
      case 2 -> MapFigure.of(map);
      case 1 -> CurveFigure.of(map);
      default -> "";
    };
  }

  private static String headline(BandgapMap map) {
    return "Best efficiency %s %% at %s eV (%s)"
        .formatted(
            percent(map.optimum().efficiencyPercent()),
            gaps(map.optimum()),
            String.join(" / ", map.conditions().junctions()));
  }

  /** Which gaps are equally good, in one sentence. */
  public static String ridgeSentence(BandgapMap map) {
    StringBuilder text =
        new StringBuilder("Within 1 % of it (at least ")
            .append(percent(map.ridgeFromPercent()))
            .append(" %):");
    for (int j = 0; j < map.conditions().junctions().size(); j++) {
      int junction = j;
      double low =
          map.ridge().stream().mapToDouble(p -> p.gapsEv().get(junction)).min().orElseThrow();
      double high =
          map.ridge().stream().mapToDouble(p -> p.gapsEv().get(junction)).max().orElseThrow();
      text.append(j == 0 ? " " : ", ")
          .append(map.conditions().junctions().get(j))
          .append(' ')
          .append(low == high ? ev(low) : ev(low) + " to " + ev(high));
    }
    boolean several = map.axes().size() == 2 && map.ridge().size() > 1;
    return text.append(several ? " eV, paired as along the ridge." : " eV.").toString();
  }

  private static String legend(BandgapMap map) {
    if (map.axes().isEmpty()) {
      return "All gaps are fixed.";
    }
    String over = map.bestOver();
    return (map.axes().size() == 2
            ? "Lines: equal efficiency. Shaded: within 1 % of the best. Cross: the best. Hatched: the gaps stand in the wrong order for the light."
            : "Shaded: within 1 % of the best.")
        + (over == null ? "" : " At each point the " + over + " junction has its best gap.");
  }

  private static void ridgeTable(StringBuilder page, BandgapMap map) {
    page.append("<h2>The ridge: best partners within 1 %</h2>\n<table><tr>");
    for (String junction : map.conditions().junctions()) {
      page.append("<th>").append(junction).append(" (eV)</th>");
    }
    page.append("<th>efficiency (%)</th></tr>\n");
    for (Point point : map.ridge()) {
      page.append("<tr>");
      point.gapsEv().forEach(gap -> page.append("<td>").append(ev(gap)).append("</td>"));
      page.append("<td>").append(percent(point.efficiencyPercent())).append("</td></tr>\n");
    }
    page.append("</table>\n");
  }

  private static void conditions(StringBuilder page, Conditions c) {
    page.append("<h2>Conditions</h2>\n<table>\n");
    row(page, "spectrum", escaped(c.spectrum()) + ", " + plain(c.irradianceWPerM2()) + " W m⁻²");
    row(page, "concentration", plain(c.concentrationSuns()));
    row(page, "cell temperature", plain(c.temperatureK()) + " K");
    row(page, "connection", c.connection());
    row(page, "external radiative efficiency", listed(c.externalRadiativeEfficiency()));
    row(page, "luminescent coupling to the next junction", listed(c.luminescentCouplingFraction()));
    row(page, "absorptance above the gap", listed(c.absorptance()));
    row(page, "mesh", plain(c.stepEv()) + " eV");
    page.append("</table>\n");
  }

  private static void row(StringBuilder page, String name, String value) {
    page.append("<tr><th class=\"word\" scope=\"row\">")
        .append(name)
        .append("</th><td class=\"word\">")
        .append(value)
        .append("</td></tr>\n");
  }

  private static String listed(List<Double> values) {
    return values.stream().map(GapPage::plain).collect(Collectors.joining(" / "));
  }

  /** Gaps as people write them, in the order the light meets them. */
  public static String gaps(Point point) {
    return point.gapsEv().stream().map(GapPage::ev).collect(Collectors.joining(" / "));
  }

  private static String ev(double gap) {
    String text = String.format(Locale.ROOT, "%.3f", gap);
    return text.endsWith("0") ? text.substring(0, text.length() - 1) : text;
  }

  private static String percent(double value) {
    return String.format(Locale.ROOT, "%.2f", value);
  }

  private static String plain(double value) {
    return new java.math.BigDecimal(value)
        .round(new java.math.MathContext(6))
        .stripTrailingZeros()
        .toPlainString();
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
