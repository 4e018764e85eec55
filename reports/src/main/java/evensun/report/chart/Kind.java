package evensun.report.chart;

/** How the series of a chart are shown. */
public enum Kind {
  /** Areas on top of one another, the first at the baseline. */
  STACK,
  /** Lines. */
  LINES,
  /** Points. */
  POINTS
}
