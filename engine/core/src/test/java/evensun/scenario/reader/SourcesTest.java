package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.InputException;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SourcesTest {

  @TempDir Path folder;
  private Path file;

  @BeforeEach
  void nameFile() {
    file = folder.resolve("tandem.yaml");
  }

  private void refused(String message) {
    assertThatThrownBy(() -> Sources.open(file))
        .isInstanceOf(InputException.class)
        .hasMessage(file + message);
  }

  private void write(String text, Charset charset) throws IOException {
    Files.write(file, text.getBytes(charset));
  }

  @Test
  void pathsAreRelativeToTheFile() throws IOException {
    write("evensun: 1", StandardCharsets.UTF_8);
    assertThat(Sources.open(file).folder()).isEqualTo(folder);
  }

  @Test
  void aByteOrderMarkIsDropped() throws IOException {
    write("\uFEFFevensun: 1", StandardCharsets.UTF_8);
    assertThat(Sources.open(file).text()).isEqualTo("evensun: 1");
  }

  @Test
  void windowsLineEndsAreRead() throws IOException {
    write(ScenarioReaderTest.PLANAR.replace("\n", "\r\n"), StandardCharsets.UTF_8);
    assertThat(ScenarioReader.read(file).stack().get(1).place().line()).isEqualTo(13);
  }

  @Test
  void aMissingFileNamesItsNeighbour() throws IOException {
    Files.createFile(folder.resolve("tandam.yaml"));
    refused(": there is no such file; did you mean tandam.yaml?");
  }

  @Test
  void aMissingFolderIsSaid() {
    file = folder.resolve("no-such-folder").resolve("tandem.yaml");
    refused(": there is no such file, and no such folder either");
  }

  @Test
  void aFolderIsNoScenario() throws IOException {
    Files.createFile(folder.resolve("a.yaml"));
    file = folder;
    refused(": this is a folder; name the scenario file in it (a.yaml)");
  }

  @Test
  void otherEncodingsAreNamedWithTheLine() throws IOException {
    write("evensun: 1\ntitle: Zwölf\n", StandardCharsets.ISO_8859_1);
    refused(":2: the file is not in UTF-8 here; save it as UTF-8");
  }

  @Test
  void utf16IsNamed() throws IOException {
    write("evensun: 1", StandardCharsets.UTF_16);
    refused(": the file is in UTF-16; save it as UTF-8");
  }

  @Test
  void binaryFilesAreNoScenario() throws IOException {
    write("evensun: 1\n\u0000", StandardCharsets.UTF_8);
    refused(":2: character \\u0000 has no place in a text; is this a scenario file?");
  }

  @Test
  void hugeFilesAreNotRead() throws IOException {
    write("#".repeat((1 << 20) + 1), StandardCharsets.UTF_8);
    refused(": the file is larger than 1 MiB; a scenario holds no tables, it names them");
  }

  @Test
  void aStreamIsReadLikeAFile() {
    byte[] bytes = ScenarioReaderTest.PLANAR.getBytes(StandardCharsets.UTF_8);
    assertThat(
            ScenarioReader.read(Sources.open("-", folder, new ByteArrayInputStream(bytes))).title())
        .startsWith("Planar");
  }
}
