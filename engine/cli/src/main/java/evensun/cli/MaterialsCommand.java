package evensun.cli;

import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.material.MaterialRecord;
import evensun.material.Tuning;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code evensun materials}: the library, one material in full, and the check of a table. */
@Command(
    addMethodSubcommands = false,
    name = "materials",
    description = {
      "Lists the library: source, range, bandgap, hazards; or shows materials in full.",
      "With --check it examines a table of your own and ends with the lines to paste into a"
          + " scenario."
    },
    footer = {"", "Example:", "  evensun materials crystalline-silicon"})
final class MaterialsCommand extends BaseCommand {

  private static final List<String> KINDS =
      List.of(
          "absorber", "conductor", "dielectric", "metal", "transport", "encapsulant", "ambient");

  @Parameters(paramLabel = "NAME", arity = "0..*", description = "Materials to show in full.")
  List<String> names = new ArrayList<>();

  @Option(
      names = "--kind",
      paramLabel = "KIND",
      description =
          "Lists only one kind: absorber, conductor, dielectric, metal, transport, encapsulant.")
  String kind;

  @Option(
      names = "--bandgap-ev",
      paramLabel = "EV",
      description = "Bandgap a tunable material is shown at.")
  Double bandgapEv;

  @Option(names = "--csv", description = "Prints wavelength, n, k and absorption coefficient.")
  boolean csv;

  @Option(
      names = "--html",
      paramLabel = "FILE",
      description = "Writes a page with n, k and absorption of the materials over each other.")
  Path html;

  @Option(names = "--check", paramLabel = "FILE", description = "Examines a table of your own.")
  Path check;

  @Mixin TableForm form = new TableForm();

  @Override
  public Integer call() {
    if (check != null) {
      return TableCheck.run(check, form, global().json(), console().out());
    }
    if (kind != null && !KINDS.contains(kind)) {
      throw new InputException(
          Place.option("--kind"),
          "must be one of " + String.join(", ", KINDS) + " but was " + kind);
    }
    List<MaterialCurves> shown = shown();
    if (html != null) {
      write(html, MaterialPage.of(require(shown, "--html")));
      console().out().println(html);
    } else if (csv) {
      console().out().print(MaterialTexts.csv(require(shown, "--csv")));
    } else if (shown.isEmpty()) {
      list();
    } else {
      show(shown);
    }
    return ExitStatus.DONE;
  }

  private static List<MaterialCurves> require(List<MaterialCurves> shown, String option) {
    if (shown.isEmpty()) {
      throw new InputException(
          Place.option(option), "needs the name of a material: evensun materials NAME " + option);
    }
    return shown;
  }

  private void list() {
    List<Material> materials =
        MaterialLibrary.builtIn().names().stream()
            .filter(name -> ofKind(MaterialLibrary.builtIn().record(name)))
            .map(name -> MaterialLibrary.builtIn().find(name).orElseThrow())
            .distinct()
            .toList();
    console()
        .out()
        .print(
            global().json() ? MaterialTexts.json(materials) : MaterialTexts.list(materials, kind));
  }

  private boolean ofKind(Optional<MaterialRecord> record) {
    return kind == null || record.orElseThrow().kind().equals(kind);
  }

  private void show(List<MaterialCurves> shown) {
    for (MaterialCurves curves : shown) {
      console()
          .out()
          .print(global().json() ? MaterialTexts.json(curves) : MaterialTexts.full(curves));
    }
  }

  private List<MaterialCurves> shown() {
    return names.stream().map(this::curves).toList();
  }

  private MaterialCurves curves(String name) {
    MaterialLibrary library = MaterialLibrary.builtIn();
    Material material =
        library
            .find(name)
            .orElseThrow(
                () ->
                    new InputException(
                        Place.option("materials"),
                        "there is no material \"%s\" in the library; the nearest name is %s"
                            .formatted(name, library.nearest(name))));
    return MaterialCurves.of(material, gap(material));
  }

  private double gap(Material material) {
    double otherwise = material.bandgapEv().orElse(0);
    if (bandgapEv == null || material.tuning().isEmpty()) {
      return otherwise;
    }
    Tuning tuning = material.tuning().get();
    if (!(bandgapEv >= tuning.lowEv() && bandgapEv <= tuning.highEv())) {
      throw new InputException(
          Place.option("--bandgap-ev"),
          "must be in [%s, %s] eV for %s but was %s"
              .formatted(tuning.lowEv(), tuning.highEv(), material.record().name(), bandgapEv));
    }
    return bandgapEv;
  }

  private static void write(Path file, String text) {
    try {
      Files.writeString(file, text);
    } catch (IOException e) {
      throw new InputException(
          Place.option("--html"), "\"" + file + "\" cannot be written: " + e.getMessage());
    }
  }
}
