package evensun.search.problem;

/**
 * A kind of failure.
 *
 * @param kind what stood before the first colon of the reason
 * @param count how often
 * @param first the first design that failed in this way, with the whole reason
 */
public record FailureRecord(String kind, int count, Candidate first) {}
