package evensun.cli;

import evensun.pluginhost.ContractVersion;
import evensun.pluginhost.LoadedPlugin;
import evensun.pluginhost.PluginHost;
import evensun.pluginhost.RejectedPlugin;
import evensun.spi.Traits;
import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** {@code evensun plugins}: what is loaded, from where, and what did not load and why. */
@Command(
    addMethodSubcommands = false,
    name = "plugins",
    subcommands = PluginsCheckCommand.class,
    description = {
      "Lists the solver plugins: what is loaded, from where, and what did not load and why.",
      "A plugin is code that runs with your rights. Plugins come from the distribution and from"
          + " folders named with --plugins, from nowhere else."
    },
    footer = {"", "Example:", "  evensun plugins --format json"})
final class PluginsCommand extends BaseCommand {

  @Override
  public Integer call() {
    try (PluginHost host = PluginHost.open(Plugins.places(global()))) {
      if (global().json()) {
        console().out().println(JsonMapper.builder().build().writeValueAsString(json(host)));
      } else {
        print(host, console().out());
      }
      return host.rejected().isEmpty() ? ExitStatus.DONE : ExitStatus.WRONG_PLUGIN;
    }
  }

  private static void print(PluginHost host, PrintStream out) {
    out.println("Solver contract " + ContractVersion.current());
    String home = System.getProperty("evensun.home");
    if (home != null) {
      out.println("  EVENSUN_HOME for plugins of your own: " + home);
    }
    host.loaded().forEach(plugin -> print(plugin, out));
    if (host.loaded().isEmpty()) {
      out.println();
      out.println("No plugin is loaded; name a folder that holds one with --plugins.");
    }
    if (!host.rejected().isEmpty()) {
      out.println();
      out.println("Not loaded:");
      host.rejected().forEach(plugin -> print(plugin, out));
    }
  }

  private static void print(LoadedPlugin plugin, PrintStream out) {
    out.println();
    out.println(plugin.id() + " " + plugin.version());
    if (!plugin.description().isEmpty()) {
      out.println("  " + plugin.description());
    }
    out.println("  solver    " + plugin.solverId());
    out.println("  takes     " + takes(plugin.traits()));
    List<String> offers = abilities(plugin.traits());
    out.println(
        "  offers    " + (offers.isEmpty() ? "spectra" : "spectra, " + String.join(", ", offers)));
    out.println("  contract  " + plugin.requires());
    out.println("  file      " + plugin.file());
    out.println("  sha256    " + plugin.sha256());
  }

  private static void print(RejectedPlugin plugin, PrintStream out) {
    out.println("  " + plugin.file());
    out.println("    why     " + plugin.reason());
    out.println("    remedy  " + plugin.remedy());
  }

  private static String takes(Traits traits) {
    List<String> parts = new ArrayList<>();
    parts.add(traits.incoherent() ? "coherent and incoherent layers" : "coherent layers");
    parts.add(traits.oblique() ? "light at any angle" : "light along the normal");
    traits.features().stream().sorted().forEach(parts::add);
    if (traits.statistical()) {
      parts.add("with a statistical error");
    }
    return String.join(", ", parts);
  }

  private static List<String> abilities(Traits traits) {
    return traits.abilities().stream().map(Class::getSimpleName).sorted().toList();
  }

  private static ObjectNode json(PluginHost host) {
    ObjectNode root = JsonMapper.builder().build().createObjectNode();
    root.put("contract", ContractVersion.current());
    ArrayNode loaded = root.putArray("loaded");
    host.loaded().forEach(plugin -> add(loaded.addObject(), plugin));
    ArrayNode rejected = root.putArray("rejected");
    for (RejectedPlugin plugin : host.rejected()) {
      rejected
          .addObject()
          .put("file", plugin.file().toString())
          .put("code", plugin.code())
          .put("reason", plugin.reason())
          .put("remedy", plugin.remedy());
    }
    return root;
  }

  private static void add(ObjectNode node, LoadedPlugin plugin) {
    Traits traits = plugin.traits();
    node.put("id", plugin.id())
        .put("version", plugin.version())
        .put("requires", plugin.requires())
        .put("description", plugin.description())
        .put("file", plugin.file().toString())
        .put("sha256", plugin.sha256());
    ObjectNode solver = node.putObject("solver");
    solver.put("id", plugin.solverId());
    fill(solver.putArray("features"), traits.features().stream());
    fill(solver.putArray("abilities"), abilities(traits).stream());
    solver
        .put("oblique", traits.oblique())
        .put("incoherent", traits.incoherent())
        .put("statistical", traits.statistical());
  }

  private static void fill(ArrayNode array, Stream<String> values) {
    values.sorted().forEach(array::add);
  }
}
