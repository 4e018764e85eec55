package evensun.run;

import evensun.data.TableFormatException;
import evensun.data.TextTable;
import evensun.data.TextTable.Row;
import evensun.data.TextTableReader;
import evensun.scenario.FaceSpec.HeightMapSpec;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.Place;
import evensun.spi.HeightMap;
import evensun.spi.Samples;
import evensun.stack.SurfaceSource;
import java.util.List;

/** Reads the measured surfaces of a scenario: grids of heights in µm. */
final class ScenarioSurfaces implements SurfaceSource {

  /** Steps across the edge over the largest step within, above which edges do not meet. */
  private static final double STEEPEST = 3;

  private final InputFiles files;

  ScenarioSurfaces(InputFiles files) {
    this.files = files;
  }

  @Override
  public HeightMap heightMap(HeightMapSpec spec) {
    String text = files.text(spec.table(), spec.place());
    try {
      return grid(TextTableReader.read(text), spec.pitchUm());
    } catch (TableFormatException e) {
      throw new InputException(
          new Place(spec.table(), e.line(), 1, ""), "height map: " + e.getMessage());
    }
  }

  private static HeightMap grid(TextTable table, double pitchUm) {
    if (table.blocks().size() > 1) {
      Row later = table.blocks().get(1).rows().get(0);
      throw new TableFormatException(
          later.line(), "words part the grid of heights; write one grid, row below row");
    }
    List<Row> rows = table.blocks().get(0).rows();
    if (rows.size() < 2) {
      throw new TableFormatException(
          rows.get(0).line(), "must have two rows of heights or more but has one");
    }
    rows.forEach(ScenarioSurfaces::requireFinite);
    requireClosed(rows);
    double[] heightUm =
        rows.stream().flatMap(row -> row.values().stream()).mapToDouble(h -> h).toArray();
    int columns = table.blocks().get(0).columnCount();
    return new HeightMap(columns, rows.size(), pitchUm, Samples.of(heightUm));
  }

  private static void requireFinite(Row row) {
    for (int c = 0; c < row.values().size(); c++) {
      if (!Double.isFinite(row.values().get(c))) {
        throw new TableFormatException(
            row.line(),
            "height %d is no finite number of µm; fill gaps of the measurement first"
                .formatted(c + 1));
      }
    }
  }

  /** The surface is continued periodically: its edges must meet. */
  private static void requireClosed(List<Row> rows) {
    double within = 0;
    for (int r = 0; r < rows.size(); r++) {
      for (int c = 1; c < columns(rows); c++) {
        within = Math.max(within, step(rows, r, c - 1, r, c));
      }
      for (int c = 0; r > 0 && c < columns(rows); c++) {
        within = Math.max(within, step(rows, r - 1, c, r, c));
      }
    }
    int last = rows.size() - 1;
    for (int r = 0; r <= last; r++) {
      requireClosed(rows.get(r), step(rows, r, columns(rows) - 1, r, 0), within, "row");
    }
    for (int c = 0; c < columns(rows); c++) {
      requireClosed(rows.get(last), step(rows, last, c, 0, c), within, "column");
    }
  }

  private static int columns(List<Row> rows) {
    return rows.get(0).values().size();
  }

  private static double step(List<Row> rows, int row, int column, int toRow, int toColumn) {
    return Math.abs(rows.get(row).values().get(column) - rows.get(toRow).values().get(toColumn));
  }

  private static void requireClosed(Row row, double step, double within, String line) {
    if (step > STEEPEST * within) {
      throw new TableFormatException(
          row.line(),
          "surface is open: it repeats, but from the end of a %s to its start it steps %.3g µm, more than %.0f times the largest step of %.3g µm between neighbours; cut it to a whole period, level it, or append its mirror image"
              .formatted(line, step, STEEPEST, within));
    }
  }
}
