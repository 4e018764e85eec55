package evensun.result;

/**
 * Something a reader should know.
 *
 * @param severity {@code note}, {@code warning} or {@code serious}
 * @param code stable name, explained by {@code evensun explain CODE}
 * @param where what it is about
 * @param message one sentence
 */
public record FindingRecord(String severity, String code, String where, String message) {}
