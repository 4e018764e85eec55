package evensun.pluginhost;

import static evensun.pluginhost.PluginBuilder.described;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import evensun.spi.OpticalSolver;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whose defect something thrown is. Witness: the plugin's own source, which throws. */
class PluginFaultTest {

  @TempDir Path work;

  @Test
  void whatAPluginThrowsIsItsOwn() throws Exception {
    assertThat(thrownBy("throw new IllegalStateException(\"lost\");"))
        .isInstanceOf(IllegalStateException.class)
        .satisfies(e -> assertThat(PluginFault.place(e)).contains("lab.Solver"));
  }

  @Test
  void whatTheJdkThrowsInsideAPluginIsThePlugins() throws Exception {
    assertThat(thrownBy("return (PreparedSolver) (Object) java.util.List.of((Object) null);"))
        .satisfies(e -> assertThat(PluginFault.place(e)).contains("lab.Solver"));
  }

  @Test
  void aMissingLibraryOfAPluginIsThePlugins() throws Exception {
    String code = "throw new NoClassDefFoundError(\"some/Library\");";
    assertThat(new IllegalStateException(thrownBy(code)))
        .satisfies(e -> assertThat(PluginFault.place(e)).contains("lab.Solver"));
  }

  @Test
  void whatWeThrowIsOurs() {
    assertThat(PluginFault.place(new IllegalStateException("ours"))).isEmpty();
    assertThat(PluginFault.place(catchThrowable(() -> List.of((Object) null)))).isEmpty();
  }

  private Throwable thrownBy(String body) throws Exception {
    Path plugins = Files.createDirectory(work.resolve("plugins"));
    String source =
        PluginBuilder.solver("lab", "")
            .replace("throw new UnsupportedProblem(\"only for loading\");", body);
    described(work, "lab").source("lab.Solver", source).jar(plugins.resolve("lab.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      OpticalSolver solver = host.solver("lab").orElseThrow();
      return catchThrowable(() -> solver.prepare(null, null, null));
    }
  }
}
