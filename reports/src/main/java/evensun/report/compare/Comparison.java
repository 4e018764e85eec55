package evensun.report.compare;

import evensun.report.figure.Budget;
import evensun.report.figure.Figure;
import evensun.report.figure.LevelPicture.Vessel;
import evensun.report.figure.LevelsBeside;
import evensun.report.figure.LevelsBeside.Design;
import evensun.report.figure.Share;
import evensun.report.page.Table;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.MaterialUse;
import evensun.result.Outcome;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/** What differs between results, and whether they may be compared at all. */
final class Comparison {

  /** Fewest runs to compare. */
  static final int FEWEST = 2;

  /** Most runs to compare. */
  static final int MOST = 6;

  private final List<NamedRun> runs;

  Comparison(List<NamedRun> runs) {
    if (runs.size() < FEWEST || runs.size() > MOST) {
      throw new IllegalArgumentException(
          "2 to 6 runs can be compared, but there were " + runs.size());
    }
    this.runs = List.copyOf(runs);
  }

  List<NamedRun> runs() {
    return runs;
  }

  /** Which passes most, by how much, and why that may not be held against each other. */
  String sentence() {
    List<String> warnings = warnings();
    return warnings.isEmpty()
        ? lead() + "."
        : lead() + "; not fully comparable: " + String.join(", ", warnings) + ".";
  }

  private String lead() {
    int best = -1;
    int second = -1;
    for (int i = 0; i < runs.size(); i++) {
      Double current = headline(i);
      if (current == null) {
        continue;
      }
      if (best < 0 || current > Objects.requireNonNull(headline(best))) {
        second = best;
        best = i;
      } else if (second < 0 || current > Objects.requireNonNull(headline(second))) {
        second = i;
      }
    }
    if (second < 0) {
      return "These results share no matched current to compare";
    }
    double lead = Objects.requireNonNull(headline(best)) - Objects.requireNonNull(headline(second));
    String first =
        Matrix.letter(best) + " passes " + Numbers.ma(Objects.requireNonNull(headline(best)));
    return lead < 0.005
        ? first + ", as much as " + Matrix.letter(second)
        : first + ", " + Numbers.ma(lead) + " more than " + Matrix.letter(second);
  }

  private @Nullable Double headline(int run) {
    return runs.get(run).result().found().matchedCurrentMaPerCm2();
  }

  /**
   * Why the results should not be held against each other; empty when nothing speaks against it.
   */
  List<String> warnings() {
    List<String> warnings = new ArrayList<>();
    warn(warnings, "the spectrum differs", r -> r.spectrum().name());
    warn(warnings, "the angle of incidence differs", r -> r.spectrum().angleDeg());
    warn(warnings, "the polarisation differs", r -> r.spectrum().polarisation());
    warn(warnings, "the wavelengths differ", r -> r.found().spectral().wavelengthNm());
    warn(warnings, "the solver differs", r -> r.provenance().solver().id());
    warn(warnings, "the version of the solver differs", r -> r.provenance().solver().version());
    warn(warnings, "the version of Evensun differs", r -> r.provenance().evensunVersion());
    warn(warnings, "some are as drawn, others searched", r -> r.search() == null);
    warn(warnings, "the aim differs", r -> r.search() == null ? "" : r.search().aim());
    return warnings;
  }

  private void warn(List<String> warnings, String text, Function<RunResult, Object> of) {
    if (runs.stream().map(run -> of.apply(run.result())).distinct().count() > 1) {
      warnings.add(text);
    }
  }

  /** The subcells of every design as vessels; null where there are no currents. */
  @Nullable Figure levels() {
    List<Design> designs = new ArrayList<>();
    for (int i = 0; i < runs.size(); i++) {
      List<Vessel> vessels = vessels(runs.get(i).result().found());
      if (!vessels.isEmpty()) {
        designs.add(new Design(Matrix.letter(i), vessels, headline(i)));
      }
    }
    String what =
        "The subcells of each design in the order the light meets them, filled to their currents. The"
            + " line is what the design passes;"
            + " what stands above it, hatched, is unused.";
    return designs.isEmpty() ? null : Figure.of(new LevelsBeside(designs), what);
  }

  private static List<Vessel> vessels(Outcome outcome) {
    List<Vessel> vessels = new ArrayList<>();
    for (SubcellOutcome subcell : outcome.subcells()) {
      Double current = subcell.photocurrentMaPerCm2();
      if (current != null) {
        vessels.add(new Vessel(subcell.name(), current, null, subcell.standardErrorMaPerCm2()));
      }
    }
    return vessels;
  }

