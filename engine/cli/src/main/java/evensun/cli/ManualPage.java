package evensun.cli;

import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** The manual page, made of the same descriptions as the help. */
final class ManualPage {

  private final StringBuilder text = new StringBuilder();

  private ManualPage() {}

  /** The page in the language of man (troff with its man macros). */
  static String of(CommandLine evensun) {
    ManualPage page = new ManualPage();
    page.head(evensun.getCommandSpec());
    evensun.getSubcommands().values().forEach(command -> page.command(command.getCommandSpec()));
    page.foot();
    return page.text.toString();
  }

  private void head(CommandSpec evensun) {
    line(".TH EVENSUN 1");
    heading("NAME");
    line("evensun \\- balances the currents of the subcells of a multi-junction solar cell");
    heading("SYNOPSIS");
    line(".B evensun");
    line(".I COMMAND");
    line("[options]");
    heading("DESCRIPTION");
    paragraph(
        "Evensun takes a scenario (a stack, the light, what may vary, what is wanted), finds the"
            + " design at which the subcells of a tandem deliver the same current, and writes one"
            + " HTML file with which a design review can decide, check and repeat.");
    heading("OPTIONS OF EVERY COMMAND");
    evensun.options().forEach(this::argument);
    heading("COMMANDS");
  }

  private void command(CommandSpec command) {
    line(".SS " + escaped(synopsis(command)));
    paragraph(String.join(" ", command.usageMessage().description()));
    command.positionalParameters().forEach(this::argument);
    command.options().stream()
        .filter(option -> !option.inherited() && !isHelp(option))
        .forEach(this::argument);
    command.subcommands().forEach((name, sub) -> subcommand(name, sub.getCommandSpec()));
    example(command.usageMessage().footer());
  }

  private void subcommand(String name, CommandSpec command) {
    if (!name.equals("help")) {
      line(".TP");
      line(".B " + escaped(name));
      line(escaped(String.join(" ", command.usageMessage().description())));
    }
  }

  private static String synopsis(CommandSpec command) {
    StringBuilder words = new StringBuilder("evensun " + command.name());
    for (PositionalParamSpec parameter : command.positionalParameters()) {
      boolean optional = parameter.arity().min() == 0;
      String label = parameter.paramLabel() + (parameter.arity().max() > 1 ? "..." : "");
      words.append(' ').append(optional ? "[" + label + "]" : label);
    }
    return words.toString();
  }

  private static boolean isHelp(OptionSpec option) {
    return option.usageHelp() || option.versionHelp();
  }

  private void argument(ArgSpec argument) {
    line(".TP");
    if (argument instanceof OptionSpec option) {
      boolean takesValue = option.arity().max() > 0;
      String value = takesValue ? " \\fI" + escaped(option.paramLabel()) + "\\fR" : "";
      line("\\fB" + escaped(String.join(", ", option.names())) + "\\fR" + value);
    } else {
      line("\\fI" + escaped(argument.paramLabel()) + "\\fR");
    }
    line(escaped(String.join(" ", argument.description())));
  }

  private void example(String[] footer) {
    List<String> lines = List.of(footer).stream().filter(line -> line.startsWith("  ")).toList();
    if (!lines.isEmpty()) {
      line(".PP");
      line("Example:");
      line(".PP");
      line(".nf");
      lines.forEach(example -> line(escaped(example)));
      line(".fi");
    }
  }

  private void foot() {
    heading("EXIT STATUS");
    paragraph(
        "0 done, 1 internal error, 2 the input is wrong, 3 a plugin is wrong, 130 stopped (what was"
            + " found so far is saved).");
    heading("ENVIRONMENT");
    line(".TP");
    line(".B NO_COLOR");
    line("Where it is set, help is printed without bold and italic letters on a terminal, too.");
    line(".TP");
    line(".B JAVA_HOME, EVENSUN_JAVA_OPTS");
    line("The Java to run on, and options for it.");
    heading("FILES");
    paragraph("scenarios/README.md beside the program explains every field of a scenario.");
  }

  private void heading(String words) {
    line(".SH " + words);
  }

  private void paragraph(String words) {
    line(".PP");
    line(escaped(words));
  }

  private void line(String words) {
    text.append(words).append('\n');
  }

  /** Backslashes and hyphens are commands of troff, as is a dot that begins a line. */
  private static String escaped(String words) {
    String plain = words.replace("\\", "\\e").replace("-", "\\-").replace("%n", " ");
    return plain.startsWith(".") || plain.startsWith("'") ? "\\&" + plain : plain;
  }
}
