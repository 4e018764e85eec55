package evensun.cli;

import evensun.report.ClosingSummary;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/** Where a run goes and how its end is told; shared by the commands that make one. */
final class OutputOptions {

  /** Form of the closing summary. */
  enum Form {
    text,
    markdown
  }

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Folder for the report, tables and copies of the inputs.")
  Path out;

  @Option(names = "--force", description = "Replaces what Evensun wrote into --out earlier.")
  boolean force;

  @Option(
      names = "--summary",
      paramLabel = "text|markdown",
      description = "Form of the closing summary (default: text).")
  Form summary = Form.text;

  @Option(names = "--open", description = "Shows the report when it is written.")
  boolean open;

  /** Prints the end of a run: JSON, or the summary with the path of the report last. */
  void tell(Console console, GlobalOptions global, RunResult result, @Nullable Path report) {
    String path = report == null ? "" : report.toString();
    if (global.json()) {
      console.out().print(ResultJson.write(result));
    } else if (summary == Form.markdown) {
      console.out().print(ClosingSummary.markdown(result, path));
    } else {
      console.out().print(ClosingSummary.text(result, path));
    }
    if (open && report != null) {
      show(console, report);
    }
  }

  private static void show(Console console, Path report) {
    String file = report.toAbsolutePath().toString();
    String system = System.getProperty("os.name").toLowerCase(Locale.ROOT);
    List<String> command =
        system.contains("win")
            ? List.of("rundll32", "url.dll,FileProtocolHandler", file)
            : List.of(system.contains("mac") ? "open" : "xdg-open", file);
    try {
      new ProcessBuilder(command)
          .redirectOutput(ProcessBuilder.Redirect.DISCARD)
          .redirectError(ProcessBuilder.Redirect.DISCARD)
          .start();
    } catch (IOException e) {
      console.err().println("no program shows HTML files here; open " + file + " by hand");
    }
  }
}
