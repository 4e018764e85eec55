package evensun.report.page;

import evensun.report.figure.Figure;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The first screen.
 *
 * @param sentence what to deposit, what it gives, what limits
 * @param headlines the numbers of the decision
 * @param verdict whether to decide on it; null where that is not asked
 * @param rules how the verdict is reached
 * @param levels the level picture; null without currents
 * @param levelsCaption what the picture shows
 * @param wouldChange what would change the decision, most important first
 * @param uncertain what is uncertain
 */
public record Decision(
    String sentence,
    List<Headline> headlines,
    @Nullable Verdict verdict,
    List<String> rules,
    @Nullable Figure levels,
    String levelsCaption,
    List<String> wouldChange,
    List<String> uncertain) {

  /**
   * A number of the decision.
   *
   * @param key field of result.json it comes from
   * @param label what it is
   * @param value as shown
   * @param error its statistical error, such as {@code ± 0.02}; empty for none
   * @param unit its unit
   * @param note a remark, empty for none
   */
  public record Headline(
      String key, String label, String value, String error, String unit, String note) {}
}
