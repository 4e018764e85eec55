package evensun.cli;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes a page to a file a person names. */
final class PageFile {

  private PageFile() {}

  /**
   * Writes a page: whole or not at all.
   *
   * @param replace whether an existing file may be replaced
   * @throws InputException when the file exists and may not be replaced, or cannot be written
   */
  static Path write(Path file, byte[] html, boolean replace) {
    Place place = Place.option("--out");
    if (file.toString().isBlank()) {
      throw new InputException(place, "names no file; write one, such as --out page.html");
    }
    if (Files.isDirectory(file)) {
      throw new InputException(place, "\"" + file + "\" is a folder, a file is needed");
    }
    if (Files.exists(file) && !replace) {
      throw new InputException(
          place, "\"" + file + "\" exists; choose another, or add --force to replace it");
    }
    Path part = file.resolveSibling(file.getFileName() + ".part");
    try {
      Files.write(part, html);
      return Files.move(part, file, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException e) {
      throw new InputException(place, "\"" + file + "\" cannot be written");
    }
  }
}
