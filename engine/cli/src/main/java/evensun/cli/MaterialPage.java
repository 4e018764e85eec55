package evensun.cli;

import evensun.material.MaterialRecord;
import evensun.report.text.Numbers;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleBiFunction;

/**
 * A page with n, k and absorption coefficient of materials over each other; one file, no script.
 */
final class MaterialPage {

  private static final int WIDTH = 760;
  private static final int HEIGHT = 300;
  private static final int LEFT = 64;
  private static final int BOTTOM = 40;
  private static final List<String> COLOURS =
      List.of("#27619c", "#8a5406", "#7f3f75", "#1a6f65", "#97432e", "#4d55a6", "#334155");
  private static final List<String> DASHES = List.of("", "7 4", "2 3", "9 3 2 3");

  private MaterialPage() {}

  static String of(List<MaterialCurves> shown) {
    StringBuilder page = new StringBuilder();
    page.append(
        """
        <!DOCTYPE html>
        <html lang="en"><head><meta charset="utf-8">
        <meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'">
        <meta name="viewport" content="width=device-width, initial-scale=1">
        <meta name="color-scheme" content="light">
        <title>Optical constants</title>
        <style>
        body{font:16px/1.5 system-ui,sans-serif;margin:2rem auto;max-width:820px;padding:0 1rem;color:#18222d;background:#fbfaf6}
        h1,h2{font-family:Charter,"Sitka Text","Palatino Linotype",Palatino,Georgia,serif;font-weight:600}
        svg{width:100%;height:auto} h2{margin:2rem 0 .3rem;font-size:1.1rem}
        .axis{stroke:#535e6a;fill:none} .grid{stroke:#e9e5da} text{font-size:12px;fill:#535e6a}
        dl{display:grid;grid-template-columns:9rem 1fr;gap:.2rem .8rem} dt{color:#535e6a} dd{margin:0}
        table{border-collapse:collapse;font-variant-numeric:tabular-nums} td,th{padding:.15rem .8rem;text-align:right;border-bottom:1px solid #e9e5da}
        </style></head><body><main>
        <h1>Optical constants</h1>
        """);
    chart(page, shown, "Refractive index n", false, (curves, w) -> curves.n().get(w));
    chart(page, shown, "Extinction coefficient k", false, (curves, w) -> curves.k().get(w));
    chart(page, shown, "Absorption coefficient α (cm⁻¹)", true, MaterialCurves::alphaPerCm);
    for (int i = 0; i < shown.size(); i++) {
      record(page, shown.get(i), COLOURS.get(i % COLOURS.size()));
    }
    return page.append("</main></body></html>\n").toString();
  }

  private static void chart(
      StringBuilder page,
      List<MaterialCurves> shown,
      String title,
      boolean logarithmic,
      ToDoubleBiFunction<MaterialCurves, Integer> value) {
    double low = logarithmic ? 0 : Double.MAX_VALUE;
    double high = logarithmic ? 1 : -Double.MAX_VALUE;
    double fromNm = Double.MAX_VALUE;
    double toNm = 0;
    for (MaterialCurves curves : shown) {
      fromNm = Math.min(fromNm, curves.wavelengthNm().get(0));
      toNm = Math.max(toNm, curves.wavelengthNm().get(curves.size() - 1));
      for (int w = 0; w < curves.size(); w++) {
        double y = scaled(value.applyAsDouble(curves, w), logarithmic);
        low = Math.min(low, y);
        high = Math.max(high, y);
      }
    }
    Frame frame = Frame.around(fromNm, toNm, low, high, logarithmic);
    page.append("<h2>").append(escaped(title)).append("</h2>\n");
    page.append(
        "<svg viewBox=\"0 0 %d %d\" role=\"img\" aria-label=\"%s against wavelength\">\n"
            .formatted(WIDTH, HEIGHT, escaped(title)));
    frame.draw(page);
    for (int i = 0; i < shown.size(); i++) {
      curve(page, shown.get(i), frame, value, i);
    }
    page.append("</svg>\n");
  }

  private static double scaled(double value, boolean logarithmic) {
    return logarithmic ? Math.log10(Math.max(value, 1)) : value;
  }

