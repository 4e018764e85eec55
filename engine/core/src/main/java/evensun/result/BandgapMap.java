package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Detailed-balance efficiency over the bandgaps of several junctions.
 *
 * @param optimum the best gaps on the mesh
 * @param ridgeFromPercent efficiency from which a point counts as equally good: 99 % of the best
 * @param ridge the best partner for each gap of the last varied junction, where it is that good
 * @param conditions under what the map holds
 * @param axes names of the varied junctions that span the map, the light meets the first one first;
 *     one for a curve
 * @param bestOver junction whose gap is the best one at each point of the map, or null
 * @param axisEv gaps of the mesh in eV for each axis, rising
 * @param efficiencyPercent [first axis][second axis] efficiency in percent; null where the gaps
 *     stand in the wrong order for the light; a curve has one column
 * @param innerEv gap of {@code bestOver} at each point, or null without one
 */
public record BandgapMap(
    Point optimum,
    double ridgeFromPercent,
    List<Point> ridge,
    Conditions conditions,
    List<String> axes,
    @Nullable String bestOver,
    List<List<Double>> axisEv,
    List<List<@Nullable Double>> efficiencyPercent,
    @Nullable List<List<@Nullable Double>> innerEv) {

  /**
   * One choice of gaps.
   *
   * @param gapsEv gaps in the order the light meets them, eV
   * @param efficiencyPercent efficiency in percent
   */
  public record Point(List<Double> gapsEv, double efficiencyPercent) {}

  /**
   * Under what a map holds.
   *
   * @param spectrum name of the spectrum
   * @param irradianceWPerM2 its irradiance in W m⁻², before concentration
   * @param concentrationSuns factor on the light
   * @param temperatureK cell temperature in K
   * @param connection series, independent or parallel
   * @param junctions names of the junctions, the light meets the first one first
   * @param fixedEv gap of each junction that is fixed, null where it varies
   * @param externalRadiativeEfficiency of each junction
   * @param luminescentCouplingFraction of each junction to the next
   * @param absorptance of each junction above its gap
   * @param stepEv mesh in eV
   */
  public record Conditions(
      String spectrum,
      double irradianceWPerM2,
      double concentrationSuns,
      double temperatureK,
      String connection,
      List<String> junctions,
      List<@Nullable Double> fixedEv,
      List<Double> externalRadiativeEfficiency,
      List<Double> luminescentCouplingFraction,
      List<Double> absorptance,
      double stepEv) {}
}
