package evensun.report.page;

import evensun.report.chart.Chart;
import evensun.report.figure.Figure;
import java.util.List;

/** A piece of a section. */
public sealed interface Block {

  /** A paragraph. */
  record Prose(String text) implements Block {}

  /** A heading inside a section. */
  record Subheading(String text) implements Block {}

  /**
   * A drawing with its caption.
   *
   * @param id unique on the page
   */
  record Picture(String id, Figure figure, String caption) implements Block {}

  /**
   * A chart, with the table behind it.
   *
   * @param chart the data
   * @param table the same numbers as a table
   */
  record Plot(Chart chart, Table table) implements Block {}

  /** Several small charts side by side. */
  record Plots(List<Plot> plots) implements Block {}

  /**
   * A table.
   *
   * @param folded whether it starts closed
   */
  record Grid(Table table, boolean folded) implements Block {}

  /**
   * Text to copy as it is.
   *
   * @param id unique on the page
   * @param label what it is
   */
  record Verbatim(String id, String label, String text, boolean folded) implements Block {}

  /**
   * The numbers of several charts over the same x, to be saved as one table.
   *
   * @param file name of the file
   * @param label what it is
   * @param charts ids of the charts
   */
  record Together(String file, String label, List<String> charts) implements Block {}

  /** Points with a mark of their severity. */
  record Points(List<Point> points) implements Block {}

  /**
   * A point of a list.
   *
   * @param severity {@code note}, {@code warning}, {@code serious} or {@code caution}
   * @param subject what it is about
   * @param text what it says
   * @param code stable name to look up, empty for none
   */
  record Point(String severity, String subject, String text, String code) {}

  /** Curves of the aim with a marker to move. */
  record Strip(List<StripCurve> curves) implements Block {}

  /**
   * The aim against one quantity.
   *
   * @param chart aim and subcell currents against the quantity
   * @param found value found
   * @param decimals decimals of the quantity
   * @param weakest whether the aim is the smallest series; otherwise it is the last one
   * @param table the numbers
   */
  record StripCurve(Chart chart, double found, int decimals, boolean weakest, Table table) {}
}
