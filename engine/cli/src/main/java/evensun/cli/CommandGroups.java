package evensun.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import picocli.CommandLine;
import picocli.CommandLine.Help;

/** Lists the commands by what a person wants to do. */
final class CommandGroups {

  private static final Map<String, List<String>> GROUPS = new LinkedHashMap<>();

  static {
    GROUPS.put("Prepare", List.of("new", "materials", "gaps", "schema"));
    GROUPS.put("Decide", List.of("assess", "design", "compare", "report", "runs"));
    GROUPS.put("Check", List.of("verify", "explain"));
    GROUPS.put("Extend", List.of("plugins", "completion"));
  }

  private CommandGroups() {}

  /** The part of the help that lists commands; those of no group stand last. */
  static String render(Help help) {
    Map<String, CommandLine> left = new LinkedHashMap<>(help.commandSpec().subcommands());
    StringBuilder text = new StringBuilder();
    GROUPS.forEach((group, names) -> append(text, group, names, left));
    append(text, "Other", List.copyOf(left.keySet()), left);
    return text.toString();
  }

  private static void append(
      StringBuilder text, String group, List<String> names, Map<String, CommandLine> left) {
    StringBuilder lines = new StringBuilder();
    for (String name : names) {
      CommandLine command = left.remove(name);
      if (command != null && !command.getCommandSpec().usageMessage().hidden()) {
        String[] description = command.getCommandSpec().usageMessage().description();
        String first =
            description.length == 0 ? "" : description[0].replaceAll("([.:;]|, and) .*", ".");
        lines.append("  %-10s %s%n".formatted(name, first));
      }
    }
    if (!lines.isEmpty()) {
      text.append('\n').append(group).append('\n').append(lines);
    }
  }
}
