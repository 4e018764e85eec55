package evensun.material;

import evensun.data.DataFile;
import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.Term;
import evensun.material.dispersion.TermKind;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Dispersion terms as the data files write them: {@code model=lorentz peakEv=3.5 ...}. */
final class LibraryTerms {

  private LibraryTerms() {}

  static Dispersion dispersion(DataFile file) {
    List<Term> terms = new ArrayList<>();
    for (String text : file.values("term")) {
      terms.add(term(text));
    }
    return new Dispersion(Double.parseDouble(file.value("epsilon-infinity").orElse("1")), terms);
  }

  private static Term term(String text) {
    Map<String, String> values = new HashMap<>();
    for (String pair : text.split(" ")) {
      int sign = pair.indexOf('=');
      values.put(pair.substring(0, sign), pair.substring(sign + 1));
    }
    TermKind kind = TermKind.named(values.get("model")).orElseThrow();
    double[] parameters = new double[kind.parameters().size()];
    for (int i = 0; i < parameters.length; i++) {
      parameters[i] = Double.parseDouble(values.get(kind.parameters().get(i)));
    }
    return kind.of(parameters);
  }
}
