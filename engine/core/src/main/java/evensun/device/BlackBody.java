package evensun.device;

import evensun.light.Constants;

/**
 * Emission of a flat body at cell temperature into the half space on one side.
 *
 * <p>The photon current above an energy is 2πq/(h³c²) ∫ E²/(exp(E/kT) − 1) dE (Shockley & Queisser,
 * J. Appl. Phys. 32, 510 (1961)); 1/(eˣ − 1) is written as Σ e^(−mx), each term of which has a
 * closed integral.
 */
public final class BlackBody {

  private static final double SMALLEST_TERM = 1e-18;
  private static final int MOST_TERMS = 10_000;

  private BlackBody() {}

  /**
   * Thermal voltage kT/q.
   *
   * @param temperatureK temperature in K, greater than 0
   * @return V
   */
  public static double thermalVoltageV(double temperatureK) {
    return Constants.BOLTZMANN_J_PER_K * temperatureK / Constants.ELEMENTARY_CHARGE_C;
  }

  /**
   * Photon current above an energy: the radiative saturation current of a step absorber.
   *
   * @param energyEv photon energy in eV, greater than 0
   * @param temperatureK temperature in K, greater than 0
   * @return mA cm⁻²
   */
  public static double aboveMaPerCm2(double energyEv, double temperatureK) {
    double kT = thermalVoltageV(temperatureK);
    double x = energyEv / kT;
    double decay = Math.exp(-x);
    double power = 1;
    double sum = 0;
    for (int m = 1; m <= MOST_TERMS; m++) {
      double term = power * (x * x / m + 2 * x / ((double) m * m) + 2.0 / ((double) m * m * m));
      sum += term;
      power *= decay;
      if (term < SMALLEST_TERM * sum) {
        break;
      }
    }
    return prefactorMaPerCm2PerEv3() * kT * kT * kT * decay * sum;
  }

  /**
   * Photon current between two energies.
   *
   * @param fromEv lower energy in eV, greater than 0
   * @param toEv upper energy in eV, at least {@code fromEv}
   * @param temperatureK temperature in K, greater than 0
   * @return mA cm⁻²
   */
  public static double betweenMaPerCm2(double fromEv, double toEv, double temperatureK) {
    return aboveMaPerCm2(fromEv, temperatureK) - aboveMaPerCm2(toEv, temperatureK);
  }

  /** 2πq/(h³c²) for energies in eV and currents in mA cm⁻². */
  private static double prefactorMaPerCm2PerEv3() {
    double q = Constants.ELEMENTARY_CHARGE_C;
    double h = Constants.PLANCK_JS / q; // eV s
    double c = Constants.LIGHT_SPEED_M_PER_S;
    return 0.1 * 2 * Math.PI * q / (h * h * h * c * c);
  }
}
