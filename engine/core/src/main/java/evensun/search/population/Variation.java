package evensun.search.population;

import evensun.search.problem.Fitness;
import evensun.search.problem.Space;
import io.jenetics.Alterer;
import io.jenetics.AltererResult;
import io.jenetics.DoubleGene;
import io.jenetics.Phenotype;
import io.jenetics.util.ISeq;
import io.jenetics.util.MSeq;
import io.jenetics.util.RandomRegistry;
import io.jenetics.util.Seq;
import java.util.random.RandomGenerator;

/**
 * Makes new designs of old ones. Each gets one of three changes: a step along the difference of two
 * others, whose length follows the spread of the population (differential evolution: Storn and
 * Price, J. Global Optim. 11, 341 (1997)); a mixture with another; or a random change of few genes.
 */
public record Variation(Space space, double differenceShare, double mixtureShare)
    implements Alterer<DoubleGene, Fitness> {

  @Override
  public AltererResult<DoubleGene, Fitness> alter(
      Seq<Phenotype<DoubleGene, Fitness>> population, long generation) {
    RandomGenerator random = RandomRegistry.random();
    double[][] genes = new double[population.size()][];
    for (int i = 0; i < genes.length; i++) {
      genes[i] = Genes.of(population.get(i));
    }
    MSeq<Phenotype<DoubleGene, Fitness>> altered = MSeq.ofLength(genes.length);
    for (int i = 0; i < genes.length; i++) {
      double[] child = space.snap(child(genes, i, random));
      altered.set(i, Phenotype.of(Genes.genotype(child), generation));
    }
    return new AltererResult<>(ISeq.of(altered), genes.length);
  }

  private double[] child(double[][] genes, int parent, RandomGenerator random) {
    double kind = random.nextDouble();
    if (kind < differenceShare) {
      return difference(genes, parent, random);
    }
    if (kind < differenceShare + mixtureShare) {
      return mixture(genes[parent], genes[index(genes.length, random)], random);
    }
    return mutation(genes[parent], random);
  }

  private double[] difference(double[][] genes, int parent, RandomGenerator random) {
    double[] child = genes[parent].clone();
    double[] a = genes[index(genes.length, random)];
    double[] b = genes[index(genes.length, random)];
    double length = 0.4 + 0.6 * random.nextDouble();
    double share = random.nextDouble() < 0.5 ? 0.2 : 0.9;
    int forced = index(child.length, random);
    for (int i = 0; i < child.length; i++) {
      if (i == forced || random.nextDouble() < share) {
        child[i] = space.isChoice(i) ? a[i] : inside(child[i], length * (a[i] - b[i]), random);
      }
    }
    return child;
  }

  private double[] mixture(double[] parent, double[] other, RandomGenerator random) {
    double[] child = parent.clone();
    boolean blend = random.nextDouble() < 0.3;
    for (int i = 0; i < child.length; i++) {
      double weight = random.nextDouble();
      if (blend && !space.isChoice(i)) {
        double step = (1.5 * weight - 0.25) * (other[i] - child[i]);
        child[i] = inside(child[i], step, random);
      } else if (weight < 0.5) {
        child[i] = other[i];
      }
    }
    return child;
  }

  private double[] mutation(double[] parent, RandomGenerator random) {
    double[] child = parent.clone();
    int forced = index(child.length, random);
    double rate = 1.0 / child.length;
    double width = Math.pow(10, -2.5 * random.nextDouble());
    for (int i = 0; i < child.length; i++) {
      if (i == forced || random.nextDouble() < rate) {
        child[i] = mutated(i, child[i], width, random);
      }
    }
    return child;
  }

  private double mutated(int variable, double gene, double width, RandomGenerator random) {
    double draw = random.nextDouble();
    if (space.isChoice(variable)) {
      return draw;
    }
    if (space.isStepped(variable)) {
      double oneStep = 1.0 / Math.max(1, space.stepCount(variable));
      return inside(gene, (2 * draw - 1) * Math.max(width, 1.6 * oneStep), random);
    }
    return inside(gene, (2 * draw - 1) * width, random);
  }

  /** A step that would leave the cube ends somewhere between its start and the wall. */
  private static double inside(double gene, double step, RandomGenerator random) {
    double next = gene + step;
    if (next < 0) {
      return random.nextDouble() < 0.3 ? 0 : gene * random.nextDouble();
    }
    if (next > 1) {
      return random.nextDouble() < 0.3 ? 1 : 1 - (1 - gene) * random.nextDouble();
    }
    return next;
  }

  private static int index(int bound, RandomGenerator random) {
    return (int) (random.nextDouble() * bound);
  }
}
