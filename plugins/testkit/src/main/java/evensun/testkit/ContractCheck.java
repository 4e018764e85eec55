package evensun.testkit;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;

/**
 * Tries all laws on a solver; one that hangs or crashes in one law is still tried on the others.
 */
public final class ContractCheck {

  private ContractCheck() {}

  /**
   * Tries all laws.
   *
   * @param subject the solver
   * @param limit how long one law may take before it counts as broken
   * @param each called with each report as soon as it is there
   * @return all reports, in the order of {@link Laws#all()}
   */
  public static List<LawReport> run(Subject subject, Duration limit, Consumer<LawReport> each) {
    List<LawReport> reports = new ArrayList<>();
    for (Law law : Laws.all()) {
      LawReport report = checkWithin(law, subject, limit);
      reports.add(report);
      each.accept(report);
    }
    return reports;
  }

  /** Tries one law on a thread of its own, left behind if it hangs. */
  static LawReport checkWithin(Law law, Subject subject, Duration limit) {
    FutureTask<LawReport> task = new FutureTask<>(() -> law.check(subject));
    Thread thread = new Thread(task, "law-" + law.name());
    thread.setDaemon(true);
    thread.start();
    try {
      return task.get(limit.toMillis(), TimeUnit.MILLISECONDS);
    } catch (TimeoutException e) {
      task.cancel(true);
      return LawReport.failed(law, 1, "no answer within " + limit.toSeconds() + " s");
    } catch (ExecutionException e) {
      return LawReport.failed(law, 1, "threw " + e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return LawReport.failed(law, 1, "was interrupted");
    }
  }
}
