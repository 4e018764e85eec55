package evensun.bench.search;

import evensun.pluginhost.PluginHost;
import evensun.run.DesignJob;
import evensun.run.Preparation;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.search.problem.Objective;
import evensun.transfermatrix.TransferMatrixSolver;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;

/** A scenario of the benchmarks made ready as the program does it, with the solver as a plugin. */
final class Stack implements AutoCloseable {

  private final PluginHost host;
  private final Preparation preparation;

  private Stack(PluginHost host, Preparation preparation) {
    this.host = host;
    this.preparation = preparation;
  }

  /** Opens the scenario of that name among the resources beside this class. */
  static Stack open(String name) {
    PluginHost host = PluginHost.open(List.of(placeOf(TransferMatrixSolver.class)));
    Source source = new Source(name + ".yaml", Path.of(""), text(name + ".yaml"));
    return new Stack(host, Preparation.of(ScenarioReader.read(source), host, () -> false));
  }

  /** What {@code evensun design} searches. */
  Objective objective() {
    return new DesignJob(preparation).objective();
  }

  private static String text(String resource) {
    try (InputStream in = Stack.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalArgumentException("no scenario " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Path placeOf(Class<?> type) {
    try {
      return Path.of(type.getProtectionDomain().getCodeSource().getLocation().toURI());
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  @Override
  public void close() {
    preparation.close();
    host.close();
  }
}
