package evensun.scenario.tree;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds what somebody probably meant. */
public final class Nearest {

  private static final int LIST_AT_MOST = 12;
  private static final int LONGEST = 80;

  private Nearest() {}

  /**
   * The known name that a wrong one probably stands for: the same but for case and separators, one
   * that only lacks its unit, or the one with the fewest changed letters if these are few.
   */
  public static Optional<String> of(String wrong, Collection<String> known) {
    if (wrong.length() > LONGEST) {
      return Optional.empty();
    }
    String plainWrong = plain(wrong);
    String best = null;
    double bestCost = Math.max(1.5, plainWrong.length() / 3.0);
    for (String candidate : known) {
      double cost = cost(plainWrong, plain(candidate));
      if (cost < bestCost) {
        bestCost = cost;
        best = candidate;
      }
    }
    return Optional.ofNullable(best);
  }

  /** The end of a message about a wrong name: the nearest known name, or a short list of all. */
  public static String hint(String wrong, Collection<String> known) {
    Optional<String> nearest = of(wrong, known);
    if (nearest.isPresent()) {
      return "; did you mean " + Shown.plain(nearest.get()) + "?";
    }
    if (known.isEmpty() || known.size() > LIST_AT_MOST) {
      return "";
    }
    return "; known here: " + Shown.list(known);
  }

  private static String plain(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[-_. ]", "");
  }

  private static double cost(String wrong, String candidate) {
    if (wrong.equals(candidate)) {
      return 0;
    }
    boolean lacksUnit = wrong.length() >= 3 && candidate.startsWith(wrong);
    return lacksUnit ? 0.5 : distance(wrong, candidate);
  }

  /** Insertions, deletions, substitutions and swaps of neighbours (optimal string alignment). */
  static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : step(a, b, i, j, d);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int step(String a, String b, int i, int j, int[][] d) {
    int substituted = d[i - 1][j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
    int best = Math.min(substituted, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
    boolean swapped =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swapped ? Math.min(best, d[i - 2][j - 2] + 1) : best;
  }
}
