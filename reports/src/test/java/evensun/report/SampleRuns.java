package evensun.report;

import evensun.result.Angular;
import evensun.result.Caution;
import evensun.result.DepthLayer;
import evensun.result.Electrical;
import evensun.result.FindingRecord;
import evensun.result.MaterialUse;
import evensun.result.Opinion;
import evensun.result.Outcome;
import evensun.result.Provenance;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Generation;
import evensun.result.SearchRecord.Optimum;
import evensun.result.SearchRecord.VariableRecord;
import evensun.result.Sensitivity;
import evensun.result.SpectrumUse;
import evensun.result.WhatIf;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.jspecify.annotations.Nullable;

/** Results of invented runs whose numbers add up, made before any solver. */
final class SampleRuns {

  static final String COATING = "antireflection.thicknessNm";
  static final String CONTACT = "front-contact.thicknessNm";
  static final String ABSORBER = "perovskite.thicknessNm";
  private static final String HASH =
      "5f0c2d6b9a4e8173c6d20e94b8a7f3151d9e06c47ab38f2e5510c9d4e7b6a283";

  private SampleRuns() {}

  /** A design run with every section. */
  static RunResult full() {
    Outcome drawn = withPower(ToyOptics.tandem(100, 80, 640, Map.of()), 25.1);
    Map<String, Double> design = new LinkedHashMap<>();
    design.put(COATING, 112.4);
    design.put(CONTACT, 40.0);
    design.put(ABSORBER, balancedNm());
    Outcome found = withPower(ToyOptics.tandem(112.4, 40, balancedNm(), design), 29.4);
    return new RunResult(
        RunResult.FORMAT,
        "design",
        "Planar perovskite on silicon, two terminals",
        found,
        drawn,
        search(drawn, found),
        materials(found),
        spectrum(),
        depth(),
        angular(found),
        sensitivities(found),
        whatIf(),
        opinions(found),
        findings(),
        cautions(),
        provenance());
  }

  /** The stack as drawn, no search. */
  static RunResult assessment() {
    RunResult full = full();
    return new RunResult(
        RunResult.FORMAT,
        "assess",
        full.title(),
        ToyOptics.tandem(100, 80, 640, Map.of()),
        null,
        null,
        full.materials(),
        full.spectrum(),
        null,
        null,
        null,
        null,
        null,
        List.of(),
        full.cautions(),
        provenance());
  }

  /** The full run under another title. */
  static RunResult titled(String title) {
    RunResult full = full();
    return with(full, title, full.search());
  }

  /** The full run after another search. */
  static RunResult searched(RunResult r, SearchRecord search) {
    return with(r, r.title(), search);
  }

  private static RunResult with(RunResult r, String title, @Nullable SearchRecord search) {
    return new RunResult(
        r.formatVersion(),
        r.kind(),
        title,
        r.found(),
        r.asDrawn(),
        search,
        r.materials(),
        r.spectrum(),
        r.depth(),
        r.angular(),
        r.sensitivities(),
        r.whatIf(),
        r.secondOpinion(),
        r.findings(),
        r.cautions(),
        r.provenance());
  }

  /** The absorber thickness at which the toy's subcells balance, by bisection. */
  static double balancedNm() {
    double low = 50;
    double high = 2000;
    for (int i = 0; i < 60; i++) {
      double middle = (low + high) / 2;
      Outcome outcome = ToyOptics.tandem(112.4, 40, middle, Map.of());
      boolean topWeak = current(outcome, 0) < current(outcome, 1);
      low = topWeak ? middle : low;
      high = topWeak ? high : middle;
    }
    return Math.round(low * 10) / 10.0;
  }

  private static double current(Outcome outcome, int subcell) {
    return outcome.subcells().get(subcell).photocurrentMaPerCm2();
  }

