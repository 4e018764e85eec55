package evensun.report.decision;

import evensun.report.page.Verdict;
import evensun.report.page.Verdict.Level;
import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.FindingRecord;
import evensun.result.Opinion;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;

/** The verdict, by rules that the page states. */
public final class VerdictRules {

  private static final double NUMERICS_FRACTION = 0.0025;
  private static final int MOST_LETTERS = 400;

  private VerdictRules() {}

  /** The rules in words, as the page shows them. */
  public static List<String> rules() {
    return List.of(
        "“Do not decide on this” if a finding is serious, if there are no currents, or if the search"
            + " could evaluate no design.",
        "“Decide after checking these points” if a finding is a warning, if the search stopped"
            + " before it had converged, if a found value stands on its bound, if another way to"
            + " compute the same design moves the aim by more than 0.25 %, or if another source of a"
            + " material takes away more than the gain over as drawn.",
        "“Fit to decide on” otherwise: within the assumptions listed below, nothing speaks against"
            + " it.");
  }

  /** The verdict on a result. */
  public static Verdict of(RunResult result) {
    List<String> against = against(result);
    if (!against.isEmpty()) {
      return new Verdict(Level.DO_NOT, against);
    }
    List<String> points = points(result);
    return new Verdict(points.isEmpty() ? Level.FIT : Level.CHECK, points);
  }

  private static List<String> against(RunResult result) {
    List<String> reasons = new ArrayList<>(findings(result, "serious"));
    if (result.found().incidentMaPerCm2() == null) {
      reasons.add("A single wavelength carries no current.");
    }
    SearchRecord search = result.search();
    if (search != null && Sentence.failed(search)) {
      reasons.add("The search could evaluate no design.");
    }
    return reasons;
  }

  private static List<String> points(RunResult result) {
    List<String> points = new ArrayList<>(findings(result, "warning"));
    SearchRecord search = result.search();
    if (search != null) {
      if (!found(result, "search-not-converged")) {
        stopped(search).ifPresent(points::add);
      }
      search.variables().stream()
          .filter(variable -> variable.bound() != null)
          .filter(variable -> !named(result, variable))
          .map(VerdictRules::bound)
          .forEach(points::add);
      opinions(result, search, points);
    }
    return points;
  }

  /** One reason for findings that say the same of several things. */
  private static List<String> findings(RunResult result, String severity) {
    Map<String, List<FindingRecord>> alike = new LinkedHashMap<>();
    for (FindingRecord finding : result.findings()) {
      if (finding.severity().equals(severity)) {
        String text = finding.code() + finding.message().replace(finding.where(), "");
        alike.computeIfAbsent(text, key -> new ArrayList<>()).add(finding);
      }
    }
    return alike.values().stream().map(same -> words(result, together(same))).toList();
  }

  private static FindingRecord together(List<FindingRecord> same) {
    FindingRecord first = same.get(0);
    String where = same.stream().map(FindingRecord::where).collect(Collectors.joining(", "));
    return same.size() == 1
        ? first
        : new FindingRecord(
            first.severity(), first.code(), where, first.message().replace(first.where(), where));
  }

  private static String words(RunResult result, FindingRecord finding) {
    String message = Clip.to(finding.message(), MOST_LETTERS);
    if (finding.where().isEmpty() || finding.message().contains(finding.where())) {
      return message;
    }
    return Clip.to(spoken(result, finding.where()), 60) + ": " + message;
  }

  private static String spoken(RunResult result, String where) {
    return result.found().design().containsKey(where) ? Keys.words(where) : where;
  }

  private static boolean found(RunResult result, String code) {
    return result.findings().stream().anyMatch(finding -> finding.code().equals(code));
  }

  private static java.util.Optional<String> stopped(SearchRecord search) {
    return switch (search.stopped()) {
      case "converged" -> java.util.Optional.empty();
      case "evaluations" ->
          java.util.Optional.of(
              "The search spent its "
                  + Numbers.count(search.evaluations(), "evaluation")
                  + " before it had converged.");
      case "time" -> java.util.Optional.of("The search ran out of time before it had converged.");
      case "interrupted" -> java.util.Optional.of("The search was interrupted.");
      default -> java.util.Optional.of("The search stopped: " + search.stopped() + ".");
    };
  }

  /** Whether a finding already says something about a variable's bound. */
  private static boolean named(RunResult result, VariableRecord variable) {
    return result.findings().stream()
        .anyMatch(
            finding ->
                finding.code().contains("bound")
                    && (finding.where().contains(Keys.layer(variable.key()))
                        || finding.message().contains(Keys.layer(variable.key()))));
  }

  private static String bound(VariableRecord variable) {
    boolean low = "low".equals(variable.bound());
    return Clip.to(Keys.words(variable.key()), 60)
        + " stands on its "
        + (low ? "lower" : "upper")
        + " bound of "
        + Numbers.quantity(low ? variable.low() : variable.high(), variable.unit())
        + "; a wider range may do better.";
  }

  private static void opinions(RunResult result, SearchRecord search, List<String> points) {
    double gain =
        search.aimFound() - Objects.requireNonNullElse(search.aimAsDrawn(), search.aimFound());
    for (Opinion opinion : Objects.requireNonNullElse(result.secondOpinion(), List.<Opinion>of())) {
      Double difference = opinion.difference();
      if (difference == null) {
        continue;
      }
      boolean numerics = opinion.kind().equals("numerics");
      boolean large =
          numerics
              ? Math.abs(difference) > NUMERICS_FRACTION * Math.abs(search.aimFound())
              : gain > 0 && -difference > gain;
      if (large) {
        points.add(
            Clip.to(opinion.what(), 120)
                + " moves the aim by "
                + Numbers.change(difference, search.aimUnit())
                + (numerics ? "." : ", more than the gain over as drawn."));
      }
    }
  }
}
