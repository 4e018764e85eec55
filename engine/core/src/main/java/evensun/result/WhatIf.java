package evensun.result;

import java.util.List;
import java.util.Map;

/**
 * The aim against one varied quantity, the others as found.
 *
 * @param key the quantity
 * @param unit its unit
 * @param value values of the quantity
 * @param aim the aim at each value
 * @param subcellMaPerCm2 subcell currents at each value, by name
 */
public record WhatIf(
    String key,
    String unit,
    List<Double> value,
    List<Double> aim,
    Map<String, List<Double>> subcellMaPerCm2) {}
