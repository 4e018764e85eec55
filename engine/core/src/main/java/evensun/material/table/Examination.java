package evensun.material.table;

import evensun.data.DecimalText;
import evensun.light.Constants;
import evensun.light.Spectrum;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/** What is doubtful about a table of n and k, worst first, with what it is worth and a remedy. */
public final class Examination {

  /** Thickness of the film by which light lost to a false absorption is judged, in nm. */
  private static final double FILM_NM = 500;

  /** An extinction coefficient that does not fall below this is a floor. */
  private static final double FLOOR_K = 1e-3;

  /** Below the gap by this much the edge itself no longer counts, in eV. */
  private static final double FLOOR_BELOW_EV = 0.10;

  /** Beyond, lattices absorb, in nm. */
  private static final double FLOOR_TO_NM = 2500;

  private static final double KK_WARNING = 0.05;
  private static final double COARSE_N = 0.03;
  private static final double COARSE_K = 0.03;

  /** Below this, absorption bends n by less than {@link #RISE_N}. */
  private static final double CLEAR_K = 0.003;

  private static final double RISE_N = 0.03;

  private final String name;
  private final Spectrum spectrum;
  private final List<Finding> findings = new ArrayList<>();

  private Examination(String name, Spectrum spectrum) {
    this.name = name;
    this.spectrum = spectrum;
  }

  /**
   * Examines the points as they stand in a file.
   *
   * @param name of the material or file
   * @param raw the points
   * @param spectrum light by which currents are judged
   * @return findings; none when all is well so far
   */
  public static List<Finding> form(String name, RawTable raw, Spectrum spectrum) {
    Examination examination = new Examination(name, spectrum);
    examination.form(raw.points());
    return List.copyOf(examination.findings);
  }

  /**
   * Examines a table whose form is in order.
   *
   * @param name of the material or file
   * @param table the table
   * @param spectrum light by which currents are judged
   * @param gridFromNm first wavelength it is needed at, in nm
   * @param gridToNm last wavelength it is needed at, in nm
   */
  public static List<Finding> content(
      String name, OpticalTable table, Spectrum spectrum, double gridFromNm, double gridToNm) {
    Examination examination = new Examination(name, spectrum);
    examination.range(table, gridFromNm, gridToNm);
    examination.floor(table, gridToNm);
    examination.consistency(table);
    examination.dispersion(table);
    examination.sampling(table);
    examination.jumps(table);
    examination.lowIndex(table);
    return List.copyOf(examination.findings);
  }

  private void form(List<RawTable.Point> points) {
    double last = 0;
    for (int i = 0; i < points.size(); i++) {
      RawTable.Point point = points.get(i);
      if (impossible(point) && (i == 0 || !impossible(points.get(i - 1)))) {
        impossibleFrom(points, i);
      }
      if (point.wavelengthNm() == last) {
        findings.add(
            new Finding(
                "table-doubled-wavelength",
                Severity.SERIOUS,
                name,
                text("line %d: %s stands twice; keep one of the two", point.line(), nm(last))));
      } else if (point.wavelengthNm() < last || !(point.wavelengthNm() > 0)) {
        findings.add(
            new Finding(
                "table-unsorted",
                Severity.SERIOUS,
                name,
                text(
                    "line %d: %s follows %s; sort the lines by wavelength",
                    point.line(), nm(point.wavelengthNm()), nm(last))));
      }
      last = point.wavelengthNm();
    }
  }

  private static boolean impossible(RawTable.Point point) {
    return !(point.n() > 0)
        || !(point.k() >= 0)
        || Double.isInfinite(point.n())
        || Double.isInfinite(point.k());
  }

