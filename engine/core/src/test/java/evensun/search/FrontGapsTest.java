package evensun.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.search.problem.Individual;
import evensun.search.problem.Space;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Witness: the gaps that were left on purpose. */
class FrontGapsTest {

  private static Individual design(List<Double> genes, Double... aims) {
    return new Individual(0, genes, new Verdict(List.of(aims), 0, 0, ""));
  }

  @Test
  void twoAimsHaveTheirGapBetweenDesignsThatStandNextToEachOther() {
    List<Individual> front = new ArrayList<>();
    for (double x : new double[] {0, 0.1, 0.2, 0.7, 0.8, 1}) {
      front.add(design(List.of(x), x, -x));
    }
    List<double[]> filled =
        new FrontGaps(new Space(List.of(Problem.box(1, 0, 1))), front).filled(3);
    assertThat(filled).hasSize(3);
    assertThat(filled.get(0)[0]).isCloseTo(0.45, within(1e-12));
    assertThat(List.of(filled.get(1)[0], filled.get(2)[0]))
        .allMatch(x -> Math.abs(x - 0.325) < 1e-12 || Math.abs(x - 0.575) < 1e-12);
  }

  /** Designs all over the plane x + y + z = 1 but for a hole of radius 0.15 about its middle. */
  @Test
  void threeAimsHaveTheirGapAcrossAHole() {
    List<Individual> front = new ArrayList<>();
    for (int i = 0; i <= 12; i++) {
      for (int j = 0; i + j <= 12; j++) {
        double x = i / 12.0;
        double y = j / 12.0;
        if (Math.hypot(x - 1 / 3.0, y - 1 / 3.0) > 0.15) {
          front.add(design(List.of(x, y), x, y, 1 - x - y));
        }
      }
    }
    Space space = new Space(List.of(Problem.box(2, 0, 1)));
    double[] first = new FrontGaps(space, front).filled(1).get(0);
    assertThat(Math.hypot(first[0] - 1 / 3.0, first[1] - 1 / 3.0)).isLessThan(0.15);
  }

  @Test
  void thereIsNothingBetweenAlternatives() {
    Space space = new Space(List.of(Variable.choice("layer.material", List.of("a", "b", "c"), 0)));
    List<Individual> front =
        List.of(design(List.of(0.0), 0.0, 1.0), design(List.of(1.0), 1.0, 0.0));
    assertThat(new FrontGaps(space, front).filled(3))
        .extracting(genes -> genes[0])
        .containsOnly(0.0, 1.0);
  }
}
