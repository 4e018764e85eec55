package evensun.search;

/** A saved state that belongs to another search than the one that is to go on from it. */
public final class ForeignStateException extends IllegalArgumentException {

  private static final long serialVersionUID = 1;

  ForeignStateException(String message) {
    super(message);
  }
}
