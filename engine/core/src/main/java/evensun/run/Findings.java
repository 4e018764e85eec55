package evensun.run;

import evensun.evaluation.Bench;
import evensun.evaluation.Model;
import evensun.result.FindingRecord;
import evensun.result.Outcome;
import evensun.result.SearchRecord;
import evensun.spi.Finding;
import evensun.spi.Severity;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/** Collects what a reader should know about a result, most severe first. */
final class Findings {

  /** Light outside the grid that could still be used is worth a finding above this, mA cm⁻². */
  private static final double OUTSIDE_MA_PER_CM2 = 0.05;

  /** By what they say: hashing records costs a short command more than all the rest here. */
  private final Map<String, Finding> findings = new LinkedHashMap<>();

  void add(Finding finding) {
    findings.putIfAbsent(
        finding.code() + '\n' + finding.where() + '\n' + finding.message(), finding);
  }

  void addAll(List<Finding> more) {
    more.forEach(this::add);
  }

  /** What the stack, its materials at the gaps of a design, and the solver say. */
  void about(Bench bench) {
    Model model = bench.model();
    ResolvedStack stack = model.stack();
    addAll(stack.findings());
    addAll(Slips.of(stack));
    for (int slot = 0; slot < stack.slots().size(); slot++) {
      addAll(stack.slots().get(slot).material().findingsAt(bench.bandgapEv(slot)));
    }
    addAll(model.prepared().examine(bench.design()));
    if (!stack.isMonochromatic() && !stack.subcells().isEmpty()) {
      perfectCollection(stack);
      outsideGrid(stack);
    }
  }

  private void perfectCollection(ResolvedStack stack) {
    boolean stated =
        stack.scenario().subcells().stream()
            .map(subcell -> subcell.diode())
            .allMatch(
                diode ->
                    diode.collectionFraction().isPresent()
                        || diode.diffusionLengthNm().isPresent());
    if (!stated) {
      add(
          new Finding(
              "perfect-collection",
              Severity.NOTE,
              "all subcells",
              "photocurrents are absorbed light; every absorbed photon is assumed to be collected"));
    }
  }

  private void outsideGrid(ResolvedStack stack) {
    double blue =
        stack.spectrum().photonCurrentMaPerCm2(stack.spectrum().fromNm(), stack.grid().fromNm());
    if (blue > OUTSIDE_MA_PER_CM2) {
      add(
          new Finding(
              "light-below-grid",
              Severity.NOTE,
              "grid",
              "%.2f mA cm⁻² of the spectrum lie below %s nm and are not counted"
                  .formatted(blue, number(stack.grid().fromNm()))));
    }
  }

  /** What the numbers of an outcome say. */
  void about(Outcome outcome) {
    Double mismatch = outcome.mismatchMaPerCm2();
    if (mismatch != null && mismatch >= Outcome.BALANCED_MA_PER_CM2) {
      add(
          new Finding(
              "not-balanced",
              mismatch > 1 ? Severity.WARNING : Severity.NOTE,
              String.valueOf(outcome.limitingSubcell()),
              "this subcell limits the current; the strongest subcell delivers %.2f mA cm⁻² more, which a series device cannot use"
                  .formatted(mismatch)));
    }
    for (Outcome.SubcellOutcome subcell : outcome.subcells()) {
      Double current = subcell.photocurrentMaPerCm2();
      if (current != null && current < 0.1) {
        add(
            new Finding(
                "subcell-in-the-dark",
                Severity.SERIOUS,
                subcell.name(),
                "this subcell absorbs %.3f mA cm⁻²: check the order of the stack and its bandgap"
                    .formatted(current)));
      }
    }
  }

  /** What an outcome's statistical errors mean, when a search found it or not. */
  void aboutErrors(Outcome outcome, boolean searched) {
    double largest =
        outcome.subcells().stream()
            .map(Outcome.SubcellOutcome::standardErrorMaPerCm2)
            .filter(Objects::nonNull)
            .mapToDouble(Double::doubleValue)
            .max()
            .orElse(0);
    if (largest > 0) {
      add(
          new Finding(
              "statistical-error",
              Severity.NOTE,
              searched ? "the optimum" : "all subcells",
              "photocurrents carry a standard error of up to %s mA cm⁻² from the number of rays%s"
                  .formatted(
                      number(Math.max(1e-4, Math.rint(largest * 1e4) / 1e4)),
                      searched
                          ? "; designs were compared on the same rays, so that their differences are surer than their values"
                          : "")));
    }
  }

  /** What the search says. */
  void about(SearchRecord search) {
    for (SearchRecord.VariableRecord variable : search.variables()) {
      if (variable.bound() != null) {
        add(
            new Finding(
                "at-bound",
                Severity.WARNING,
                variable.key(),
                "the best value stands on its %s bound (%s %s); a wider range may be better"
                    .formatted(variable.bound(), number(variable.found()), variable.unit())));
      }
    }
    if (!search.stopped().equals("converged")) {
      add(
          new Finding(
              "search-not-converged",
              search.stopped().equals("interrupted") ? Severity.SERIOUS : Severity.WARNING,
              "search",
              "the search stopped before it had converged (%s); repeat it with a larger budget or resume it"
                  .formatted(search.stopped())));
    }
    about(search.grid(), search);
    if (search.failures() > 0) {
      add(
          new Finding(
              "failed-evaluations",
              Severity.WARNING,
              "search",
              "%d of %d designs could not be evaluated and were left out"
                  .formatted(search.failures(), search.evaluations())));
    }
  }

  private void about(SearchRecord.@Nullable Grid grid, SearchRecord search) {
    if (grid != null && grid.better() && grid.best() != null) {
      add(
          new Finding(
              "grid-found-better",
              Severity.SERIOUS,
              "search",
              "an exhaustive grid found a better design: %s %.4f %s against %.4f, at %s; search again with another seed or a larger budget"
                  .formatted(
                      search.aim(),
                      grid.best().aim(),
                      search.aimUnit(),
                      search.aimFound(),
                      values(grid.best()))));
    }
  }

  private static String values(SearchRecord.Optimum optimum) {
    return optimum.values().entrySet().stream()
        .map(entry -> entry.getKey() + " " + number(entry.getValue()))
        .collect(Collectors.joining(", "));
  }

  /** A number as people write it: no trailing zeros, no exponent for usual sizes. */
  static String number(double value) {
    if (value == Math.rint(value) && Math.abs(value) < 1e15) {
      return Long.toString((long) value);
    }
    return new java.math.BigDecimal(value)
        .round(new java.math.MathContext(6))
        .stripTrailingZeros()
        .toPlainString();
  }

  List<FindingRecord> records() {
    List<Finding> sorted = new ArrayList<>(findings.values());
    sorted.sort(Comparator.comparing(Finding::severity).reversed());
    return sorted.stream()
        .map(
            f ->
                new FindingRecord(
                    f.severity().name().toLowerCase(Locale.ROOT), f.code(), f.where(), f.message()))
        .toList();
  }
}
