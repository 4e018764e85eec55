package evensun.measured;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.data.TableFormatException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeasuredReaderTest {

  /** One curve, 0.1 at 400 nm and 0.5 at 1000 nm, as different instruments write it. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "400,0.1\\n1000,0.5 | fraction against wavelength in nm",
        "wavelength_nm,eqe\\n400,0.1\\n1000,0.5 | fraction against wavelength in nm",
        "400;10,0\\n1000;50,0 | percent against wavelength in nm",
        "nm\\tR %\\n1000\\t50\\n400\\t10 | percent against wavelength in nm",
        "wavelength_um,r\\n0.4,0.1\\n1.0,0.5 | fraction against wavelength in µm",
        "0.4,10\\n1.0,50 | percent against wavelength in µm",
        "energy_ev,percent\\n1.239841984,50\\n3.09960496,10 | percent against photon energy in eV",
        "1.239841984,0.5\\n3.09960496,0.1 | fraction against photon energy in eV",
      })
  void unitsAreFoundAndSaid(String text, String readAs) {
    MeasuredCurve curve = MeasuredReader.read(text.replace("\\n", "\n").replace("\\t", "\t"));
    assertThat(curve.readAs()).isEqualTo(readAs);
    // hc/q = 1239.841984 eV nm (CODATA 2019); the energies in the files are rounded to its digits.
    assertThat(curve.fromNm()).isCloseTo(400, within(1e-6));
    assertThat(curve.toNm()).isCloseTo(1000, within(1e-6));
    assertThat(curve.at(curve.fromNm())).isCloseTo(0.1, within(1e-12));
    assertThat(curve.at(700)).isCloseTo(0.3, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "0.7,0.1\\n1.8,0.5 | cannot tell whether 0.7 to 1.8 are nm, µm or eV; write a head line, such as wavelength_nm,reflectance_percent",
        "400,0.1 | a curve needs at least two points but has one",
        "400,0.1\\n500,-0.2 | a measured value must be between 0 and 1 but was -0.2",
        "400,10\\n500,120 | a measured value must be between 0 and 100 % but was 120.0",
        "400,0.1\\n400,0.2 | 400.000 nm is measured twice; keep one",
      })
  void whatIsNoCurveIsSaid(String text, String message) {
    assertThatThrownBy(() -> MeasuredReader.read(text.replace("\\n", "\n")))
        .isInstanceOf(TableFormatException.class)
        .hasMessage(message);
  }

  @Test
  void theComparisonWeighsWithThePhotonsOfTheOverlap() {
    MeasuredCurve curve = MeasuredReader.read("400,0.5\n600,0.7");
    double[] grid = {300, 400, 500, 600, 700};
    double[] photons = {1, 2, 3, 4, 5};
    double[] predicted = {0.9, 0.5, 0.5, 0.9, 0.9};
    Comparison comparison = Comparison.of(curve, grid, photons, predicted);
    // By hand: differences 0, 0.1, -0.2 at 400, 500, 600 nm.
    assertThat(comparison.points()).isEqualTo(3);
    assertThat(comparison.rmsDifference()).isCloseTo(Math.sqrt(0.05 / 3), within(1e-12));
    assertThat(comparison.measuredMaPerCm2()).isCloseTo(0.5 * 2 + 0.6 * 3 + 0.7 * 4, within(1e-12));
    assertThat(comparison.predictedMaPerCm2())
        .isCloseTo(0.5 * 2 + 0.5 * 3 + 0.9 * 4, within(1e-12));
  }

  @Test
  void aMeasurementBesideTheGridIsRefused() {
    MeasuredCurve curve = MeasuredReader.read("400,0.5\n600,0.7");
    assertThatThrownBy(
            () -> Comparison.of(curve, new double[] {700}, new double[] {1}, new double[] {1}))
        .hasMessage("the measurement covers no wavelength of the grid");
  }
}
