package evensun.scenario;

/**
 * One thing wrong with an input, in one line.
 *
 * @param place where it stands
 * @param message what it is, which rule it breaks, the value with its unit, and what to do
 */
public record Fault(Place place, String message) {

  @Override
  public String toString() {
    return place + ": " + message;
  }
}
