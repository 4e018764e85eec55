package evensun.pluginhost;

import java.nio.file.Path;

/**
 * A plugin that was found and not loaded.
 *
 * @param file the jar or folder
 * @param code stable name of the reason, in kebab-case
 * @param reason what is wrong, in one line
 * @param remedy what to do, in one line
 */
public record RejectedPlugin(Path file, String code, String reason, String remedy) {

  /** File, reason and remedy in one line. */
  @Override
  public String toString() {
    return file + ": " + reason + "; " + remedy;
  }
}
