package evensun.material;

import java.util.Locale;

/** How far apart two names are: edits of a character, case and separators aside (Levenshtein). */
final class Similarity {

  private Similarity() {}

  static int distance(String left, String right) {
    String a = plain(left);
    String b = plain(right);
    int[] row = new int[b.length() + 1];
    for (int j = 0; j < row.length; j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j < row.length; j++) {
        int change = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(change, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()];
  }

  private static String plain(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[-_. ]", "");
  }
}
