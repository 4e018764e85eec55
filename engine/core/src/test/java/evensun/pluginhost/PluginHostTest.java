package evensun.pluginhost;

import static evensun.pluginhost.PluginBuilder.described;
import static evensun.pluginhost.PluginBuilder.empty;
import static evensun.pluginhost.PluginBuilder.solver;
import static evensun.pluginhost.PluginBuilder.working;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Traits;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.concurrent.FutureTask;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the plugin host promises, on real jars. Witness throughout: the contract's own words. */
class PluginHostTest {

  @TempDir Path work;
  private Path plugins;

  @BeforeEach
  void makeFolder() throws IOException {
    plugins = Files.createDirectory(work.resolve("plugins"));
  }

  @Test
  void aPluginIsDescribed() throws Exception {
    Path jar = working(work, "lab").jar(plugins.resolve("lab.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
      // The hash of the JDK's own digest over the whole file at once.
      byte[] digest =
          java.security.MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(jar));
      LoadedPlugin plugin = host.loaded().get(0);
      assertThat(plugin.sha256()).isEqualTo(HexFormat.of().formatHex(digest));
      assertThat(plugin)
          .extracting(
              LoadedPlugin::id,
              LoadedPlugin::version,
              LoadedPlugin::requires,
              LoadedPlugin::description,
              LoadedPlugin::file,
              LoadedPlugin::solverId,
              LoadedPlugin::traits)
          .containsExactly("lab", "2.3.4", ">=1.0.0 & <2.0.0", "", jar, "lab", Traits.plain());
      assertThat(host.solver("lab")).get().extracting(OpticalSolver::id).isEqualTo("lab");
      assertThat(host.pluginOf("lab")).isPresent();
    }
  }

  @Test
  void jarsFoldersAndFoldersWithALibraryLoadFromOneFolderInOrderOfName() throws IOException {
    working(work, "c").jar(plugins.resolve("c.jar"));
    working(work, "b").exploded(plugins.resolve("b"));
    Path folder = Files.createDirectories(plugins.resolve("a/lib")).getParent();
    working(work, "a").jar(folder.resolve("whatever.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
      assertThat(host.loaded()).extracting(LoadedPlugin::id).containsExactly("a", "b", "c");
    }
  }

  @Test
  void theHashIsThatOfTheFileThatWasLoaded() throws Exception {
    Path jar = working(work, "lab").jar(plugins.resolve("lab.jar"));
    String before = hash(jar);
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      host.require("lab");
      working(work, "lab").text("more", "content").jar(jar);
      assertThat(host.loaded().get(0).sha256()).isEqualTo(before);
      assertThat(hash(jar)).isNotEqualTo(before);
    }
  }

  @Test
  void aPlaceMayBeOnePlugin() {
    Path classes = working(work, "classes").exploded(work.resolve("target/classes"));
    Path jar = working(work, "jar").jar(work.resolve("one.jar"));
    try (PluginHost host = PluginHost.open(List.of(classes, jar))) {
      assertThat(host.loaded()).extracting(LoadedPlugin::id).containsExactly("classes", "jar");
      assertThat(host.loaded().get(0).sha256()).matches("[0-9a-f]{64}");
    }
  }

  @Test
  void theSamePlaceNamedTwiceIsLoadedOnce() {
    working(work, "lab").jar(plugins.resolve("lab.jar"));
    Path detour = plugins.resolve("../plugins");
    try (PluginHost host = PluginHost.open(List.of(plugins, detour))) {
      assertThat(host.loaded()).hasSize(1);
      assertThat(host.rejected()).isEmpty();
    }
  }

