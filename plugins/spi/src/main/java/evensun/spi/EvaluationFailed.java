package evensun.spi;

/** One design cannot be evaluated. Carries no stack trace, since searches throw it often. */
public final class EvaluationFailed extends RuntimeException {

  private static final long serialVersionUID = 1;

  /**
   * A failure of one design.
   *
   * @param message the reason, in one line
   */
  public EvaluationFailed(String message) {
    super(message, null, false, false);
  }
}
