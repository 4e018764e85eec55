package evensun.raytrace;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** A table of the library, read for tests; its header names its source. */
final class Table {

  private final List<double[]> rows = new ArrayList<>();

  private Table(String resource) {
    try (BufferedReader reader =
        new BufferedReader(
            new InputStreamReader(
                Table.class.getResourceAsStream(resource), StandardCharsets.UTF_8))) {
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (!line.isBlank() && "0123456789".indexOf(line.charAt(0)) >= 0) {
          String[] parts = line.split(",", -1);
          double[] row = new double[parts.length];
          for (int i = 0; i < parts.length; i++) {
            row[i] = Double.parseDouble(parts[i]);
          }
          rows.add(row);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Table material(String name) {
    return new Table("/evensun/material/table/" + name + ".csv");
  }

  static Table light() {
    return new Table("/evensun/light/am1.5g.csv");
  }

  /** A column at a wavelength, linear between its points. */
  double at(double nm, int column) {
    int i = 1;
    while (i < rows.size() - 1 && rows.get(i)[0] < nm) {
      i++;
    }
    double[] a = rows.get(i - 1);
    double[] b = rows.get(i);
    return a[column] + (b[column] - a[column]) * (nm - a[0]) / (b[0] - a[0]);
  }

  /**
   * Photon current of an irradiance between two wavelengths, mA cm⁻²: q/(hc) ∫ E λ dλ, by Simpson's
   * rule between the points of the table, where E λ is a parabola and the rule exact.
   */
  double photonsMaPerCm2(double fromNm, double toNm) {
    double sum = 0;
    for (int i = 1; i < rows.size(); i++) {
      double a = Math.max(fromNm, rows.get(i - 1)[0]);
      double b = Math.min(toNm, rows.get(i)[0]);
      if (a < b) {
        double m = (a + b) / 2;
        sum += (b - a) / 6 * (a * at(a, 1) + 4 * m * at(m, 1) + b * at(b, 1));
      }
    }
    // W m⁻² nm over hc/q = 1239.841984 V nm (CODATA 2019), A m⁻² to mA cm⁻².
    return sum / 1239.841984 / 10;
  }
}
