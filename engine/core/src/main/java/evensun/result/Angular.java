package evensun.result;

import java.util.List;
import java.util.Map;

/**
 * Angle dependence, the irradiance on the cell plane kept.
 *
 * @param angleDeg angles of incidence in degrees
 * @param reflectedMaPerCm2 reflected current per angle
 * @param subcellMaPerCm2 photocurrent per angle by subcell
 */
public record Angular(
    List<Double> angleDeg,
    List<Double> reflectedMaPerCm2,
    Map<String, List<Double>> subcellMaPerCm2) {}
