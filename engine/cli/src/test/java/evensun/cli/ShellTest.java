package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** How the program behaves in a shell. Outside witness: the shells themselves, and man. */
class ShellTest {

  private static final Path MANUAL = Path.of("../dist/src/main/man/evensun.1");

  @TempDir Path folder;

  private static Console console(ByteArrayOutputStream out, boolean terminal) {
    PrintStream stream = new PrintStream(out, true, StandardCharsets.UTF_8);
    return new Console(new ByteArrayInputStream(new byte[0]), stream, stream, terminal, terminal);
  }

  private static String run(boolean terminal, String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    assertThat(Main.run(console(out, terminal), arguments)).isZero();
    return out.toString(StandardCharsets.UTF_8);
  }

  private static boolean has(String program) throws IOException, InterruptedException {
    return new ProcessBuilder("sh", "-c", "command -v " + program).start().waitFor() == 0;
  }

  private static String output(String... command) throws IOException, InterruptedException {
    Process process = new ProcessBuilder(command).redirectErrorStream(true).start();
    String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertThat(process.waitFor()).as(out).isZero();
    return out;
  }

  private Path script(String shell) throws IOException, InterruptedException {
    Assumptions.assumeTrue(has(shell), "SKIPPED: no " + shell + " here");
    return Files.writeString(folder.resolve("completion"), run(false, "completion", shell));
  }

  @ParameterizedTest
  @CsvSource({"de, 1, design", "assess --ea, 2, --each", "completion z, 2, zsh"})
  void bashCompletesWhatIsBegun(String words, int index, String completed)
      throws IOException, InterruptedException {
    String ask =
        ". %s; COMP_WORDS=(evensun %s); COMP_CWORD=%d; _complete_evensun 2>/dev/null;"
            + " echo ${COMPREPLY[*]}";
    String answer = output("bash", "-c", ask.formatted(script("bash"), words, index));
    assertThat(answer).isEqualTo(completed + "\n");
  }

  @Test
  void zshReadsTheScriptAndNamesTheCommands() throws IOException, InterruptedException {
    String ask =
        "autoload -U +X compinit && compinit -u; . %s; setopt ksharrays; COMP_WORDS=(evensun '');"
            + " COMP_CWORD=1; _complete_evensun 2>/dev/null; echo ${COMPREPLY[*]}";
    String answer = output("zsh", "-f", "-c", ask.formatted(script("zsh")));
    assertThat(answer).contains("new assess design").doesNotContain("error");
  }

  /** The page in the zip is written by {@code -Dgolden.update=true} after a command changed. */
  @Test
  void theManualPageIsThatOfTheCommands() throws IOException {
    String page = ManualPage.of(Evensun.commandLine(console(new ByteArrayOutputStream(), false)));
    if (Boolean.getBoolean("golden.update")) {
      Files.createDirectories(MANUAL.getParent());
      Files.writeString(MANUAL, page);
    }
    assertThat(Files.readString(MANUAL)).isEqualTo(page);
  }

  @Test
  void manReadsTheManualPageWithoutAWarning() throws IOException, InterruptedException {
    Assumptions.assumeTrue(has("groff"), "SKIPPED: no groff here");
    String text = output("groff", "-man", "-Tascii", "-ww", MANUAL.toString());
    String plain = text.replaceAll("\u001b\\[[0-9;]*m", "").replaceAll(".\\x08", "");
    assertThat(plain)
        .doesNotContain("warning")
        .contains("evensun assess SCENARIO", "--each", "EXIT STATUS");
  }

  @Test
  void lettersAreBoldOnATerminalOnly() {
    assertThat(run(false, "assess", "--help")).doesNotContain("\u001b");
    Console terminal = console(new ByteArrayOutputStream(), true);
    assertThat(terminal.styled(Map.of("TERM", "xterm"))).isTrue();
    for (Map<String, String> refused : List.of(Map.of("NO_COLOR", "1"), Map.of("TERM", "dumb"))) {
      assertThat(terminal.styled(refused)).isFalse();
    }
    assertThat(console(new ByteArrayOutputStream(), false).styled(Map.of())).isFalse();
  }
}
