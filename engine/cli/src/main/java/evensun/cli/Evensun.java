package evensun.cli;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Help.Ansi.Style;
import picocli.CommandLine.Help.ColorScheme;
import picocli.CommandLine.Mixin;

/** The program itself: global options and the list of commands. */
@Command(
    addMethodSubcommands = false,
    name = "evensun",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    description = "Balances the currents of the subcells of a multi-junction solar cell.")
final class Evensun implements Callable<Integer> {

  private final Console console;

  @Mixin GlobalOptions global = new GlobalOptions();

  private Evensun(Console console) {
    this.console = console;
  }

  /** Every command by its name. */
  private static Map<String, Supplier<Object>> commands() {
    Map<String, Supplier<Object>> commands = new LinkedHashMap<>();
    commands.put("new", NewCommand::new);
    commands.put("assess", AssessCommand::new);
    commands.put("design", DesignCommand::new);
    commands.put("materials", MaterialsCommand::new);
    commands.put("plugins", PluginsCommand::new);
    commands.put("compare", CompareCommand::new);
    commands.put("report", ReportCommand::new);
    commands.put("runs", RunsCommand::new);
    commands.put("gaps", GapsCommand::new);
    commands.put("schema", SchemaCommand::new);
    commands.put("verify", VerifyCommand::new);
    commands.put("explain", ExplainCommand::new);
    commands.put("completion", CompletionCommand::new);
    return commands;
  }

  /** The command line with every command, ready to execute. */
  static CommandLine commandLine(Console console) {
    return commandLine(console, commands().values());
  }

  /**
   * The command line for some arguments: where they start with the name of a command it holds that
   * one alone, since building all of them takes longer than many of them run.
   */
  static CommandLine commandLine(Console console, String[] arguments) {
    Map<String, Supplier<Object>> commands = commands();
    Supplier<Object> called = arguments.length == 0 ? null : commands.get(arguments[0]);
    return commandLine(console, called == null ? commands.values() : List.of(called));
  }

  private static CommandLine commandLine(Console console, Collection<Supplier<Object>> commands) {
    CommandLine line = new CommandLine(new Evensun(console));
    for (Supplier<Object> command : commands) {
      line.addSubcommand(command.get());
    }
    line.setUsageHelpWidth(100);
    line.setColorScheme(letters(console.styled()));
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setOut(new java.io.PrintWriter(console.out(), true));
    line.setErr(new java.io.PrintWriter(console.err(), true));
    line.getHelpSectionMap()
        .put(CommandLine.Model.UsageMessageSpec.SECTION_KEY_COMMAND_LIST_HEADING, help -> "");
    line.getHelpSectionMap()
        .put(
            CommandLine.Model.UsageMessageSpec.SECTION_KEY_COMMAND_LIST,
            help ->
                help.commandSpec().parent() == null
                    ? CommandGroups.render(help)
                    : help.commandList());
    ErrorReport errors = new ErrorReport(console);
    line.setParameterExceptionHandler(errors::wrongCommandLine);
    line.setExecutionExceptionHandler(errors::failed);
    return line;
  }

  /** Bold and italic letters, no colours: readable on every background. */
  private static ColorScheme letters(boolean styled) {
    return new ColorScheme.Builder(styled ? Ansi.ON : Ansi.OFF)
        .commands(Style.bold)
        .options(Style.bold)
        .parameters(Style.italic)
        .optionParams(Style.italic)
        .build();
  }

  Console console() {
    return console;
  }

  @Override
  public Integer call() {
    console
        .out()
        .println(
            """
            Try the demo:      evensun design scenarios/perovskite-on-silicon.yaml
            Start your own:    evensun new my-cell.yaml
            Get help:          evensun --help, or evensun COMMAND --help""");
    return ExitStatus.DONE;
  }
}
