package evensun.search;

import evensun.search.problem.Candidate;
import java.util.List;

/**
 * What a search for several aims found.
 *
 * @param front designs none of which is better in every aim, in the order of falling first aim
 * @param knee index into the front of the best compromise; -1 when the front is empty
 * @param search how it went; its best design is the knee, or for an empty front the design that
 *     breaks the limits least, and its optima are empty
 */
public record ParetoOutcome(List<Candidate> front, int knee, SearchOutcome search) {

  public ParetoOutcome {
    front = List.copyOf(front);
  }
}
