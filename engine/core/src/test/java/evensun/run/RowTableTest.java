package evensun.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.InputException;
import org.junit.jupiter.api.Test;

class RowTableTest {

  @Test
  void keysStandInTheHeaderAndEveryRowKnowsItsLine() {
    RowTable table = RowTable.parse("t.csv", "# sweep\na.thicknessNm,b.bandgapEv\n1, 2\n\n3,4\n");
    assertThat(table.keys()).containsExactly("a.thicknessNm", "b.bandgapEv");
    assertThat(table.rows())
        .containsExactly(
            new RowTable.Row(3, java.util.List.of("1", "2")),
            new RowTable.Row(5, java.util.List.of("3", "4")));
  }

  @Test
  void aRowOfTheWrongLengthIsNamed() {
    assertThatThrownBy(() -> RowTable.parse("t.csv", "a,b\n1,2\n3\n"))
        .isInstanceOf(InputException.class)
        .hasMessage("t.csv:3: needs 2 values, one per key of the header, but has 1");
  }

  @Test
  void aTableWithoutRowsSaysWhatToWrite() {
    assertThatThrownBy(() -> RowTable.parse("t.csv", "a,b\n"))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("holds no rows");
  }
}
