package evensun.search.refine;

import evensun.search.problem.Candidate;
import evensun.search.problem.Fitness;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Objective;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Verdict;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The neighbourhood of one design, on one worker: some genes are free, the others stay. It counts
 * what it evaluates and remembers the best legal design it has seen.
 */
public final class LocalProblem {

  private final Space space;
  private final Judges judges;
  private final Objective.Worker worker;
  private final double floor;
  private final int budget;
  private final Tally tally = new Tally(0, List.of());
  private Individual best;

  public LocalProblem(
      Space space,
      Judges judges,
      Objective.Worker worker,
      Individual start,
      double floor,
      int budget) {
    this.space = space;
    this.judges = judges;
    this.worker = worker;
    this.best = start;
    this.floor = floor;
    this.budget = budget;
  }

  Space space() {
    return space;
  }

  Objective.Worker worker() {
    return worker;
  }

  double floor() {
    return floor;
  }

  public Individual best() {
    return best;
  }

  Fitness bestFitness() {
    return Fitness.of(best.verdict(), floor);
  }

  public Tally tally() {
    return tally;
  }

  int left() {
    return budget - tally.evaluations();
  }

  /** Indices of the genes that a continuous method may move. */
  public int[] continuous() {
    return IntStream.range(0, space.size())
        .filter(i -> !space.isFixed(i) && !space.isStepped(i))
        .toArray();
  }

  /** Indices of the genes that stand on steps and have an order. */
  int[] stepped() {
    return IntStream.range(0, space.size())
        .filter(i -> !space.isFixed(i) && space.isStepped(i) && !space.isChoice(i))
        .toArray();
  }

  /** All genes that have an order, steps disregarded. */
  public int[] ordered() {
    return IntStream.range(0, space.size())
        .filter(i -> !space.isFixed(i) && !space.isChoice(i))
        .toArray();
  }

  /** Judges a legal design. */
  public Verdict judge(double[] genes) {
    double[] legal = space.snap(genes);
    double[] values = space.values(legal);
    Verdict verdict = counted(values, judges.judge(worker, values));
    if (Fitness.of(verdict, floor).compareTo(bestFitness()) > 0) {
      best = new Individual(best.birth(), Numbers.list(legal), verdict);
    }
    return verdict;
  }

  /** Judges a design without regard to the steps; it is never the best. */
  public Verdict judgeRelaxed(double[] genes) {
    double[] values = space.relaxedValues(genes);
    return counted(values, judges.judge(worker, values));
  }

  private Verdict counted(double[] values, Verdict verdict) {
    tally.count(Candidate.of(values, verdict));
    return verdict;
  }

  /**
   * The parts of the first aim with their derivatives with respect to genes.
   *
   * @return whether the worker offers them
   */
  boolean parts(double[] genes, double[] parts, double[][] gradient) {
    judges.stopIfCancelled();
    double[] values = space.relaxedValues(genes);
    boolean offered;
    try {
      offered = worker.parts(values, parts, gradient);
    } catch (RuntimeException failure) {
      offered = false;
    }
    if (offered) {
      tally.count(Candidate.of(values, Verdict.of(Arrays.stream(parts).min().orElse(0), 0)));
      for (double[] row : gradient) {
        for (int i = 0; i < row.length; i++) {
          row[i] *= space.span(i);
        }
      }
    }
    return offered;
  }
}
