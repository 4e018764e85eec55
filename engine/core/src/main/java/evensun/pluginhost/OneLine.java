package evensun.pluginhost;

/** Foreign messages made fit for one line. */
final class OneLine {

  private OneLine() {}

  static String of(String text) {
    return text.strip().replaceAll("\\s*\\R\\s*", " ");
  }

  /** The message of whatever a plugin threw, with the kind of error, which often says more. */
  static String of(Throwable thrown) {
    String kind = thrown.getClass().getSimpleName();
    String message = thrown.getMessage();
    return message == null || message.isBlank() ? kind : kind + ": " + of(message);
  }
}
