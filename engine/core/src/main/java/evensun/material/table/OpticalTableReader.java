package evensun.material.table;

import evensun.data.DecimalText;
import evensun.data.TableFormatException;
import evensun.data.TextTable;
import evensun.data.TextTableReader;
import evensun.light.Constants;
import evensun.material.table.TableHints.Extinction;
import evensun.material.table.TableHints.WavelengthUnit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.TreeSet;

/** Reads n and k from text in whatever form it is written, and says how it understood it. */
public final class OpticalTableReader {

  private static final double LARGEST_PLAUSIBLE_K = 30;

  private OpticalTableReader() {}

  /**
   * Reads one file: wavelength (or energy) with n and k or n and α in one block, with n alone, or
   * with n in a first and k in a second block.
   *
   * @throws TableFormatException when it cannot be understood
   */
  public static RawTable read(String text, TableHints hints) {
    TextTable table = TextTableReader.read(text);
    List<String> said = new ArrayList<>(List.of(form(table)));
    List<TextTable.Block> blocks = table.blocks();
    if (blocks.size() == 2 && blocks.get(0).columnCount() == 2) {
      said.add("n stands in the first block, the extinction in the second");
      return joined(
          curve(blocks.get(0), hints, said), extinction(blocks.get(1), hints, said), said);
    }
    if (blocks.size() > 1) {
      throw new TableFormatException(
          blocks.get(1).rows().get(0).line(),
          "begins a new block of numbers; give one material in a file");
    }
    return single(blocks.get(0), hints, said);
  }

  /** Reads n from one file and k (or α) from another; they are joined where both are known. */
  public static RawTable read(String indexText, String extinctionText, TableHints hints) {
    TextTable index = TextTableReader.read(indexText);
    TextTable extinction = TextTableReader.read(extinctionText);
    List<String> said = new ArrayList<>(List.of("index: " + form(index)));
    List<Sample> n = curve(index.blocks().get(0), hints, said);
    said.add("extinction: " + form(extinction));
    return joined(n, extinction(extinction.blocks().get(0), hints, said), said);
  }

  private static String form(TextTable table) {
    int rows = table.blocks().stream().mapToInt(block -> block.rows().size()).sum();
    return rows
        + " rows, numbers parted by "
        + table.separator()
        + (table.decimalComma() ? ", with decimal comma" : "");
  }

  private static RawTable single(TextTable.Block block, TableHints hints, List<String> said) {
    int x = Columns.wavelength(block);
    int index = Columns.index(block, x);
    int last = Columns.extinction(block, x, index);
    WavelengthUnit unit = unit(block, x, hints, said);
    if (last < 0) {
      said.add("no extinction is given: k is taken as 0 everywhere");
    }
    Extinction kind = last < 0 ? Extinction.K : kind(block, last, hints, said);
    List<RawTable.Point> points = new ArrayList<>();
    for (TextTable.Row row : block.rows()) {
      double nm = nm(row.values().get(x), unit);
      double k = last < 0 ? 0 : kind.k(row.values().get(last), nm);
      points.add(new RawTable.Point(row.line(), nm, row.values().get(index), k));
    }
    return new RawTable(rising(points, said), said);
  }

  private static List<RawTable.Point> rising(List<RawTable.Point> points, List<String> said) {
    boolean falling = points.size() > 1;
    for (int i = 1; i < points.size(); i++) {
      falling &= points.get(i).wavelengthNm() < points.get(i - 1).wavelengthNm();
    }
    if (falling) {
      said.add("wavelengths fall throughout: turned round");
      List<RawTable.Point> turned = new ArrayList<>(points);
      Collections.reverse(turned);
      return turned;
    }
    return points;
  }

  private record Sample(double nm, double value) {}

  private static List<Sample> curve(TextTable.Block block, TableHints hints, List<String> said) {
    WavelengthUnit unit = unit(block, 0, hints, said);
    return block.rows().stream()
        .map(row -> new Sample(nm(row.values().get(0), unit), row.values().get(1)))
        .sorted((a, b) -> Double.compare(a.nm(), b.nm()))
        .toList();
  }

  private static List<Sample> extinction(
      TextTable.Block block, TableHints hints, List<String> said) {
    Extinction kind = kind(block, 1, hints, said);
    return curve(block, hints, said).stream()
        .map(sample -> new Sample(sample.nm(), kind.k(sample.value(), sample.nm())))
        .toList();
  }