  @Test
  void aBadPluginStopsNoOther() throws IOException {
    Files.writeString(plugins.resolve("a-corrupt.jar"), "no zip");
    described(work, "b")
        .source("lab.Solver", solver("b", "throw new RuntimeException();"))
        .jar(plugins.resolve("b.jar"));
    working(work, "c").jar(plugins.resolve("c.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.loaded()).extracting(LoadedPlugin::id).containsExactly("c");
      assertThat(host.rejected()).hasSize(2);
      assertThat(host.whyMissing("b"))
          .contains("loaded: c", "a-corrupt.jar: it is no jar", "b.jar");
      assertThatThrownBy(() -> host.require("b"))
          .isInstanceOf(PluginException.class)
          .hasMessageNotContaining("\n");
    }
  }

  @Test
  void aBundledContractDoesNoHarm() {
    working(work, "lab").folder(classesOfContract()).jar(plugins.resolve("lab.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
      assertThat(host.require("lab")).isInstanceOf(OpticalSolver.class);
    }
  }

  static List<Path> recordedContracts() throws IOException {
    try (var jars = Files.list(Path.of("..", "..", "plugins", "spi", "recorded"))) {
      List<Path> recorded = jars.filter(PluginFile::isJar).sorted().toList();
      assertThat(recorded).hasSizeGreaterThan(1);
      return recorded;
    }
  }

  @ParameterizedTest
  @MethodSource("recordedContracts")
  void aPluginCompiledAgainstARecordedContractStillLoadsAndRuns(Path recorded) {
    described(work, "mirror")
        .against(recorded)
        .source(
            "lab.Solver",
"""
            package lab;
            import evensun.spi.*;
            import java.util.List;
import java.util.Map;
            public class Solver implements OpticalSolver {
              public String id() { return "mirror"; }
              public Traits traits() { return Traits.plain(); }
              public PreparedSolver prepare(Problem problem, Design start, Services services) {
                return new PreparedSolver() {
                  public List<Channel> channels() { return List.of(); }
                  public Evaluator newEvaluator() {
                    return (design, into) -> into.reflectance[0][0] = design.n[0][0];
                  }
                };
              }
            }
            """)
        .jar(plugins.resolve("mirror.jar"));
    Problem problem =
        new Problem(
            Samples.of(500),
            Samples.of(1),
            List.of(),
            0,
            0,
            1,
            0,
            List.of(Incidence.normal()),
            1,
            0.01,
            Map.of());
    Design design = Design.of(problem);
    design.n[0][0] = 0.75;
    Response response = Response.spectra(1, 0, 1);
    try (PluginHost host = PluginHost.open(List.of(plugins));
        PreparedSolver prepared =
            host.require("mirror").prepare(problem, design, host.services(() -> false));
        Evaluator evaluator = prepared.newEvaluator()) {
      evaluator.evaluate(design, response);
    }
    assertThat(response.reflectance[0][0]).isEqualTo(0.75);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "evensun.pluginhost.PluginHost",
        "org.apache.commons.math3.complex.Complex",
        "io.jenetics.Genotype",
        "tools.jackson.databind.ObjectMapper"
      })
  void theHostsOwnClassesAreHidden(String hidden) throws Exception {
    // Otherwise this test could not fail.
    assertThat(Class.forName(hidden)).isNotNull();
    described(work, "lab")
        .source("lab.Solver", solver("lab", lookUp(hidden)))
        .jar(plugins.resolve("lab.jar"));
    assertThat(only().reason()).contains("ClassNotFoundException: " + hidden);
  }

  @ParameterizedTest
  @ValueSource(strings = {"evensun.spi.Problem", "java.sql.Connection", "org.pf4j.Plugin"})
  void theContractTheJdkAndPf4jAreVisible(String visible) {
    described(work, "lab")
        .source("lab.Solver", solver("lab", lookUp(visible)))
        .jar(plugins.resolve("lab.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
    }
  }

  @Test
  void twoPluginsKeepTheirOwnVersionsOfOneLibrary() throws IOException {
    for (String version : List.of("one", "two")) {
      Path library =
          empty(work)
              .source(
                  "dep.Lib",
                  "package dep; public class Lib { public static String version() "
                      + "{ return \""
                      + version
                      + "\"; } }")
              .jar(work.resolve("lib-" + version + ".jar"));
      Path folder = Files.createDirectories(plugins.resolve(version + "/lib")).getParent();
      Files.copy(library, folder.resolve("lib/dep.jar"));
      String check =
          "if (!dep.Lib.version().equals(\""
              + version
              + "\")) throw new IllegalStateException(dep.Lib.version());";
      described(work, version)
          .seeing(library)
          .source("lab.Solver", solver(version, check))
          .exploded(folder);
    }
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
      assertThat(host.loaded()).extracting(LoadedPlugin::id).containsExactly("one", "two");
    }
  }

  @Test
  void anotherServiceInThePluginIsNoSolver() {
    working(work, "lab")
        .text("META-INF/services/java.lang.Runnable", "dep.NoSolver\n")
        .jar(plugins.resolve("lab.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
    }
  }

  private RejectedPlugin only() {
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.loaded()).isEmpty();
      assertThat(host.rejected()).hasSize(1);
      return host.rejected().get(0);
    }
  }

  private static String lookUp(String className) {
    return "try { Class.forName(\""
        + className
        + "\"); } catch (ClassNotFoundException e) { throw new RuntimeException(e.toString()); }";
  }

  private Path classesOfContract() {
    return PluginBuilder.contract();
  }

  private static String hash(Path jar) throws Exception {
    FutureTask<String> task = Fingerprint.of(jar);
    task.run();
    return task.get();
  }
}
