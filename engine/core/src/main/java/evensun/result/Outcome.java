package evensun.result;

import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * One evaluated design: currents, losses, spectra.
 *
 * @param incidentMaPerCm2 available photon current of the grid in mA cm⁻²; null for a single
 *     wavelength
 * @param subcells in the order the light meets them
 * @param matchedCurrentMaPerCm2 smallest subcell current of a series device, else null
 * @param mismatchMaPerCm2 largest minus smallest subcell current of a series device, else null
 * @param limitingSubcell name of the weakest subcell of a series device that is not balanced, else
 *     null
 * @param losses light that no subcell absorbs; null for a single wavelength
 * @param design value of every varied quantity by its key; empty for an assessment
 * @param stack every layer with the values of this design, incident medium first, exit last
 * @param spectral spectra on the grid
 * @param quantities further numbers the solver reports
 * @param electrical the electrical side, when it was asked for
 */
public record Outcome(
    @Nullable Double incidentMaPerCm2,
    List<SubcellOutcome> subcells,
    @Nullable Double matchedCurrentMaPerCm2,
    @Nullable Double mismatchMaPerCm2,
    @Nullable String limitingSubcell,
    @Nullable Losses losses,
    Map<String, Double> design,
    List<StackEntry> stack,
    Spectral spectral,
    List<QuantityRecord> quantities,
    @Nullable Electrical electrical) {

  /** Subcells whose currents differ by less than this are called balanced, in mA cm⁻². */
  public static final double BALANCED_MA_PER_CM2 = 0.05;

  /** This outcome with its electrical side and the currents after collection. */
  public Outcome withElectrical(List<SubcellOutcome> collected, Electrical device) {
    return new Outcome(
        incidentMaPerCm2,
        collected,
        matchedCurrentMaPerCm2,
        mismatchMaPerCm2,
        limitingSubcell,
        losses,
        design,
        stack,
        spectral,
        quantities,
        device);
  }

  /**
   * A subcell.
   *
   * @param name name
   * @param absorbers layers, or {@code layer/component}
   * @param bandgapEv bandgap of its (first) absorber in eV, if it has one
   * @param photocurrentMaPerCm2 absorbed light in mA cm⁻²; null for a single wavelength
   * @param standardErrorMaPerCm2 statistical error, null where there is none
   * @param collectedMaPerCm2 photocurrent after collection, null without the electrical side
   */
  public record SubcellOutcome(
      String name,
      List<String> absorbers,
      @Nullable Double bandgapEv,
      @Nullable Double photocurrentMaPerCm2,
      @Nullable Double standardErrorMaPerCm2,
      @Nullable Double collectedMaPerCm2) {

    /** This subcell when so much of its absorbed light is collected. */
    public SubcellOutcome collected(double fraction) {
      return new SubcellOutcome(
          name,
          absorbers,
          bandgapEv,
          photocurrentMaPerCm2,
          standardErrorMaPerCm2,
          photocurrentMaPerCm2 == null ? null : fraction * photocurrentMaPerCm2);
    }
  }

  /**
   * Light that no subcell absorbs. Reflected + transmitted + parasitic + subcells = incident.
   *
   * @param reflectedMaPerCm2 reflected
   * @param transmittedMaPerCm2 net flux into an exit medium that belongs to no subcell, else 0
   * @param parasitic layers, and components, that belong to no subcell, in the light's order
   */
  public record Losses(
      double reflectedMaPerCm2, double transmittedMaPerCm2, List<Parasitic> parasitic) {}

  /**
   * Light absorbed where nothing is collected.
   *
   * @param layer layer name, or {@code layer/component}
   * @param maPerCm2 absorbed, mA cm⁻²
   */
  public record Parasitic(String layer, double maPerCm2) {}

  /**
   * A layer of the stack.
   *
   * @param name name
   * @param material material name
   * @param role {@code incident}, {@code layer} or {@code exit}
   * @param thicknessNm thickness in nm; null for incident and exit medium
   * @param bandgapEv bandgap of a tunable material in eV, else null
   * @param coherent whether waves interfere inside
   * @param subcell subcell it belongs to, if any
   * @param features further properties in words
   */
  public record StackEntry(
      String name,
      String material,
      String role,
      @Nullable Double thicknessNm,
      @Nullable Double bandgapEv,
      boolean coherent,
      @Nullable String subcell,
      List<String> features) {}

  /**
   * Spectra, one value per wavelength.
   *
   * @param wavelengthNm wavelengths in nm
   * @param incidentMaPerCm2 photon current of each bin
   * @param reflectance reflectance
   * @param transmittance net transmittance into the exit medium
   * @param absorptance by layer, or {@code layer/component}, in the light's order
   */
  public record Spectral(
      List<Double> wavelengthNm,
      List<Double> incidentMaPerCm2,
      List<Double> reflectance,
      List<Double> transmittance,
      Map<String, List<Double>> absorptance) {}

  /**
   * A further number.
   *
   * @param key stable name
   * @param label as shown to people
   * @param value the number
   * @param unit as shown to people
   */
  public record QuantityRecord(String key, String label, double value, String unit) {}
}
