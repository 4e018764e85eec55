package evensun.cli;

import evensun.cli.OutputOptions.Form;
import evensun.report.CompareWriter;
import evensun.report.compare.NamedRun;
import evensun.result.ResultJson;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code evensun compare}: results side by side. */
@Command(
    addMethodSubcommands = false,
    name = "compare",
    description = {
      "Compares two to six runs, differences first.",
      "Prints what differs and, with --out, writes it as a page."
    },
    footer = {"", "Example:", "  evensun compare previous last --out comparison.html"})
final class CompareCommand extends BaseCommand {

  private static final int FEWEST = 2;
  private static final int MOST = 6;

  @Parameters(
      arity = "1..*",
      paramLabel = "RUN",
      description = "Folders of runs, their result.json, last or previous.")
  List<String> names = new ArrayList<>();

  @Option(names = "--out", paramLabel = "FILE", description = "Where the page goes.")
  @Nullable Path out;

  @Option(names = "--force", description = "Replaces the file of --out.")
  boolean force;

  @Option(
      names = "--summary",
      paramLabel = "text|markdown",
      description = "Form of what is printed (default: text).")
  Form summary = Form.text;

  @Override
  public Integer call() {
    if (names.size() < FEWEST || names.size() > MOST) {
      throw new InputException(
          Place.option("RUN"), "two to six runs can be compared, but there were " + names.size());
    }
    List<NamedRun> runs =
        names.stream()
            .map(StoredRuns::read)
            .map(run -> NamedRun.of(run.name(), run.result(), run.content()))
            .toList();
    Path page = out == null ? null : PageFile.write(out, CompareWriter.write(runs), force);
    String path = page == null ? "" : page.toString();
    if (global().json()) {
      console().out().println(json(runs));
    } else {
      console()
          .out()
          .print(
              summary == Form.markdown
                  ? CompareWriter.markdown(runs, path)
                  : CompareWriter.text(runs, path));
    }
    return ExitStatus.DONE;
  }

  /** The results themselves, in the order given: a script compares what it likes. */
  private static String json(List<NamedRun> runs) {
    return runs.stream()
        .map(run -> ResultJson.writeLine(run.result()))
        .collect(Collectors.joining(",\n", "[", "]"));
  }
}
