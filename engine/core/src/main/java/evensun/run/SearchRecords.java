package evensun.run;

import evensun.evaluation.Aim;
import evensun.result.SearchRecord;
import evensun.search.Candidate;
import evensun.search.SearchOutcome;
import evensun.search.Variable;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Turns what a search found into the record of a result. */
final class SearchRecords {

  /** A value this close to a bound, as a share of the range, stands on it. */
  private static final double ON_BOUND = 1e-6;

  private final Varied varied;
  private final Aim aim;

  SearchRecords(Varied varied, Aim aim) {
    this.varied = varied;
    this.aim = aim;
  }

  SearchRecord record(SearchOutcome outcome, Candidate best, @Nullable Double asDrawn) {
    return new SearchRecord(
        aim.name(),
        aim.unit(),
        asDrawn,
        best.aim(),
        outcome.stop().name().toLowerCase(Locale.ROOT),
        outcome.generations(),
        outcome.evaluations(),
        outcome.failureCount(),
        outcome.refinementGain(),
        outcome.history().stream()
            .map(
                g ->
                    new SearchRecord.Generation(
                        g.generation(), g.evaluations(), g.best(), g.mean()))
            .toList(),
        variables(best),
        outcome.optima().stream().map(this::optimum).toList(),
        List.of(),
        null,
        outcome.failures().stream()
            .map(f -> f.count() + " designs: " + f.first().verdict().failure())
            .toList());
  }

  private List<SearchRecord.VariableRecord> variables(Candidate best) {
    List<SearchRecord.VariableRecord> records = new ArrayList<>();
    for (int v = 0; v < varied.variables().size(); v++) {
      Variable variable = varied.variables().get(v);
      double found = best.values().get(v);
      records.add(
          new SearchRecord.VariableRecord(
              variable.key(),
              variable.unit(),
              variable.low(),
              variable.high(),
              variable.step(),
              variable.drawn(),
              found,
              null,
              null,
              bound(variable, found)));
    }
    return records;
  }

  private static @Nullable String bound(Variable variable, double found) {
    double margin = ON_BOUND * (variable.high() - variable.low());
    if (variable.low() == variable.high()) {
      return null;
    }
    if (found <= variable.low() + margin) {
      return "low";
    }
    return found >= variable.high() - margin ? "high" : null;
  }

  private SearchRecord.Optimum optimum(Candidate candidate) {
    Map<String, Double> values = new LinkedHashMap<>();
    for (int v = 0; v < varied.variables().size(); v++) {
      values.put(varied.variables().get(v).key(), candidate.values().get(v));
    }
    return new SearchRecord.Optimum(candidate.aim(), values);
  }
}
