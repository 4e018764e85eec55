package evensun.spi;

/** How much a finding matters for a decision. */
public enum Severity {
  /** Good to know. */
  NOTE,
  /** To be checked before deciding. */
  WARNING,
  /** Speaks against deciding on this result. */
  SERIOUS
}
