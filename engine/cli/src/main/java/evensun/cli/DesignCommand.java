package evensun.cli;

import picocli.CommandLine.Command;

/** {@code evensun design}: the main job. */
@Command(
    name = "design",
    description = "Searches the best design of a scenario and writes its report.")
final class DesignCommand extends BaseCommand {

  @Override
  public Integer call() {
    throw new UnsupportedOperationException();
  }
}
