package evensun.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/**
 * Where a command reads and writes, always UTF-8: results on {@code out}, everything else on {@code
 * err}.
 *
 * @param in standard input
 * @param out results
 * @param err progress, findings, errors
 * @param outIsTerminal whether a person reads {@code out}
 * @param errIsTerminal whether a person reads {@code err}
 */
public record Console(
    InputStream in,
    PrintStream out,
    PrintStream err,
    boolean outIsTerminal,
    boolean errIsTerminal) {

  /** The process's own streams; the launcher says which of them are terminals. */
  static Console system() {
    return new Console(
        System.in,
        stream(FileDescriptor.out),
        stream(FileDescriptor.err),
        Boolean.getBoolean("evensun.terminal.out"),
        Boolean.getBoolean("evensun.terminal.err"));
  }

  /** Whether letters on {@code out} may be bold: on a terminal, and never against NO_COLOR. */
  boolean styled() {
    return styled(System.getenv());
  }

  boolean styled(Map<String, String> environment) {
    boolean refused = !environment.getOrDefault("NO_COLOR", "").isEmpty();
    return outIsTerminal && !refused && !"dumb".equals(environment.get("TERM"));
  }

  private static PrintStream stream(FileDescriptor descriptor) {
    return new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
  }
}
