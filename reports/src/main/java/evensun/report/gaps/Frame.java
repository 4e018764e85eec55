package evensun.report.gaps;

import java.util.Locale;

/**
 * From gaps in eV to places in a figure.
 *
 * @param fromX smallest value across
 * @param toX largest value across
 * @param fromY smallest value upward
 * @param toY largest value upward
 */
record Frame(double fromX, double toX, double fromY, double toY) {

  static final int WIDTH = 760;
  static final int HEIGHT = 620;
  static final int LEFT = 64;
  static final int TOP = 16;
  static final int RIGHT = 16;
  static final int BOTTOM = 56;

  double x(double value) {
    return LEFT + (value - fromX) / (toX - fromX) * (WIDTH - LEFT - RIGHT);
  }

  double y(double value) {
    return HEIGHT - BOTTOM - (value - fromY) / (toY - fromY) * (HEIGHT - BOTTOM - TOP);
  }

  String point(double valueX, double valueY) {
    return String.format(Locale.ROOT, "%.1f %.1f", x(valueX), y(valueY));
  }

  /** Axes with ticks, and what they show. */
  String axes(String across, String upward) {
    StringBuilder svg = new StringBuilder();
    double stepX = step(toX - fromX);
    for (double v = first(fromX, stepX); v <= toX + 1e-9; v += stepX) {
      svg.append(
          String.format(
              Locale.ROOT,
              "<path class=\"tick\" d=\"M%.1f %dv6\"/><text x=\"%.1f\" y=\"%d\" text-anchor=\"middle\">%s</text>\n",
              x(v),
              HEIGHT - BOTTOM,
              x(v),
              HEIGHT - BOTTOM + 20,
              label(v, stepX)));
    }
    double stepY = step(toY - fromY);
    for (double v = first(fromY, stepY); v <= toY + 1e-9; v += stepY) {
      svg.append(
          String.format(
              Locale.ROOT,
              "<path class=\"tick\" d=\"M%d %.1fh-6\"/><text x=\"%d\" y=\"%.1f\" text-anchor=\"end\">%s</text>\n",
              LEFT,
              y(v),
              LEFT - 10,
              y(v) + 4,
              label(v, stepY)));
    }
    svg.append(
        String.format(
            Locale.ROOT,
            "<path class=\"axis\" d=\"M%d %dV%dH%d\"/>\n<text class=\"name\" x=\"%d\" y=\"%d\" text-anchor=\"middle\">%s</text>\n<text class=\"name\" transform=\"translate(16 %d) rotate(-90)\" text-anchor=\"middle\">%s</text>\n",
            LEFT,
            TOP,
            HEIGHT - BOTTOM,
            WIDTH - RIGHT,
            (LEFT + WIDTH - RIGHT) / 2,
            HEIGHT - 10,
            across,
            (TOP + HEIGHT - BOTTOM) / 2,
            upward));
    return svg.toString();
  }

  /** The first tick; adding zero turns minus zero into zero. */
  private static double first(double from, double step) {
    return Math.ceil(from / step - 1e-9) * step + 0.0;
  }

  /** 1, 2 or 5 times a power of ten, for about eight ticks. */
  static double step(double span) {
    double power = Math.pow(10, Math.floor(Math.log10(span / 8)));
    for (double factor : new double[] {1, 2, 5}) {
      if (span / 8 <= factor * power) {
        return factor * power;
      }
    }
    return 10 * power;
  }

  private static String label(double value, double step) {
    int decimals = Math.max(0, (int) Math.ceil(-Math.log10(step) - 1e-9));
    return String.format(Locale.ROOT, "%." + decimals + "f", value);
  }
}
