package evensun.report.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.report.figure.LevelPicture.Vessel;
import evensun.report.figure.Shape.Box;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Geometry of the drawings, held against sums and proportions worked out here. */
class FiguresTest {

  private static final Budget BUDGET =
      new Budget(
          40,
          List.of(
              new Share("reflected", "reflected", 4, null),
              new Share("contact", "parasitic", 1, null),
              new Share("top", "sub1", 18, null),
              new Share("bottom", "sub2", 17, null)));

  @Test
  void thePartsOfTheBarFillItInProportion() {
    List<Box> parts = boxes(new LightBar(null, BUDGET).draw(800), "part ");
    assertThat(parts).hasSize(4);
    assertThat(parts.stream().mapToDouble(Box::width).sum()).isCloseTo(800, within(1e-9));
    assertThat(parts.get(2).width()).isCloseTo(800 * 18 / 40.0, within(1e-9));
    assertThat(parts.get(3).x() + parts.get(3).width()).isCloseTo(800, within(1e-9));
  }

  @Test
  void theWaterfallEndsAtZero() {
    List<Box> bars = boxes(new Waterfall(BUDGET).draw(880), "fill-");
    Box last = bars.get(bars.size() - 1);
    assertThat(last.x()).isCloseTo(bars.get(0).x(), within(1e-6));
    assertThat(last.width() / bars.get(0).width()).isCloseTo(17 / 40.0, within(1e-6));
  }

  @Test
  void aVesselIsFilledToItsCurrentAndHatchedAboveTheLevel() {
    LevelPicture picture =
        new LevelPicture(
            List.of(new Vessel("top", 20, null, null), new Vessel("bottom", 15, null, null)), 15.0);
    Drawing drawing = picture.draw(580);
    List<Box> filled = boxes(drawing, "fill-sub");
    List<Box> surplus = boxes(drawing, "pale-sub");
    assertThat(filled.get(0).height()).isCloseTo(filled.get(1).height(), within(1e-9));
    assertThat(surplus).hasSize(1);
    assertThat(surplus.get(0).height() / filled.get(0).height()).isCloseTo(5 / 15.0, within(1e-9));
  }

  @Test
  void labelsNeverOverlapAndKeepTheirOrder() {
    Random random = new Random(5);
    for (int round = 0; round < 200; round++) {
      int n = 1 + random.nextInt(12);
      double[] wanted = random.doubles(n, 0, 500).sorted().toArray();
      double[] size = random.doubles(n, 10, 40).toArray();
      double[] at = Spread.apart(wanted, size, 0, 500);
      for (int i = 0; i + 1 < n; i++) {
        assertThat(at[i + 1] - at[i]).isGreaterThan((size[i] + size[i + 1]) / 2 - 1e-3);
      }
    }
  }

  @Test
  void aPathHoldsNumbersAlone() {
    double[] awkward = {0, -0.04, 12.35, -7, 1e300, Double.NaN, Double.NEGATIVE_INFINITY};
    for (double x : awkward) {
      for (double y : awkward) {
        // The commands of a path as SVG has them.
        assertThat(new Path().move(x, y).line(y, x).close().toString())
            .matches("M-?[0-9.]+ -?[0-9.]+L-?[0-9.]+ -?[0-9.]+Z");
      }
    }
    assertThat(new Path().move(-0.25, 1.04).toString()).isEqualTo("M-0.2 1");
  }

  @Test
  void ticksAreRoundAndInside() {
    assertThat(Ticks.of(0, 23, 5)).containsExactly(0.0, 5.0, 10.0, 15.0, 20.0);
    assertThat(Ticks.of(300, 1200, 9)).hasSize(10).startsWith(300.0).endsWith(1200.0);
    assertThat(Ticks.of(1, 1, 5)).isEmpty();
  }

  private static List<Box> boxes(Drawing drawing, String look) {
    return drawing.shapes().stream()
        .filter(Box.class::isInstance)
        .map(Box.class::cast)
        .filter(box -> box.look().startsWith(look))
        .toList();
  }
}
