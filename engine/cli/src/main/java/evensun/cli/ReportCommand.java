package evensun.cli;

import evensun.cli.StoredRuns.StoredRun;
import evensun.report.ReportWriter;
import evensun.run.RunFolder;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tools.jackson.databind.json.JsonMapper;

/** {@code evensun report}: rebuilds the page of a run from its result.json. */
@Command(
    addMethodSubcommands = false,
    name = "report",
    description = {
      "Rebuilds the page of a run from its result.json alone.",
      "An old run can so be shown in today's layout; no number is computed again."
    },
    footer = {"", "Example:", "  evensun report last"})
final class ReportCommand extends BaseCommand {

  @Parameters(
      paramLabel = "RUN",
      description = "Folder of a run, its result.json, last or previous.")
  String run;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "Where the page goes (default: report.html in the run's folder).")
  @Nullable Path out;

  @Override
  public Integer call() {
    StoredRun stored = StoredRuns.read(run);
    byte[] html = ReportWriter.write(stored.result(), stored.content());
    Path page = out == null ? inRun(stored, html) : PageFile.write(out, html, true);
    console()
        .out()
        .println(
            global().json()
                ? JsonMapper.shared().createObjectNode().put("report", page.toString()).toString()
                : "Report: " + page);
    return ExitStatus.DONE;
  }

  private static Path inRun(StoredRun stored, byte[] html) {
    RunFolder folder = RunFolder.open(stored.folder());
    folder.write(RunFiles.REPORT, html);
    return folder.file(RunFiles.REPORT);
  }
}
