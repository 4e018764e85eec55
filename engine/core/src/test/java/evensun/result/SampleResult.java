package evensun.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Small invented results: one that fills every field, one that leaves out all it may. */
final class SampleResult {

  private SampleResult() {}

  static RunResult full() {
    return new RunResult(
        RunResult.FORMAT,
        "design",
        "Invented <tandem> \"7\" \u202e",
        outcome(19.5, 19.52),
        outcome(15.0, 21.25),
        search(),
        List.of(material()),
        new SpectrumUse("AM1.5G", "ASTM G173-03", 1000.37, 0, "unpolarised"),
        List.of(new DepthLayer("absorber", List.of(0.0, 1.0), List.of(1e21, 9.5e20))),
        new Angular(List.of(0.0, 30.0), List.of(4.0, 4.25), map("top", List.of(19.5, 19.25))),
        List.of(
            new Sensitivity(
                "absorber.thicknessNm", "nm", 1, 0.01, -0.012, map("top", 0.01), 0.02, 25, -0.4)),
        List.of(
            new WhatIf(
                "absorber.thicknessNm",
                "nm",
                List.of(400.0, 500.0),
                List.of(18.0, 19.5),
                map("top", List.of(18.0, 19.5)))),
        List.of(
            new Opinion("numerics", "half the wavelength step", 19.498, -0.002, ""),
            new Opinion("material", "another table", null, null, "covers 400 to 900 nm only")),
        null,
        textured(),
        List.of(new Published("a limit", "%", 33.7, 33.75, 0.1, "a paper", true)),
        List.of(new FindingRecord("warning", "bound-reached", "absorber", "Stands on its bound.")),
        List.of(new Caution("absorber", "Contains lead.")),
        provenance());
  }

  static RunResult sparse() {
    RunResult full = full();
    Outcome empty =
        new Outcome(
            null,
            List.of(new Outcome.SubcellOutcome("top", List.of("absorber"), null, null, null, null)),
            null,
            null,
            null,
            null,
            Map.of(),
            full.found().stack(),
            full.found().spectral(),
            List.of(),
            null);
    return new RunResult(
        RunResult.FORMAT,
        "assess",
        "Sparse",
        empty,
        null,
        null,
        List.of(),
        full.spectrum(),
        null,
        null,
        null,
        null,
        null,
        List.of(),
        List.of(),
        provenance());
  }

  private static Textured textured() {
    return new Textured(
        outcome(18.0, 18.5),
        List.of("transfer-matrix"),
        new Textured.Section(
            1000,
            List.of(
                new Textured.Outline(
                    "air", "wafer", List.of(0.0, 2.5, 5.0), List.of(1.0, -2.0, 1.0))),
            List.of(new Textured.RayPath(0, 1, -4, 1, -1, 1, 0.9))));
  }

  private static Outcome outcome(double top, double bottom) {
    return new Outcome(
        46.456,
        List.of(
            new Outcome.SubcellOutcome("top", List.of("absorber"), 1.68, top, 0.01, 19.0),
            new Outcome.SubcellOutcome("bottom", List.of("wafer"), null, bottom, null, null)),
        Math.min(top, bottom),
        Math.abs(top - bottom),
        "top",
        new Outcome.Losses(
            4.156,
            0.8,
            List.of(new Outcome.Parasitic("front-contact", 0.1 + 0.2, 0.003)),
            0.01,
            0.002,
            3.5),
        map("absorber.thicknessNm", 431.2),
        List.of(
            new Outcome.StackEntry("air", "air", "incident", null, null, false, null, List.of()),
            new Outcome.StackEntry(
                "absorber",
                "perovskite",
                "layer",
                431.2,
                1.68,
                true,
                "top",
                List.of("graded"),
                746.0)),
        new Outcome.Spectral(
            List.of(300.0, 305.0),
            List.of(0.01, 0.0123456789012345),
            List.of(0.31, 1e-17),
            List.of(0.0, 5e-324),
            map("absorber", List.of(0.2, 1.0 / 3.0)),
            map("absorber", List.of(0.001, 0.002)),
            List.of(0.3, 0.0)),
        List.of(new Outcome.QuantityRecord("haze", "Haze", 0.25, "")),
        electrical());
  }

  private static Electrical electrical() {
    return new Electrical(
        "step absorptance",
        "series",
        298.15,
        1.9,
        19.5,
        0.8,
        29.6,
        29.6,
        30.1,
        List.of(
            new Electrical.SubcellElectrical(
                "top", 1.68, 1e-20, 0.01, 1.5, 1.2, 1.0, 18.5, null, 19.5, 0.1, 1.3, null)),
        List.of(new Electrical.CurvePoint(0, 19.5), new Electrical.CurvePoint(1.9, 0)),
        List.of(new Electrical.MismatchPoint(-1, 28, 0.81)),
        List.of(new Electrical.LadderStep("limit", 45.1, null)),
        null);
  }

  private static SearchRecord search() {
    return new SearchRecord(
        "matched-current",
        "mA cm⁻²",
        15.0,
        19.5,
        "converged",
        2,
        200,
        1,
        0.01,
        List.of(new SearchRecord.Generation(1, 100, 18, 12)),
        List.of(
            new SearchRecord.VariableRecord(
                "absorber.thicknessNm", "nm", 200, 1000, 1, 500, 431.2, 420.0, 445.0, null)),
        List.of(new SearchRecord.Optimum(19.5, map("absorber.thicknessNm", 431.2))),
        List.of(new SearchRecord.ConstraintRecord("absorber.thicknessNm <= 500", 431.2, false)),
        new SearchRecord.Front(
            List.of("a", "b"),
            List.of("mA cm⁻²", "nm"),
            List.of("largest", "smallest"),
            List.of(new SearchRecord.FrontPoint(List.of(1.0, 2.0), map("x", 3.0))),
            0,
            0,
            List.of(0.5, 2.5)),
        List.of("One optimum."),
        null,
        null,
        "largest");
  }

  private static MaterialUse material() {
    return new MaterialUse(
        "perovskite",
        "Perovskite",
        List.of("absorber"),
        "Invented",
        "film",
        300,
        1200,
        298.15,
        1.68,
        false,
        List.of("tail replaced"),
        List.of(2.5, 2.5),
        List.of(1.0, 0.9));
  }

  private static Provenance provenance() {
    var solver = new Provenance.SolverUse("transfer-matrix", "0.1.0", "tm.jar", "ab12");
    return new Provenance(
        "0.1.0",
        "ffff",
        "17",
        solver,
        List.of(solver),
        "array",
        7L,
        "300 to 1200 nm in steps of 5 nm",
        "evensun: 1\n",
        List.of(new Provenance.InputFile("tandem.yaml", "cd34")),
        "evensun design tandem.yaml",
        "2026-01-01T00:00:00Z",
        1.5,
        map("threads", "2"));
  }

  private static <V extends @Nullable Object> Map<String, V> map(String key, V value) {
    Map<String, V> map = new LinkedHashMap<>();
    map.put(key, value);
    return map;
  }
}
