package evensun.report;

import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.Parasitic;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.jspecify.annotations.Nullable;

/**
 * Invented spectra that look like a tandem's and add up: one pass through layers that absorb by
 * Beer's law, with a wavy reflectance. No physics to rely on; only the sums matter here.
 */
final class ToyOptics {

  static final double AVAILABLE_MA_PER_CM2 = 46.456;

  private ToyOptics() {}

  static Outcome tandem(
      double coatingNm, double contactNm, double absorberNm, Map<String, Double> design) {
    List<Double> nm = grid(300, 1200, 5);
    List<Double> incident = incident(nm);
    List<Double> reflectance = new ArrayList<>();
    List<Double> transmittance = new ArrayList<>();
    Map<String, List<Double>> absorptance = new LinkedHashMap<>();
    for (String layer :
        List.of("antireflection", "front-contact", "perovskite", "recombination", "wafer")) {
      absorptance.put(layer, new ArrayList<>());
    }
    for (double wavelength : nm) {
      double phase = 2 * Math.PI * (1.38 * coatingNm + 0.4 * contactNm) / wavelength;
      double r = 0.05 + 0.09 * Math.pow(Math.cos(phase), 2) + 0.1 * edge(wavelength, 1150, 25);
      double left = 1 - r;
      reflectance.add(r);
      left -= take(absorptance, "antireflection", left, 0.002);
      left -=
          take(
              absorptance,
              "front-contact",
              left,
              contactNm * (edge(340, wavelength, 20) * 4e-3 + 4e-4));
      left -=
          take(
              absorptance,
              "perovskite",
              left,
              absorberNm * 7e-3 * edge(735, wavelength, 5) * (500 / wavelength));
      left -= take(absorptance, "recombination", left, 0.012);
      left -= take(absorptance, "wafer", left, 6 * edge(1120, wavelength, 22));
      transmittance.add(left);
    }
    Spectral spectral = new Spectral(nm, incident, reflectance, transmittance, absorptance);
    return outcome(spectral, stack(coatingNm, contactNm, absorberNm), design);
  }

  /** Near one below the edge, near zero above it. */
  private static double edge(double at, double wavelength, double width) {
    return 1 / (1 + Math.exp((wavelength - at) / width));
  }

  private static double take(
      Map<String, List<Double>> into, String layer, double left, double depth) {
    double taken = left * (1 - Math.exp(-depth));
    into.get(layer).add(taken);
    return taken;
  }

  static List<Double> grid(double from, double to, double step) {
    return DoubleStream.iterate(from, nm -> nm <= to, nm -> nm + step).boxed().toList();
  }

  /** Photons like those of a black body at 5800 K, scaled to the available current. */
  private static List<Double> incident(List<Double> nm) {
    double[] photons =
        nm.stream()
            .mapToDouble(l -> Math.pow(l / 1000, -4) / (Math.exp(14387.77 / (5.8 * l)) - 1))
            .toArray();
    double sum = DoubleStream.of(photons).sum();
    return DoubleStream.of(photons).map(p -> p / sum * AVAILABLE_MA_PER_CM2).boxed().toList();
  }

  static Outcome outcome(Spectral spectral, List<StackEntry> stack, Map<String, Double> design) {
    double top = current(spectral, spectral.absorptance().get("perovskite"));
    double bottom = current(spectral, spectral.absorptance().get("wafer"));
    List<Parasitic> parasitic = new ArrayList<>();
    spectral
        .absorptance()
        .forEach(
            (layer, share) -> {
              if (!layer.equals("perovskite") && !layer.equals("wafer")) {
                parasitic.add(new Parasitic(layer, current(spectral, share)));
              }
            });
    double difference = Math.abs(top - bottom);
    @Nullable String limiting =
        difference < Outcome.BALANCED_MA_PER_CM2 ? null : top < bottom ? "top" : "bottom";
    return new Outcome(
        spectral.incidentMaPerCm2().stream().mapToDouble(Double::doubleValue).sum(),
        List.of(
            new SubcellOutcome("top", List.of("perovskite"), 1.68, top, null, null),
            new SubcellOutcome("bottom", List.of("wafer"), 1.12, bottom, null, null)),
        Math.min(top, bottom),
        difference,
        limiting,
        new Losses(
            current(spectral, spectral.reflectance()),
            current(spectral, spectral.transmittance()),
            parasitic),
        design,
        stack,
        spectral,
        List.of(),
        null);
  }

  private static double current(Spectral spectral, List<Double> share) {
    double sum = 0;
    for (int i = 0; i < share.size(); i++) {
      sum += share.get(i) * spectral.incidentMaPerCm2().get(i);
    }
    return sum;
  }

  private static List<StackEntry> stack(double coatingNm, double contactNm, double absorberNm) {
    return List.of(
        entry("air", "air", "incident", null, null, null),
        entry("antireflection", "magnesium-fluoride", "layer", coatingNm, null, null),
        entry("front-contact", "indium-tin-oxide", "layer", contactNm, null, null),
        entry("perovskite", "lead-halide-perovskite", "layer", absorberNm, 1.68, "top"),
        entry("recombination", "indium-tin-oxide", "layer", 20.0, null, null),
        new StackEntry(
            "wafer", "crystalline-silicon", "layer", 180000.0, null, false, "bottom", List.of()),
        entry("mirror", "silver", "exit", null, null, null));
  }

  private static StackEntry entry(
      String name,
      String material,
      String role,
      @Nullable Double nm,
      @Nullable Double gapEv,
      @Nullable String subcell) {
    return new StackEntry(name, material, role, nm, gapEv, true, subcell, List.of());
  }
}
