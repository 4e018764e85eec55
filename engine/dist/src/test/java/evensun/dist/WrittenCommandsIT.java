package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every command that a person finds written somewhere, pasted as it stands into a shell: those of
 * the README, of the help, and of the comments in scenarios. Outside witness: the shell and the
 * exit status.
 */
class WrittenCommandsIT {

  private static final Pattern IN_BACKTICKS =
      Pattern.compile("`((?:eval \"\\$\\()?evensun [^`]+)`");
  private static final Pattern INDENTED = Pattern.compile("(?m)^  ((?:eval \"\\$\\()?evensun .+)$");
  private static final Pattern IN_COMMENT =
      Pattern.compile("(?m)^#   (evensun \\S+(?: (?:--)?[\\w./-]+)+)");

  /** Two finished runs, copied to wherever a command wants some. */
  @TempDir static Path prepared;

  @TempDir Path folder;

  @BeforeAll
  static void prepare() {
    assertThat(new Program(prepared).run("new", "my-cell.yaml").status()).isZero();
    for (int i = 0; i < 2; i++) {
      Run run =
          new Program(prepared)
              .run("design", Program.scenario("perovskite-on-silicon.yaml").toString(), "--quiet");
      assertThat(run.status()).as(run.err()).isZero();
    }
  }

  private static List<String> found(Pattern pattern, String text) {
    List<String> commands = new ArrayList<>();
    Matcher matcher = pattern.matcher(text);
    while (matcher.find()) {
      commands.add(matcher.group(1));
    }
    return commands;
  }

  static Set<String> written() throws IOException {
    Set<String> commands = new LinkedHashSet<>();
    String readme = Files.readString(Distribution.repository().resolve("README.md"));
    found(IN_BACKTICKS, readme).forEach(commands::add);
    String help = new Program(Path.of(".")).run("--help").out();
    for (String name : found(Pattern.compile("(?m)^  ([a-z]+) +[A-Z]"), help)) {
      String text = new Program(Path.of(".")).run(name, "--help").out();
      commands.addAll(found(INDENTED, text.substring(text.indexOf("Example"))));
    }
    try (Stream<Path> scenarios = Files.list(Program.folder().resolve("scenarios"))) {
      for (Path scenario : scenarios.filter(p -> p.toString().endsWith(".yaml")).toList()) {
        // A search over textures takes minutes; its scenario is assessed.
        found(IN_COMMENT, Files.readString(scenario)).stream()
            .filter(command -> !command.startsWith("evensun design"))
            .forEach(commands::add);
      }
    }
    return commands;
  }

  @Test
  void thereAreManyOfThem() throws IOException {
    assertThat(written())
        .hasSizeGreaterThan(30)
        .contains("evensun compare last previous", "evensun gaps --fix bottom=1.12");
  }

  @ParameterizedTest
  @MethodSource("written")
  void aCommandRunsAsWritten(String command) throws IOException, InterruptedException {
    copy(Program.folder().resolve("scenarios"), folder.resolve("scenarios"));
    copy(prepared.resolve("evensun-runs"), folder.resolve("evensun-runs"));
    if (!command.contains("evensun new")) {
      Files.copy(prepared.resolve("my-cell.yaml"), folder.resolve("my-cell.yaml"));
    }
    Files.writeString(folder.resolve("my-table.csv"), "wavelength_nm,n,k\n300,2,0\n1200,2,0\n");
    Files.writeString(folder.resolve("table.csv"), "perovskite.thicknessNm\n400\n500\n");
    try (Stream<Path> plugins = Files.list(Program.folder().resolve("plugins"))) {
      Path flat =
          plugins.filter(p -> p.toString().contains("transfer-matrix")).findFirst().orElseThrow();
      Files.copy(flat, folder.resolve("my-solver.jar"));
    }
    // Words in capitals stand for a name of the reader's own.
    String ready = command.replace(" RUN", " last").replace(" CODE", " not-balanced");
    ProcessBuilder shell =
        new ProcessBuilder("bash", "-c", ready)
            .directory(folder.toFile())
            .redirectErrorStream(true);
    shell.environment().merge("PATH", Program.folder().resolve("bin") + ":", (a, b) -> b + a);
    Process process = shell.start();
    process.getOutputStream().close();
    String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertThat(process.waitFor()).as(ready + "\n" + out).isZero();
  }

  private static void copy(Path from, Path to) throws IOException {
    try (Stream<Path> files = Files.walk(from)) {
      for (Path file : files.toList()) {
        Files.copy(file, to.resolve(from.relativize(file).toString()));
      }
    }
  }
}
