package evensun.report.summary;

import evensun.report.decision.ChoiceWords;
import evensun.report.decision.FrontWords;
import evensun.report.decision.GridWords;
import evensun.report.decision.Sentence;
import evensun.report.decision.VerdictRules;
import evensun.report.figure.Budget;
import evensun.report.figure.Share;
import evensun.report.page.Verdict;
import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.Electrical;
import evensun.result.FindingRecord;
import evensun.result.Outcome;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.ChoiceRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * The decision in a few lines, as data.
 *
 * @param title title of the scenario
 * @param sentence the decision in one sentence
 * @param verdict whether to decide on it
 * @param tables numbers that carry it
 * @param closing lines at the end
 */
public record Summary(
    String title, String sentence, String verdict, List<Listing> tables, List<String> closing) {

  private static final int MOST_LETTERS = 100;

  /**
   * A small table.
   *
   * @param header heads of the columns; the first column holds words, the others numbers
   * @param rows its rows
   */
  public record Listing(List<String> header, List<List<String>> rows) {}

  /** The summary of a result. */
  public static Summary of(RunResult result) {
    Verdict verdict = VerdictRules.of(result);
    List<Listing> tables = new ArrayList<>();
    tables.add(currents(result));
    SearchRecord search = result.search();
    if (search != null) {
      if (!search.variables().isEmpty() || !search.choices().isEmpty()) {
        tables.add(varied(search));
      }
    }
    Budget.of(result.found()).ifPresent(found -> tables.add(ledger(result, found)));
    String points =
        verdict.level() == Verdict.Level.CHECK ? " (" + verdict.reasons().size() + ")" : "";
    return new Summary(
        Clip.to(result.title(), MOST_LETTERS),
        Sentence.of(result),
        verdict.level().words() + points,
        tables,
        closing(result));
  }

  private static Listing currents(RunResult result) {
    Outcome found = result.found();
    Outcome drawn = result.asDrawn();
    boolean errors = found.subcells().stream().anyMatch(s -> s.standardErrorMaPerCm2() != null);
    Rows rows = new Rows("currents, " + Numbers.MA, drawn != null, errors);
    for (SubcellOutcome subcell : found.subcells()) {
      rows.add(
          Clip.to(subcell.name(), 40),
          subcell.photocurrentMaPerCm2(),
          subcell.standardErrorMaPerCm2(),
          current(drawn, subcell.name()));
    }
    rows.add(
        "matched current",
        found.matchedCurrentMaPerCm2(),
        found.matchedStandardErrorMaPerCm2(),
        drawn == null ? null : drawn.matchedCurrentMaPerCm2());
    rows.add(
        "mismatch",
        found.mismatchMaPerCm2(),
        null,
        drawn == null ? null : drawn.mismatchMaPerCm2());
    Electrical power = found.electrical();
    Electrical before = drawn == null ? null : drawn.electrical();
    if (power != null) {
      rows.add(
          "efficiency, %",
          power.efficiencyPercent(), null, before == null ? null : before.efficiencyPercent());
    }
    return rows.listing();
  }

  private static @Nullable Double current(@Nullable Outcome outcome, String subcell) {
    return outcome == null
        ? null
        : outcome.subcells().stream()
            .filter(s -> s.name().equals(subcell))
            .findFirst()
            .map(SubcellOutcome::photocurrentMaPerCm2)
            .orElse(null);
  }

  private static Listing varied(SearchRecord search) {
    List<List<String>> rows = new ArrayList<>();
    for (ChoiceRecord choice : search.choices()) {
      rows.add(
          List.of(
              Clip.to(Keys.words(choice.key()), 48),
              Clip.to(choice.drawn(), 48),
              "→",
              Clip.to(choice.found(), 48),
              ChoiceWords.runnerUp(search, choice)));
    }
    for (VariableRecord v : search.variables()) {
      rows.add(
          List.of(
              Clip.to(Keys.words(v.key()), 48),
              Numbers.bare(v.drawn(), v.unit()),
              "→",
              Numbers.quantity(v.found(), v.unit()),
              equallyGood(v)));
    }
    return new Listing(List.of("varied", "as drawn", "", "found", "equally good"), rows);
  }

  private static String equallyGood(VariableRecord v) {
    Double low = v.equallyGoodLow();
    Double high = v.equallyGoodHigh();
    String range =
        low == null || high == null
            ? ""
            : Numbers.bare(low, v.unit()) + " to " + Numbers.bare(high, v.unit());
    return v.bound() == null ? range : (range + " (on its " + v.bound() + " bound)").strip();
  }

  private static Listing ledger(RunResult result, Budget found) {
    Outcome asDrawn = result.asDrawn();
    Optional<Budget> drawn = asDrawn == null ? Optional.empty() : Budget.of(asDrawn);
    String head = "of " + Numbers.fixed(found.incidentMaPerCm2(), 2) + " " + Numbers.MA;
    Rows rows = new Rows(head, drawn.isPresent(), found.isStatistical());
    for (Share share : found.shares()) {
      rows.add(
          Clip.to(share.label(), 40),
          share.maPerCm2(),
          share.standardErrorMaPerCm2(),
          drawn.map(d -> d.of(share.label())).orElse(null));
    }
    rows.add("total", found.totalMaPerCm2(), null, drawn.map(Budget::totalMaPerCm2).orElse(null));
    return rows.listing();
  }

  private static List<String> closing(RunResult result) {
    List<String> lines = new ArrayList<>();
    SearchRecord search = result.search();
    if (search != null) {
      FrontWords.of(search).ifPresent(lines::add);
      GridWords.of(search).ifPresent(text -> lines.add(text + "."));
    }
    lines.add(findings(result.findings()));
    return lines;
  }

  private static String findings(List<FindingRecord> findings) {
    if (findings.isEmpty()) {
      return "No findings.";
    }
    FindingRecord first = findings.get(0);
    return Numbers.count(findings.size(), "finding")
        + "; first: "
        + first.severity()
        + ", "
        + first.where()
        + ": "
        + first.message()
        + " (evensun explain "
        + first.code()
        + ")";
  }
}
