package evensun.search;

import java.util.List;

/** The rules that end a round and a search, computed from the saved history alone. */
record Rounds(SearchSettings settings) {

  /** Rounds that start afresh; fewer where the budget is too small to let each converge. */
  int fresh() {
    int affordable = settings.evaluations() / (20 * settings.populationSize());
    return Math.max(1, Math.min(settings.rounds(), affordable));
  }

  /** Rounds at most: after the fresh ones, those that combine what was found. */
  int limit() {
    return fresh() == 1 && settings.rounds() == 1 ? 1 : fresh() + 4;
  }

  boolean isFresh(int round) {
    return round < fresh();
  }

  /** Whether the genetic part of the round has ended. */
  boolean roundEnded(int round, List<GenerationRecord> history) {
    List<GenerationRecord> own = history.stream().filter(g -> g.round() == round).toList();
    return !own.isEmpty() && (stalled(own) || spent(round, history) || timeSpent(history));
  }

  private boolean stalled(List<GenerationRecord> own) {
    int last = own.size() - 1;
    int before = last - settings.stallGenerations();
    if (before < 0) {
      return false;
    }
    double best = own.get(last).roundBest();
    double scale = best - own.get(0).mean();
    double gain = best - own.get(before).roundBest();
    // Without a feasible design yet there is no gain to measure, and every reason to go on.
    return best > Double.NEGATIVE_INFINITY && !(gain > settings.stallFraction() * scale);
  }

  /** A fresh round may use its share of the budget, so that every round gets its turn. */
  private boolean spent(int round, List<GenerationRecord> history) {
    double share =
        isFresh(round)
            ? 0.7 * settings.evaluations() * (round + 1) / fresh()
            : 0.95 * settings.evaluations();
    return history.get(history.size() - 1).evaluations() + settings.populationSize() > share;
  }

  boolean timeSpent(List<GenerationRecord> history) {
    return settings.generations().isPresent()
        && history.size() >= settings.generations().getAsInt();
  }

  boolean budgetSpent(int evaluations) {
    return evaluations + settings.populationSize() > 0.95 * settings.evaluations();
  }

  /** Whether the last round, one that combined, gained nothing worth while. */
  boolean converged(List<Double> roundBests, List<GenerationRecord> history) {
    int last = roundBests.size() - 1;
    if (last < fresh()) {
      return limit() <= roundBests.size();
    }
    double before = roundBests.subList(0, last).stream().mapToDouble(b -> b).max().orElseThrow();
    double scale = before - history.get(0).mean();
    return !(roundBests.get(last) - before > 1e-5 * scale);
  }

  boolean tooManyFailures(int evaluations, int failures) {
    return evaluations >= 50 && failures > settings.failureFraction() * evaluations;
  }
}
