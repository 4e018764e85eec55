package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * Derivatives of what happens in packets by the thicknesses of their layers, for the waves from one
 * side.
 *
 * <p>Let ρ_j = w_j/u_j and F_j = P_j s_j the flux into layer j. All fluxes below layer l change by
 * one factor when d_l changes, −(α_l + 2 Re(h_l ν_l)); those down to layer l depend on it through
 * ρ_l alone. With h = 2iκ u w, ν = (∂ ln u_near/∂ρ)/u² and γ = (∂Φ/∂ρ)/u², where Φ holds the
 * weighted fluxes down to the layer, both go down the packet by the same factor p(1 − r²) per
 * layer:
 *
 * <pre>
 * ν′ = ν p(1 − r²) + r/(u u′)
 * γ′ = γ p(1 − r²) + m′ σ′,   σ = P (∂s/∂w)/u − 2F ν
 * ∂Φ/∂d = Re(h γ) − (Σ of m F below)·(α + 2 Re(h ν))
 * </pre>
 *
 * where m = weight of the layer less that of the one before. All but γ is common to all sums.
 */
final class PacketGradient {

  /** [j][w] flux into medium j, next to a weighted layer; at a far medium, the transmittance. */
  final double[][] flux;

  private final Waves waves;
  private final int wavelengths;
  private final double[][] inverseRe; // [j] 1/u
  private final double[][] inverseIm;
  private final double[][] downRe; // [j] p(1 - r²), from layer j to the next
  private final double[][] downIm;
  private final double[][] nuRe; // [j]
  private final double[][] nuIm;
  private final double[][] hRe; // [j]
  private final double[][] hIm;
  private final double[][] sigmaRe; // [j]
  private final double[][] sigmaIm;
  private final double[][] loss; // [j] α + 2 Re(h ν)
  private final double[][] change; // [j] m of the sum at hand
  private final boolean[] changes; // [j] whether m is not zero
  private final double[][] rest; // [j] Σ of m F below layer j
  private final boolean[] rests; // [j] whether that is not zero
  private final double[] aRe;
  private final double[] aIm;
  private final double[] bRe;
  private final double[] bIm;
  private final double[] gammaRe;
  private final double[] gammaIm;
  private final double[] row;

  PacketGradient(Waves waves, int layers, int wavelengths) {
    this.waves = waves;
    this.wavelengths = wavelengths;
    flux = rows(layers);
    inverseRe = rows(layers);
    inverseIm = rows(layers);
    downRe = rows(layers);
    downIm = rows(layers);
    nuRe = rows(layers);
    nuIm = rows(layers);
    hRe = rows(layers);
    hIm = rows(layers);
    sigmaRe = rows(layers);
    sigmaIm = rows(layers);
    loss = rows(layers);
    change = rows(layers);
    changes = new boolean[layers + 2];
    rest = rows(layers);
    rests = new boolean[layers + 2];
    aRe = new double[wavelengths];
    aIm = new double[wavelengths];
    bRe = new double[wavelengths];
    bIm = new double[wavelengths];
    gammaRe = new double[wavelengths];
    gammaIm = new double[wavelengths];
    row = new double[wavelengths];
  }

  private double[][] rows(int layers) {
    return new double[layers + 2][wavelengths];
  }

  /**
   * Finds what is common to all sums, after the waves were solved.
   *
   * @param weighted [j] whether any sum weighs the absorptance of layer j
   */
  void prepare(Optics optics, int near, int far, boolean[] weighted) {
    int step = waves.step;
    invert(near);
    Arrays.fill(nuRe[near], 0);
    Arrays.fill(nuIm[near], 0);
    for (int j = near; j != far; j += step) {
      int slot = waves.slot(optics, j);
      down(optics, j, j == near, slot);
      int next = j + step;
      if (next != far) {
        invert(next);
        nu(optics, j, next, slot);
        thickness(optics, next);
        if (weighted[next] || (j != near && weighted[j])) {
          sigma(optics, near, next);
        }
      }
    }
    System.arraycopy(waves.transmittance[near], 0, flux[far], 0, wavelengths);
  }

  private void invert(int j) {
    GradientLoops.reciprocal(waves.uRe[j], waves.uIm[j], inverseRe[j], inverseIm[j], wavelengths);
  }

  private void down(Optics optics, int j, boolean near, int slot) {
    double[] re = optics.faces.crossedRe[slot];
    double[] im = optics.faces.crossedIm[slot];
    if (near) {
      System.arraycopy(re, 0, downRe[j], 0, wavelengths);
      System.arraycopy(im, 0, downIm[j], 0, wavelengths);
    } else {
      int l = optics.layout.layer[j];
      WaveLoops.multiply(
          re, im, optics.phases.re[l], optics.phases.im[l], downRe[j], downIm[j], wavelengths);
    }
  }

  private void nu(Optics optics, int j, int next, int slot) {
    double[] rRe = optics.faces.re[slot];
    double[] rIm = optics.faces.im[slot];
    WaveLoops.multiply(
        inverseRe[j], inverseIm[j], inverseRe[next], inverseIm[next], aRe, aIm, wavelengths);
    WaveLoops.multiply(rRe, rIm, aRe, aIm, nuRe[next], nuIm[next], wavelengths);
    WaveLoops.addProduct(
        nuRe[j], nuIm[j], downRe[j], downIm[j], nuRe[next], nuIm[next], wavelengths);
  }

