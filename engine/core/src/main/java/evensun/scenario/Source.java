package evensun.scenario;

import java.nio.file.Path;

/**
 * Where a scenario came from.
 *
 * @param name as the user gave it, used in messages
 * @param folder what relative paths in it are relative to
 * @param text its text
 */
public record Source(String name, Path folder, String text) {}
