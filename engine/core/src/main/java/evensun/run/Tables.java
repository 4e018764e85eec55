package evensun.run;

import evensun.result.DepthLayer;
import evensun.result.MaterialUse;
import evensun.result.Outcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** The tables of a result as CSV files; every column names its unit. */
public final class Tables {

  private Tables() {}

  /** All tables of a result by file name. */
  public static Map<String, String> of(RunResult result) {
    Map<String, String> tables = new LinkedHashMap<>();
    tables.put("tables/currents.csv", currents(result.found()));
    tables.put("tables/spectra.csv", spectra(result.found().spectral()));
    if (result.asDrawn() != null) {
      tables.put("tables/spectra-as-drawn.csv", spectra(result.asDrawn().spectral()));
    }
    tables.put("tables/optical-constants.csv", constants(result));
    if (result.search() != null) {
      tables.put("tables/search-history.csv", history(result.search()));
      tables.put("tables/designs.csv", DesignTable.of(result.search()));
    }
    if (result.depth() != null) {
      tables.put("tables/generation.csv", generation(result.depth()));
    }
    return tables;
  }

  private static String currents(Outcome outcome) {
    List<List<Object>> rows = new ArrayList<>();
    rows.add(List.of("what", "name", "mA_per_cm2"));
    if (outcome.losses() == null) {
      return csv(rows);
    }
    outcome
        .subcells()
        .forEach(s -> rows.add(List.of("subcell", s.name(), s.photocurrentMaPerCm2())));
    rows.add(List.of("loss", "reflected", outcome.losses().reflectedMaPerCm2()));
    rows.add(List.of("loss", "transmitted", outcome.losses().transmittedMaPerCm2()));
    outcome.losses().parasitic().forEach(p -> rows.add(List.of("loss", p.layer(), p.maPerCm2())));
    rows.add(List.of("total", "incident", outcome.incidentMaPerCm2()));
    return csv(rows);
  }

  private static String spectra(Outcome.Spectral spectral) {
    Map<String, List<Double>> columns = new LinkedHashMap<>();
    columns.put("wavelength_nm", spectral.wavelengthNm());
    columns.put("incident_mA_per_cm2", spectral.incidentMaPerCm2());
    columns.put("reflectance", spectral.reflectance());
    columns.put("transmittance", spectral.transmittance());
    spectral.absorptance().forEach((layer, row) -> columns.put("absorptance " + layer, row));
    return columns(columns);
  }

  private static String constants(RunResult result) {
    Map<String, List<Double>> columns = new LinkedHashMap<>();
    columns.put("wavelength_nm", result.found().spectral().wavelengthNm());
    for (MaterialUse use : result.materials()) {
      String label = use.name() + " (" + String.join(" ", use.layers()) + ")";
      columns.put("n " + label, use.n());
      columns.put("k " + label, use.k());
    }
    return columns(columns);
  }

  private static String history(SearchRecord search) {
    List<List<Object>> rows = new ArrayList<>();
    rows.add(List.of("generation", "evaluations", "best", "mean"));
    search
        .history()
        .forEach(g -> rows.add(List.of(g.generation(), g.evaluations(), g.best(), g.mean())));
    return csv(rows);
  }

  private static String generation(List<DepthLayer> depth) {
    List<List<Object>> rows = new ArrayList<>();
    rows.add(List.of("layer", "depth_nm", "generation_per_cm3_s"));
    for (DepthLayer layer : depth) {
      for (int i = 0; i < layer.depthNm().size(); i++) {
        rows.add(List.of(layer.layer(), layer.depthNm().get(i), layer.generationPerCm3S().get(i)));
      }
    }
    return csv(rows);
  }

  private static String columns(Map<String, List<Double>> columns) {
    List<List<Object>> rows = new ArrayList<>();
    rows.add(List.copyOf(columns.keySet()));
    int count = columns.values().iterator().next().size();
    for (int i = 0; i < count; i++) {
      List<Object> row = new ArrayList<>();
      for (List<Double> column : columns.values()) {
        row.add(column.get(i));
      }
      rows.add(row);
    }
    return csv(rows);
  }

  static String csv(List<? extends List<?>> rows) {
    StringBuilder text = new StringBuilder();
    try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
      for (List<?> row : rows) {
        printer.printRecord(row);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }
}
