package evensun.material;

import evensun.light.Constants;
import evensun.material.table.Bandgap;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An absorber whose bandgap is chosen: the measured permittivities of one or more anchors are moved
 * along the energy axis to the wanted gap and mixed between neighbours, n following by
 * Kramers–Kronig ({@link EdgeShape}).
 *
 * <p>The share of the upper anchor rises from 0 at the lower anchor's gap to 1 at its own as 3x² −
 * 2x³, so that n and k are smooth in the gap; at an anchor's gap its measured table is met. Beyond
 * the outermost anchors the nearest one is moved alone.
 */
final class MovedEdgeMaterial implements Material {

  private static final double MESH_EV = 0.02;

  private final MaterialRecord record;
  private final Tuning tuning;
  private final List<EdgeShape> anchors;
  private final List<MarkedRange> marked;
  private final double[] correctionEv;

  /** A range of the gap in which the numbers deserve a word. */
  record MarkedRange(double lowEv, double highEv, String what) {}

  MovedEdgeMaterial(
      MaterialRecord record, Tuning tuning, List<EdgeShape> anchors, List<MarkedRange> marked) {
    this.record = record;
    this.tuning = tuning;
    this.anchors = List.copyOf(anchors);
    this.marked = List.copyOf(marked);
    this.correctionEv = corrections();
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
    double first = wavelengthNm[0];
    double last = wavelengthNm[wavelengthNm.length - 1];
    if (first < record.fromNm() || last > record.toNm()) {
      throw new MaterialRangeException(
          Ranges.message(record.name(), record.fromNm(), record.toNm(), first, last),
          record.fromNm(),
          record.toNm());
    }
    double[] energyEv = new double[wavelengthNm.length];
    for (int w = 0; w < energyEv.length; w++) {
      energyEv[w] = Constants.HC_EV_NM / wavelengthNm[w];
    }
    return new EdgeFiller(energyEv, RecordFindings.of(record, wavelengthNm));
  }

  @Override
  public List<Finding> findingsAt(double bandgapEv) {
    return marked.stream()
        .filter(m -> bandgapEv >= m.lowEv() && bandgapEv < m.highEv())
        .map(m -> new Finding("gap-estimated", Severity.WARNING, record.name(), m.what()))
        .toList();
  }

  private final class EdgeFiller implements Filler {

    private final double[] energyEv;
    private final List<Finding> findings;

    EdgeFiller(double[] energyEv, List<Finding> findings) {
      this.energyEv = energyEv;
      this.findings = List.copyOf(findings);
    }

    @Override
    public void fill(double bandgapEv, double[] n, double[] k) {
      double gapEv = bandgapEv - correction(bandgapEv);
      int lower = lower(bandgapEv);
      EdgeShape a = anchors.get(lower);
      EdgeShape b = anchors.get(Math.min(lower + 1, anchors.size() - 1));
      double share = share(a, b, bandgapEv);
      for (int w = 0; w < energyEv.length; w++) {
        double real = real(a, gapEv, energyEv[w]);
        double imaginary = imaginary(a, gapEv, energyEv[w]);
        if (share > 0) {
          real += share * (real(b, gapEv, energyEv[w]) - real);
          imaginary += share * (imaginary(b, gapEv, energyEv[w]) - imaginary);
        }
        double modulus = Math.sqrt(real * real + imaginary * imaginary);
        n[w] = Math.sqrt(0.5 * (modulus + real));
        k[w] = 0.5 * imaginary / n[w];
      }
    }

    @Override
    public List<Finding> findings() {
      return findings;
    }
  }

  private static double real(EdgeShape shape, double gapEv, double ev) {
    double shift = gapEv - shape.bandgapEv();
    return shape.resonantAt(ev - shift) + shape.antiresonantAt(ev + shift);
  }

  private static double imaginary(EdgeShape shape, double gapEv, double ev) {
    return shape.imaginaryAt(ev - (gapEv - shape.bandgapEv()));
  }

  private int lower(double bandgapEv) {
    int lower = 0;
    while (lower + 1 < anchors.size() && anchors.get(lower + 1).bandgapEv() <= bandgapEv) {
      lower++;
    }
    return lower;
  }

  private static double share(EdgeShape a, EdgeShape b, double bandgapEv) {
    double width = b.bandgapEv() - a.bandgapEv();
    double x = width > 0 ? (bandgapEv - a.bandgapEv()) / width : 0;
    double inside = Math.min(Math.max(x, 0), 1);
    return inside * inside * (3 - 2 * inside);
  }

  /** By how much the gap of the moved and mixed table misses the wanted one, per mesh gap. */
  private double[] corrections() {
    double[] missEv = new double[(int) Math.ceil((tuning.highEv() - tuning.lowEv()) / MESH_EV) + 1];
    for (int i = 0; i < missEv.length; i++) {
      double wanted = tuning.lowEv() + i * MESH_EV;
      double got =
          Bandgap.of(ev -> alphaPerCm(wanted, ev), wanted - 0.2, wanted + 0.35).orElse(wanted);
      missEv[i] = got - wanted;
    }
    return missEv;
  }

  private double alphaPerCm(double gapEv, double ev) {
    int lower = lower(gapEv);
    EdgeShape a = anchors.get(lower);
    EdgeShape b = anchors.get(Math.min(lower + 1, anchors.size() - 1));
    double share = share(a, b, gapEv);
    double real = (1 - share) * real(a, gapEv, ev) + share * real(b, gapEv, ev);
    double imaginary = (1 - share) * imaginary(a, gapEv, ev) + share * imaginary(b, gapEv, ev);
    double n = Math.sqrt(0.5 * (Math.hypot(real, imaginary) + real));
    return 4e7 * Math.PI * 0.5 * imaginary / n * ev / Constants.HC_EV_NM;
  }

  private double correction(double bandgapEv) {
    double position = (bandgapEv - tuning.lowEv()) / MESH_EV;
    int i = Math.min(Math.max((int) position, 0), correctionEv.length - 2);
    double t = Math.min(Math.max(position - i, 0), 1);
    return correctionEv[i] + t * (correctionEv[i + 1] - correctionEv[i]);
  }
}
