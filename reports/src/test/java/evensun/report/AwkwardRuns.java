package evensun.report;

import evensun.result.Caution;
import evensun.result.FindingRecord;
import evensun.result.MaterialUse;
import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.Parasitic;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.Provenance;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * Results that a page must survive: hostile texts, sixty layers, one wavelength, a failed search.
 */
final class AwkwardRuns {

  static final String HOSTILE =
      "</script><script>window.stolen=1</script>\"'><img src=x onerror=window.stolen=1>"
          + "${7*7} \u202eevil\u202c \u0645\u0631\u062d\u0628\u0627 \ud83c\udf1e ";

  private AwkwardRuns() {}

  static RunResult hostile() {
    RunResult r = SampleRuns.full();
    String long10k = HOSTILE + "x".repeat(10_000);
    MaterialUse m = r.materials().get(0);
    MaterialUse evil =
        new MaterialUse(
            HOSTILE,
            HOSTILE,
            List.of("antireflection"),
            HOSTILE,
            HOSTILE,
            280,
            1200,
            298.15,
            null,
            false,
            List.of(HOSTILE),
            m.n(),
            m.k());
    Provenance p = r.provenance();
    Provenance provenance =
        new Provenance(
            HOSTILE,
            HOSTILE,
            HOSTILE,
            new Provenance.SolverUse(HOSTILE, HOSTILE, HOSTILE, HOSTILE),
            List.of(),
            HOSTILE,
            7L,
            HOSTILE,
            long10k,
            List.of(new Provenance.InputFile(HOSTILE, HOSTILE)),
            HOSTILE,
            p.startedUtc(),
            1,
            Map.of(HOSTILE, HOSTILE));
    return new RunResult(
        r.formatVersion(),
        r.kind(),
        long10k,
        renamed(r.found()),
        renamed(r.asDrawn()),
        r.search(),
        List.of(evil),
        r.spectrum(),
        null,
        null,
        r.sensitivities(),
        r.whatIf(),
        null,
        List.of(new FindingRecord("warning", "some-code", HOSTILE, long10k)),
        List.of(new Caution(HOSTILE, HOSTILE)),
        provenance);
  }

  /** The outcome with hostile names of layers and subcells. */
  private static Outcome renamed(Outcome o) {
    Map<String, List<Double>> absorptance = new LinkedHashMap<>();
    o.spectral().absorptance().forEach((layer, share) -> absorptance.put(HOSTILE + layer, share));
    List<SubcellOutcome> subcells =
        o.subcells().stream()
            .map(
                s ->
                    new SubcellOutcome(
                        HOSTILE + s.name(),
                        s.absorbers().stream().map(a -> HOSTILE + a).toList(),
                        s.bandgapEv(),
                        s.photocurrentMaPerCm2(),
                        null,
                        null))
            .toList();
    List<StackEntry> stack =
        o.stack().stream()
            .map(
                e ->
                    new StackEntry(
                        HOSTILE + e.name(),
                        HOSTILE,
                        e.role(),
                        e.thicknessNm(),
                        e.bandgapEv(),
                        e.coherent(),
                        e.subcell() == null ? null : HOSTILE + e.subcell(),
                        List.of(HOSTILE)))
            .toList();
    Spectral s = o.spectral();
    return new Outcome(
        o.incidentMaPerCm2(),
        subcells,
        o.matchedCurrentMaPerCm2(),
        o.mismatchMaPerCm2(),
        o.limitingSubcell() == null ? null : HOSTILE + o.limitingSubcell(),
        new Losses(
            o.losses().reflectedMaPerCm2(),
            o.losses().transmittedMaPerCm2(),
            o.losses().parasitic().stream()
                .map(q -> new Parasitic(HOSTILE + q.layer(), q.maPerCm2()))
                .toList()),
        o.design(),
        stack,
        new Spectral(
            s.wavelengthNm(),
            s.incidentMaPerCm2(),
            s.reflectance(),
            s.transmittance(),
            absorptance),
        List.of(new Outcome.QuantityRecord("key", HOSTILE, 1, HOSTILE)),
        null);
  }

