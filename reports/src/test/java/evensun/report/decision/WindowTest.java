package evensun.report.decision;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.result.WhatIf;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The stretch in which a value costs little, on curves whose crossings are known by hand. */
class WindowTest {

  private static final WhatIf TENT =
      new WhatIf(
          "a.thicknessNm", "nm", List.of(0.0, 4.0, 10.0), List.of(10.0, 14.0, 8.0), Map.of());

  @Test
  void endsWhereTheCurveCrossesTheFloor() {
    // From the top at 5 (15 high): down 1.25 per nm to the left, 1.4 per nm to the right.
    Window window = Window.around(TENT, 5, 15, 14).orElseThrow();
    assertThat(window.low()).isEqualTo(4);
    assertThat(window.high()).isEqualTo(5 + 1 / 1.4);
  }

  @Test
  void endsAtTheEndOfTheCurveWhereItStaysAbove() {
    Window window = Window.around(TENT, 5, 15, 1).orElseThrow();
    assertThat(window).isEqualTo(new Window(0, 10));
  }

  @Test
  void isAbsentOutsideTheCurve() {
    assertThat(Window.around(TENT, 11, 15, 1)).isEmpty();
  }
}
