package evensun.externalprocess;

/** The last words of a stream that may be endless; safe for threads. */
final class Tail {

  private static final int MOST_CHARACTERS = 2000;

  private final StringBuilder text = new StringBuilder();

  synchronized void add(char[] block, int count) {
    text.append(block, 0, count);
    if (text.length() > MOST_CHARACTERS) {
      text.delete(0, text.length() - MOST_CHARACTERS);
    }
  }

  /** The last words in one line. */
  synchronized String line() {
    return text.toString().strip().replaceAll("\\s*\\R\\s*", " | ");
  }

  /** A half-sentence for messages, empty when nothing was said. */
  String suffix() {
    String line = line();
    return line.isEmpty() ? "" : "; its last words on standard error: " + line;
  }
}
