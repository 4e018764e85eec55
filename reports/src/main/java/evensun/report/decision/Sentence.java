package evensun.report.decision;

import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.Outcome;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/** The decision in one sentence. */
public final class Sentence {

  private static final String MATCHED_CURRENT = "matched-current";
  private static final double NOTICEABLE = 0.005;

  private Sentence() {}

  /** What to deposit, what it gives and by how much that is better, what limits. */
  public static String of(RunResult result) {
    SearchRecord search = result.search();
    if (search == null) {
      return assessed(result.found());
    }
    if (failed(search)) {
      return "The search found no design that could be evaluated: "
          + Numbers.count(search.evaluations(), "design")
          + " tried, all failed.";
    }
    String what =
        Deposit.phrase(
            Deposit.withFollowers(search.variables(), result.found().design()), search.choices());
    String deposit = what.isEmpty() ? "Deposit the stack as listed" : "Deposit " + what;
    return deposit + ": " + gives(result, search) + GridWords.headline(search) + ".";
  }

  /** Whether a search could evaluate no design at all. */
  public static boolean failed(SearchRecord search) {
    return search.evaluations() > 0 && search.failures() >= search.evaluations();
  }

  private static String gives(RunResult result, SearchRecord search) {
    String currents = currents(result.found(), result.asDrawn(), search);
    if (search.aim().equals(MATCHED_CURRENT)) {
      return currents;
    }
    String aim =
        Keys.aim(search.aim()) + " " + Numbers.quantity(search.aimFound(), search.aimUnit());
    Double drawn = search.aimAsDrawn();
    String better =
        drawn == null
            ? ""
            : ", "
                + Numbers.change(search.aimFound() - drawn, search.aimUnit())
                + " against as drawn";
    return aim + better + "; " + currents;
  }

  private static String currents(Outcome found, @Nullable Outcome asDrawn, SearchRecord search) {
    Double matched = found.matchedCurrentMaPerCm2();
    if (matched == null) {
      return sum(found);
    }
    Double before = asDrawn == null ? null : asDrawn.matchedCurrentMaPerCm2();
    if (before == null && search.aim().equals(MATCHED_CURRENT)) {
      before = search.aimAsDrawn();
    }
    return "matched at "
        + Numbers.ma(matched, found.matchedStandardErrorMaPerCm2())
        + gain(matched, before)
        + "; "
        + balance(found);
  }

  private static String gain(double matched, @Nullable Double before) {
    if (before == null) {
      return "";
    }
    double gain = matched - before;
    if (Math.abs(gain) < NOTICEABLE) {
      return ", the same as drawn";
    }
    String percent =
        before > 0 ? " (" + Numbers.fixed(Math.abs(gain) / before * 100, 1) + "\u00a0%)" : "";
    return ", "
        + Numbers.ma(Math.abs(gain))
        + percent
        + (gain > 0 ? " better" : " worse")
        + " than as drawn";
  }

  /** Balanced, or which subcell limits and by how much. */
  static String balance(Outcome outcome) {
    String limiting = outcome.limitingSubcell();
    double mismatch = Objects.requireNonNullElse(outcome.mismatchMaPerCm2(), 0.0);
    if (outcome.subcells().size() < 2) {
      return "one subcell";
    }
    return limiting == null
        ? "balanced to "
            + (mismatch < NOTICEABLE ? "better than " : "")
            + Numbers.ma(Math.max(mismatch, 2 * NOTICEABLE))
        : Clip.to(limiting, 40)
            + " limits, "
            + Numbers.ma(mismatch)
            + " below "
            + strongest(outcome);
  }

  private static String strongest(Outcome outcome) {
    SubcellOutcome best = outcome.subcells().get(0);
    for (SubcellOutcome subcell : outcome.subcells()) {
      best = current(subcell) > current(best) ? subcell : best;
    }
    return Clip.to(best.name(), 40);
  }

  private static double current(SubcellOutcome subcell) {
    return Objects.requireNonNullElse(subcell.photocurrentMaPerCm2(), 0.0);
  }

  private static String assessed(Outcome found) {
    Double matched = found.matchedCurrentMaPerCm2();
    if (matched != null) {
      return "As drawn, the device passes "
          + Numbers.ma(matched, found.matchedStandardErrorMaPerCm2())
          + "; "
          + balance(found)
          + ".";
    }
    if (found.incidentMaPerCm2() == null) {
      return "Spectra only: a single wavelength carries no current, so there is nothing to decide.";
    }
    return "As drawn, " + sum(found) + ".";
  }

  private static String sum(Outcome outcome) {
    List<SubcellOutcome> subcells = outcome.subcells();
    if (subcells.stream().anyMatch(s -> s.photocurrentMaPerCm2() == null)) {
      return "no currents";
    }
    double sum = subcells.stream().mapToDouble(Sentence::current).sum();
    return "the subcells absorb " + Numbers.ma(sum) + " together";
  }
}
