package evensun.evaluation;

import evensun.stack.MaterialSlot;
import evensun.stack.ResolvedStack;
import java.util.Optional;

/**
 * A number of the stack that may be set by its key.
 *
 * @param key as in the scenario, such as {@code perovskite.thicknessNm}
 * @param unit as shown to people
 * @param kind what it is
 * @param index layer of a thickness, slot of a bandgap or composition, index of a knob
 * @param drawn value as drawn
 */
public record Parameter(String key, String unit, Kind kind, int index, double drawn) {

  /** What a parameter is. */
  public enum Kind {
    /** Thickness of a layer in nm. */
    THICKNESS,
    /** Bandgap of a tunable material in eV. */
    BANDGAP,
    /** Composition of a tunable alloy, a fraction. */
    COMPOSITION,
    /** Knob of a feature. */
    KNOB
  }

  /** The parameter of a key, or empty when the key names none that can be set. */
  public static Optional<Parameter> of(String key, ResolvedStack stack) {
    int dot = key.lastIndexOf('.');
    if (dot < 0) {
      return Optional.empty();
    }
    String layer = key.substring(0, dot);
    return switch (key.substring(dot + 1)) {
      case "thicknessNm" -> thickness(key, layer, stack);
      case "bandgapEv" -> tunable(key, "eV", Kind.BANDGAP, layer, stack);
      case "compositionFraction" -> tunable(key, "", Kind.COMPOSITION, layer, stack);
      default -> knob(key, stack);
    };
  }

  private static Optional<Parameter> knob(String key, ResolvedStack stack) {
    return stack.knobs().stream()
        .filter(knob -> knob.key().equals(key))
        .map(
            knob ->
                new Parameter(
                    key, knob.knob().unit(), Kind.KNOB, knob.knob().index(), knob.drawn()))
        .findFirst();
  }

  private static Optional<Parameter> thickness(String key, String layer, ResolvedStack stack) {
    for (int i = 0; i < stack.layers().size(); i++) {
      if (stack.layers().get(i).name().equals(layer)) {
        double drawn = stack.layers().get(i).spec().thicknessNm();
        return Optional.of(new Parameter(key, "nm", Kind.THICKNESS, i, drawn));
      }
    }
    return Optional.empty();
  }

  private static Optional<Parameter> tunable(
      String key, String unit, Kind kind, String layer, ResolvedStack stack) {
    for (int s = 0; s < stack.slots().size(); s++) {
      MaterialSlot slot = stack.slots().get(s);
      if (slot.tunable() && slot.layers().contains(layer)) {
        int index = s;
        return drawn(kind, slot).map(drawn -> new Parameter(key, unit, kind, index, drawn));
      }
    }
    return Optional.empty();
  }

  private static Optional<Double> drawn(Kind kind, MaterialSlot slot) {
    return kind == Kind.BANDGAP
        ? Optional.of(slot.fillValue())
        : slot.tuning().composition().map(c -> c.fraction(slot.fillValue()));
  }

  /** Whether it sets a bandgap, as such or by a composition. */
  public boolean setsGap() {
    return kind == Kind.BANDGAP || kind == Kind.COMPOSITION;
  }

  /** Smallest value that the material of a bandgap or composition allows, in its unit. */
  public double materialLow(ResolvedStack stack) {
    return inOwnUnit(stack, stack.slots().get(index).tuning().lowEv());
  }

  /** Largest value that the material of a bandgap or composition allows, in its unit. */
  public double materialHigh(ResolvedStack stack) {
    return inOwnUnit(stack, stack.slots().get(index).tuning().highEv());
  }

  private double inOwnUnit(ResolvedStack stack, double bandgapEv) {
    return kind == Kind.COMPOSITION
        ? stack.slots().get(index).tuning().composition().orElseThrow().fraction(bandgapEv)
        : bandgapEv;
  }
}
