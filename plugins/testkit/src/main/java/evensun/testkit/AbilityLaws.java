package evensun.testkit;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import java.util.List;
import java.util.Optional;

/** Laws about what evaluators offer beyond spectra. */
final class AbilityLaws {

  /** Small against a fringe, large against rounding: both errors stay below 1e-8. */
  private static final double STEP_NM = 0.002;

  private static final double SLOPE_TOLERANCE = 1e-8;
  private static final double INTEGRAL_TOLERANCE = 1e-7;
  private static final double PANEL_NM = 5;

  /**
   * Abscissae and weights of the three-point Gauss rule on [0, 1] (Abramowitz and Stegun 25.4.29).
   */
  private static final double[] GAUSS_AT = {0.5 - Math.sqrt(0.15), 0.5, 0.5 + Math.sqrt(0.15)};

  private static final double[] GAUSS_WEIGHT = {5.0 / 18, 8.0 / 18, 5.0 / 18};

  private AbilityLaws() {}

  static List<Law> all() {
    return List.of(
        new CaseLaw(
            "gradient",
            "derivatives by thickness are those that small steps show, and the sums stay the same",
            s -> offered(s, Gradient.class),
            AbilityLaws::gradient),
        new CaseLaw(
            "depth-integral",
            "absorption against depth adds up to the absorptance of the layer",
            s -> offered(s, DepthProfile.class),
            AbilityLaws::depth));
  }

  private static List<StackCase> offered(Subject subject, Class<?> ability) {
    return subject.solver().traits().abilities().contains(ability)
        ? Cases.claimedBy(subject, c -> true)
        : List.of();
  }

  private static Optional<String> gradient(Subject subject, StackCase stack) {
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Optional<Gradient> ability = evaluator.ability(Gradient.class);
      if (ability.isEmpty()) {
        return Optional.of("the traits name Gradient, the evaluator does not offer it");
      }
      Response response = subject.spectra(prepared, stack);
      Weighted.ask(response, prepared.channels().size(), stack.wavelengthCount());
      double[] slopes = new double[response.sum.length * stack.layerCount()];
      ability.get().evaluate(stack.design(), response, slopes);
      double[] sums = response.sum.clone();
      evaluator.evaluate(stack.design(), response);
      for (int s = 0; s < sums.length; s++) {
        if (!(Math.abs(sums[s] - response.sum[s]) <= Answer.EXACT)) {
          return Optional.of(
              "sum " + s + " is " + sums[s] + " with and " + response.sum[s] + " without slopes");
        }
      }
      return slopes(stack, evaluator, response, slopes);
    }
  }

  private static Optional<String> slopes(
      StackCase stack, Evaluator evaluator, Response response, double[] slopes) {
    Design design = stack.design();
    for (int l = 0; l < stack.layerCount(); l++) {
      double at = design.thicknessNm[l];
      design.thicknessNm[l] = at + STEP_NM;
      evaluator.evaluate(design, response);
      double[] above = response.sum.clone();
      design.thicknessNm[l] = at - STEP_NM;
      evaluator.evaluate(design, response);
      design.thicknessNm[l] = at;
      for (int s = 0; s < above.length; s++) {
        double stepped = (above[s] - response.sum[s]) / (2 * STEP_NM);
        double is = slopes[s * stack.layerCount() + l];
        if (!(Math.abs(is - stepped) <= SLOPE_TOLERANCE + 1e-5 * Math.abs(stepped))) {
          return Optional.of(
              "sum %d by the thickness of layer %d: %s per nm, steps show %s"
                  .formatted(s, l + 1, is, stepped));
        }
      }
    }
    return Optional.empty();
  }

  private static Optional<String> depth(Subject subject, StackCase stack) {
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Optional<DepthProfile> ability = evaluator.ability(DepthProfile.class);
      if (ability.isEmpty()) {
        return Optional.of("the traits name DepthProfile, the evaluator does not offer it");
      }
      Response response = subject.spectra(prepared, stack);
      evaluator.evaluate(stack.design(), response);
      for (int c = 0; c < prepared.channels().size(); c++) {
        Channel channel = prepared.channels().get(c);
        CaseLayer layer = stack.layers().get(channel.layer());
        if (layer.coherent()) {
          double[] integral = integral(ability.get(), stack, channel);
          Optional<String> wrong =
              Difference.first(
                  "the integral", stack, integral, response.absorptance[c], INTEGRAL_TOLERANCE);
          if (wrong.isPresent()) {
            return wrong.map(text -> "layer " + (channel.layer() + 1) + ": " + text);
          }
        }
      }
      return Optional.empty();
    }
  }

  private static double[] integral(DepthProfile ability, StackCase stack, Channel channel) {
    double thicknessNm = stack.layers().get(channel.layer()).thicknessNm();
    int panels = (int) Math.ceil(thicknessNm / PANEL_NM) + 1;
    double widthNm = thicknessNm / panels;
    double[] depthNm = new double[panels * GAUSS_AT.length];
    for (int z = 0; z < depthNm.length; z++) {
      depthNm[z] = widthNm * (z / GAUSS_AT.length + GAUSS_AT[z % GAUSS_AT.length]);
    }
    double[][] density = new double[depthNm.length][stack.wavelengthCount()];
    ability.evaluate(stack.design(), 0, channel, depthNm, density);
    double[] integral = new double[stack.wavelengthCount()];
    for (int z = 0; z < depthNm.length; z++) {
      for (int w = 0; w < integral.length; w++) {
        integral[w] += density[z][w] * widthNm * GAUSS_WEIGHT[z % GAUSS_AT.length];
      }
    }
    return integral;
  }
}
