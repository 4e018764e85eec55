package evensun.report.decision;

import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.SearchRecord.ChoiceRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The varied quantities as a person at the deposition tool says them. */
final class Deposit {

  private static final int MOST_PHRASES = 5;
  private static final int MOST_LETTERS = 40;

  private Deposit() {}

  /**
   * Such as {@code 92 nm antireflection, 431.2 nm perovskite of 1.680 eV}; layers about which
   * something was chosen come first.
   */
  static String phrase(List<VariableRecord> variables, List<ChoiceRecord> choices) {
    Map<String, List<VariableRecord>> byLayer = new LinkedHashMap<>();
    Map<String, String> chosen = new LinkedHashMap<>();
    for (ChoiceRecord choice : choices) { // first, since a long list is cut short
      if (isNews(choice)) {
        byLayer.put(Keys.layer(choice.key()), new ArrayList<>());
        chosen.merge(Keys.layer(choice.key()), material(choice), (a, b) -> a.isEmpty() ? b : a);
      }
    }
    for (VariableRecord variable : variables) {
      byLayer.computeIfAbsent(Keys.layer(variable.key()), k -> new ArrayList<>()).add(variable);
    }
    List<String> phrases = new ArrayList<>();
    byLayer.forEach((layer, values) -> phrases.add(layer(layer, values, chosen.get(layer))));
    if (phrases.size() > MOST_PHRASES) {
      int more = phrases.size() - MOST_PHRASES + 1;
      return String.join(", ", phrases.subList(0, MOST_PHRASES - 1))
          + " and "
          + more
          + " more layers";
    }
    return joined(phrases);
  }

  /** A layer that stays as it is goes without saying; its material, once chosen, does not. */
  private static boolean isNews(ChoiceRecord choice) {
    return !choice.asksForPresence() || !choice.found().equals(choice.drawn());
  }

  private static String material(ChoiceRecord choice) {
    boolean there = choice.asksForPresence() && !choice.found().equals(ChoiceRecord.ABSENT);
    return there ? "" : choice.found();
  }

  /**
   * What varied, and what followed it: those of a design's values that did not vary by themselves.
   */
  static List<VariableRecord> withFollowers(
      List<VariableRecord> variables, Map<String, Double> design) {
    List<VariableRecord> all = new ArrayList<>(variables);
    design.forEach(
        (key, value) -> {
          if (variables.stream().noneMatch(v -> v.key().equals(key))) {
            String unit = Keys.unit(key);
            all.add(new VariableRecord(key, unit, value, value, 0, value, value, null, null, null));
          }
        });
    return all;
  }

  private static String layer(
      String layer, List<VariableRecord> values, @Nullable String material) {
    if (ChoiceRecord.ABSENT.equals(material)) {
      return "no " + Clip.to(layer, MOST_LETTERS);
    }
    StringBuilder text = new StringBuilder(Clip.to(layer, MOST_LETTERS));
    if (material != null && !material.isEmpty()) {
      text.append(" of ").append(Clip.to(material, MOST_LETTERS));
    }
    for (VariableRecord value : values) {
      if (Keys.isThickness(value.key())) {
        text.insert(0, Numbers.thickness(value.found()) + " ");
      } else if (Keys.isBandgap(value.key())) {
        text.append(" of ").append(Numbers.quantity(value.found(), "eV"));
      } else {
        text.append(" with ")
            .append(Keys.property(value.key()))
            .append(' ')
            .append(Numbers.quantity(value.found(), value.unit()));
      }
    }
    return text.toString();
  }

  private static String joined(List<String> phrases) {
    int last = phrases.size() - 1;
    return last < 1
        ? String.join("", phrases)
        : String.join(", ", phrases.subList(0, last)) + " and " + phrases.get(last);
  }
}
