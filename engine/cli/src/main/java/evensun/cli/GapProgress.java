package evensun.cli;

import java.util.Locale;
import java.util.function.DoubleConsumer;
import org.jspecify.annotations.Nullable;

/** Says on a terminal how far a map is, once it takes more than a second; safe for threads. */
final class GapProgress implements DoubleConsumer, AutoCloseable {

  private static final long PATIENCE_NANOS = 1_000_000_000L;
  private static final long PAUSE_NANOS = 200_000_000L;

  private final @Nullable Console console;
  private long next = System.nanoTime() + PATIENCE_NANOS;
  private boolean shown;

  GapProgress(@Nullable Console console) {
    this.console = console != null && console.errIsTerminal() ? console : null;
  }

  @Override
  public synchronized void accept(double share) {
    if (console != null && System.nanoTime() > next) {
      next = System.nanoTime() + PAUSE_NANOS;
      shown = true;
      console.err().print(String.format(Locale.ROOT, "\rbandgap map: %3.0f %%", 100 * share));
      console.err().flush();
    }
  }

  @Override
  public synchronized void close() {
    if (console != null && shown) {
      console.err().print("\r                     \r");
      console.err().flush();
    }
  }
}
