package evensun.externalprocess;

import evensun.spi.Design;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.Problem;
import evensun.spi.Samples;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** What a program is asked. */
final class Requests {

  private static final JsonMapper JSON = JsonMapper.builder().build();

  private Requests() {}

  static ObjectNode prepare(Problem problem, Design start, Map<String, String> options) {
    ObjectNode root = JSON.createObjectNode();
    root.put("evensun", 1).put("request", "prepare");
    ObjectNode node = root.putObject("problem");
    samples(node.putArray("wavelengthNm"), problem.wavelengthNm());
    samples(node.putArray("incidentMaPerCm2"), problem.incidentMaPerCm2());
    ArrayNode layers = node.putArray("layers");
    for (Layer layer : problem.layers()) {
      layers.addObject().put("name", layer.name()).put("coherent", layer.coherent());
    }
    node.put("incidentMaterial", problem.incidentMaterial());
    node.put("exitMaterial", problem.exitMaterial());
    ArrayNode incidences = node.putArray("incidences");
    problem.incidences().forEach(incidence -> incidence(incidences.addObject(), incidence));
    node.put("seed", problem.seed()).put("wantedErrorMaPerCm2", problem.wantedErrorMaPerCm2());
    ObjectNode passed = node.putObject("options");
    options.forEach(passed::put);
    ObjectNode first = root.putObject("start");
    layers(first, start);
    rows(first.putArray("n"), start.n);
    rows(first.putArray("k"), start.k);
    return root;
  }

  /**
   * Asks for designs.
   *
   * @param sent [m] revisions of the rows that the program has; brought up to date
   */
  static ObjectNode evaluate(List<Design> designs, long[] sent) {
    ObjectNode root = JSON.createObjectNode();
    root.put("request", "evaluate");
    ArrayNode array = root.putArray("designs");
    for (Design design : designs) {
      ObjectNode node = array.addObject();
      layers(node, design);
      ArrayNode rows = node.putArray("rows");
      for (int m = 0; m < sent.length; m++) {
        if (sent[m] != design.revision[m]) {
          ObjectNode row = rows.addObject();
          row.put("material", m);
          row(row.putArray("n"), design.n[m]);
          row(row.putArray("k"), design.k[m]);
          sent[m] = design.revision[m];
        }
      }
    }
    return root;
  }

  private static void incidence(ObjectNode node, Incidence incidence) {
    node.put("angleDeg", incidence.angleDeg());
    node.put("polarisation", incidence.polarisation().name().toLowerCase(Locale.ROOT));
    node.put("side", incidence.side().name().toLowerCase(Locale.ROOT));
  }

  private static void layers(ObjectNode node, Design design) {
    row(node.putArray("thicknessNm"), design.thicknessNm);
    ArrayNode materials = node.putArray("material");
    Arrays.stream(design.material).forEach(materials::add);
  }

  private static void rows(ArrayNode array, double[][] rows) {
    for (double[] row : rows) {
      row(array.addArray(), row);
    }
  }

  private static void row(ArrayNode array, double[] row) {
    for (double value : row) {
      array.add(value);
    }
  }

  private static void samples(ArrayNode array, Samples samples) {
    row(array, samples.toArray());
  }
}