  /** One finding for impossible values that follow each other. */
  private void impossibleFrom(List<RawTable.Point> points, int first) {
    int last = first;
    while (last + 1 < points.size() && impossible(points.get(last + 1))) {
      last++;
    }
    RawTable.Point point = points.get(first);
    String more =
        last == first
            ? ""
            : text(
                " (and %d more up to %s, line %d)",
                last - first, nm(points.get(last).wavelengthNm()), points.get(last).line());
    findings.add(
        new Finding(
            "table-impossible-value",
            Severity.SERIOUS,
            name,
            text(
                "line %d: n = %s, k = %s at %s%s; n must be greater than 0 and k at least 0: remove"
                    + " the line or correct it",
                point.line(), point.n(), point.k(), nm(point.wavelengthNm()), more)));
  }

  private void range(OpticalTable table, double gridFromNm, double gridToNm) {
    double missing =
        spectrum.photonCurrentMaPerCm2(gridFromNm, Math.max(gridFromNm, table.fromNm()))
            + spectrum.photonCurrentMaPerCm2(Math.min(gridToNm, table.toNm()), gridToNm);
    if (!table.covers(gridFromNm, gridToNm)) {
      findings.add(
          new Finding(
              "table-range",
              Severity.WARNING,
              name,
              text(
                  "covers %s to %s and leaves %.2f mA cm⁻² of the light between %s and %s uncovered: write"
                      + " extrapolate: hold, or a shorter grid",
                  nm(table.fromNm()), nm(table.toNm()), missing, nm(gridFromNm), nm(gridToNm))));
    }
  }

  /** Absorption below the gap that does not vanish towards the end of the table, as tails do. */
  private void floor(OpticalTable table, double gridToNm) {
    OptionalDouble gap = Bandgap.of(table);
    double toNm = Math.min(table.toNm(), FLOOR_TO_NM);
    double fromNm =
        gap.isPresent() ? Constants.HC_EV_NM / (gap.getAsDouble() - FLOOR_BELOW_EV) : toNm;
    double lastNm = Math.min(toNm, gridToNm);
    double least = least(table, toNm - (toNm - fromNm) / 3, toNm);
    if (fromNm >= lastNm || !(least > FLOOR_K)) {
      return;
    }
    double current = 0;
    for (double nm = fromNm; nm + 1 <= lastNm; nm++) {
      double absorbed = 1 - Math.exp(-table.alphaPerCmAt(nm + 0.5) * FILM_NM * 1e-7);
      current += absorbed * spectrum.photonCurrentMaPerCm2(nm, nm + 1);
    }
    findings.add(
        new Finding(
            "table-floor-below-gap",
            Severity.WARNING,
            name,
            text(
                "below the gap of %.3f eV k does not vanish but stays at %.2g and more up to %s; from"
                    + " %s to %s one pass of %s books %.2f mA cm⁻² as absorbed: an instrument's floor,"
                    + " unless you know better; write clean: urbach",
                gap.getAsDouble(), least, nm(toNm), nm(fromNm), nm(lastNm), nm(FILM_NM), current)));
  }

  private static double least(OpticalTable table, double fromNm, double toNm) {
    double least = Double.POSITIVE_INFINITY;
    for (double nm = fromNm; nm <= toNm; nm++) {
      least = Math.min(least, table.kAt(nm));
    }
    return least;
  }

  private void consistency(OpticalTable table) {
    KramersKronig.of(table)
        .filter(residual -> residual.rms() > KK_WARNING)
        .ifPresent(
            residual ->
                findings.add(
                    new Finding(
                        "table-kramers-kronig",
                        Severity.WARNING,
                        name,
                        text(
                            "n and k do not belong together: %.2f in n (root mean square) cannot be"
                                + " explained by any absorption outside the table, most (%.2f) near %s;"
                                + " check that both come from one film and one fit",
                            residual.rms(), residual.largest(), nm(residual.atNm())))));
  }

