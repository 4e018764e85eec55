package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import picocli.CommandLine;

/** The texts of the help fit a terminal of 100 columns, and every command shows an example. */
class HelpTest {

  private static String help(String... arguments) {
    Called called = Called.with(arguments);
    assertThat(called.status()).isZero();
    assertThat(called.err()).isEmpty();
    return called.out();
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
