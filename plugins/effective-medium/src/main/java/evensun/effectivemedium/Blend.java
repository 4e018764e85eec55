package evensun.effectivemedium;

import evensun.effectivemedium.kernel.HostedSpheres;
import evensun.effectivemedium.kernel.LossShares;
import evensun.effectivemedium.kernel.PairBruggeman;
import evensun.effectivemedium.kernel.Permittivity;
import evensun.effectivemedium.kernel.PowerMeans;
import evensun.effectivemedium.kernel.SetBruggeman;
import evensun.spi.Design;
import evensun.spi.MixingRule;
import java.util.Arrays;

/**
 * One set of components mixed in one or several proportions (slots: the slices of a graded layer);
 * recomputes only what changed. One thread at a time.
 */
final class Blend {

  private final MixingRule rule;
  private final int host;
  private final double depolarisationFactor;

  /** Rows of the components, [c][w]; of the caller, valid until the next design. */
  private final double[][] rowN;

  private final double[][] rowK;
  private final long[] rowRevision;
  private final double[][] epsRe;
  private final double[][] epsIm;
  private final double[][] rootRe;
  private final double[][] rootIm;
  private final double[] vacuumRe;
  private final double[] vacuumIm;
  private final double[] mixedRe;
  private final double[] mixedIm;
  private final SetBruggeman set;

  private final double[][] fraction;
  private final boolean[] stale;
  private final double[][] n;
  private final double[][] k;
  private final long[] revision;
  private final double[][][] share;

  /**
   * A blend with nothing in it yet.
   *
   * @param rule mixing rule
   * @param host component that is the host of Maxwell Garnett, else −1
   * @param depolarisationFactor in (0, 1)
   * @param components C
   * @param slots number of proportions
   * @param wavelengths W
   */
  Blend(
      MixingRule rule,
      int host,
      double depolarisationFactor,
      int components,
      int slots,
      int wavelengths) {
    this.rule = rule;
    this.host = host;
    this.depolarisationFactor = depolarisationFactor;
    boolean roots = rule == MixingRule.LOOYENGA;
    rowN = new double[components][];
    rowK = new double[components][];
    rowRevision = new long[components];
    epsRe = new double[components][wavelengths];
    epsIm = new double[components][wavelengths];
    rootRe = new double[roots ? components : 0][wavelengths];
    rootIm = new double[roots ? components : 0][wavelengths];
    vacuumRe = new double[wavelengths];
    vacuumIm = new double[wavelengths];
    Arrays.fill(vacuumRe, 1);
    set = new SetBruggeman(components, wavelengths);
    mixedRe = new double[wavelengths];
    mixedIm = new double[wavelengths];
    fraction = new double[slots][components];
    stale = new boolean[slots];
    n = new double[slots][wavelengths];
    k = new double[slots][wavelengths];
    revision = new long[slots];
    share = new double[slots][components][wavelengths];
    Arrays.fill(stale, true);
  }

  int slots() {
    return n.length;
  }

  /** [w] effective refractive index of a slot. */
  double[] n(int slot) {
    return n[slot];
  }

  /** [w] effective extinction coefficient of a slot. */
  double[] k(int slot) {
    return k[slot];
  }

  /** Changes with the rows of a slot. */
  long revision(int slot) {
    return revision[slot];
  }

  /** [w] share of a component in what a slot absorbs. */
  double[] share(int slot, int component) {
    return share[slot][component];
  }

  /** Volume fraction of a component in a slot as last mixed. */
  double fraction(int slot, int component) {
    return fraction[slot][component];
  }

  /** Sets the rows of a component; a revision of 0 counts as changed. */
  void component(int c, double[] newN, double[] newK, long newRevision) {
    rowN[c] = newN;
    rowK[c] = newK;
    if (newRevision != 0 && newRevision == rowRevision[c]) {
      return;
    }
    rowRevision[c] = newRevision;
    Permittivity.ofIndex(newN, newK, epsRe[c], epsIm[c]);
    if (rule == MixingRule.LOOYENGA) {
      PowerMeans.cubeRoots(epsRe[c], epsIm[c], rootRe[c], rootIm[c]);
    }
    Arrays.fill(stale, true);
  }

