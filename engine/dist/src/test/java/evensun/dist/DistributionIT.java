package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.spi.OpticalSolver;
import java.io.File;
import java.io.IOException;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import java.util.zip.ZipFile;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The distribution as a user unpacks and starts it. Witness: the processes themselves. */
class DistributionIT {

  private static final JsonMapper JSON = JsonMapper.builder().build();
  private static final String[] TOOLS = {
    "dirname", "readlink", "cksum", "cat", "ls", "mkdir", "nice", "mv", "rm", "sed"
  };

  @TempDir static Path work;
  private static Path home;
  private static Path launcher;

  @BeforeAll
  static void unpack() {
    home = Distribution.unpack(work.resolve("a folder with spaces"));
    launcher = home.resolve("bin/evensun");
  }

  @Test
  void everySolverOfTheBuildIsLoadedAsAPlugin() throws IOException {
    Run run = run("plugins", "--format", "json");
    assertThat(run.status()).isZero();
    JsonNode json = JSON.readTree(run.out());
    assertThat(json.get("rejected")).isEmpty();
    assertThat(json.get("loaded")).hasSameSizeAs(declaredSolvers()).isNotEmpty();
  }

  @Test
  void pluginsNeverStandInLib() throws IOException {
    for (URL solver : declaredSolvers()) {
      String jar = jarOf(solver);
      assertThat(home.resolve("lib").resolve(jar)).doesNotExist();
    }
    try (Stream<Path> lib = Files.list(home.resolve("lib"))) {
      assertThat(lib).anyMatch(jar -> jar.getFileName().toString().startsWith("evensun-cli"));
    }
  }

  @Test
  void theZipHoldsWhatAUserNeedsAndNothingOfThisMachine() throws IOException {
    try (ZipFile zip = new ZipFile(Distribution.zip().toFile())) {
      List<String> names = zip.stream().map(e -> e.getName().replaceFirst("^[^/]*/", "")).toList();
      assertThat(names)
          .contains(
              "bin/evensun",
              "bin/evensun.bat",
              "LICENSE",
              "README.md",
              "scenarios/perovskite-on-silicon.yaml");
      assertThat(names).noneMatch(name -> name.endsWith(".jsa") || name.contains(".cache"));
    }
  }

  @Test
  void startsFromAnywhereThroughASymbolicLink() throws IOException {
    Path elsewhere = Files.createDirectory(work.resolve("else where"));
    Path link = Files.createSymbolicLink(elsewhere.resolve("ev"), launcher);
    Path chain = Files.createSymbolicLink(elsewhere.resolve("chain"), Path.of("ev"));
    for (Path start : List.of(launcher, link, chain)) {
      Run run = Distribution.run(start, elsewhere, Map.of(), "plugins", "--format", "json");
      assertThat(run.status()).isZero();
      assertThat(JSON.readTree(run.out()).get("loaded")).isNotEmpty();
    }
  }

  @Test
  void anAssessmentPrintsOneDocumentAndNothingElse() {
    Run run =
        run(
            "assess",
            home.resolve("scenarios/perovskite-on-silicon.yaml").toString(),
            "--format",
            "json");
    assertThat(run.status()).isZero();
    assertThat(JSON.readTree(run.out()).get("matchedCurrentMaPerCm2").asDouble()).isPositive();
    assertThat(run.err()).isEmpty();
  }

  @Test
  void archivesOfClassesKeepSilentEvenWhenTheyAreStale() throws IOException {
    Path own = Distribution.unpack(work.resolve("archive"));
    Path start = own.resolve("bin/evensun");
    Distribution.run(start, work, Map.of("EVENSUN_ARCHIVE", "prepare"));
    Path archive;
    try (Stream<Path> cache = Files.list(own.resolve(".cache"))) {
      archive = cache.filter(file -> file.toString().endsWith(".jsa")).findFirst().orElseThrow();
    }
    Run with = Distribution.run(start, work, Map.of(), "--version");
    assertThat(with.out()).matches("evensun \\S+ \\(Java \\d+\\)\\R");
    assertThat(with.err()).isEmpty();
    File file = archive.toFile();
    assertThat(file.setWritable(true)).isTrue();
    Files.write(archive, new byte[] {1, 2, 3});
    Run stale = Distribution.run(start, work, Map.of(), "--version");
    assertThat(stale).isEqualTo(with);
  }

  /** The virtual machine itself tells with which settings it runs. */
  @Test
  void longWorkAndShortWorkStartTheirOwnWay() {
    assertThat(flags("design")).containsPattern("Tier4InvocationThreshold += 50000 ");
    assertThat(flags("assess")).containsPattern("TieredStopAtLevel += 1 ");
  }

  private String flags(String command) {
    Map<String, String> print = Map.of("EVENSUN_JAVA_OPTS", "-XX:+PrintFlagsFinal");
    return Distribution.run(launcher, work, print, command, "--help").out();
  }

  @Test
  void aMissingJavaIsNamed() throws IOException {
    Run run = Distribution.run(launcher, work, withoutJava("none"), "--version");
    assertThat(run.status()).isEqualTo(1);
    assertThat(run.err())
        .isEqualTo(
            "evensun: needs Java 17 or newer but found none in JAVA_HOME or PATH;"
                + " install one, or set JAVA_HOME to its folder\n");
    assertThat(run.out()).isEmpty();
  }

  @Test
  void anOldJavaIsNamed() throws IOException {
    Map<String, String> environment = withoutJava("old");
    Path old = Files.createDirectories(work.resolve("old java/bin")).getParent();
    Files.writeString(old.resolve("release"), "IMPLEMENTOR=\"x\"\nJAVA_VERSION=\"1.8.0_402\"\n");
    Files.writeString(old.resolve("bin/java"), "#!/bin/sh\n");
    assertThat(old.resolve("bin/java").toFile().setExecutable(true)).isTrue();
    Map<String, String> withOld = new java.util.HashMap<>(environment);
    withOld.put("JAVA_HOME", old.toString());
    Run run = Distribution.run(launcher, work, withOld, "--version");
    assertThat(run.status()).isEqualTo(1);
    assertThat(run.err()).contains("found " + old + " (version 1.8.0_402)");
  }

  @Test
  void anOldJavaInJavaHomeDoesNotHideANewerOneInPath() {
    Map<String, String> environment = Map.of("JAVA_HOME", "/nonexistent");
    assertThat(Distribution.run(launcher, work, environment, "--version").status()).isZero();
  }

  /** A PATH with the tools of a plain system and no Java. */
  private static Map<String, String> withoutJava(String name) throws IOException {
    Path bin = Distribution.tools(work.resolve("bin-" + name), TOOLS);
    return Map.of("PATH", bin.toString(), "JAVA_HOME", "");
  }

  private static Run run(String... args) {
    return Distribution.run(launcher, work, Map.of(), args);
  }

  private static List<URL> declaredSolvers() throws IOException {
    return Collections.list(
        DistributionIT.class
            .getClassLoader()
            .getResources("META-INF/services/" + OpticalSolver.class.getName()));
  }

  private static String jarOf(URL entry) {
    String path = entry.getPath().replaceFirst("!.*", "");
    return path.substring(path.lastIndexOf('/') + 1);
  }
}
