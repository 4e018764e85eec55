package evensun.report.section;

import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.FindingRecord;
import evensun.result.RunResult;
import java.util.List;
import java.util.Optional;

/** What a reader should know, most severe first. */
public final class FindingsSection {

  private FindingsSection() {}

  /** The section; absent without findings. */
  public static Optional<Section> of(RunResult result) {
    List<FindingRecord> findings = result.findings();
    if (findings.isEmpty()) {
      return Optional.empty();
    }
    List<Block.Point> points =
        findings.stream()
            .map(
                f ->
                    new Block.Point(f.severity(), spoken(result, f.where()), f.message(), f.code()))
            .toList();
    return Optional.of(
        new Section("findings", "Findings", heading(findings), List.of(new Block.Points(points))));
  }

  private static String spoken(RunResult result, String where) {
    return result.found().design().containsKey(where) ? Keys.words(where) : where;
  }

  private static String heading(List<FindingRecord> findings) {
    int serious = count(findings, "serious");
    int warnings = count(findings, "warning");
    String all = Numbers.count(findings.size(), "finding");
    if (serious > 0) {
      return all + ", " + serious + " of them serious";
    }
    return warnings > 0 ? all + ", " + warnings + " to check" : all + ", none that needs action";
  }

  private static int count(List<FindingRecord> findings, String severity) {
    return (int) findings.stream().filter(f -> f.severity().equals(severity)).count();
  }
}
