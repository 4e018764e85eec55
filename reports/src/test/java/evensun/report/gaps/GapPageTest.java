package evensun.report.gaps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.device.DeviceParameters;
import evensun.device.gaps.GapMapper;
import evensun.device.gaps.GapOptions;
import evensun.device.gaps.GapOptions.Junction;
import evensun.light.Spectra;
import evensun.result.BandgapMap;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

public class GapPageTest {

  /** A map of two gaps as a page. */
  public static String page() {
    return GapPage.html(map(Junction.IDEAL, Junction.IDEAL));
  }

  private static BandgapMap map(Junction... junctions) {
    return GapMapper.map(
        new GapOptions(
            List.of(junctions),
            Spectra.named("AM1.5G"),
            DeviceParameters.of(Connection.SERIES),
            0.7,
            2.0,
            0.05),
        1,
        share -> {});
  }

  /** Witness: the record the page is made of; a reader needs no script. */
  @Test
  void numbersAreReadableWithoutScript() {
    BandgapMap map = map(Junction.IDEAL, Junction.IDEAL);
    String page = GapPage.html(map);
    assertThat(page)
        .contains("Best efficiency %.2f %%".formatted(map.optimum().efficiencyPercent()))
        .contains("Content-Security-Policy")
        .contains("url(#hatch)", "class=\"ridge\"", "class=\"line\"")
        .doesNotContain("<script", "http:", "https:", "NaN", "null");
    assertThat(page.split("<tr><td>", -1)).hasSize(map.ridge().size() + 1);
  }

  @Test
  void oneFreeGapIsACurveAndNoneIsATable() {
    String curve = GapPage.html(map(Junction.IDEAL, Junction.IDEAL.fixedAt(1.12)));
    assertThat(curve).contains("class=\"line\"", "efficiency (%)").doesNotContain("hatch\" width");
    String point = GapPage.html(map(Junction.IDEAL.fixedAt(1.73), Junction.IDEAL.fixedAt(1.12)));
    assertThat(point).contains("All gaps are fixed.").doesNotContain("<svg");
  }

  /** Witness: a circle, whose points all stand at one distance from the middle. */
  @Test
  void contoursOfACone() {
    List<List<@Nullable Double>> rows = new ArrayList<>();
    for (int r = 0; r <= 40; r++) {
      List<@Nullable Double> row = new ArrayList<>();
      for (int c = 0; c <= 40; c++) {
        row.add(Math.hypot(r - 20, c - 20));
      }
      rows.add(row);
    }
    List<Contours.Piece> pieces = new Contours(rows).at(12.5);
    assertThat(pieces).hasSizeGreaterThan(60);
    assertThat(pieces)
        .allSatisfy(
            p -> assertThat(Math.hypot(p.x1() - 20, p.y1() - 20)).isCloseTo(12.5, within(0.05)));
    double length =
        pieces.stream().mapToDouble(p -> Math.hypot(p.x2() - p.x1(), p.y2() - p.y1())).sum();
    assertThat(length).isCloseTo(2 * Math.PI * 12.5, within(0.5));
  }

  @Test
  void cellsWithAHoleAreLeftOut() {
    List<List<@Nullable Double>> rows = new ArrayList<>();
    List<@Nullable Double> first = new ArrayList<>();
    first.add(0.0);
    first.add(null);
    rows.add(first);
    rows.add(List.of(1.0, 2.0));
    assertThat(new Contours(rows).at(0.5)).isEmpty();
  }
}
