package evensun.report.decision;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.result.Outcome;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.StackEntry;
import evensun.result.SearchRecord.VariableRecord;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What is said to deposit. Witness: the stacks as written here. */
class DepositTest {

  private static final List<VariableRecord> VARIED =
      List.of(
          new VariableRecord("coating.thicknessNm", "nm", 60, 150, 0, 100, 92, 90.0, 95.0, null),
          new VariableRecord("contact.thicknessNm", "nm", 40, 120, 0, 80, 40, 40.0, 43.0, "low"));

  private static Outcome stack(String... namesAndMaterials) {
    List<StackEntry> entries =
        Arrays.stream(namesAndMaterials)
            .map(text -> text.split(" "))
            .map(p -> new StackEntry(p[0], p[1], "layer", 50.0, null, true, null, List.of()))
            .toList();
    Spectral none = null;
    return new Outcome(
        null, List.of(), null, null, null, null, Map.of(), entries, none, List.of(), null);
  }

  @Test
  void valuesAloneWhenTheStackIsAsDrawn() {
    Outcome drawn = stack("coating fluoride", "contact tin");
    assertThat(Deposit.phrase(VARIED, Swap.between(drawn, drawn)))
        .isEqualTo("92\u00a0nm coating and 40\u00a0nm contact");
  }

  @Test
  void anotherMaterialComesFirstAndIsNamed() {
    Outcome drawn = stack("coating fluoride", "contact tin");
    Outcome found = stack("coating fluoride", "contact zinc");
    assertThat(Deposit.phrase(VARIED, Swap.between(drawn, found)))
        .isEqualTo("40\u00a0nm contact of zinc and 92\u00a0nm coating");
  }

  @Test
  void layersLeftOutAndLayersAddedAreNamed() {
    Outcome with = stack("coating fluoride", "spacer silica", "contact tin");
    Outcome without = stack("coating fluoride", "contact tin");
    assertThat(Deposit.phrase(VARIED, Swap.between(with, without))).startsWith("no spacer, ");
    assertThat(Deposit.phrase(VARIED, Swap.between(without, with)))
        .startsWith("spacer of silica, ");
    assertThat(Swap.between(null, with)).isEmpty();
  }
}
