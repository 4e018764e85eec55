package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.text.Numbers;
import evensun.result.RunResult;
import org.junit.jupiter.api.Test;

/** The closing summary; its numbers are held against the result it is made from. */
class ClosingSummaryTest {

  @Test
  void saysTheDecisionTheVariedValuesTheLedgerTheFindingsAndThePath() {
    RunResult run = SampleRuns.full();
    String text = ClosingSummary.text(run, "runs/a/report.html");
    assertThat(text)
        .contains("matched at " + Numbers.fixed(run.found().matchedCurrentMaPerCm2(), 2))
        .contains("Decide after checking these points (1).")
        .containsPattern("antireflection thickness +100  →  112.4 nm  104 to 121.5")
        .containsPattern("total +46.46 +46.46 +0.00")
        .contains("2 findings; first: warning, front-contact.thicknessNm")
        .contains("evensun explain bound-reached")
        .endsWith("Report: runs/a/report.html\n");
  }

  @Test
  void anAssessmentComparesWithNothing() {
    assertThat(ClosingSummary.text(SampleRuns.assessment(), ""))
        .contains("As drawn, the device passes")
        .contains("No findings.")
        .doesNotContain("change")
        .doesNotContain("Report:");
  }

  @Test
  void aTitleCannotSteerTheTerminalOrTheTicket() {
    RunResult run = SampleRuns.titled("\u001b[31mred\u0007 \u202eback | **bold** <b>");
    assertThat(ClosingSummary.text(run, "")).doesNotContain("\u001b", "\u0007", "\u202e");
    assertThat(ClosingSummary.markdown(run, ""))
        .contains("\\*\\*bold\\*\\* \\<b\\>")
        .contains("back \\|");
  }
}
