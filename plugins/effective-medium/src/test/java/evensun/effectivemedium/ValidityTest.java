package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.spi.Design;
import evensun.spi.Finding;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import evensun.spi.PreparedSolver;
import evensun.spi.Profile;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class ValidityTest {

  private static List<String> codes(Stacks stack) {
    return stack.prepare().examine(stack.design()).stream().map(Finding::code).toList();
  }

  private static Stacks mixture(
      MixingRule rule, double n, double k, double fraction, OptionalDouble sizeNm) {
    Stacks stack = Stacks.on(1.5, 0);
    int inclusion = stack.material(n, k);
    int host = rule == MixingRule.MAXWELL_GARNETT ? 1 : -1;
    Mixture mixture =
        new Mixture(
            rule,
            List.of(
                Mixture.Component.fixed("inclusion", inclusion, fraction),
                Mixture.Component.fixed("rest", 1, 1 - fraction)),
            host,
            Mixture.SPHERE,
            sizeNm);
    return stack.layer("mixed", 1, 0, 100, mixture);
  }

  @Test
  void aSizeUnknownIsNoted() {
    assertThat(codes(mixture(MixingRule.BRUGGEMAN, 2, 0, 0.3, OptionalDouble.empty())))
        .containsExactly("mixture-size-unknown");
  }

  @Test
  void aSizeAboveATenthOfTheWavelengthIsSaid() {
    // By hand: at 400 nm and an index near 1.6 a tenth of the wavelength is 25 nm.
    OptionalDouble small = OptionalDouble.of(20);
    OptionalDouble large = OptionalDouble.of(30);
    assertThat(codes(mixture(MixingRule.BRUGGEMAN, 2, 0, 0.2, small))).isEmpty();
    assertThat(codes(mixture(MixingRule.BRUGGEMAN, 2, 0, 0.2, large)))
        .containsExactly("mixture-size");
  }

  @Test
  void aMetalNearPercolationIsSaid() {
    OptionalDouble small = OptionalDouble.of(5);
    assertThat(codes(mixture(MixingRule.BRUGGEMAN, 0.2, 3, 0.3, small)))
        .containsExactly("mixture-percolation");
    assertThat(codes(mixture(MixingRule.BRUGGEMAN, 0.2, 3, 0.1, small))).isEmpty();
  }

  @Test
  void aRuleOutsideItsRangeIsSaid() {
    OptionalDouble small = OptionalDouble.of(5);
    assertThat(codes(mixture(MixingRule.MAXWELL_GARNETT, 2, 0, 0.5, small)))
        .containsExactly("mixture-rule");
    assertThat(codes(mixture(MixingRule.MAXWELL_GARNETT, 2, 0, 0.1, small))).isEmpty();
    assertThat(codes(mixture(MixingRule.LOOYENGA, 4, 0, 0.5, small)))
        .containsExactly("mixture-rule");
    assertThat(codes(mixture(MixingRule.LOOYENGA, 2, 0, 0.5, small))).isEmpty();
    assertThat(codes(mixture(MixingRule.LORENTZ_LORENZ, 0.2, 3, 0.5, small)))
        .containsExactly("mixture-rule");
  }

  @Test
  void aGradedLayerFarFromItsDrawingIsSaid() {
    Stacks stack = Stacks.on(1.6, 0);
    stack.layer("graded", 1, 0, 40, grading());
    PreparedSolver prepared = stack.prepare();
    Design grown = stack.design();
    grown.thicknessNm[0] = 20_000;
    assertThat(prepared.examine(stack.design())).isEmpty();
    assertThat(prepared.examine(grown)).extracting(Finding::code).containsExactly("grading-coarse");
  }

  private static Grading grading() {
    return new Grading(
        new Grading.End("air", 0),
        new Grading.End("dense", 1),
        new Profile.Linear(),
        MixingRule.REFRACTIVE_INDEX,
        Grading.DEFAULT_TOLERANCE,
        OptionalDouble.empty());
  }

  @Test
  void featuresThatDoNotGoTogetherAreRefused() {
    Stacks both = Stacks.on(4, 0).layer("layer", 1, 0, 40, grading(), Stacks.porous(1, 0.3));
    assertThatThrownBy(both::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining("layer \"layer\": a layer takes one mixture or grading");
    Stacks thick = Stacks.on(4, 0).layer("layer", false, 1, 0, 40, grading());
    assertThatThrownBy(thick::prepare).hasMessageContaining("a graded layer must be coherent");
  }
}
