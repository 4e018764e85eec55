package evensun.report;

import evensun.report.compare.NamedRun;
import evensun.report.page.ReportPage;
import evensun.report.text.Hashes;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Pages of results as if these had just been stored. */
final class Written {

  private Written() {}

  static byte[] file(RunResult run) {
    return ResultJson.write(run).getBytes(StandardCharsets.UTF_8);
  }

  static ReportPage model(RunResult run) {
    return ReportPages.of(run, Hashes.shortSha256(file(run)));
  }

  static String page(RunResult run) {
    return new String(ReportWriter.write(run, file(run)), StandardCharsets.UTF_8);
  }

  static NamedRun named(String name, RunResult run) {
    return NamedRun.of(name, run, file(run));
  }

  static String comparison(List<NamedRun> runs) {
    return new String(CompareWriter.write(runs), StandardCharsets.UTF_8);
  }
}
