package evensun.scenario.reader;

import evensun.scenario.MaterialSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Shown;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Binds {@code materials}. */
final class MaterialBinder {

  private MaterialBinder() {}

  static Map<String, MaterialSpec> bind(Fields root) {
    Map<String, MaterialSpec> materials = new LinkedHashMap<>();
    Optional<Mapping> section = root.node("materials").flatMap(n -> mapping(root));
    if (section.isEmpty()) {
      return materials;
    }
    Fields names = new Fields("materials", section.get(), root.faults());
    for (Entry entry : section.get().entries()) {
      Scalar name = new Scalar(entry.key(), true, entry.keyPlace());
      if (NameRule.MATERIAL.read("materials: a name", name, root.faults()).isPresent()) {
        names.node(entry.key());
        one(entry, root).ifPresent(m -> materials.putIfAbsent(entry.key(), m));
      }
    }
    return materials;
  }

  /** {@code materials:} with nothing below it is what a person leaves who needs none. */
  private static Optional<Mapping> mapping(Fields root) {
    boolean nothing = root.node("materials").orElseThrow() instanceof Scalar s && s.isNothing();
    return nothing ? Optional.empty() : root.mapping("materials");
  }

  private static Optional<MaterialSpec> one(Entry entry, Fields root) {
    String who = "material " + Shown.quoted(entry.key());
    if (!(entry.value() instanceof Mapping mapping)) {
      root.fault(
          entry.value().place(),
          who
              + " must be described, such as {table: file.csv}, but was "
              + entry.value().described());
      return Optional.empty();
    }
    return table(new Fields(who, mapping, root.faults()));
  }

  private static Optional<MaterialSpec> table(Fields fields) {
    Optional<String> path =
        fields.requiredText("table", "the name of a CSV file with wavelength_nm,n,k");
    boolean hold = fields.choice("extrapolate", Map.of("hold", true)).orElse(false);
    fields.finish();
    return path.map(p -> new MaterialSpec.Table(p, hold, fields.place("table")));
  }
}
