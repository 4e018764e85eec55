package evensun.testkit;

/** One thing that every solver of the contract has to do. */
public interface Law {

  /** Short name in kebab-case. */
  String name();

  /** What is promised, in one sentence. */
  String promise();

  /** Tries it. */
  LawReport check(Subject subject);
}
