package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.result.RunResult;
import evensun.run.DesignJob;
import evensun.run.Preparation;
import evensun.run.RunFolder;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.search.ForeignStateException;
import evensun.search.SearchSettings;
import evensun.search.SearchState;
import evensun.search.SearchStateCodec;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code evensun design}: the main job. */
@Command(
    addMethodSubcommands = false,
    name = "design",
    description = "Searches the best design of a scenario and writes its report.",
    footer = {"", "Example:", "  evensun design scenarios/perovskite-on-silicon.yaml --out my-run"})
final class DesignCommand extends BaseCommand {

  @Parameters(
      arity = "0..1",
      paramLabel = "SCENARIO",
      description = "Scenario file, or - for standard input; not needed with --resume.")
  String scenarioFile;

  @Option(
      names = "--set",
      paramLabel = "KEY=VALUE",
      description = {
        "Changes one value of the scenario, such as search.seed; front-contact.material=NAME takes",
        "another material as drawn, spacer.present=false leaves a layer out (repeatable)."
      })
  List<String> settings = new ArrayList<>();

  @Mixin OutputOptions output = new OutputOptions();

  @Option(
      names = "--resume",
      paramLabel = "RUN",
      description = {
        "Goes on with a run that was stopped; it ends where it would have ended. With --out the"
            + " run",
        "stays as it is."
      })
  Path resume;

  @Option(
      names = "--time-seconds",
      paramLabel = "S",
      description = "Stops searching after this time with what was found.")
  Double timeSeconds;

  @Option(
      names = "--generations",
      paramLabel = "N",
      description = "Ends after so many generations; repeats a run that was stopped by its time.")
  Integer generations;

  @Option(
      names = "--exhaustive",
      description = {
        "Also looks at every point of a grid, for up to four varied quantities, and says whether"
            + " the",
        "search had missed something; done unasked where it takes less than two seconds."
      })
  boolean exhaustive;

  @Option(
      names = "--point",
      paramLabel = "N",
      description = {
        "Reports on this design of a front instead of its best compromise; with --resume of a",
        "finished run no search is repeated."
      })
  Integer point;

  @Override
  public Integer call() {
    GlobalOptions global = global();
    Interruption interruption = Interruption.listen();
    Scenario scenario = scenario();
    RunResult result;
    Path report;
    try (PluginHost host = Plugins.open(evensun());
        Preparation preparation = Preparation.of(scenario, host, interruption)) {
      DesignJob job = new DesignJob(preparation);
      RunFolder folder = folder(scenario);
      RunFiles.inputs(folder, scenario, preparation, settings);
      result = search(job, folder, global, interruption);
      report = RunFiles.results(folder, result);
    }
    output.tell(console(), global, result, report);
    if (interruption.getAsBoolean()) {
      return ExitStatus.INTERRUPTED;
    }
    boolean failing = result.search() != null && result.search().stopped().equals("failures");
    return failing ? ExitStatus.WRONG_PLUGIN : ExitStatus.DONE;
  }

  private Scenario scenario() {
    if (resume != null) {
      RunFolder.open(resume);
      settings.addAll(0, RunFiles.settings(resume));
      return ScenarioInput.read(
          resume.resolve(RunFiles.SCENARIO).toString(), settings, console().in());
    }
    if (scenarioFile == null) {
      throw new InputException(
          Place.option("design"), "names no scenario; write evensun design SCENARIO");
    }
    return ScenarioInput.read(scenarioFile, settings, console().in());
  }

  /** Goes on in the folder of the run, unless another is named. */
  private RunFolder folder(Scenario scenario) {
    if (resume != null && output.out == null) {
      return RunFolder.open(resume);
    }
    Path folder =
        output.out != null
            ? output.out
            : RunFolder.defaultFolder(Path.of(""), ScenarioInput.runName(scenario), Instant.now());
    return RunFolder.create(folder, output.force);
  }

  private RunResult search(
      DesignJob job, RunFolder folder, GlobalOptions global, Interruption interruption) {
    SearchSettings searchSettings = job.settings(global.threadCount());
    if (generations != null) {
      searchSettings =
          searchSettings.withoutTime().withGenerations(positive("--generations", generations));
    } else if (timeSeconds != null) {
      searchSettings = searchSettings.withTimeSeconds(positive("--time-seconds", timeSeconds));
    }
    boolean live = console().errIsTerminal() && !global.quiet;
    PrintStream terminal = live ? console().err() : null;
    ProgressLine progress = new ProgressLine(terminal, folder, job.aimUnit());
    try {
      return job.run(
          searchSettings, progress, savedState(), interruption, order(), repeatCommand());
    } catch (ForeignStateException e) {
      throw new InputException(
          Place.of(resume.resolve(ProgressLine.STATE).toString()),
          "belongs to a search that varied or wanted something else, or had another seed; go on"
              + " without --set, or start a new run with evensun design");
    } finally {
      progress.end();
      progress.save();
    }
  }

  private static <N extends Number> N positive(String option, N value) {
    if (!(value.doubleValue() > 0)) {
      throw new InputException(Place.option(option), "must be greater than 0 but was " + value);
    }
    return value;
  }

  private @Nullable SearchState savedState() {
    if (resume == null) {
      return null;
    }
    Path file = resume.resolve(ProgressLine.STATE);
    if (!Files.exists(file)) {
      return null; // stopped before anything was saved: it starts again
    }
    try {
      return SearchStateCodec.read(Files.readString(file));
    } catch (IOException | RuntimeException e) {
      throw new InputException(
          Place.of(file.toString()),
          "holds no state to go on from; start the run again with evensun design");
    }
  }

  private DesignJob.Order order() {
    return new DesignJob.Order(
        exhaustive, point == null ? OptionalInt.empty() : OptionalInt.of(point));
  }

  private String repeatCommand() {
    String command = CommandText.of("design", RunFiles.SCENARIO, settings);
    command += exhaustive ? " --exhaustive" : "";
    return point == null ? command : command + " --point " + point;
  }
}
