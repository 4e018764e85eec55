package evensun.cli;

import picocli.CommandLine.Command;

/** {@code evensun assess}: the stack as drawn, no search. */
@Command(name = "assess", description = "Evaluates a scenario's stack as drawn, without a search.")
final class AssessCommand extends BaseCommand {

  @Override
  public Integer call() {
    throw new UnsupportedOperationException();
  }
}
