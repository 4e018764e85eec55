package evensun.cli;

import evensun.scenario.reader.ScenarioSchema;
import picocli.CommandLine.Command;

/** {@code evensun schema}: the JSON Schema of a scenario. */
@Command(
    addMethodSubcommands = false,
    name = "schema",
    description = "Prints the JSON Schema of a scenario, with which editors complete and check it.",
    footer = {"", "Example:", "  evensun schema > scenario.schema.json"})
final class SchemaCommand extends BaseCommand {

  @Override
  public Integer call() {
    console().out().print(ScenarioSchema.text());
    return ExitStatus.DONE;
  }
}
