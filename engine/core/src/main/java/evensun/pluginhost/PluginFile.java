package evensun.pluginhost;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;
import java.util.stream.Stream;

/**
 * What stands in the file system: a jar with a {@code plugin.properties}; or a folder with that
 * file and classes, or with one jar that holds it. A folder's {@code lib/*.jar} are the plugin's
 * own libraries.
 *
 * @param path the jar or folder
 * @param main the jar or folder that holds {@code plugin.properties}
 * @param libraries jars of the folder's {@code lib}, sorted
 * @param properties content of {@code plugin.properties}
 */
record PluginFile(Path path, Path main, List<Path> libraries, Properties properties) {

  private static final String DESCRIPTOR = "plugin.properties";

  /** Reads what a jar or folder says about itself. */
  static PluginFile of(Path path) throws Rejection {
    if (!Files.isDirectory(path)) {
      return new PluginFile(path, path, List.of(), readJar(path));
    }
    List<Path> libraries = jars(path.resolve("lib"));
    if (Files.isRegularFile(path.resolve(DESCRIPTOR))) {
      return new PluginFile(path, path, libraries, readFolder(path));
    }
    List<Path> jars = jars(path);
    if (jars.size() == 1) {
      return new PluginFile(path, jars.get(0), libraries, readJar(jars.get(0)));
    }
    throw noDescriptor(
        "it holds neither a plugin.properties nor exactly one jar",
        "name the folder that holds plugin jars, or see the plugin template for the layout");
  }

  /** Whether a folder is itself a plugin rather than a folder of plugins. */
  static boolean isExploded(Path folder) {
    return Files.isRegularFile(folder.resolve(DESCRIPTOR))
        || (jars(folder).size() == 1 && Files.isDirectory(folder.resolve("lib")));
  }

  /** A property without surrounding blanks, empty when absent. */
  String property(String key) {
    return properties.getProperty(key, "").strip();
  }

  /** Everything that classes and resources come from, in order. */
  List<Path> classPath() {
    List<Path> all = new ArrayList<>();
    all.add(main);
    all.addAll(libraries);
    return all;
  }

  static List<Path> jars(Path folder) {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.filter(PluginFile::isJar).sorted().toList();
    } catch (IOException e) {
      return List.of();
    }
  }

  static boolean isJar(Path path) {
    return path.getFileName().toString().endsWith(".jar") && !Files.isDirectory(path);
  }

  private static Properties readFolder(Path folder) throws Rejection {
    try (InputStream in = Files.newInputStream(folder.resolve(DESCRIPTOR))) {
      return load(in);
    } catch (IOException e) {
      throw unreadable(e);
    }
  }

  private static Properties readJar(Path path) throws Rejection {
    try (JarFile jar = new JarFile(path.toFile())) {
      JarEntry entry = jar.getJarEntry(DESCRIPTOR);
      if (entry == null) {
        throw noDescriptor(
            "the jar holds no plugin.properties",
            "add one with plugin.id, plugin.version and plugin.requires="
                + ContractVersion.suggestedRange()
                + ", or remove the jar if it is a library");
      }
      try (InputStream in = jar.getInputStream(entry)) {
        return load(in);
      }
    } catch (IOException e) {
      if (!Files.isReadable(path)) {
        throw unreadable(e);
      }
      throw new Rejection(
          "not-a-jar",
          "it is no jar (" + OneLine.of(String.valueOf(e.getMessage())) + ")",
          "copy or build it again; a download may have been cut short");
    }
  }

  private static Properties load(InputStream in) throws IOException, Rejection {
    Properties properties = new Properties();
    try {
      properties.load(in);
    } catch (IllegalArgumentException e) {
      throw new Rejection(
          "descriptor-unreadable",
          "plugin.properties is unreadable (" + e.getMessage() + ")",
          "write one key=value a line");
    }
    return properties;
  }

  private static Rejection noDescriptor(String reason, String remedy) {
    return new Rejection("no-descriptor", reason, remedy);
  }

  private static Rejection unreadable(IOException e) {
    return new Rejection(
        "unreadable", "it cannot be read (" + OneLine.of(e) + ")", "check its access rights");
  }
}
