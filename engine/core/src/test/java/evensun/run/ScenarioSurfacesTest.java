package evensun.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.FaceSpec.HeightMapSpec;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.Place;
import evensun.spi.HeightMap;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Grids of heights; the rules are those of the format. */
class ScenarioSurfacesTest {

  @TempDir Path folder;

  private HeightMap read(String text) throws IOException {
    Files.writeString(folder.resolve("surface.csv"), text);
    HeightMapSpec spec = new HeightMapSpec("surface.csv", 0.5, Place.of("cell.yaml"));
    return new ScenarioSurfaces(new InputFiles(folder)).heightMap(spec);
  }

  @Test
  void aGridIsReadRowByRow() throws IOException {
    HeightMap map = read("# heights in µm\n0,1.5,0\n0.5,2,-1\n");
    assertThat(map.columns()).isEqualTo(3);
    assertThat(map.rows()).isEqualTo(2);
    assertThat(map.heightUm().toArray()).containsExactly(0, 1.5, 0, 0.5, 2, -1);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "0,1.5,0\\n0.5,2\\n | surface.csv:2: height map: has 2 numbers where the rows before have 3",
        "0,1.5,0\\n0.5,NaN,1\\n | surface.csv:2: height map: height 2 is no finite number of µm; fill gaps of the measurement first",
        "0,1.5,0\\n0.5,1e999,1\\n | surface.csv:2: height map: height 2 is no finite number of µm; fill gaps of the measurement first",
        "0,1,2,3,3.1\\n0,1,2,3,3.1\\n | surface.csv:1: height map: surface is open: it repeats, but from the end of a row to its start it steps 3.10 µm, more than 3 times the largest step of 1.00 µm between neighbours; cut it to a whole period, level it, or append its mirror image",
        "0,0\\n1,1\\n2,2\\n3,3\\n4,4\\n | surface.csv:5: height map: surface is open: it repeats, but from the end of a column to its start it steps 4.00 µm, more than 3 times the largest step of 1.00 µm between neighbours; cut it to a whole period, level it, or append its mirror image",
        "0,1.5,0\\n | surface.csv:1: height map: must have two rows of heights or more but has one",
        "0,1.5\\n1,2.5\\nsecond part\\n0,1.5\\n | surface.csv:4: height map: words part the grid of heights; write one grid, row below row",
        "nothing here | surface.csv: height map: holds no numbers",
      })
  void refuses(String text, String message) {
    assertThatThrownBy(() -> read(text.replace("\\n", "\n")))
        .isInstanceOf(InputException.class)
        .hasMessageContaining(message);
  }
}
