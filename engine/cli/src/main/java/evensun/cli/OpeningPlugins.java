package evensun.cli;

import evensun.pluginhost.PluginHost;
import evensun.run.BuildInfo;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;

/** Plugins that load aside while a command reads its input. */
final class OpeningPlugins implements AutoCloseable {

  private final FutureTask<PluginHost> host;

  OpeningPlugins(Evensun evensun) {
    this.host = new FutureTask<>(() -> Plugins.open(evensun));
    Thread aside = new Thread(this::prepare, "plugins");
    aside.setDaemon(true);
    aside.start();
  }

  /** Loads the plugins, then works out what the record of the run will want to know. */
  private void prepare() {
    host.run();
    BuildInfo.fingerprint();
  }

  /** The plugins, once they are loaded; whatever went wrong with their places is thrown here. */
  PluginHost host() {
    try {
      return host.get();
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException why) {
        throw why;
      }
      if (e.getCause() instanceof Error why) {
        throw why;
      }
      throw new IllegalStateException(e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  @Override
  public void close() {
    try {
      host.get().close();
    } catch (ExecutionException e) {
      return; // nothing was opened; who asked for the plugins was told why
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
