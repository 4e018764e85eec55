package evensun.report;

import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Front;
import evensun.result.SearchRecord.FrontPoint;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.IntStream;

/** An invented search for two aims at once: its front is a curve, not physics. */
final class FrontRuns {

  private static final int POINTS = 12;

  private FrontRuns() {}

  static RunResult full() {
    RunResult run = SampleRuns.full();
    SearchRecord s = Objects.requireNonNull(run.search());
    Map<String, Double> values = s.optima().get(0).values();
    List<FrontPoint> points =
        IntStream.range(0, POINTS)
            .mapToObj(i -> new FrontPoint(List.of(29.4 - 0.02 * i * i, 400.0 - 15 * i), values))
            .toList();
    Front front =
        new Front(
            List.of("efficiency", "perovskite.thicknessNm"),
            List.of("%", "nm"),
            List.of("largest", "smallest"),
            points,
            4,
            4,
            List.of(26.1, 640.0));
    return SampleRuns.searched(
        run,
        new SearchRecord(
            s.aim(),
            s.aimUnit(),
            s.aimAsDrawn(),
            s.aimFound(),
            s.stopped(),
            s.generations(),
            s.evaluations(),
            s.failures(),
            s.refinementGain(),
            s.history(),
            s.variables(),
            s.optima(),
            s.constraints(),
            front,
            s.notes(),
            s.grid(),
            s.stepCost(),
            s.wanted()));
  }
}
