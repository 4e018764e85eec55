package evensun.run;

import evensun.evaluation.Aim;
import evensun.result.SearchRecord;
import evensun.run.DesignJob.Found;
import evensun.run.DesignJob.Look;
import evensun.search.SearchOutcome;
import evensun.search.problem.Candidate;
import evensun.search.problem.Optima;
import evensun.search.problem.Variable;
import evensun.search.proof.Freedom;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/** Turns what a search found into the record of a result. */
final class SearchRecords {

  /** A value this close to a bound, as a share of the range, stands on it. */
  private static final double ON_BOUND = 1e-6;

  /** Loss up to which designs count as equally good, in the unit of the aim. */
  static final double EQUALLY_GOOD = 0.02;

  private final Designs designs;
  private final List<Aim> aims;
  private final Aim aim;

  /**
   * Records of a search.
   *
   * @param designs what the values of its candidates mean
   */
  SearchRecords(Designs designs, Aims aims) {
    this.designs = designs;
    this.aims = aims.all();
    this.aim = aims.first();
  }

  /**
   * The record.
   *
   * @param asDrawn the aims of the stack as drawn, empty where it could not be evaluated
   * @param look what a look around the design found says
   * @param constraints the limits at the design found
   */
  SearchRecord record(
      Found found,
      Candidate best,
      List<Double> asDrawn,
      Look look,
      List<SearchRecord.ConstraintRecord> constraints) {
    SearchOutcome outcome = found.outcome();
    List<Freedom> freedoms = look.freedoms();
    return new SearchRecord(
        aim.name(),
        aim.unit(),
        asDrawn.isEmpty() ? null : asDrawn.get(0),
        aim.shown(best.aim()),
        outcome.stop().name().toLowerCase(Locale.ROOT),
        outcome.generations(),
        outcome.evaluations(),
        outcome.failureCount(),
        outcome.refinementGain(),
        history(outcome),
        variables(best, freedoms),
        optima(outcome.optima()),
        constraints,
        found.front().isEmpty() ? null : front(found, asDrawn),
        notes(outcome, freedoms),
        look.checks().grid(this),
        look.checks().stepCost(),
        wanted(aim),
        choices(best, look.alternatives()));
  }

  private static String wanted(Aim aim) {
    return aim.isSmallest() ? "smallest" : "largest";
  }

  /** Without the generations before the first design that keeps every limit. */
  private List<SearchRecord.Generation> history(SearchOutcome outcome) {
    return outcome.history().stream()
        .filter(g -> Double.isFinite(g.best()) && Double.isFinite(g.mean()))
        .map(
            g ->
                new SearchRecord.Generation(
                    g.generation(), g.evaluations(), aim.shown(g.best()), aim.shown(g.mean())))
        .toList();
  }

  private SearchRecord.Front front(Found found, List<Double> asDrawn) {
    return new SearchRecord.Front(
        aims.stream().map(Aim::name).toList(),
        aims.stream().map(Aim::unit).toList(),
        aims.stream().map(SearchRecords::wanted).toList(),
        found.front().stream().map(this::point).toList(),
        found.knee(),
        found.shown(),
        asDrawn.isEmpty() ? null : asDrawn);
  }

  private SearchRecord.FrontPoint point(Candidate candidate) {
    List<Double> values = candidate.verdict().aims();
    return new SearchRecord.FrontPoint(
        IntStream.range(0, aims.size()).mapToObj(i -> aims.get(i).shown(values.get(i))).toList(),
        designs.values(candidate),
        designs.choices(candidate));
  }

  private List<SearchRecord.VariableRecord> variables(Candidate best, List<Freedom> freedoms) {
    List<SearchRecord.VariableRecord> records = new ArrayList<>();
    for (int v = 0; v < designs.variables().size(); v++) {
      Variable variable = designs.variables().get(v);
      if (variable.isChoice() || !designs.has(best, v)) {
        continue;
      }
      double found = best.values().get(v);
      boolean known = !freedoms.isEmpty() && !isOpen(variable, freedoms.get(v));
      records.add(
          new SearchRecord.VariableRecord(
              variable.key(),
              variable.unit(),
              variable.low(),
              variable.high(),
              variable.step(),
              variable.drawn(),
              found,
              known ? freedoms.get(v).low() : null,
              known ? freedoms.get(v).high() : null,
              bound(variable, found)));
    }
    return records;
  }

