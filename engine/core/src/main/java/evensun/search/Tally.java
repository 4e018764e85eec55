package evensun.search;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Counts evaluations and keeps the first failure of each kind. */
final class Tally {

  private final Map<String, FailureRecord> failures = new LinkedHashMap<>();
  private int evaluations;

  Tally(int evaluations, List<FailureRecord> failures) {
    this.evaluations = evaluations;
    failures.forEach(failure -> this.failures.put(failure.kind(), failure));
  }

  void count(Candidate candidate) {
    evaluations++;
    Verdict verdict = candidate.verdict();
    if (verdict.isFailure()) {
      failures.merge(
          verdict.failureKind(),
          new FailureRecord(verdict.failureKind(), 1, candidate),
          (old, now) -> new FailureRecord(old.kind(), old.count() + 1, old.first()));
    }
  }

  /** Counts what another tally counted, after it. */
  void add(Tally other) {
    evaluations += other.evaluations;
    other.failures.forEach(
        (kind, failure) ->
            failures.merge(
                kind,
                failure,
                (old, now) -> new FailureRecord(kind, old.count() + now.count(), old.first())));
  }

  int evaluations() {
    return evaluations;
  }

  List<FailureRecord> failures() {
    return new ArrayList<>(failures.values());
  }
}
