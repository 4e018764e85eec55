package evensun.report.text;

import java.util.List;

/** The terms of the field that a page explains. */
public final class Glossary {

  private Glossary() {}

  /**
   * A term.
   *
   * @param id usable in a link
   * @param name as written in the text
   * @param meaning one sentence
   */
  public record Term(String id, String name, String meaning) {}

  private static final List<Term> TERMS =
      List.of(
          term(
              "matched-current",
              "matched current",
              "The smallest subcell current of a series device: every subcell must carry the same"
                  + " current, so the weakest sets it."),
          term(
              "mismatch",
              "mismatch",
              "Largest minus smallest subcell current of a series device, in mA cm⁻²."),
          term(
              "balanced",
              "balanced",
              "The subcell currents differ by less than 0.05 mA cm⁻²; no subcell is then called"
                  + " limiting."),
          term(
              "photocurrent",
              "photocurrent",
              "The photons a subcell absorbs, times the elementary charge: the current it would"
                  + " deliver if every absorbed photon were collected."),
          term(
              "available-current",
              "available current",
              "The photons of the spectrum within the wavelength grid, times the elementary"
                  + " charge."),
          term(
              "parasitic",
              "parasitic",
              "Light absorbed in a layer that collects nothing, such as a contact."),
          term(
              "absorptance",
              "absorptance",
              "The share of the incident light that a layer absorbs at a wavelength."),
          term(
              "reflectance",
              "reflectance",
              "The share of the incident light that leaves the device on the side it came from."),
          term(
              "bandgap",
              "bandgap",
              "The photon energy from which a material absorbs strongly, in eV; light of a longer"
                  + " wavelength than 1239.84 eV nm divided by it passes through."),
          term(
              "incoherent",
              "incoherent",
              "A layer so thick that waves in it no longer interfere; intensities are added"
                  + " instead."),
          term(
              "equally-good-range",
              "equally good range",
              "The values of a quantity at which the aim is as good as found, within the stated"
                  + " tolerance, once the others are optimised again."),
          term(
              "external-radiative-efficiency",
              "external radiative efficiency",
              "The share of recombination at open circuit that leaves as light; one at the"
                  + " detailed-balance limit."),
          term(
              "fill-factor",
              "fill factor",
              "Maximum power divided by open-circuit voltage times short-circuit current."),
          term(
              "generation-rate",
              "generation rate",
              "Electron–hole pairs made per volume and second, in cm⁻³ s⁻¹."),
          term(
              "extinction-coefficient",
              "extinction coefficient",
              "The imaginary part k of the refractive index n + ik; zero where a material does not"
                  + " absorb."),
          term(
              "pareto-front",
              "Pareto front",
              "The designs of which none is better in every aim than another."),
          term(
              "sensitivity",
              "sensitivity",
              "What a small change of one quantity does to the aim, everything else kept."));

  private static Term term(String id, String name, String meaning) {
    return new Term("term-" + id, name, meaning);
  }

  /** All terms, in the order they matter. */
  public static List<Term> all() {
    return TERMS;
  }
}
