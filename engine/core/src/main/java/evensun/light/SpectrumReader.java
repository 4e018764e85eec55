package evensun.light;

import evensun.data.TableFormatException;
import evensun.data.TextTable;
import evensun.data.TextTableReader;
import java.util.Arrays;
import java.util.Optional;

/** Reads a spectrum of the user's own: wavelength with irradiance or photon flux. */
public final class SpectrumReader {

  private SpectrumReader() {}

  /** What the second column is. */
  public enum Quantity {
    /** Irradiance in W m⁻² nm⁻¹. */
    IRRADIANCE_PER_NM("W-per-m2-nm"),
    /** Irradiance in W m⁻² µm⁻¹. */
    IRRADIANCE_PER_UM("W-per-m2-um"),
    /** Photons in m⁻² s⁻¹ nm⁻¹. */
    PHOTONS_PER_M2("photons-per-m2-s-nm"),
    /** Photons in cm⁻² s⁻¹ nm⁻¹. */
    PHOTONS_PER_CM2("photons-per-cm2-s-nm");

    private final String key;

    Quantity(String key) {
      this.key = key;
    }

    /** As scenarios write it. */
    public String key() {
      return key;
    }

    private double irradiance(double value, double nm) {
      double photonJ = Constants.PLANCK_JS * Constants.LIGHT_SPEED_M_PER_S / (nm * 1e-9);
      return switch (this) {
        case IRRADIANCE_PER_NM -> value;
        case IRRADIANCE_PER_UM -> value / 1000;
        case PHOTONS_PER_M2 -> value * photonJ;
        case PHOTONS_PER_CM2 -> value * 1e4 * photonJ;
      };
    }
  }

  /**
   * Reads a spectrum.
   *
   * @param name as shown to people
   * @param text content of the file; a header line may name the units
   * @param told what the second column is, where the scenario says so
   * @throws TableFormatException when it cannot be understood or used
   */
  public static Spectrum read(String name, String text, Optional<Quantity> told) {
    TextTable table = TextTableReader.read(text);
    TextTable.Block block = table.blocks().get(0);
    if (table.blocks().size() > 1 || block.columnCount() != 2) {
      throw new TableFormatException(
          block.rows().get(0).line(),
          "a spectrum has two columns, wavelength and irradiance, but this has "
              + block.columnCount()
              + (table.blocks().size() > 1 ? " in several blocks" : ""));
    }
    double scale = scaleToNm(block);
    Quantity quantity = told.or(() -> named(block.head(1))).orElseThrow(() -> unknown(block));
    double[] nm = block.column(0);
    double[] irradiance = block.column(1);
    for (int i = 0; i < nm.length; i++) {
      nm[i] = Math.rint(nm[i] * scale * 1e6) / 1e6;
      irradiance[i] = quantity.irradiance(irradiance[i], nm[i]);
    }
    try {
      return Spectrum.of(name, "table " + name + " in " + quantity.key(), nm, irradiance);
    } catch (IllegalArgumentException e) {
      throw new TableFormatException(0, e.getMessage());
    }
  }

  private static double scaleToNm(TextTable.Block block) {
    String head = block.head(0);
    if (head.matches(".*(µm|μm|\\bum\\b|_um\\b|micron).*")) {
      return 1000;
    }
    boolean small = Arrays.stream(block.column(0)).max().orElseThrow() < 100;
    if (small && !head.contains("nm")) {
      throw new TableFormatException(
          block.rows().get(0).line(),
          "wavelengths are below 100 and no header says their unit; write nm, or um in the header");
    }
    return 1;
  }

  private static TableFormatException unknown(TextTable.Block block) {
    return new TableFormatException(
        block.rows().get(0).line(),
        "does not say what its second column is; write a header line such as"
            + " wavelength_nm,irradiance_W_per_m2_nm, or quantity: W-per-m2-nm (or W-per-m2-um,"
            + " photons-per-m2-s-nm, photons-per-cm2-s-nm) beside the table in the scenario");
  }

  private static Optional<Quantity> named(String head) {
    if (head.matches(".*(photon|flux).*")) {
      return Optional.of(head.contains("cm") ? Quantity.PHOTONS_PER_CM2 : Quantity.PHOTONS_PER_M2);
    }
    if (head.matches(".*(w.*m.?-?2|w/m|w_per_m2|irradiance|w m⁻²).*")) {
      boolean um = head.matches(".*(µm|μm|\\bum\\b|_um\\b|/um|um-1).*");
      return Optional.of(um ? Quantity.IRRADIANCE_PER_UM : Quantity.IRRADIANCE_PER_NM);
    }
    return Optional.empty();
  }
}
