package evensun.evaluation;

import evensun.spi.Response;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Statistical errors of what becomes of the light, in mA cm⁻². Each is asked of the solver as that
 * of a sum, because errors at different wavelengths stem from the same rays.
 */
final class StandardErrors {

  private final double[] error;
  private final int subcells;
  private final int channels;

  private StandardErrors(Bench bench, double[] bins) {
    Model model = bench.model();
    subcells = model.stack().subcells().size();
    channels = model.channels().size();
    Response shares = Response.sums(subcells + channels + 2, channels);
    for (int s = 0; s < subcells; s++) {
      Bench.weigh(shares, s, model, bins);
    }
    for (int c = 0; c < channels; c++) {
      shares.weight[(subcells + c) * channels + c] = bins;
    }
    shares.transmittanceWeight[subcells + channels] = bins;
    // What is reflected is what is neither absorbed nor transmitted.
    Arrays.fill(shares.weight, (subcells + channels + 1) * channels, shares.weight.length, bins);
    shares.transmittanceWeight[subcells + channels + 1] = bins;
    error = bench.standardErrors(shares);
  }

  /**
   * The errors of a bench's present design; empty where the solver states none.
   *
   * @param bench the bench
   * @param spectra every spectrum of that design with its standard error
   * @param bins [w] photon current of each bin in mA cm⁻²
   */
  static Optional<StandardErrors> of(Bench bench, Response spectra, double[] bins) {
    boolean stated =
        List.of(spectra.absorptanceStandardError).stream()
            .anyMatch(row -> Arrays.stream(row).anyMatch(e -> e > 0));
    return stated ? Optional.of(new StandardErrors(bench, bins)) : Optional.empty();
  }

  double subcell(int s) {
    return error[s];
  }

  double channel(int c) {
    return error[subcells + c];
  }

  double transmitted() {
    return error[subcells + channels];
  }

  double reflected() {
    return error[subcells + channels + 1];
  }
}
