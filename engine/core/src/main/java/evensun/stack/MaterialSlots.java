package evensun.stack;

import evensun.data.DecimalText;
import evensun.material.Composition;
import evensun.material.Material;
import evensun.material.Tuning;
import evensun.scenario.GapChoice;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Collects the rows of optical constants of a stack; fixed materials share a row. */
final class MaterialSlots {

  private final MaterialSource source;
  private final List<MaterialSlot> slots = new ArrayList<>();

  MaterialSlots(MaterialSource source) {
    this.source = source;
  }

  List<MaterialSlot> slots() {
    return slots;
  }

  /** The slot of a layer's material, made when it is not there yet. */
  int slot(String layer, String name, GapChoice choice, Place place) {
    Material material = source.material(name, place);
    OptionalDouble gap =
        material.tuning().isPresent()
            ? chosenGap(material, choice, layer, place)
            : fixedGap(material, choice, layer, name, place);
    for (int i = 0; i < slots.size(); i++) {
      MaterialSlot slot = slots.get(i);
      if (slot.name().equals(name) && !slot.tunable()) {
        slots.set(i, slot.withLayer(layer));
        return i;
      }
    }
    slots.add(new MaterialSlot(name, material, gap, List.of(layer)));
    return slots.size() - 1;
  }

  private static OptionalDouble chosenGap(
      Material material, GapChoice choice, String layer, Place place) {
    Tuning tuning = material.tuning().orElseThrow();
    return switch (choice.key()) {
      case NONE -> OptionalDouble.of(tuning.defaultEv());
      case BANDGAP -> {
        within(material, choice, tuning.lowEv(), tuning.highEv(), "eV", layer, place);
        yield OptionalDouble.of(choice.value());
      }
      case COMPOSITION -> {
        Composition composition = composition(material, tuning, layer, place);
        double low = composition.fraction(tuning.lowEv());
        within(material, choice, low, composition.fraction(tuning.highEv()), "", layer, place);
        yield OptionalDouble.of(composition.bandgapEv(choice.value()));
      }
    };
  }

  private static Composition composition(
      Material material, Tuning tuning, String layer, Place place) {
    return tuning
        .composition()
        .orElseThrow(
            () ->
                new InputException(
                    place,
                    "layer \"%s\": %s has no composition to choose by; write bandgapEv instead"
                        .formatted(layer, material.record().name())));
  }

  private static void within(
      Material material,
      GapChoice choice,
      double low,
      double high,
      String unit,
      String layer,
      Place place) {
    if (!(choice.value() >= low && choice.value() <= high)) {
      String message =
          "layer \"%s\": %s must be in [%s, %s] %s for %s but was %s"
              .formatted(
                  layer,
                  choice.key().word(),
                  DecimalText.of(low, 5),
                  DecimalText.of(high, 5),
                  unit,
                  material.record().name(),
                  choice.value());
      throw new InputException(place, message.replace("]  for", "] for"));
    }
  }

  private static OptionalDouble fixedGap(
      Material material, GapChoice choice, String layer, String name, Place place) {
    if (choice.isPresent()) {
      throw new InputException(
          place,
          "layer \"%s\": the bandgap of %s cannot be chosen; leave %s out or take a tunable"
                  .formatted(layer, name, choice.key().word())
              + " material (evensun materials lists them)");
    }
    return material.bandgapEv();
  }
}
