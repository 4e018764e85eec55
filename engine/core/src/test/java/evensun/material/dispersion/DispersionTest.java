package evensun.material.dispersion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class DispersionTest {

  private static double[] chi(Term term, double ev) {
    double[] chi = new double[2];
    term.addTo(ev, chi);
    return chi;
  }

  static Stream<Term> oscillators() {
    return Stream.of(
        new Lorentz(2.5, 3.1, 0.4),
        new TaucLorentz(3.55, 215, 2.3, 1.68),
        new TaucLorentz(5.0, 80, 1.0, 3.2));
  }

  /**
   * Kramers–Kronig by quadrature, with the singularity subtracted: Re χ(E) = (2/π) ∫ [x Im χ(x) − E
   * Im χ(E)] / (x² − E²) dx, since P∫ dx/(x² − E²) over (0, ∞) is zero.
   */
  @ParameterizedTest
  @MethodSource("oscillators")
  void realPartIsTheKramersKronigTransformOfTheImaginaryPart(Term term) {
    IterativeLegendreGaussIntegrator gauss = new IterativeLegendreGaussIntegrator(32, 1e-10, 1e-10);
    for (double ev : new double[] {0.8, 1.6, 2.4, 3.3, 4.7}) {
      double own = ev * chi(term, ev)[1];
      double[] edges = {1e-6, 0.5, 1.0, 1.68, 2.0, 2.7, 3.2, 4.0, 5.0, 7.0, 12, 40, 200, 2000, 1e5};
      double sum = 0;
      for (int i = 0; i + 1 < edges.length; i++) {
        sum +=
            gauss.integrate(
                4_000_000,
                x -> Math.abs(x - ev) < 1e-9 ? 0 : (x * chi(term, x)[1] - own) / (x * x - ev * ev),
                edges[i],
                edges[i + 1]);
      }
      double tail = -own / edges[edges.length - 1];
      assertThat(chi(term, ev)[0])
          .as("real part at %s eV", ev)
          .isCloseTo(2 / Math.PI * (sum + tail), within(2e-4));
    }
  }

  // The formula in complex numbers, by an independent library (Commons Math).
  @ParameterizedTest
  @ValueSource(doubles = {0.5, 1.2, 2.9, 6.0})
  void lorentzAndDrudeAgreeWithTheFormulaInComplexNumbers(double ev) {
    Complex lorentz = new Complex(2 * 9.0).divide(new Complex(9.0 - ev * ev, -0.3 * ev));
    Complex drude = new Complex(-1.44).divide(new Complex(ev * ev, 0.08 * ev));
    double[] epsilon = new double[2];
    new Dispersion(1.5, List.of(new Lorentz(2, 3, 0.3), new Drude(1.2, 0.08)))
        .permittivity(ev, epsilon);
    Complex sum = lorentz.add(drude).add(1.5);
    assertThat(epsilon[0]).isCloseTo(sum.getReal(), within(1e-12));
    assertThat(epsilon[1]).isCloseTo(sum.getImaginary(), within(1e-12));
    double[] index = new double[2];
    new Dispersion(1.5, List.of(new Lorentz(2, 3, 0.3), new Drude(1.2, 0.08))).index(ev, index);
    Complex root = sum.sqrt();
    assertThat(index[0]).isCloseTo(root.getReal(), within(1e-12));
    assertThat(index[1]).isCloseTo(root.getImaginary(), within(1e-12));
  }

  // Limit of the published formula: no absorption below the Tauc gap.
  @Test
  void taucLorentzDoesNotAbsorbBelowItsGapAndIsContinuousThere() {
    TaucLorentz term = new TaucLorentz(3.55, 215, 2.3, 1.68);
    assertThat(chi(term, 1.6)[1]).isZero();
    assertThat(chi(term, 1.68)[0]).isFinite().isCloseTo(chi(term, 1.6801)[0], within(0.01));
  }

  // Forouhi and Bloomer (1986): k = A (E - Eg)^2 / (E^2 - BE + C) is zero at the gap only.
  @Test
  void forouhiBloomerAbsorbsBelowItsGap() {
    ForouhiBloomer term = new ForouhiBloomer(0.5, 3.5, 1.0, 1.7, 1.9);
    double[] index = new double[2];
    Dispersion sum = new Dispersion(1, List.of(term));
    sum.index(1.7, index);
    assertThat(index[1]).isCloseTo(0, within(1e-12));
    sum.index(1.0, index);
    assertThat(index[1]).isCloseTo(0.5 * 0.49 / (1 - 7 + 13.25), within(1e-9));
    sum.index(1e6, index);
    assertThat(index[0]).isCloseTo(1.9, within(1e-4));
  }

  // Closed form: a Cauchy glass by hand at 500 nm, 1.5 + 0.004 / 0.25 = 1.516.
  @Test
  void cauchyCountsInMicrometres() {
    double[] index = new double[2];
    new Dispersion(1, List.of(new Cauchy(1.5, 0.004, 0))).index(1239.8419843 / 500, index);
    assertThat(index[0]).isCloseTo(1.516, within(1e-7));
  }

  @Test
  void namesTheParameterThatIsOutOfRange() {
    assertThatThrownBy(() -> TermKind.named("lorentz").orElseThrow().of(1, 3, 0))
        .hasMessage("broadeningEv must be in [1.0E-4, 50.0] but was 0.0");
    assertThatThrownBy(() -> new TaucLorentz(1, 100, 2.5, 1))
        .hasMessageContaining("broadeningEv must be in");
  }
}
