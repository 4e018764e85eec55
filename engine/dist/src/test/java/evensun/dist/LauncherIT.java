package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The launcher of the sources. A stand-in for Maven counts its calls and builds a program that only
 * says which sources it was built from, so that building, changing and failing take no time.
 */
class LauncherIT {

  private static final String STAND_IN =
      """
      #!/bin/sh
      echo "called" >>"$CALLS"
      if grep -q BROKEN engine/core/Code.java; then
        for i in 1 2 3 4 5 6 7 8 9 10 11 12 13 14 15 16 17 18 19 20 21; do echo "line $i"; done
        echo "[ERROR] it does not compile"
        exit 1
      fi
      sleep "${BUILD_SECONDS:-0}"
      bin=engine/dist/target/evensun-0.1.0/evensun-0.1.0/bin
      mkdir -p "$bin"
      { echo '#!/bin/sh'; echo '[ -n "$EVENSUN_ARCHIVE" ] && [ "$EVENSUN_ARCHIVE" = prepare ] && exit 0'
        echo "echo $(cat engine/core/Code.java) \\"\\$@\\""; } >"$bin/evensun"
      chmod +x "$bin/evensun"
      """;

  @TempDir Path work;
  private Path root;
  private Path launcher;
  private Path code;
  private Path calls;
  private final Map<String, String> environment = new HashMap<>();

  @BeforeEach
  void makeSources() throws IOException {
    root = work.resolve("sources with spaces");
    Path real = Distribution.repository();
    for (String name :
        List.of("engine/bin/evensun", "engine/dist/src/main/launcher/find-java.sh", "pom.xml")) {
      Files.createDirectories(root.resolve(name).getParent());
      Files.copy(real.resolve(name), root.resolve(name));
    }
    for (String folder : List.of(".mvn", "plugins", "reports", "scenarios")) {
      Files.createDirectories(root.resolve(folder));
      Files.writeString(root.resolve(folder).resolve("file"), "content");
    }
    Files.createDirectories(root.resolve("engine/core/target"));
    Files.writeString(root.resolve("LICENSE"), "free");
    code = Files.writeString(root.resolve("engine/core/Code.java"), "first");
    launcher = root.resolve("engine/bin/evensun");
    calls = work.resolve("calls");
    Path bin = Files.createDirectory(work.resolve("bin"));
    Path maven = Files.writeString(bin.resolve("mvn"), STAND_IN);
    assertThat(maven.toFile().setExecutable(true)).isTrue();
    environment.put("PATH", bin + ":" + System.getenv("PATH"));
    environment.put("CALLS", calls.toString());
  }

  @Test
  void buildsOnceAndThenStartsAtOnce() throws IOException {
    Run first = run("--some", "two words");
    assertThat(first.status()).isZero();
    assertThat(first.out()).isEqualTo("first --some two words\n");
    assertThat(first.err())
        .isEqualTo("evensun: First start: building once, needs the network, a few minutes\n");
    Run second = run("again");
    assertThat(second).isEqualTo(new Run(0, "first again\n", ""));
    assertThat(Files.readAllLines(calls)).hasSize(1);
  }

  @Test
  void changedContentIsBuiltAndToldNewTimesAreNot() throws IOException {
    run();
    Files.setLastModifiedTime(code, FileTime.from(Instant.now().plusSeconds(60)));
    Files.writeString(root.resolve("engine/core/target/Output.class"), "changes all the time");
    Files.writeString(root.resolve("scenarios/mine.yaml"), "an input, not a source");
    assertThat(run().err()).isEmpty();
    Files.writeString(code, "second");
    Run changed = run();
    assertThat(changed.out()).isEqualTo("second\n");
    assertThat(changed.err()).contains("Sources have changed");
    assertThat(Files.readAllLines(calls)).hasSize(2);
  }

  @Test
  void theDevelopersTargetFoldersStayAlone() {
    run();
    assertThat(root.resolve("engine/dist/target")).doesNotExist();
    assertThat(root.resolve("engine/core/target")).isEmptyDirectory();
  }

  @Test
  void aBuildThatFailsShowsMavensLastLines() throws IOException {
    Files.writeString(code, "BROKEN");
    Run run = run();
    assertThat(run.status()).isEqualTo(1);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).contains("[ERROR] it does not compile", "line 21", "build.log");
    assertThat(run.err().lines()).noneMatch(line -> line.equals("line 1"));
    Files.writeString(code, "mended");
    assertThat(run().out()).isEqualTo("mended\n");
  }

  @Test
  void twoStartsAtOnceBuildOnce() throws Exception {
    environment.put("BUILD_SECONDS", "2");
    ExecutorService pool = Executors.newFixedThreadPool(2);
    try {
      Callable<Run> start = this::run;
      List<Future<Run>> runs = pool.invokeAll(List.of(start, start));
      for (Future<Run> run : runs) {
        assertThat(run.get().out()).isEqualTo("first\n");
      }
    } finally {
      pool.shutdown();
    }
    assertThat(Files.readAllLines(calls)).hasSize(1);
  }

  @Test
  void aLockLeftBehindIsTakenOver() throws IOException {
    Path lock = Files.createDirectories(root.resolve(".built/lock"));
    // Above every process number of a usual system.
    Files.writeString(lock.resolve("owner"), "99999999\n");
    assertThat(run().status()).isZero();
    assertThat(lock).doesNotExist();
  }

  @Test
  void worksThroughASymbolicLinkFromAnotherFolder() throws IOException {
    Path link = Files.createSymbolicLink(work.resolve("ev"), launcher);
    assertThat(Distribution.run(link, work, environment, "x").out()).isEqualTo("first x\n");
  }

  @Test
  void aMissingMavenIsNamed() throws IOException {
    Path bin =
        Distribution.tools(
            work.resolve("plain"), "dirname", "readlink", "find", "cksum", "sort", "tr", "cat");
    environment.put("PATH", bin.toString());
    environment.put("JAVA_HOME", System.getProperty("java.home"));
    Run run = run();
    assertThat(run.status()).isEqualTo(1);
    assertThat(run.err()).contains("building needs Maven (command mvn), which is not in PATH");
  }

  private Run run(String... args) {
    return Distribution.run(launcher, work, environment, args);
  }
}
