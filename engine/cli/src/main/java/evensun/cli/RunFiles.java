package evensun.cli;

import evensun.report.ReportWriter;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import evensun.run.Preparation;
import evensun.run.RunFolder;
import evensun.run.Tables;
import evensun.scenario.Scenario;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/** Writes everything a run leaves behind. */
final class RunFiles {

  static final String RESULT = "result.json";
  static final String REPORT = "report.html";
  static final String SCENARIO = "inputs/scenario.yaml";

  private RunFiles() {}

  /** Copies of the inputs, before the work starts, so that even a broken run can be repeated. */
  static void inputs(RunFolder folder, Scenario scenario, Preparation preparation) {
    folder.write(SCENARIO, scenario.source().text());
    preparation
        .files()
        .contents()
        .forEach((path, bytes) -> folder.write("inputs/" + inside(path), bytes));
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
