package evensun.evaluation;

import evensun.spi.Channel;
import evensun.spi.Samples;
import evensun.stack.ResolvedSubcell;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.IntStream;

/**
 * A weighted sum over the spectra of a design that a {@link Bench} takes along with the currents.
 * Benches know it by identity.
 *
 * @param channels indices of the channels whose absorptance counts
 * @param transmitted whether the light that enters the exit medium counts
 * @param weight [w] weight of each wavelength; the incident photon currents give mA cm⁻²
 */
public record LightSum(List<Integer> channels, boolean transmitted, Samples weight) {

  public LightSum {
    channels = List.copyOf(channels);
  }

  /** What a subcell takes of light with these weights. */
  static LightSum of(Model model, ResolvedSubcell subcell, Samples weight) {
    return new LightSum(
        channels(model, channel -> model.belongsTo(channel, subcell)),
        model.exitBelongsTo(subcell),
        weight);
  }

  /** Absorbed light in mA cm⁻². */
  static LightSum absorbed(Model model, Predicate<Channel> counts, boolean transmitted) {
    return new LightSum(channels(model, counts), transmitted, model.problem().incidentMaPerCm2());
  }

  private static List<Integer> channels(Model model, Predicate<Channel> counts) {
    return IntStream.range(0, model.channels().size())
        .filter(c -> counts.test(model.channels().get(c)))
        .boxed()
        .toList();
  }
}
