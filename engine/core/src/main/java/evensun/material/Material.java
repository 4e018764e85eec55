package evensun.material;

import evensun.light.Spectrum;
import evensun.spi.Finding;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Optical constants of one material, tunable or not; immutable and safe for threads. */
public interface Material {

  /** What it is and where its numbers come from. */
  MaterialRecord record();

  /** How its bandgap may be chosen, or empty when it is fixed. */
  Optional<Tuning> tuning();

  /** Bandgap in eV where it has one: that of the table, or the default of a tunable material. */
  OptionalDouble bandgapEv();

  /**
   * A filler for a fixed grid.
   *
   * @param wavelengthNm [w] vacuum wavelengths in nm, increasing
   * @return a filler whose findings say what was assumed on this grid
   * @throws MaterialRangeException when the grid leaves the range of the data and nothing says how
   *     to go on
   */
  Filler on(double[] wavelengthNm);

  /**
   * A filler for a fixed grid under a known light.
   *
   * @param wavelengthNm [w] vacuum wavelengths in nm, increasing
   * @param light by which a step inside a bin is weighed
   */
  default Filler on(double[] wavelengthNm, Spectrum light) {
    return on(wavelengthNm);
  }

  /**
   * What a user should know about a chosen bandgap, such as that it lies where the numbers are an
   * estimate.
   *
   * @param bandgapEv the chosen bandgap in eV
   */
  default List<Finding> findingsAt(double bandgapEv) {
    return List.of();
  }

  /** Fills rows of n and k; a filler belongs to one thread and allocates nothing while filling. */
  interface Filler {

    /**
     * Writes n and k on the grid.
     *
     * @param bandgapEv wanted bandgap in eV, within {@link Material#tuning()}; ignored by a
     *     material that is not tunable
     * @param n [w] out: refractive index
     * @param k [w] out: extinction coefficient
     */
    void fill(double bandgapEv, double[] n, double[] k);

    /**
     * Writes n and k for a layer of known thickness.
     *
     * @param thicknessNm in nm; makes a difference only where {@link #followsThickness()}
     */
    default void fill(double bandgapEv, double thicknessNm, double[] n, double[] k) {
      fill(bandgapEv, n, k);
    }

    /** Whether n and k depend on the thickness of the layer. */
    default boolean followsThickness() {
      return false;
    }

    /** What a user should know about this material on this grid. */
    default List<Finding> findings() {
      return List.of();
    }
  }
}
