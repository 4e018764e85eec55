package evensun.search;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** When a search ends, counted by hand from the rules: four fresh rounds, then combining ones. */
class RoundsTest {

  private static final Rounds ROUNDS = new Rounds(SearchSettings.of(1, 2));

  /** A first generation of mean 0, so that values are alike within 1e-5 of the best. */
  private static final List<GenerationRecord> HISTORY =
      List.of(new GenerationRecord(1, 0, 52, 0.5, 0.5, 0, 0));

  private static boolean converged(Double... roundBests) {
    return ROUNDS.converged(List.of(roundBests), HISTORY);
  }

  @Test
  void twoIdleRoundsEndASearchWhoseFreshRoundsAgreed() {
    assertThat(ROUNDS.fresh()).isEqualTo(4);
    assertThat(converged(1.0, 1.0, 1.0, 1.0)).isFalse();
    assertThat(converged(1.0, 0.9, 1.0, 1.0, 1.0)).isFalse();
    assertThat(converged(1.0, 0.9, 1.0, 1.0, 1.0, 1.0)).isTrue();
  }

  @Test
  void fiveIdleRoundsEndASearchWhoseFreshRoundsDisagreed() {
    assertThat(converged(1.0, 0.9, 0.8, 1.0, 1.0, 1.0, 1.0, 1.0)).isFalse();
    assertThat(converged(1.0, 0.9, 0.8, 1.0, 1.0, 1.0, 1.0, 1.0, 1.0)).isTrue();
  }

  @Test
  void whatACombiningRoundGainedUndoesTheAgreement() {
    assertThat(converged(1.0, 1.0, 1.0, 1.0, 1.1, 1.1)).isFalse();
    assertThat(converged(1.0, 1.0, 1.0, 1.0, 1.1, 1.1, 1.1, 1.1, 1.1, 1.1)).isTrue();
  }
}
