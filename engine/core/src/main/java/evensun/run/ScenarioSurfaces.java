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
}
