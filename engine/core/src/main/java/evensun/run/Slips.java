package evensun.run;

import evensun.scenario.LayerSpec;
import evensun.spi.Finding;
import evensun.spi.Severity;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/** Values that are allowed but look like a slip of the pen. */
final class Slips {

  /** What people measure in micrometres or millimetres, by name of the layer or its material. */
  private static final Set<String> THICK =
      Set.of("wafer", "glass", "substrate", "superstrate", "encapsulant", "crystalline-silicon");

  /** Thinner than any wafer or sheet, but a usual number of micrometres. */
  private static final double THICKNESS_NM = 1000;

  private Slips() {}

  static List<Finding> of(ResolvedStack stack) {
    List<Finding> findings = new ArrayList<>();
    for (ResolvedLayer layer : stack.layers()) {
      LayerSpec spec = layer.spec();
      if (spec.thicknessNm() >= 10 && spec.thicknessNm() < THICKNESS_NM && isThickThing(spec)) {
        findings.add(
            new Finding(
                "thickness-in-micrometres",
                Severity.WARNING,
                layer.name(),
                String.format(
                    Locale.ROOT,
                    "%.6g nm is very thin for %s; if %.6g µm was meant, write thicknessNm: %.0f",
                    spec.thicknessNm(),
                    spec.material(),
                    spec.thicknessNm(),
                    spec.thicknessNm() * 1000)));
      }
    }
    return findings;
  }

  private static boolean isThickThing(LayerSpec spec) {
    return THICK.stream().anyMatch(t -> spec.name().contains(t) || spec.material().contains(t));
  }
}