  private static Outcome withPower(Outcome o, double efficiency) {
    return new Outcome(
        o.incidentMaPerCm2(),
        o.subcells(),
        o.matchedCurrentMaPerCm2(),
        o.mismatchMaPerCm2(),
        o.limitingSubcell(),
        o.losses(),
        o.design(),
        o.stack(),
        o.spectral(),
        List.of(),
        electrical(o, efficiency));
  }

  private static Electrical electrical(Outcome o, double efficiency) {
    double jsc = o.matchedCurrentMaPerCm2();
    List<Electrical.CurvePoint> curve =
        ToyOptics.grid(0, 1.9, 0.05).stream()
            .map(
                v ->
                    new Electrical.CurvePoint(
                        v, Math.max(0, jsc * (1 - Math.exp((v - 1.9) / 0.06)))))
            .toList();
    List<Electrical.MismatchPoint> cost =
        ToyOptics.grid(-3, 3, 0.25).stream()
            .map(
                d ->
                    new Electrical.MismatchPoint(
                        d, efficiency - 0.6 * Math.abs(d), 0.78 + 0.01 * Math.abs(d)))
            .toList();
    return new Electrical(
        "saturation currents from each subcell's own absorptance",
        "series",
        298.15,
        1.9,
        jsc,
        0.801,
        efficiency,
        efficiency,
        efficiency + 0.42,
        List.of(
            new Electrical.SubcellElectrical(
                "top", 1.68, 3.1e-23, 0.01, 1.4, 1.23, 1.09, jsc * 0.96, 0.71, jsc, 0, 1.36, 1.12),
            new Electrical.SubcellElectrical(
                "bottom",
                1.12,
                2.6e-12,
                0.02,
                1.0,
                0.71,
                0.61,
                jsc * 0.96,
                0.66,
                jsc,
                0,
                0.83,
                -1.12)),
        curve,
        cost,
        List.of(
            new Electrical.LadderStep("detailed-balance limit of these gaps", 43.9, null),
            new Electrical.LadderStep("reflection", -4.1, -3.9),
            new Electrical.LadderStep("parasitic absorption", -2.2, -2.0),
            new Electrical.LadderStep("non-radiative recombination", efficiency - 37.6, null)),
        null);
  }

  private static SearchRecord search(Outcome drawn, Outcome found) {
    double aim = found.matchedCurrentMaPerCm2();
    double start = drawn.matchedCurrentMaPerCm2();
    List<Generation> history = new ArrayList<>();
    for (int g = 1; g <= 40; g++) {
      double best = aim - (aim - start) * Math.exp(-g / 6.0);
      history.add(
          new Generation(g, g * 60, g == 40 ? aim : best, best - 2.2 * Math.exp(-g / 12.0)));
    }
    return new SearchRecord(
        "matched-current",
        "mA cm⁻²",
        start,
        aim,
        "converged",
        40,
        2400,
        3,
        0.0031,
        history,
        List.of(
            new VariableRecord(COATING, "nm", 60, 150, 0, 100, 112.4, 104.0, 121.5, null),
            new VariableRecord(CONTACT, "nm", 40, 120, 0, 80, 40, 40.0, 43.1, "low"),
            new VariableRecord(
                ABSORBER,
                "nm",
                200,
                1000,
                0,
                640,
                balancedNm(),
                balancedNm() - 4,
                balancedNm() + 5,
                null)),
        List.of(
            new Optimum(aim, found.design()),
            new Optimum(aim - 0.21, Map.of(COATING, 71.0, CONTACT, 41.5, ABSORBER, 512.0))),
        List.of(),
        null,
        List.of("Two distinct optima were found; the second is 0.21 mA cm⁻² worse."),
        null,
        null,
        "largest");
  }

