package evensun.pluginhost;

import evensun.spi.Traits;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import org.jspecify.annotations.Nullable;

/** A plugin that is ready for use; safe for threads. */
public final class LoadedPlugin {

  private final PluginFile file;
  private final String solverId;
  private final Traits traits;
  private @Nullable FutureTask<String> fingerprint;

  LoadedPlugin(PluginFile file, String solverId, Traits traits) {
    this.file = file;
    this.solverId = solverId;
    this.traits = traits;
  }

  /** Name of the plugin, unique among the loaded ones. */
  public String id() {
    return file.property("plugin.id");
  }

  /** Its own version. */
  public String version() {
    return file.property("plugin.version");
  }

  /** Range of contract versions it was made for. */
  public String requires() {
    return file.property("plugin.requires");
  }

  /** One line in the author's words, empty where there is none. */
  public String description() {
    return file.property("plugin.description");
  }

  /** The jar or folder it was loaded from. */
  public Path file() {
    return file.path();
  }

  /**
   * Hash of that jar as {@code sha256sum} prints it, or of all files of that folder, as they were
   * when its solver was first asked for.
   */
  public String sha256() {
    try {
      return fingerprint().get();
    } catch (InterruptedException | ExecutionException e) {
      throw new IllegalStateException("the hash of " + file.path() + " cannot be worked out", e);
    }
  }

  /**
   * Reads the plugin and begins to hash it aside, since a run waits for its solver and not for the
   * hash; plugins that a run does not use are not hashed at all.
   */
  synchronized FutureTask<String> fingerprint() {
    if (fingerprint == null) {
      try {
        fingerprint = Fingerprint.of(file.path());
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
      Thread aside = new Thread(fingerprint, "fingerprint of " + id());
      aside.setDaemon(true);
      aside.start();
    }
    return fingerprint;
  }

  /** Name of its solver in scenarios, unique among the loaded ones. */
  public String solverId() {
    return solverId;
  }

  /** What the solver takes and offers. */
  public Traits traits() {
    return traits;
  }
}