  /** Sixty layers on a fine grid. */
  static RunResult sixtyLayers() {
    RunResult r = SampleRuns.assessment();
    List<Double> nm = ToyOptics.grid(300, 1200, 1);
    int points = nm.size();
    List<StackEntry> stack = new ArrayList<>();
    Map<String, List<Double>> absorptance = new LinkedHashMap<>();
    List<Parasitic> parasitic = new ArrayList<>();
    stack.add(new StackEntry("air", "air", "incident", null, null, false, null, List.of()));
    for (int i = 1; i <= 60; i++) {
      boolean absorber = i == 30;
      String name = absorber ? "perovskite" : "layer-" + i;
      stack.add(
          new StackEntry(
              name,
              "m" + i % 4,
              "layer",
              absorber ? 500.0 : 5.0 + i,
              null,
              true,
              absorber ? "top" : null,
              List.of()));
      double share = absorber ? 0.6 : 0.005;
      absorptance.put(name, java.util.Collections.nCopies(points, share));
      if (!absorber) {
        parasitic.add(new Parasitic(name, share * 45.05));
      }
    }
    stack.add(new StackEntry("glass", "glass", "exit", null, null, false, null, List.of()));
    Outcome outcome =
        new Outcome(
            45.05,
            List.of(
                new SubcellOutcome("top", List.of("perovskite"), null, 0.6 * 45.05, null, null)),
            0.6 * 45.05,
            0.0,
            null,
            new Losses(0.1 * 45.05, 0.005 * 45.05, parasitic),
            Map.of(),
            stack,
            new Spectral(
                nm,
                java.util.Collections.nCopies(points, 0.05),
                java.util.Collections.nCopies(points, 0.1),
                java.util.Collections.nCopies(points, 0.005),
                absorptance),
            List.of(),
            null);
    return with(r, "Sixty layers", outcome, null, List.of());
  }

  /** One wavelength: spectra without currents. */
  static RunResult oneWavelength() {
    RunResult r = SampleRuns.assessment();
    Map<String, List<Double>> absorptance = new LinkedHashMap<>();
    absorptance.put("perovskite", List.of(0.8));
    absorptance.put("front-contact", List.of(0.05));
    Outcome outcome =
        new Outcome(
            null,
            List.of(new SubcellOutcome("top", List.of("perovskite"), 1.68, null, null, null)),
            null,
            null,
            null,
            null,
            Map.of(),
            r.found().stack(),
            new Spectral(List.of(600.0), List.of(0.0), List.of(0.1), List.of(0.05), absorptance),
            List.of(),
            null);
    return with(r, "One wavelength", outcome, null, List.of());
  }

  /** A search that could evaluate nothing: the stack as drawn is all there is. */
  static RunResult failedSearch() {
    RunResult r = SampleRuns.full();
    SearchRecord search =
        new SearchRecord(
            "matched-current",
            "mA cm⁻²",
            null,
            0,
            "evaluations",
            1,
            60,
            60,
            null,
            List.of(),
            r.search().variables(),
            List.of(),
            List.of(),
            null,
            List.of(),
            null,
            null,
            "largest");
    return with(
        r,
        "Failed search",
        r.asDrawn(),
        search,
        List.of(new FindingRecord("serious", "search-failed", "search", "No design worked.")));
  }

  private static RunResult with(
      RunResult r,
      String title,
      Outcome found,
      @Nullable SearchRecord search,
      List<FindingRecord> findings) {
    return new RunResult(
        r.formatVersion(),
        r.kind(),
        title,
        found,
        null,
        search,
        List.of(),
        r.spectrum(),
        null,
        null,
        null,
        null,
        null,
        findings,
        List.of(),
        r.provenance());
  }
}
