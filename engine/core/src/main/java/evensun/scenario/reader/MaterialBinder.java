package evensun.scenario.reader;

import evensun.material.table.TableHints;
import evensun.material.table.TableHints.Extinction;
import evensun.material.table.TableHints.WavelengthUnit;
import evensun.scenario.MaterialSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Shown;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

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
    Fields fields = new Fields(who, mapping, root.faults());
    if (fields.has("terms")) {
      return TermBinder.bind(fields);
    }
    return fields.has("idealAbsorber") ? ideal(fields) : table(fields);
  }

  private static Optional<MaterialSpec> table(Fields fields) {
    Optional<String> path =
        fields.requiredText("table", "the name of a CSV file with wavelength_nm,n,k");
    Optional<String> extinctionPath = fields.text("extinctionTable");
    TableHints hints =
        new TableHints(
            fields.choice("wavelengthUnit", keyed(WavelengthUnit.values(), WavelengthUnit::key)),
            fields.choice("extinction", keyed(Extinction.values(), Extinction::key)));
    boolean hold = fields.choice("extrapolate", Map.of("hold", true)).orElse(false);
    boolean clean = fields.choice("clean", Map.of("urbach", true)).orElse(false);
    fields.know("terms", "epsilonInfinity", "idealAbsorber");
    fields.finish();
    return path.map(
        p -> new MaterialSpec.Table(p, extinctionPath, hints, hold, clean, fields.place("table")));
  }

  private static Optional<MaterialSpec> ideal(Fields fields) {
    Optional<Fields> inner = fields.section("idealAbsorber");
    fields.finish();
    if (inner.isEmpty()) {
      return Optional.empty();
    }
    double index = inner.get().requiredNumber("refractiveIndex", Interval.closed(0.1, 10, ""));
    double absorption =
        inner.get().number("absorptionPerCm", Interval.closed(0, 1e7, "per cm")).orElse(1e5);
    inner.get().finish();
    return Double.isNaN(index)
        ? Optional.empty()
        : Optional.of(new MaterialSpec.Ideal(index, absorption, fields.place("idealAbsorber")));
  }

  private static <T> Map<String, T> keyed(T[] values, Function<T, String> key) {
    Map<String, T> choices = new LinkedHashMap<>();
    for (T value : values) {
      choices.put(key.apply(value), value);
    }
    return choices;
  }
}
