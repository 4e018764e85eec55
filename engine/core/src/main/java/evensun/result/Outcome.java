package evensun.result;

import java.util.List;
import java.util.Map;
import java.util.Objects;
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
 * @param choices alternative of each choice of a search by its key; empty without choices
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
    @Nullable Electrical electrical,
    Map<String, String> choices) {

  /** Subcells whose currents differ by less than this are called balanced, in mA cm⁻². */
  public static final double BALANCED_MA_PER_CM2 = 0.05;

  public Outcome {
    choices = choices == null ? Map.of() : choices; // runs of earlier versions
  }

  /** An outcome without choices. */
  public Outcome(
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
    this(
        incidentMaPerCm2,
        subcells,
        matchedCurrentMaPerCm2,
        mismatchMaPerCm2,
        limitingSubcell,
        losses,
        design,
        stack,
        spectral,
        quantities,
        electrical,
        Map.of());
  }

  /**
   * Statistical error of the matched current, null where there is none: the largest of the subcells
   * that may be the weakest, those within {@link #BALANCED_MA_PER_CM2} of it.
   */
  public @Nullable Double matchedStandardErrorMaPerCm2() {
    Double matched = matchedCurrentMaPerCm2;
    return matched == null
        ? null
        : subcells.stream()
            .filter(s -> mayBeWeakest(s, matched))
            .map(SubcellOutcome::standardErrorMaPerCm2)
            .filter(Objects::nonNull)
            .max(Double::compare)
            .orElse(null);
  }

  private static boolean mayBeWeakest(SubcellOutcome subcell, double matched) {
    Double current = subcell.photocurrentMaPerCm2();
    return current != null && current - matched < BALANCED_MA_PER_CM2;
  }

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
        device,
        choices);
  }

  /** This outcome as that of a design for which a search chose these alternatives. */
  public Outcome withChoices(Map<String, String> chosen) {
    return new Outcome(
        incidentMaPerCm2,
        subcells,
        matchedCurrentMaPerCm2,
        mismatchMaPerCm2,
        limitingSubcell,
        losses,
        design,
        stack,
        spectral,
        quantities,
        electrical,
        chosen);
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
   * Light that no subcell absorbs. Reflected + transmitted + parasitic + subcells = incident. The
   * standard errors are null where there are none.
   *
   * @param reflectedMaPerCm2 reflected
   * @param transmittedMaPerCm2 net flux into an exit medium that belongs to no subcell, else 0
   * @param parasitic layers, and components, that belong to no subcell, in the light's order
   * @param reflectedStandardErrorMaPerCm2 statistical error of the reflected light
   * @param transmittedStandardErrorMaPerCm2 statistical error of the transmitted light
   * @param neverEnteredMaPerCm2 part of the reflected light that never reached a thick absorbing
   *     layer; null where the solver does not tell. The rest had been inside and came back out.
   */
  public record Losses(
      double reflectedMaPerCm2,
      double transmittedMaPerCm2,
      List<Parasitic> parasitic,
      @Nullable Double reflectedStandardErrorMaPerCm2,
      @Nullable Double transmittedStandardErrorMaPerCm2,
      @Nullable Double neverEnteredMaPerCm2) {

    /** Losses of a solver without statistical errors. */
    public Losses(double reflectedMaPerCm2, double transmittedMaPerCm2, List<Parasitic> parasitic) {
      this(reflectedMaPerCm2, transmittedMaPerCm2, parasitic, null, null, null);
    }
  }

  /**
   * Light absorbed where nothing is collected.
   *
   * @param layer layer name, or {@code layer/component}
   * @param maPerCm2 absorbed, mA cm⁻²
   * @param standardErrorMaPerCm2 statistical error, null where there is none
   */
  public record Parasitic(String layer, double maPerCm2, @Nullable Double standardErrorMaPerCm2) {

    /** Absorbed light without a statistical error. */
    public Parasitic(String layer, double maPerCm2) {
      this(layer, maPerCm2, null);
    }
  }

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
   * @param alongSubstrateNormalNm thickness of a film on facets along the normal of the substrate
   *     in nm, the mean over its facets; null for films on flat boundaries
   */
  public record StackEntry(
      String name,
      String material,
      String role,
      @Nullable Double thicknessNm,
      @Nullable Double bandgapEv,
      boolean coherent,
      @Nullable String subcell,
      List<String> features,
      @Nullable Double alongSubstrateNormalNm) {

    /** A layer that lies flat. */
    public StackEntry(
        String name,
        String material,
        String role,
        @Nullable Double thicknessNm,
        @Nullable Double bandgapEv,
        boolean coherent,
        @Nullable String subcell,
        List<String> features) {
      this(name, material, role, thicknessNm, bandgapEv, coherent, subcell, features, null);
    }
  }

  /**
   * Spectra, one value per wavelength.
   *
   * @param wavelengthNm wavelengths in nm
   * @param incidentMaPerCm2 photon current of each bin
   * @param reflectance reflectance
   * @param transmittance net transmittance into the exit medium
   * @param absorptance by layer, or {@code layer/component}, in the light's order
   * @param absorptanceStandardError statistical error of each, null where there is none
   * @param neverEntered part of the reflectance that never reached a thick absorbing layer; null
   *     where the solver does not tell
   */
  public record Spectral(
      List<Double> wavelengthNm,
      List<Double> incidentMaPerCm2,
      List<Double> reflectance,
      List<Double> transmittance,
      Map<String, List<Double>> absorptance,
      @Nullable Map<String, List<Double>> absorptanceStandardError,
      @Nullable List<Double> neverEntered) {

    /** Spectra without statistical errors. */
    public Spectral(
        List<Double> wavelengthNm,
        List<Double> incidentMaPerCm2,
        List<Double> reflectance,
        List<Double> transmittance,
        Map<String, List<Double>> absorptance) {
      this(wavelengthNm, incidentMaPerCm2, reflectance, transmittance, absorptance, null, null);
    }
  }

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
