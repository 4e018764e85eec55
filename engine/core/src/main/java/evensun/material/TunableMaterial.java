package evensun.material;

import evensun.light.Constants;
import evensun.material.table.Bandgap;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An absorber whose bandgap is chosen; the wanted gap is met as {@link Bandgap} defines it, because
 * what moving and mixing curves miss it by is found beforehand and taken off.
 */
final class TunableMaterial implements Material {

  private static final double MESH_EV = 0.02;

  private final MaterialRecord record;
  private final Tuning tuning;
  private final GapCurves curves;
  private final List<MarkedRange> marked;
  private final List<MarkedRange> weak;
  private final double[] missEv;

  /** A range of the gap in which the numbers deserve a word. */
  record MarkedRange(double lowEv, double highEv, String what) {

    boolean holds(double bandgapEv) {
      return bandgapEv >= lowEv && bandgapEv < highEv;
    }
  }

  /**
   * A tunable absorber.
   *
   * @param marked ranges without a measured composition nearby
   * @param weak ranges in which an anchor absorbs less than its neighbours let expect
   * @param missEv by how much the curves miss the gap, from the lowest gap up in steps of 0.02 eV;
   *     found here when it is empty, which takes a while
   */
  TunableMaterial(
      MaterialRecord record,
      Tuning tuning,
      GapCurves curves,
      List<MarkedRange> marked,
      List<MarkedRange> weak,
      double[] missEv) {
    this.record = record;
    this.tuning = tuning;
    this.curves = curves;
    this.marked = List.copyOf(marked);
    this.weak = List.copyOf(weak);
    this.missEv = missEv.length == meshSize() ? missEv.clone() : missEv();
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
  public Filler on(double[] wavelengthNm) {
    Ranges.require(record, wavelengthNm);
    double[] energyEv = new double[wavelengthNm.length];
    for (int w = 0; w < energyEv.length; w++) {
      energyEv[w] = Constants.HC_EV_NM / wavelengthNm[w];
    }
    return new GapFiller(energyEv, RecordFindings.of(record, wavelengthNm));
  }

  @Override
  public List<Finding> findingsAt(double bandgapEv) {
    List<Finding> findings = new ArrayList<>();
    for (MarkedRange range : marked) {
      if (range.holds(bandgapEv)) {
        findings.add(new Finding("gap-estimated", Severity.WARNING, record.name(), range.what()));
      }
    }
    for (MarkedRange range : weak) {
      if (range.holds(bandgapEv)) {
        findings.add(new Finding("anchor-weak", Severity.WARNING, record.name(), range.what()));
      }
    }
    return findings;
  }

  private final class GapFiller implements Filler {

    private final double[] energyEv;
    private final List<Finding> findings;

    GapFiller(double[] energyEv, List<Finding> findings) {
      this.energyEv = energyEv;
      this.findings = List.copyOf(findings);
    }

    @Override
    public void fill(double bandgapEv, double[] n, double[] k) {
      curves.fill(bandgapEv - miss(bandgapEv), energyEv, n, k);
    }

    @Override
    public List<Finding> findings() {
      return findings;
    }
  }

  private int meshSize() {
    return (int) Math.ceil((tuning.highEv() - tuning.lowEv()) / MESH_EV) + 1;
  }

  /** By how much the curves miss the gap on the mesh; a fresh array. */
  double[] missEv() {
    double[] miss = new double[meshSize()];
    double[] energyEv = new double[1];
    double[] n = new double[1];
    double[] k = new double[1];
    for (int i = 0; i < miss.length; i++) {
      double wanted = tuning.lowEv() + i * MESH_EV;
      OptionalDouble got =
          Bandgap.of(
              ev -> {
                energyEv[0] = ev;
                curves.fill(wanted, energyEv, n, k);
                return 4e7 * Math.PI * k[0] * ev / Constants.HC_EV_NM;
              },
              wanted - 0.2,
              wanted + 0.35);
      miss[i] = got.orElse(wanted) - wanted;
    }
    return miss;
  }

  private double miss(double bandgapEv) {
    double position = (bandgapEv - tuning.lowEv()) / MESH_EV;
    int i = Math.min(Math.max((int) position, 0), missEv.length - 2);
    double t = Math.min(Math.max(position - i, 0), 1);
    return missEv[i] + t * (missEv[i + 1] - missEv[i]);
  }
}
