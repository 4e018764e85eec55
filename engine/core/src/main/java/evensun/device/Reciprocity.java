package evensun.device;

import evensun.light.Constants;
import evensun.scenario.Saturation;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.stat.regression.SimpleRegression;

/**
 * Saturation currents from a subcell's own absorptance: J₀ = q ∫ A φ_bb dE (U. Rau, Phys. Rev. B
 * 76, 085303 (2007)).
 *
 * <p>The integrand lies around and below the bandgap, where a table of optical constants is least
 * sure: a floor of the extinction coefficient far below the gap costs tenths of a volt. It is
 * therefore used only if the grid reaches 0.25 eV below the gap and the absorptance falls there
 * faster than the black body rises, that is with an Urbach energy below kT.
 */
final class Reciprocity {

  /** The grid must reach this far below the bandgap, in eV. */
  static final double REACH_EV = 0.25;

  /** The slope of the absorptance is measured from {@link #REACH_EV} to this below the gap. */
  private static final double TAIL_TOP_EV = 0.05;

  private static final double NOTHING = 1e-14;

  private Reciprocity() {}

  /** Which pairing a device has: reciprocity where it is wanted and holds for all subcells. */
  static PairingChoice choose(
      DeviceOptics optics, List<SubcellParameters> subcells, DeviceParameters device) {
    boolean asked = device.saturation() == Saturation.RECIPROCITY;
    if (device.saturation() == Saturation.STEP_EDGE || !(optics.hasSpectra() || asked)) {
      return new PairingChoice(false, List.of());
    }
    List<Finding> refusals = new ArrayList<>();
    for (int s = 0; s < subcells.size(); s++) {
      SubcellParameters subcell = subcells.get(s);
      refusal(optics, s, subcell.bandgapEv(), device.temperatureK())
          .ifPresent(reason -> refusals.add(finding(subcell.name(), reason, device)));
    }
    return new PairingChoice(refusals.isEmpty(), refusals);
  }

  /** The pairing of a design, as it was chosen for this or for all designs of a run. */
  static Pairing pairing(
      PairingChoice choice,
      DeviceOptics optics,
      List<SubcellParameters> subcells,
      DeviceParameters device) {
    double temperatureK = device.temperatureK();
    List<Double> currents = new ArrayList<>();
    for (int s = 0; s < subcells.size(); s++) {
      currents.add(
          choice.reciprocal()
              ? saturationMaPerCm2(optics, s, temperatureK)
              : BlackBody.aboveMaPerCm2(subcells.get(s).bandgapEv(), temperatureK));
    }
    String name = choice.reciprocal() ? Pairing.RECIPROCITY : Pairing.STEP_EDGE;
    return new Pairing(name, choice.reciprocal(), currents, choice.findings());
  }

  private static Finding finding(String subcell, String reason, DeviceParameters device) {
    boolean asked = device.saturation() == Saturation.RECIPROCITY;
    return new Finding(
        "reciprocity-refused",
        asked ? Severity.WARNING : Severity.NOTE,
        subcell,
        "the saturation current is that of a step edge, not of the subcell's own absorptance: "
            + reason);
  }

  /**
   * Emission of a subcell over the grid.
   *
   * @param optics with spectra
   * @param s index of the subcell
   * @param temperatureK in K
   * @return mA cm⁻²; what lies outside the grid is missing
   */
  static double saturationMaPerCm2(DeviceOptics optics, int s, double temperatureK) {
    double[] emitted = Emission.binsMaPerCm2(optics.wavelengthsNm(), temperatureK);
    double sum = 0;
    for (int w = 0; w < emitted.length; w++) {
      sum += optics.absorptance(s, w) * emitted[w];
    }
    return sum;
  }

  /** Why the saturation current cannot be taken from the absorptance, or empty when it can. */
  static Optional<String> refusal(
      DeviceOptics optics, int s, double bandgapEv, double temperatureK) {
    if (!optics.hasSpectra()) {
      return Optional.of("no spectra are at hand");
    }
    double lastEv = Constants.HC_EV_NM / optics.wavelengthNm(optics.wavelengthCount() - 1);
    if (lastEv > bandgapEv - REACH_EV + 1e-9) {
      return Optional.of(
          "the grid ends %.2f eV below its bandgap and must reach %.2f eV below it, to %.0f nm"
              .formatted(
                  Math.max(0, bandgapEv - lastEv),
                  REACH_EV,
                  Math.ceil(Constants.HC_EV_NM / (bandgapEv - REACH_EV))));
    }
    double urbachEv = urbachEv(optics, s, bandgapEv);
    double kT = BlackBody.thermalVoltageV(temperatureK);
    return urbachEv < kT
        ? Optional.empty()
        : Optional.of(
            "below the bandgap its absorptance falls with an Urbach energy of "
                + (urbachEv < 1 ? "%.0f meV".formatted(1000 * urbachEv) : "more than 1 eV")
                + ", which must be less than kT = %.1f meV".formatted(1000 * kT));
  }

  /** Energy over which the absorptance falls e-fold below the gap; 0 where there is none left. */
  private static double urbachEv(DeviceOptics optics, int s, double bandgapEv) {
    SimpleRegression line = new SimpleRegression();
    int points = 0;
    for (int w = 0; w < optics.wavelengthCount(); w++) {
      double below = bandgapEv - Constants.HC_EV_NM / optics.wavelengthNm(w);
      double absorptance = optics.absorptance(s, w);
      boolean inside = below >= TAIL_TOP_EV && below <= REACH_EV;
      points += inside ? 1 : 0;
      if (inside && absorptance > NOTHING) {
        line.addData(-below, Math.log(absorptance));
      }
    }
    if (line.getN() < 3) {
      return points < 3 ? Double.POSITIVE_INFINITY : 0;
    }
    double slope = line.getSlope();
    return slope > 0 ? 1 / slope : Double.POSITIVE_INFINITY;
  }
}
