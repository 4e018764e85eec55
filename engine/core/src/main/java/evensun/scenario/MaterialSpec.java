package evensun.scenario;

import evensun.material.dispersion.Dispersion;
import evensun.material.table.TableHints;
import java.util.Optional;

/** A material of the scenario's own. */
public sealed interface MaterialSpec {

  /** Where it stands. */
  Place place();

  /**
   * A measured table.
   *
   * @param path of the CSV file, relative to the scenario
   * @param extinctionPath of a second file that holds k or α, if n and k stand apart
   * @param hints what the scenario says about the form of the files
   * @param hold whether the end values hold beyond the table ({@code extrapolate: hold})
   * @param clean whether an Urbach tail replaces absorption below the gap ({@code clean: urbach})
   * @param place where it stands
   */
  record Table(
      String path,
      Optional<String> extinctionPath,
      TableHints hints,
      boolean hold,
      boolean clean,
      Place place)
      implements MaterialSpec {

    /** A table in one file that says all itself. */
    public Table(String path, boolean hold, Place place) {
      this(path, Optional.empty(), TableHints.NONE, hold, false, place);
    }
  }

  /**
   * A sum of dispersion models.
   *
   * @param dispersion the sum
   * @param place where it stands
   */
  record Model(Dispersion dispersion, Place place) implements MaterialSpec {}

  /**
   * A step of absorption at the gap that a layer chooses.
   *
   * @param refractiveIndex constant index
   * @param absorptionPerCm absorption coefficient above the gap in cm⁻¹
   * @param place where it stands
   */
  record Ideal(double refractiveIndex, double absorptionPerCm, Place place)
      implements MaterialSpec {}
}
