package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

/** The texts of the help fit a terminal of 100 columns, and every command shows an example. */
class HelpTest {

  private static String help(String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    Console console =
        new Console(
            new ByteArrayInputStream(new byte[0]),
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            false,
            false);
    assertThat(Main.run(console, arguments)).isZero();
    assertThat(err.toString(StandardCharsets.UTF_8)).isEmpty();
    return out.toString(StandardCharsets.UTF_8);
  }

  @Test
  void everyHelpFitsAndEveryCommandShowsAnExample() {
    assertThat(help("--help").lines()).allMatch(line -> line.length() <= 100);
    for (CommandLine command : Evensun.commandLine(Console.system()).getSubcommands().values()) {
      String text = help(command.getCommandName(), "--help");
      assertThat(text.lines()).allMatch(line -> line.length() <= 100);
      assertThat(text).contains("Example");
    }
  }
}
