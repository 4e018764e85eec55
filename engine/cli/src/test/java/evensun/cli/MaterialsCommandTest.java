package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.material.MaterialLibrary;
import evensun.material.MaterialRecord;
import evensun.scenario.MaterialSpec;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The library as people and scripts see it. Witness: the library's own records and numbers. */
class MaterialsCommandTest {

  private static final String MESSY = "../../scenarios/data/measured-film.csv";

  @TempDir Path folder;

  private static MaterialRecord record(String name) {
    return MaterialLibrary.builtIn().record(name).orElseThrow();
  }

  private static List<String> rows(Called called) {
    return called.out().lines().skip(1).takeWhile(line -> !line.isBlank()).toList();
  }

  private static JsonNode json(Called called) {
    return JsonMapper.builder().build().readTree(called.out());
  }

  @Test
  void listsEveryMaterialOnce() {
    Called called = Called.with("materials");
    assertThat(called.status()).isZero();
    List<String> names =
        MaterialLibrary.builtIn().names().stream().map(n -> record(n).name()).distinct().toList();
    assertThat(rows(called).stream().map(row -> row.split(" +")[0]))
        .containsExactlyInAnyOrderElementsOf(names);
    assertThat(called.out()).contains("gap eV", "range nm", "source", "hazard");
    assertThat(row(called, "gold")).contains("metal", " 2012 ", "Etching uses iodine");
    assertThat(row(called, "tin-oxide")).contains("memory");
    assertThat(row(called, "lead-halide-perovskite")).contains("1.20-2.30", "280-1800");
  }