  private void thickness(Optics optics, int j) {
    int x = optics.media.place(optics.layout, j);
    WaveLoops.multiply(
        waves.uRe[j], waves.uIm[j], waves.wRe[j], waves.wIm[j], aRe, aIm, wavelengths);
    GradientLoops.byThickness(
        optics.media.turnsPerNm[x],
        optics.media.decayPerNm[x],
        aRe,
        aIm,
        hRe[j],
        hIm[j],
        wavelengths);
    GradientLoops.loss(
        optics.media.decayPerNm[x], hRe[j], hIm[j], nuRe[j], nuIm[j], loss[j], wavelengths);
  }

  private void sigma(Optics optics, int near, int j) {
    int x = optics.media.place(optics.layout, j);
    double[] re = optics.eta.re[x];
    double[] im = optics.eta.im[x];
    WaveLoops.product(waves.norm[near], waves.through[j], row, wavelengths);
    WaveLoops.product(row, waves.flux[j], flux[j], wavelengths);
    GradientLoops.straightByWave(row, re, waves.wRe[j], waves.wIm[j], aRe, aIm, wavelengths);
    GradientLoops.addMixedByWave(
        row, im, waves.cross, waves.uRe[j], waves.uIm[j], aRe, aIm, wavelengths);
    WaveLoops.multiply(aRe, aIm, inverseRe[j], inverseIm[j], sigmaRe[j], sigmaIm[j], wavelengths);
    GradientLoops.subtractTwice(flux[j], nuRe[j], nuIm[j], sigmaRe[j], sigmaIm[j], wavelengths);
  }

  /**
   * Adds the derivatives of one weighted sum over this packet.
   *
   * @param weight [j][w] weights of the absorptance of layers, null rows are zero
   * @param ofTransmittance [w] weight of the transmittance, or null
   * @param ofReflectance [w] weight of the reflectance, or null together with the next
   * @param ofMixed [w] weight of the mixed term, or null
   * @param into [offset + l] derivative by the thickness of layer l, per nm
   */
  void add(
      Optics optics,
      int near,
      int far,
      double[][] weight,
      double[] ofTransmittance,
      double[] ofReflectance,
      double[] ofMixed,
      double[] into,
      int offset) {
    changes(near, far, weight, ofTransmittance);
    rests(near, far);
    boolean active = ofReflectance != null;
    if (active) {
      reflectionSeed(optics, near, ofReflectance, ofMixed);
    }
    int step = waves.step;
    for (int j = near + step; j != far; j += step) {
      if (active) {
        WaveLoops.multiply(
            gammaRe, gammaIm, downRe[j - step], downIm[j - step], gammaRe, gammaIm, wavelengths);
      }
      if (changes[j]) {
        seed(j, active);
        active = true;
      }
      into[offset + optics.layout.layer[j]] += derivative(j, active);
    }
  }

  private void seed(int j, boolean active) {
    if (active) {
      GradientLoops.addScaled(change[j], sigmaRe[j], sigmaIm[j], gammaRe, gammaIm, wavelengths);
    } else {
      GradientLoops.scale(change[j], sigmaRe[j], sigmaIm[j], gammaRe, gammaIm, wavelengths);
    }
  }

  private double derivative(int j, boolean active) {
    if (active) {
      GradientLoops.realProduct(hRe[j], hIm[j], gammaRe, gammaIm, row, wavelengths);
    } else if (rests[j]) {
      Arrays.fill(row, 0);
    } else {
      return 0;
    }
    if (rests[j]) {
      GradientLoops.subtractProduct(rest[j], loss[j], row, wavelengths);
    }
    return RowSums.total(row);
  }

  /** m: what the flux into each medium weighs. */
  private void changes(int near, int far, double[][] weight, double[] ofTransmittance) {
    int step = waves.step;
    double[] before = null;
    for (int j = near + step; ; j += step) {
      double[] here = j == far ? ofTransmittance : weight[j];
      changes[j] = here != null || before != null;
      if (changes[j]) {
        difference(here, before, change[j]);
      }
      if (j == far) {
        return;
      }
      before = here;
    }
  }

  private void difference(double[] here, double[] before, double[] out) {
    if (before == null) {
      System.arraycopy(here, 0, out, 0, wavelengths);
    } else if (here == null) {
      GradientLoops.negative(before, out, wavelengths);
    } else {
      GradientLoops.difference(here, before, out, wavelengths);
    }
  }

  private void rests(int near, int far) {
    int step = waves.step;
    rests[far] = false;
    for (int j = far - step; j != near; j -= step) {
      int next = j + step;
      rests[j] = rests[next] || changes[next];
      if (rests[next] && changes[next]) {
        GradientLoops.multiplyAdd(change[next], flux[next], rest[next], rest[j], wavelengths);
      } else if (changes[next]) {
        WaveLoops.product(change[next], flux[next], rest[j], wavelengths);
      } else if (rests[next]) {
        System.arraycopy(rest[next], 0, rest[j], 0, wavelengths);
      }
    }
  }

  private void reflectionSeed(Optics optics, int near, double[] ofReflectance, double[] ofMixed) {
    int x = optics.media.place(optics.layout, near);
    double[] iRe = inverseRe[near];
    double[] iIm = inverseIm[near];
    WaveLoops.multiply(waves.wRe[near], waves.wIm[near], iRe, iIm, aRe, aIm, wavelengths);
    GradientLoops.reflectionSeed(
        ofReflectance,
        ofMixed,
        waves.cross,
        optics.eta.im[x],
        optics.eta.carried[x],
        aRe,
        aIm,
        bRe,
        bIm,
        wavelengths);
    WaveLoops.multiply(iRe, iIm, iRe, iIm, aRe, aIm, wavelengths);
    WaveLoops.multiply(aRe, aIm, bRe, bIm, gammaRe, gammaIm, wavelengths);
  }
}
