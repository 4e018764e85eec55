package evensun.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** The program itself: global options and the list of commands. */
@Command(
    name = "evensun",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    description = "Balances the currents of the subcells of a multi-junction solar cell.",
    subcommands = {
      NewCommand.class,
      AssessCommand.class,
      DesignCommand.class,
      MaterialsCommand.class,
      PluginsCommand.class,
      CompareCommand.class,
      ReportCommand.class,
      RunsCommand.class,
      GapsCommand.class,
      SchemaCommand.class,
      VerifyCommand.class,
      ExplainCommand.class,
    })
final class Evensun implements Callable<Integer> {

  private final Console console;

  @Mixin GlobalOptions global = new GlobalOptions();

  private Evensun(Console console) {
    this.console = console;
  }

  /** The command line, ready to execute. */
  static CommandLine commandLine(Console console) {
    CommandLine line = new CommandLine(new Evensun(console));
    line.setUsageHelpWidth(100);
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
