package evensun.cli;

import evensun.report.gaps.GapPage;
import evensun.result.BandgapMap;
import evensun.result.BandgapMap.Point;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** A bandgap map as text, JSON and CSV. */
final class GapTexts {

  private static final JsonMapper JSON =
      JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();

  private GapTexts() {}

  static String text(BandgapMap map, @Nullable Path html, @Nullable Path csv) {
    BandgapMap.Conditions c = map.conditions();
    StringBuilder text = new StringBuilder();
    text.append(
        String.format(
            Locale.ROOT,
            "Best: %.2f %% at %s eV (%s)%n",
            map.optimum().efficiencyPercent(),
            GapPage.gaps(map.optimum()),
            String.join(" / ", c.junctions())));
    text.append(GapPage.ridgeSentence(map)).append('\n');
    text.append(
        String.format(
            Locale.ROOT,
            "Detailed balance, %s, %s, %s K, %s%n",
            c.spectrum(),
            c.connection(),
            number(c.temperatureK()),
            c.concentrationSuns() == 1 ? "one sun" : number(c.concentrationSuns()) + " suns"));
    if (html != null) {
      text.append("Page: ").append(html).append('\n');
    }
    if (csv != null) {
      text.append("Table: ").append(csv).append('\n');
    }
    return text.toString();
  }

  /** The optimum, the ridge and the conditions; the whole map goes into a table. */
  static String json(BandgapMap map) {
    ObjectNode root = JSON.createObjectNode();
    root.set("optimum", point(map.optimum()));
    root.put("ridgeFromPercent", map.ridgeFromPercent());
    ArrayNode ridge = root.putArray("ridge");
    map.ridge().forEach(point -> ridge.add(point(point)));
    root.set("conditions", JSON.valueToTree(map.conditions()));
    return JSON.writeValueAsString(root) + "\n";
  }

  private static ObjectNode point(Point point) {
    ObjectNode node = JSON.createObjectNode();
    ArrayNode gaps = node.putArray("gapsEv");
    point.gapsEv().forEach(gaps::add);
    node.put("efficiencyPercent", point.efficiencyPercent());
    return node;
  }

  /** One line for each point of the map, gaps in the order the light meets them. */
  static String csv(BandgapMap map) {
    StringBuilder text = new StringBuilder();
    map.conditions().junctions().forEach(name -> text.append(name).append("_ev,"));
    text.append("efficiency_percent\n");
    for (int row = 0; row < map.efficiencyPercent().size(); row++) {
      for (int column = 0; column < map.efficiencyPercent().get(row).size(); column++) {
        Double value = map.efficiencyPercent().get(row).get(column);
        if (value != null) {
          line(text, map, row, column, value);
        }
      }
    }
    return text.toString();
  }

  private static void line(
      StringBuilder text, BandgapMap map, int row, int column, double efficiencyPercent) {
    List<String> junctions = map.conditions().junctions();
    for (int j = 0; j < junctions.size(); j++) {
      text.append(number(gap(map, j, row, column))).append(',');
    }
    text.append(String.format(Locale.ROOT, "%.4f%n", efficiencyPercent));
  }

  private static double gap(BandgapMap map, int junction, int row, int column) {
    String name = map.conditions().junctions().get(junction);
    int axis = map.axes().indexOf(name);
    Double fixed = map.conditions().fixedEv().get(junction);
    if (axis >= 0) {
      return map.axisEv().get(axis).get(axis == 0 ? row : column);
    }
    if (fixed != null) {
      return fixed;
    }
    Double inner = map.innerEv() == null ? null : map.innerEv().get(row).get(column);
    return inner == null ? Double.NaN : inner;
  }

  private static String number(double value) {
    return new java.math.BigDecimal(value)
        .round(new java.math.MathContext(6))
        .stripTrailingZeros()
        .toPlainString();
  }
}
