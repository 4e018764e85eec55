package evensun.testkit;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.testkit.LawReport.Status;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * A law is worth something when it lets right solvers pass and catches the mistake it is meant for.
 * Witness: solvers of our own with one known flaw each.
 */
class LawsTest {

  private static final Duration LIMIT = Duration.ofSeconds(60);

  @Test
  void aRightSolverKeepsEveryLaw() {
    List<LawReport> reports =
        ContractCheck.run(Subject.alone(new TwoBeam(Flaw.NONE)), LIMIT, report -> {});
    assertThat(reports).noneMatch(report -> report.status() == Status.FAILED);
    assertThat(reports).filteredOn(report -> report.status() == Status.PASSED).hasSize(22);
    assertThat(reports)
        .filteredOn(report -> report.status() == Status.PASSED)
        .allMatch(report -> report.tried() > 0);
  }

  @ParameterizedTest
  @EnumSource(
      mode = EnumSource.Mode.EXCLUDE,
      names = {"NONE", "HANGS"})
  void aFlawIsCaughtByItsLaw(Flaw flaw) {
    LawReport report = law(flaw.law).check(Subject.alone(new TwoBeam(flaw)));
    assertThat(report.status()).isEqualTo(Status.FAILED);
    assertThat(report.message()).isNotBlank().doesNotContain("\n");
    assertThat(report.smallest()).isPresent();
  }

  @Test
  void aSolverThatHangsIsLeftBehind() {
    Subject subject = Subject.alone(new TwoBeam(Flaw.HANGS));
    LawReport report =
        ContractCheck.checkWithin(law(Flaw.HANGS.law), subject, Duration.ofSeconds(2));
    assertThat(report.status()).isEqualTo(Status.FAILED);
    assertThat(report.message()).isEqualTo("no answer within 2 s");
  }

  @Test
  void everyLawIsBrokenBySomeFlaw() {
    Stream<String> caught = Arrays.stream(Flaw.values()).map(flaw -> flaw.law);
    List<String> judging =
        Laws.all().stream().map(Law::name).filter(name -> !name.equals("pace")).toList();
    assertThat(caught.toList()).containsAll(judging);
  }

  @Test
  void aFailingCaseIsMadeSmall() {
    StackCase smallest =
        law("ledger").check(Subject.alone(new TwoBeam(Flaw.MAKES_LIGHT))).smallest().orElseThrow();
    assertThat(smallest.layerCount()).isZero();
    assertThat(smallest.wavelengthCount()).isEqualTo(1);
    assertThat(smallest.angleDeg()).isZero();
    assertThat(smallest.exit()).isEqualTo(CaseMedium.of(2, 0));
  }

  @Test
  void casesAreTheSameEveryTime() {
    assertThat(Cases.plain()).isEqualTo(Cases.plain());
    assertThat(Cases.plain()).extracting(StackCase::layerCount).contains(1, 2, 4, 8);
  }

  private static Law law(String name) {
    return Laws.all().stream().filter(law -> law.name().equals(name)).findFirst().orElseThrow();
  }
}
