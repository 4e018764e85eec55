package evensun.search.problem;

/** Unwinds a step of the search that was asked to stop; the state before the step stays valid. */
public final class SearchInterruptedException extends RuntimeException {

  private static final long serialVersionUID = 1L;

  SearchInterruptedException() {
    super("interrupted", null, false, false);
  }
}
