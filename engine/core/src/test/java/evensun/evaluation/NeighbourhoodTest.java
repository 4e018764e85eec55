package evensun.evaluation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import evensun.result.Sensitivity;
import evensun.result.WhatIf;
import evensun.search.problem.Variable;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Witness throughout: currents of the two grey cells worked out here from their closed form,
 * photons q/(hc)·E·(λ₂² − λ₁²)/2 per bin times what is absorbed, exp(−4πkd/λ) passing each layer.
 */
class NeighbourhoodTest {

  private static final double UPPER = 300;
  private static final double LOWER = 900;
  private static final double K = 0.05;

  private static double[] currents(double upperNm, double lowerNm) {
    double[] currents = new double[2];
    for (double nm = 400; nm <= 800; nm += 10) {
      double from = Math.max(400, nm - 5);
      double to = Math.min(800, nm + 5);
      // W m⁻² nm⁻¹ · nm² / (eV nm) is A m⁻²; 1 A m⁻² is 0.1 mA cm⁻².
      double photons = 0.1 * Cells.FLAT * (to * to - from * from) / 2 / Constants.HC_EV_NM;
      double passed = Math.exp(-4 * Math.PI * K * upperNm / nm);
      currents[0] += photons * (1 - passed);
      currents[1] += photons * passed * (1 - Math.exp(-4 * Math.PI * K * lowerNm / nm));
    }
    return currents;
  }

  private static double matched(double upperNm, double lowerNm) {
    double[] currents = currents(upperNm, lowerNm);
    return Math.min(currents[0], currents[1]);
  }

  private static Neighbourhood around(Model model, Aim aim) {
    List<Parameter> parameters =
        List.of(
            Parameter.of("upper.thicknessNm", model.stack()).orElseThrow(),
            Parameter.of("lower.thicknessNm", model.stack()).orElseThrow());
    List<Variable> variables =
        List.of(
            new Variable("upper.thicknessNm", "nm", 100, 500, 0, UPPER),
            new Variable("lower.thicknessNm", "nm", 500, 1300, 0, LOWER));
    return new Neighbourhood(model, parameters, variables, new double[] {UPPER, LOWER}, aim, null);
  }

  private static Aim matchedCurrent(Model model) {
    return GaugeAim.of(
        Quantity.MATCHED_CURRENT, "matched-current", List.of(), List.of(), false, model, null);
  }

  @Test
  void sensitivitiesAreDifferencesOfTheClosedForm() {
    try (Model model = Cells.model(Cells.twoCells(UPPER, LOWER), new BeerLambertSolver());
        Neighbourhood around = around(model, matchedCurrent(model))) {
      List<Sensitivity> all = around.sensitivities();
      assertThat(all)
          .extracting(Sensitivity::key)
          .containsExactlyInAnyOrder("upper.thicknessNm", "lower.thicknessNm");
      for (Sensitivity found : all) {
        boolean upper = found.key().startsWith("upper");
        double here = matched(UPPER, LOWER);
        double[] before = currents(UPPER, LOWER);
        double[] after = upper ? currents(UPPER + 1, LOWER) : currents(UPPER, LOWER + 1);
        assertThat(found.change()).isEqualTo(1);
        assertThat(found.aimChange()).isCloseTo(Math.min(after[0], after[1]) - here, within(1e-9));
        assertThat(found.aimChangeDown())
            .isCloseTo(
                (upper ? matched(UPPER - 1, LOWER) : matched(UPPER, LOWER - 1)) - here,
                within(1e-9));
        assertThat(found.subcellMaPerCm2().get("top"))
            .isCloseTo(after[0] - before[0], within(1e-9));
        assertThat(found.subcellMaPerCm2().get("bottom"))
            .isCloseTo(after[1] - before[1], within(1e-9));
        double worse =
            upper
                ? Math.min(matched(1.05 * UPPER, LOWER), matched(0.95 * UPPER, LOWER))
                : Math.min(matched(UPPER, 1.05 * LOWER), matched(UPPER, 0.95 * LOWER));
        assertThat(found.toleranceAimChange()).isCloseTo(worse - here, within(1e-9));
      }
      assertThat(all.get(0).toleranceAimChange())
          .isLessThanOrEqualTo(all.get(1).toleranceAimChange());
    }
  }

  @Test
  void whatIfCurvesFollowTheClosedFormFromBoundToBound() {
    try (Model model = Cells.model(Cells.twoCells(UPPER, LOWER), new BeerLambertSolver());
        Neighbourhood around = around(model, matchedCurrent(model))) {
      WhatIf upper = around.curves().get(0);
      assertThat(upper.value()).startsWith(100.0).endsWith(500.0).isSorted();
      for (int i = 0; i < upper.value().size(); i++) {
        double[] wanted = currents(upper.value().get(i), LOWER);
        assertThat(upper.aim().get(i)).isCloseTo(Math.min(wanted[0], wanted[1]), within(1e-9));
        assertThat(upper.subcellMaPerCm2().get("top").get(i)).isCloseTo(wanted[0], within(1e-9));
        assertThat(upper.subcellMaPerCm2().get("bottom").get(i)).isCloseTo(wanted[1], within(1e-9));
      }
    }
  }
}
