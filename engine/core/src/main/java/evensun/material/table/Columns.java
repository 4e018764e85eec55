package evensun.material.table;

import evensun.data.TableFormatException;
import evensun.data.TextTable;
import evensun.material.table.TableHints.Extinction;
import evensun.material.table.TableHints.WavelengthUnit;
import java.util.regex.Pattern;

/** Which column is what, by the words above it, else by its place: wavelength, n, k. */
final class Columns {

  private static final Pattern WAVELENGTH =
      Pattern.compile(
          ".*(wave|wellenl|longueur|lambda|λ|energy|energie|photon|\\bwl\\b|\\bev\\b).*");
  private static final Pattern ABSORPTION =
      Pattern.compile(".*(alpha|α|absorption|cm-1|cm\\^-1|1/cm|cm⁻¹|1/m\\b|1/µm|1/um).*");
  private static final Pattern EXTINCTION =
      Pattern.compile(".*(\\bk\\b|_k\\b|kappa|κ|extinction|extinktion).*");
  private static final Pattern INDEX =
      Pattern.compile(".*(\\bn\\b|_n\\b|refract|index|brechung).*");

  private Columns() {}

  static int wavelength(TextTable.Block block) {
    return first(block, WAVELENGTH, -1, -1, 0);
  }

  static int index(TextTable.Block block, int wavelength) {
    return first(block, INDEX, wavelength, -1, wavelength == 0 ? 1 : 0);
  }

  /** The column of k or α, or -1 when there is none. */
  static int extinction(TextTable.Block block, int wavelength, int index) {
    for (Pattern pattern : new Pattern[] {EXTINCTION, ABSORPTION}) {
      int found = first(block, pattern, wavelength, index, -1);
      if (found >= 0) {
        return found;
      }
    }
    if (block.columnCount() == 2) {
      return -1;
    }
    if (block.columnCount() > 3) {
      throw new TableFormatException(
          block.rows().get(0).line(),
          "has "
              + block.columnCount()
              + " columns and no header that says which are wavelength, n and k; name them in a"
              + " header line or leave three");
    }
    return 3 - wavelength - index;
  }

  private static int first(
      TextTable.Block block, Pattern pattern, int except, int exceptToo, int otherwise) {
    for (int c = 0; c < block.columnCount(); c++) {
      if (c != except && c != exceptToo && pattern.matcher(block.head(c)).matches()) {
        return c;
      }
    }
    return otherwise;
  }

  static WavelengthUnit unit(String head) {
    if (head.matches(".*(\\bev\\b|_ev\\b|electron).*")) {
      return WavelengthUnit.EV;
    }
    if (head.matches(".*(µm|μm|\\bum\\b|_um\\b|micro|mikro|micron).*")) {
      return WavelengthUnit.UM;
    }
    return head.matches(".*(\\bnm\\b|_nm\\b|nano).*") ? WavelengthUnit.NM : null;
  }

  static Extinction kind(String head) {
    if (ABSORPTION.matcher(head).matches()) {
      if (head.matches(".*(1/µm|1/um|1/μm|um-1|µm-1).*")) {
        return Extinction.ALPHA_PER_UM;
      }
      return head.matches(".*(1/m\\b|\\bm-1|m\\^-1|m⁻¹).*") && !head.contains("cm")
          ? Extinction.ALPHA_PER_M
          : Extinction.ALPHA_PER_CM;
    }
    return EXTINCTION.matcher(head).matches() ? Extinction.K : null;
  }
}
