package evensun.result;

import java.util.List;

/**
 * Generation against depth in one layer.
 *
 * @param layer layer name
 * @param depthNm depth below its upper face in nm
 * @param generationPerCm3S generation rate in cm⁻³ s⁻¹
 */
public record DepthLayer(String layer, List<Double> depthNm, List<Double> generationPerCm3S) {}
