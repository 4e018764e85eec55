package evensun.search.population;

import evensun.search.problem.Fitness;
import evensun.search.problem.GeneKey;
import io.jenetics.DoubleGene;
import io.jenetics.Optimize;
import io.jenetics.Phenotype;
import io.jenetics.Selector;
import io.jenetics.util.ISeq;
import io.jenetics.util.Seq;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Keeps the best, each design once; copies only when there are too few different ones. */
public final class DistinctBest implements Selector<DoubleGene, Fitness> {

  @Override
  public ISeq<Phenotype<DoubleGene, Fitness>> select(
      Seq<Phenotype<DoubleGene, Fitness>> population, int count, Optimize optimize) {
    List<Phenotype<DoubleGene, Fitness>> sorted = new ArrayList<>(population.asList());
    sorted.sort((a, b) -> optimize.compare(b.fitness(), a.fitness()));
    List<Phenotype<DoubleGene, Fitness>> kept = distinct(sorted, count);
    for (int i = 0; kept.size() < count; i++) {
      kept.add(sorted.get(i % sorted.size()));
    }
    return ISeq.of(kept);
  }

  private static List<Phenotype<DoubleGene, Fitness>> distinct(
      List<Phenotype<DoubleGene, Fitness>> sorted, int count) {
    Set<GeneKey> seen = new HashSet<>();
    List<Phenotype<DoubleGene, Fitness>> kept = new ArrayList<>(count);
    for (Phenotype<DoubleGene, Fitness> phenotype : sorted) {
      if (kept.size() < count && seen.add(new GeneKey(Genes.of(phenotype)))) {
        kept.add(phenotype);
      }
    }
    return kept;
  }
}
