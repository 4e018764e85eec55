package evensun.report.section;

import evensun.report.page.Table;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * The columns of a table of designs that tell what each is made of: first the alternatives chosen,
 * then the numbers. A cell stays empty where a design does not have what its column is about.
 */
final class DesignColumns {

  private final Set<String> choices = new LinkedHashSet<>();
  private final Map<String, String> units = new LinkedHashMap<>();

  /**
   * Columns for some designs of a search.
   *
   * @param values the numbers of each design by key
   * @param chosen the alternatives of each design by key
   */
  DesignColumns(
      SearchRecord search,
      Collection<Map<String, Double>> values,
      Collection<Map<String, String>> chosen) {
    chosen.forEach(design -> choices.addAll(design.keySet()));
    Map<String, String> known =
        search.variables().stream().collect(Collectors.toMap(VariableRecord::key, v -> v.unit()));
    search.variables().forEach(v -> units.put(v.key(), v.unit()));
    // What the design found does not have, others may: the thickness of a layer left out.
    for (Map<String, Double> design : values) {
      design
          .keySet()
          .forEach(key -> units.putIfAbsent(key, known.getOrDefault(key, Keys.unit(key))));
    }
  }

  void addTo(Table.Builder table) {
    choices.forEach(key -> table.words(Keys.words(key)));
    units.forEach((key, unit) -> table.numbers(Keys.words(key), unit));
  }

  List<String> cells(Map<String, Double> values, Map<String, String> chosen) {
    List<String> cells = new ArrayList<>();
    choices.forEach(key -> cells.add(chosen.getOrDefault(key, "")));
    units.forEach(
        (key, unit) -> {
          Double value = values.get(key);
          cells.add(value == null ? "" : Numbers.bare(value, unit));
        });
    return cells;
  }
}
