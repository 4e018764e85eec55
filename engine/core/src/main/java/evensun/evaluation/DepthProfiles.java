package evensun.evaluation;

import evensun.light.Constants;
import evensun.result.DepthLayer;
import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.EvaluationFailed;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Generation against depth: G(z) = Σ_w A′(z, w) Φ_w / q, with A′ the absorbed share per depth and Φ
 * the photon current of each bin.
 */
public final class DepthProfiles {

  private static final int POINTS = 81;

  /** (mA cm⁻² per nm) over q: cm⁻³ s⁻¹. */
  private static final double TO_GENERATION = 1e-3 / Constants.ELEMENTARY_CHARGE_C * 1e7;

  private DepthProfiles() {}

  /** Generation in every layer that belongs to a subcell, or empty when the solver offers none. */
  public static Optional<List<DepthLayer>> of(Bench bench) {
    return bench.ability(DepthProfile.class).map(profile -> layers(bench, profile));
  }

  private static List<DepthLayer> layers(Bench bench, DepthProfile profile) {
    Model model = bench.model();
    List<DepthLayer> layers = new ArrayList<>();
    for (Channel channel : model.channels()) {
      boolean absorber =
          model.stack().subcells().stream().anyMatch(s -> model.belongsTo(channel, s));
      double thicknessNm = bench.design().thicknessNm[channel.layer()];
      if (absorber && thicknessNm > 0) {
        layer(bench, profile, channel, thicknessNm).ifPresent(layers::add);
      }
    }
    return layers;
  }

  /** The profile of a channel; empty where the solver knows only how much it absorbs in all. */
  private static Optional<DepthLayer> layer(
      Bench bench, DepthProfile profile, Channel channel, double thicknessNm) {
    boolean thick = !bench.model().stack().layers().get(channel.layer()).coherent();
    double[] depthNm = depths(thicknessNm, thick);
    double[][] share = new double[depthNm.length][bench.model().problem().wavelengthCount()];
    try {
      profile.evaluate(bench.design(), 0, channel, depthNm, share);
    } catch (EvaluationFailed e) {
      return Optional.empty();
    }
    var bins = bench.model().problem().incidentMaPerCm2();
    List<Double> depth = new ArrayList<>();
    List<Double> generation = new ArrayList<>();
    for (int z = 0; z < depthNm.length; z++) {
      double sum = 0;
      for (int w = 0; w < share[z].length; w++) {
        sum += share[z][w] * bins.at(w);
      }
      depth.add(depthNm[z]);
      generation.add(sum * TO_GENERATION);
    }
    return Optional.of(new DepthLayer(bench.model().channelName(channel), depth, generation));
  }

  /** Evenly spaced in a thin layer; denser towards the light in a thick one. */
  private static double[] depths(double thicknessNm, boolean thick) {
    double[] depthNm = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      double share = (double) i / (POINTS - 1);
      depthNm[i] = thicknessNm * (thick ? share * share * share : share);
    }
    return depthNm;
  }
}
