package evensun.cli;

import java.util.List;

/** The command that repeats a run, as it can be pasted into a shell from the run's folder. */
final class CommandText {

  private CommandText() {}

  static String of(String command, String scenario, List<String> settings, String... more) {
    StringBuilder text = new StringBuilder("evensun " + command + " " + scenario);
    settings.forEach(setting -> text.append(" --set ").append(quoted(setting)));
    for (String word : more) {
      text.append(' ').append(quoted(word));
    }
    return text.toString();
  }

  /** A word as a Unix shell takes it. */
  static String quoted(String word) {
    return word.matches("[A-Za-z0-9_./=:,@%+-]+") ? word : "'" + word.replace("'", "'\\''") + "'";
  }
}
