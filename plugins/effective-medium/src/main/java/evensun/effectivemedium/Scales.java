package evensun.effectivemedium;

import evensun.spi.Problem;
import java.util.function.IntToDoubleFunction;

/** Lengths against the wavelength in a medium, with the thresholds of common practice. */
final class Scales {

  /** Far below the wavelength: an effective medium describes it (common practice). */
  static final double FINE = 0.1;

  /** Far above the wavelength: scalar scattering describes it (common practice). */
  static final double COARSE = 1;

  /** Where neither holds the nearer model is taken: the geometric mean of both limits. */
  static final double MIDDLE = Math.sqrt(FINE * COARSE);

  private Scales() {}

  /** Index of the wavelength nearest to the mean of the incident photons. */
  static int meanWavelength(Problem problem) {
    double photons = 0;
    double moment = 0;
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      photons += problem.incidentMaPerCm2().at(w);
      moment += problem.incidentMaPerCm2().at(w) * problem.wavelengthNm().at(w);
    }
    double mean = photons > 0 ? moment / photons : middleNm(problem);
    int nearest = 0;
    for (int w = 1; w < problem.wavelengthCount(); w++) {
      double distance = Math.abs(problem.wavelengthNm().at(w) - mean);
      if (distance < Math.abs(problem.wavelengthNm().at(nearest) - mean)) {
        nearest = w;
      }
    }
    return nearest;
  }

  private static double middleNm(Problem problem) {
    int last = problem.wavelengthCount() - 1;
    return 0.5 * (problem.wavelengthNm().at(0) + problem.wavelengthNm().at(last));
  }

  /** Length over the wavelength in a medium of index n. */
  static double ratio(Problem problem, int w, double lengthNm, double n) {
    return lengthNm * n / problem.wavelengthNm().at(w);
  }

  /** Mean over the incident photons of a number per wavelength; the plain mean without light. */
  static double photonMean(Problem problem, IntToDoubleFunction value) {
    double photons = 0;
    double sum = 0;
    double plain = 0;
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      double x = value.applyAsDouble(w);
      photons += problem.incidentMaPerCm2().at(w);
      sum += problem.incidentMaPerCm2().at(w) * x;
      plain += x;
    }
    return photons > 0 ? sum / photons : plain / problem.wavelengthCount();
  }
}
