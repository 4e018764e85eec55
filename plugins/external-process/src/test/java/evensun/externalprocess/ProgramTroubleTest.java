package evensun.externalprocess;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.UnsupportedProblem;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Programs that misbehave. Witness: real programs of a few lines, for the system's shell. */
@DisabledOnOs(OS.WINDOWS)
class ProgramTroubleTest {

  private static final String READY =
      "read line; id=$(expr \"$line\" : '.*\"id\":\\([0-9]*\\)'); echo \"{\\\"id\\\": $id, \\\"ready\\\": true}\"\n";

  private static final String ANSWER =
      "echo \"{\\\"id\\\": $id, \\\"answers\\\": [{\\\"reflectance\\\": [[0.25]], "
          + "\\\"transmittance\\\": [[0.5]], \\\"absorptance\\\": [[0.25]]}]}\"\n";

  private static final String ASKED = "read line; id=$(expr \"$line\" : '.*\"id\":\\([0-9]*\\)')\n";

  private static final Services NONE =
      new Services() {
        @Override
        public Optional<evensun.spi.OpticalSolver> solver(String id) {
          return Optional.empty();
        }

        @Override
        public boolean cancelled() {
          return false;
        }
      };

  @TempDir Path folder;
  private final Map<String, String> options = new HashMap<>();

  @BeforeEach
  void nameFolder() {
    System.setProperty("evensun.programs", folder.toString());
    options.put("program", "program");
    options.put("timeoutSeconds", "1");
  }

  @AfterEach
  void forget() {
    System.clearProperty("evensun.programs");
  }

  @Test
  void aProgramThatBehavesIsHeard() throws IOException {
    program(READY + ASKED + ANSWER);
    try (PreparedSolver prepared = prepare();
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Response.spectra(1, 1, 1);
      evaluator.evaluate(design(), response);
      assertThat(response.reflectance[0]).containsExactly(0.25);
      assertThat(response.transmittance[0]).containsExactly(0.5);
      assertThat(response.absorptance[0]).containsExactly(0.25);
      assertThat(prepared.examine(design())).isEmpty();
    }
  }

  @Test
  void whatItSaysOnStandardErrorBecomesAFinding() throws IOException {
    program(READY + ASKED + "echo 'table ends at 900 nm' >&2; sleep 0.2\n" + ANSWER);
    try (PreparedSolver prepared = prepare();
        Evaluator evaluator = prepared.newEvaluator()) {
      evaluator.evaluate(design(), Response.spectra(1, 1, 1));
      assertThat(prepared.examine(design()))
          .extracting(Finding::message)
          .containsExactly("The program wrote to standard error: table ends at 900 nm");
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "exit 3                       | ended with status 3 before it answered",
        "echo oops >&2; exit 3        | its last words on standard error: oops",
        "sleep 30                     | did not answer within 1.0 s",
        "echo hello                   | no JSON object: \"hello\"",
        "echo '{\"ready\": true}'     | when asked with id 1",
        "echo '{\"id\": 1}'           | did not answer {\"ready\": true}",
        "while :; do echo y >&2; done | did not answer within 1.0 s",
        "tr '\\0' y </dev/zero        | without the end of a line",
      })
  void aProgramThatCannotPrepareIsRefusedWithItsReason(String body, String reason)
      throws IOException {
    if (body.startsWith("tr ")) {
      options.put("timeoutSeconds", "60");
    }
    program(body.strip() + "\n");
    assertThatThrownBy(this::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining(reason.strip())
        .hasMessageNotContaining("\n");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "exit 0                                          | ended with status 0",
        "sleep 30                                        | did not answer within 1.0 s",
        "echo \"{\\\"id\\\": $id, \\\"answers\\\": []}\" | answered 0 designs instead of 1",
        "echo \"{\\\"id\\\": $id, \\\"answers\\\": [{}]}\" | answered reflectance with no rows",
        "echo \"{\\\"id\\\": $id, \\\"answers\\\": [{\\\"failed\\\": \\\"too thin\\\"}]}\" | too thin",
        "echo \"{\\\"id\\\": $id, \\\"answers\\\": [{\\\"reflectance\\\": [[null]]}]}\" | not a number",
      })
  void anEvaluationThatGoesWrongFailsThatDesignAlone(String body, String reason)
      throws IOException {
    program(READY + ASKED + body.strip() + "\n" + ASKED + ANSWER);
    try (PreparedSolver prepared = prepare();
        Evaluator evaluator = prepared.newEvaluator()) {
      assertThatThrownBy(() -> evaluator.evaluate(design(), Response.spectra(1, 1, 1)))
          .isInstanceOf(EvaluationFailed.class)
          .hasMessageContaining(reason.strip());
    }
  }

  @Test
  void aProgramThatDiesIsStartedAgain() throws IOException {
    Path mark = folder.resolve("died");
    program(
        READY + ASKED + "[ -e '" + mark + "' ] || { touch '" + mark + "'; exit 7; }\n" + ANSWER);
    try (PreparedSolver prepared = prepare();
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Response.spectra(1, 1, 1);
      assertThatThrownBy(() -> evaluator.evaluate(design(), response))
          .isInstanceOf(EvaluationFailed.class);
      evaluator.evaluate(design(), response);
      assertThat(response.reflectance[0]).containsExactly(0.25);
    }
  }

  @Test
  void aProgramThatAlwaysDiesIsGivenUp() throws IOException {
    program(READY + ASKED + "exit 7\n");
    try (PreparedSolver prepared = prepare();
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Response.spectra(1, 1, 1);
      for (int i = 0; i < 2; i++) {
        assertThatThrownBy(() -> evaluator.evaluate(design(), response))
            .isInstanceOf(EvaluationFailed.class);
      }
      assertThatThrownBy(() -> evaluator.evaluate(design(), response))
          .isInstanceOf(IllegalStateException.class)
          .hasMessageContaining("3 times in a row, given up");
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "program        |            | needs solver.options.program",
        "program        | absent     | there is no program \"absent\"",
        "program        | ../program | must be a file name without folders",
        "program        | /bin/sh    | must be a file name without folders",
        "timeoutSeconds | -1         | must be in (0, 86400] s",
        "timeoutSeconds | soon       | must be in (0, 86400] s",
        "speed          | 9          | option \"speed\" is unknown",
      })
  void wrongOptionsAreNamed(String name, String value, String reason) throws IOException {
    program(READY);
    options.put(name, value == null ? "" : value);
    assertThatThrownBy(this::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining(reason);
  }

  @Test
  void noProgramRunsUnlessTheUserNamedItsFolder() throws IOException {
    program("touch '" + folder.resolve("ran") + "'\n");
    System.clearProperty("evensun.programs");
    assertThatThrownBy(this::prepare).hasMessageContaining("EVENSUN_PROGRAMS (not set)");
    assertThat(folder.resolve("ran")).doesNotExist();
  }

  private void program(String body) throws IOException {
    Path file = Files.writeString(folder.resolve("program"), "#!/bin/sh\n" + body);
    assertThat(file.toFile().setExecutable(true)).isTrue();
  }

  private PreparedSolver prepare() {
    return new ExternalProcessSolver().prepare(problem(), design(), NONE);
  }

  private Problem problem() {
    return new Problem(
        Samples.of(500),
        Samples.of(1),
        List.of(Layer.plain("film", true)),
        0,
        1,
        3,
        0,
        List.of(Incidence.normal()),
        1,
        0.01,
        options);
  }

  private Design design() {
    Design design = Design.of(problem());
    for (double[] row : design.n) {
      row[0] = 1.5;
    }
    return design;
  }
}