  /**
   * Mixes a slot, unless it is up to date.
   *
   * @param slot index of the proportion
   * @param fractions [c] volume fractions, at least 0, of sum 1
   */
  void mix(int slot, double[] fractions) {
    if (!stale[slot] && Arrays.equals(fractions, fraction[slot])) {
      return;
    }
    System.arraycopy(fractions, 0, fraction[slot], 0, fractions.length);
    if (permittivity(slot, fractions)) {
      Permittivity.toIndex(mixedRe, mixedIm, n[slot], k[slot]);
    }
    finish(slot);
  }

  private void finish(int slot) {
    LossShares.fill(epsRe, epsIm, fraction[slot], fieldFactor(), mixedRe, mixedIm, share[slot]);
    revision[slot] = Design.nextRevision();
    stale[slot] = false;
  }

  /** The component that the mixture consists of, or −1: then limits are exact to the last bit. */
  private int pure(double[] fractions) {
    int first = -1;
    for (int c = 0; c < fractions.length; c++) {
      if (fractions[c] > 0) {
        boolean same = first >= 0 && rowRevision[c] != 0 && rowRevision[c] == rowRevision[first];
        if (first >= 0 && !same) {
          return -1;
        }
        first = first < 0 ? c : first;
      }
    }
    return first;
  }

  /** Fills the mixed permittivity; false where it has written the index of the slot already. */
  private boolean permittivity(int slot, double[] f) {
    int pure = pure(f);
    if (pure >= 0) {
      System.arraycopy(rowN[pure], 0, n[slot], 0, n[slot].length);
      System.arraycopy(rowK[pure], 0, k[slot], 0, k[slot].length);
      Permittivity.ofIndex(n[slot], k[slot], mixedRe, mixedIm);
      return false;
    }
    switch (rule) {
      case BRUGGEMAN -> bruggeman(slot, f);
      case MAXWELL_GARNETT ->
          HostedSpheres.mix(epsRe, epsIm, f, epsRe[host], epsIm[host], mixedRe, mixedIm);
      case LORENTZ_LORENZ ->
          HostedSpheres.mix(epsRe, epsIm, f, vacuumRe, vacuumIm, mixedRe, mixedIm);
      case LOOYENGA -> {
        PowerMeans.mean(rootRe, rootIm, f, mixedRe, mixedIm);
        PowerMeans.cube(mixedRe, mixedIm);
      }
      case WIENER_PARALLEL -> PowerMeans.mean(epsRe, epsIm, f, mixedRe, mixedIm);
      case WIENER_SERIES -> PowerMeans.harmonic(epsRe, epsIm, f, mixedRe, mixedIm);
      case REFRACTIVE_INDEX -> {
        PowerMeans.mean(rowN, rowK, f, n[slot], k[slot]);
        Permittivity.ofIndex(n[slot], k[slot], mixedRe, mixedIm);
        return false;
      }
    }
    return true;
  }

  private void bruggeman(int slot, double[] f) {
    double d = (1 - depolarisationFactor) / depolarisationFactor;
    if (f.length == 2) {
      PairBruggeman.mix(rowN[0], rowK[0], rowN[1], rowK[1], f[1], d, mixedRe, mixedIm);
    } else {
      PowerMeans.mean(rowN, rowK, f, n[slot], k[slot]);
      Permittivity.ofIndex(n[slot], k[slot], mixedRe, mixedIm);
      set.mix(epsRe, epsIm, f, d, mixedRe, mixedIm);
    }
  }

  /** Depolarisation factor by which absorbed light is shared. */
  private double fieldFactor() {
    return switch (rule) {
      case WIENER_PARALLEL -> 0;
      case WIENER_SERIES -> 1;
      default -> depolarisationFactor;
    };
  }
}
