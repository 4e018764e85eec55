package evensun.scenario;

import java.util.List;
import java.util.stream.Collectors;

/** Wrong input: all faults found, in the order they stand in the file. Ends with exit status 2. */
public final class InputException extends RuntimeException {

  private static final long serialVersionUID = 1;

  private final transient List<Fault> faults;

  /** Several faults; at least one. */
  public InputException(List<Fault> faults) {
    super(faults.stream().map(Fault::toString).collect(Collectors.joining("\n")));
    this.faults = List.copyOf(faults);
  }

  /** One fault. */
  public InputException(Place place, String message) {
    this(List.of(new Fault(place, message)));
  }

  /** The faults. */
  public List<Fault> faults() {
    return faults;
  }
}
