package evensun.material;

import evensun.light.Constants;
import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.ForouhiBloomer;
import evensun.material.table.Bandgap;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A material given by a sum of dispersion terms. */
public final class ModelMaterial implements Material {

  private static final double LOWEST_EV = 0.5;
  private static final double HIGHEST_EV = 6.0;

  private final MaterialRecord record;
  private final Dispersion dispersion;

  private ModelMaterial(MaterialRecord record, Dispersion dispersion) {
    this.record = record;
    this.dispersion = dispersion;
  }

  /** A material of a formula; its record says over which wavelengths the formula holds. */
  public static ModelMaterial of(MaterialRecord record, Dispersion dispersion) {
    return new ModelMaterial(record, dispersion);
  }

  private double alphaPerCm(double ev) {
    double[] index = new double[2];
    dispersion.index(ev, index);
    return 4e7 * Math.PI * index[1] * ev / Constants.HC_EV_NM;
  }

  @Override
  public MaterialRecord record() {
    return record;
  }

  /** Its formula. */
  public Dispersion dispersion() {
    return dispersion;
  }

  @Override
  public Optional<Tuning> tuning() {
    return Optional.empty();
  }

  @Override
  public OptionalDouble bandgapEv() {
    return Bandgap.of(this::alphaPerCm, LOWEST_EV, HIGHEST_EV);
  }

  @Override
  public Filler on(double[] wavelengthNm) {
    Ranges.require(record, wavelengthNm);
    double[] n = new double[wavelengthNm.length];
    double[] k = new double[wavelengthNm.length];
    double[] index = new double[2];
    for (int w = 0; w < n.length; w++) {
      dispersion.index(Constants.HC_EV_NM / wavelengthNm[w], index);
      n[w] = index[0];
      k[w] = index[1];
    }
    return new FixedFiller(n, k, findings(wavelengthNm, n));
  }

  private List<Finding> findings(double[] wavelengthNm, double[] n) {
    List<Finding> findings = new ArrayList<>(RecordFindings.of(record, wavelengthNm));
    for (int w = 0; w < n.length; w++) {
      if (!(n[w] > 0)) {
        findings.add(
            new Finding(
                "model-without-index",
                Severity.SERIOUS,
                record.name(),
                "the model gives no refractive index greater than 0 at "
                    + Ranges.nm(wavelengthNm[w])
                    + ": its parameters do not describe a medium there"));
        break;
      }
    }
    boolean leaks = dispersion.terms().stream().anyMatch(ForouhiBloomer.class::isInstance);
    if (leaks) {
      findings.add(
          new Finding(
              "model-absorbs-below-gap",
              Severity.WARNING,
              record.name(),
              "the Forouhi-Bloomer formula rises again below its gap: it books absorption where"
                  + " the material is transparent; tauc-lorentz does not"));
    }
    return findings;
  }
}
