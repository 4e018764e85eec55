package evensun.search;

import evensun.search.problem.Candidate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Fronts of designs with several aims. */
final class Front {

  private Front() {}

  /** The designs that keep all limits and that none of the others beats, first aim falling. */
  static List<Candidate> of(List<Candidate> candidates) {
    List<Candidate> feasible = candidates.stream().filter(Candidate::isFeasible).toList();
    List<Candidate> front = new ArrayList<>();
    for (Candidate candidate : feasible) {
      boolean beaten = feasible.stream().anyMatch(other -> beats(other, candidate));
      if (!beaten && front.stream().noneMatch(f -> sameAims(f, candidate))) {
        front.add(candidate);
      }
    }
    front.sort(Comparator.comparingDouble(Candidate::aim).reversed());
    return front;
  }

  private static boolean sameAims(Candidate a, Candidate b) {
    return a.verdict().aims().equals(b.verdict().aims());
  }

  private static boolean beats(Candidate a, Candidate b) {
    boolean better = false;
    for (int i = 0; i < a.verdict().aims().size(); i++) {
      double difference = a.verdict().aims().get(i) - b.verdict().aims().get(i);
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
    int knee = -1;
    double largest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < front.size(); i++) {
      double sum = scaledSum(front, front.get(i));
      if (sum > largest) {
        largest = sum;
        knee = i;
      }
    }
    return knee;
  }

  private static double scaledSum(List<Candidate> front, Candidate candidate) {
    double sum = 0;
    for (int i = 0; i < candidate.verdict().aims().size(); i++) {
      int aim = i;
      double low = front.stream().mapToDouble(c -> c.verdict().aims().get(aim)).min().orElse(0);
      double high = front.stream().mapToDouble(c -> c.verdict().aims().get(aim)).max().orElse(0);
      sum += high > low ? (candidate.verdict().aims().get(aim) - low) / (high - low) : 0;
    }
    return sum;
  }
}
