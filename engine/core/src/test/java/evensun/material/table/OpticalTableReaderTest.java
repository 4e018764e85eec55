package evensun.material.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.data.TableFormatException;
import evensun.material.table.TableHints.Extinction;
import evensun.material.table.TableHints.WavelengthUnit;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class OpticalTableReaderTest {

  private static final double[] NM = {300, 412.5, 700, 1200};
  private static final double[] N = {2.1, 2.75, 2.5, 2.25};
  private static final double[] K = {1.5, 0.75, 0.0625, 0};

  private static String cell(double value, boolean comma) {
    String text = String.format(Locale.ROOT, "%.12g", value);
    return comma ? text.replace('.', ',') : text;
  }

  private static String written(
      String header, String separator, boolean comma, String unit, boolean alpha) {
    StringBuilder text = new StringBuilder(header);
    for (int i = 0; i < NM.length; i++) {
      double x =
          switch (unit) {
            case "um" -> NM[i] / 1000;
            case "eV" -> 1239.8419843320026 / NM[i];
            default -> NM[i];
          };
      double last = alpha ? 4e7 * Math.PI * K[i] / NM[i] : K[i];
      text.append(cell(x, comma)).append(separator).append(cell(N[i], comma)).append(separator);
      text.append(cell(last, comma)).append('\n');
    }
    return text.toString();
  }

  private static void holdsTheValues(RawTable raw) {
    OpticalTable table = raw.table();
    assertThat(table.size()).isEqualTo(NM.length);
    for (int i = 0; i < NM.length; i++) {
      assertThat(table.wavelengthNm()[i]).isCloseTo(NM[i], within(1e-6));
      assertThat(table.n()[i]).isCloseTo(N[i], within(1e-9));
      assertThat(table.k()[i]).isCloseTo(K[i], within(1e-9));
    }
  }

  // Round trip of every form: the values above written out and read back.
  @ParameterizedTest
  @CsvSource({
    "comma, false, nm",
    "comma, false, um",
    "comma, false, eV",
    "semicolon, false, nm",
    "semicolon, true, nm",
    "semicolon, true, um",
    "tab, false, eV",
    "tab, true, nm",
    "blanks, false, nm",
    "blanks, true, um"
  })
  void readsWhatItWrites(String separator, boolean comma, String unit) {
    String mark =
        switch (separator) {
          case "comma" -> ",";
          case "semicolon" -> ";";
          case "tab" -> "\t";
          default -> "   ";
        };
    for (boolean alpha : new boolean[] {false, true}) {
      String header =
          String.join(
                  mark.isBlank() && !mark.equals("\t") ? " " : mark,
                  "wavelength_" + unit,
                  "n",
                  alpha ? "alpha_1/cm" : "k")
              + "\n";
      RawTable raw =
          OpticalTableReader.read(written(header, mark, comma, unit, alpha), TableHints.NONE);
      holdsTheValues(raw);
      assertThat(raw.understood().get(0)).contains("parted by " + separator);
      assertThat(raw.understood()).anySatisfy(s -> assertThat(s).contains("in " + unit));
    }
  }

  @Test
  void readsTwoHeaderLinesDecimalCommasAndMicrometres() {
    String text =
        "\uFEFF# film 12\nWellenlänge;Brechungsindex;Extinktionskoeffizient\nµm;;\n"
            + written("", ";", true, "um", false);
    holdsTheValues(OpticalTableReader.read(text.substring(1), TableHints.NONE));
  }

  @Test
  void judgesUnitsBySizeWhenNoHeaderSaysThemAndSaysSo() {
    RawTable nm = OpticalTableReader.read(written("", ",", false, "nm", true), TableHints.NONE);
    holdsTheValues(nm);
    assertThat(nm.understood()).anySatisfy(s -> assertThat(s).contains("nm, judged"));
    assertThat(nm.understood()).anySatisfy(s -> assertThat(s).contains("alpha-per-cm, judged"));
    holdsTheValues(OpticalTableReader.read(written("", ",", false, "um", false), TableHints.NONE));
    holdsTheValues(OpticalTableReader.read(written("", " ", false, "eV", false), TableHints.NONE));
  }

  @Test
  void obeysWhatThePersonSays() {
    TableHints hints =
        new TableHints(Optional.of(WavelengthUnit.UM), Optional.of(Extinction.ALPHA_PER_CM));
    holdsTheValues(OpticalTableReader.read(written("a,b,c\n", ",", false, "um", true), hints));
  }

  @Test
  void joinsTwoFilesAndTwoBlocks() {
    String n = "wavelength_nm,n\n300,2.1\n412.5,2.75\n700,2.5\n1200,2.25\n";
    String k = "wavelength_nm,k\n300,1.5\n412.5,0.75\n700,0.0625\n1200,0\n";
    holdsTheValues(OpticalTableReader.read(n, k, TableHints.NONE));
    holdsTheValues(OpticalTableReader.read(n + "\n" + k, TableHints.NONE));
  }

  // By hand: k of 0.5 and 0.3 at 500 and 600 nm is 0.4 half way.
  @Test
  void joinsTwoFilesWithDifferentWavelengthsWhereBothAreKnown() {
    RawTable raw =
        OpticalTableReader.read(
            "nm n\n400 2\n550 2\n900 2\n", "nm k\n500 0.5\n600 0.3\n", TableHints.NONE);
    assertThat(raw.table().fromNm()).isEqualTo(500);
    assertThat(raw.table().toNm()).isEqualTo(600);
    assertThat(raw.table().kAt(550)).isCloseTo(0.4, within(1e-12));
  }

  @Test
  void takesColumnsByTheirNamesInAnyOrder() {
    RawTable raw =
        OpticalTableReader.read("k,n,wavelength (nm)\n0.5,2,400\n0.3,2.1,500\n", TableHints.NONE);
    assertThat(raw.table().nAt(500)).isEqualTo(2.1);
    assertThat(raw.table().kAt(400)).isEqualTo(0.5);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "300,2,1,0\n1200,2,1,0|can be read in two ways",
        "0.5,2,0\n1.2,2,0|does not say whether its first column is in um or eV",
        "words only\nand more|holds no numbers",
        "PK\u0003\u0004zip|is a spreadsheet",
        "300,2,0\n400,2\n500,2,0|has 2 numbers where the rows before have 3",
        "300,2,0\n400,2,zero\n500,2,0|is not a row of numbers",
        "nm,n\n300,2\nnm,k\n400,1\n500,1\n600,1\n\n|no wavelengths in common"
      })
  void refusesWhatCannotBeUnderstoodWithARemedy(String row) {
    String[] parts = row.split("\\|");
    assertThatThrownBy(() -> OpticalTableReader.read(parts[0], TableHints.NONE))
        .isInstanceOf(TableFormatException.class)
        .hasMessageContaining(parts[1]);
  }
}
