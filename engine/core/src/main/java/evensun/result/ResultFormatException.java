package evensun.result;

/** A file that cannot be read as {@code result.json}; the message is one line with the remedy. */
public final class ResultFormatException extends RuntimeException {

  private static final long serialVersionUID = 1;

  /** A message of one line: file, what is wrong, what to do. */
  public ResultFormatException(String message) {
    super(message);
  }
}
