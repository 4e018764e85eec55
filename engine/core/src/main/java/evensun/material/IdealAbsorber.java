package evensun.material;

import evensun.light.Constants;
import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/**
 * An absorber of a chosen constant index whose absorption coefficient steps from zero to a constant
 * at the gap; in the bin that holds the gap one pass through the layer absorbs as if only the
 * photons above the gap were there to absorb, so that currents are smooth in the gap and do not
 * depend on the step of the grid.
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
    return new StepFiller(wavelengthNm, WavelengthGrid.edgesNm(wavelengthNm), Optional.empty());
  }

  @Override
  public Filler on(double[] wavelengthNm, Spectrum light) {
    return new StepFiller(wavelengthNm, WavelengthGrid.edgesNm(wavelengthNm), Optional.of(light));
  }

  private final class StepFiller implements Filler {

    private final double[] gridNm;
    private final double[] edgesNm;
    private final @Nullable Spectrum light;

    StepFiller(double[] gridNm, double[] edgesNm, Optional<Spectrum> light) {
      this.gridNm = gridNm.clone();
      this.edgesNm = edgesNm;
      this.light = light.orElse(null);
    }

    @Override
    public void fill(double bandgapEv, double[] n, double[] k) {
      fill(bandgapEv, 0, n, k);
    }

    @Override
    public void fill(double bandgapEv, double thicknessNm, double[] n, double[] k) {
      double gapNm = Constants.HC_EV_NM / bandgapEv;
      for (int w = 0; w < gridNm.length; w++) {
        n[w] = index;
        k[w] = weighed(above(w, gapNm), thicknessNm) * gridNm[w] / (4e7 * Math.PI);
      }
    }

    @Override
    public boolean followsThickness() {
      return true;
    }

    /** Part of the photons of a bin above the gap; of its width where there are none. */
    private double above(int w, double gapNm) {
      double from = edgesNm[w];
      double to = edgesNm[w + 1];
      if (gapNm <= from || gapNm >= to) {
        return gridNm[w] <= gapNm ? 1 : 0;
      }
      double all = light == null ? 0 : light.photonCurrentMaPerCm2(from, to);
      return all > 0
          ? light.photonCurrentMaPerCm2(from, gapNm) / all
          : (gapNm - from) / (to - from);
    }
  }

  /**
   * Absorption coefficient with which one pass absorbs the given part of what the full step would:
   * −ln(1 − f (1 − exp(−αd)))/d, in cm⁻¹.
   */
  private double weighed(double part, double thicknessNm) {
    double depth = absorptionPerCm * thicknessNm * 1e-7;
    return part <= 0 || part >= 1 || !(depth > 0)
        ? part * absorptionPerCm
        : -Math.log1p(part * Math.expm1(-depth)) / (thicknessNm * 1e-7);
  }
}
