package evensun.raytrace;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Response;
import java.util.Arrays;
import java.util.Optional;

/** Answers flat stacks: what the solver below says, averaged over the directions of the light. */
final class FlatEvaluator implements Evaluator, DepthProfile {

  private final FlatStack stack;
  private final Evaluator below;
  private final Response answer;
  private final double[][] mean;

  FlatEvaluator(FlatStack stack) {
    this.stack = stack;
    below = stack.newEvaluatorBelow();
    int wavelengths = stack.problem().wavelengthCount();
    int layers = stack.problem().layerCount();
    answer = Response.spectra(stack.directions(), layers, wavelengths);
    mean = new double[LitDevice.LAYERS + layers][wavelengths];
  }

  @Override
  public void evaluate(Design design, Response into) {
    below.evaluate(design, answer);
    for (int i = 0; i < stack.problem().incidences().size(); i++) {
      average(i);
      Rows.write(i, mean, null, into);
      if (i == 0 && into.sum != null) {
        for (int s = 0; s < into.sum.length; s++) {
          into.sum[s] = Rows.sum(s, mean, into);
        }
      }
    }
    if (into.sumStandardError != null) {
      Arrays.fill(into.sumStandardError, 0);
    }
  }

  private void average(int incidence) {
    int layers = mean.length - LitDevice.LAYERS;
    for (double[] row : mean) {
      Arrays.fill(row, 0);
    }
    for (int d = stack.first(incidence); d < stack.first(incidence + 1); d++) {
      double weight = stack.weight(d);
      add(weight, answer.reflectance[d], mean[LitDevice.REFLECTED]);
      add(weight, answer.transmittance[d], mean[LitDevice.TRANSMITTED]);
      for (int l = 0; l < layers; l++) {
        add(weight, answer.absorptance[d * layers + l], mean[LitDevice.LAYERS + l]);
      }
    }
  }

  private static void add(double weight, double[] from, double[] to) {
    for (int w = 0; w < to.length; w++) {
      to[w] += weight * from[w];
    }
  }

  @Override
  public void evaluate(
      Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    DepthProfile profile = below.ability(DepthProfile.class).orElseThrow();
    double[][] one = new double[into.length][mean[0].length];
    for (double[] row : into) {
      Arrays.fill(row, 0, mean[0].length, 0);
    }
    for (int d = stack.first(incidence); d < stack.first(incidence + 1); d++) {
      profile.evaluate(design, d, channel, depthNm, one);
      for (int z = 0; z < into.length; z++) {
        add(stack.weight(d), one[z], into[z]);
      }
    }
  }

  @Override
  public <A> Optional<A> ability(Class<A> type) {
    return type == DepthProfile.class && below.ability(DepthProfile.class).isPresent()
        ? Optional.of(type.cast(this))
        : Optional.empty();
  }

  @Override
  public void close() {
    below.close();
  }
}
