package evensun.light;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SpectraTest {

  // ASTM G173-03, trapezoid integrals of its own points from 280 to 4000 nm.
  @ParameterizedTest
  @CsvSource({"AM1.5G, 1000.37", "AM1.5D, 900.14", "AM0, 1347.93"})
  void carriesTheIrradianceOfTheStandard(String name, double totalWPerM2) {
    Spectrum spectrum = Spectra.named(name);
    assertThat(spectrum.totalWPerM2()).isCloseTo(totalWPerM2, within(0.006));
    assertThat(spectrum.fromNm()).isEqualTo(280);
    assertThat(spectrum.toNm()).isEqualTo(4000);
  }

  // Computed from the G173 table (global tilt): photon current above a step at the gap.
  @ParameterizedTest
  @CsvSource({"1.12, 43.811", "1.34, 35.032", "1.424, 31.886", "1.70, 22.455"})
  void carriesThePhotonCurrentAboveAGap(double gapEv, double maPerCm2) {
    double edgeNm = Constants.HC_EV_NM / gapEv;
    assertThat(Spectra.named("AM1.5G").photonCurrentMaPerCm2(280, edgeNm))
        .isCloseTo(maPerCm2, within(1.5e-3));
  }

  // Computed from the G173 table (global tilt): 300 to 1200 nm.
  @Test
  void carriesThePhotonCurrentOfTheUsualGridWhateverItsStep() {
    for (double stepNm : new double[] {1, 5, 10, 100}) {
      double sum = 0;
      for (double bin :
          Spectra.named("AM1.5G").binsMaPerCm2(WavelengthGrid.of(300, 1200, stepNm))) {
        sum += bin;
      }
      assertThat(sum).isCloseTo(46.456, within(1e-3));
    }
  }

  @Test
  void namesTheKnownSpectraWhenAskedForAnother() {
    assertThatThrownBy(() -> Spectra.named("AM1.5"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("spectrum must be one of AM1.5G, AM1.5D, AM0 but was AM1.5");
  }
}
