package evensun.material;

import evensun.light.Constants;
import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.ForouhiBloomer;
import evensun.material.dispersion.Term;
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
  private final OptionalDouble bandgapEv;

  private ModelMaterial(MaterialRecord record, Dispersion dispersion, OptionalDouble bandgapEv) {
    this.record = record;
    this.dispersion = dispersion;
    this.bandgapEv = bandgapEv;
  }

  /** A material of a formula; its record says over which wavelengths the formula holds. */
  public static ModelMaterial of(MaterialRecord record, Dispersion dispersion) {
    return of(
        record, dispersion, Bandgap.of(ev -> alphaPerCm(dispersion, ev), LOWEST_EV, HIGHEST_EV));
  }

  /** A material whose bandgap is stated, or that has none. */
  public static ModelMaterial of(
      MaterialRecord record, Dispersion dispersion, OptionalDouble bandgapEv) {
    return new ModelMaterial(record, dispersion, bandgapEv);
  }

  private static double alphaPerCm(Dispersion dispersion, double ev) {
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
    return bandgapEv;
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
    if (leaks()) {
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

  private boolean leaks() {
    for (Term term : dispersion.terms()) {
      if (term instanceof ForouhiBloomer) {
        return true;
      }
    }
    return false;
  }
}
