package evensun.report.section;

import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.Provenance;
import evensun.result.Provenance.SolverUse;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** How the result came about and how to repeat it. */
public final class ProvenanceSection {

  private ProvenanceSection() {}

  /** The section. */
  public static Optional<Section> of(RunResult result) {
    Provenance provenance = result.provenance();
    List<Block> blocks = new ArrayList<>();
    blocks.add(
        new Block.Verbatim(
            "repeat", "Command that repeats this run", provenance.repeatCommand(), false));
    blocks.add(new Block.Grid(facts(result), false));
    blocks.add(new Block.Grid(inputs(provenance), false));
    blocks.add(
        new Block.Verbatim("scenario", "The scenario file", provenance.scenarioText(), true));
    String heading =
        provenance.seed() == null
            ? "How to repeat this"
            : "How to repeat this: seed " + provenance.seed() + " gives the same result again";
    return Optional.of(new Section("provenance", "Provenance", heading, blocks));
  }

  private static Table facts(RunResult result) {
    Provenance p = result.provenance();
    SearchRecord search = result.search();
    Table.Builder table =
        new Table.Builder("table-provenance", "The run").words("what").words("value");
    table.row("Evensun", p.evensunVersion());
    table.row("build", p.build());
    table.row("Java", p.javaVersion());
    solver(table, "solver", p.solver());
    p.chain().stream()
        .filter(use -> !use.equals(p.solver()))
        .forEach(use -> solver(table, "hands on to", use));
    if (p.kernel() != null) {
      table.row("kernel", p.kernel());
    }
    if (p.seed() != null) {
      table.row("seed", Long.toString(p.seed()));
    }
    if (search != null) {
      table.row("generations", Integer.toString(search.generations()));
      table.row("evaluations", Integer.toString(search.evaluations()));
    }
    table.row("wavelengths", p.grid());
    table.row("started (UTC)", p.startedUtc());
    table.row("took", Numbers.withUnit(Numbers.fixed(p.elapsedSeconds(), 1), "s"));
    return table.build();
  }

  private static void solver(Table.Builder table, String what, SolverUse use) {
    table.row(what, use.id() + " " + use.version());
    if (!use.file().isEmpty()) {
      table.row(what + " file", use.file());
      table.row(what + " SHA-256", use.sha256());
    }
  }

  private static Table inputs(Provenance provenance) {
    Table.Builder table =
        new Table.Builder("table-inputs", "Every input with its SHA-256")
            .words("file")
            .words("SHA-256");
    provenance.inputs().forEach(input -> table.row(input.path(), input.sha256()));
    return table.build();
  }
}
