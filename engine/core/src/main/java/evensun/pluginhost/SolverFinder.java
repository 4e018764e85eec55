package evensun.pluginhost;

import evensun.spi.OpticalSolver;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import org.pf4j.AbstractExtensionFinder;
import org.pf4j.PluginClassLoader;
import org.pf4j.PluginManager;
import org.pf4j.PluginWrapper;

/**
 * Finds the classes that plugins declare as solvers.
 *
 * <p>PF4J's own finder of service files takes the services of every interface together; a plugin
 * that bundles a library with services of its own would then seem to declare wrong solvers.
 */
final class SolverFinder extends AbstractExtensionFinder {

  static final String SERVICE_FILE = "META-INF/services/" + OpticalSolver.class.getName();

  SolverFinder(PluginManager manager) {
    super(manager);
  }

  @Override
  public Map<String, Set<String>> readClasspathStorages() {
    return Map.of();
  }

  @Override
  public Map<String, Set<String>> readPluginsStorages() {
    Map<String, Set<String>> declared = new LinkedHashMap<>();
    for (PluginWrapper plugin : pluginManager.getPlugins()) {
      declared.put(
          plugin.getPluginId(), declared((PluginClassLoader) plugin.getPluginClassLoader()));
    }
    return declared;
  }

  private static Set<String> declared(PluginClassLoader loader) {
    Set<String> names = new LinkedHashSet<>();
    try {
      for (URL url : Collections.list(loader.findResources(SERVICE_FILE))) {
        try (BufferedReader reader =
            new BufferedReader(new InputStreamReader(url.openStream(), StandardCharsets.UTF_8))) {
          reader.lines().map(SolverFinder::withoutComment).forEach(names::add);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    names.remove("");
    return names;
  }

  private static String withoutComment(String line) {
    int comment = line.indexOf('#');
    return (comment < 0 ? line : line.substring(0, comment)).strip();
  }
}
