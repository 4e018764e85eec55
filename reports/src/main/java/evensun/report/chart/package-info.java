/**
 * Charts as data: what a chart shows, its table, and its drawing for readers without JavaScript.
 */
@NullMarked
package evensun.report.chart;

import org.jspecify.annotations.NullMarked;
