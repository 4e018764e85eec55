package evensun.run;

import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Front;
import evensun.result.SearchRecord.FrontPoint;
import evensun.result.SearchRecord.Optimum;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The good designs of a search as a table: those of its front where there are several aims, else
 * the distinct optima, best first. Keys of the scenario head what each design is made of; a cell
 * stays empty where a design does not have it.
 */
final class DesignTable {

  /**
   * A design.
   *
   * @param aims value of each aim
   * @param values its numbers by key
   * @param choices its alternatives by key
   */
  private record Design(
      List<Double> aims, Map<String, Double> values, Map<String, String> choices) {

    static Design of(FrontPoint point) {
      return new Design(point.aims(), point.values(), point.choices());
    }

    static Design of(Optimum optimum) {
      return new Design(List.of(optimum.aim()), optimum.values(), optimum.choices());
    }
  }

  private DesignTable() {}

  static String of(SearchRecord search) {
    Front front = search.front();
    List<Design> designs =
        front == null
            ? search.optima().stream().map(Design::of).toList()
            : front.points().stream().map(Design::of).toList();
    Set<String> choices = new LinkedHashSet<>();
    Set<String> keys = new LinkedHashSet<>();
    designs.forEach(design -> choices.addAll(design.choices().keySet()));
    designs.forEach(design -> keys.addAll(design.values().keySet()));
    List<List<Object>> rows = new ArrayList<>();
    rows.add(head(search, choices, keys));
    for (int i = 0; i < designs.size(); i++) {
      rows.add(row(i + 1, designs.get(i), choices, keys));
    }
    return Tables.csv(rows);
  }

  private static List<Object> head(SearchRecord search, Set<String> choices, Set<String> keys) {
    Front front = search.front();
    List<Object> head = new ArrayList<>(List.of("design"));
    for (int aim = 0; aim < (front == null ? 1 : front.aims().size()); aim++) {
      String name = front == null ? search.aim() : front.aims().get(aim);
      String unit = front == null ? search.aimUnit() : front.units().get(aim);
      head.add(unit.isEmpty() ? name : name + " (" + unit + ")");
    }
    head.addAll(choices);
    head.addAll(keys);
    return head;
  }

  private static List<Object> row(
      int number, Design design, Set<String> choices, Set<String> keys) {
    List<Object> row = new ArrayList<>(List.of(number));
    row.addAll(design.aims());
    choices.forEach(key -> row.add(design.choices().getOrDefault(key, "")));
    keys.forEach(key -> row.add(design.values().containsKey(key) ? design.values().get(key) : ""));
    return row;
  }
}
