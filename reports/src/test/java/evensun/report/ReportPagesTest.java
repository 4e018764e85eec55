package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.page.ReportPage;
import evensun.report.page.Section;
import evensun.report.page.Verdict.Level;
import evensun.result.RunResult;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The page model. The golden files were read line by line when they were made; after a wanted
 * change {@code -Dgolden.update=true} writes them anew, to be read again.
 */
class ReportPagesTest {

  private static final Path GOLDEN = Path.of("src/test/resources/evensun/report/golden");

  private static RunResult run(String name) {
    return switch (name) {
      case "full" -> SampleRuns.full();
      case "assessment" -> SampleRuns.assessment();
      case "one-wavelength" -> AwkwardRuns.oneWavelength();
      case "failed-search" -> AwkwardRuns.failedSearch();
      default -> throw new IllegalArgumentException(name);
    };
  }

  @ParameterizedTest
  @ValueSource(strings = {"full", "assessment", "one-wavelength", "failed-search"})
  void aPageSaysWhatItsGoldenFileSays(String name) throws IOException {
    String outline = PageOutline.of(ReportPages.of(run(name)));
    Path golden = GOLDEN.resolve(name + ".txt");
    if (Boolean.getBoolean("golden.update")) {
      Files.createDirectories(GOLDEN);
      Files.writeString(golden, outline);
    }
    assertThat(outline).isEqualTo(Files.readString(golden));
  }

  @Test
  void sectionsWithoutDataAreAbsent() {
    assertThat(ids(ReportPages.of(SampleRuns.full())))
        .containsExactly(
            "stack",
            "light",
            "electrical",
            "search",
            "sensitivities",
            "second-opinion",
            "depth",
            "angle",
            "findings",
            "assumptions",
            "provenance",
            "cautions");
    assertThat(ids(ReportPages.of(SampleRuns.assessment())))
        .containsExactly("stack", "light", "assumptions", "provenance", "cautions");
  }

  private static List<String> ids(ReportPage page) {
    return page.sections().stream().map(Section::id).toList();
  }

  @Test
  void theVerdictFollowsItsRules() {
    assertThat(level(SampleRuns.full())).isEqualTo(Level.CHECK);
    assertThat(level(SampleRuns.assessment())).isEqualTo(Level.FIT);
    assertThat(level(AwkwardRuns.oneWavelength())).isEqualTo(Level.DO_NOT);
    assertThat(level(AwkwardRuns.failedSearch())).isEqualTo(Level.DO_NOT);
  }

  private static Level level(RunResult result) {
    return ReportPages.of(result).decision().verdict().level();
  }
}
