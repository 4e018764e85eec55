package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A measured curve beside what the model says of the stack as drawn.
 *
 * @param subcell the subcell whose external quantum efficiency was measured; null for the
 *     reflectance of the device
 * @param path file it came from
 * @param readAs how the file was understood
 * @param wavelengthNm wavelengths of the measurement in nm
 * @param measured measured fraction
 * @param comparedFromNm first compared wavelength in nm
 * @param comparedToNm last compared wavelength in nm
 * @param rmsDifference root of the mean squared difference on the grid
 * @param measuredMaPerCm2 photon current of the measurement in mA cm⁻² over the compared range;
 *     null for a single wavelength
 * @param predictedMaPerCm2 photon current of the model in mA cm⁻² over the same range; null for a
 *     single wavelength
 */
public record Measured(
    @Nullable String subcell,
    String path,
    String readAs,
    List<Double> wavelengthNm,
    List<Double> measured,
    double comparedFromNm,
    double comparedToNm,
    double rmsDifference,
    @Nullable Double measuredMaPerCm2,
    @Nullable Double predictedMaPerCm2) {

  public Measured {
    wavelengthNm = List.copyOf(wavelengthNm);
    measured = List.copyOf(measured);
  }
}