  private List<SearchRecord.ChoiceRecord> choices(Candidate best, List<List<Double>> alternatives) {
    List<SearchRecord.ChoiceRecord> records = new ArrayList<>();
    for (int v = 0; v < designs.variables().size(); v++) {
      Variable variable = designs.variables().get(v);
      if (variable.isChoice() && designs.has(best, v)) {
        List<Double> reached = alternatives.isEmpty() ? List.of() : alternatives.get(v);
        records.add(
            new SearchRecord.ChoiceRecord(
                variable.key(),
                Designs.name(variable, variable.drawn()),
                Designs.name(variable, best.values().get(v)),
                alternatives(variable.choices(), reached)));
      }
    }
    return records;
  }

  private List<SearchRecord.AlternativeRecord> alternatives(
      List<String> names, List<Double> reached) {
    List<SearchRecord.AlternativeRecord> records = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      boolean known = i < reached.size() && Double.isFinite(reached.get(i));
      records.add(
          new SearchRecord.AlternativeRecord(
              names.get(i), known ? aim.shown(reached.get(i)) : null));
    }
    return records;
  }

  /** Whether not even the smallest move could be tried out within the evaluations allowed. */
  private static boolean isOpen(Variable variable, Freedom freedom) {
    return !variable.isChoice()
        && variable.step() == 0
        && variable.low() < variable.high()
        && freedom.low() == freedom.high();
  }

  private Optional<String> open(List<Freedom> freedoms) {
    List<String> keys = new ArrayList<>();
    for (int v = 0; v < freedoms.size(); v++) {
      if (isOpen(designs.variables().get(v), freedoms.get(v))) {
        keys.add(freedoms.get(v).key());
      }
    }
    return keys.isEmpty()
        ? Optional.empty()
        : Optional.of(
            "The range that is equally good was not found within the evaluations allowed for "
                + String.join(", ", keys)
                + ".");
  }

  private List<String> notes(SearchOutcome outcome, List<Freedom> freedoms) {
    List<String> notes = new ArrayList<>();
    outcome
        .failures()
        .forEach(f -> notes.add(f.count() + " designs: " + f.first().verdict().failure()));
    if (!freedoms.isEmpty()) {
      notes.add(
          String.format(
              Locale.ROOT,
              "Equally good means at most %s %s less, with the other values chosen anew.",
              EQUALLY_GOOD,
              aim.unit()));
    }
    open(freedoms).ifPresent(notes::add);
    freedoms.stream()
        .filter(f -> !f.bound().isEmpty() && f.gainPerUnit() > 0)
        .forEach(f -> notes.add(atBound(f)));
    if (outcome.roundBests().size() > 1) {
      notes.add(spread(outcome.roundBests()));
    }
    return notes;
  }

  private String atBound(Freedom freedom) {
    Variable variable =
        designs.variables().stream().filter(v -> v.key().equals(freedom.key())).findAny().get();
    double width = (variable.high() - variable.low()) / 10;
    return String.format(
        Locale.ROOT,
        "%s stands on its %s bound; a range wider by %.3g %s would gain about %.2f %s.",
        freedom.key(),
        freedom.bound().equals("low") ? "lower" : "upper",
        width,
        variable.unit(),
        freedom.gainPerUnit() * width,
        aim.unit());
  }

  private String spread(List<Double> roundBests) {
    double best = roundBests.stream().mapToDouble(b -> b).max().orElseThrow();
    double worst = roundBests.stream().mapToDouble(b -> b).min().orElseThrow();
    long reached = roundBests.stream().filter(b -> best - b <= EQUALLY_GOOD).count();
    return String.format(
        Locale.ROOT,
        "%d of %d rounds of the search came within %s %s of the best, the worst within %.2f.",
        reached,
        roundBests.size(),
        EQUALLY_GOOD,
        aim.unit(),
        best - worst);
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

  SearchRecord.Optimum optimum(Candidate candidate) {
    return new SearchRecord.Optimum(
        aim.shown(candidate.aim()), designs.values(candidate), designs.choices(candidate));
  }

  /** Designs that differ only in what they do not have are one. */
  private List<SearchRecord.Optimum> optima(List<Candidate> candidates) {
    List<SearchRecord.Optimum> optima = new ArrayList<>();
    for (Candidate candidate : candidates) {
      SearchRecord.Optimum optimum = optimum(candidate);
      if (optima.stream().noneMatch(other -> isSame(optimum, other))) {
        optima.add(optimum);
      }
    }
    return optima;
  }

  private boolean isSame(SearchRecord.Optimum a, SearchRecord.Optimum b) {
    return a.choices().equals(b.choices())
        && designs.variables().stream()
            .filter(v -> a.values().containsKey(v.key()))
            .allMatch(
                v ->
                    Math.abs(a.values().get(v.key()) - b.values().get(v.key()))
                        <= Optima.SAME * (v.high() - v.low()));
  }
}
