package evensun.testkit;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Writes a case as a scenario with its tables, so that it can be looked at and run. */
public final class CaseFiles {

  /** Materials are linear in the wavelength, so two rows say everything. */
  private static final double[] TABLE_NM = {200, 2000};

  private static final double STEP_NM = 100;

  private CaseFiles() {}

  /**
   * Writes {@code scenario.yaml} and a table for each material.
   *
   * @param stack the case
   * @param solverId solver that the scenario names
   * @param options options of that solver
   * @param title title of the scenario
   * @param folder where to; made when absent, files of these names are replaced
   * @return the scenario file
   */
  public static Path write(
      StackCase stack, String solverId, Map<String, String> options, String title, Path folder)
      throws IOException {
    Files.createDirectories(folder);
    table(folder, "incident", stack.incident());
    for (int l = 0; l < stack.layerCount(); l++) {
      table(folder, layer(l), stack.layers().get(l).medium());
    }
    table(folder, "exit", stack.exit());
    Path scenario = folder.resolve("scenario.yaml");
    Files.writeString(scenario, yaml(stack, solverId, options, title));
    return scenario;
  }

  private static void table(Path folder, String name, CaseMedium medium) throws IOException {
    StringBuilder csv = new StringBuilder("wavelength_nm,n,k\n");
    for (double wavelengthNm : TABLE_NM) {
      csv.append(wavelengthNm).append(',').append(medium.nAt(wavelengthNm));
      csv.append(',').append(medium.k()).append('\n');
    }
    Files.writeString(folder.resolve(name + ".csv"), csv.toString());
  }

  private static String yaml(
      StackCase stack, String solverId, Map<String, String> options, String title) {
    StringBuilder yaml = new StringBuilder("evensun: 1\n");
    yaml.append("title: \"").append(title.replace("\"", "'")).append("\"\n");
    yaml.append("light: {spectrum: AM1.5G, angleDeg: ").append(stack.angleDeg());
    String polarisation = stack.polarisation().name().toLowerCase(Locale.ROOT);
    yaml.append(", polarisation: ").append(polarisation).append("}\n");
    double last = stack.wavelengthNm().at(stack.wavelengthCount() - 1);
    yaml.append("grid: {fromNm: ").append(stack.wavelengthNm().at(0));
    yaml.append(", toNm: ").append(last).append(", stepNm: ").append(STEP_NM).append("}\n");
    yaml.append("materials:\n");
    material(yaml, "incident");
    for (int l = 0; l < stack.layerCount(); l++) {
      material(yaml, layer(l));
    }
    material(yaml, "exit");
    yaml.append("stack:\n  - {medium: incident}\n");
    for (int l = 0; l < stack.layerCount(); l++) {
      CaseLayer layer = stack.layers().get(l);
      yaml.append("  - {name: ").append(layer(l)).append(", material: ").append(layer(l));
      yaml.append(", thicknessNm: ").append(layer.thicknessNm());
      yaml.append(", coherence: ").append(layer.coherent() ? "coherent" : "incoherent");
      yaml.append("}\n");
    }
    yaml.append("  - {name: exit, material: exit}\n");
    String absorber = stack.layerCount() == 0 ? "exit" : layer(0);
    yaml.append("subcells:\n  - {name: cell, absorbers: [").append(absorber).append("]}\n");
    yaml.append("connection: series\n");
    yaml.append("solver:\n  id: ").append(solverId).append('\n');
    if (!options.isEmpty()) {
      yaml.append("  options:\n");
      options.forEach(
          (key, value) ->
              yaml.append("    ").append(key).append(": \"").append(value).append("\"\n"));
    }
    return yaml.toString();
  }

  private static String layer(int index) {
    return "layer-" + (index + 1);
  }

  private static void material(StringBuilder yaml, String name) {
    yaml.append("  ").append(name).append(": {table: ").append(name).append(".csv}\n");
  }
}
