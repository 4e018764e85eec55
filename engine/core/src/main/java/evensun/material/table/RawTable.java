package evensun.material.table;

import java.util.List;

/**
 * n and k as a file gave them, nothing checked yet but the form.
 *
 * @param points in the order of the file, turned round where wavelengths fell throughout
 * @param understood how the file was read, a sentence each
 */
public record RawTable(List<Point> points, List<String> understood) {

  public RawTable {
    points = List.copyOf(points);
    understood = List.copyOf(understood);
  }

  /**
   * A point.
   *
   * @param line line in the file, from 1; 0 where it was interpolated between two files
   * @param wavelengthNm in nm
   * @param n refractive index
   * @param k extinction coefficient
   */
  public record Point(int line, double wavelengthNm, double n, double k) {}

  /**
   * The checked table.
   *
   * @throws evensun.data.TableFormatException at the first point that breaks a rule
   */
  public OpticalTable table() {
    double last = 0;
    for (Point point : points) {
      if (!(point.wavelengthNm() > 0) || Double.isInfinite(point.wavelengthNm())) {
        throw fault(point, "wavelength must be greater than 0 nm", point.wavelengthNm());
      }
      if (point.wavelengthNm() == last) {
        throw fault(point, "the same wavelength stands twice", last);
      }
      if (point.wavelengthNm() < last) {
        throw fault(point, "wavelengths must rise or fall throughout", point.wavelengthNm());
      }
      if (!(point.n() > 0) || Double.isInfinite(point.n())) {
        throw fault(point, "n must be a finite number greater than 0", point.n());
      }
      if (!(point.k() >= 0) || Double.isInfinite(point.k())) {
        throw fault(point, "k must be a finite number of at least 0", point.k());
      }
      last = point.wavelengthNm();
    }
    return OpticalTable.of(
        points.stream().mapToDouble(Point::wavelengthNm).toArray(),
        points.stream().mapToDouble(Point::n).toArray(),
        points.stream().mapToDouble(Point::k).toArray());
  }

  private static evensun.data.TableFormatException fault(Point at, String rule, double value) {
    return new evensun.data.TableFormatException(at.line(), rule + " but was " + value);
  }
}
