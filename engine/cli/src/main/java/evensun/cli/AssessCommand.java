package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import evensun.run.AssessJob;
import evensun.run.Preparation;
import evensun.run.RunFolder;
import evensun.scenario.Scenario;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code evensun assess}: the stack as drawn, no search. */
@Command(
    name = "assess",
    description = "Evaluates the stack of a scenario as drawn, without a search.",
    footer = {
      "",
      "Example:",
      "  evensun assess scenarios/perovskite-on-silicon.yaml --set perovskite.thicknessNm=450"
    })
final class AssessCommand extends BaseCommand {

  @Parameters(paramLabel = "SCENARIO", description = "Scenario file, or - for standard input.")
  String scenarioFile;

  @Option(
      names = "--set",
      paramLabel = "KEY=VALUE",
      description = "Changes one value of the scenario, such as wafer.thicknessNm (repeatable).")
  List<String> settings = new ArrayList<>();

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Also writes a report, tables and copies of the inputs into this folder.")
  Path out;

  @Option(names = "--force", description = "Replaces what Evensun wrote into --out earlier.")
  boolean force;

  @Override
  public Integer call() {
    GlobalOptions global = global();
    Scenario scenario = ScenarioInput.read(scenarioFile, settings, console().in());
    RunFolder folder = null;
    RunResult result;
    try (PluginHost host = Plugins.open(evensun());
        Preparation preparation = Preparation.of(scenario, host, () -> false)) {
      if (out != null) {
        folder = RunFolder.create(out, force);
        RunFiles.inputs(folder, scenario, preparation);
      }
      result = new AssessJob(preparation, out != null).run(repeatCommand());
    }
    Path report = folder == null ? null : RunFiles.results(folder, result);
    console()
        .out()
        .print(global.json() ? ResultJson.write(result) : RunFiles.summary(result, report));
    return ExitStatus.DONE;
  }

  private String repeatCommand() {
    return CommandText.of("assess", RunFiles.SCENARIO, settings);
  }
}
