package evensun.run;

import evensun.device.DeviceAnalysis;
import evensun.device.DeviceModel;
import evensun.device.DeviceOptics;
import evensun.device.PairingChoice;
import evensun.device.ScenarioDevice;
import evensun.device.SubcellParameters;
import evensun.evaluation.Bench;
import evensun.evaluation.DepthProfiles;
import evensun.evaluation.Model;
import evensun.evaluation.Outcomes;
import evensun.evaluation.Parameter;
import evensun.result.DepthLayer;
import evensun.result.Outcome;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.scenario.SubcellSpec;
import evensun.spi.EvaluationFailed;
import evensun.spi.Finding;
import evensun.stack.ResolvedStack;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The electrical side of a bench's present design, as the scenario describes it. */
final class Electrics {

  /**
   * An outcome with its electrical side.
   *
   * @param outcome the outcome, unchanged when a subcell has no bandgap or there are no currents
   * @param findings what was assumed and what is odd
   */
  record Powered(Outcome outcome, List<Finding> findings) {

    Powered {
      findings = List.copyOf(findings);
    }
  }

  private Electrics() {}

  /** The device of the present design, or empty when a subcell has no bandgap. */
  static Optional<ScenarioDevice> device(Bench bench) {
    ResolvedStack stack = bench.model().stack();
    if (stack.isMonochromatic()) {
      return Optional.empty();
    }
    double[] gaps = new double[stack.subcells().size()];
    bench.subcellGaps(gaps);
    return ScenarioDevice.of(
        stack.scenario(),
        stack.subcells().stream().map(subcell -> material(subcell, stack)).toList(),
        gaps,
        stack.spectrum(),
        needsDepth(stack) ? depth(bench) : null);
  }

  private static String material(ResolvedSubcell subcell, ResolvedStack stack) {
    return subcell.absorbers().isEmpty()
        ? ""
        : stack.slots().get(subcell.absorbers().get(0).slot()).name();
  }

  /** Generation against depth costs time, and only diffusion lengths want it. */
  private static boolean needsDepth(ResolvedStack stack) {
    return stack.scenario().subcells().stream()
        .map(SubcellSpec::diode)
        .anyMatch(diode -> diode.diffusionLengthNm().isPresent());
  }

  private static @Nullable List<DepthLayer> depth(Bench bench) {
    return DepthProfiles.of(bench).orElse(null);
  }

  /** Adds the electrical side to the outcome of the bench's present design, alone. */
  static Powered power(Outcome outcome, Bench bench) {
    return power(outcome, bench, null);
  }

  /**
   * Adds the electrical side to the outcome of the bench's present design.
   *
   * @param choice where saturation currents come from; null to choose for this design alone
   */
  static Powered power(Outcome outcome, Bench bench, @Nullable PairingChoice choice) {
    Optional<ScenarioDevice> device = device(bench);
    if (device.isEmpty()) {
      return new Powered(outcome, List.of());
    }
    DeviceModel model = device.get().model();
    DeviceOptics optics = optics(outcome);
    DeviceAnalysis analysis = model.analyse(optics, choice == null ? model.choose(optics) : choice);
    List<Finding> findings = new ArrayList<>(device.get().findings());
    findings.addAll(analysis.findings());
    List<SubcellOutcome> collected = collected(outcome, device.get().model().subcells());
    return new Powered(outcome.withElectrical(collected, analysis.electrical()), findings);
  }

  private static DeviceOptics optics(Outcome outcome) {
    return DeviceOptics.of(outcome.spectral(), outcome.subcells());
  }

  /**
   * Where saturation currents come from in every design of a search: reciprocity only where it
   * suits the stack as drawn and both ends of the gaps that vary. A design that cannot be evaluated
   * does not count.
   */
  static PairingChoice choice(Model model) {
    ResolvedStack stack = model.stack();
    try (Bench bench = model.newBench()) {
      PairingChoice choice = choice(bench);
      List<VarySpec> gaps =
          stack.scenario().search().stream()
              .flatMap(search -> search.ranges().stream())
              .filter(
                  vary -> Parameter.of(vary.key(), stack).filter(Parameter::setsGap).isPresent())
              .toList();
      if (choice.reciprocal() && !gaps.isEmpty()) {
        gaps.forEach(gap -> set(bench, gap, gap.low()));
        choice = choice.and(choice(bench));
        gaps.forEach(gap -> set(bench, gap, gap.high()));
        choice = choice.and(choice(bench));
      }
      return choice;
    }
  }

  private static void set(Bench bench, VarySpec gap, double value) {
    if (!gap.isTied()) {
      bench.set(Parameter.of(gap.key(), bench.model().stack()).orElseThrow(), value);
    }
  }

  private static PairingChoice choice(Bench bench) {
    Optional<ScenarioDevice> device = device(bench);
    if (device.isEmpty()) {
      return new PairingChoice(false, List.of());
    }
    try {
      return device.get().model().choose(optics(Outcomes.of(bench, List.of())));
    } catch (EvaluationFailed e) {
      return new PairingChoice(true, List.of());
    }
  }

  private static List<SubcellOutcome> collected(
      Outcome outcome, List<SubcellParameters> parameters) {
    List<SubcellOutcome> subcells = new ArrayList<>();
    for (int s = 0; s < parameters.size(); s++) {
      subcells.add(outcome.subcells().get(s).collected(parameters.get(s).collectionFraction()));
    }
    return subcells;
  }
}
