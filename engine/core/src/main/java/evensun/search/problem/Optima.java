package evensun.search.problem;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Picks and merges distinct designs. */
public final class Optima {

  /** Designs nearer than this in every gene are one design. */
  public static final double SAME = 0.02;

  /** More than a reader would look at. */
  public static final int MOST = 24;

  private Optima() {}

  /** Best first; ties keep their order. */
  public static Comparator<Individual> order(double floor) {
    return (a, b) -> Fitness.of(b.verdict(), floor).compareTo(Fitness.of(a.verdict(), floor));
  }

  /** The best individuals that differ from one another, best first. */
  public static List<Individual> distinct(
      Space space, List<Individual> individuals, double floor, double same, int most) {
    List<Individual> sorted = new ArrayList<>(individuals);
    sorted.removeIf(individual -> individual.verdict().isFailure());
    sorted.sort(order(floor));
    List<Individual> kept = new ArrayList<>();
    for (Individual individual : sorted) {
      if (kept.size() < most && kept.stream().noneMatch(k -> isSame(space, k, individual, same))) {
        kept.add(individual);
      }
    }
    return kept;
  }

  private static boolean isSame(Space space, Individual a, Individual b, double same) {
    for (int i = 0; i < space.size(); i++) {
      double distance = Math.abs(a.genes().get(i) - b.genes().get(i));
      if (space.isChoice(i) ? distance > 0 : distance > same) {
        return false;
      }
    }
    return true;
  }
}
