package evensun.search.problem;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Counts evaluations and keeps the first failure of each kind. */
public final class Tally {

  private final Map<String, FailureRecord> failures = new LinkedHashMap<>();
  private int evaluations;

  public Tally(int evaluations, List<FailureRecord> failures) {
    this.evaluations = evaluations;
    failures.forEach(failure -> this.failures.put(failure.kind(), failure));
  }

  public void count(Candidate candidate) {
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
  public void add(Tally other) {
    evaluations += other.evaluations;
    other.failures.forEach(
        (kind, failure) ->
            failures.merge(
                kind,
                failure,
                (old, now) -> new FailureRecord(kind, old.count() + now.count(), old.first())));
  }

  public int evaluations() {
    return evaluations;
  }

  public List<FailureRecord> failures() {
    return new ArrayList<>(failures.values());
  }
}
