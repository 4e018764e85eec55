package evensun.evaluation;

/**
 * The numbers of a bench's design that aims and limits are made of. Belongs to one thread; reading
 * allocates nothing.
 */
public final class Reading {

  private final Bench bench;
  private final double[] sums;
  private final double[] photocurrentMaPerCm2;
  private final double[] bandgapEv;

  /** What a bench says; nothing until it is taken. */
  public Reading(Bench bench) {
    this.bench = bench;
    int subcells = bench.model().stack().subcells().size();
    sums = new double[bench.sumCount()];
    photocurrentMaPerCm2 = new double[subcells];
    bandgapEv = new double[subcells];
  }

  /**
   * Evaluates the present design of the bench.
   *
   * @throws evensun.spi.EvaluationFailed when it cannot be evaluated
   */
  public Reading take() {
    bench.currents(sums);
    return filled();
  }

  /**
   * Evaluates it with derivatives.
   *
   * @param byThickness [i*L + l] derivative of each number of {@link #sums} by the thickness of
   *     each layer, per nm
   */
  Reading take(double[] byThickness) {
    bench.currentsAndGradient(sums, byThickness);
    return filled();
  }

  private Reading filled() {
    System.arraycopy(sums, 0, photocurrentMaPerCm2, 0, photocurrentMaPerCm2.length);
    bench.subcellGaps(bandgapEv);
    return this;
  }

  /** The photocurrents, then the sums that the bench was made with. */
  double[] sums() {
    return sums;
  }

  /** Writes one of {@link #sums}, to see what follows from it. */
  void set(int index, double value) {
    sums[index] = value;
    if (index < photocurrentMaPerCm2.length) {
      photocurrentMaPerCm2[index] = value;
    }
  }

  /** Photocurrents, [subcell] mA cm⁻²; not to be written. */
  public double[] photocurrentMaPerCm2() {
    return photocurrentMaPerCm2;
  }

  /** Bandgaps, [subcell] eV, 0 where an absorber has none; not to be written. */
  public double[] bandgapEv() {
    return bandgapEv;
  }

  /** Thicknesses, [layer] nm; not to be written. */
  public double[] thicknessNm() {
    return bench.design().thicknessNm;
  }

  /** A sum that the bench was made with. */
  public double sum(LightSum sum) {
    return sums[bench.indexOf(sum)];
  }
}
