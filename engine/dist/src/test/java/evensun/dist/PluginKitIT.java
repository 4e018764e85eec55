package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/**
 * The way of an author: from a copy of the template to a design, and what happens when it fails.
 */
class PluginKitIT {

  private static final JsonMapper JSON = JsonMapper.builder().build();
  private static final Path TEMPLATE = Distribution.repository().resolve("plugins/template");
  private static final Path PLANAR =
      Distribution.folder().resolve("scenarios/perovskite-on-silicon.yaml");

  @TempDir Path work;
  private Path project;

  @BeforeEach
  void copyTemplate() throws IOException {
    project = work.resolve("my-solver");
    Files.walkFileTree(
        TEMPLATE,
        new SimpleFileVisitor<>() {
          @Override
          public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes)
              throws IOException {
            if (folder.endsWith("target")) {
              return FileVisitResult.SKIP_SUBTREE;
            }
            Files.createDirectories(project.resolve(TEMPLATE.relativize(folder)));
            return FileVisitResult.CONTINUE;
          }

          @Override
          public FileVisitResult visitFile(Path file, BasicFileAttributes attributes)
              throws IOException {
            Path copy = project.resolve(TEMPLATE.relativize(file));
            Files.copy(file, copy, java.nio.file.StandardCopyOption.COPY_ATTRIBUTES);
            return FileVisitResult.CONTINUE;
          }
        });
  }

  @Test
  void theTemplateIsBuiltFromOutsideCheckedAndUsedForADesign() throws IOException {
    assertThat(maven().status()).isZero();
    Path jar = project.resolve("target/beer-lambert-1.0.0.jar");
    Run check = evensun("plugins", "check", jar.toString(), "--format", "json");
    assertThat(check.status()).isZero();
    assertThat(JSON.readTree(check.out()).get("laws"))
        .noneMatch(law -> law.get("status").asString().equals("failed"))
        .filteredOn(law -> law.get("status").asString().equals("passed"))
        .hasSizeGreaterThanOrEqualTo(15);

    Path scenario = scenario("solver: {id: beer-lambert}");
    Run design =
        evensun(
            "design",
            scenario.toString(),
            "--plugins",
            jar.toString(),
            "--out",
            work.resolve("run").toString());
    assertThat(design.status()).as(design.err()).isZero();
    JsonNode result = JSON.readTree(Files.readString(work.resolve("run/result.json")));
    JsonNode solver = result.get("provenance").get("solver");
    assertThat(solver.get("id").asString()).isEqualTo("beer-lambert");
    assertThat(solver.get("version").asString()).isEqualTo("1.0.0");
    assertThat(solver.get("sha256").asString()).matches("[0-9a-f]{64}");
    assertThat(work.resolve("run/report.html")).exists();
  }

  @Test
  void aSolverThatBreaksALawIsToldWithAScenarioThatShowsIt() throws IOException {
    Path evaluator = project.resolve("src/main/java/example/beerlambert/BeerLambertEvaluator.java");
    String source = Files.readString(evaluator);
    String broken = source.replace("-4 * Math.PI * k", "-4 * Math.PI * (k + 0.01)");
    assertThat(broken).isNotEqualTo(source);
    Files.writeString(evaluator, broken);
    Path plugin = compile();
    Path cases = work.resolve("cases");
    Run check = evensun("plugins", "check", plugin.toString(), "--out", cases.toString());
    assertThat(check.status()).isEqualTo(3);
    assertThat(check.out())
        .contains("FAILED   transparent-layers", "layer 1 has k = 0 and absorbs");
    Path shown = cases.resolve("transparent-layers/scenario.yaml");
    Run assess =
        evensun("assess", shown.toString(), "--plugins", plugin.toString(), "--format", "json");
    assertThat(assess.status()).as(assess.err()).isZero();
    // The layer of the smallest case has k = 0, so all that it absorbs is wrong.
    JsonNode rows = JSON.readTree(assess.out()).get("spectral").get("absorptance").get("layer-1");
    assertThat(rows.get(0).asDouble()).isGreaterThan(1e-3);
  }

  @Test
  void aPluginThatDoesNotLoadIsToldAndStopsNothing() throws IOException {
    Path folder = Files.createDirectory(work.resolve("plugins"));
    Files.writeString(folder.resolve("cut-short.jar"), "PK");
    Run run =
        evensun("assess", PLANAR.toString(), "--plugins", folder.toString(), "--format", "json");
    assertThat(run.status()).isZero();
    assertThat(JSON.readTree(run.out()).get("matchedCurrentMaPerCm2").asDouble()).isPositive();
    assertThat(run.err().lines().toList())
        .singleElement()
        .asString()
        .contains("plugin not loaded", "cut-short.jar", "it is no jar");
  }

  @Test
  void thePythonExampleAnswersAsTheJavaExampleDoes() throws IOException {
    Assumptions.assumeTrue(hasPython(), "SKIPPED: no python3 in PATH");
    Path java = compile();
    Path withJava = scenario("solver: {id: beer-lambert}");
    Run one =
        evensun("assess", withJava.toString(), "--plugins", java.toString(), "--format", "json");
    Path withPython = scenario("solver: {id: external-process, options: {program: two_beam.py}}");
    Run other =
        Distribution.run(
            Distribution.folder().resolve("bin/evensun"),
            work,
            Map.of("EVENSUN_PROGRAMS", project.resolve("python").toString()),
            "assess",
            withPython.toString(),
            "--format",
            "json");
    assertThat(other.status()).as(other.err()).isZero();
    // Two programs of one formula, written apart.
    JsonNode wanted = JSON.readTree(one.out()).get("subcells");
    JsonNode is = JSON.readTree(other.out()).get("subcells");
    for (int i = 0; i < wanted.size(); i++) {
      assertThat(is.get(i).get("photocurrentMaPerCm2").asDouble())
          .isCloseTo(wanted.get(i).get("photocurrentMaPerCm2").asDouble(), within(1e-9));
    }
  }

  /** Witness: the rule that more than half of the designs failing is a fault of the solver. */
  @Test
  void aSolverThatFailsTooOftenEndsTheRunWithEverythingKept() throws IOException {
    Path source = project.resolve("src/main/java/example/beerlambert/BeerLambertEvaluator.java");
    String evaluate = "public void evaluate(Design design, Response into) {";
    assertThat(source).content().contains(evaluate);
    Files.writeString(
        source,
        Files.readString(source)
            .replace(
                evaluate,
                evaluate
                    + " if (design.thicknessNm[0] > 101) {"
                    + " throw new evensun.spi.EvaluationFailed(\"the lamp is off\"); }"));
    Path scenario = scenario("solver: {id: beer-lambert}");
    Files.writeString(
        scenario, Files.readString(scenario).replaceFirst("\\[60, 150\\]", "[100, 150]"));
    Run run =
        evensun(
            "design", scenario.toString(), "--plugins", compile().toString(), "--out", "failing");
    assertThat(run.status()).as(run.err()).isEqualTo(3);
    Path folder = work.resolve("failing");
    JsonNode result = JSON.readTree(Files.readString(folder.resolve("result.json")));
    assertThat(result.get("search").get("stopped").asString()).isEqualTo("failures");
    assertThat(result.get("search").get("failures").asInt()).isGreaterThan(25);
    assertThat(result.get("search").get("notes").toString() + result.get("findings"))
        .contains("the lamp is off");
    assertThat(folder.resolve("report.html")).exists();
    assertThat(folder.resolve("search-state.json")).exists();
  }

  @Test
  void aScenarioAloneStartsNoProgram() throws IOException {
    Path program = Files.writeString(work.resolve("program"), "#!/bin/sh\ntouch ran\n");
    assertThat(program.toFile().setExecutable(true)).isTrue();
    Path scenario = scenario("solver: {id: external-process, options: {program: program}}");
    Run run = evensun("assess", scenario.toString());
    assertThat(run.status()).isEqualTo(2);
    assertThat(run.err()).contains("EVENSUN_PROGRAMS (not set)");
    assertThat(work.resolve("ran")).doesNotExist();
  }

  /** Maven with a repository of its own, filled from the one that this build uses. */
  private Run maven() throws IOException {
    Path settings = work.resolve("settings.xml");
    Files.writeString(
        settings,
        "<settings><mirrors><mirror><id>known</id><mirrorOf>central</mirrorOf><url>file://"
            + System.getProperty("evensun.localRepository")
            + "</url></mirror></mirrors></settings>");
    return Distribution.run(
        Path.of("mvn"),
        project,
        Map.of("EVENSUN_HOME", Distribution.folder().toString()),
        "-B",
        "-q",
        "-s",
        settings.toString(),
        "-Dmaven.repo.local=" + work.resolve("repository"),
        "package");
  }

  /** The template's classes as a plugin folder, without Maven. */
  private Path compile() throws IOException {
    Path classes = project.resolve("target/classes");
    Path resources = project.resolve("src/main/resources");
    Files.createDirectories(classes.resolve("META-INF/services"));
    String service = "META-INF/services/evensun.spi.OpticalSolver";
    Files.copy(resources.resolve(service), classes.resolve(service));
    String properties = Files.readString(resources.resolve("plugin.properties"));
    Files.writeString(
        classes.resolve("plugin.properties"), properties.replace("${project.version}", "1.0.0"));
    List<String> arguments = new ArrayList<>(List.of("-proc:none", "-cp", contract()));
    arguments.addAll(List.of("-d", classes.toString()));
    try (Stream<Path> sources = Files.list(project.resolve("src/main/java/example/beerlambert"))) {
      sources.map(Path::toString).forEach(arguments::add);
    }
    int status =
        ToolProvider.getSystemJavaCompiler()
            .run(null, null, null, arguments.toArray(String[]::new));
    assertThat(status).isZero();
    return classes;
  }

  private static String contract() throws IOException {
    try (Stream<Path> lib = Files.list(Distribution.folder().resolve("lib"))) {
      return lib.filter(jar -> jar.getFileName().toString().startsWith("evensun-spi"))
          .findFirst()
          .orElseThrow()
          .toString();
    }
  }

  private Path scenario(String more) throws IOException {
    Path scenario = work.resolve("my-cell.yaml");
    return Files.writeString(scenario, Files.readString(PLANAR) + "\n" + more + "\n");
  }

  private static boolean hasPython() {
    try {
      return new ProcessBuilder("python3", "--version").start().waitFor() == 0;
    } catch (IOException e) {
      return false;
    } catch (InterruptedException e) {
      throw new IllegalStateException(e);
    }
  }

  private Run evensun(String... args) {
    return Distribution.run(Distribution.folder().resolve("bin/evensun"), work, Map.of(), args);
  }
}
