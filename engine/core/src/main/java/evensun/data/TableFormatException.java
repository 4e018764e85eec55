package evensun.data;

/** A text that is no table of numbers; the message says what to do about it. */
public final class TableFormatException extends RuntimeException {

  private static final long serialVersionUID = 1;

  private final int line;

  /**
   * A fault.
   *
   * @param line line from 1, 0 when it concerns the whole file
   * @param message one line
   */
  public TableFormatException(int line, String message) {
    super(message);
    this.line = line;
  }

  /** Line from 1, 0 when it concerns the whole file. */
  public int line() {
    return line;
  }
}
