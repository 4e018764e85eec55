package evensun.report.decision;

import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.AlternativeRecord;
import evensun.result.SearchRecord.ChoiceRecord;
import java.util.Comparator;

/** What a choice between alternatives decides, in words. */
public final class ChoiceWords {

  private static final double LEAST_SHOWN = 0.005;

  private ChoiceWords() {}

  /** The best of the other alternatives and what it costs, empty where none is known. */
  public static String runnerUp(SearchRecord search, ChoiceRecord choice) {
    Comparator<AlternativeRecord> order = Comparator.comparingDouble(a -> loss(search, a));
    return choice.alternatives().stream()
        .filter(a -> a.aim() != null && !a.name().equals(choice.found()))
        .min(order)
        .map(a -> Clip.to(a.name(), 48) + " " + cost(search, a))
        .orElse("");
  }

  /** What an alternative costs against the design found, all else chosen anew. */
  public static String cost(SearchRecord search, AlternativeRecord alternative) {
    if (alternative.aim() == null) {
      return "";
    }
    double loss = loss(search, alternative);
    return Math.abs(loss) < LEAST_SHOWN
        ? "as good"
        : Numbers.quantity(Math.abs(loss), search.aimUnit()) + (loss > 0 ? " worse" : " better");
  }

  private static double loss(SearchRecord search, AlternativeRecord alternative) {
    double difference = search.aimFound() - alternative.aim();
    return "smallest".equals(search.wanted()) ? -difference : difference;
  }
}
