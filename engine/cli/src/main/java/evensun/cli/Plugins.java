package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Where a command's plugins come from: folders the user names, then the distribution's own. */
final class Plugins {

  private Plugins() {}

  /**
   * Opens the plugins for a command that works with solvers. What did not load is told on standard
   * error, since the user may be waiting for exactly that plugin; it stops nothing.
   */
  static PluginHost open(Evensun evensun) {
    PluginHost host = PluginHost.open(places(evensun.global));
    host.rejected()
        .forEach(plugin -> evensun.console().err().println("plugin not loaded: " + plugin));
    return host;
  }

  /** The user's places first, so that of two plugins with one id the user's stays. */
  static List<Path> places(GlobalOptions options) {
    List<Path> places = new ArrayList<>();
    for (Path place : options.plugins) {
      // An unset variable of a script must not make the working folder a folder of plugins.
      if (place.toString().isBlank()) {
        throw new InputException(
            Place.option("--plugins"), "names no folder; name a folder or a plugin");
      }
      if (!Files.exists(place)) {
        throw new InputException(
            Place.option("--plugins"), "there is no " + place + "; name a folder or a plugin");
      }
      places.add(place);
    }
    Path own = Path.of(System.getProperty("evensun.home", ""), "plugins");
    if (System.getProperty("evensun.home") != null && Files.isDirectory(own)) {
      places.add(own);
    }
    return places;
  }
}
