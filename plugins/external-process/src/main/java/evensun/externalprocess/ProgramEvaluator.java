package evensun.externalprocess;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Response;
import java.util.List;
import tools.jackson.databind.JsonNode;

/**
 * Asks one program. A program that dies or hangs fails the designs it was asked for and is started
 * again; one that does so again and again is given up.
 */
final class ProgramEvaluator implements Evaluator {

  private static final int MOST_FAILURES = 3;

  private final PreparedProgram prepared;
  private final Answers answers;
  private ProgramProcess program;
  private long[] sent;
  private int failures;

  ProgramEvaluator(PreparedProgram prepared, Answers answers) {
    this.prepared = prepared;
    this.answers = answers;
    sent = prepared.sent();
  }

  @Override
  public void evaluate(Design design, Response into) {
    String failed = ask(List.of(design), List.of(into)).get(0);
    if (!failed.isEmpty()) {
      throw new EvaluationFailed(failed);
    }
  }

  /** Designs that fail get NaN, so that one does not spoil the others. */
  @Override
  public void evaluateAll(List<Design> designs, List<Response> into) {
    List<String> failed = designs.isEmpty() ? List.of() : ask(designs, into);
    for (int i = 0; i < failed.size(); i++) {
      if (!failed.get(i).isEmpty()) {
        Answers.clear(into.get(i));
      }
    }
  }

  @Override
  public void close() {
    if (program != null) {
      prepared.release(program);
      program = null;
    }
  }

  /** Why each design failed; empty where it did not. */
  private List<String> ask(List<Design> designs, List<Response> into) {
    designs.forEach(ProgramEvaluator::requireFinite);
    try {
      if (program == null) {
        program = prepared.acquire();
        sent = prepared.sent();
      }
      List<String> failed = exchange(designs, into);
      failures = 0;
      prepared.heard(program);
      return failed;
    } catch (ProgramTrouble e) {
      return givenUp(e);
    }
  }

  private List<String> exchange(List<Design> designs, List<Response> into) throws ProgramTrouble {
    JsonNode answer = program.ask(Requests.evaluate(designs, sent), prepared.options().limit());
    JsonNode all = answer.path("answers");
    if (all.size() != designs.size()) {
      throw program.trouble("answered " + all.size() + " designs instead of " + designs.size());
    }
    String[] failed = new String[designs.size()];
    for (int i = 0; i < failed.length; i++) {
      failed[i] = answers.take(all.get(i), into.get(i), program);
    }
    return List.of(failed);
  }

  private List<String> givenUp(ProgramTrouble trouble) {
    if (program != null) {
      prepared.heard(program);
      program.kill();
      program = null;
    }
    failures++;
    if (failures >= MOST_FAILURES) {
      throw new IllegalStateException(
          trouble.getMessage() + " (" + failures + " times in a row, given up)");
    }
    throw new EvaluationFailed(trouble.getMessage());
  }

  /** JSON has no word for NaN. */
  private static void requireFinite(Design design) {
    for (double thicknessNm : design.thicknessNm) {
      requireFinite(thicknessNm, "a thickness");
    }
    for (int m = 0; m < design.n.length; m++) {
      for (int w = 0; w < design.n[m].length; w++) {
        requireFinite(design.n[m][w], "a refractive index");
        requireFinite(design.k[m][w], "an extinction coefficient");
      }
    }
  }

  private static void requireFinite(double value, String what) {
    if (!Double.isFinite(value)) {
      throw new EvaluationFailed(what + " is " + value);
    }
  }
}
