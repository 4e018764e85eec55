package evensun.search.population;

import evensun.search.problem.Candidate;
import evensun.search.problem.Fitness;
import evensun.search.problem.GeneKey;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Verdict;
import io.jenetics.DoubleGene;
import io.jenetics.Phenotype;
import io.jenetics.Selector;
import io.jenetics.TournamentSelector;
import io.jenetics.engine.Engine;
import io.jenetics.engine.EvolutionStart;
import io.jenetics.util.ISeq;
import io.jenetics.util.RandomRegistry;
import io.jenetics.util.Seq;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

/**
 * One generation after the other. Selection and alteration run on the calling thread with one
 * stream of random numbers for each generation; only the judging is spread over threads.
 */
public final class Genetic {

  private static final double OFFSPRING_FRACTION = 0.6;

  private final Space space;
  private final long seed;
  private final int populationSize;
  private final Judges judges;
  private final Selector<DoubleGene, Fitness> survivors;
  private final Selector<DoubleGene, Fitness> parents;

  private Genetic(
      Space space,
      long seed,
      int populationSize,
      Judges judges,
      Selector<DoubleGene, Fitness> survivors,
      Selector<DoubleGene, Fitness> parents) {
    this.space = space;
    this.seed = seed;
    this.populationSize = populationSize;
    this.judges = judges;
    this.survivors = survivors;
    this.parents = parents;
  }

  /** For the first aim alone: the best survive, tournaments choose the parents. */
  public static Genetic forOneAim(Space space, long seed, int populationSize, Judges judges) {
    return new Genetic(
        space, seed, populationSize, judges, new DistinctBest(), new TournamentSelector<>(3));
  }

  /** For several aims at once: whole fronts survive, and their better half has the children. */
  public static Genetic forSeveralAims(Space space, long seed, int populationSize, Judges judges) {
    FrontSelector fronts = new FrontSelector();
    Selector<DoubleGene, Fitness> parents =
        (population, count, optimize) -> {
          var half = fronts.select(population, population.length() / 2, optimize);
          return IntStream.range(0, count)
              .mapToObj(i -> half.get(i % half.length()))
              .collect(ISeq.toISeq());
        };
    return new Genetic(space, seed, populationSize, judges, fronts, parents);
  }

  /**
   * A first population that fills the cube evenly (a Latin hypercube), the given designs in front.
   */
  public List<Individual> first(List<double[]> given, int generation, Tally tally) {
    SplittableRandom random = Numbers.random(seed, generation);
    int count = populationSize;
    double[][] cube = latinHypercube(count, random);
    List<Phenotype<DoubleGene, Fitness>> population = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      double[] genes = space.snap(i < given.size() ? given.get(i) : cube[i]);
      population.add(Phenotype.of(Genes.genotype(genes), generation));
    }
    return individuals(
        evaluated(ISeq.of(population), ISeq.empty(), Double.NEGATIVE_INFINITY, tally));
  }

  private double[][] latinHypercube(int count, SplittableRandom random) {
    double[][] cube = new double[count][space.size()];
    for (int variable = 0; variable < space.size(); variable++) {
      int[] order = permutation(count, random);
      for (int i = 0; i < count; i++) {
        cube[i][variable] = (order[i] + random.nextDouble()) / count;
      }
    }
    return cube;
  }

  private static int[] permutation(int count, SplittableRandom random) {
    int[] order = new int[count];
    for (int i = 0; i < count; i++) {
      int j = random.nextInt(i + 1);
      order[i] = order[j];
      order[j] = i;
    }
    return order;
  }

  /**
   * The generation after the given one.
   *
   * @param floor see {@link Fitness#of}
   */
  public List<Individual> next(
      List<Individual> present, int generation, double floor, Tally tally) {
    ISeq<Phenotype<DoubleGene, Fitness>> evaluated =
        present.stream().map(individual -> phenotype(individual, floor)).collect(ISeq.toISeq());
    Engine<DoubleGene, Fitness> engine =
        new Engine.Builder<DoubleGene, Fitness>(
                population -> evaluated(population, evaluated, floor, tally),
                () -> Genes.genotype(new double[space.size()]))
            .executor(Runnable::run)
            .populationSize(present.size())
            .offspringFraction(OFFSPRING_FRACTION)
            .survivorsSelector(survivors)
            .offspringSelector(parents)
            .alterers(new Variation(space, 0.5, 0.3))
            .maximalPhenotypeAge(Long.MAX_VALUE)
            .build();
    List<Individual> result = new ArrayList<>(present.size());
    RandomRegistry.using(
        Numbers.random(seed, generation),
        random ->
            result.addAll(
                individuals(engine.evolve(EvolutionStart.of(evaluated, generation)).population())));
    return result;
  }

  private static Phenotype<DoubleGene, Fitness> phenotype(Individual individual, double floor) {
    double[] genes = Numbers.array(individual.genes());
    return Phenotype.of(
        Genes.genotype(genes), individual.birth(), Fitness.of(individual.verdict(), floor));
  }

  private static List<Individual> individuals(Seq<Phenotype<DoubleGene, Fitness>> population) {
    List<Individual> individuals = new ArrayList<>(population.size());
    for (Phenotype<DoubleGene, Fitness> p : population) {
      individuals.add(
          new Individual(p.generation(), Numbers.list(Genes.of(p)), p.fitness().verdict));
    }
    return individuals;
  }

  /** Judges what has no fitness yet; equal genes, and genes of a parent, are judged once. */
  private ISeq<Phenotype<DoubleGene, Fitness>> evaluated(
      Seq<Phenotype<DoubleGene, Fitness>> population,
      Seq<Phenotype<DoubleGene, Fitness>> parents,
      double floor,
      Tally tally) {
    Map<GeneKey, Fitness> known = new HashMap<>();
    parents.forEach(p -> known.put(new GeneKey(Genes.of(p)), p.fitness()));
    List<double[]> wanted = new ArrayList<>();
    for (Phenotype<DoubleGene, Fitness> p : population) {
      double[] genes = Genes.of(p);
      if (p.nonEvaluated() && known.putIfAbsent(new GeneKey(genes), UNKNOWN) == null) {
        wanted.add(genes);
      }
    }
    judge(wanted, floor, tally, known);
    return population.stream()
        .map(p -> p.isEvaluated() ? p : p.withFitness(known.get(new GeneKey(Genes.of(p)))))
        .collect(ISeq.toISeq());
  }

  private static final Fitness UNKNOWN =
      Fitness.of(Verdict.failed("not judged"), Double.NEGATIVE_INFINITY);

  private void judge(
      List<double[]> wanted, double floor, Tally tally, Map<GeneKey, Fitness> known) {
    List<double[]> values = wanted.stream().map(space::values).toList();
    List<Verdict> verdicts = judges.judge(values);
    for (int i = 0; i < verdicts.size(); i++) {
      tally.count(Candidate.of(values.get(i), verdicts.get(i)));
      known.put(new GeneKey(wanted.get(i)), Fitness.of(verdicts.get(i), floor));
    }
  }
}
