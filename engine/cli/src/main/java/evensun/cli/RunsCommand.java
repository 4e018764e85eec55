package evensun.cli;

import evensun.cli.StoredRuns.StoredRun;
import evensun.report.ClosingSummary;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;

/** {@code evensun runs}: the runs of a folder with their headlines. */
@Command(
    addMethodSubcommands = false,
    name = "runs",
    description = {
      "Lists the finished runs of a folder with their headlines, latest first.",
      "Other commands take the first of evensun-runs as last, the second as previous."
    },
    footer = {"", "Example:", "  evensun runs", "  evensun compare previous last"})
final class RunsCommand extends BaseCommand {

  @Parameters(arity = "0..1", paramLabel = "DIR", description = "Folder (default: evensun-runs).")
  @Nullable Path folder;

  @Override
  public Integer call() {
    Path place = folder == null ? StoredRuns.USUAL_FOLDER : folder;
    if (folder != null && !Files.isDirectory(folder)) {
      throw new InputException(Place.of(folder.toString()), "there is no such folder");
    }
    List<StoredRun> runs = StoredRuns.in(place);
    if (global().json()) {
      console().out().println(json(runs));
    } else if (runs.isEmpty()) {
      console().out().println("No finished run in " + place + ".");
    } else {
      runs.forEach(run -> console().out().println(line(run)));
    }
    return ExitStatus.DONE;
  }

  private static String line(StoredRun run) {
    return run.folder()
        + "  "
        + run.result().provenance().startedUtc()
        + "\n  "
        + ClosingSummary.headline(run.result());
  }

  private static String json(List<StoredRun> runs) {
    ArrayNode array = JsonMapper.shared().createArrayNode();
    for (StoredRun run : runs) {
      array
          .addObject()
          .put("folder", run.folder().toString())
          .put("startedUtc", run.result().provenance().startedUtc())
          .put("kind", run.result().kind())
          .put("title", run.result().title())
          .put("matchedCurrentMaPerCm2", run.result().found().matchedCurrentMaPerCm2())
          .put("mismatchMaPerCm2", run.result().found().mismatchMaPerCm2())
          .put("headline", ClosingSummary.headline(run.result()));
    }
    return array.toPrettyString();
  }
}
