package evensun.pluginhost;

import evensun.spi.Traits;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;

/** A plugin that is ready for use; safe for threads. */
public final class LoadedPlugin {

  private final PluginFile file;
  private final String solverId;
  private final Traits traits;
  private @Nullable String sha256;

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
   * Hash of that jar as {@code sha256sum} prints it, or of all files of that folder. Taken when its
   * solver is first asked for, since hashing plugins that a run does not use would slow its start.
   */
  public synchronized String sha256() {
    if (sha256 == null) {
      try {
        sha256 = Fingerprint.of(file.path());
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
    return sha256;
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
