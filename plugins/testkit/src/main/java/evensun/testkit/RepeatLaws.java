package evensun.testkit;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import evensun.spi.Samples;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/** Laws about asking more than once: the answer is a function of the design alone. */
final class RepeatLaws {

  private static final int THREADS = 4;
  private static final int ROUNDS = 8;

  private RepeatLaws() {}

  static List<Law> all() {
    return List.of(
        new CaseLaw(
            "wavelength-by-wavelength",
            "a wavelength alone gets the answer that it gets among others",
            Cases::claimedBy,
            RepeatLaws::wavelengths),
        new CaseLaw(
            "same-input-same-output",
            "the same design gets the same bits, whatever was asked before",
            Cases::claimedBy,
            RepeatLaws::repeated),
        new CaseLaw(
            "threads",
            "evaluators on several threads get the bits that one alone gets",
            s -> Cases.claimedBy(s).stream().skip(20).limit(12).toList(),
            RepeatLaws::threads),
        new CaseLaw(
            "batch",
            "designs asked together get the bits that they get one by one",
            s -> Cases.claimedBy(s).stream().limit(30).toList(),
            RepeatLaws::batch));
  }

  private static Optional<String> wavelengths(Subject subject, StackCase stack) {
    Answer all = subject.answer(stack);
    for (int w = 0; w < stack.wavelengthCount(); w++) {
      StackCase alone = stack.withWavelengthNm(Samples.of(stack.wavelengthNm().at(w)));
      Answer one = subject.answer(alone);
      Optional<String> wrong =
          Difference.first(alone, at(all, w), one, all.tolerance + one.tolerance);
      if (wrong.isPresent()) {
        return wrong.map(text -> "asked with others against asked alone: " + text);
      }
    }
    return Optional.empty();
  }

  private static Answer at(Answer answer, int w) {
    double[][] absorptance = new double[answer.absorptance.length][];
    for (int l = 0; l < absorptance.length; l++) {
      absorptance[l] = new double[] {answer.absorptance[l][w]};
    }
    return new Answer(
        new double[] {answer.reflectance[w]},
        new double[] {answer.transmittance[w]},
        absorptance,
        answer.tolerance);
  }

  private static Optional<String> repeated(Subject subject, StackCase stack) {
    Answer fresh = subject.answer(stack);
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = subject.spectra(prepared, stack);
      Design design = stack.design();
      for (Design other : variants(stack)) {
        evaluator.evaluate(other, response);
        evaluator.evaluate(design, response);
        Answer again = subject.answer(prepared, response, stack);
        Optional<String> wrong = Difference.first(stack, again, fresh, 0);
        if (wrong.isPresent()) {
          return wrong.map(text -> "after another design: " + text);
        }
      }
    }
    return Optional.empty();
  }

  /** Designs of the same shape: other thicknesses, another material, a layer that vanishes. */
  static List<Design> variants(StackCase stack) {
    List<Design> designs = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      Design design = stack.design();
      for (int l = 0; l < design.thicknessNm.length; l++) {
        design.thicknessNm[l] *= i == 2 && l == 0 ? 0 : 0.5 + 0.3 * i + 0.1 * l;
      }
      if (i == 3 && stack.layerCount() > 0) {
        for (int w = 0; w < stack.wavelengthCount(); w++) {
          design.n[2][w] += 0.25;
        }
        design.revision[2] = Design.nextRevision();
      }
      designs.add(design);
    }
    return designs;
  }

  private static Optional<String> threads(Subject subject, StackCase stack) {
    List<Design> designs = variants(stack);
    try (PreparedSolver prepared = subject.prepare(stack)) {
      List<Answer> alone = answers(subject, prepared, stack, designs);
      ExecutorService pool = Executors.newFixedThreadPool(THREADS);
      try {
        List<Callable<List<Answer>>> tasks = new ArrayList<>();
        for (int t = 0; t < THREADS; t++) {
          tasks.add(() -> answers(subject, prepared, stack, designs));
        }
        for (Future<List<Answer>> future : pool.invokeAll(tasks)) {
          Optional<String> wrong = first(stack, future.get(), alone);
          if (wrong.isPresent()) {
            return wrong.map(text -> "beside " + (THREADS - 1) + " other threads: " + text);
          }
        }
        return Optional.empty();
      } catch (ExecutionException e) {
        return Optional.of("beside other threads it threw " + e.getCause());
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
        return Optional.of("was interrupted");
      } finally {
        pool.shutdownNow();
      }
    }
  }

  /** Asks for every design several times, so that threads meet. */
  private static List<Answer> answers(
      Subject subject, PreparedSolver prepared, StackCase stack, List<Design> designs) {
    List<Answer> answers = new ArrayList<>();
    try (Evaluator evaluator = prepared.newEvaluator()) {
      Response response = subject.spectra(prepared, stack);
      for (int round = 0; round < ROUNDS; round++) {
        for (Design design : designs) {
          evaluator.evaluate(design, response);
          answers.add(subject.answer(prepared, response, stack));
        }
      }
    }
    return answers;
  }

  private static Optional<String> first(StackCase stack, List<Answer> is, List<Answer> wanted) {
    for (int i = 0; i < is.size(); i++) {
      Optional<String> wrong = Difference.first(stack, is.get(i), wanted.get(i), 0);
      if (wrong.isPresent()) {
        return wrong;
      }
    }
    return Optional.empty();
  }

  private static Optional<String> batch(Subject subject, StackCase stack) {
    List<Design> designs = variants(stack);
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      List<Response> responses = new ArrayList<>();
      designs.forEach(d -> responses.add(subject.spectra(prepared, stack)));
      evaluator.evaluateAll(designs, responses);
      for (int i = 0; i < designs.size(); i++) {
        Response single = subject.spectra(prepared, stack);
        evaluator.evaluate(designs.get(i), single);
        Optional<String> wrong =
            Difference.first(
                stack,
                subject.answer(prepared, responses.get(i), stack),
                subject.answer(prepared, single, stack),
                0);
        if (wrong.isPresent()) {
          int place = i + 1;
          return wrong.map(t -> "design " + place + " of " + designs.size() + ": " + t);
        }
      }
      return Optional.empty();
    }
  }
}
