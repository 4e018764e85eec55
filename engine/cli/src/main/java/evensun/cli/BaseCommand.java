package evensun.cli;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/**
 * What every command shares. A command throws {@link InputException} for wrong input and returns an
 * {@link ExitStatus}; whatever else it throws is reported as a defect.
 */
@Command(mixinStandardHelpOptions = true, addMethodSubcommands = false)
abstract class BaseCommand implements Callable<Integer> {

  @Spec CommandSpec spec;

  final Evensun evensun() {
    return (Evensun) spec.root().userObject();
  }

  final Console console() {
    return evensun().console();
  }

  final GlobalOptions global() {
    GlobalOptions options = evensun().global;
    if (options.threads != null && options.threads < 1) {
      throw new InputException(
          Place.option("--threads"), "must be at least 1 but was " + options.threads);
    }
    return options;
  }
}
