package evensun.light;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.data.DataFile;
import evensun.data.TableFormatException;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ModelledLightTest {

  // Stefan and Boltzmann: σT⁴ with σ = 5.670374419e-8 W m⁻² K⁻⁴ (CODATA).
  @ParameterizedTest
  @ValueSource(doubles = {300, 3000, 5772})
  void aBlackBodyRadiatesAsStefanAndBoltzmannHaveIt(double temperatureK) {
    double expected = 5.670374419e-8 * Math.pow(temperatureK, 4);
    assertThat(Blackbody.at(temperatureK).totalWPerM2())
        .isCloseTo(expected, within(2e-4 * expected));
  }

  // Wien: the peak lies at 2.897771955e-3 m K over the temperature (CODATA).
  @Test
  void aBlackBodyPeaksWhereWienHasIt() {
    double peakNm = 2.897771955e6 / 5772;
    double peak = Blackbody.exitanceWPerM2PerNm(peakNm, 5772);
    assertThat(peak).isGreaterThan(Blackbody.exitanceWPerM2PerNm(peakNm * 1.002, 5772));
    assertThat(peak).isGreaterThan(Blackbody.exitanceWPerM2PerNm(peakNm * 0.998, 5772));
  }

  // Solar constant 1361 W m⁻² (Kopp and Lean, Geophys. Res. Lett. 38, L01706 (2011)).
  @Test
  void theSunAsABlackBodyGivesTheSolarConstant() {
    assertThat(Blackbody.at(5772).totalWPerM2() * Blackbody.SUN_DILUTION)
        .isCloseTo(1361, within(1.5));
  }

  // Bird and Riordan, table 1: the extraterrestrial line, unchanged outside the atmosphere.
  @Test
  void outsideTheAtmosphereTheTableIsMetExactly() {
    Spectrum outside = ClearSky.of(SkyConditions.REFERENCE.withAirMass(0));
    double[] table = DataFile.resource(ClearSky.class, "bird-riordan.csv").column(1);
    assertThat(outside.irradianceWPerM2PerNm()).containsExactly(table);
    assertThat(outside.wavelengthNm()).hasSize(122);
  }

  // Against ASTM G173-03 (global, 37°) under the conditions it was computed for. The model is older
  // than the standard; by an independent calculation (the published formulas written once more in
  // another language) it deviates from the standard's photon currents by 3.9, -0.1 and 2.1 %.
  @ParameterizedTest
  @CsvSource({"300, 700, 0.0391", "700, 1100, -0.0006", "1100, 1800, 0.0207"})
  void comesNearTheReferenceSpectrumOnThreeBands(double fromNm, double toNm, double deviation) {
    double model = ClearSky.of(SkyConditions.REFERENCE).photonCurrentMaPerCm2(fromNm, toNm);
    double standard = Spectra.named("AM1.5G").photonCurrentMaPerCm2(fromNm, toNm);
    assertThat(model / standard - 1).isCloseTo(deviation, within(5e-4));
  }

  // Laws: more of anything in the air lets less direct light through; the zenith is air mass 1.
  @Test
  void moreAirWaterAndDustTakeLight() {
    double clear = ClearSky.of(SkyConditions.REFERENCE.withAirMass(1)).totalWPerM2();
    assertThat(ClearSky.of(SkyConditions.REFERENCE.withAirMass(3)).totalWPerM2()).isLessThan(clear);
    SkyConditions dusty = new SkyConditions(1, 0.34, 1.42, 0.5, 1013.25, 0.2, 37);
    assertThat(ClearSky.of(dusty).totalWPerM2()).isLessThan(clear);
    assertThat(SkyConditions.airMass(0)).isCloseTo(1, within(1e-3));
    assertThat(SkyConditions.airMass(SkyConditions.zenithDeg(1.5))).isCloseTo(1.5, within(1e-9));
  }

  // By hand: 1 W m⁻² nm⁻¹ at 500 nm is 2.517e18 photons m⁻² s⁻¹ nm⁻¹.
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "wavelength_nm,irradiance_W_per_m2_nm | 1",
        "wavelength (nm),W m-2 nm-1 | 1",
        "wavelength (nm),W/m2/um | 1000",
        "wavelength_nm,photon flux (m-2 s-1 nm-1) | 2.51700e18",
        "wavelength_nm,photon flux (cm-2 s-1 nm-1) | 2.51700e14"
      })
  void readsASpectrumInEveryUnit(String header, String value) {
    Spectrum spectrum =
        SpectrumReader.read(
            "mine", header.strip() + "\n500," + value + "\n501," + value + "\n", Optional.empty());
    assertThat(spectrum.irradianceWPerM2PerNm()[0]).isCloseTo(1, within(1e-4));
  }

  @Test
  void refusesASpectrumWithoutAUnit() {
    assertThatThrownBy(() -> SpectrumReader.read("mine", "500,1\n501,1\n", Optional.empty()))
        .isInstanceOf(TableFormatException.class)
        .hasMessageContaining("does not say what its second column is");
  }

  @Test
  void scalingScalesPowerAndPhotons() {
    Spectrum sun = Spectra.named("AM1.5D");
    Spectrum tenfold = sun.times(10, "concentrated 10 times");
    assertThat(tenfold.totalWPerM2()).isCloseTo(9001.4, within(0.1));
    assertThat(tenfold.name()).isEqualTo("AM1.5D, concentrated 10 times");
  }
}
