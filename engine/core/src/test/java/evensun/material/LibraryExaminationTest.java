package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.light.Spectra;
import evensun.material.table.Examination;
import evensun.material.table.OpticalTable;
import evensun.spi.Finding;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What an examination finds in the library's own numbers stands in their headers, so that a
 * scenario says it without examining them anew.
 */
class LibraryExaminationTest {

  private static final double[] USUAL_NM =
      IntStream.rangeClosed(280, 1200).mapToDouble(i -> i).toArray();

  /** Free carriers absorb below the gap and take n below 1: nothing surprising in a conductor. */
  private static final Set<String> OF_CONDUCTORS =
      Set.of("table-low-index", "table-floor-below-gap");

  private static List<String> names() {
    MaterialLibrary library = MaterialLibrary.builtIn();
    return library.names().stream()
        .filter(name -> library.record(name).orElseThrow().name().equals(name))
        .filter(name -> !name.equals("ideal-absorber")) // says itself that it is no material
        .toList();
  }

  // Witness: the examination of the numbers as they are today. The lines are ready to paste.
  @ParameterizedTest
  @MethodSource("names")
  void theHeaderHoldsWhatAnExaminationFinds(String name) {
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    assertThat(lines(material.record().examined())).isEqualTo(lines(examine(material)));
  }

  private static List<String> lines(List<Finding> findings) {
    return findings.stream()
        .map(f -> "# examined: " + f.code() + "," + f.severity() + "," + f.message())
        .toList();
  }

  private static List<Finding> examine(Material material) {
    MaterialRecord record = material.record();
    boolean conducts = record.kind().equals("metal") || record.kind().equals("conductor");
    OpticalTable table = table(material);
    return Examination.content(record.name(), table, Spectra.named("AM1.5G"), 300, 1200).stream()
        .filter(finding -> !finding.code().equals("table-range"))
        .filter(finding -> !(conducts && OF_CONDUCTORS.contains(finding.code())))
        .toList();
  }

  private static OpticalTable table(Material material) {
    if (material instanceof TableMaterial tabulated) {
      return tabulated.table();
    }
    double[] n = new double[USUAL_NM.length];
    double[] k = new double[USUAL_NM.length];
    material.on(USUAL_NM).fill(material.bandgapEv().orElse(0), n, k);
    return OpticalTable.of(USUAL_NM, n, k);
  }
}
