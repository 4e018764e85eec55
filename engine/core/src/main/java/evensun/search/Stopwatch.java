package evensun.search;

/** Time since a search or its continuation began, and what it may still take. */
final class Stopwatch {

  private final SearchSettings settings;
  private final SearchState from;
  private final long startNanos = System.nanoTime();

  Stopwatch(SearchSettings settings, SearchState from) {
    this.settings = settings;
    this.from = from;
  }

  private double elapsedSeconds() {
    return (System.nanoTime() - startNanos) * 1e-9;
  }

  /** Whether the genetic part must end so that the refinement fits into the time as well. */
  boolean timeIsUp() {
    return settings.budget().timeSeconds().isPresent()
        && elapsedSeconds() > 0.7 * settings.budget().timeSeconds().getAsDouble();
  }

  Progress progress(SearchState state) {
    return new Progress(
        state.phase() == SearchState.Phase.REFINE ? "refine" : "search",
        state.round(),
        state.generation(),
        state.evaluations(),
        state.bestAim(),
        elapsedSeconds(),
        leftSeconds(state));
  }

  private double leftSeconds(SearchState state) {
    double elapsed = elapsedSeconds();
    int done = state.evaluations() - from.evaluations();
    if (done <= 0) {
      return Double.NaN;
    }
    double byEvaluations = elapsed / done * (settings.budget().evaluations() - state.evaluations());
    double byTime = settings.budget().timeSeconds().orElse(Double.POSITIVE_INFINITY) - elapsed;
    return Math.max(0, Math.min(byEvaluations, byTime));
  }
}
