package evensun.search.refine;

import evensun.search.problem.Fitness;
import evensun.search.problem.GeneKey;
import java.util.HashSet;
import java.util.Set;

/** Walks over the steps: one variable by one step, or two at once, as long as that gains. */
public final class StepNeighbours {

  private final LocalProblem problem;
  private final Set<GeneKey> seen = new HashSet<>();

  StepNeighbours(LocalProblem problem) {
    this.problem = problem;
  }

  void descend() {
    boolean gained = true;
    while (gained && problem.left() > 0) {
      Fitness before = problem.bestFitness();
      singles();
      if (problem.bestFitness().compareTo(before) == 0) {
        pairs();
      }
      gained = problem.bestFitness().compareTo(before) > 0;
    }
  }

  private void singles() {
    double[] from = problem.best().geneArray();
    for (int i : problem.stepped()) {
      tryStep(moved(from, i, 1));
      tryStep(moved(from, i, -1));
    }
  }

  private void pairs() {
    double[] from = problem.best().geneArray();
    int[] stepped = problem.stepped();
    for (int a = 0; a < stepped.length; a++) {
      for (int b = a + 1; b < stepped.length; b++) {
        for (int sign = 0; sign < 4; sign++) {
          double[] once = moved(from, stepped[a], sign < 2 ? 1 : -1);
          tryStep(moved(once, stepped[b], sign % 2 == 0 ? 1 : -1));
        }
      }
    }
  }

  private double[] moved(double[] genes, int variable, int steps) {
    double[] moved = genes.clone();
    double one = 1.0 / problem.space().stepCount(variable);
    moved[variable] = problem.space().snap(variable, genes[variable] + steps * one);
    return moved;
  }

  private void tryStep(double[] genes) {
    if (problem.left() > 0 && seen.add(new GeneKey(genes))) {
      problem.judge(genes);
    }
  }
}
