package evensun.search.population;

import evensun.search.problem.Fitness;
import io.jenetics.DoubleChromosome;
import io.jenetics.DoubleGene;
import io.jenetics.Genotype;
import io.jenetics.Phenotype;

/** Rows of numbers as the types of the genetic library, and back. */
public final class Genes {

  /** The library takes the upper end as excluded; the wall itself must be a legal gene. */
  private static final double TOP = Math.nextUp(1.0);

  private Genes() {}

  static double[] of(Phenotype<DoubleGene, Fitness> phenotype) {
    var chromosome = phenotype.genotype().chromosome();
    double[] genes = new double[chromosome.length()];
    for (int i = 0; i < genes.length; i++) {
      genes[i] = chromosome.get(i).doubleValue();
    }
    return genes;
  }

  static Genotype<DoubleGene> genotype(double[] genes) {
    DoubleGene[] row = new DoubleGene[genes.length];
    for (int i = 0; i < row.length; i++) {
      row[i] = DoubleGene.of(genes[i], 0, TOP);
    }
    return Genotype.of(DoubleChromosome.of(row));
  }
}
