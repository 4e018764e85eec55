package evensun.run;

import evensun.data.TableFormatException;
import evensun.light.Constants;
import evensun.light.Spectrum;
import evensun.material.IdealAbsorber;
import evensun.material.Material;
import evensun.material.MaterialRecord;
import evensun.material.ModelMaterial;
import evensun.material.OwnTable;
import evensun.material.Tuning;
import evensun.material.table.OpticalTableReader;
import evensun.material.table.RawTable;
import evensun.scenario.GridSpec;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.MaterialSpec;
import evensun.scenario.Place;
import java.util.List;

/** Makes the materials that a scenario brings. */
final class OwnTables {

  private static final List<String> HAZARDS =
      List.of("Hazards not known: a material of the user's own; see its safety data sheet.");

  private OwnTables() {}

  static Material material(
      String name, MaterialSpec spec, InputFiles files, Spectrum spectrum, GridSpec grid) {
    if (spec instanceof MaterialSpec.Table table) {
      return table(name, table, files, spectrum, grid);
    }
    if (spec instanceof MaterialSpec.Model model) {
      return ModelMaterial.of(
          record(name, "model", "dispersion model written in the scenario"), model.dispersion());
    }
    MaterialSpec.Ideal ideal = (MaterialSpec.Ideal) spec;
    return IdealAbsorber.of(
        record(name, "absorber", "ideal absorber described in the scenario"),
        new Tuning(0.4, 4.0, 1.4),
        ideal.refractiveIndex(),
        ideal.absorptionPerCm());
  }

  private static Material table(
      String name, MaterialSpec.Table spec, InputFiles files, Spectrum spectrum, GridSpec grid) {
    try {
      OwnTable table = new OwnTable(name, spec.path(), raw(spec, files), spec.hold(), spec.clean());
      return table.material(spectrum, grid.fromNm(), grid.toNm());
    } catch (TableFormatException e) {
      throw new InputException(new Place(spec.path(), e.line(), 1, ""), e.getMessage());
    }
  }

  private static RawTable raw(MaterialSpec.Table spec, InputFiles files) {
    String text = files.text(spec.path(), spec.place());
    return spec.extinctionPath().isPresent()
        ? OpticalTableReader.read(
            text, files.text(spec.extinctionPath().get(), spec.place()), spec.hints())
        : OpticalTableReader.read(text, spec.hints());
  }

  private static MaterialRecord record(String name, String kind, String source) {
    return new MaterialRecord(
        name,
        name,
        kind,
        "as described by the user",
        source,
        0,
        100,
        100000,
        Constants.CELL_TEMPERATURE_K,
        false,
        HAZARDS,
        List.of(),
        List.of());
  }
}
