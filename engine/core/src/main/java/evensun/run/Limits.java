package evensun.run;

import evensun.evaluation.Limit;
import evensun.result.Outcome;
import evensun.result.SearchRecord.ConstraintRecord;
import evensun.scenario.SearchSpec;
import evensun.scenario.SearchSpec.LimitSpec;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.List;

/** The limits of a search: from the scenario, and as the result states them. */
final class Limits {

  /** A design this close to a limit, as a fraction of it, is held by it. */
  private static final double ACTIVE = 1e-3;

  private Limits() {}

  static List<Limit> of(SearchSpec search, ResolvedStack stack) {
    List<Limit> limits = new ArrayList<>();
    for (LimitSpec spec : search.limits()) {
      spec.atLeast()
          .ifPresent(
              bound -> limits.add(Limit.of(spec.quantity(), spec.of(), bound, false, stack)));
      spec.atMost()
          .ifPresent(bound -> limits.add(Limit.of(spec.quantity(), spec.of(), bound, true, stack)));
    }
    return limits;
  }

  static List<ConstraintRecord> records(List<Limit> limits, double[] thicknessNm, Outcome found) {
    double[] currents =
        found.subcells().stream().mapToDouble(s -> s.photocurrentMaPerCm2()).toArray();
    double[] gaps =
        found.subcells().stream()
            .mapToDouble(s -> s.bandgapEv() == null ? 0 : s.bandgapEv())
            .toArray();
    return limits.stream()
        .map(
            limit -> {
              double value = limit.value(thicknessNm, currents, gaps);
              return new ConstraintRecord(limit.text(), value, limit.slack(value) < ACTIVE);
            })
        .toList();
  }
}
