package evensun.report.page;

import java.util.List;

/**
 * Whether to decide on this result.
 *
 * @param level the verdict
 * @param reasons the points to check, or what speaks against deciding; empty when fit
 */
public record Verdict(Level level, List<String> reasons) {

  /** What may be done with the result. */
  public enum Level {
    /** Nothing speaks against it. */
    FIT("Fit to decide on"),
    /** Decide once the points are checked. */
    CHECK("Decide after checking these points"),
    /** The result does not carry a decision. */
    DO_NOT("Do not decide on this");

    private final String words;

    Level(String words) {
      this.words = words;
    }

    /** The verdict in words. */
    public String words() {
      return words;
    }

    /** Class of the style sheet. */
    public String look() {
      return "verdict-" + name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
    }
  }

  /** Copies the reasons. */
  public Verdict {
    reasons = List.copyOf(reasons);
  }
}
