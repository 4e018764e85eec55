package evensun.stack;

import evensun.material.Material;
import evensun.material.Tuning;
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
  int slot(String layer, String name, OptionalDouble bandgapEv, Place place) {
    Material material = source.material(name, place);
    OptionalDouble gap =
        material.tuning().isPresent()
            ? chosenGap(material, bandgapEv, layer, place)
            : fixedGap(material, bandgapEv, layer, name, place);
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
      Material material, OptionalDouble wanted, String layer, Place place) {
    Tuning tuning = material.tuning().orElseThrow();
    double gap = wanted.orElse(tuning.defaultEv());
    if (gap < tuning.lowEv() || gap > tuning.highEv()) {
      throw new InputException(
          place,
          "layer \"%s\": bandgapEv must be in [%s, %s] eV for %s but was %s"
              .formatted(layer, tuning.lowEv(), tuning.highEv(), material.record().name(), gap));
    }
    return OptionalDouble.of(gap);
  }

  private static OptionalDouble fixedGap(
      Material material, OptionalDouble wanted, String layer, String name, Place place) {
    if (wanted.isPresent()) {
      throw new InputException(
          place,
          "layer \"%s\": the bandgap of %s cannot be chosen; leave bandgapEv out or take a tunable"
                  .formatted(layer, name)
              + " material (evensun materials lists them)");
    }
    return material.bandgapEv();
  }
}
