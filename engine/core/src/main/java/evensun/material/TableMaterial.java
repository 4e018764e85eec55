package evensun.material;

import evensun.material.table.Bandgap;
import evensun.material.table.OpticalTable;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A material whose n and k stand in a table. */
public final class TableMaterial implements Material {

  private final MaterialRecord record;
  private final OpticalTable table;
  private final OptionalDouble bandgapEv;
  private final boolean hold;
  private final List<Finding> said;

  private TableMaterial(
      MaterialRecord record,
      OpticalTable table,
      OptionalDouble bandgapEv,
      boolean hold,
      List<Finding> said) {
    this.said = List.copyOf(said);
    this.record = record;
    this.table = table;
    this.bandgapEv = bandgapEv;
    this.hold = hold;
  }

  /**
   * A material whose bandgap is that of its table.
   *
   * @param record what it is
   * @param table its n and k
   * @param hold whether the end values hold beyond the table
   */
  public static TableMaterial of(MaterialRecord record, OpticalTable table, boolean hold) {
    return new TableMaterial(record, table, Bandgap.of(table), hold, List.of());
  }

  /** A material whose bandgap is stated, or that has none. */
  public static TableMaterial of(
      MaterialRecord record, OpticalTable table, boolean hold, OptionalDouble bandgapEv) {
    return new TableMaterial(record, table, bandgapEv, hold, List.of());
  }

  /** The same material with findings that hold wherever it is used. */
  public TableMaterial withFindings(List<Finding> findings) {
    return new TableMaterial(record, table, bandgapEv, hold, findings);
  }

  @Override
  public MaterialRecord record() {
    return record;
  }

  /** Its n and k. */
  public OpticalTable table() {
    return table;
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
    List<Finding> findings = new ArrayList<>(said);
    findings.addAll(RecordFindings.of(record, wavelengthNm));
    double first = wavelengthNm[0];
    double last = wavelengthNm[wavelengthNm.length - 1];
    if (!table.covers(first, last)) {
      if (!hold) {
        throw new MaterialRangeException(
            Ranges.message(record.name(), table.fromNm(), table.toNm(), first, last),
            table.fromNm(),
            table.toNm());
      }
      findings.add(held(first, last));
    }
    double[] n = new double[wavelengthNm.length];
    double[] k = new double[wavelengthNm.length];
    for (int w = 0; w < n.length; w++) {
      n[w] = table.nAt(wavelengthNm[w]);
      k[w] = table.kAt(wavelengthNm[w]);
    }
    return new FixedFiller(n, k, findings);
  }

  private Finding held(double firstNm, double lastNm) {
    String ends =
        firstNm < table.fromNm() && lastNm > table.toNm()
            ? Ranges.nm(table.fromNm()) + " and " + Ranges.nm(table.toNm())
            : Ranges.nm(firstNm < table.fromNm() ? table.fromNm() : table.toNm());
    return new Finding(
        "table-held",
        Severity.WARNING,
        record.name(),
        "the data ends at "
            + ends
            + " and the grid goes on ("
            + Ranges.nm(firstNm)
            + " to "
            + Ranges.nm(lastNm)
            + "): the end values of n and k are held there, as asked");
  }
}
