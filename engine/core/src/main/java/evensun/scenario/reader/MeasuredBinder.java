package evensun.scenario.reader;

import evensun.scenario.MeasuredSpec;
import evensun.scenario.SubcellSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Shown;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Binds {@code measured}. */
final class MeasuredBinder {

  private MeasuredBinder() {}

  static List<MeasuredSpec> bind(Fields root, List<SubcellSpec> subcells) {
    List<MeasuredSpec> curves = new ArrayList<>();
    Optional<Fields> measured = root.section("measured");
    if (measured.isEmpty()) {
      return curves;
    }
    Fields fields = measured.get();
    fields
        .text("reflectance")
        .ifPresent(path -> curves.add(new MeasuredSpec("", path, fields.place("reflectance"))));
    fields.section("subcells").ifPresent(s -> subcells(s, subcells, curves));
    fields.finish();
    if (fields.keys().isEmpty()) {
      fields.fault(fields.place(), "must name reflectance: FILE, or subcells: {NAME: FILE}");
    }
    return curves;
  }

  private static void subcells(
      Fields fields, List<SubcellSpec> subcells, List<MeasuredSpec> curves) {
    List<String> names = subcells.stream().map(SubcellSpec::name).toList();
    for (String name : fields.keys()) {
      if (names.contains(name)) {
        fields
            .text(name)
            .ifPresent(path -> curves.add(new MeasuredSpec(name, path, fields.place(name))));
      } else if (!names.isEmpty()) {
        fields.fault(
            fields.place(name), Shown.plain(name) + " is no subcell" + Nearest.hint(name, names));
      }
    }
  }
}
