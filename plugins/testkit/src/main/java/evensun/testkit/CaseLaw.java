package evensun.testkit;

import evensun.spi.EvaluationFailed;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * A law about single stacks: tried on many, and reported with the smallest that breaks it.
 *
 * @param name short name in kebab-case
 * @param promise what is promised, in one sentence
 * @param cases what it is tried on
 * @param test what is wrong with the answer to one case, or empty
 */
record CaseLaw(String name, String promise, Function<Subject, List<StackCase>> cases, Test test)
    implements Law {

  /** One trial. */
  @FunctionalInterface
  interface Test {
    /** What is wrong, or empty. */
    Optional<String> violation(Subject subject, StackCase stack);
  }

  @Override
  public LawReport check(Subject subject) {
    int tried = 0;
    for (StackCase stack : cases.apply(subject)) {
      tried++;
      if (violation(subject, stack).isPresent()) {
        StackCase smallest = Shrinker.shrink(stack, c -> violation(subject, c).isPresent());
        return LawReport.failed(this, tried, violation(subject, smallest).orElseThrow(), smallest);
      }
    }
    return tried == 0
        ? LawReport.notPromised(this, "the solver claims no case that this law is about")
        : LawReport.passed(this, tried);
  }

  private Optional<String> violation(Subject subject, StackCase stack) {
    try {
      return test.violation(subject, stack);
    } catch (UnsupportedProblem e) {
      return Optional.of("refuses a problem that its traits claim: " + e.getMessage());
    } catch (EvaluationFailed e) {
      return Optional.of("cannot evaluate a regular design: " + e.getMessage());
    } catch (RuntimeException | LinkageError | StackOverflowError e) {
      return Optional.of("threw " + e);
    }
  }
}
