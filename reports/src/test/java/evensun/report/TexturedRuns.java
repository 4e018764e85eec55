package evensun.report;

import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.Textured;
import evensun.result.Textured.Outline;
import evensun.result.Textured.RayPath;
import evensun.result.Textured.Section;
import java.util.List;
import java.util.Map;

/** An invented run with a textured boundary: its numbers add up, its rays obey no law. */
final class TexturedRuns {

  /** Statistical error of the reflected light in mA cm⁻². */
  static final double REFLECTED_ERROR = 0.008;

  private TexturedRuns() {}

  /** Pyramids above a thick wafer, and a ray that leaves the section sideways. */
  static Section section() {
    return new Section(
        1000,
        List.of(
            new Outline(
                "air",
                "wafer",
                List.of(0.0, 2.0, 4.0, 6.0, 8.0),
                List.of(1.0, -1.8, 1.0, -1.8, 1.0)),
            new Outline("wafer", "mirror", List.of(0.0, 8.0), List.of(180.0, 180.0))),
        List.of(
            new RayPath(0, 3, -5, 3, -0.4, 1, 1),
            new RayPath(0, 3, -0.4, 147, 180, 0.9, 0.5),
            new RayPath(0, 147, 180, 151, 175, 0.48, 0.47),
            new RayPath(1, 5.5, -5, 5.5, -1.1, 1, 1),
            new RayPath(1, 5.5, -1.1, 1.5, 0, 0.1, 0.1)));
  }

  static RunResult assessment() {
    RunResult run = SampleRuns.assessment();
    Outcome flat = ToyOptics.tandem(100, 80, 640, Map.of());
    Outcome shaped = statistical(ToyOptics.tandem(90, 60, 620, Map.of()));
    return new RunResult(
        run.formatVersion(),
        run.kind(),
        "Invented pyramids",
        shaped,
        null,
        null,
        run.materials(),
        run.spectrum(),
        null,
        null,
        null,
        null,
        null,
        null,
        new Textured(flat, List.of("transfer-matrix"), section()),
        null,
        List.of(),
        run.cautions(),
        run.provenance());
  }

  private static Outcome statistical(Outcome o) {
    Losses losses = o.losses();
    return new Outcome(
        o.incidentMaPerCm2(),
        o.subcells().stream().map(TexturedRuns::statistical).toList(),
        o.matchedCurrentMaPerCm2(),
        o.mismatchMaPerCm2(),
        o.limitingSubcell(),
        new Losses(
            losses.reflectedMaPerCm2(),
            losses.transmittedMaPerCm2(),
            losses.parasitic(),
            REFLECTED_ERROR,
            0.001,
            0.25 * losses.reflectedMaPerCm2()),
        o.design(),
        o.stack().stream().map(TexturedRuns::onFacets).toList(),
        o.spectral(),
        o.quantities(),
        o.electrical());
  }

  private static SubcellOutcome statistical(SubcellOutcome s) {
    return new SubcellOutcome(
        s.name(), s.absorbers(), s.bandgapEv(), s.photocurrentMaPerCm2(), 0.0056, null);
  }

  private static StackEntry onFacets(StackEntry e) {
    boolean film = e.role().equals("layer") && e.thicknessNm() < 1000;
    return new StackEntry(
        e.name(),
        e.material(),
        e.role(),
        e.thicknessNm(),
        e.bandgapEv(),
        e.coherent(),
        e.subcell(),
        e.features(),
        film ? 2 * e.thicknessNm() : null);
  }
}
