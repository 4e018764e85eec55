package evensun.search.proof;

import evensun.search.problem.Candidate;
import evensun.search.problem.FailureRecord;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Objective;
import evensun.search.problem.Optima;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Verdict;
import evensun.search.refine.Refiner;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/**
 * Judges every point of a grid over the box of values, then refines the best distinct points: the
 * plain check that a search has overlooked nothing coarser than the grid. For up to four variables.
 */
public final class Exhaustive {

  /** With more variables a grid is too coarse to prove anything. */
  public static final int MOST_VARIABLES = 4;

  private static final int BATCH = 4096;
  private static final int KEPT = 64;
  private static final int REFINED = 12;

  private final Objective objective;
  private final Space space;
  private final int threads;
  private final BooleanSupplier cancelled;

  /**
   * A check.
   *
   * @param threads number of threads, changes the time only
   * @param cancelled asked before every evaluation, from any thread
   * @throws IllegalArgumentException for more than {@link #MOST_VARIABLES} variables
   */
  public Exhaustive(Objective objective, int threads, BooleanSupplier cancelled) {
    if (objective.variables().size() > MOST_VARIABLES) {
      throw new IllegalArgumentException(
          "an exhaustive grid takes at most "
              + MOST_VARIABLES
              + " variables, but "
              + objective.variables().size()
              + " vary");
    }
    this.objective = objective;
    this.threads = threads;
    this.cancelled = cancelled;
    space = new Space(objective.variables());
  }

  /**
   * Points of each variable on the finest grid that the number of evaluations affords: equally many
   * for every variable, but never more than a stepped variable has steps.
   */
  public List<Integer> points(long evaluations) {
    int[] points = new int[space.size()];
    Arrays.fill(points, 1);
    boolean grew = true;
    while (grew) {
      grew = false;
      for (int i = 0; i < points.length; i++) {
        if (points[i] < legal(i) && product(points) / points[i] * (points[i] + 1) <= evaluations) {
          points[i]++;
          grew = true;
        }
      }
    }
    return Arrays.stream(points).boxed().toList();
  }

  private long legal(int variable) {
    if (space.isFixed(variable)) {
      return 1;
    }
    return space.isStepped(variable) ? space.stepCount(variable) + 1 : Integer.MAX_VALUE;
  }

  private static long product(int[] points) {
    return Arrays.stream(points).asLongStream().reduce(1, (a, b) -> a * b);
  }

  /**
   * Looks at every point.
   *
   * @param points [variable] number of points, from {@link #points}
   */
  public ExhaustiveOutcome run(List<Integer> points) {
    Tally tally = new Tally(0, List.of());
    int[] counts = points.stream().mapToInt(p -> p).toArray();
    List<Individual> kept = new ArrayList<>();
    try (Judges judges = new Judges(objective, threads, cancelled)) {
      long all = product(counts);
      for (long from = 0; from < all; from += BATCH) {
        batch(judges, counts, from, Math.min(all, from + BATCH), kept, tally);
      }
      Individual bestOnGrid = kept.isEmpty() ? null : kept.get(0);
      List<Individual> starts =
          Optima.distinct(space, kept, Double.NEGATIVE_INFINITY, spacing(counts), REFINED);
      Refiner refiner = new Refiner(space, judges, objective.limits().size(), 0);
      List<Individual> refined =
          refiner.refine(starts, Double.NEGATIVE_INFINITY, 4000 * REFINED, tally);
      kept.addAll(refined);
      kept.sort(Optima.order(Double.NEGATIVE_INFINITY));
      return outcome(bestOnGrid, kept, points, tally, true);
    } catch (SearchInterruptedException interrupted) {
      return outcome(kept.isEmpty() ? null : kept.get(0), kept, points, tally, false);
    }
  }

  private static double spacing(int[] counts) {
    double widest = 0;
    for (int count : counts) {
      widest = Math.max(widest, count > 1 ? 1.5 / (count - 1) : 0);
    }
    return widest;
  }

  private void batch(
      Judges judges, int[] counts, long from, long to, List<Individual> kept, Tally tally) {
    List<double[]> genes = new ArrayList<>();
    List<double[]> values = new ArrayList<>();
    for (long point = from; point < to; point++) {
      double[] row = genes(counts, point);
      genes.add(row);
      values.add(space.values(row));
    }
    List<Verdict> verdicts = judges.judge(values);
    for (int i = 0; i < verdicts.size(); i++) {
      tally.count(Candidate.of(values.get(i), verdicts.get(i)));
      if (!verdicts.get(i).isFailure()) {
        kept.add(new Individual(0, Numbers.list(genes.get(i)), verdicts.get(i)));
      }
    }
    kept.sort(Optima.order(Double.NEGATIVE_INFINITY));
    if (kept.size() > KEPT) {
      kept.subList(KEPT, kept.size()).clear();
    }
  }

  private double[] genes(int[] counts, long point) {
    double[] genes = new double[counts.length];
    long rest = point;
    for (int i = 0; i < counts.length; i++) {
      long index = rest % counts[i];
      rest /= counts[i];
      genes[i] = space.snap(i, counts[i] > 1 ? (double) index / (counts[i] - 1) : 0.5);
    }
    return genes;
  }

  private ExhaustiveOutcome outcome(
      @Nullable Individual bestOnGrid,
      List<Individual> kept,
      List<Integer> points,
      Tally tally,
      boolean complete) {
    return new ExhaustiveOutcome(
        bestOnGrid == null ? null : candidate(bestOnGrid),
        kept.isEmpty() ? null : candidate(kept.get(0)),
        points,
        tally.evaluations(),
        tally.failures().stream().mapToInt(FailureRecord::count).sum(),
        complete);
  }

  private Candidate candidate(Individual individual) {
    return Candidate.of(space.values(individual.geneArray()), individual.verdict());
  }
}
