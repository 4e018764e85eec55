package evensun.device;

import evensun.light.Constants;
import evensun.light.WavelengthGrid;

/** What a perfect absorber at cell temperature emits, bin by bin of a wavelength grid. */
public final class Emission {

  private Emission() {}

  /**
   * Photon current emitted in each bin; the saturation current of an absorber is its absorptance
   * times this, summed (U. Rau, Phys. Rev. B 76, 085303 (2007)).
   *
   * @param wavelengthNm [w] grid points in nm, evenly spaced, at least two
   * @param temperatureK temperature in K
   * @return [w] mA cm⁻²
   */
  public static double[] binsMaPerCm2(double[] wavelengthNm, double temperatureK) {
    int last = wavelengthNm.length - 1;
    double step = (wavelengthNm[last] - wavelengthNm[0]) / last;
    double[] edges = WavelengthGrid.of(wavelengthNm[0], wavelengthNm[last], step).edgesNm();
    double[] bins = new double[wavelengthNm.length];
    for (int w = 0; w < bins.length; w++) {
      bins[w] =
          BlackBody.betweenMaPerCm2(
              Constants.HC_EV_NM / edges[w + 1], Constants.HC_EV_NM / edges[w], temperatureK);
    }
    return bins;
  }
}
