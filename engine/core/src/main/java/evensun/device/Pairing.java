package evensun.device;

import evensun.spi.Finding;
import java.util.List;

/**
 * Which absorptance goes with which saturation current; one for the whole device.
 *
 * @param name in words, for a report
 * @param reciprocal whether the saturation currents come from the subcells' own absorptance
 * @param saturationMaPerCm2 radiative saturation current of each subcell in mA cm⁻²
 * @param findings why it is not another one
 */
record Pairing(
    String name, boolean reciprocal, List<Double> saturationMaPerCm2, List<Finding> findings) {

  static final String STEP_EDGE = "saturation currents from a step edge at each bandgap";
  static final String RECIPROCITY = "saturation currents from each subcell's own absorptance";

  Pairing {
    saturationMaPerCm2 = List.copyOf(saturationMaPerCm2);
    findings = List.copyOf(findings);
  }

  double[] saturation() {
    return saturationMaPerCm2.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