  /**
   * Where nothing absorbs, n falls with the wavelength: absorption at shorter and at longer waves
   * both make it so (Kramers–Kronig).
   */
  private void dispersion(OpticalTable table) {
    double[] nm = table.wavelengthNm();
    double[] n = table.n();
    double[] k = table.k();
    int lowest = 0;
    int from = 0;
    int to = 0;
    for (int i = 0; i < nm.length; i++) {
      if (k[i] > CLEAR_K || k[Math.max(i - 1, 0)] > CLEAR_K || n[i] < n[lowest]) {
        lowest = i;
      }
      if (n[i] - n[lowest] > n[to] - n[from]) {
        from = lowest;
        to = i;
      }
    }
    if (n[to] - n[from] > RISE_N) {
      findings.add(
          new Finding(
              "table-kramers-kronig",
              Severity.WARNING,
              name,
              text(
                  "n rises by %.2f from %s to %s although k stays below %s there: no absorption"
                      + " anywhere makes it so; check the columns and the fit",
                  n[to] - n[from], nm(nm[from]), nm(nm[to]), CLEAR_K)));
    }
  }

  /** A point that the straight line between its neighbours misses by much. */
  private void sampling(OpticalTable table) {
    double[] nm = table.wavelengthNm();
    double[] n = table.n();
    double[] k = table.k();
    double worst = 0;
    int at = 0;
    for (int i = 1; i + 1 < nm.length; i++) {
      double t = (nm[i] - nm[i - 1]) / (nm[i + 1] - nm[i - 1]);
      double missN = Math.abs(n[i - 1] + t * (n[i + 1] - n[i - 1]) - n[i]) / COARSE_N;
      double missK = Math.abs(k[i - 1] + t * (k[i + 1] - k[i - 1]) - k[i]) / COARSE_K;
      // A straight line misses a parabola between two points by a quarter of this.
      double miss = 0.25 * Math.max(missN, missK);
      if (miss > worst && nm[i + 1] - nm[i - 1] > 4 && nm[i] > 280 && nm[i] < 2000) {
        worst = miss;
        at = i;
      }
    }
    if (worst > 1) {
      findings.add(
          new Finding(
              "table-coarse",
              Severity.NOTE,
              name,
              text(
                  "the points near %s (%s apart) are far for the curve between them: straight lines miss it"
                      + " by about %.2g in n or k; add points there",
                  nm(nm[at]), nm(0.5 * (nm[at + 1] - nm[at - 1])), worst * COARSE_N)));
    }
  }

  /** A step between neighbours that is far above those around it. */
  private void jumps(OpticalTable table) {
    double[] nm = table.wavelengthNm();
    double[] n = table.n();
    double[] k = table.k();
    for (int i = 2; i + 2 < nm.length; i++) {
      boolean jump = jump(nm, n, i) || jump(nm, k, i);
      if (jump) {
        findings.add(
            new Finding(
                "table-jump",
                Severity.NOTE,
                name,
                text(
                    "n or k jumps between %s and %s; two measurements joined there, or a wrong digit?",
                    nm(nm[i - 1]), nm(nm[i]))));
        return;
      }
    }
  }

  private static boolean jump(double[] nm, double[] y, int i) {
    double step = Math.abs(y[i] - y[i - 1]);
    double before = Math.abs(y[i - 1] - y[i - 2]) / (nm[i - 1] - nm[i - 2]);
    double after = Math.abs(y[i + 1] - y[i]) / (nm[i + 1] - nm[i]);
    double usual = Math.max(before, after) * (nm[i] - nm[i - 1]);
    return step > 0.05 && step > 8 * usual + 0.02;
  }

  private void lowIndex(OpticalTable table) {
    double[] nm = table.wavelengthNm();
    for (double at : nm) {
      if (table.nAt(at) < 1 && table.kAt(at) < 0.3) {
        findings.add(
            new Finding(
                "table-low-index",
                Severity.NOTE,
                name,
                text(
                    "n is %.3f at %s with little absorption: right near the plasma edge of a conductor,"
                        + " surprising elsewhere; are the columns in the right order?",
                    table.nAt(at), nm(at))));
        return;
      }
    }
  }

  private static String text(String message, Object... values) {
    return String.format(Locale.ROOT, message, values);
  }

  private static String nm(double nm) {
    return DecimalText.of(nm, 5) + " nm";
  }
}
