package evensun.spi;

/** A problem that a solver cannot take; the message says what, why and what to do instead. */
public final class UnsupportedProblem extends RuntimeException {

  private static final long serialVersionUID = 1;

  /**
   * A refusal.
   *
   * @param message what is not supported, why, and the remedy, in one line
   */
  public UnsupportedProblem(String message) {
    super(message);
  }
}
