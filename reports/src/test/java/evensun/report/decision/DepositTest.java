package evensun.report.decision;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.result.SearchRecord.ChoiceRecord;
import evensun.result.SearchRecord.VariableRecord;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What is said to deposit. Witness: the choices as written here. */
class DepositTest {

  private static final List<VariableRecord> VARIED =
      List.of(
          new VariableRecord("coating.thicknessNm", "nm", 60, 150, 0, 100, 92, 90.0, 95.0, null),
          new VariableRecord("contact.thicknessNm", "nm", 40, 120, 0, 80, 40, 40.0, 43.0, "low"));

  private static ChoiceRecord choice(String key, String drawn, String found) {
    return new ChoiceRecord(key, drawn, found, List.of());
  }

  private static String phrase(ChoiceRecord... choices) {
    return Deposit.phrase(VARIED, List.of(choices));
  }

  @Test
  void valuesAloneWhenNothingWasChosen() {
    assertThat(phrase()).isEqualTo("92\u00a0nm coating and 40\u00a0nm contact");
  }

  @Test
  void aChosenMaterialComesFirstAndIsNamedEvenWhenItIsTheOneAsDrawn() {
    assertThat(phrase(choice("contact.material", "tin", "zinc")))
        .isEqualTo("40\u00a0nm contact of zinc and 92\u00a0nm coating");
    assertThat(phrase(choice("contact.material", "tin", "tin"))).contains("contact of tin");
  }

  @Test
  void whatFollowsAnotherValueIsNamedAsWell() {
    Map<String, Double> design =
        Map.of(
            "coating.thicknessNm", 92.0, "contact.thicknessNm", 40.0, "spacer.thicknessNm", 46.0);
    assertThat(Deposit.phrase(Deposit.withFollowers(VARIED, design), List.of()))
        .isEqualTo("92\u00a0nm coating, 40\u00a0nm contact and 46\u00a0nm spacer");
  }

  @Test
  void layersLeftOutAndLayersAddedAreNamed() {
    assertThat(phrase(choice("spacer.present", "present", "absent"))).startsWith("no spacer, ");
    assertThat(phrase(choice("spacer.present", "absent", "present"))).startsWith("spacer, ");
    assertThat(phrase(choice("spacer.present", "present", "present"))).doesNotContain("spacer");
    assertThat(
            phrase(
                choice("spacer.present", "absent", "present"),
                choice("spacer.material", "silica", "silica")))
        .startsWith("spacer of silica, ");
  }
}
