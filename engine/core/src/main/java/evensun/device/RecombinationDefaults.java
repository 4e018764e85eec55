package evensun.device;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/**
 * Radiative efficiency and ideality usual for kinds of absorbers, for scenarios that give none;
 * from a table that names its sources.
 */
final class RecombinationDefaults {

  /**
   * What is usual for one kind of absorber.
   *
   * @param prefix how names of such materials begin
   * @param kind as spoken
   * @param efficiency external radiative efficiency at the one-sun open circuit
   * @param ideality of the non-radiative branch
   */
  record Usual(String prefix, String kind, double efficiency, double ideality) {}

  private static final List<Usual> ROWS = load();

  private RecombinationDefaults() {}

  /** What is usual for a material of this name; the last row fits every name. */
  static Usual of(String material) {
    return ROWS.stream().filter(row -> material.startsWith(row.prefix())).findFirst().orElseThrow();
  }

  private static List<Usual> load() {
    CSVFormat format =
        CSVFormat.DEFAULT
            .builder()
            .setCommentMarker('#')
            .setHeader()
            .setSkipHeaderRecord(true)
            .get();
    InputStream stream =
        Objects.requireNonNull(
            RecombinationDefaults.class.getResourceAsStream("recombination.csv"),
            "recombination.csv is missing from the program");
    try (Reader in = new InputStreamReader(stream, StandardCharsets.UTF_8)) {
      return format.parse(in).stream().map(RecombinationDefaults::row).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Usual row(CSVRecord cells) {
    return new Usual(
        cells.get("prefix"),
        cells.get("kind"),
        Double.parseDouble(cells.get("externalRadiativeEfficiency")),
        Double.parseDouble(cells.get("idealityFactor")));
  }
}
