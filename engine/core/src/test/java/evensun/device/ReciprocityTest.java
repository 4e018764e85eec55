package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.Connection;
import evensun.scenario.Saturation;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;

class ReciprocityTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");

  private static DeviceOptics optics(WavelengthGrid grid, DoubleUnaryOperator absorptanceOfEv) {
    double[] bins = GLOBAL.binsMaPerCm2(grid);
    double[] absorbed =
        Arrays.stream(grid.wavelengthNm())
            .map(nm -> absorptanceOfEv.applyAsDouble(Constants.HC_EV_NM / nm))
            .toArray();
    return optics(grid, bins, absorbed);
  }

  private static DeviceOptics optics(WavelengthGrid grid, double[] bins, double[] absorbed) {
    double current = 0;
    for (int w = 0; w < bins.length; w++) {
      current += bins[w] * absorbed[w];
    }
    double[] rest = Arrays.stream(absorbed).map(a -> 1 - a).toArray();
    Spectral spectral =
        new Spectral(
            boxed(grid.wavelengthNm()),
            boxed(bins),
            boxed(rest),
            boxed(new double[bins.length]),
            Map.of("absorber", boxed(absorbed)));
    return DeviceOptics.of(
        spectral,
        List.of(new SubcellOutcome("only", List.of("absorber"), null, current, null, null)));
  }

  private static List<Double> boxed(double[] values) {
    return Arrays.stream(values).boxed().toList();
  }

  private static DeviceAnalysis analyse(DeviceOptics optics, double gap, Saturation saturation) {
    return DeviceModel.of(
            List.of(SubcellParameters.ideal("only", gap)),
            DeviceParameters.of(Connection.SERIES).withSaturation(saturation),
            GLOBAL)
        .analyse(optics);
  }

  /** Witness: the closed form of a step edge, which a steep edge on a fine grid approaches. */
  @Test
  void aSteepEdgeEmitsLikeAStep() {
    DeviceOptics optics =
        optics(
            WavelengthGrid.of(300, 1400, 0.5), ev -> ev >= 1.2 ? 1 : Math.exp((ev - 1.2) / 0.0005));
    var found = analyse(optics, 1.2, Saturation.AUTOMATIC);
    assertThat(found.electrical().pairing()).isEqualTo(Pairing.RECIPROCITY);
    assertThat(found.electrical().subcells().get(0).saturationMaPerCm2())
        .isCloseTo(
            BlackBody.aboveMaPerCm2(1.2, 298.15),
            within(0.04 * BlackBody.aboveMaPerCm2(1.2, 298.15)));
  }

  /**
   * Witness: ∫ E² exp((E − E_g)/E_u − E/kT) dE below the gap over ∫ E² exp(−E/kT) dE above it, both
   * in closed form, with s = 1/E_u − 1/kT.
   */
  @Test
  void anUrbachTailAddsItsEmission() {
    double urbach = 0.015;
    DeviceOptics optics =
        optics(
            WavelengthGrid.of(300, 1400, 0.5), ev -> ev >= 1.2 ? 1 : Math.exp((ev - 1.2) / urbach));
    double found =
        analyse(optics, 1.2, Saturation.AUTOMATIC)
            .electrical()
            .subcells()
            .get(0)
            .saturationMaPerCm2();
    double kT = BlackBody.thermalVoltageV(298.15);
    double s = 1 / urbach - 1 / kT;
    double below = 1.44 / s - 2.4 / (s * s) + 2 / (s * s * s);
    double above = kT * (1.44 + 2.4 * kT + 2 * kT * kT);
    double expected = 1 + below / above;
    assertThat(found / BlackBody.aboveMaPerCm2(1.2, 298.15)).isCloseTo(expected, within(0.005));
  }

  @Test
  void aShortGridIsRefusedWithTheWavelengthItNeeds() {
    DeviceOptics optics = optics(WavelengthGrid.of(300, 1200, 5), ev -> ev >= 1.12 ? 1 : 1e-20);
    var found = analyse(optics, 1.12, Saturation.RECIPROCITY);
    assertThat(found.electrical().pairing()).isEqualTo(Pairing.STEP_EDGE);
    assertThat(found.findings())
        .filteredOn(f -> f.code().equals("reciprocity-refused"))
        .singleElement()
        .satisfies(f -> assertThat(f.severity()).isEqualTo(Severity.WARNING))
        .extracting(Finding::message)
        .asString()
        .contains("ends 0.09 eV below its bandgap", "to 1426 nm");
  }

  /** Witness: the rule that a floor of the extinction coefficient must not count as emission. */
  @Test
  void aFloorBelowTheGapIsRefused() {
    DeviceOptics optics =
        optics(
            WavelengthGrid.of(300, 1400, 5),
            ev -> ev >= 1.2 ? 1 : Math.max(2e-3, Math.exp((ev - 1.2) / 0.01)));
    var found = analyse(optics, 1.2, Saturation.AUTOMATIC);
    assertThat(found.electrical().pairing()).isEqualTo(Pairing.STEP_EDGE);
    assertThat(found.findings())
        .extracting(Finding::message)
        .anyMatch(m -> m.contains("must be less than kT = 25.7 meV"));
  }

  /**
   * Witness: a Lambertian wafer of 180 µm absorbs 44.08 mA cm⁻² on 300–1200 nm, and its reciprocal
   * saturation current is 5.3 times that of a step at 1.12 eV (computed from M. A. Green, Sol.
   * Energy Mater. Sol. Cells 92, 1305 (2008)).
   */
  @Test
  void aLambertianWaferEmitsMoreThanAStep() {
    WavelengthGrid grid = WavelengthGrid.of(300, 1445, 1);
    double[] absorbed = lambertian(grid, 180e-4);
    double[] bins = GLOBAL.binsMaPerCm2(grid);
    double current = 0;
    for (int w = 0; w <= 900; w++) {
      current += bins[w] * absorbed[w];
    }
    assertThat(current).isCloseTo(44.08, within(0.05));
    DeviceOptics optics = optics(grid, bins, absorbed);
    double emitted = Reciprocity.saturationMaPerCm2(optics, 0, 298.15);
    assertThat(emitted / BlackBody.aboveMaPerCm2(1.12, 298.15)).isCloseTo(5.3, within(0.1));
    var step = analyse(optics, 1.12, Saturation.STEP_EDGE);
    assertThat(step.findings()).extracting(Finding::code).contains("voc-above-radiative-limit");
    var reciprocal = analyse(optics, 1.12, Saturation.AUTOMATIC);
    assertThat(reciprocal.electrical().pairing()).isEqualTo(Pairing.RECIPROCITY);
    assertThat(reciprocal.findings())
        .extracting(Finding::code)
        .doesNotContain("voc-above-radiative-limit");
  }

  /** A = (1 − T²)/(1 − T²(1 − 1/n²)), T = 2E₃(αW). */
  private static double[] lambertian(WavelengthGrid grid, double widthCm) {
    double[] nm = grid.wavelengthNm();
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    Material silicon = MaterialLibrary.builtIn().find("crystalline-silicon").orElseThrow();
    silicon.on(nm).fill(1.12, n, k);
    double[] absorbed = new double[nm.length];
    for (int w = 0; w < nm.length; w++) {
      double depth = 4 * Math.PI * k[w] / (nm[w] * 1e-7) * widthCm;
      double passed = Math.pow(twiceE3(depth), 2);
      absorbed[w] = (1 - passed) / (1 - passed * (1 - 1 / (n[w] * n[w])));
    }
    return absorbed;
  }

  /** 2E₃(x) = 2 ∫₀¹ µ exp(−x/µ) dµ. */
  private static double twiceE3(double x) {
    return x > 600
        ? 0
        : new IterativeLegendreGaussIntegrator(24, 1e-9, 1e-13)
            .integrate(1_000_000, mu -> 2 * mu * Math.exp(-x / mu), 1e-12, 1);
  }
}
