package evensun.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;

/** Options that every command takes. */
final class GlobalOptions {

  /** How results are printed. */
  enum Format {
    text,
    json
  }

  @Option(
      names = "--threads",
      paramLabel = "N",
      scope = ScopeType.INHERIT,
      description = "Threads to work on (default: all cores). Results do not depend on it.")
  Integer threads;

  @Option(
      names = "--plugins",
      paramLabel = "DIR",
      scope = ScopeType.INHERIT,
      description = "A further folder of solver plugins, or one plugin (repeatable).")
  List<Path> plugins = new ArrayList<>();

  @Option(
      names = "--quiet",
      scope = ScopeType.INHERIT,
      description = "No progress on standard error.")
  boolean quiet;

  @Option(
      names = "--format",
      paramLabel = "text|json",
      scope = ScopeType.INHERIT,
      description = "How results are printed on standard output (default: text).")
  Format format = Format.text;

  /** Number of threads to work on, at least 1. */
  int threadCount() {
    return threads == null ? Runtime.getRuntime().availableProcessors() : threads;
  }

  /** Whether results are printed as JSON. */
  boolean json() {
    return format == Format.json;
  }
}
