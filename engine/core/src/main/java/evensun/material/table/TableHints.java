package evensun.material.table;

import java.util.Optional;

/**
 * What a person says about a file beyond the file itself.
 *
 * @param wavelengthUnit unit of the first column, where the file does not say or says it wrong
 * @param extinction what the column beside n is, likewise
 */
public record TableHints(Optional<WavelengthUnit> wavelengthUnit, Optional<Extinction> extinction) {

  /** Nothing said. */
  public static final TableHints NONE = new TableHints(Optional.empty(), Optional.empty());

  /** Units of the first column. */
  public enum WavelengthUnit {
    /** Nanometres. */
    NM("nm"),
    /** Micrometres. */
    UM("um"),
    /** Photon energy in electronvolts. */
    EV("eV");

    private final String key;

    WavelengthUnit(String key) {
      this.key = key;
    }

    /** As scenarios write it. */
    public String key() {
      return key;
    }
  }

  /** What the column beside n is. */
  public enum Extinction {
    /** Extinction coefficient k. */
    K("k"),
    /** Absorption coefficient in cm⁻¹. */
    ALPHA_PER_CM("alpha-per-cm"),
    /** Absorption coefficient in m⁻¹. */
    ALPHA_PER_M("alpha-per-m"),
    /** Absorption coefficient in µm⁻¹. */
    ALPHA_PER_UM("alpha-per-um");

    private final String key;

    Extinction(String key) {
      this.key = key;
    }

    /** As scenarios write it. */
    public String key() {
      return key;
    }

    /** k from a value of this kind. */
    double k(double value, double wavelengthNm) {
      return switch (this) {
        case K -> value;
        case ALPHA_PER_CM -> value * wavelengthNm / (4e7 * Math.PI);
        case ALPHA_PER_M -> value * wavelengthNm / (4e9 * Math.PI);
        case ALPHA_PER_UM -> value * wavelengthNm / (4e3 * Math.PI);
      };
    }
  }
}
