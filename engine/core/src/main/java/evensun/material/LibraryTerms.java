package evensun.material;

import evensun.data.DataFile;
import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.Term;
import evensun.material.dispersion.TermKind;
import java.util.HashMap;
import java.util.Map;

/** Dispersion terms as the data files write them: {@code model=lorentz peakEv=3.5 ...}. */
final class LibraryTerms {

  private LibraryTerms() {}

  static Dispersion dispersion(DataFile file) {
    return new Dispersion(
        Double.parseDouble(file.value("epsilon-infinity").orElse("1")),
        file.values("term").stream().map(LibraryTerms::term).toList());
  }

  private static Term term(String text) {
    Map<String, String> values = new HashMap<>();
    for (String pair : text.split(" ")) {
      String[] parts = pair.split("=", 2);
      values.put(parts[0], parts[1]);
    }
    TermKind kind = TermKind.named(values.get("model")).orElseThrow();
    return kind.of(
        kind.parameters().stream()
            .mapToDouble(key -> Double.parseDouble(values.get(key)))
            .toArray());
  }
}
