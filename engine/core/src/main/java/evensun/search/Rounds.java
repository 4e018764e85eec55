package evensun.search;

import java.util.List;

/** The rules that end a round and a search, computed from the saved history alone. */
record Rounds(SearchSettings settings) {

  /**
   * A front stands still when the mean gain of a generation, in parts of its range, is less than
   * this over the number of its designs and falls no more: designs that merely move along a front
   * give such gains for ever.
   */
  private static final double FRONT_GAIN = 0.25;

  /** The gain falls no more when it is at least this part of the gain before. */
  private static final double PLATEAU = 0.8;

  /** Generations over which gains are averaged. */
  private static final int FRONT_PATIENCE = 20;

  /** So many combining rounds in a row without a gain end the search. */
  private static final int IDLE = 5;

  /** The same where nearly all fresh rounds ended at one value: a short round and a long one. */
  private static final int IDLE_WHERE_AGREED = 2;

  /** Values are alike, and a gain is not worth while, within this part of the range of values. */
  private static final double ALIKE = 1e-5;

  /** More combining rounds would only polish noise. */
  private static final int COMBINING = 12;

  /** Rounds that start afresh; fewer where the budget is too small to let each converge. */
  int fresh() {
    int affordable = settings.budget().evaluations() / (20 * settings.effort().populationSize());
    return Math.max(1, Math.min(settings.effort().rounds(), affordable));
  }

  /** Rounds at most: after the fresh ones, those that combine what was found. */
  int limit() {
    return settings.effort().rounds() == 1 ? 1 : fresh() + COMBINING;
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
    int before = last - patience(own.get(0).round());
    if (before < 0) {
      return false;
    }
    double best = own.get(last).roundBest();
    double scale = best - own.get(0).mean();
    double gain = best - own.get(before).roundBest();
    // Without a feasible design yet there is no gain to measure, and every reason to go on.
    return best > Double.NEGATIVE_INFINITY && !(gain > settings.effort().stallFraction() * scale);
  }

  /**
   * Combining rounds are in turn short, for what shows its gain in the refinement, and long, for
   * what the genetic algorithm has to put together itself.
   */
  private int patience(int round) {
    boolean brief = !isFresh(round) && (round - fresh()) % 2 == 0;
    return brief
        ? Math.min(2, settings.effort().stallGenerations())
        : settings.effort().stallGenerations();
  }

  /** A fresh round may use its share of the budget, so that every round gets its turn. */
  private boolean spent(int round, List<GenerationRecord> history) {
    double share =
        isFresh(round)
            ? 0.7 * settings.budget().evaluations() * (round + 1) / fresh()
            : 0.95 * settings.budget().evaluations();
    return history.get(history.size() - 1).evaluations() + settings.effort().populationSize()
        > share;
  }

  boolean timeSpent(List<GenerationRecord> history) {
    return settings.budget().generations().isPresent()
        && history.size() >= settings.budget().generations().getAsInt();
  }

  boolean budgetSpent(int evaluations) {
    return evaluations + settings.effort().populationSize()
        > 0.95 * settings.budget().evaluations();
  }

  /** Whether the last rounds, all of which combined, gained nothing worth while. */
  boolean converged(List<Double> roundBests, List<GenerationRecord> history) {
    int count = roundBests.size();
    if (count >= limit()) {
      return true;
    }
    if (count < fresh()) {
      return false;
    }
    double alike = ALIKE * (best(roundBests) - history.get(0).mean());
    int idle = agreed(roundBests, alike) ? IDLE_WHERE_AGREED : IDLE;
    if (count < fresh() + idle) {
      return false;
    }
    return !(best(roundBests) - best(roundBests.subList(0, count - idle)) > alike);
  }

  /** Whether all fresh rounds but one at most found the best value there is, each by itself. */
  private boolean agreed(List<Double> roundBests, double alike) {
    double best = best(roundBests);
    long agreeing = roundBests.subList(0, fresh()).stream().filter(b -> b >= best - alike).count();
    return fresh() >= 3 && agreeing >= fresh() - 1;
  }

  private static double best(List<Double> roundBests) {
    return roundBests.stream().mapToDouble(b -> b).max().orElseThrow();
  }

  /** Whether a front gets ahead no more. */
  boolean frontStands(List<GenerationRecord> history) {
    int last = history.size() - FRONT_PATIENCE;
    if (last < FRONT_PATIENCE) {
      return false;
    }
    double gain = meanGain(history.subList(last, history.size()));
    double before = meanGain(history.subList(last - FRONT_PATIENCE, last));
    return gain == 0
        || gain < FRONT_GAIN / settings.effort().populationSize() && gain > PLATEAU * before;
  }

  private static double meanGain(List<GenerationRecord> generations) {
    return generations.stream().mapToDouble(GenerationRecord::frontGain).average().orElseThrow();
  }

  boolean tooManyFailures(int evaluations, int failures) {
    return evaluations >= 50 && failures > settings.effort().failureFraction() * evaluations;
  }
}
