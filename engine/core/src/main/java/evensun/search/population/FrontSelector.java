package evensun.search.population;

import evensun.search.problem.Fitness;
import evensun.search.problem.GeneKey;
import io.jenetics.DoubleGene;
import io.jenetics.Optimize;
import io.jenetics.Phenotype;
import io.jenetics.Selector;
import io.jenetics.ext.moea.Pareto;
import io.jenetics.util.ISeq;
import io.jenetics.util.Seq;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * Keeps designs front by front, and of the last front that does not fit whole those with the most
 * room around them (NSGA-II: Deb et al., IEEE Trans. Evol. Comput. 6, 182 (2002)). The library's
 * own selector measures the room among all designs, dominated ones included, which leaves gaps in
 * the front; this one measures it within each front.
 */
public final class FrontSelector implements Selector<DoubleGene, Fitness> {

  @Override
  public ISeq<Phenotype<DoubleGene, Fitness>> select(
      Seq<Phenotype<DoubleGene, Fitness>> population, int count, Optimize optimize) {
    List<Phenotype<DoubleGene, Fitness>> distinct = distinct(population);
    List<Phenotype<DoubleGene, Fitness>> ordered = ordered(distinct, count);
    for (int i = 0; ordered.size() < count; i++) {
      ordered.add(ordered.get(i));
    }
    return ISeq.of(ordered);
  }

  private static List<Phenotype<DoubleGene, Fitness>> distinct(
      Seq<Phenotype<DoubleGene, Fitness>> population) {
    Set<GeneKey> seen = new HashSet<>();
    return population.stream().filter(p -> seen.add(new GeneKey(Genes.of(p)))).toList();
  }

  private static List<Phenotype<DoubleGene, Fitness>> ordered(
      List<Phenotype<DoubleGene, Fitness>> population, int count) {
    ISeq<Fitness> fitness = population.stream().map(Phenotype::fitness).collect(ISeq.toISeq());
    int[] rank = Pareto.rank(fitness, FrontSelector::dominance);
    List<Phenotype<DoubleGene, Fitness>> kept = new ArrayList<>(count);
    int most = Math.min(count, population.size());
    for (int r = 0; kept.size() < most; r++) {
      int present = r;
      int[] front = IntStream.range(0, rank.length).filter(i -> rank[i] == present).toArray();
      for (int i : byRoom(front, fitness)) {
        if (kept.size() < most) {
          kept.add(population.get(i));
        }
      }
    }
    return kept;
  }

  private static List<Integer> byRoom(int[] front, ISeq<Fitness> fitness) {
    ISeq<Fitness> members = IntStream.of(front).mapToObj(fitness::get).collect(ISeq.toISeq());
    double[] room =
        Pareto.crowdingDistance(
            members,
            (a, b, i) -> Double.compare(a.objective(i), b.objective(i)),
            (a, b, i) -> Math.abs(a.objective(i) - b.objective(i)),
            Fitness::objectiveCount);
    return IntStream.range(0, front.length)
        .boxed()
        .sorted(Comparator.comparingDouble((Integer i) -> -room[i]))
        .map(i -> front[i])
        .toList();
  }

  /** Positive when the first is at least as good in every aim and better in one. */
  static int dominance(Fitness a, Fitness b) {
    if (a.violation != b.violation) {
      return Double.compare(b.violation, a.violation);
    }
    boolean better = false;
    boolean worse = false;
    for (int i = 0; i < Math.min(a.objectiveCount(), b.objectiveCount()); i++) {
      better |= a.objective(i) > b.objective(i);
      worse |= a.objective(i) < b.objective(i);
    }
    return better == worse ? 0 : better ? 1 : -1;
  }
}