  private static RawTable joined(List<Sample> n, List<Sample> k, List<String> said) {
    double from = Math.max(n.get(0).nm(), k.get(0).nm());
    double to = Math.min(n.get(n.size() - 1).nm(), k.get(k.size() - 1).nm());
    if (!(to > from)) {
      throw new TableFormatException(0, "n and the extinction have no wavelengths in common");
    }
    TreeSet<Double> nodes = new TreeSet<>();
    n.forEach(sample -> nodes.add(sample.nm()));
    k.forEach(sample -> nodes.add(sample.nm()));
    said.add(String.format("joined where both are known: %s to %s nm", shown(from), shown(to)));
    List<RawTable.Point> points =
        nodes.subSet(from, true, to, true).stream()
            .map(nm -> new RawTable.Point(0, nm, at(n, nm), at(k, nm)))
            .toList();
    return new RawTable(points, said);
  }

  private static double at(List<Sample> samples, double nm) {
    int i = 0;
    while (i + 2 < samples.size() && samples.get(i + 1).nm() < nm) {
      i++;
    }
    Sample a = samples.get(i);
    Sample b = samples.get(i + 1);
    return a.value() + (nm - a.nm()) / (b.nm() - a.nm()) * (b.value() - a.value());
  }

  private static double nm(double value, WavelengthUnit unit) {
    return switch (unit) {
      case NM -> value;
      case UM -> Math.rint(value * 1e9) / 1e6;
      case EV -> Constants.HC_EV_NM / value;
    };
  }

  private static WavelengthUnit unit(
      TextTable.Block block, int column, TableHints hints, List<String> said) {
    if (hints.wavelengthUnit().isPresent()) {
      said.add("first column in " + hints.wavelengthUnit().get().key() + ", as told");
      return hints.wavelengthUnit().get();
    }
    WavelengthUnit named = Columns.unit(block.head(column));
    if (named != null) {
      refuseTiny(block, column, named);
      said.add("wavelengths in " + named.key() + ", as the header says");
      return named;
    }
    WavelengthUnit guessed = guessed(block.column(column), block.rows().get(0).line());
    said.add("wavelengths in " + guessed.key() + ", judged by their size: no header says it");
    return guessed;
  }

  /** No table for a solar cell ends below 20 nm; one that seems to is in micrometres. */
  private static void refuseTiny(TextTable.Block block, int column, WavelengthUnit unit) {
    double low = Arrays.stream(block.column(column)).min().orElseThrow();
    double high = Arrays.stream(block.column(column)).max().orElseThrow();
    if (unit == WavelengthUnit.NM && high < 20) {
      throw new TableFormatException(
          block.rows().get(0).line(),
          "the wavelengths (%s to %s nm) look like micrometres; name um in the header, or write wavelengthUnit: um in the scenario"
              .formatted(shown(low), shown(high)));
    }
  }

  /** Above 100 only nanometres make sense; µm and eV overlap between 0.45 and 3.2. */
  private static WavelengthUnit guessed(double[] values, int line) {
    double low = Arrays.stream(values).min().orElseThrow();
    double high = Arrays.stream(values).max().orElseThrow();
    if (high > 100) {
      return WavelengthUnit.NM;
    }
    boolean um = low < 0.45;
    boolean ev = high > 3.2;
    if (um == ev) {
      throw new TableFormatException(
          line,
          "does not say whether its first column is in um or eV; write wavelengthUnit: um or eV in"
              + " the scenario (--wavelength-unit on the command line), or name it in a header line");
    }
    return um ? WavelengthUnit.UM : WavelengthUnit.EV;
  }

  private static Extinction kind(
      TextTable.Block block, int column, TableHints hints, List<String> said) {
    if (hints.extinction().isPresent()) {
      said.add("extinction as " + hints.extinction().get().key() + ", as told");
      return hints.extinction().get();
    }
    Extinction named = Columns.kind(block.head(column));
    if (named != null) {
      said.add("extinction as " + named.key() + ", as the header says");
      return named;
    }
    double largest = Arrays.stream(block.column(column)).max().orElseThrow();
    if (largest > LARGEST_PLAUSIBLE_K) {
      said.add("extinction as alpha-per-cm, judged by its size (up to " + shown(largest) + ")");
      return Extinction.ALPHA_PER_CM;
    }
    said.add("extinction as k: no header says otherwise");
    return Extinction.K;
  }

  private static String shown(double value) {
    return DecimalText.of(value, 6);
  }
}
