package evensun.cli;

import java.util.Locale;

/** Entry point of the program. */
public final class Main {

  private Main() {}

  /** Runs one command and ends the process with its exit status. */
  public static void main(String[] args) {
    Locale.setDefault(Locale.ROOT); // numbers read the same on every machine
    Console console = Console.system();
    System.setOut(System.err); // a plugin that prints must not spoil results
    int status = run(console, args);
    Interruption.finished();
    System.exit(status);
  }

  /**
   * Runs one command. Returns 0 done, 1 internal error, 2 wrong input, 3 wrong plugin, 130 stopped.
   */
  public static int run(Console console, String... args) {
    int status;
    try {
      status = Evensun.commandLine(console, args).execute(args);
    } catch (Error e) { // a plugin without its library, no memory left
      status = new ErrorReport(console).broken(e, args);
    }
    console.out().flush();
    console.err().flush();
    return status;
  }
}
