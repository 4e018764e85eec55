package evensun.pluginhost;

import java.io.File;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.stream.Stream;
import javax.tools.ToolProvider;

/** Builds real plugin jars and folders from source text. */
final class PluginBuilder {

  private static final String SERVICE = "META-INF/services/evensun.spi.OpticalSolver";

  private final Path work;
  private final Map<String, byte[]> entries = new TreeMap<>();
  private final List<Path> classPath = new ArrayList<>();

  private PluginBuilder(Path work) {
    this.work = work;
    classPath.add(contract());
  }

  /** Nothing in it yet. */
  static PluginBuilder empty(Path work) {
    return new PluginBuilder(work);
  }

  /** A plugin with descriptor and service file for class {@code lab.Solver}, not yet compiled. */
  static PluginBuilder described(Path work, String id) {
    return empty(work).descriptor(id, ">=1.0.0 & <2.0.0").text(SERVICE, "lab.Solver\n");
  }

  /** A plugin that works. */
  static PluginBuilder working(Path work, String id) {
    return described(work, id).source("lab.Solver", solver(id, ""));
  }

  PluginBuilder descriptor(String id, String requires) {
    return text(
        "plugin.properties",
        "plugin.id=" + id + "\nplugin.version=2.3.4\nplugin.requires=" + requires + "\n");
  }

  PluginBuilder text(String name, String content) {
    entries.put(name, content.getBytes(StandardCharsets.UTF_8));
    return this;
  }

  PluginBuilder without(String name) {
    entries.remove(name);
    return this;
  }

  PluginBuilder service(String content) {
    return text(SERVICE, content);
  }

  PluginBuilder withoutService() {
    return without(SERVICE);
  }

  /** Compiles against another jar of the contract. */
  PluginBuilder against(Path contractJar) {
    classPath.set(0, contractJar);
    return this;
  }

  PluginBuilder seeing(Path library) {
    classPath.add(library);
    return this;
  }

  /** Compiles one class into the plugin. */
  PluginBuilder source(String className, String code) {
    try {
      Path source = Files.createTempDirectory(work, "source").resolve(simpleName(className));
      Files.writeString(source, code);
      Path classes = Files.createTempDirectory(work, "classes");
      String path =
          String.join(File.pathSeparator, classPath.stream().map(Path::toString).toList());
      int status =
          ToolProvider.getSystemJavaCompiler()
              .run(
                  null,
                  null,
                  null,
                  "--release",
                  "17",
                  "-proc:none",
                  "-cp",
                  path,
                  "-d",
                  classes.toString(),
                  source.toString());
      if (status != 0) {
        throw new IllegalArgumentException("test source does not compile");
      }
      return folder(classes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Adds everything below a folder. */
  PluginBuilder folder(Path root) {
    try (Stream<Path> walk = Files.walk(root)) {
      for (Path file : walk.filter(Files::isRegularFile).toList()) {
        entries.put(root.relativize(file).toString(), Files.readAllBytes(file));
      }
      return this;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Gives a class the version mark of another Java. */
  PluginBuilder markedForJava(String className, int feature) {
    entries.get(className.replace('.', '/') + ".class")[7] = (byte) (feature + 44);
    return this;
  }

  Path jar(Path jar) {
    try (OutputStream out = Files.newOutputStream(jar);
        JarOutputStream zip = new JarOutputStream(out)) {
      for (Map.Entry<String, byte[]> entry : entries.entrySet()) {
        zip.putNextEntry(new JarEntry(entry.getKey()));
        zip.write(entry.getValue());
        zip.closeEntry();
      }
      return jar;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  Path exploded(Path folder) {
    try {
      for (Map.Entry<String, byte[]> entry : entries.entrySet()) {
        Path file = folder.resolve(entry.getKey());
        Files.createDirectories(file.getParent());
        Files.write(file, entry.getValue());
      }
      return folder;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Folder or jar that the contract's classes come from. */
  static Path contract() {
    try {
      return Path.of(
          evensun.spi.OpticalSolver.class
              .getProtectionDomain()
              .getCodeSource()
              .getLocation()
              .toURI());
    } catch (java.net.URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  /** Source of a solver whose constructor runs {@code body}. */
  static String solver(String id, String body) {
    return """
        package lab;

        import evensun.spi.*;

        public class Solver implements OpticalSolver {
          public Solver() { %s }
          public String id() { return "%s"; }
          public Traits traits() { return Traits.plain(); }
          public PreparedSolver prepare(Problem problem, Design start, Services services) {
            throw new UnsupportedProblem("only for loading");
          }
        }
        """
        .formatted(body, id);
  }

  private static String simpleName(String className) {
    return className.substring(className.lastIndexOf('.') + 1) + ".java";
  }
}
