package evensun.cli;

import evensun.pluginhost.LoadedPlugin;
import evensun.pluginhost.PluginException;
import evensun.pluginhost.PluginHost;
import evensun.pluginhost.RejectedPlugin;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.testkit.CaseFiles;
import evensun.testkit.ContractCheck;
import evensun.testkit.LawReport;
import evensun.testkit.LawReport.Status;
import evensun.testkit.Subject;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** {@code evensun plugins check}: tries the contract's laws on a plugin. */
@Command(
    addMethodSubcommands = false,
    name = "check",
    description = {
      "Tries the laws of the solver contract on a plugin.",
      "For each law that the plugin breaks, the smallest stack that shows it is written as a"
          + " scenario."
    })
final class PluginsCheckCommand extends BaseCommand {

  @Parameters(paramLabel = "FILE", description = "The plugin: a jar or a folder.")
  Path file;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Where failing cases go (default: evensun-check-<plugin>).")
  Path out;

  @Option(
      names = "--option",
      paramLabel = "NAME=VALUE",
      description = "An option of the solver, as in solver.options of a scenario (repeatable).")
  Map<String, String> options = new LinkedHashMap<>();

  @Option(
      names = "--limit-seconds",
      paramLabel = "N",
      description = "How long a law may take before it counts as broken (default: 120).")
  int limitSeconds = 120;

  @Override
  public Integer call() throws IOException {
    if (!Files.exists(file)) {
      throw new InputException(
          Place.of(file.toString()), "there is no such file; name a plugin's jar or folder");
    }
    List<Path> places = new ArrayList<>(List.of(file));
    places.addAll(Plugins.places(global()));
    try (PluginHost host = PluginHost.open(places)) {
      return check(host, plugin(host));
    }
  }

  private LoadedPlugin plugin(PluginHost host) {
    List<LoadedPlugin> loaded =
        host.loaded().stream().filter(plugin -> plugin.file().startsWith(file)).toList();
    if (loaded.size() == 1) {
      return loaded.get(0);
    }
    if (loaded.size() > 1) {
      throw new InputException(
          Place.of(file.toString()), "holds " + loaded.size() + " plugins; name one of them");
    }
    throw new PluginException(
        host.rejected().stream()
            .filter(plugin -> plugin.file().startsWith(file))
            .map(RejectedPlugin::toString)
            .findFirst()
            .orElse(file + " holds no plugin"));
  }

  private int check(PluginHost host, LoadedPlugin plugin) throws IOException {
    Subject subject =
        new Subject(host.require(plugin.solverId()), host.services(() -> false), options);
    boolean json = global().json();
    if (!json) {
      console().out().println(plugin.id() + " " + plugin.version() + ", " + plugin.file());
      console().out().println();
    }
    Map<String, Path> cases = new LinkedHashMap<>();
    List<LawReport> reports = new ArrayList<>();
    ContractCheck.run(
        subject,
        Duration.ofSeconds(limitSeconds),
        report -> {
          reports.add(report);
          if (!json) {
            print(report);
          }
        });
    for (LawReport report : reports) {
      if (report.status() == Status.FAILED && report.smallest().isPresent()) {
        cases.put(report.law(), writeCase(plugin, report));
      }
    }
    if (json) {
      console().out().println(json(plugin, reports, cases));
    } else {
      printEnd(reports, cases);
    }
    boolean kept = reports.stream().noneMatch(report -> report.status() == Status.FAILED);
    return kept ? ExitStatus.DONE : ExitStatus.WRONG_PLUGIN;
  }

  private Path writeCase(LoadedPlugin plugin, LawReport report) throws IOException {
    Path folder = out == null ? Path.of("evensun-check-" + plugin.id()) : out;
    String title = plugin.id() + " breaks " + report.law() + ": " + report.message();
    return CaseFiles.write(
        report.smallest().orElseThrow(),
        plugin.solverId(),
        options,
        title,
        folder.resolve(report.law()));
  }

  private void print(LawReport report) {
    console()
        .out()
        .printf("%-8s %-26s %s%n", word(report.status()), report.law(), report.promise());
    if (report.tried() > 1) {
      console().out().printf("%-8s %-26s   tried on %d stacks%n", "", "", report.tried());
    }
    if (!report.message().isEmpty()) {
      console().out().printf("%-8s %-26s   %s%n", "", "", report.message());
    }
  }

  private void printEnd(List<LawReport> reports, Map<String, Path> cases) {
    console().out().println();
    for (Status status : Status.values()) {
      long count = reports.stream().filter(report -> report.status() == status).count();
      if (count > 0) {
        console().out().println(count + " " + word(status));
      }
    }
    if (!cases.isEmpty()) {
      console().out().println("Smallest stacks that show it (evensun assess FILE --plugins ...):");
      cases.forEach((law, path) -> console().out().println("  " + law + ": " + path));
    }
  }

  private static String word(Status status) {
    return switch (status) {
      case PASSED -> "passed";
      case FAILED -> "FAILED";
      case NOT_PROMISED -> "no claim";
      case INFORMATION -> "measured";
    };
  }

  private static String json(
      LoadedPlugin plugin, List<LawReport> reports, Map<String, Path> cases) {
    JsonMapper mapper = JsonMapper.builder().build();
    ObjectNode root = mapper.createObjectNode();
    root.put("id", plugin.id());
    root.put("version", plugin.version());
    root.put("file", plugin.file().toString());
    root.put("sha256", plugin.sha256());
    ArrayNode laws = root.putArray("laws");
    for (LawReport report : reports) {
      ObjectNode law = laws.addObject();
      law.put("law", report.law());
      law.put("promise", report.promise());
      law.put("status", report.status().name().toLowerCase(java.util.Locale.ROOT));
      law.put("tried", report.tried());
      law.put("message", report.message());
      if (cases.containsKey(report.law())) {
        law.put("case", cases.get(report.law()).toString());
      }
    }
    return mapper.writeValueAsString(root);
  }
}
