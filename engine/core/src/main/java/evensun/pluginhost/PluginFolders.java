package evensun.pluginhost;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Finds what may be a plugin in the folders that the user and the distribution name. */
final class PluginFolders {

  private PluginFolders() {}

  /**
   * The plugins of one place, sorted by name: the place itself when it is a jar or one plugin's
   * folder, otherwise every jar and every folder in it.
   */
  static List<Path> candidates(Path place) throws Rejection {
    if (!Files.exists(place)) {
      throw new Rejection("no-such-folder", "no such folder", "check the path after --plugins");
    }
    if (!Files.isDirectory(place) || PluginFile.isExploded(place)) {
      return List.of(place);
    }
    try (Stream<Path> entries = Files.list(place)) {
      List<Path> found = entries.filter(PluginFolders::mayBePlugin).sorted().toList();
      if (found.isEmpty()) {
        throw new Rejection(
            "empty-folder", "the folder holds no plugin", "put a plugin's jar or folder into it");
      }
      return found;
    } catch (IOException e) {
      throw new Rejection(
          "unreadable", "it cannot be read (" + OneLine.of(e) + ")", "check its access rights");
    }
  }

  private static boolean mayBePlugin(Path path) {
    String name = path.getFileName().toString();
    return !name.startsWith(".")
        && (Files.isDirectory(path) || name.endsWith(".jar") || name.endsWith(".zip"));
  }
}
