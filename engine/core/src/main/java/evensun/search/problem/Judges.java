package evensun.search.problem;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;

/**
 * The workers of a search, one for each thread. Results come back in the order of the requests, and
 * a verdict depends on its values alone, so that the number of threads changes nothing but the
 * time.
 */
public final class Judges implements AutoCloseable {

  /** Something to do for one index with one worker. */
  public interface Task<T> {
    T run(Objective.Worker worker, int index);
  }

  private final List<Objective.Worker> workers = new ArrayList<>();
  private final ExecutorService pool;
  private final BooleanSupplier cancelled;
  private final int aimCount;

  public Judges(Objective objective, int threads, BooleanSupplier cancelled) {
    this.cancelled = cancelled;
    aimCount = objective.aims().size();
    for (int i = 0; i < threads; i++) {
      workers.add(objective.newWorker());
    }
    pool = Executors.newFixedThreadPool(Math.max(1, threads - 1), Judges::daemon);
  }

  private static Thread daemon(Runnable runnable) {
    Thread thread = new Thread(runnable, "evensun-search");
    thread.setDaemon(true);
    return thread;
  }

  /** Verdicts in the order of the candidates. */
  public List<Verdict> judge(List<double[]> candidates) {
    return each(candidates.size(), (worker, i) -> judge(worker, candidates.get(i)));
  }

  /** One verdict; whatever goes wrong with the candidate becomes a failure. */
  public Verdict judge(Objective.Worker worker, double[] values) {
    stopIfCancelled();
    Verdict verdict;
    try {
      verdict = worker.judge(values.clone());
    } catch (RuntimeException failure) {
      String message = failure.getMessage();
      return Verdict.failed(message == null ? failure.getClass().getSimpleName() : message);
    }
    return checked(verdict);
  }

  public void stopIfCancelled() {
    if (cancelled.getAsBoolean()) {
      throw new SearchInterruptedException();
    }
  }

  /** NaN would sort above every number, so it never gets further than here. */
  private Verdict checked(Verdict verdict) {
    if (verdict.isFailure()) {
      return verdict;
    }
    if (verdict.aims().size() != aimCount) {
      throw new IllegalStateException(
          "a verdict has " + verdict.aims().size() + " aims, expected " + aimCount);
    }
    boolean finite =
        verdict.aims().stream().allMatch(Double::isFinite)
            && verdict.slacks().stream().noneMatch(slack -> Double.isNaN(slack))
            && Double.isFinite(verdict.tieBreak())
            && verdict.violation() >= 0;
    return finite ? verdict : Verdict.failed("not a number: aims " + verdict.aims());
  }

  /** Runs the tasks over all workers; results in the order of the indices. */
  public <T> List<T> each(int count, Task<T> task) {
    Object[] results = new Object[count];
    AtomicInteger next = new AtomicInteger();
    List<Future<?>> others = new ArrayList<>();
    for (int w = 1; w < Math.min(workers.size(), count); w++) {
      Objective.Worker worker = workers.get(w);
      others.add(pool.submit(() -> drain(worker, next, results, task)));
    }
    RuntimeException failure = null;
    try {
      drain(workers.get(0), next, results, task);
    } catch (RuntimeException e) {
      failure = e;
    }
    failure = join(others, failure);
    if (failure != null) {
      throw failure;
    }
    return cast(results);
  }

  private static <T> void drain(
      Objective.Worker worker, AtomicInteger next, Object[] results, Task<T> task) {
    for (int i = next.getAndIncrement(); i < results.length; i = next.getAndIncrement()) {
      results[i] = task.run(worker, i);
    }
  }

  private static RuntimeException join(List<Future<?>> others, RuntimeException first) {
    RuntimeException failure = first;
    for (Future<?> other : others) {
      try {
        other.get();
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
        failure = new SearchInterruptedException();
      } catch (ExecutionException e) {
        if (e.getCause() instanceof Error error) {
          throw error;
        }
        failure = failure == null ? (RuntimeException) e.getCause() : failure;
      }
    }
    return failure;
  }

  @SuppressWarnings("unchecked")
  private static <T> List<T> cast(Object[] results) {
    return (List<T>) Arrays.asList(results);
  }

  @Override
  public void close() {
    pool.shutdownNow();
    workers.forEach(Objective.Worker::close);
  }
}
