package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.result.Published;
import evensun.verify.PublishedValues;
import java.util.List;
import java.util.Locale;
import picocli.CommandLine.Command;
import tools.jackson.databind.json.JsonMapper;

/** {@code evensun verify}: published values against values computed on this machine. */
@Command(
    addMethodSubcommands = false,
    name = "verify",
    description = "Compares published values with values computed on this machine.",
    footer = {"", "Example:", "  evensun verify"})
final class VerifyCommand extends BaseCommand {

  @Override
  public Integer call() {
    List<Published> verdicts;
    try (PluginHost host = Plugins.open(evensun())) {
      verdicts =
          PublishedValues.compared(
              PublishedValues.all(host.require("transfer-matrix"), host.services(() -> false)));
    }
    if (global().json()) {
      console().out().println(JsonMapper.builder().build().writeValueAsString(verdicts));
    } else {
      verdicts.forEach(verdict -> console().out().println(line(verdict)));
      long agreed = verdicts.stream().filter(Published::agrees).count();
      console().out().printf("%n%d of %d values agree.%n", agreed, verdicts.size());
    }
    boolean all = verdicts.stream().allMatch(Published::agrees);
    return all ? ExitStatus.DONE : ExitStatus.INTERNAL_ERROR;
  }

  private static String line(Published verdict) {
    return String.format(
        Locale.ROOT,
        "%-8s  %s: published %s, computed %s %s (within %s)%n          %s",
        verdict.agrees() ? "agrees" : "DIFFERS",
        verdict.what(),
        number(verdict.published()),
        number(verdict.computed()),
        verdict.unit(),
        number(verdict.tolerance()),
        verdict.source());
  }

  private static String number(double value) {
    return Math.abs(value) < 1e-12
        ? "0"
        : new java.math.BigDecimal(value)
            .round(new java.math.MathContext(7))
            .stripTrailingZeros()
            .toPlainString();
  }
}
