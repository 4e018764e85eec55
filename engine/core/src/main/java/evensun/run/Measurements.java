package evensun.run;

import evensun.data.TableFormatException;
import evensun.measured.Comparison;
import evensun.measured.MeasuredCurve;
import evensun.measured.MeasuredReader;
import evensun.result.Measured;
import evensun.result.Outcome;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.MeasuredSpec;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** The measured curves of a scenario, laid over what the model says. Nothing is fitted. */
final class Measurements {

  private record Entry(MeasuredSpec spec, MeasuredCurve curve) {}

  private final List<Entry> entries = new ArrayList<>();

  private Measurements() {}

  /**
   * Reads every curve.
   *
   * @throws InputException with everything that is wrong with them
   */
  static Measurements read(Scenario scenario, InputFiles files) {
    Measurements measurements = new Measurements();
    List<Fault> faults = new ArrayList<>();
    for (MeasuredSpec spec : scenario.measured()) {
      try {
        MeasuredCurve curve = MeasuredReader.read(files.text(spec.path(), spec.place()));
        double fromNm = scenario.grid().fromNm();
        double toNm = scenario.grid().toNm();
        if (curve.toNm() < fromNm || curve.fromNm() > toNm) {
          faults.add(new Fault(spec.place(), beside(spec, curve, fromNm, toNm)));
        }
        measurements.entries.add(new Entry(spec, curve));
      } catch (TableFormatException e) {
        faults.add(new Fault(new Place(spec.path(), e.line(), 1, ""), e.getMessage()));
      } catch (InputException e) {
        faults.addAll(e.faults());
      }
    }
    if (!faults.isEmpty()) {
      throw new InputException(faults);
    }
    return measurements;
  }

  private static String beside(MeasuredSpec spec, MeasuredCurve curve, double fromNm, double toNm) {
    return String.format(
        Locale.ROOT,
        "\"%s\", read as %s, runs from %.6g to %.6g nm and misses the grid from %.6g to %.6g nm",
        spec.path(),
        curve.readAs(),
        curve.fromNm(),
        curve.toNm(),
        fromNm,
        toNm);
  }

  /**
   * Compares every curve with an outcome, and says the result as findings.
   *
   * @param asDrawn the stack as drawn
   * @return null when there is nothing measured
   */
  @Nullable List<Measured> against(Outcome asDrawn, Findings findings) {
    if (entries.isEmpty()) {
      return null;
    }
    List<Measured> compared = new ArrayList<>();
    for (Entry entry : entries) {
      compared.add(compare(entry, asDrawn, findings));
    }
    return compared;
  }

  private static Measured compare(Entry entry, Outcome outcome, Findings findings) {
    Spectral spectral = outcome.spectral();
    MeasuredCurve curve = entry.curve;
    double[] gridNm = array(spectral.wavelengthNm());
    boolean currents = outcome.incidentMaPerCm2() != null;
    double[] photons = currents ? array(spectral.incidentMaPerCm2()) : new double[gridNm.length];
    Comparison comparison;
    try {
      comparison = Comparison.of(curve, gridNm, photons, predicted(entry.spec, outcome));
    } catch (IllegalArgumentException e) {
      throw new InputException(entry.spec.place(), e.getMessage());
    }
    findings.add(finding(entry, comparison, currents));
    return new Measured(
        entry.spec.isReflectance() ? null : entry.spec.subcell(),
        entry.spec.path(),
        curve.readAs(),
        java.util.stream.IntStream.range(0, curve.size()).mapToObj(curve::wavelengthNm).toList(),
        java.util.stream.IntStream.range(0, curve.size()).mapToObj(curve::fraction).toList(),
        comparison.fromNm(),
        comparison.toNm(),
        comparison.rmsDifference(),
        currents ? comparison.measuredMaPerCm2() : null,
        currents ? comparison.predictedMaPerCm2() : null);
  }

  /** Reflectance, or the light absorbed by a subcell: every absorbed photon is collected. */
  private static double[] predicted(MeasuredSpec spec, Outcome outcome) {
    if (spec.isReflectance()) {
      return array(outcome.spectral().reflectance());
    }
    SubcellOutcome subcell =
        outcome.subcells().stream()
            .filter(s -> s.name().equals(spec.subcell()))
            .findFirst()
            .orElseThrow();
    double[] sum = new double[outcome.spectral().wavelengthNm().size()];
    for (String absorber : subcell.absorbers()) {
      List<Double> absorptance = outcome.spectral().absorptance().get(absorber);
      for (int w = 0; absorptance != null && w < sum.length; w++) {
        sum[w] += absorptance.get(w);
      }
    }
    return sum;
  }

  private static Finding finding(Entry entry, Comparison c, boolean currents) {
    boolean reflectance = entry.spec.isReflectance();
    String what = reflectance ? "reflectance" : "quantum efficiency";
    String sums =
        currents
            ? String.format(
                Locale.ROOT,
                "the measured %s carries %.2f mA cm⁻² and the model %.2f mA cm⁻², ",
                what,
                c.measuredMaPerCm2(),
                c.predictedMaPerCm2())
            : "";
    return new Finding(
        "measured-against-model",
        Severity.NOTE,
        reflectance ? "reflectance" : entry.spec.subcell(),
        String.format(
            Locale.ROOT,
            "from %.6g to %.6g nm %srms difference %.3f (%s, read as %s)",
            c.fromNm(),
            c.toNm(),
            sums,
            c.rmsDifference(),
            entry.spec.path(),
            entry.curve.readAs()));
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
