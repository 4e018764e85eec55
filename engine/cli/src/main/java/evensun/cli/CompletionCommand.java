package evensun.cli;

import picocli.AutoComplete;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code evensun completion}: what a shell needs to complete commands and options. */
@Command(
    addMethodSubcommands = false,
    name = "completion",
    description = {
      "Prints a script with which a shell completes commands and options.",
      "Put the line of the example into ~/.bashrc or ~/.zshrc."
    },
    footer = {"", "Example:", "  eval \"$(evensun completion bash)\""})
final class CompletionCommand extends BaseCommand {

  /** Shells that complete. */
  enum Shell {
    bash,
    zsh
  }

  @Parameters(
      paramLabel = "bash|zsh",
      description = "The shell; zsh reads the script through its bashcompinit.")
  Shell shell;

  @Override
  public Integer call() {
    console().out().print(AutoComplete.bash("evensun", Evensun.commandLine(console())));
    return ExitStatus.DONE;
  }
}
