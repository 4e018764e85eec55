package evensun.search.proof;

import evensun.search.problem.Candidate;
import evensun.search.problem.Fitness;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Objective;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import evensun.search.problem.Verdict;
import evensun.search.refine.DerivativeFree;
import evensun.search.refine.LocalModel;
import evensun.search.refine.LocalProblem;
import evensun.search.refine.MaxMinSolver;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.stream.IntStream;

/**
 * Looks around a found design: how far each value can move while the first aim stays within a
 * stated loss of the best and every limit is kept, all other values chosen anew; and what moving an
 * active bound would gain. Follows the hill on which the design stands. Choices stay as they are.
 */
public final class Proof {

  /** Values this close to a bound, as a fraction of the range, stand on it. */
  private static final double ON_BOUND = 1e-6;

  /** The gain at a bound is read off this far inside, as a fraction of the range. */
  private static final double INSIDE = 0.02;

  private static final int BISECTIONS = 6;

  /** How far the best of the other values may lie from where they are. */
  private enum Climb {
    /** Beside a design that was the best. */
    NEAR(0.02, 20),
    /** With another alternative, which may want everything else to be different. */
    FAR(0.4, 100);

    /** First radius as a fraction of the range. */
    final double radius;

    /** Evaluations for each value, without derivatives. */
    final int evaluations;

    Climb(double radius, int evaluations) {
      this.radius = radius;
      this.evaluations = evaluations;
    }
  }

  private final Objective objective;
  private final Space space;
  private final int threads;
  private final BooleanSupplier cancelled;
  private final int limits;
  private final int evaluations;

  /**
   * A look around.
   *
   * @param threads number of threads, changes the time only
   * @param evaluations roughly the most it may evaluate; with too few the ranges come out narrower
   *     than they are, never wider
   * @param cancelled asked before every evaluation, from any thread
   */
  public Proof(Objective objective, int threads, int evaluations, BooleanSupplier cancelled) {
    this.evaluations = evaluations;
    this.objective = objective;
    this.threads = threads;
    this.cancelled = cancelled;
    space = new Space(objective.variables());
    limits = objective.limits().size();
  }

  /**
   * The freedom of every variable, in their order.
   *
   * @param best a design that keeps all limits
   * @param loss largest loss of the first aim that still counts as equally good, in its unit
   * @return empty when it was cancelled
   */
  public List<Freedom> freedoms(Candidate best, double loss) {
    Individual start = individual(best);
    double floor = best.aim() - loss;
    try (Judges judges = new Judges(objective, threads, cancelled)) {
      List<Double> ends =
          judges.each(
              2 * space.size(),
              (worker, i) ->
                  end(new Local(judges, worker), start, floor, i / 2, i % 2 == 0 ? -1 : 1));
      List<Double> gains =
          judges.each(
              space.size(), (worker, i) -> gainPerUnit(new Local(judges, worker), start, i));
      return IntStream.range(0, space.size())
          .mapToObj(i -> freedom(i, start, ends.get(2 * i), ends.get(2 * i + 1), gains.get(i)))
          .toList();
    } catch (SearchInterruptedException interrupted) {
      return List.of();
    }
  }

  /**
   * What every alternative of every choice is worth: the first aim with that alternative, all other
   * values chosen anew from the best designs that are known.
   *
   * @param best a design that keeps all limits
   * @param others good designs to start from as well
   * @return [variable][alternative] NaN where no design was found that keeps all limits; empty for
   *     variables that are no choice, and when it was cancelled
   */
  public List<List<Double>> alternatives(Candidate best, List<Candidate> others) {
    List<int[]> tries = new ArrayList<>();
    for (int v = 0; v < space.size(); v++) {
      for (int a = 0; a < space.variables().get(v).choices().size(); a++) {
        tries.add(new int[] {v, a});
      }
    }
    try (Judges judges = new Judges(objective, threads, cancelled)) {
      List<Double> aims =
          judges.each(
              tries.size(),
              (worker, i) ->
                  with(new Local(judges, worker), best, others, tries.get(i)[0], tries.get(i)[1]));
      List<List<Double>> table = new ArrayList<>();
      IntStream.range(0, space.size()).forEach(v -> table.add(new ArrayList<>()));
      IntStream.range(0, tries.size()).forEach(i -> table.get(tries.get(i)[0]).add(aims.get(i)));
      return table;
    } catch (SearchInterruptedException interrupted) {
      return List.of();
    }
  }

  private double with(
      Local local, Candidate best, List<Candidate> others, int variable, int alternative) {
    if (best.values().get(variable) == alternative) {
      return best.aim();
    }
    double reached =
        others.stream()
            .filter(other -> other.isFeasible() && other.values().get(variable) == alternative)
            .mapToDouble(Candidate::aim)
            .max()
            .orElse(Double.NEGATIVE_INFINITY);
    double refined =
        aim(held(local, individual(best), variable, gene(variable, alternative), Climb.FAR));
    double most = Math.max(reached, refined);
    return Double.isFinite(most) ? most : Double.NaN;
  }

  private Individual individual(Candidate candidate) {
    return new Individual(0, Numbers.list(space.genes(candidate.toArray())), candidate.verdict());
  }

  private double gene(int variable, int alternative) {
    return (double) alternative / Math.max(1, space.stepCount(variable));
  }

