package evensun.report.section;

import evensun.report.decision.ChoiceWords;
import evensun.report.decision.Sentence;
import evensun.report.figure.Figure;
import evensun.report.figure.Share;
import evensun.report.figure.StackPicture;
import evensun.report.figure.StackPicture.Slab;
import evensun.report.figure.StackPicture.Window;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.Outcome;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.AlternativeRecord;
import evensun.result.SearchRecord.ChoiceRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The stack as drawn beside the stack found. */
public final class StackSection {

  private StackSection() {}

  /** The section; absent when the result names no layer. */
  public static Optional<Section> of(RunResult result) {
    if (result.found().stack().isEmpty()) {
      return Optional.empty();
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(picture(result));
    SearchRecord search = result.search();
    if (search != null && !search.choices().isEmpty() && !Sentence.failed(search)) {
      blocks.add(new Block.Grid(choices(search), false));
    }
    if (search != null && !search.variables().isEmpty()) {
      blocks.add(new Block.Grid(variables(search, Sentence.failed(search)), false));
    }
    blocks.add(new Block.Grid(layers(result), true));
    return Optional.of(new Section("stack", "Stack", heading(result), blocks));
  }

  private static String heading(RunResult result) {
    SearchRecord search = result.search();
    long layers =
        result.found().stack().stream().filter(entry -> entry.role().equals("layer")).count();
    if (search == null || search.variables().isEmpty()) {
      return "The stack as drawn: " + Numbers.count((int) layers, "layer");
    }
    if (Sentence.failed(search)) {
      return "No design could be evaluated; the stack as drawn: "
          + Numbers.count((int) layers, "layer");
    }
    VariableRecord most = search.variables().get(0);
    for (VariableRecord variable : search.variables()) {
      most = relativeChange(variable) > relativeChange(most) ? variable : most;
    }
    if (relativeChange(most) < 1e-9) {
      return "The search kept every value as drawn";
    }
    return "Largest change: "
        + Clip.to(Keys.words(most.key()), 60)
        + ", from "
        + Numbers.quantity(most.drawn(), most.unit())
        + " to "
        + Numbers.quantity(most.found(), most.unit());
  }

  private static double relativeChange(VariableRecord variable) {
    double width = variable.high() - variable.low();
    return width > 0 ? Math.abs(variable.found() - variable.drawn()) / width : 0;
  }

  private static Block picture(RunResult result) {
    Outcome drawn = result.asDrawn();
    SearchRecord search = result.search();
    List<VariableRecord> varied =
        search == null || Sentence.failed(search) ? List.of() : search.variables();
    StackPicture picture =
        new StackPicture(
            drawn == null ? List.of() : slabs(drawn, List.of()), slabs(result.found(), varied));
    String what =
        (drawn == null ? "The stack" : "The stack as drawn (left) and as found (right)")
            + ", light from above. Layers are to scale with each other; those of 3 µm and more are cut"
            + " short with a break, and very thin ones are drawn at least as a line."
            + (varied.stream().anyMatch(v -> v.equallyGoodLow() != null)
                ? " Brackets: where the lower face of a layer may lie at no loss to speak of."
                : "");
    return new Block.Picture("fig-stack", Figure.of(picture, what), what);
  }

  private static List<Slab> slabs(Outcome outcome, List<VariableRecord> varied) {
    List<String> names = outcome.subcells().stream().map(SubcellOutcome::name).toList();
    List<Slab> slabs = new ArrayList<>();
    int parasitic = 0;
    for (StackEntry entry : outcome.stack()) {
      int index = entry.subcell() == null ? -1 : names.indexOf(entry.subcell());
      boolean layer = entry.role().equals("layer");
      String other = layer ? Share.parasiticRole(parasitic) : "medium";
      slabs.add(slab(entry, index >= 0 ? Share.subcellRole(index) : other, varied));
      parasitic += layer && index < 0 ? 1 : 0;
    }
    return slabs;
  }

  private static Slab slab(StackEntry entry, String role, List<VariableRecord> varied) {
    double nm = entry.thicknessNm() == null ? Double.NaN : entry.thicknessNm();
    String name = entry.role().equals("exit") ? entry.name() + " (exit)" : entry.name();
    VariableRecord thickness = of(varied, entry.name() + ".thicknessNm");
    VariableRecord gap = of(varied, entry.name() + ".bandgapEv");
    String note = entry.bandgapEv() == null ? "" : Numbers.quantity(entry.bandgapEv(), "eV");
    if (gap != null && gap.equallyGoodLow() != null) {
      note += " (" + range(gap.equallyGoodLow(), gap.equallyGoodHigh(), "eV") + ")";
    }
    return new Slab(name, role, nm, note, thickness == null ? null : window(thickness));
  }

  private static @Nullable VariableRecord of(List<VariableRecord> varied, String key) {
    return varied.stream().filter(v -> v.key().equals(key)).findFirst().orElse(null);
  }

  private static Window window(VariableRecord v) {
    double low = v.equallyGoodLow() == null ? v.found() : v.equallyGoodLow();
    double high = v.equallyGoodHigh() == null ? v.found() : v.equallyGoodHigh();
    String bound = v.bound() == null ? "" : v.bound().equals("low") ? "lower" : "upper";
    return new Window(low, high, bound);
  }

  private static Table choices(SearchRecord search) {
    Table.Builder table =
        new Table.Builder("table-choices", "Choices, and the best found with each alternative")
            .words("choice")
            .words("alternative")
            .words("state")
            .numbers(Keys.aim(search.aim()), search.aimUnit())
            .words("against the design found");
    for (ChoiceRecord choice : search.choices()) {
      for (AlternativeRecord alternative : choice.alternatives()) {
        table.row(
            Keys.words(choice.key()),
            alternative.name(),
            state(choice, alternative.name()),
            alternative.aim() == null ? "" : Numbers.fixed(alternative.aim(), 2),
            alternative.name().equals(choice.found()) ? "" : ChoiceWords.cost(search, alternative));
      }
    }
    return table.build();
  }

  private static String state(ChoiceRecord choice, String name) {
    String drawn = name.equals(choice.drawn()) ? "as drawn" : "";
    String found = name.equals(choice.found()) ? "found" : "";
    return drawn + (drawn.isEmpty() || found.isEmpty() ? "" : ", ") + found;
  }

  private static Table variables(SearchRecord search, boolean failed) {
    boolean ranges =
        !failed && search.variables().stream().anyMatch(v -> v.equallyGoodLow() != null);
    boolean bounds = !failed && search.variables().stream().anyMatch(v -> v.bound() != null);
    Table.Builder table =
        new Table.Builder("table-variables", "What may vary")
            .words("quantity")
            .words("unit")
            .numbers("drawn", "");
    if (!failed) {
      table.numbers("found", "").numbers("change", "");
    }
    if (ranges) {
      table.words("equally good");
    }
    table.words("allowed");
    if (bounds) {
      table.words("bound");
    }
    search.variables().forEach(v -> table.row(row(v, failed, ranges, bounds)));
    return table.build();
  }

  private static List<String> row(
      VariableRecord v, boolean failed, boolean ranges, boolean bounds) {
    List<String> cells =
        new ArrayList<>(List.of(Keys.words(v.key()), v.unit(), Numbers.bare(v.drawn(), v.unit())));
    if (!failed) {
      cells.addAll(List.of(Numbers.bare(v.found(), v.unit()), signed(v)));
    }
    if (ranges) {
      cells.add(range(v.equallyGoodLow(), v.equallyGoodHigh(), v.unit()));
    }
    cells.add(range(v.low(), v.high(), v.unit()) + step(v));
    if (bounds) {
      String side = "low".equals(v.bound()) ? "lower" : "upper";
      cells.add(v.bound() == null ? "" : "at the " + side + " bound");
    }
    return cells;
  }

  private static String signed(VariableRecord v) {
    double change = v.found() - v.drawn();
    return (change > 0 ? "+" : "") + Numbers.bare(change, v.unit());
  }

  private static String step(VariableRecord v) {
    return v.step() > 0 ? ", step " + Numbers.bare(v.step(), v.unit()) : "";
  }

  private static String range(@Nullable Double low, @Nullable Double high, String unit) {
    return low == null || high == null ? "" : Numbers.range(low, high, unit);
  }

  private static Table layers(RunResult result) {
    boolean compared = result.asDrawn() != null;
    Table.Builder table =
        new Table.Builder("table-layers", "Every layer, in the order the light meets them")
            .words("layer")
            .words("material")
            .words("part of");
    if (compared) {
      table.numbers("as drawn", "nm");
    }
    table
        .numbers(compared ? "found" : "thickness", "nm")
        .numbers("bandgap", "eV")
        .words("waves")
        .words("further");
    for (StackEntry entry : result.found().stack()) {
      List<String> cells = new ArrayList<>();
      cells.addAll(List.of(entry.name(), entry.material(), partOf(entry)));
      if (compared) {
        cells.add(drawnNm(result, entry.name()));
      }
      cells.add(nm(entry.thicknessNm()));
      cells.add(entry.bandgapEv() == null ? "" : Numbers.fixed(entry.bandgapEv(), 3));
      cells.add(
          entry.role().equals("layer") ? (entry.coherent() ? "interfere" : "incoherent") : "");
      cells.add(String.join("; ", entry.features()));
      table.row(cells);
    }
    return table.build();
  }

  private static String partOf(StackEntry entry) {
    if (entry.subcell() != null) {
      return "subcell " + entry.subcell();
    }
    return switch (entry.role()) {
      case "incident" -> "incident medium";
      case "exit" -> "exit medium";
      default -> "collects nothing";
    };
  }

  private static String drawnNm(RunResult result, String name) {
    Outcome drawn = result.asDrawn();
    return drawn == null
        ? ""
        : drawn.stack().stream()
            .filter(entry -> entry.name().equals(name))
            .findFirst()
            .map(entry -> nm(entry.thicknessNm()))
            .orElse("");
  }

  private static String nm(@Nullable Double nm) {
    return nm == null ? "" : Numbers.trimmed(nm, 2);
  }
}
