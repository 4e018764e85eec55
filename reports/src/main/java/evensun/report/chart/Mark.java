package evensun.report.chart;

/**
 * A named value on the x axis, shown as an upright line.
 *
 * @param x where
 * @param label what it is
 */
public record Mark(double x, String label) {}
