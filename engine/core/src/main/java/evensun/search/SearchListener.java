package evensun.search;

/** Hears from a search, on the thread that runs it, between its steps. */
public interface SearchListener {

  /** Hears nothing. */
  SearchListener NONE = new SearchListener() {};

  /** A step ended. */
  default void progress(Progress progress) {}

  /** A state from which the search can continue; called after every step, so keep it cheap. */
  default void state(SearchState state) {}
}
