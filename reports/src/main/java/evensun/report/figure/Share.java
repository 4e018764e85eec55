package evensun.report.figure;

import org.jspecify.annotations.Nullable;

/**
 * A part of the available light.
 *
 * @param label as shown to people
 * @param role class of the style sheet: {@code sub1}, …, {@code reflected}, {@code parasitic},
 *     {@code exit}
 * @param maPerCm2 mA cm⁻²
 * @param standardErrorMaPerCm2 statistical error, null where there is none
 */
public record Share(
    String label, String role, double maPerCm2, @Nullable Double standardErrorMaPerCm2) {

  /** A part without a statistical error. */
  public Share(String label, String role, double maPerCm2) {
    this(label, role, maPerCm2, null);
  }

  private static final int SUBCELL_ROLES = 6;

  /** The role of a subcell, from 0 in the light's order. */
  public static String subcellRole(int index) {
    return "sub" + (index % SUBCELL_ROLES + 1);
  }

  /** The role of a layer that collects nothing, from 0: two greys take turns. */
  public static String parasiticRole(int index) {
    return index % 2 == 0 ? "parasitic" : "parasitic-b";
  }

  /** Whether this light is collected. */
  public boolean collected() {
    return role.startsWith("sub");
  }
}
