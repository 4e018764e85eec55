package evensun.run;

import evensun.light.Spectrum;
import evensun.material.Material;
import evensun.material.MaterialRecord;
import evensun.material.TableMaterial;
import evensun.material.table.OpticalTable;
import evensun.scenario.GridSpec;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.MaterialSpec;
import evensun.scenario.Place;
import java.util.ArrayList;
import java.util.List;

/** Reads the tables that a scenario brings: materials and spectra. */
final class OwnTables {

  /** No table for a solar cell ends below this; one that seems to is in micrometres. */
  private static final double SHORTEST_NM = 20;

  private OwnTables() {}

  static Material material(String name, MaterialSpec.Table spec, InputFiles files) {
    double[][] columns = columns(spec.path(), 3, "wavelength_nm,n,k", files, spec.place());
    try {
      OpticalTable table = OpticalTable.of(columns[0], columns[1], columns[2]);
      return TableMaterial.of(record(name, spec, table), table, spec.hold());
    } catch (IllegalArgumentException e) {
      throw new InputException(Place.of(spec.path()), e.getMessage());
    }
  }

  private static MaterialRecord record(String name, MaterialSpec.Table spec, OpticalTable table) {
    return new MaterialRecord(
        name,
        name,
        "own table",
        "as measured by the user",
        "table " + spec.path(),
        0,
        table.fromNm(),
        table.toNm(),
        evensun.light.Constants.CELL_TEMPERATURE_K,
        false,
        List.of("Hazards not known: a material of the user's own; see its safety data sheet."),
        List.of());
  }

  static Spectrum spectrum(String path, GridSpec grid, InputFiles files, Place place) {
    double[][] columns = columns(path, 2, "wavelength_nm,irradiance_W_per_m2_nm", files, place);
    try {
      Spectrum spectrum = Spectrum.of(path, "table " + path, columns[0], columns[1]);
      if (spectrum.fromNm() > grid.fromNm() || spectrum.toNm() < grid.toNm()) {
        throw new InputException(
            place,
            "the spectrum covers %s to %s nm but the grid runs from %s to %s nm; shorten the grid"
                .formatted(spectrum.fromNm(), spectrum.toNm(), grid.fromNm(), grid.toNm()));
      }
      if (spectrum.photonCurrentMaPerCm2(grid.fromNm(), grid.toNm()) <= 0
          && grid.toNm() > grid.fromNm()) {
        throw new InputException(
            place,
            "the spectrum of table \"%s\" holds no light between %s and %s nm"
                .formatted(path, grid.fromNm(), grid.toNm()));
      }
      return spectrum;
    } catch (IllegalArgumentException e) {
      throw new InputException(Place.of(path), e.getMessage());
    }
  }

  /** The columns of a CSV table; '#' starts a comment line, one header line is allowed. */
  private static double[][] columns(
      String path, int count, String header, InputFiles files, Place place) {
    List<double[]> rows = new ArrayList<>();
    String[] lines = files.text(path, place).split("\\R", -1);
    boolean headerSeen = false;
    for (int i = 0; i < lines.length; i++) {
      String line = lines[i].strip();
      if (line.isEmpty() || line.startsWith("#")) {
        continue;
      }
      String[] cells = line.split(",", -1);
      if (rows.isEmpty() && !headerSeen && !isNumber(cells[0])) {
        headerSeen = true;
        continue;
      }
      rows.add(row(cells, count, header, new Place(path, i + 1, 1, "")));
    }
    if (rows.isEmpty()) {
      throw new InputException(Place.of(path), "holds no numbers; it needs lines " + header);
    }
    double lastNm = rows.get(rows.size() - 1)[0];
    if (lastNm > 0 && lastNm < SHORTEST_NM) {
      throw new InputException(
          Place.of(path),
          "the wavelengths (%s to %s) look like micrometres; write them in nm, 1000 times as much"
              .formatted(rows.get(0)[0], lastNm));
    }
    double[][] columns = new double[count][rows.size()];
    for (int r = 0; r < rows.size(); r++) {
      for (int c = 0; c < count; c++) {
        columns[c][r] = rows.get(r)[c];
      }
    }
    return columns;
  }

  private static double[] row(String[] cells, int count, String header, Place place) {
    if (cells[0].contains(";")) {
      throw new InputException(
          place,
          "the columns are parted by semicolons; part them by commas, with decimal points ("
              + header
              + ")");
    }
    if (cells.length != count) {
      throw new InputException(
          place, "needs %d numbers (%s) but has %d".formatted(count, header, cells.length));
    }
    double[] row = new double[count];
    for (int c = 0; c < count; c++) {
      if (!isNumber(cells[c])) {
        throw new InputException(place, "\"" + cells[c].strip() + "\" is not a number");
      }
      row[c] = Double.parseDouble(cells[c].strip());
    }
    return row;
  }

  private static boolean isNumber(String cell) {
    return cell.strip().matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");
  }
}
