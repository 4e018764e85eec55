package evensun.run;

import evensun.result.Caution;
import evensun.stack.MaterialSlot;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The limits of every prediction and the hazards of the materials of a stack. */
final class Cautions {

  private static final Caution LIMITS =
      new Caution(
          "What this result is",
          "A prediction of idealised optics. It says nothing about stability, lifetime or certified efficiency and replaces no measurement.");

  private static final Caution DEFER =
      new Caution(
          "Working safely",
          "This list is a reminder, not an instruction: follow the safety data sheets, your local rules and the advice of trained staff.");

  private Cautions() {}

  static List<Caution> of(ResolvedStack stack) {
    List<Caution> cautions = new ArrayList<>();
    cautions.add(LIMITS);
    Map<String, Caution> byMaterial = new LinkedHashMap<>();
    for (MaterialSlot slot : stack.usedSlots()) {
      byMaterial.computeIfAbsent(slot.name(), name -> caution(slot));
    }
    byMaterial.values().stream().filter(c -> !c.text().isEmpty()).forEach(cautions::add);
    cautions.add(DEFER);
    return cautions;
  }

  private static Caution caution(MaterialSlot slot) {
    return new Caution(slot.name(), String.join(" ", slot.material().record().hazards()));
  }
}
