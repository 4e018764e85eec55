package evensun.scenario.tree;

import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects what is wrong, so that all of it is reported together. Not safe for threads. */
public final class Faults {

  private static final int MOST = 50;

  private final List<Fault> found = new ArrayList<>();

  /** Adds one fault. */
  public void add(Place place, String message) {
    found.add(new Fault(place, message));
  }

  /** Adds what others collected. */
  public void addAll(Faults others) {
    found.addAll(others.found);
  }

  /** Number of faults so far. */
  public int count() {
    return found.size();
  }

  /**
   * Ends the reading when there is a fault.
   *
   * @throws InputException with all faults in the order they stand in the file, 50 at most
   */
  public void throwIfAny() {
    if (found.isEmpty()) {
      return;
    }
    List<Fault> sorted = new ArrayList<>(found);
    sorted.sort(
        Comparator.comparingInt((Fault f) -> f.place().line())
            .thenComparingInt(f -> f.place().column()));
    if (sorted.size() > MOST) {
      int left = sorted.size() - MOST;
      Place last = sorted.get(MOST - 1).place();
      sorted = new ArrayList<>(sorted.subList(0, MOST));
      sorted.add(new Fault(last, "and " + left + " more faults after this one"));
    }
    throw new InputException(sorted);
  }
}
