package evensun.report.section;

import evensun.report.chart.Series;
import evensun.report.figure.Budget;
import evensun.report.figure.Share;
import evensun.result.Outcome;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The spectra of an outcome by role: subcells, layers that collect nothing, exit, reflection. */
final class Spectra {

  private static final int MOST_LAYERS = 9;

  private Spectra() {}

  /** Absorptance of each subcell, in the light's order. */
  static List<Series> subcells(Outcome outcome) {
    List<Series> series = new ArrayList<>();
    for (int i = 0; i < outcome.subcells().size(); i++) {
      SubcellOutcome subcell = outcome.subcells().get(i);
      double[] sum = new double[outcome.spectral().wavelengthNm().size()];
      for (String absorber : subcell.absorbers()) {
        add(sum, channel(outcome, absorber));
      }
      series.add(Series.of(subcell.name(), Share.subcellRole(i), boxed(sum)));
    }
    return series;
  }

  /** Where the light ends that no subcell absorbs: layers, exit medium, reflection last. */
  static List<Series> losses(Outcome outcome) {
    Spectral spectral = outcome.spectral();
    List<Series> series = new ArrayList<>(layers(outcome));
    exit(outcome).ifPresent(series::add);
    series.add(Series.of("reflected", "reflected", spectral.reflectance()));
    return series;
  }

  private static List<Series> layers(Outcome outcome) {
    Set<String> collected = new HashSet<>();
    outcome.subcells().forEach(subcell -> collected.addAll(subcell.absorbers()));
    List<Map.Entry<String, List<Double>>> parasitic =
        outcome.spectral().absorptance().entrySet().stream()
            .filter(entry -> !collected.contains(entry.getKey()))
            .filter(entry -> carried(outcome, entry.getValue()) > 0)
            .toList();
    List<Map.Entry<String, List<Double>>> largest =
        parasitic.stream()
            .sorted(
                (a, b) ->
                    Double.compare(carried(outcome, b.getValue()), carried(outcome, a.getValue())))
            .limit(MOST_LAYERS)
            .toList();
    List<Series> series = new ArrayList<>();
    double[] rest = new double[outcome.spectral().wavelengthNm().size()];
    int others = 0;
    for (Map.Entry<String, List<Double>> entry : parasitic) {
      if (largest.contains(entry)) {
        series.add(Series.of(entry.getKey(), role(outcome, entry.getKey()), entry.getValue()));
      } else {
        add(rest, entry.getValue());
        others++;
      }
    }
    if (others > 0) {
      series.add(Series.of(others + " other layers", "parasitic", boxed(rest)));
    }
    return series;
  }

  /** The same grey as in the light's budget. */
  private static String role(Outcome outcome, String layer) {
    return Budget.of(outcome).stream()
        .flatMap(budget -> budget.shares().stream())
        .filter(share -> share.label().equals(layer))
        .map(Share::role)
        .findFirst()
        .orElse("parasitic");
  }

  private static Optional<Series> exit(Outcome outcome) {
    Optional<StackEntry> exit =
        outcome.stack().stream().filter(entry -> entry.role().equals("exit")).findFirst();
    boolean collects = exit.map(entry -> entry.subcell() != null).orElse(false);
    return collects
        ? Optional.empty()
        : Optional.of(
            Series.of(
                exit.map(Budget::exitLabel).orElse("transmitted"),
                "exit",
                outcome.spectral().transmittance()));
  }

  /** A layer's absorptance; of an absorbing exit medium, what enters it. */
  private static List<Double> channel(Outcome outcome, String absorber) {
    List<Double> own = outcome.spectral().absorptance().get(absorber);
    if (own != null) {
      return own;
    }
    boolean exit =
        outcome.stack().stream()
            .anyMatch(entry -> entry.role().equals("exit") && entry.name().equals(absorber));
    return exit ? outcome.spectral().transmittance() : Collections.emptyList();
  }

  /** Current of a channel; for a single wavelength, which carries none, its share. */
  private static double carried(Outcome outcome, List<Double> share) {
    boolean single = outcome.incidentMaPerCm2() == null;
    double sum = 0;
    for (int i = 0; i < share.size(); i++) {
      sum += share.get(i) * (single ? 1 : outcome.spectral().incidentMaPerCm2().get(i));
    }
    return sum;
  }

  private static void add(double[] sum, List<Double> values) {
    for (int i = 0; i < values.size(); i++) {
      sum[i] += values.get(i);
    }
  }

  private static List<Double> boxed(double[] values) {
    List<Double> boxed = new ArrayList<>(values.length);
    for (double value : values) {
      boxed.add(value);
    }
    return boxed;
  }
}
