package evensun.pluginhost;

import static evensun.pluginhost.PluginBuilder.described;
import static evensun.pluginhost.PluginBuilder.empty;
import static evensun.pluginhost.PluginBuilder.solver;
import static evensun.pluginhost.PluginBuilder.working;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every way a plugin can be wrong has a name, a reason and a remedy. Witness: the jars are real.
 */
class RejectedPluginTest {

  @TempDir Path work;
  private Path plugins;

  @BeforeEach
  void makeFolder() throws IOException {
    plugins = Files.createDirectory(work.resolve("plugins"));
  }

  static Stream<Arguments> wrong() {
    return Stream.of(
        wrong(
            "no-descriptor",
            "no plugin.properties",
            w -> working(w, "x").without("plugin.properties")),
        wrong("id-missing", "no plugin.id", w -> working(w, "x").text("plugin.properties", "")),
        wrong(
            "version-missing",
            "no plugin.version",
            w -> working(w, "x").text("plugin.properties", "plugin.id=x\n")),
        wrong(
            "descriptor-unreadable",
            "unreadable",
            w -> working(w, "x").text("plugin.properties", "plugin.id=\\u00zz\n")),
        wrong(
            "plugin-dependencies",
            "plugin.dependencies",
            w ->
                working(w, "x")
                    .text(
                        "plugin.properties",
                        "plugin.id=x\nplugin.version=1.0.0\nplugin.requires=1.x\n"
                            + "plugin.dependencies=other\n")),
        wrong("no-solver-declared", "missing or empty", w -> working(w, "x").withoutService()),
        wrong(
            "no-solver-declared",
            "missing or empty",
            w -> working(w, "x").service("# nothing\n\n")),
        wrong(
            "several-solvers-declared",
            "lab.Solver, lab.Other",
            w -> working(w, "x").service("lab.Solver\nlab.Other\n")),
        wrong("class-absent", "lab.Absent", w -> working(w, "x").service("lab.Absent\n")),
        wrong(
            "class-abstract", "abstract", w -> source(w, "public class", "public abstract class")),
        wrong("class-not-public", "not public", w -> source(w, "public class", "class")),
        wrong(
            "constructor-missing",
            "without arguments",
            w -> source(w, "Solver()", "Solver(int a)")),
        wrong(
            "constructor-missing",
            "without arguments",
            w -> source(w, "public Solver()", "Solver()")),
        wrong(
            "class-not-a-solver",
            "does not implement",
            w -> described(w, "x").source("lab.Solver", "package lab; public class Solver {}")),
        wrong(
            "newer-java",
            "compiled for Java 66",
            w -> working(w, "x").markedForJava("lab.Solver", 66)),
        wrong("dependency-missing", "class dep.Lib", RejectedPluginTest::withoutItsLibrary),
        wrong("constructor-threw", "IllegalStateException: no licence", w -> body(w, "no licence")),
        wrong(
            "constructor-threw",
            "static initialiser threw ArithmeticException",
            w ->
                source(
                    w,
                    "public Solver()",
                    "static int a = 1 / Integer.parseInt(\"0\"); public Solver()")),
        wrong(
            "native-library-missing",
            "no-such-library",
            w ->
                source(
                    w,
                    "public Solver()",
                    "static { System.loadLibrary(\"no-such-library\"); } public Solver()")),
        wrong(
            "solver-id-malformed",
            "\"My Solver\"",
            w -> described(w, "x").source("lab.Solver", solver("My Solver", ""))),
        wrong("traits-missing", "no traits", w -> source(w, "Traits.plain()", "null")),
        wrong(
            "linkage", "ClassFormatError", w -> working(w, "x").text("lab/Solver.class", "\u0001")),
        wrong(
            "not-started",
            "lab.Absent",
            w ->
                working(w, "x")
                    .text(
                        "plugin.properties",
                        "plugin.id=x\nplugin.version=1.0.0\nplugin.requires=1.x\n"
                            + "plugin.class=lab.Absent\n")));
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("wrong")
  void isNamed(String code, String reason, Function<Path, PluginBuilder> plugin) {
    Path jar = plugin.apply(work).jar(plugins.resolve("wrong.jar"));
    RejectedPlugin rejected = only();
    assertThat(rejected.code()).isEqualTo(code);
    assertThat(rejected.reason()).contains(reason).doesNotContain("\n");
    assertThat(rejected.remedy()).isNotBlank().doesNotContain("\n");
    assertThat(rejected.file()).isEqualTo(jar);
  }

  @ParameterizedTest
  @CsvSource({
    "'', version-range-missing",
    "1.0.0, version-range-open",
    "*, version-range-open",
    ">=1.0.0, version-range-open",
    ">0.9.0, version-range-open",
    "!=2.0.0, version-range-open",
    ">=0.1.0 & <1.0.0, version-range-not-met",
    "~2.1, version-range-not-met",
    "one, version-range-unreadable",
  })
  void versionRanges(String requires, String code) {
    working(work, "x").descriptor("x", requires).jar(plugins.resolve("wrong.jar"));
    assertThat(only().code()).isEqualTo(code);
    assertThat(only().remedy()).contains(ContractVersion.current());
  }

  @ParameterizedTest
  @CsvSource({">=1.0.0 & <2.0.0", "1.x", "^1.0.0", "~1.1", "1.0.0 - 1.9.9", "=1.1.0"})
  void closedVersionRangesThatAreMet(String requires) {
    working(work, "x").descriptor("x", requires).jar(plugins.resolve("good.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.rejected()).isEmpty();
    }
  }

  @Test
  void duplicatesOfPluginAndOfSolverNameTheFirst() {
    working(work, "lab").jar(plugins.resolve("a.jar"));
    working(work, "lab").jar(plugins.resolve("b.jar"));
    working(work, "lab").descriptor("other", "1.x").jar(plugins.resolve("c.jar"));
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.loaded())
          .extracting(LoadedPlugin::file)
          .containsExactly(plugins.resolve("a.jar"));
      assertThat(host.rejected())
          .extracting(RejectedPlugin::code)
          .containsExactly("duplicate-id", "duplicate-id");
      assertThat(host.rejected()).allSatisfy(r -> assertThat(r.reason()).contains("a.jar"));
      assertThat(host.rejected().get(1).reason()).contains("solver id \"lab\"");
    }
  }

