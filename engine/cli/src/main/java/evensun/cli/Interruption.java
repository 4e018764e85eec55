package evensun.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;

/**
 * Ctrl-C: the first one asks the job to end and waits until it has saved and reported what it has;
 * the process then ends with status 130.
 */
final class Interruption implements BooleanSupplier {

  private static final long LONGEST_WAIT_SECONDS = 30;

  private static final CountDownLatch FINISHED = new CountDownLatch(1);

  private volatile boolean requested;

  /** Listens from now on. */
  static Interruption listen() {
    Interruption interruption = new Interruption();
    Runtime.getRuntime().addShutdownHook(new Thread(interruption::stopped, "interruption"));
    return interruption;
  }

  /** Tells a waiting shutdown that everything has been printed. */
  static void finished() {
    FINISHED.countDown();
  }

  @SuppressWarnings("SystemExitOutsideMain")
  private void stopped() {
    requested = true;
    try {
      if (!FINISHED.await(LONGEST_WAIT_SECONDS, TimeUnit.SECONDS)) {
        Runtime.getRuntime().halt(ExitStatus.INTERRUPTED);
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  /** Whether the user asked to stop. */
  @Override
  public boolean getAsBoolean() {
    return requested;
  }
}
