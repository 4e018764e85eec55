package evensun.report.figure;

/** Rough width of a text in px, enough to decide whether it fits. */
final class Widths {

  private static final double EM_FRACTION = 0.56;
  private static final int WIDE_FROM = 0x1100;

  private Widths() {}

  /** Width in px of a text set in a font of the given size in px. */
  static double of(String text, double fontPx) {
    double ems = text.codePoints().mapToDouble(c -> c < WIDE_FROM ? EM_FRACTION : 1).sum();
    return ems * fontPx;
  }
}
