package evensun.search;

import evensun.search.problem.Candidate;
import evensun.search.problem.Individual;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/** Fronts of designs with several aims. */
final class Front {

  private Front() {}

  /** The designs that keep all limits and that none of the others beats, first aim falling. */
  static List<Individual> of(List<Individual> designs) {
    List<Individual> feasible = designs.stream().filter(Individual::isFeasible).toList();
    List<Individual> front = new ArrayList<>();
    for (Individual design : feasible) {
      boolean beaten = feasible.stream().anyMatch(o -> beats(o.verdict(), design.verdict()));
      if (!beaten
          && front.stream().noneMatch(f -> f.verdict().aims().equals(design.verdict().aims()))) {
        front.add(design);
      }
    }
    front.sort(Comparator.comparingDouble((Individual i) -> -i.verdict().aims().get(0)));
    return front;
  }

  /**
   * A front without the designs that lead another by next to nothing in some aim and are behind it
   * in others: the best in each aim first, then by the sum of the aims, in parts of their range.
   *
   * @param nothing what is next to nothing, in parts of the range of an aim
   */
  static List<Individual> thinned(List<Individual> front, double nothing) {
    double[][] scaled = scaledAims(front);
    List<Integer> order = new ArrayList<>();
    IntStream.range(0, front.size()).forEach(order::add);
    order.sort(Comparator.comparingDouble((Integer i) -> -rank(scaled[i])));
    List<Integer> kept = new ArrayList<>();
    for (int i : order) {
      if (kept.stream().noneMatch(k -> covers(scaled[k], scaled[i], nothing))) {
        kept.add(i);
      }
    }
    return kept.stream().sorted().map(front::get).toList();
  }

  /** The same of individuals. */
  static double[][] scaledAims(List<Individual> front) {
    return scaled(front.stream().map(i -> new Candidate(i.genes(), i.verdict())).toList());
  }

  private static double rank(double[] scaled) {
    boolean best = Arrays.stream(scaled).anyMatch(aim -> aim == 1);
    return Arrays.stream(scaled).sum() + (best ? scaled.length : 0);
  }

  private static boolean covers(double[] a, double[] b, double nothing) {
    return IntStream.range(0, a.length).allMatch(i -> a[i] >= b[i] - nothing);
  }

  /** The aims of a front in parts of the range that it spans, [design][aim]. */
  static double[][] scaled(List<Candidate> front) {
    return scaled(front, front);
  }

  private static boolean beats(Verdict a, Verdict b) {
    boolean better = false;
    for (int i = 0; i < a.aims().size(); i++) {
      double difference = a.aims().get(i) - b.aims().get(i);
      if (difference < 0) {
        return false;
      }
      better |= difference > 0;
    }
    return better;
  }

  /**
   * The best compromise: with every aim scaled to [0, 1] over the front, the design farthest beyond
   * the plane through the best of each aim, that is with the largest sum.
   */
  static int knee(List<Candidate> front) {
    double[][] scaled = scaled(front);
    int knee = -1;
    double largest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < scaled.length; i++) {
      double sum = Arrays.stream(scaled[i]).sum();
      if (sum > largest) {
        largest = sum;
        knee = i;
      }
    }
    return knee;
  }

  /**
   * By how much a front got ahead: how much its designs lead the nearest of the earlier front in
   * the aim in which they lead most, on average, in parts of the range of the later front. The mean
   * of what the additive ε-indicator takes the largest of (Zitzler et al., IEEE Trans. Evol.
   * Comput. 7, 117 (2003)): the largest is at the mercy of single gaps in a front of few designs.
   *
   * @return 1 when there was no front before
   */
  static double gain(List<Candidate> before, List<Candidate> after) {
    if (before.isEmpty() || after.isEmpty()) {
      return 1;
    }
    double[][] earlier = scaled(before, after);
    double sum = 0;
    for (double[] design : scaled(after, after)) {
      double nearest = Double.POSITIVE_INFINITY;
      for (double[] other : earlier) {
        double behind = Double.NEGATIVE_INFINITY;
        for (int aim = 0; aim < design.length; aim++) {
          behind = Math.max(behind, design[aim] - other[aim]);
        }
        nearest = Math.min(nearest, behind);
      }
      sum += Math.max(0, nearest);
    }
    return sum / after.size();
  }

  /** The aims of designs in parts of the range that a front spans, [design][aim]. */
  private static double[][] scaled(List<Candidate> designs, List<Candidate> front) {
    int aims = front.isEmpty() ? 0 : front.get(0).verdict().aims().size();
    double[][] scaled = new double[designs.size()][aims];
    for (int aim = 0; aim < aims; aim++) {
      int a = aim;
      double low = front.stream().mapToDouble(c -> c.verdict().aims().get(a)).min().orElse(0);
      double high = front.stream().mapToDouble(c -> c.verdict().aims().get(a)).max().orElse(0);
      for (int i = 0; i < scaled.length; i++) {
        double value = designs.get(i).verdict().aims().get(a);
        scaled[i][a] = high > low ? (value - low) / (high - low) : 0;
      }
    }
    return scaled;
  }
}
