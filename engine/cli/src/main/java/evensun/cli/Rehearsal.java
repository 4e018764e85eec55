package evensun.cli;

import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.util.Locale;

/**
 * Does what people do first, an assessment and a short search with their reports, so that the
 * launcher can note the classes that this takes and have them ready at the next start.
 */
final class Rehearsal {

  private static final String FEW = "search.evaluations=600";

  private Rehearsal() {}

  /** Takes a scenario and the folder to be written to. */
  public static void main(String[] args) {
    Locale.setDefault(Locale.ROOT);
    PrintStream silence = new PrintStream(OutputStream.nullOutputStream());
    Console console = new Console(InputStream.nullInputStream(), silence, silence, false, false);
    String scenario = args[0];
    String folder = args[1];
    int assessed = Main.run(console, "assess", scenario, "--out", folder + "/assess");
    int designed = Main.run(console, "design", scenario, "--out", folder + "/design", "--set", FEW);
    Interruption.finished();
    System.exit(Math.max(assessed, designed));
  }
}
