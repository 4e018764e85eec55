package evensun.search;

import java.util.Locale;

/** Why a search ended. */
public enum StopReason {
  /** Nothing more was gained. */
  CONVERGED,
  /** The budget of evaluations was spent. */
  EVALUATIONS,
  /** The budget of time, or the number of generations that repeats one, was spent. */
  TIME,
  /** Somebody asked it to stop. */
  INTERRUPTED,
  /** Too large a part of the evaluations failed. */
  FAILURES;

  /** The name as results write it. */
  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }
}
