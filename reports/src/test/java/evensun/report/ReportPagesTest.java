package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.compare.ComparisonPages;
import evensun.report.compare.NamedRun;
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

  private static ReportPage page(String name) {
    return switch (name) {
      case "full" -> Written.model(SampleRuns.full());
      case "assessment" -> Written.model(SampleRuns.assessment());
      case "one-wavelength" -> Written.model(AwkwardRuns.oneWavelength());
      case "front" -> Written.model(FrontRuns.full());
      case "failed-search" -> Written.model(AwkwardRuns.failedSearch());
      case "comparison" -> ComparisonPages.page(drawnAndSearched());
      default -> throw new IllegalArgumentException(name);
    };
  }

  private static List<NamedRun> drawnAndSearched() {
    return List.of(
        new NamedRun("drawn", SampleRuns.assessment(), "12345678"),
        new NamedRun("found", SampleRuns.full(), "9abcdef0"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"full", "assessment", "front", "one-wavelength", "failed-search", "comparison"})
  void aPageSaysWhatItsGoldenFileSays(String name) throws IOException {
    String outline = PageOutline.of(page(name));
    Path golden = GOLDEN.resolve(name + ".txt");
    if (Boolean.getBoolean("golden.update")) {
      Files.createDirectories(GOLDEN);
      Files.writeString(golden, outline);
    }
    assertThat(outline).isEqualTo(Files.readString(golden));
  }

  @Test
  void sectionsWithoutDataAreAbsent() {
    assertThat(ids(Written.model(SampleRuns.full())))
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
    assertThat(ids(Written.model(SampleRuns.assessment())))
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
    return Written.model(result).decision().verdict().level();
  }
}
