package evensun.evaluation;

import evensun.light.Constants;
import evensun.light.Spectrum;
import evensun.material.Composition;
import evensun.material.Material;
import evensun.material.MaterialRecord;
import evensun.material.Tuning;
import evensun.scenario.Scenario;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.stack.MaterialSource;
import evensun.stack.ResolvedStack;
import evensun.stack.StackResolver;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;

/** Scenarios of invented materials whose currents can be worked out by hand. */
final class Cells {

  /** Irradiance in W m⁻² nm⁻¹ of the flat test spectrum. */
  static final double FLAT = 1.5;

  private static final Tuning ALLOY =
      new Tuning(1, 2, 1.5, Optional.of(new Composition("any", 1.2, 0.6, 0.2)));

  private Cells() {}

  /** A flat spectrum, so that photon currents have the closed form q/(hc)·E·(λ₂² − λ₁²)/2. */
  static Spectrum flatSpectrum() {
    return Spectrum.of("flat", "invented", new double[] {200, 2000}, new double[] {FLAT, FLAT});
  }

  /**
   * Materials by name: air, grey (k = 0.05), clear (k = 0), edge and alloy (tunable: k = gap/100).
   */
  static MaterialSource materials() {
    return (name, place) ->
        switch (name) {
          case "air", "clear" -> grey(name, 0, Optional.empty());
          case "grey" -> grey(name, 0.05, Optional.empty());
          case "tail" -> tail();
          case "edge" -> grey(name, 0, Optional.of(new Tuning(1, 2, 1.5)));
          case "alloy" -> grey(name, 0, Optional.of(ALLOY));
          default -> throw new evensun.scenario.InputException(place, "no material " + name);
        };
  }

  private static Material grey(String name, double k, Optional<Tuning> tuning) {
    return grey(name, tuning, (gap, nm) -> tuning.isPresent() ? gap / 100 : k);
  }

  private static Material grey(
      String name, Optional<Tuning> tuning, DoubleBinaryOperator kOfGapAndNm) {
    return new Material() {
      @Override
      public MaterialRecord record() {
        return new MaterialRecord(
            name,
            name,
            "test",
            "",
            "invented",
            0,
            200,
            2000,
            298.15,
            false,
            List.of(),
            List.of(),
            List.of());
      }

      @Override
      public Optional<Tuning> tuning() {
        return tuning;
      }

      @Override
      public OptionalDouble bandgapEv() {
        return tuning.map(t -> OptionalDouble.of(t.defaultEv())).orElse(OptionalDouble.empty());
      }

      @Override
      public Filler on(double[] wavelengthNm) {
        return (gap, n, kRow) -> {
          Arrays.fill(n, name.equals("air") ? 1 : 1.5);
          Arrays.setAll(kRow, w -> kOfGapAndNm.applyAsDouble(gap, wavelengthNm[w]));
        };
      }
    };
  }

  /** k = 0.05/(1 + exp((gap − E)/10 meV)). */
  static double tailK(double gapEv, double wavelengthNm) {
    double below = gapEv - Constants.HC_EV_NM / wavelengthNm;
    return 0.05 / (1 + Math.exp(below / 0.010));
  }

  private static Material tail() {
    return grey("tail", Optional.of(new Tuning(1, 2, 1.5)), (gap, nm) -> tailK(gap, nm));
  }

  static ResolvedStack stack(String yaml) {
    Scenario scenario = ScenarioReader.read(new Source("cell.yaml", Path.of("."), yaml));
    return StackResolver.resolve(scenario, materials(), flatSpectrum());
  }

  static Model model(String yaml, BeerLambertSolver solver) {
    return model(stack(yaml), solver);
  }

  static Model model(ResolvedStack stack, BeerLambertSolver solver) {
    return Model.of(
        stack,
        solver,
        java.util.Map.of(),
        1,
        new evensun.spi.Services() {
          @Override
          public Optional<evensun.spi.OpticalSolver> solver(String id) {
            return Optional.empty();
          }

          @Override
          public boolean cancelled() {
            return false;
          }
        });
  }

  /** Two subcells: a thin grey layer and a thicker one below it. */
  static String twoCells(double topNm, double bottomNm) {
    return """
    evensun: 1
    title: Two grey cells
    light: {spectrum: AM1.5G}
    grid: {fromNm: 400, toNm: 800, stepNm: 10}
    stack:
      - {medium: air}
      - {name: upper, material: grey, thicknessNm: %s}
      - {name: spacer, material: clear, thicknessNm: 50}
      - {name: lower, material: grey, thicknessNm: %s}
      - {name: back, material: clear}
    subcells:
      - {name: top, absorbers: [upper]}
      - {name: bottom, absorbers: [lower]}
    connection: series
    """
        .formatted(topNm, bottomNm);
  }
}
