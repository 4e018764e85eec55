package evensun.scenario.reader;

import evensun.scenario.GridSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Shown;
import java.util.Optional;

/** Binds {@code grid}. */
final class GridBinder {

  private static final Interval WAVELENGTH = Interval.closed(100, 100_000, "nm");
  private static final Interval STEP = Interval.above(0, 1000, "nm");
  private static final int MOST_POINTS = 20_001;

  private GridBinder() {}

  static GridSpec bind(Fields root) {
    root.require("grid", "write grid: {fromNm: 300, toNm: 1200, stepNm: 5}");
    Optional<Fields> grid = root.section("grid");
    if (grid.isEmpty()) {
      return new GridSpec(Double.NaN, Double.NaN, Double.NaN, root.place("grid"));
    }
    Fields fields = grid.get();
    GridSpec spec =
        new GridSpec(
            fields.requiredNumber("fromNm", WAVELENGTH),
            fields.requiredNumber("toNm", WAVELENGTH),
            fields.requiredNumber("stepNm", STEP),
            fields.place());
    fields.finish();
    check(fields, spec);
    return spec;
  }

  private static void check(Fields fields, GridSpec spec) {
    double rangeNm = spec.toNm() - spec.fromNm();
    double steps = rangeNm / spec.stepNm();
    if (rangeNm < 0) {
      fields.fault(
          fields.place("toNm"),
          "toNm must be at least fromNm ("
              + Shown.number(spec.fromNm())
              + " nm) but was "
              + Shown.number(spec.toNm())
              + "; swap them");
    } else if (steps > MOST_POINTS - 1) {
      fields.fault(
          fields.place("stepNm"),
          "the grid must have at most "
              + MOST_POINTS
              + " points but has "
              + Shown.number(Math.floor(steps) + 1)
              + "; write a larger stepNm");
    } else if (Math.abs(steps - Math.rint(steps)) > 1e-6) {
      fields.fault(fields.place("stepNm"), notAMultiple(spec, rangeNm));
    }
  }

  private static String notAMultiple(GridSpec spec, double rangeNm) {
    double stepNm = spec.stepNm();
    double shorterToNm = spec.fromNm() + Math.floor(rangeNm / stepNm) * stepNm;
    String shorter =
        shorterToNm > spec.fromNm() ? ", or toNm: " + Shown.number(tidy(shorterToNm)) : "";
    return "the range of "
        + Shown.number(tidy(rangeNm))
        + " nm must be a multiple of stepNm but that was "
        + Shown.number(stepNm)
        + " nm; the nearest legal step is "
        + Shown.number(tidy(nearestStepNm(rangeNm, stepNm)))
        + " nm"
        + shorter;
  }

  /** The step nearest to the wanted one that divides the range and has at most two decimals. */
  static double nearestStepNm(double rangeNm, double stepNm) {
    long wanted = Math.max(1, Math.round(rangeNm / stepNm));
    double best = rangeNm;
    for (long n = 1; n <= Math.min(2 * wanted + 1, MOST_POINTS - 1); n++) {
      double candidateNm = rangeNm / n;
      boolean short2 = Math.abs(candidateNm * 100 - Math.rint(candidateNm * 100)) < 1e-7;
      if (short2 && Math.abs(candidateNm - stepNm) < Math.abs(best - stepNm)) {
        best = candidateNm;
      }
    }
    return best;
  }

  private static double tidy(double value) {
    return Math.rint(value * 1e6) / 1e6;
  }
}
