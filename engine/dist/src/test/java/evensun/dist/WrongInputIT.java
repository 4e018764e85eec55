package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * One clear line for each wrong input, the right exit status, nothing on standard output, no trace,
 * and no file that was not there before.
 */
class WrongInputIT {

  private static final String TITLE = "title: Planar perovskite on silicon, two terminals";

  /** A scenario whose front contact is a table of the user's own. */
  private static final String OWN_TABLE = TITLE + "\nmaterials: {mine: {table: mine.csv}}";

  @TempDir Path folder;

  static List<Row> rows() throws IOException {
    try (InputStream in = WrongInputIT.class.getResourceAsStream("wrong-inputs.txt")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.startsWith("#"))
          .map(Row::of)
          .toList();
    }
  }

  @Test
  void theTableIsNotEmpty() throws IOException {
    assertThat(rows()).hasSizeGreaterThan(50);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rows")
  void oneLineAndNothingElse(Row row) throws IOException {
    Files.writeString(folder.resolve("tandem.yaml"), row.scenario());
    row.makeFile(folder);
    List<String> before = files();
    Run run = new Program(folder).run(row.argumentList());
    assertThat(run.err()).startsWith(row.message()).endsWith("\n");
    assertThat(run.err().lines()).hasSize(1);
    assertThat(run.err()).doesNotContain("Exception", "\tat ", "internal error");
    assertThat(run.status()).isEqualTo(row.status());
    assertThat(run.out()).isEmpty();
    assertThat(files()).isEqualTo(before);
  }

  private List<String> files() throws IOException {
    try (Stream<Path> files = Files.walk(folder)) {
      return files.map(Path::toString).sorted().toList();
    }
  }

  private record Row(int status, String edit, String file, String arguments, String message) {

    static Row of(String line) {
      String[] cells = line.split("\\|", 5);
      return new Row(
          Integer.parseInt(cells[0].strip()),
          cells[1].strip(),
          cells[2].strip(),
          cells[3].strip(),
          cells[4].strip());
    }

    /** The arguments; {@code ""} stands for an empty one, as in a shell. */
    String[] argumentList() {
      return Stream.of(arguments.split(" "))
          .map(word -> word.equals("\"\"") ? "" : word)
          .toArray(String[]::new);
    }

    String scenario() throws IOException {
      String valid = Files.readString(Program.scenario("perovskite-on-silicon.yaml"));
      if (edit.isEmpty()) {
        return valid;
      }
      String[] sides = edit.split("=>", 2);
      String wrong = sides[1].strip().replace("\\n", "\n");
      String edited =
          switch (sides[0].strip()) {
            case "*" -> wrong;
            case "$mine" ->
                valid
                    .replace(TITLE, OWN_TABLE)
                    .replace(
                        "front-contact, material: indium-tin-oxide",
                        "front-contact, material: mine");
            default -> valid.replace(sides[0].strip(), wrong);
          };
      assertThat(edited).isNotEqualTo(valid);
      return edited;
    }

    void makeFile(Path folder) throws IOException {
      if (!file.isEmpty()) {
        int colon = file.indexOf(':');
        Path made = folder.resolve(file.substring(0, colon));
        Files.createDirectories(made.getParent());
        Files.writeString(made, file.substring(colon + 1).strip().replace("\\n", "\n"));
      }
    }

    @Override
    public String toString() {
      return message;
    }
  }
}