  private static List<MaterialUse> materials(Outcome found) {
    List<Double> nm = found.spectral().wavelengthNm();
    return List.of(
        material(
            "magnesium-fluoride",
            "Magnesium fluoride",
            List.of("antireflection"),
            nm,
            1.38,
            0,
            null),
        material(
            "indium-tin-oxide",
            "Indium tin oxide",
            List.of("front-contact", "recombination"),
            nm,
            1.9,
            0.02,
            null),
        material(
            "lead-halide-perovskite",
            "Lead-halide perovskite",
            List.of("perovskite"),
            nm,
            2.4,
            0.6,
            1.68),
        material(
            "crystalline-silicon", "Crystalline silicon", List.of("wafer"), nm, 3.7, 0.3, null),
        material("silver", "Silver", List.of("mirror"), nm, 0.15, 4.0, null));
  }

  private static MaterialUse material(
      String name,
      String title,
      List<String> layers,
      List<Double> nm,
      double n,
      double k,
      @Nullable Double gap) {
    return new MaterialUse(
        name,
        title,
        layers,
        "Invented table for this sample",
        "film on glass",
        280,
        1200,
        298.15,
        gap,
        name.equals("silver"),
        gap == null ? List.of() : List.of("absorption below the gap replaced by a 15 meV tail"),
        nm.stream().map(l -> n * (1 + 2e4 / (l * l))).toList(),
        nm.stream().map(l -> k * Math.exp(-(l - 300) / 300)).toList());
  }

  private static SpectrumUse spectrum() {
    return new SpectrumUse("AM1.5G", "ASTM G173-03", 1000.37, 0, "unpolarised");
  }

  private static List<DepthLayer> depth() {
    List<Double> film = ToyOptics.grid(0, 560, 5);
    List<Double> wafer = ToyOptics.grid(0, 180_000, 2_000);
    return List.of(
        new DepthLayer(
            "perovskite",
            film,
            film.stream().map(z -> 4.2e21 * Math.exp(-z / 160) + 4e20).toList()),
        new DepthLayer(
            "wafer", wafer, wafer.stream().map(z -> 8e19 * Math.exp(-z / 25_000) + 1e17).toList()));
  }

  private static Angular angular(Outcome found) {
    List<Double> angles = ToyOptics.grid(0, 75, 5);
    double reflected = found.losses().reflectedMaPerCm2();
    return new Angular(
        angles,
        angles.stream().map(a -> reflected * (1 + Math.pow(a / 60, 4))).toList(),
        ordered(
            "top",
                angles.stream()
                    .map(a -> current(found, 0) * (1 - 0.1 * Math.pow(a / 60, 4)))
                    .toList(),
            "bottom",
                angles.stream()
                    .map(a -> current(found, 1) * (1 - 0.14 * Math.pow(a / 60, 4)))
                    .toList()));
  }

  private static List<Sensitivity> sensitivities(Outcome found) {
    return List.of(
        sensitivity(ABSORBER, 112.4, 40, balancedNm(), 0, 0, 1),
        sensitivity(CONTACT, 112.4, 40, balancedNm(), 0, 1, 0),
        sensitivity(COATING, 112.4, 40, balancedNm(), 1, 0, 0));
  }

  private static Sensitivity sensitivity(
      String key, double a, double b, double c, double da, double db, double dc) {
    Outcome here = ToyOptics.tandem(a, b, c, Map.of());
    Outcome up = ToyOptics.tandem(a + da, b + db, c + dc, Map.of());
    Outcome down = ToyOptics.tandem(a - da, b - db, c - dc, Map.of());
    double aim = here.matchedCurrentMaPerCm2();
    return new Sensitivity(
        key,
        "nm",
        1,
        up.matchedCurrentMaPerCm2() - aim,
        down.matchedCurrentMaPerCm2() - aim,
        ordered(
            "top", current(up, 0) - current(here, 0), "bottom", current(up, 1) - current(here, 1)),
        -0.011,
        0.05 * (da * a + db * b + dc * c),
        Math.min(0, worst(a, b, c, da, db, dc) - aim));
  }

  private static double worst(double a, double b, double c, double da, double db, double dc) {
    return Math.min(
        ToyOptics.tandem(a * (1 + 0.05 * da), b * (1 + 0.05 * db), c * (1 + 0.05 * dc), Map.of())
            .matchedCurrentMaPerCm2(),
        ToyOptics.tandem(a * (1 - 0.05 * da), b * (1 - 0.05 * db), c * (1 - 0.05 * dc), Map.of())
            .matchedCurrentMaPerCm2());
  }

