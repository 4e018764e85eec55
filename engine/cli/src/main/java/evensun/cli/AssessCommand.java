package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.result.RunResult;
import evensun.run.AssessJob;
import evensun.run.EachJob;
import evensun.run.Preparation;
import evensun.run.RowTable;
import evensun.run.RunFolder;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.reader.ScenarioReader;
import evensun.scenario.reader.Setting;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code evensun assess}: the stack as drawn, no search. */
@Command(
    addMethodSubcommands = false,
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
      description = {
        "Changes one value of the scenario, such as wafer.thicknessNm; front-contact.material=NAME",
        "takes another material, spacer.present=false leaves a layer out (repeatable)."
      })
  List<String> settings = new ArrayList<>();

  @Option(
      names = "--each",
      paramLabel = "TABLE",
      description =
          "CSV table with keys in its header: evaluates the scenario once per row and prints one"
              + " line of JSON for each, in order.")
  Path each;

  @Option(
      names = "--angles",
      paramLabel = "STEP",
      description = "Also prints currents against the angle of incidence, 0 to 85 degrees.")
  Double angleStepDeg;

  @Mixin OutputOptions output = new OutputOptions();

  @Override
  public Integer call() {
    return each == null ? once() : forEachRow();
  }

  private int once() {
    GlobalOptions global = global();
    checkAngles();
    RunFolder folder = null;
    RunResult result;
    try (OpeningPlugins plugins = new OpeningPlugins(evensun());
        Preparation preparation = prepare(plugins)) {
      Scenario scenario = preparation.stack().scenario();
      if (output.out != null) {
        folder = RunFolder.create(output.out, output.force);
        RunFiles.inputs(folder, scenario, preparation, settings);
      }
      boolean full = folder != null;
      double step = angleStepDeg == null ? AssessJob.USUAL_ANGLE_STEP_DEG : angleStepDeg;
      AssessJob job = new AssessJob(preparation, full, full || angleStepDeg != null ? step : 0);
      result = job.run(CommandText.of("assess", RunFiles.SCENARIO, settings));
    }
    Path report = folder == null ? null : RunFiles.results(folder, result);
    if (angleStepDeg != null && !global.json()) {
      console().out().print(AngleTable.text(result));
    }
    output.tell(console(), global, result, report);
    return ExitStatus.DONE;
  }

  private Preparation prepare(OpeningPlugins plugins) {
    Scenario scenario = ScenarioInput.read(scenarioFile, settings, console().in());
    return Preparation.of(scenario, plugins.host(), () -> false);
  }

  private void checkAngles() {
    if (angleStepDeg != null && !(angleStepDeg >= 0.1 && angleStepDeg <= 85)) {
      throw new InputException(
          Place.option("--angles"),
          "the step must be in [0.1, 85] degrees but was " + angleStepDeg);
    }
  }

  private int forEachRow() {
    GlobalOptions global = global();
    List<Setting> parsed = settings.stream().map(text -> Setting.parse("--set", text)).toList();
    InputFiles files = new InputFiles(Path.of(""));
    String text = files.text(each.toString(), Place.option("--each"));
    RowTable table = RowTable.parse(each.toString(), text);
    boolean[] failed = new boolean[1];
    try (PluginHost host = Plugins.open(evensun())) {
      var draft = ScenarioReader.open(ScenarioInput.source(scenarioFile, console().in()));
      EachJob job = new EachJob(draft, parsed, each.toString(), table, host);
      job.run(
          global.threadCount(),
          answer -> {
            failed[0] |= !answer.faults().isEmpty();
            answer.faults().forEach(fault -> console().err().println(fault));
            console().out().println(EachRow.line(table, answer));
          });
    }
    return failed[0] ? ExitStatus.WRONG_INPUT : ExitStatus.DONE;
  }
}
