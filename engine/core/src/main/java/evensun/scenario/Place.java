package evensun.scenario;

/**
 * Where a value stands in an input, so that later checks can still point at it.
 *
 * @param file name as the user gave it
 * @param line line, from 1; 0 when the value was not written anywhere (a default)
 * @param column column, from 1; 0 when unknown
 * @param key path of keys, such as {@code stack[2].thicknessNm}; empty for the whole file
 */
public record Place(String file, int line, int column, String key) {

  /** A place in a file as a whole. */
  public static Place of(String file) {
    return new Place(file, 0, 0, "");
  }

  /** The place of an option on the command line, such as {@code --set}. */
  public static Place option(String option) {
    return new Place(option, 0, 0, "");
  }

  @Override
  public String toString() {
    return line > 0 ? file + ":" + line : file;
  }
}