  private static List<WhatIf> whatIf() {
    return List.of(
        whatIf(
            ABSORBER, ToyOptics.grid(200, 1000, 25), v -> ToyOptics.tandem(112.4, 40, v, Map.of())),
        whatIf(
            CONTACT,
            ToyOptics.grid(40, 120, 4),
            v -> ToyOptics.tandem(112.4, v, balancedNm(), Map.of())),
        whatIf(
            COATING,
            ToyOptics.grid(60, 150, 5),
            v -> ToyOptics.tandem(v, 40, balancedNm(), Map.of())));
  }

  private static WhatIf whatIf(
      String key, List<Double> values, java.util.function.DoubleFunction<Outcome> at) {
    List<Outcome> outcomes = values.stream().map(v -> at.apply(v)).toList();
    return new WhatIf(
        key,
        "nm",
        values,
        outcomes.stream().map(Outcome::matchedCurrentMaPerCm2).toList(),
        ordered(
            "top", outcomes.stream().map(o -> current(o, 0)).toList(),
            "bottom", outcomes.stream().map(o -> current(o, 1)).toList()));
  }

  private static List<Opinion> opinions(Outcome found) {
    double aim = found.matchedCurrentMaPerCm2();
    return List.of(
        new Opinion("numerics", "half the wavelength step (2.5 nm)", aim - 0.002, -0.002, ""),
        new Opinion("numerics", "reference kernel", aim, 0.0, "agrees to the last digit"),
        new Opinion("material", "front-contact: indium-tin-oxide.sputtered", aim - 0.38, -0.38, ""),
        new Opinion(
            "material", "wafer: another table of crystalline silicon", aim + 0.06, 0.06, ""),
        new Opinion("material", "mirror: aluminium", null, null, "covers 280 to 1000 nm only"));
  }

  private static List<FindingRecord> findings() {
    return List.of(
        new FindingRecord(
            "warning",
            "bound-reached",
            "front-contact.thicknessNm",
            "The found value stands on its lower bound of 40 nm; a wider range may do better."),
        new FindingRecord(
            "note",
            "tail-replaced",
            "lead-halide-perovskite",
            "Measured absorption below the gap was replaced by an Urbach tail of 15 meV."));
  }

  private static List<Caution> cautions() {
    return List.of(
        new Caution(
            "perovskite",
            "Lead halides are water-soluble and toxic for reproduction; broken modules are hazardous waste."),
        new Caution(
            "front-contact", "Indium compounds: keep dust and sputter flakes out of the air."));
  }

  private static Provenance provenance() {
    Map<String, String> settings = new LinkedHashMap<>();
    settings.put("temperature", "298.15 K");
    return new Provenance(
        "0.1.0",
        "c0ffee12",
        "17.0.15",
        new Provenance.SolverUse("transfer-matrix", "0.1.0", "transfer-matrix-0.1.0.jar", HASH),
        List.of(),
        "arrays",
        7L,
        "300 to 1200 nm in steps of 5 nm, 181 wavelengths",
        "evensun: 1\ntitle: Planar perovskite on silicon, two terminals\n# an invented stack\nlight: {spectrum: AM1.5G}\n",
        List.of(new Provenance.InputFile("perovskite-on-silicon.yaml", HASH)),
        "evensun design perovskite-on-silicon.yaml --seed 7",
        "2026-03-04T10:11:12Z",
        12.3,
        settings);
  }

  private static <V> Map<String, V> ordered(String k1, V v1, String k2, V v2) {
    Map<String, V> map = new LinkedHashMap<>();
    map.put(k1, v1);
    map.put(k2, v2);
    return map;
  }

  static double[] array(List<Double> values) {
    return values.stream().flatMapToDouble(DoubleStream::of).toArray();
  }
}
