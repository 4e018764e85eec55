package evensun.externalprocess;

/** A program that does not answer as it should; the message is one line. */
final class ProgramTrouble extends Exception {

  private static final long serialVersionUID = 1;

  ProgramTrouble(String message) {
    super(message, null, false, false);
  }
}
