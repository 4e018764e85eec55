package evensun.report;

import evensun.report.decision.Outlook;
import evensun.report.decision.Sentence;
import evensun.report.decision.VerdictRules;
import evensun.report.figure.Figure;
import evensun.report.figure.LevelPicture;
import evensun.report.figure.LevelPicture.Vessel;
import evensun.report.page.Decision;
import evensun.report.page.Decision.Headline;
import evensun.report.page.ReportPage;
import evensun.report.page.Section;
import evensun.report.section.AngleSection;
import evensun.report.section.AssumptionSection;
import evensun.report.section.CautionSection;
import evensun.report.section.DepthSection;
import evensun.report.section.ElectricalSection;
import evensun.report.section.FindingsSection;
import evensun.report.section.LightSection;
import evensun.report.section.MeasuredSection;
import evensun.report.section.OpinionSection;
import evensun.report.section.ProvenanceSection;
import evensun.report.section.PublishedSection;
import evensun.report.section.SearchSection;
import evensun.report.section.SensitivitySection;
import evensun.report.section.StackSection;
import evensun.report.section.TextureSection;
import evensun.report.text.Glossary;
import evensun.report.text.Numbers;
import evensun.result.Electrical;
import evensun.result.Outcome;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.Provenance;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** Turns a result into the page as data. */
final class ReportPages {

  private static final double LEVELS_PX = 580;
  private static final int DAY_LENGTH = "2026-01-31".length();

  private static final List<Function<RunResult, Optional<Section>>> SECTIONS =
      List.of(
          StackSection::of,
          LightSection::of,
          TextureSection::of,
          ElectricalSection::of,
          SearchSection::of,
          SensitivitySection::of,
          OpinionSection::of,
          DepthSection::of,
          AngleSection::of,
          MeasuredSection::of,
          FindingsSection::of,
          AssumptionSection::of,
          ProvenanceSection::of,
          PublishedSection::of,
          CautionSection::of);

  private ReportPages() {}

  /**
   * The page of a result.
   *
   * @param shortHash first digits of the hash of its file
   */
  static ReportPage of(RunResult result, String shortHash) {
    List<Section> sections =
        SECTIONS.parallelStream()
            .map(section -> section.apply(result))
            .flatMap(Optional::stream)
            .toList();
    Provenance provenance = result.provenance();
    String started = provenance.startedUtc();
    return new ReportPage(
        result.search() == null ? "Assessment" : "Design review",
        result.title(),
        started.substring(0, Math.min(DAY_LENGTH, started.length())),
        shortHash,
        "First digits of the SHA-256 of result.json",
        decision(result),
        sections,
        Glossary.all(),
        "Written by Evensun " + provenance.evensunVersion() + " from result.json alone.");
  }

  private static Decision decision(RunResult result) {
    Figure levels = levels(result);
    return new Decision(
        Sentence.of(result),
        headlines(result),
        VerdictRules.of(result),
        VerdictRules.rules(),
        levels,
        levels == null ? "" : levels.description(),
        Outlook.wouldChange(result),
        Outlook.uncertain(result));
  }

  private static @Nullable Figure levels(RunResult result) {
    Outcome drawn = result.asDrawn();
    List<Vessel> vessels = new ArrayList<>();
    for (SubcellOutcome subcell : result.found().subcells()) {
      Double current = subcell.photocurrentMaPerCm2();
      if (current == null) {
        return null;
      }
      vessels.add(
          new Vessel(
              subcell.name(),
              current,
              drawnCurrent(drawn, subcell.name()),
              subcell.standardErrorMaPerCm2()));
    }
    if (vessels.isEmpty()) {
      return null;
    }
    Double level = result.found().matchedCurrentMaPerCm2();
    String what =
        "Each subcell filled to its current"
            + (level == null
                ? "."
                : "; the weakest sets the level, what stands above it is unused.")
            + (drawn == null ? "" : " Dotted: as drawn.");
    return Figure.of(new LevelPicture(vessels, level), what, LEVELS_PX);
  }

  private static @Nullable Double drawnCurrent(@Nullable Outcome drawn, String name) {
    return drawn == null
        ? null
        : drawn.subcells().stream()
            .filter(subcell -> subcell.name().equals(name))
            .findFirst()
            .map(SubcellOutcome::photocurrentMaPerCm2)
            .orElse(null);
  }

  private static List<Headline> headlines(RunResult result) {
    List<Headline> headlines = new ArrayList<>();
    Outcome found = result.found();
    Outcome drawn = result.asDrawn();
    Electrical electrical = found.electrical();
    if (electrical != null) {
      add(
          headlines,
          "electrical.efficiencyPercent",
          "efficiency",
          "%",
          electrical.efficiencyPercent(),
          null,
          drawn == null || drawn.electrical() == null
              ? null
              : drawn.electrical().efficiencyPercent());
    }
    add(
        headlines,
        "matchedCurrentMaPerCm2",
        "matched current",
        Numbers.MA,
        found.matchedCurrentMaPerCm2(),
        found.matchedStandardErrorMaPerCm2(),
        drawn == null ? null : drawn.matchedCurrentMaPerCm2());
    add(
        headlines,
        "mismatchMaPerCm2",
        "mismatch",
        Numbers.MA,
        found.mismatchMaPerCm2(),
        null,
        drawn == null ? null : drawn.mismatchMaPerCm2());
    add(
        headlines,
        "losses",
        "lost in all",
        Numbers.MA,
        lost(found),
        null,
        drawn == null ? null : lost(drawn));
    return headlines;
  }

  private static void add(
      List<Headline> headlines,
      String key,
      String label,
      String unit,
      @Nullable Double value,
      @Nullable Double standardError,
      @Nullable Double drawn) {
    if (value != null) {
      String note = drawn == null ? "" : "as drawn " + Numbers.fixed(drawn, 2);
      headlines.add(
          new Headline(
              key,
              label,
              Numbers.fixed(value, 2),
              Numbers.plusMinus(standardError).strip(),
              unit,
              note));
    }
  }

  private static @Nullable Double lost(Outcome outcome) {
    Outcome.Losses losses = outcome.losses();
    if (losses == null) {
      return null;
    }
    double parasitic = losses.parasitic().stream().mapToDouble(Outcome.Parasitic::maPerCm2).sum();
    return losses.reflectedMaPerCm2() + losses.transmittedMaPerCm2() + parasitic;
  }
}