  private static String row(Called called, String name) {
    return rows(called).stream()
        .filter(row -> row.startsWith(name + " "))
        .findFirst()
        .orElseThrow();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "absorber",
        "conductor",
        "dielectric",
        "metal",
        "transport",
        "encapsulant",
        "ambient"
      })
  void listsOneKindOnly(String kind) {
    Called called = Called.with("materials", "--kind", kind);
    assertThat(called.status()).isZero();
    long expected =
        MaterialLibrary.builtIn().names().stream()
            .map(MaterialsCommandTest::record)
            .filter(record -> record.kind().equals(kind))
            .map(MaterialRecord::name)
            .distinct()
            .count();
    assertThat(rows(called)).hasSize((int) expected).allSatisfy(r -> assertThat(r).contains(kind));
    assertThat(called.out()).contains(expected + " material");
  }

  @Test
  void listsAsOneJsonDocument() {
    JsonNode list = json(Called.with("materials", "--kind", "metal", "--format", "json"));
    assertThat(list.size()).isEqualTo(3);
    assertThat(list.get(0).get("name").asString()).isEqualTo("aluminium");
    assertThat(list.get(0).get("source").asString()).isEqualTo(record("aluminium").source());
  }

  @Test
  void showsOneInFull() {
    Called called = Called.with("materials", "gallium-arsenide");
    MaterialRecord record = record("gallium-arsenide");
    assertThat(called.out())
        .contains(record.title(), record.kind(), record.form(), record.source())
        .contains("261-1800 nm", "300 K", "1.470 eV", "alpha per cm")
        .contains(record.hazards().get(0), record.notes().get(0))
        .contains("[table-kramers-kronig]");
  }

  @Test
  void showsATunableMaterialAtAChosenGap() {
    Called called =
        Called.with("materials", "lead-halide-perovskite", "--bandgap-ev", "1.68", "--csv");
    assertThat(called.out()).contains("at 1.680 eV");
    Called wide = Called.with("materials", "lead-halide-perovskite", "--bandgap-ev", "3");
    assertThat(wide.status()).isEqualTo(2);
    assertThat(wide.err().strip())
        .isEqualTo("--bandgap-ev: must be in [1.2, 2.3] eV for lead-halide-perovskite but was 3.0");
  }

  // α = 4πk/λ by hand from the printed k; n and k against the library at the same wavelength.
  @Test
  void writesNumbersThatAProgramReads() {
    Called called = Called.with("materials", "crystalline-silicon", "--csv");
    List<String> lines = called.out().lines().filter(line -> !line.startsWith("#")).toList();
    assertThat(lines.get(0)).isEqualTo("wavelength_nm,n,k,alpha_per_cm");
    assertThat(lines).hasSizeGreaterThan(90);
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = line.split(",");
      double[] nm = {Double.parseDouble(cells[0])};
      double[] n = new double[1];
      double[] k = new double[1];
      MaterialLibrary.builtIn().find("crystalline-silicon").orElseThrow().on(nm).fill(0, n, k);
      double alpha = 4e7 * Math.PI * k[0] / nm[0];
      assertThat(Double.parseDouble(cells[1])).isCloseTo(n[0], within(1e-4 * n[0]));
      assertThat(Double.parseDouble(cells[2])).isCloseTo(k[0], within(1e-3 * k[0] + 1e-12));
      assertThat(Double.parseDouble(cells[3])).isCloseTo(alpha, within(2e-3 * alpha + 1e-6));
    }
  }

  @Test
  void drawsSeveralSourcesOverEachOther() throws IOException {
    Path page = folder.resolve("silicon.html");
    Called called =
        Called.with(
            "materials",
            "crystalline-silicon.300-k",
            "crystalline-silicon.295-k",
            "--html",
            page.toString());
    assertThat(called.status()).isZero();
    String html = Files.readString(page);
    assertThat(html)
        .contains("crystalline-silicon.300-k", "crystalline-silicon.295-k")
        .contains("Refractive index n", "Extinction coefficient k", "Absorption coefficient")
        .contains(record("crystalline-silicon.295-k").source().split(",")[0])
        .doesNotContain("src=\"http", "href=\"http");
    assertThat(html.split("<svg", -1)).hasSize(4);
  }

  @Test
  void saysBackHowItReadAMessyTable() {
    Called called = Called.with("materials", "--check", MESSY);
    assertThat(called.status()).isZero();
    assertThat(called.out())
        .contains("102 rows, numbers parted by semicolon, with decimal comma")
        .contains("wavelengths in um, as the header says")
        .contains("102 points, 300 to 1150 nm")
        .contains("[table-range]", "[table-floor-below-gap]", "mA cm⁻²");
  }

  // The lines themselves, read as part of a scenario in the working directory.
  @Test
  void endsWithLinesThatWorkAsPasted() {
    String pasted = lines(Called.with("materials", "--check", MESSY));
    var scenario =
        ScenarioReader.read(new Source("cell.yaml", Path.of(""), SCENARIO.formatted(pasted)));
    var table = (MaterialSpec.Table) scenario.materials().get("measured-film");
    assertThat(Path.of("").resolve(table.path())).exists();
    assertThat(table.hold()).isTrue();
    assertThat(table.clean()).isTrue();
  }

  private static String lines(Called called) {
    return called.out().substring(called.out().indexOf("materials:" + System.lineSeparator()));
  }

  private static final String SCENARIO =
      """
      evensun: 1
      title: A film
      light: {spectrum: AM1.5G}
      grid: {fromNm: 300, toNm: 1200, stepNm: 5}
      %s
      stack:
        - {medium: air}
        - {name: film, material: measured-film, thicknessNm: 500}
        - {name: rear, material: silver}
      subcells:
        - {name: only, absorbers: [film]}
      """;

  // Names that YAML would take apart: a blank, a comment mark, a colon.
  @Test
  void quotesPathsThatYamlWouldTakeApart() throws IOException {
    Path odd = folder.resolve("film #2: new.csv");
    Files.copy(Path.of(MESSY), odd);
    String pasted = lines(Called.with("materials", "--check", odd.toString()));
    String yaml = SCENARIO.formatted(pasted).replace("measured-film", "film-2-new");
    var scenario = ScenarioReader.read(new Source("cell.yaml", Path.of(""), yaml));
    var table = (MaterialSpec.Table) scenario.materials().get("film-2-new");
    assertThat(Path.of(table.path())).isEqualTo(odd);
  }

  @Test
  void answersASpreadsheetWithHowToSaveItAsCsv() throws IOException {
    Path file = folder.resolve("film.xlsx");
    Files.write(file, new byte[] {'P', 'K', 3, 4, 20, 0, 8, 8});
    Called called = Called.with("materials", "--check", file.toString());
    assertThat(called.status()).isEqualTo(2);
    assertThat(called.err().strip().lines()).hasSize(1);
    assertThat(called.err()).contains("film.xlsx", "spreadsheet", "CSV");
  }

  @Test
  void aTableThatCannotBeUsedEndsWithItsFaults() throws IOException {
    Path file = folder.resolve("film.csv");
    Files.writeString(file, "wavelength_nm,n,k\n300,2,-1\n300,2,0\n280,2,0\n");
    Called called = Called.with("materials", "--check", file.toString());
    assertThat(called.status()).isEqualTo(2);
    assertThat(called.out())
        .contains("line 2: n = 2.0, k = -1.0 at 300 nm", "line 3: 300 nm stands twice", "line 4")
        .doesNotContain("materials:");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          sliver | materials: there is no material "sliver" in the library; the nearest name is silver
          --kind=metals | --kind: must be one of absorber, conductor, dielectric, metal, transport, encapsulant, ambient but was metals
          --csv | --csv: needs the name of a material: evensun materials NAME --csv
          --check=absent.csv | --check: file "absent.csv" does not exist
          """)
  void wrongInputIsOneClearLine(String argument, String line) {
    Called called = Called.with("materials", argument);
    assertThat(called.status()).isEqualTo(2);
    assertThat(called.err().strip()).startsWith(line);
    assertThat(called.err().strip().lines()).hasSize(1);
    assertThat(called.out()).isEmpty();
  }
}
