package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.report.figure.Budget;
import evensun.report.figure.Drawing;
import evensun.report.figure.RayPicture;
import evensun.report.figure.Shape;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.section.TextureSection;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class TextureSectionTest {

  private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

  private static Section section() {
    return TextureSection.of(TexturedRuns.assessment()).orElseThrow();
  }

  private static Table table(String id) {
    return section().blocks().stream()
        .filter(Block.Grid.class::isInstance)
        .map(block -> ((Block.Grid) block).table())
        .filter(t -> t.id().equals(id))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void flatBoundariesHaveNoSection() {
    assertThat(TextureSection.of(SampleRuns.assessment())).isEmpty();
  }

  /** Law: both columns are ledgers, so each total is the available current. */
  @Test
  void bothLedgersAddUp() {
    RunResult run = TexturedRuns.assessment();
    Table table = table("table-flat-twin");
    List<String> total = table.rows().get(table.rows().size() - 1);
    assertThat(total.get(1)).isEqualTo(Numbers.fixed(run.found().incidentMaPerCm2(), 3));
    assertThat(total.get(2)).isEqualTo(total.get(1));
    assertThat(total.get(4)).isEqualTo(Numbers.signed(0, 3));
    List<String> reflected = table.rows().get(0);
    assertThat(reflected.get(3)).isEqualTo("0.008");
    double never = number(table.rows().get(1).get(2));
    double back = number(table.rows().get(2).get(2));
    assertThat(never + back).isCloseTo(number(reflected.get(2)), within(1.1e-3));
  }

  @Test
  void theHeadingTellsWhatTheSubcellsGain() {
    RunResult run = TexturedRuns.assessment();
    double gain =
        Budget.of(run.found()).orElseThrow().collectedMaPerCm2()
            - Budget.of(run.textured().flat()).orElseThrow().collectedMaPerCm2();
    assertThat(section().heading())
        .contains(gain < 0 ? "lose" : "gain")
        .endsWith(Numbers.ma(Math.abs(gain)));
  }

  @Test
  void filmsOnFacetsAreGivenAlongBothNormals() {
    Table table = table("table-facet-films");
    assertThat(table.rows()).isNotEmpty();
    for (List<String> row : table.rows()) {
      assertThat(number(row.get(2))).isCloseTo(2 * number(row.get(1)), within(0.1));
    }
  }

  @Test
  void raysStayInsideThePictureAndThinOut() {
    for (double width : new double[] {880, 360}) {
      Drawing drawing = new RayPicture(TexturedRuns.section(), Map.of()).draw(width);
      List<double[]> rays =
          drawing.shapes().stream()
              .filter(shape -> shape.look().equals("ray"))
              .map(shape -> numbers(((Shape.Outline) shape).path().toString()))
              .toList();
      assertThat(rays).hasSizeGreaterThan(5);
      for (double[] ray : rays) {
        for (int i = 0; i < ray.length; i += 2) {
          assertThat(ray[i]).isBetween(-3.0, width + 3);
          assertThat(ray[i + 1]).isBetween(-3.0, drawing.height() + 3);
        }
      }
      // The first piece carries all light, the one below the wafer about half of it.
      double first = Math.hypot(rays.get(0)[0] - rays.get(0)[6], rays.get(0)[1] - rays.get(0)[7]);
      assertThat(first).isCloseTo(3.4, within(0.2));
    }
    assertThat(RayPicture.isBroken(TexturedRuns.section())).isTrue();
  }

  private static double number(String cell) {
    return Double.parseDouble(cell.replace('−', '-'));
  }

  private static double[] numbers(String path) {
    Matcher matcher = NUMBER.matcher(path);
    return matcher.results().mapToDouble(r -> Double.parseDouble(r.group())).toArray();
  }
}
