package evensun.cli;

import static java.util.stream.Collectors.joining;

import evensun.report.ReportWriter;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import evensun.run.Preparation;
import evensun.run.RunFolder;
import evensun.run.Tables;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** Writes everything a run leaves behind. */
final class RunFiles {

  static final String RESULT = "result.json";
  static final String REPORT = "report.html";
  static final String SCENARIO = "inputs/scenario.yaml";
  private static final String SETTINGS = "inputs/settings.txt";

  private RunFiles() {}

  /** Copies of the inputs, before the work starts, so that even a broken run can be repeated. */
  static void inputs(
      RunFolder folder, Scenario scenario, Preparation preparation, List<String> settings) {
    folder.write(SCENARIO, scenario.source().text());
    if (!settings.isEmpty()) {
      folder.write(
          SETTINGS,
          settings.stream().map(s -> s.lines().collect(joining(" ")) + "\n").collect(joining()));
    }
    preparation
        .files()
        .contents()
        .forEach((path, bytes) -> folder.write("inputs/" + inside(path), bytes));
  }

  /** What {@code --set} changed in the scenario of a run. */
  static List<String> settings(Path run) {
    Path file = run.resolve(SETTINGS);
    try {
      return Files.exists(file) ? Files.readAllLines(file) : List.of();
    } catch (IOException e) {
      throw new InputException(Place.of(file.toString()), "cannot be read");
    }
  }

  /** A path that stays inside the folder whatever the scenario wrote. */
  private static String inside(String path) {
    return path.replace('\\', '/')
        .replaceAll("^[A-Za-z]:", "")
        .replaceAll("^/+", "")
        .replaceAll("(^|/)\\.\\.(?=/|$)", "$1up");
  }

  /** Result, tables and report; returns the path of the report. */
  static Path results(RunFolder folder, RunResult result) {
    byte[] file = ResultJson.write(result).getBytes(StandardCharsets.UTF_8);
    folder.write(RESULT, file);
    Tables.of(result).forEach(folder::write);
    folder.write(REPORT, ReportWriter.write(result, file));
    return folder.file(REPORT);
  }
}
