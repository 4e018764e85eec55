package evensun.report.chart;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A row of values over the chart's x.
 *
 * @param label as shown to people
 * @param role class of the style sheet that gives its colour
 * @param dashed whether it is drawn dashed
 * @param values one per x, null where there is none
 */
public record Series(String label, String role, boolean dashed, List<@Nullable Double> values) {

  /** Copies the values. */
  public Series {
    values = Collections.unmodifiableList(new ArrayList<>(values));
  }

  /** A full line or area. */
  public static Series of(String label, String role, List<Double> values) {
    return new Series(label, role, false, new ArrayList<@Nullable Double>(values));
  }

  /** The same, dashed. */
  public Series asDashed() {
    return new Series(label, role, true, values);
  }
}