  private Freedom freedom(int i, Individual start, double low, double high, double gain) {
    double gene = start.genes().get(i);
    String bound = gene <= ON_BOUND ? "low" : gene >= 1 - ON_BOUND ? "high" : "";
    boolean fixed = space.isFixed(i) || space.isChoice(i);
    return new Freedom(
        space.variables().get(i).key(),
        space.value(i, gene),
        space.value(i, low),
        space.value(i, high),
        low <= ON_BOUND,
        high >= 1 - ON_BOUND,
        fixed ? "" : bound,
        gain);
  }

  /** The gene at which the range ends on one side; a stepped variable ends on a step. */
  private double end(Local local, Individual start, double floor, int variable, int direction) {
    double gene = start.genes().get(variable);
    if (space.isFixed(variable) || space.isChoice(variable)) {
      return gene;
    }
    double end =
        local.worker.partCount() > 0
            ? slide(local.problem(start, floor), floor, variable, direction)
            : halve(local, start, floor, variable, direction);
    return inward(variable, gene, end);
  }

  private double inward(int variable, double gene, double end) {
    if (!space.isStepped(variable)) {
      return end;
    }
    double count = space.stepCount(variable);
    double steps = end > gene ? Math.floor(end * count + 1e-6) : Math.ceil(end * count - 1e-6);
    return steps / count;
  }

  /** With derivatives: the variable itself is made as large, or as small, as the floor allows. */
  private double slide(LocalProblem problem, double floor, int variable, int direction) {
    int[] free = problem.ordered();
    int moved = Arrays.binarySearch(free, variable);
    LocalModel model = new LocalModel(problem, free, limits, moved, direction);
    double[] start = model.pointOf(problem.best().geneArray());
    double[] end = new MaxMinSolver(model, start, 0.05, 1e3).climb(80, 1e-4);
    for (double back = 0; back < 1; back = Math.max(1e-4, 3 * back)) {
      double[] point = start.clone();
      for (int j = 0; j < point.length; j++) {
        point[j] = end[j] + back * (start[j] - end[j]);
      }
      Verdict verdict = problem.judgeRelaxed(model.genesOf(point));
      if (Fitness.of(verdict, floor).isFeasible()) {
        return point[moved];
      }
    }
    return start[moved];
  }

  /**
   * Without: the variable is held, the others are chosen anew. The way to the bound is halved until
   * a good design is met, then the end is bisected.
   */
  private double halve(Local local, Individual start, double floor, int variable, int direction) {
    double from = start.genes().get(variable);
    double good = from;
    double bad = direction < 0 ? 0 : 1;
    Individual at = start;
    double tried = bad;
    int bisections = 0;
    while (local.left > 0 && bisections < BISECTIONS && Math.abs(bad - good) > 1e-5) {
      Individual held = held(local, at, variable, tried, Climb.NEAR);
      if (Fitness.of(held.verdict(), floor).isFeasible()) {
        good = tried;
        at = held;
      } else {
        bad = tried;
      }
      bisections += good == from ? 0 : 1;
      tried = good == from ? from + (bad - from) / 3 : (good + bad) / 2;
    }
    return good;
  }

  /** The best design with one gene held. */
  private Individual held(Local local, Individual from, int variable, double gene, Climb climb) {
    double[] genes = from.geneArray();
    genes[variable] = space.snap(variable, gene);
    Verdict verdict = local.judges.judge(local.worker, space.values(genes));
    Individual start = new Individual(0, Numbers.list(genes), verdict);
    LocalProblem problem = local.problem(start, Double.NEGATIVE_INFINITY);
    int[] free = IntStream.of(problem.continuous()).filter(i -> i != variable).toArray();
    if (free.length == 0) {
      local.left--;
      return problem.best();
    }
    if (local.worker.partCount() > 0) {
      LocalModel model = new LocalModel(problem, free, limits);
      double[] point = model.pointOf(genes);
      problem.judge(
          model.genesOf(new MaxMinSolver(model, point, climb.radius, 1e3).climb(60, 1e-6)));
    } else {
      new DerivativeFree(problem, free)
          .quadratic(
              climb.radius, 1e-5, Math.min(local.left, climb.evaluations * (free.length + 1)));
    }
    local.left -= 1 + problem.tally().evaluations();
    return problem.best();
  }

  private double gainPerUnit(Local local, Individual start, int variable) {
    double gene = start.genes().get(variable);
    boolean active = gene <= ON_BOUND || gene >= 1 - ON_BOUND;
    if (!active || space.isFixed(variable) || space.isChoice(variable)) {
      return 0;
    }
    double step = Math.max(INSIDE, space.isStepped(variable) ? 1.0 / space.stepCount(variable) : 0);
    Individual inside =
        held(local, start, variable, gene <= ON_BOUND ? step : 1 - step, Climb.NEAR);
    double loss = start.verdict().aims().get(0) - aim(inside);
    double moved = Math.abs(inside.genes().get(variable) - gene) * space.span(variable);
    return Double.isFinite(loss) && moved > 0 ? Math.max(0, loss / moved) : 0;
  }

  /** One worker and what it needs. */
  private final class Local {
    final Judges judges;
    final Objective.Worker worker;
    int left = evaluations / (3 * space.size());

    Local(Judges judges, Objective.Worker worker) {
      this.judges = judges;
      this.worker = worker;
    }

    LocalProblem problem(Individual start, double floor) {
      return new LocalProblem(space, judges, worker, start, floor, Math.max(2, left));
    }
  }

  private static double aim(Individual individual) {
    return individual.isFeasible() ? individual.verdict().aims().get(0) : Double.NEGATIVE_INFINITY;
  }
}
