package evensun.report.decision;

import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.MaterialUse;
import evensun.result.Opinion;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.VariableRecord;
import evensun.result.Sensitivity;
import evensun.result.WhatIf;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/** What would change the decision, and what is uncertain about it. */
public final class Outlook {

  private static final int MOST_SENSITIVITIES = 3;
  private static final double TOLERATED = 0.1;
  private static final double LEAST_SHOWN = 1e-3;

  private Outlook() {}

  /** The strongest sensitivities in deposition terms, at most three. */
  public static List<String> wouldChange(RunResult result) {
    List<Sensitivity> sensitivities =
        Objects.requireNonNullElse(result.sensitivities(), List.<Sensitivity>of());
    String unit = aimUnit(result);
    return sensitivities.stream()
        .limit(MOST_SENSITIVITIES)
        .map(s -> sensitivity(s, unit, result))
        .toList();
  }

  private static String aimUnit(RunResult result) {
    SearchRecord search = result.search();
    return search == null ? Numbers.MA : search.aimUnit();
  }

  private static String sensitivity(Sensitivity s, String unit, RunResult result) {
    String text =
        Clip.to(Keys.words(s.key()), 60)
            + " off by ±"
            + Numbers.quantity(s.tolerance(), s.unit())
            + " "
            + effect(s.toleranceAimChange(), unit);
    return text + window(s.key(), unit, result).map(w -> "; " + w).orElse("") + ".";
  }

  private static String effect(double change, String unit) {
    if (Math.abs(change) < 5e-3) {
      return "changes next to nothing";
    }
    return (change < 0 ? "costs up to " : "gains ") + Numbers.quantity(Math.abs(change), unit);
  }

  private static Optional<String> window(String key, String unit, RunResult result) {
    SearchRecord search = result.search();
    if (search == null || !unit.equals(Numbers.MA)) {
      return Optional.empty();
    }
    for (WhatIf whatIf : Objects.requireNonNullElse(result.whatIf(), List.<WhatIf>of())) {
      Optional<VariableRecord> variable =
          search.variables().stream().filter(v -> v.key().equals(key)).findFirst();
      if (whatIf.key().equals(key) && variable.isPresent()) {
        return Window.around(
                whatIf, variable.get().found(), search.aimFound(), search.aimFound() - TOLERATED)
            .map(
                w ->
                    "it costs less than "
                        + Numbers.trimmed(TOLERATED, 1)
                        + "\u00a0"
                        + unit.replace(' ', '\u00a0')
                        + " from "
                        + Numbers.bare(w.low(), whatIf.unit())
                        + " to "
                        + Numbers.quantity(w.high(), whatIf.unit()));
      }
    }
    return Optional.empty();
  }

  /** What is uncertain, numerical and material uncertainty apart. */
  public static List<String> uncertain(RunResult result) {
    List<String> texts = new ArrayList<>();
    List<Opinion> opinions = Objects.requireNonNullElse(result.secondOpinion(), List.<Opinion>of());
    numerics(opinions, aimUnit(result)).ifPresent(texts::add);
    materials(opinions, aimUnit(result)).ifPresent(texts::add);
    statistics(result).ifPresent(texts::add);
    remembered(result).ifPresent(texts::add);
    if (opinions.isEmpty()) {
      texts.add("No second opinion was computed: the error of these numbers was not tested.");
    }
    texts.add("Perfect collection is assumed: absorbed light counts as current.");
    return texts;
  }

  private static Optional<String> numerics(List<Opinion> opinions, String unit) {
    double largest = -1;
    int tested = 0;
    for (Opinion opinion : opinions) {
      if (opinion.kind().equals("numerics") && opinion.difference() != null) {
        largest = Math.max(largest, Math.abs(opinion.difference()));
        tested++;
      }
    }
    return largest < 0
        ? Optional.empty()
        : Optional.of(
            "Numerics: "
                + Numbers.count(tested, "other way")
                + " to compute the same design moved it by "
                + (largest < LEAST_SHOWN ? "less than " : "at most ")
                + Numbers.withUnit(Numbers.fixed(Math.max(largest, LEAST_SHOWN), 3), unit)
                + ".");
  }

  private static Optional<String> materials(List<Opinion> opinions, String unit) {
    List<Opinion> tested =
        opinions.stream()
            .filter(o -> o.kind().equals("material") && o.difference() != null)
            .sorted(
                java.util.Comparator.comparingDouble(
                    (Opinion o) -> -Math.abs(Objects.requireNonNull(o.difference()))))
            .toList();
    if (tested.isEmpty()) {
      return Optional.empty();
    }
    Opinion worst = tested.get(0);
    return Optional.of(
        "Materials: of "
            + Numbers.count(tested.size(), "other source")
            + " tried, the largest difference is "
            + Numbers.change(Objects.requireNonNull(worst.difference()), unit)
            + " ("
            + Clip.to(worst.what(), 90)
            + ").");
  }

  private static Optional<String> statistics(RunResult result) {
    return result.found().subcells().stream()
        .map(SubcellOutcome::standardErrorMaPerCm2)
        .filter(Objects::nonNull)
        .max(Double::compare)
        .filter(error -> error > 0)
        .map(
            error ->
                "Statistics: subcell currents carry ±"
                    + Numbers.withUnit(Numbers.fixed(error, 3), Numbers.MA)
                    + " (one standard error).");
  }

  private static Optional<String> remembered(RunResult result) {
    List<String> names =
        result.materials().stream().filter(MaterialUse::fromMemory).map(MaterialUse::name).toList();
    return names.isEmpty()
        ? Optional.empty()
        : Optional.of(
            "From memory, not looked up: " + Clip.to(String.join(", ", names), 120) + ".");
  }
}
