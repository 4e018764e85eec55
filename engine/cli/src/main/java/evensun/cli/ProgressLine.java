package evensun.cli;

import evensun.run.RunFolder;
import evensun.search.Progress;
import evensun.search.SearchListener;
import evensun.search.SearchState;
import evensun.search.SearchStateCodec;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ObjectNode;

/** Shows how a search goes, on a terminal only, and saves its state at intervals. */
final class ProgressLine implements SearchListener {

  /** Name of the log of the progress in a run's folder: one JSON document per line. */
  static final String LOG = "progress.jsonl";

  /** Name of the saved state in a run's folder. */
  static final String STATE = "search-state.json";

  private static final JsonMapper JSON = JsonMapper.builder().build();
  private static final long SHOW_NANOS = 200_000_000L;

  /** Saving takes at most this part of the time. */
  private static final double SAVING_SHARE = 0.05;

  private final @Nullable PrintStream terminal;
  private final RunFolder folder;
  private final Path log;
  private final String unit;
  private long shown = System.nanoTime();
  private long nextSave = Long.MIN_VALUE;
  private @Nullable SearchState latest;
  private int width;

  ProgressLine(@Nullable PrintStream terminal, RunFolder folder, String unit) {
    this.terminal = terminal;
    this.folder = folder;
    this.log = folder.claim(LOG);
    this.unit = unit;
  }

  @Override
  public void progress(Progress progress) {
    log(progress);
    long now = System.nanoTime();
    if (terminal != null && now - shown > SHOW_NANOS) {
      shown = now;
      show(text(progress));
    }
  }

  private void log(Progress progress) {
    ObjectNode line = JSON.createObjectNode();
    line.put("phase", progress.phase());
    line.put("generation", progress.generation());
    line.put("evaluations", progress.evaluations());
    if (Double.isFinite(progress.best())) {
      line.put("best", progress.best());
    }
    line.put("elapsedSeconds", Math.round(progress.elapsedSeconds() * 1000) / 1000.0);
    try {
      Files.writeString(
          log,
          JSON.writeValueAsString(line) + "\n",
          StandardOpenOption.CREATE,
          StandardOpenOption.APPEND);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write " + log, e);
    }
  }

  private String text(Progress progress) {
    String left =
        Double.isFinite(progress.leftSeconds())
            ? ", at most %.0f s left".formatted(progress.leftSeconds())
            : "";
    return String.format(
        Locale.ROOT,
        "%s: generation %d, %d evaluations, best %.3f %s%s",
        progress.phase(),
        progress.generation(),
        progress.evaluations(),
        progress.best(),
        unit,
        left);
  }

  private void show(String text) {
    String padded = text.length() < width ? text + " ".repeat(width - text.length()) : text;
    width = text.length();
    terminal.print("\r" + padded);
    terminal.flush();
  }

  @Override
  public void state(SearchState state) {
    latest = state;
    if (System.nanoTime() > nextSave) {
      save();
    }
  }

  /** Saves the latest state, if there is one. */
  void save() {
    if (latest != null) {
      long start = System.nanoTime();
      folder.write(STATE, SearchStateCodec.write(latest));
      long end = System.nanoTime();
      nextSave = end + (long) ((end - start) / SAVING_SHARE);
    }
  }

  /** Clears the line. */
  void end() {
    if (terminal != null && width > 0) {
      terminal.print("\r" + " ".repeat(width) + "\r");
      terminal.flush();
    }
  }
}
