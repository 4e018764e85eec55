package evensun.finding;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The sources themselves are the witness of which codes there are. */
class ExplanationsTest {

  private static final Pattern FINDING = Pattern.compile("new Finding\\(\\s*([^,)]+),");

  private static final List<Path> ROOTS =
      List.of(Path.of("../../engine"), Path.of("../../plugins"), Path.of("../../reports"));

  static List<String> codes() {
    return Explanations.codes();
  }

  @ParameterizedTest
  @MethodSource("codes")
  void everyTextHasThreeParts(String code) {
    assertThat(Explanations.of(code).orElseThrow().code()).isEqualTo(code);
  }

  @Test
  void everyCodeInTheSourcesHasAText() throws IOException {
    Set<String> used = literals();
    assertThat(used).hasSizeGreaterThan(10);
    assertThat(codes()).containsAll(used);
  }

  @Test
  void everyTextBelongsToACodeInTheSources() throws IOException {
    assertThat(literals()).containsAll(codes());
  }

  @Test
  void codesAreLiteralsSoThatTheyCanBeFound() throws IOException {
    assertThat(firstArguments()).allSatisfy(a -> assertThat(a).matches("\"[a-z][a-z0-9-]*\""));
  }

  @Test
  void whatHasNoTextIsEmpty() {
    assertThat(Explanations.of("no-such-code")).isEmpty();
    assertThat(Explanations.of("../finding/at-bound")).isEmpty();
  }

  @Test
  void aTextOfAnotherFormIsRefused() {
    assertThatThrownBy(() -> Explanation.parse("x", "means: a\ndo: b\neffect: c"))
        .hasMessage("line 2 of x must start with effect:");
  }

  private static Set<String> literals() throws IOException {
    Set<String> literals = new TreeSet<>();
    for (String argument : firstArguments()) {
      literals.add(argument.replace("\"", ""));
    }
    return literals;
  }

  private static List<String> firstArguments() throws IOException {
    List<String> found = new ArrayList<>();
    for (Path root : ROOTS) {
      try (Stream<Path> files = Files.walk(root)) {
        for (Path file : files.filter(ExplanationsTest::isMainSource).toList()) {
          Matcher matcher = FINDING.matcher(Files.readString(file));
          while (matcher.find()) {
            // What examinations found is read back from the headers of tables; LibraryExamination
            // holds those codes against what the sources say today.
            if (!matcher.group(1).strip().equals("examinedCode")) {
              found.add(matcher.group(1).strip());
            }
          }
        }
      }
    }
    return found;
  }

  private static boolean isMainSource(Path file) {
    String path = file.toString().replace('\\', '/');
    return path.endsWith(".java") && path.contains("/src/main/java/evensun/");
  }
}
