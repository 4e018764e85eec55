package evensun.device.gaps;

import evensun.device.BlackBody;
import evensun.light.Constants;

/** Photon current and emission above each gap that a map visits, by junction. */
final class GapTables {

  /** [junction][choice] gaps in eV, rising. */
  final double[][] gapEv;

  /** [junction][choice] photon current of the light above the gap, mA cm⁻². */
  final double[][] lightAbove;

  /** [junction][choice] radiative saturation current, mA cm⁻². */
  final double[][] saturation;

  /** [junction] absorptance above the gap. */
  final double[] absorptance;

  GapTables(GapOptions options) {
    int count = options.junctions().size();
    gapEv = new double[count][];
    lightAbove = new double[count][];
    saturation = new double[count][];
    absorptance = new double[count];
    for (int j = 0; j < count; j++) {
      GapOptions.Junction junction = options.junctions().get(j);
      absorptance[j] = junction.absorptance();
      gapEv[j] =
          junction.fixedEv().isPresent()
              ? new double[] {junction.fixedEv().getAsDouble()}
              : options.meshEv();
      fill(options, j);
    }
  }

  private void fill(GapOptions options, int j) {
    int choices = gapEv[j].length;
    lightAbove[j] = new double[choices];
    saturation[j] = new double[choices];
    double fromNm = options.spectrum().fromNm();
    for (int i = 0; i < choices; i++) {
      double edgeNm = Constants.HC_EV_NM / gapEv[j][i];
      lightAbove[j][i] =
          edgeNm > fromNm
              ? options.device().suns() * options.spectrum().photonCurrentMaPerCm2(fromNm, edgeNm)
              : 0;
      saturation[j][i] =
          absorptance[j] * BlackBody.aboveMaPerCm2(gapEv[j][i], options.device().temperatureK());
    }
  }

  /**
   * Photocurrents and saturation currents of falling gaps.
   *
   * @param choice [junction] index into the junction's gaps
   * @param current [junction] out: mA cm⁻²
   * @param dark [junction] out: mA cm⁻²
   */
  void fill(int[] choice, double[] current, double[] dark) {
    for (int j = 0; j < choice.length; j++) {
      double reaching = 0;
      double above = 0;
      for (int b = 0; b <= j; b++) {
        double upTo = lightAbove[b][choice[b]];
        reaching += (upTo - above) * passed(b, j);
        above = upTo;
      }
      current[j] = absorptance[j] * reaching;
      dark[j] = saturation[j][choice[j]];
    }
  }

  /** What the junctions from {@code first} up to {@code last}, that one left out, let through. */
  private double passed(int first, int last) {
    double share = 1;
    for (int j = first; j < last; j++) {
      share *= 1 - absorptance[j];
    }
    return share;
  }
}