  @ParameterizedTest
  @CsvSource({"''", "PK", "plain text"})
  void aJarThatIsNone(String content) throws IOException {
    Files.writeString(plugins.resolve("wrong.jar"), content);
    assertThat(only().code()).isEqualTo("not-a-jar");
  }

  @Test
  void aJarThatWasCutShort() throws IOException {
    Path jar = working(work, "x").jar(plugins.resolve("wrong.jar"));
    byte[] all = Files.readAllBytes(jar);
    Files.write(jar, java.util.Arrays.copyOf(all, all.length / 2));
    assertThat(only().code()).isEqualTo("not-a-jar");
  }

  @Test
  void foldersThatHoldNoPlugin() throws IOException {
    assertThat(only().code()).isEqualTo("empty-folder");
    Files.createDirectory(plugins.resolve("nothing"));
    assertThat(only().code()).isEqualTo("no-descriptor");
    plugins = work.resolve("absent");
    assertThat(only().code()).isEqualTo("no-such-folder");
  }

  private RejectedPlugin only() {
    try (PluginHost host = PluginHost.open(List.of(plugins))) {
      assertThat(host.loaded()).isEmpty();
      assertThat(host.rejected()).hasSize(1);
      return host.rejected().get(0);
    }
  }

  private static Arguments wrong(String code, String reason, Function<Path, PluginBuilder> plugin) {
    return Arguments.of(code, reason, plugin);
  }

  /** A working solver with one piece of its source replaced. */
  private static PluginBuilder source(Path work, String from, String to) {
    return described(work, "x").source("lab.Solver", solver("x", "").replace(from, to));
  }

  private static PluginBuilder body(Path work, String message) {
    String body = "if (true) throw new IllegalStateException(\"" + message + "\");";
    return described(work, "x").source("lab.Solver", solver("x", body));
  }

  private static PluginBuilder withoutItsLibrary(Path work) {
    Path library =
        empty(work)
            .source("dep.Lib", "package dep; public class Lib {}")
            .jar(work.resolve("dep.jar"));
    return described(work, "x").seeing(library).source("lab.Solver", solver("x", "new dep.Lib();"));
  }
}
