package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.MaterialUse;
import evensun.result.Outcome.QuantityRecord;
import evensun.result.Outcome.StackEntry;
import evensun.result.Provenance;
import evensun.result.RunResult;
import evensun.result.SpectrumUse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What was assumed: layers, materials with their data, light, models. */
public final class AssumptionSection {

  private AssumptionSection() {}

  /** The section. */
  public static Optional<Section> of(RunResult result) {
    List<Block> blocks = new ArrayList<>();
    blocks.add(new Block.Grid(conditions(result), false));
    blocks.add(new Block.Grid(byLayer(result), false));
    if (!result.found().quantities().isEmpty()) {
      blocks.add(new Block.Grid(quantities(result), false));
    }
    List<Block.Plot> plots = plots(result);
    if (!plots.isEmpty()) {
      blocks.add(new Block.Subheading("Refractive index n and extinction coefficient k as used"));
      List<String> charts = plots.stream().map(plot -> plot.chart().id()).toList();
      blocks.add(new Block.Together("optical-constants.csv", "All n and k as one CSV", charts));
      blocks.add(new Block.Plots(plots));
    }
    return Optional.of(new Section("assumptions", "Assumptions", heading(result), blocks));
  }

  private static String heading(RunResult result) {
    long memory = result.materials().stream().filter(MaterialUse::fromMemory).count();
    String materials = Numbers.count(result.materials().size(), "material");
    return memory == 0
        ? "What was assumed: " + materials + ", each with its source"
        : "What was assumed: " + materials + ", " + memory + " with numbers from memory";
  }

  private static Table conditions(RunResult result) {
    SpectrumUse light = result.spectrum();
    Provenance provenance = result.provenance();
    Table.Builder table =
        new Table.Builder("table-conditions", "Light and models").words("what").words("as used");
    table.row(
        "spectrum",
        light.name() + ", " + Numbers.withUnit(Numbers.fixed(light.totalWPerM2(), 2), "W m⁻²"));
    table.row("its source", light.source());
    table.row("incidence", Numbers.trimmed(light.angleDeg(), 2) + "°, " + light.polarisation());
    table.row("wavelengths", provenance.grid());
    Double incident = result.found().incidentMaPerCm2();
    if (incident != null) {
      table.row("available current", Numbers.withUnit(Numbers.fixed(incident, 3), Numbers.MA));
    }
    table.row("solver", chain(provenance));
    provenance.settings().forEach((name, value) -> table.row(name, value));
    return table.build();
  }

  private static String chain(Provenance provenance) {
    StringBuilder text = new StringBuilder(use(provenance.solver()));
    provenance.chain().stream()
        .filter(use -> !use.equals(provenance.solver()))
        .forEach(use -> text.append(" → ").append(use(use)));
    return text.toString();
  }

  private static String use(Provenance.SolverUse use) {
    return use.id() + " " + use.version();
  }

  private static Table byLayer(RunResult result) {
    Table.Builder table =
        new Table.Builder(
                "table-assumptions", "What each layer is made of, and where its data come from")
            .words("layer")
            .words("material")
            .words("source")
            .words("data")
            .words("what was done to the numbers");
    for (StackEntry entry : result.found().stack()) {
      MaterialUse use = material(result, entry);
      table.row(
          entry.name() + waves(entry),
          use == null ? entry.material() : prepared(use),
          use == null ? "" : use.source() + (use.fromMemory() ? " (from memory)" : ""),
          use == null ? "" : range(use),
          use == null ? "" : String.join("; ", use.notes()));
    }
    return table.build();
  }

  private static String waves(StackEntry entry) {
    return entry.role().equals("layer")
        ? entry.coherent() ? "" : " (incoherent)"
        : " (" + entry.role() + ")";
  }

  private static String prepared(MaterialUse use) {
    String title = use.title().isEmpty() ? use.name() : use.title();
    return use.form().isEmpty() ? title : title + "; " + use.form();
  }

  private static String range(MaterialUse use) {
    String kelvin = Numbers.withUnit(Numbers.trimmed(use.temperatureK(), 2), "K");
    return use.toNm() > use.fromNm()
        ? Numbers.trimmed(use.fromNm(), 1)
            + "\u00a0to\u00a0"
            + Numbers.withUnit(Numbers.trimmed(use.toNm(), 1), "nm")
            + ", "
            + kelvin
        : kelvin;
  }

  private static @org.jspecify.annotations.Nullable MaterialUse material(
      RunResult result, StackEntry entry) {
    return result.materials().stream()
        .filter(use -> use.name().equals(entry.material()))
        .filter(use -> use.layers().isEmpty() || use.layers().contains(entry.name()))
        .findFirst()
        .or(
            () ->
                result.materials().stream()
                    .filter(use -> use.name().equals(entry.material()))
                    .findFirst())
        .orElse(null);
  }

  private static Table quantities(RunResult result) {
    Table.Builder table =
        new Table.Builder("table-quantities", "Further numbers the solver reports")
            .words("quantity")
            .numbers("value", "")
            .words("unit");
    for (QuantityRecord q : result.found().quantities()) {
      table.row(q.label(), Numbers.significant(q.value(), 5), q.unit());
    }
    return table.build();
  }

  private static List<Block.Plot> plots(RunResult result) {
    List<Double> nm = result.found().spectral().wavelengthNm();
    List<Block.Plot> plots = new ArrayList<>();
    for (int i = 0; nm.size() > 1 && i < result.materials().size(); i++) {
      MaterialUse use = result.materials().get(i);
      if (use.n().size() == nm.size() && use.k().size() == nm.size()) {
        plots.add(Tables.plot(chart(use, nm, i)));
      }
    }
    return plots;
  }

  private static Chart chart(MaterialUse use, List<Double> nm, int index) {
    double high = 1;
    for (int i = 0; i < nm.size(); i++) {
      high = Math.max(high, Math.max(use.n().get(i), use.k().get(i)));
    }
    String gap =
        use.bandgapEv() == null ? "" : ", bandgap " + Numbers.quantity(use.bandgapEv(), "eV");
    return new Chart(
        "material-" + (index + 1),
        Kind.LINES,
        use.name() + gap,
        Axis.linear("wavelength", "nm", nm.get(0), nm.get(nm.size() - 1)),
        Axis.covering("n, k", "", 0, high),
        nm,
        List.of(Series.of("n", "ink", use.n()), Series.of("k", "sub2", use.k())),
        List.of());
  }
}
