package evensun.measured;

import evensun.data.TableFormatException;
import evensun.data.TextTable;
import evensun.data.TextTable.Block;
import evensun.data.TextTable.Row;
import evensun.data.TextTableReader;
import evensun.light.Constants;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/**
 * Reads a curve of two columns as instruments write it: wavelength in nm or µm, or photon energy in
 * eV; then percent or a fraction. The head line decides where it says so, otherwise the numbers.
 */
public final class MeasuredReader {

  private static final double HIGHEST_FRACTION = 1.1;
  private static final double LOWEST_FRACTION = -0.05;

  private MeasuredReader() {}

  /** What the first column holds. */
  private enum Axis {
    NM("wavelength in nm") {
      @Override
      double nm(double value) {
        return value;
      }
    },
    UM("wavelength in µm") {
      @Override
      double nm(double value) {
        return value * 1000;
      }
    },
    EV("photon energy in eV") {
      @Override
      double nm(double value) {
        return Constants.HC_EV_NM / value;
      }
    };

    private final String words;

    Axis(String words) {
      this.words = words;
    }

    abstract double nm(double value);
  }

  /**
   * Reads a curve.
   *
   * @param text content of the file
   * @throws TableFormatException when it is no such curve, or can be read in more than one way
   */
  public static MeasuredCurve read(String text) {
    TextTable table = TextTableReader.read(text);
    Block block = table.blocks().get(0);
    if (block.rows().size() < 2) {
      throw new TableFormatException(
          block.rows().get(0).line(), "a curve needs at least two points but has one");
    }
    Axis axis = axis(block);
    boolean percent = isPercent(block);
    List<double[]> points = new ArrayList<>();
    for (Row row : block.rows()) {
      points.add(point(row, axis, percent));
    }
    points.sort(Comparator.comparingDouble(p -> p[0]));
    refuseDoubles(points);
    return new MeasuredCurve(
        points.stream().mapToDouble(p -> p[0]).toArray(),
        points.stream().mapToDouble(p -> p[1]).toArray(),
        (percent ? "percent" : "fraction") + " against " + axis.words);
  }

  private static Axis axis(Block block) {
    String head = block.head(0);
    if (head.contains("ev") || head.contains("energy")) {
      return Axis.EV;
    }
    if (head.contains("um") || head.contains("µm") || head.contains("μm")) {
      return Axis.UM;
    }
    if (head.contains("nm")) {
      return Axis.NM;
    }
    double low = Double.POSITIVE_INFINITY;
    double high = 0;
    for (double value : block.column(0)) {
      low = Math.min(low, value);
      high = Math.max(high, value);
    }
    if (low >= 100) {
      return Axis.NM;
    }
    if (low >= 0.15 && low < 0.6 && high <= 2.6) {
      return Axis.UM;
    }
    if (low >= 0.6 && high > 2.6 && high <= 8) {
      return Axis.EV;
    }
    throw new TableFormatException(
        block.rows().get(0).line(),
        String.format(
            Locale.ROOT,
            "cannot tell whether %s to %s are nm, µm or eV; write a head line, such as"
                + " wavelength_nm,reflectance_percent",
            low,
            high));
  }

  private static boolean isPercent(Block block) {
    String head = block.head(1);
    if (head.contains("%") || head.contains("percent")) {
      return true;
    }
    if (head.contains("fraction")) {
      return false;
    }
    double high = 0;
    for (double value : block.column(1)) {
      high = Math.max(high, value);
    }
    return high > 1.5;
  }

  private static double[] point(Row row, Axis axis, boolean percent) {
    double x = row.values().get(0);
    double fraction = row.values().get(1) / (percent ? 100 : 1);
    if (!(x > 0) || Double.isInfinite(x)) {
      throw new TableFormatException(row.line(), axis.words + " must be above 0 but was " + x);
    }
    if (!(fraction >= LOWEST_FRACTION && fraction <= HIGHEST_FRACTION)) {
      throw new TableFormatException(
          row.line(),
          String.format(
              Locale.ROOT,
              "a measured value must be between 0 and %s but was %s",
              percent ? "100 %" : "1",
              row.values().get(1)));
    }
    return new double[] {axis.nm(x), fraction};
  }

  private static void refuseDoubles(List<double[]> points) {
    for (int i = 1; i < points.size(); i++) {
      if (points.get(i)[0] == points.get(i - 1)[0]) {
        throw new TableFormatException(
            1, String.format(Locale.ROOT, "%.6g nm is measured twice; keep one", points.get(i)[0]));
      }
    }
  }
}
