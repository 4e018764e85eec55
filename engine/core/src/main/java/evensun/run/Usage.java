package evensun.run;

import evensun.evaluation.Bench;
import evensun.material.MaterialRecord;
import evensun.result.MaterialUse;
import evensun.result.SpectrumUse;
import evensun.scenario.LightSpec;
import evensun.stack.MaterialSlot;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/** Records the materials and the light as a design used them. */
final class Usage {

  private Usage() {}

  static List<MaterialUse> materials(Bench bench) {
    ResolvedStack stack = bench.model().stack();
    List<MaterialUse> uses = new ArrayList<>();
    for (int s = 0; s < stack.slots().size(); s++) {
      MaterialSlot slot = stack.slots().get(s);
      List<String> layers = slot.layers().stream().filter(stack.scenario()::isThere).toList();
      if (!layers.isEmpty()) {
        uses.add(use(bench, s, slot, layers));
      }
    }
    uses.addAll(EffectiveMedia.of(bench));
    return uses;
  }

  private static MaterialUse use(Bench bench, int s, MaterialSlot slot, List<String> layers) {
    MaterialRecord record = slot.material().record();
    double gap = bench.bandgapEv(s);
    return new MaterialUse(
        slot.name(),
        record.title(),
        layers,
        record.source(),
        record.form(),
        record.fromNm(),
        record.toNm(),
        record.temperatureK(),
        gap > 0 ? gap : null,
        record.fromMemory(),
        record.notes(),
        Arrays.stream(bench.design().n[s]).boxed().toList(),
        Arrays.stream(bench.design().k[s]).boxed().toList());
  }

  static SpectrumUse spectrum(ResolvedStack stack) {
    LightSpec light = stack.scenario().light();
    return new SpectrumUse(
        stack.spectrum().name(),
        stack.spectrum().source(),
        stack.spectrum().totalWPerM2(),
        light.angleDeg(),
        light.polarisation().name().toLowerCase(Locale.ROOT));
  }
}
