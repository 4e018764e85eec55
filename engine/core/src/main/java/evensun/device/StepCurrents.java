package evensun.device;

import evensun.light.Constants;
import evensun.light.Spectrum;

/** Photocurrents of absorbers that take all light above their bandgap and none below. */
public final class StepCurrents {

  private StepCurrents() {}

  /**
   * Photocurrents of a pile of step absorbers.
   *
   * @param spectrum the light
   * @param bandgapEv [subcell] in eV, the light meets the first one first; a gap that is not below
   *     all earlier ones receives nothing
   * @return [subcell] mA cm⁻²
   */
  public static double[] maPerCm2(Spectrum spectrum, double... bandgapEv) {
    double[] edges = edgesNm(spectrum, bandgapEv);
    double[] currents = new double[bandgapEv.length];
    for (int s = 0; s < currents.length; s++) {
      currents[s] = spectrum.photonCurrentMaPerCm2(edges[s], edges[s + 1]);
    }
    return currents;
  }

  /** [subcell + 1] where the band of each subcell begins and ends, in nm; never falling. */
  static double[] edgesNm(Spectrum spectrum, double[] bandgapEv) {
    double[] edges = new double[bandgapEv.length + 1];
    edges[0] = spectrum.fromNm();
    for (int s = 0; s < bandgapEv.length; s++) {
      edges[s + 1] = Math.max(edges[s], Constants.HC_EV_NM / bandgapEv[s]);
    }
    return edges;
  }
}
