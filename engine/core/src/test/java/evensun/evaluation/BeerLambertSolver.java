package evensun.evaluation;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Services;
import evensun.spi.Traits;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * One pass through the stack without any reflection, A = 1 − exp(−4πkd/λ) of what arrives: simple
 * enough that every current has a closed form.
 */
final class BeerLambertSolver implements OpticalSolver {

  /** Light that the solver loses on purpose, to break its ledger. */
  double lost;

  /** Standard error that it states of every absorptance, independent of all others. */
  double error;

  /** Thickness of the first layer above which it refuses a design. */
  double refuseAboveNm = Double.POSITIVE_INFINITY;

  @Override
  public String id() {
    return "beer-lambert";
  }

  @Override
  public Traits traits() {
    return new Traits(Set.of(), Set.of(), true, true, false);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    List<Channel> channels =
        IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
    return new PreparedSolver() {
      @Override
      public List<Channel> channels() {
        return channels;
      }

      @Override
      public Evaluator newEvaluator() {
        return new BeerLambert(problem);
      }
    };
  }

  /** With derivatives in closed form: a thicker layer takes more and shades what lies below it. */
  private final class BeerLambert implements Evaluator {
    private final Problem problem;

    BeerLambert(Problem problem) {
      this.problem = problem;
    }

    @Override
    public void evaluate(Design design, Response into) {
      BeerLambertSolver.this.evaluate(problem, design, into);
    }

    @Override
    public <A> Optional<A> ability(Class<A> type) {
      return type == Gradient.class
          ? Optional.of(type.cast((Gradient) this::differentiate))
          : Optional.empty();
    }

    private void differentiate(Design design, Response into, double[] slopes) {
      evaluate(design, into);
      java.util.Arrays.fill(slopes, 0);
      int layers = problem.layerCount();
      for (int w = 0; w < problem.wavelengthCount(); w++) {
        double left = 1;
        for (int l = 0; l < layers; l++) {
          double alpha =
              4 * Math.PI * design.k[design.material[l]][w] / problem.wavelengthNm().at(w);
          double pass = Math.exp(-alpha * design.thicknessNm[l]);
          for (int s = 0; s < into.sum.length; s++) {
            double[] own = into.weight[s * layers + l];
            slopes[s * layers + l] += own == null ? 0 : own[w] * left * alpha * pass;
            slopes[s * layers + l] -= alpha * below(into, design, l, w, s, left * pass);
          }
          left *= pass;
        }
      }
    }

    /** What a sum takes of the light that arrives below a layer. */
    private double below(Response into, Design design, int layer, int w, int s, double arriving) {
      double taken = 0;
      double left = arriving;
      for (int l = layer + 1; l < problem.layerCount(); l++) {
        double k = design.k[design.material[l]][w];
        double pass =
            Math.exp(-4 * Math.PI * k * design.thicknessNm[l] / problem.wavelengthNm().at(w));
        double[] weight = into.weight[s * problem.layerCount() + l];
        taken += weight == null ? 0 : weight[w] * left * (1 - pass);
        left *= pass;
      }
      double[] beyond = into.transmittanceWeight[s];
      return taken + (beyond == null ? 0 : beyond[w] * left);
    }
  }

  private void evaluate(Problem problem, Design design, Response into) {
    if (design.thicknessNm[0] > refuseAboveNm) {
      throw new EvaluationFailed("too thick for this solver");
    }
    int channels = problem.layerCount();
    if (into.sum != null) {
      java.util.Arrays.fill(into.sum, 0);
    }
    if (into.sum != null && into.sumStandardError != null) {
      stateErrors(into, channels);
    }
    if (into.absorptanceStandardError != null) {
      for (double[] row : into.absorptanceStandardError) {
        java.util.Arrays.fill(row, error);
      }
    }
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      double left = 1;
      for (int l = 0; l < channels; l++) {
        double k = design.k[design.material[l]][w];
        double pass =
            Math.exp(-4 * Math.PI * k * design.thicknessNm[l] / problem.wavelengthNm().at(w));
        add(into, l, w, channels, left * (1 - pass));
        left *= pass;
      }
      if (into.transmittance != null) {
        into.transmittance[0][w] = left - lost;
      }
      for (int s = 0; into.sum != null && s < into.sum.length; s++) {
        if (into.transmittanceWeight != null && into.transmittanceWeight[s] != null) {
          into.sum[s] += left * into.transmittanceWeight[s][w];
        }
      }
    }
  }

  private static void add(Response into, int layer, int w, int channels, double share) {
    if (into.absorptance != null) {
      into.absorptance[layer][w] = share;
    }
    for (int s = 0; into.sum != null && s < into.sum.length; s++) {
      double[] weight = into.weight[s * channels + layer];
      into.sum[s] += weight == null ? 0 : share * weight[w];
    }
  }

  private void stateErrors(Response into, int channels) {
    for (int s = 0; s < into.sum.length; s++) {
      double variance = 0;
      for (int c = 0; c < channels; c++) {
        double[] weight = into.weight[s * channels + c];
        for (int w = 0; weight != null && w < weight.length; w++) {
          variance += error * error * weight[w] * weight[w];
        }
      }
      into.sumStandardError[s] = Math.sqrt(variance);
    }
  }
}
