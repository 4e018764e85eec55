package evensun.material;

/** n and k of an absorber whose bandgap is chosen. */
interface GapCurves {

  /**
   * Writes n and k; allocates nothing.
   *
   * @param gapEv bandgap in eV
   * @param energyEv [w] photon energies in eV
   * @param n [w] out
   * @param k [w] out
   */
  void fill(double gapEv, double[] energyEv, double[] n, double[] k);
}