  private static void curve(
      StringBuilder page,
      MaterialCurves curves,
      Frame frame,
      ToDoubleBiFunction<MaterialCurves, Integer> value,
      int index) {
    StringBuilder points = new StringBuilder();
    for (int w = 0; w < curves.size(); w++) {
      double y = scaled(value.applyAsDouble(curves, w), frame.logarithmic());
      points.append(
          String.format(
              Locale.ROOT, "%.1f,%.1f ", frame.x(curves.wavelengthNm().get(w)), frame.y(y)));
    }
    String colour = COLOURS.get(index % COLOURS.size());
    page.append(
        "<polyline fill=\"none\" stroke=\"%s\" stroke-width=\"2\" stroke-dasharray=\"%s\" points=\"%s\"/>\n"
            .formatted(colour, DASHES.get(index % DASHES.size()), points.toString().strip()));
    page.append(
        "<text x=\"%d\" y=\"%d\" text-anchor=\"end\" style=\"fill:%s\">%s</text>\n"
            .formatted(WIDTH - 24, 18 + 16 * index, colour, escaped(curves.label())));
  }

  /** Axes of one chart. */
  private record Frame(
      double fromNm, double toNm, double low, double high, double step, boolean logarithmic) {

    static Frame around(double fromNm, double toNm, double low, double high, boolean logarithmic) {
      double span = Math.max(high - low, 1e-6);
      double step = logarithmic ? 1 : step(span / 5);
      double bottom = Math.floor(low / step) * step;
      double top = Math.max(Math.ceil(high / step) * step, bottom + step);
      return new Frame(fromNm, toNm, bottom, top, step, logarithmic);
    }

    private static double step(double rough) {
      double power = Math.pow(10, Math.floor(Math.log10(rough)));
      for (double factor : new double[] {1, 2, 5}) {
        if (rough <= factor * power) {
          return factor * power;
        }
      }
      return 10 * power;
    }

    double x(double nm) {
      return LEFT + (nm - fromNm) / (toNm - fromNm) * (WIDTH - LEFT - 24);
    }

    double y(double value) {
      return HEIGHT - BOTTOM - (value - low) / (high - low) * (HEIGHT - BOTTOM - 8);
    }

    void draw(StringBuilder page) {
      for (double value = low; value <= high + 1e-9; value += step) {
        String label =
            logarithmic
                ? Numbers.powerOfTen((int) Math.round(value))
                : String.format(Locale.ROOT, "%.4g", value)
                    .replaceAll("(\\.\\d*?)0+$", "$1")
                    .replaceAll("\\.$", "");
        page.append(
            String.format(
                Locale.ROOT,
                "<line class=\"grid\" x1=\"%d\" x2=\"%d\" y1=\"%.1f\" y2=\"%.1f\"/><text x=\"%d\" y=\"%.1f\" text-anchor=\"end\">%s</text>%n",
                LEFT,
                WIDTH - 24,
                y(value),
                y(value),
                LEFT - 6,
                y(value) + 4,
                label));
      }
      for (double nm = Math.ceil(fromNm / 200) * 200; nm <= toNm; nm += 200) {
        page.append(
            String.format(
                Locale.ROOT,
                "<text x=\"%.1f\" y=\"%d\" text-anchor=\"middle\">%.0f</text>%n",
                x(nm),
                HEIGHT - BOTTOM + 16,
                nm));
      }
      page.append(
          "<path class=\"axis\" d=\"M%d 8V%dH%d\"/><text x=\"%d\" y=\"%d\" text-anchor=\"middle\">wavelength (nm)</text>\n"
              .formatted(LEFT, HEIGHT - BOTTOM, WIDTH - 24, (LEFT + WIDTH) / 2, HEIGHT - 6));
    }
  }

  private static void record(StringBuilder page, MaterialCurves curves, String colour) {
    MaterialRecord record = curves.material().record();
    page.append(
        "<h2 style=\"color:%s\">%s</h2>\n<dl>\n".formatted(colour, escaped(curves.label())));
    entry(page, "what", record.title() + ", " + record.form());
    entry(page, "source", record.source());
    record.notes().forEach(note -> entry(page, "note", note));
    record.hazards().forEach(hazard -> entry(page, "hazard", hazard));
    curves.findings().forEach(finding -> entry(page, "finding", finding.message()));
    page.append("</dl>\n<details><summary>Numbers</summary><table>");
    page.append("<tr><th>nm</th><th>n</th><th>k</th><th>α (cm⁻¹)</th></tr>\n");
    for (int w = 0; w < curves.size(); w += 4) {
      page.append(
          String.format(
              Locale.ROOT,
              "<tr><td>%.0f</td><td>%.4f</td><td>%.4g</td><td>%.4g</td></tr>%n",
              curves.wavelengthNm().get(w),
              curves.n().get(w),
              curves.k().get(w),
              curves.alphaPerCm(w)));
    }
    page.append("</table></details>\n");
  }

  private static void entry(StringBuilder page, String key, String value) {
    page.append("<dt>%s</dt><dd>%s</dd>\n".formatted(escaped(key), escaped(value)));
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;")
        .replace("<", "&lt;")
        .replace(">", "&gt;")
        .replace("\"", "&quot;");
  }
}
