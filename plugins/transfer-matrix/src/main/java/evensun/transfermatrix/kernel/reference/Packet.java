package evensun.transfermatrix.kernel.reference;

/**
 * Coherent layers between two thick media, lit with unit intensity from one of them.
 *
 * <p>The ratio ρ of the wave that travels back to the wave that travels on is carried from the far
 * side to the near one, the wave itself from the near side to the far one; both only ever shrink.
 * The flux through a face is Re η (|u|² − |w|²) + 2 Im η Im(w u*), over Re η of the near medium.
 */
final class Packet {

  /** Amplitude reflected into the near medium. */
  final Complex reflected;

  /** Power reflected. */
  final double reflectance;

  /** Flux into the far medium. */
  final double transmittance;

  /**
   * −2 (Im η/Re η) Im r: what the two waves in an absorbing near medium share; 1 = R + M + flux in.
   */
  final double mixed;

  private final int step;
  private final Complex[] onward; // [j] wave on at the near face of layer j
  private final Complex[] ratio; // [j] back over on, at the near face of layer j
  private final double[] flux; // [j] through the near face of medium j

  /** From thick medium {@code near} to thick medium {@code far}, in either direction. */
  Packet(Slabs slabs, int near, int far) {
    step = far > near ? 1 : -1;
    int media = slabs.layerCount + 2;
    onward = new Complex[media];
    ratio = new Complex[media];
    flux = new double[media];
    ratio[far] = Complex.ZERO;
    for (int j = far - step; j != near; j -= step) {
      ratio[j] = phase(slabs, j).times(phase(slabs, j)).times(seenBelow(slabs, j));
    }
    reflected = seenBelow(slabs, near);
    Complex eta = slabs.admittance[near];
    double norm = slabs.carried(near);
    reflectance = reflected.squared();
    mixed = -2 * eta.im() / norm * reflected.im();
    Complex wave = Complex.ONE;
    for (int j = near; j != far; j += step) {
      wave = onward(slabs, j, wave);
      onward[j + step] = wave;
      flux[j + step] = flux(slabs.admittance[j + step], wave, wave.times(ratio[j + step])) / norm;
    }
    transmittance = flux[far];
  }

  private static Complex phase(Slabs slabs, int j) {
    return slabs.thick(j) ? Complex.ONE : slabs.wavePerNm[j].times(slabs.thicknessNm[j]).expI();
  }

  private Complex fresnel(Slabs slabs, int j) {
    Complex here = slabs.admittance[j];
    Complex next = slabs.admittance[j + step];
    return here.minus(next).over(here.plus(next));
  }

  /** Back over on at the far face of medium j. */
  private Complex seenBelow(Slabs slabs, int j) {
    Complex r = fresnel(slabs, j);
    Complex below = ratio[j + step];
    return r.plus(below).over(Complex.ONE.plus(r.times(below)));
  }

  /** The wave on at the near face of the next medium, from that at the near face of medium j. */
  private Complex onward(Slabs slabs, int j, Complex wave) {
    Complex here = slabs.admittance[j];
    Complex next = slabs.admittance[j + step];
    Complex entering = here.times(2).over(here.plus(next));
    Complex round = Complex.ONE.plus(fresnel(slabs, j).times(ratio[j + step]));
    return wave.times(phase(slabs, j)).times(entering).over(round);
  }

  private static double flux(Complex eta, Complex on, Complex back) {
    return eta.re() * (on.squared() - back.squared())
        + 2 * eta.im() * back.times(on.conjugate()).im();
  }

  /** Share absorbed in layer j of this packet. */
  double absorptance(int j) {
    return flux[j] - flux[j + step];
  }

  /**
   * Share absorbed per nm in layer j: −dS/dz of the two waves, in closed form (Pettersson, Roman
   * &amp; Inganäs, J. Appl. Phys. 86, 487 (1999), here for both polarisations).
   *
   * @param fromNearFaceNm depth in nm from the face the light meets first
   */
  double absorbedPerNm(Slabs slabs, int near, int j, double fromNearFaceNm) {
    double rest = slabs.thicknessNm[j] - fromNearFaceNm;
    Complex wave = slabs.wavePerNm[j];
    Complex eta = slabs.admittance[j];
    Complex on = onward[j].times(wave.times(fromNearFaceNm).expI());
    Complex back =
        onward[j].times(phase(slabs, j)).times(seenBelow(slabs, j)).times(wave.times(rest).expI());
    double both = 2 * wave.im() * eta.re() * (on.squared() + back.squared());
    double crossed = 4 * wave.re() * eta.im() * back.times(on.conjugate()).re();
    return (both + crossed) / slabs.carried(near);
  }
}
