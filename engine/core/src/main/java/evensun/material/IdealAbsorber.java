package evensun.material;

import evensun.light.Constants;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An absorber of a chosen constant index whose absorption coefficient steps from zero to a constant
 * at the gap; in the bin that holds the gap it is weighed by the part of the bin above the gap, so
 * that currents are continuous in the gap.
 */
public final class IdealAbsorber implements Material {

  private final MaterialRecord record;
  private final Tuning tuning;
  private final double index;
  private final double absorptionPerCm;

  private IdealAbsorber(
      MaterialRecord record, Tuning tuning, double index, double absorptionPerCm) {
    this.record = record;
    this.tuning = tuning;
    this.index = index;
    this.absorptionPerCm = absorptionPerCm;
  }

  /**
   * An ideal absorber.
   *
   * @param record what it is
   * @param tuning range of its gap
   * @param index n, greater than 0
   * @param absorptionPerCm absorption coefficient above the gap in cm⁻¹, at least 0
   */
  public static IdealAbsorber of(
      MaterialRecord record, Tuning tuning, double index, double absorptionPerCm) {
    if (!(index > 0 && index < 20)) {
      throw new IllegalArgumentException("refractiveIndex must be in (0, 20) but was " + index);
    }
    if (!(absorptionPerCm >= 0 && absorptionPerCm <= 1e7)) {
      throw new IllegalArgumentException(
          "absorptionPerCm must be in [0, 1e7] per cm but was " + absorptionPerCm);
    }
    return new IdealAbsorber(record, tuning, index, absorptionPerCm);
  }

  @Override
  public MaterialRecord record() {
    return record;
  }

  @Override
  public Optional<Tuning> tuning() {
    return Optional.of(tuning);
  }

  @Override
  public OptionalDouble bandgapEv() {
    return OptionalDouble.of(tuning.defaultEv());
  }

  @Override
  public List<Finding> findingsAt(double bandgapEv) {
    return List.of(
        new Finding(
            "ideal-absorber",
            Severity.NOTE,
            record.name(),
            "a step of absorption with a constant index is no real material: its currents are an"
                + " upper estimate"));
  }

  @Override
  public Filler on(double[] wavelengthNm) {
    double[] edgesNm = new double[wavelengthNm.length + 1];
    edgesNm[0] = wavelengthNm[0];
    edgesNm[wavelengthNm.length] = wavelengthNm[wavelengthNm.length - 1];
    for (int w = 1; w < wavelengthNm.length; w++) {
      edgesNm[w] = 0.5 * (wavelengthNm[w - 1] + wavelengthNm[w]);
    }
    double[] grid = wavelengthNm.clone();
    return (bandgapEv, n, k) -> fill(bandgapEv, grid, edgesNm, n, k);
  }

  private void fill(double bandgapEv, double[] gridNm, double[] edgesNm, double[] n, double[] k) {
    double gapNm = Constants.HC_EV_NM / bandgapEv;
    for (int w = 0; w < gridNm.length; w++) {
      double width = edgesNm[w + 1] - edgesNm[w];
      double above = width > 0 ? (gapNm - edgesNm[w]) / width : gapNm - gridNm[w];
      n[w] = index;
      k[w] = Math.min(Math.max(above, 0), 1) * absorptionPerCm * gridNm[w] / (4e7 * Math.PI);
    }
  }
}