  /** What the picture of the levels shows, a row per subcell of each design. */
  Table currents() {
    Table.Builder table =
        new Table.Builder("table-levels", "The levels: every subcell's current")
            .words("design")
            .words("subcell")
            .numbers("current", Numbers.MA)
            .numbers("unused", Numbers.MA);
    for (int i = 0; i < runs.size(); i++) {
      Double level = headline(i);
      for (Vessel vessel : vessels(runs.get(i).result().found())) {
        table.row(
            Matrix.letter(i),
            vessel.name(),
            Numbers.fixed(vessel.maPerCm2(), 3),
            level == null ? "" : Numbers.fixed(vessel.maPerCm2() - level, 3));
      }
    }
    return table.build();
  }

  Matrix results() {
    return new Matrix(runs)
        .numbers("matched current", 2, r -> r.found().matchedCurrentMaPerCm2())
        .numbers("mismatch", 2, r -> r.found().mismatchMaPerCm2())
        .words("limited by", r -> r.found().limitingSubcell())
        .numbers(
            "efficiency, %",
            2,
            r -> r.found().electrical() == null ? null : r.found().electrical().efficiencyPercent())
        .each(
            r -> r.found().subcells().stream().map(SubcellOutcome::name).toList(),
            (matrix, name) ->
                matrix.numbers(Clip.to(name, 40), 2, r -> photocurrent(r.found(), name)));
  }

  private static @Nullable Double photocurrent(Outcome outcome, String subcell) {
    for (SubcellOutcome each : outcome.subcells()) {
      if (each.name().equals(subcell)) {
        return each.photocurrentMaPerCm2();
      }
    }
    return null;
  }

  Matrix losses() {
    return new Matrix(runs)
        .each(
            r -> losses(r).stream().map(Share::label).toList(),
            (matrix, label) -> matrix.numbers(Clip.to(label, 60), 3, r -> loss(r, label)));
  }

  private static List<Share> losses(RunResult result) {
    return Budget.of(result.found()).map(Budget::losses).orElse(List.of());
  }

  private static @Nullable Double loss(RunResult result, String label) {
    return losses(result).stream()
        .filter(share -> share.label().equals(label))
        .findFirst()
        .map(Share::maPerCm2)
        .orElse(null);
  }

  /** One row per property of each layer, so that a change stands alone. */
  Matrix stack() {
    Matrix matrix = new Matrix(runs);
    matrix.words("layers", r -> Clip.to(order(r), 400));
    return matrix.each(
        r -> r.found().stack().stream().map(StackEntry::name).toList(),
        (rows, name) -> layer(rows, name));
  }

  private static String order(RunResult result) {
    return result.found().stack().stream().map(StackEntry::name).collect(Collectors.joining(", "));
  }

  private static void layer(Matrix rows, String name) {
    String label = Clip.to(name, 60);
    rows.words(label + ": material", r -> of(r, name, StackEntry::material));
    rows.numbers(label + ": thickness, nm", 1, r -> of(r, name, StackEntry::thicknessNm));
    rows.numbers(label + ": bandgap, eV", 3, r -> of(r, name, StackEntry::bandgapEv));
    rows.words(
        label + ": waves", r -> of(r, name, e -> e.role().equals("layer") ? waves(e) : null));
    rows.words(label + ": part of", r -> of(r, name, StackEntry::subcell));
    rows.words(
        label + ": further",
        r -> of(r, name, e -> e.features().isEmpty() ? null : String.join("; ", e.features())));
  }

  private static String waves(StackEntry entry) {
    return entry.coherent() ? "interfere" : "incoherent";
  }

  private static <T> @Nullable T of(
      RunResult result, String name, Function<StackEntry, @Nullable T> property) {
    for (StackEntry entry : result.found().stack()) {
      if (entry.name().equals(name)) {
        return property.apply(entry);
      }
    }
    return null;
  }

  Matrix assumptions() {
    return new Matrix(runs)
        .words("spectrum", r -> r.spectrum().name())
        .words(
            "incidence",
            r -> Numbers.trimmed(r.spectrum().angleDeg(), 2) + "°, " + r.spectrum().polarisation())
        .words("wavelengths", r -> r.provenance().grid())
        .words(
            "solver", r -> r.provenance().solver().id() + " " + r.provenance().solver().version())
        .words("Evensun", r -> r.provenance().evensunVersion())
        .words("aim", r -> r.search() == null ? null : r.search().aim())
        .words("seed", r -> r.provenance().seed() == null ? null : r.provenance().seed().toString())
        .each(
            r -> r.materials().stream().map(MaterialUse::name).toList(),
            (matrix, name) -> matrix.words("material " + Clip.to(name, 60), r -> source(r, name)));
  }

  private static @Nullable String source(RunResult result, String material) {
    return result.materials().stream()
        .filter(use -> use.name().equals(material))
        .findFirst()
        .map(use -> use.form().isEmpty() ? use.source() : use.source() + "; " + use.form())
        .orElse(null);
  }
}
