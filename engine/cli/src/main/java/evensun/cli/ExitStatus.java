package evensun.cli;

/** Exit statuses of the program. */
final class ExitStatus {

  /** Done. */
  static final int DONE = 0;

  /** A defect of the program itself. */
  static final int INTERNAL_ERROR = 1;

  /** The input is wrong: the command line, a scenario, a table, a folder. */
  static final int WRONG_INPUT = 2;

  /** A plugin is wrong or missing. */
  static final int WRONG_PLUGIN = 3;

  /** Stopped by the user; what was found so far is kept. */
  static final int INTERRUPTED = 130;

  private ExitStatus() {}
}
