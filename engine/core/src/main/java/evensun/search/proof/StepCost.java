package evensun.search.proof;

import evensun.search.problem.Candidate;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Objective;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Variable;
import evensun.search.refine.Refiner;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;

/**
 * What standing on steps costs: a found design against the best one on the same hill that
 * disregards the steps, all other values chosen anew. Choices stay as they are.
 */
public final class StepCost {

  private StepCost() {}

  /**
   * The cost in the unit of the first aim, never negative.
   *
   * @param best a design that keeps all limits
   * @param threads number of threads, changes the time only
   * @param evaluations roughly the most it may evaluate
   * @param cancelled asked before every evaluation, from any thread
   * @return empty when nothing stands on steps, when a tie-break had a say, or when cancelled
   */
  public static OptionalDouble of(
      Objective objective,
      Candidate best,
      int threads,
      int evaluations,
      BooleanSupplier cancelled) {
    boolean stepped = objective.variables().stream().anyMatch(v -> v.step() > 0 && !v.isChoice());
    if (!stepped || objective.tieResolution() > 0) {
      return OptionalDouble.empty();
    }
    Objective free = new WithoutSteps(objective);
    Space space = new Space(free.variables());
    Individual start = new Individual(0, Numbers.list(space.genes(best.toArray())), best.verdict());
    try (Judges judges = new Judges(free, threads, cancelled)) {
      double relaxed =
          new Refiner(space, judges, free.limits().size(), 0)
                  .refine(
                      List.of(start),
                      Double.NEGATIVE_INFINITY,
                      evaluations,
                      new Tally(0, List.of()))
                  .stream()
                  .filter(Individual::isFeasible)
                  .mapToDouble(i -> i.verdict().aims().get(0))
                  .max()
                  .orElse(best.aim());
      return OptionalDouble.of(Math.max(0, relaxed - best.aim()));
    } catch (SearchInterruptedException interrupted) {
      return OptionalDouble.empty();
    }
  }

  /** The same objective, its numbers free of their steps. */
  private record WithoutSteps(Objective inner) implements Objective {

    @Override
    public List<Variable> variables() {
      return inner.variables().stream().map(v -> v.isChoice() ? v : v.withoutSteps()).toList();
    }

    @Override
    public List<String> aims() {
      return inner.aims();
    }

    @Override
    public List<String> limits() {
      return inner.limits();
    }

    @Override
    public Worker newWorker() {
      return inner.newWorker();
    }
  }
}
