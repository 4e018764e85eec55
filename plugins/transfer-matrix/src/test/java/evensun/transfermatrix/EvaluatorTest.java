package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.Finding;
import evensun.spi.Gradient;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.UnsupportedProblem;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;
import java.util.SplittableRandom;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;

class EvaluatorTest {

  private static final ThreadMXBean THREADS = (ThreadMXBean) ManagementFactory.getThreadMXBean();

  private static final Incidence[] BOTH_WAYS = {
    Sample.at(60, Polarisation.UNPOLARISED), Incidence.normal()
  };

  private static Sample device() {
    Sample sample = Sample.of(new boolean[] {false, false, true, false}, 350, 500, 650, 800, 950);
    sample.layer(0, 1.38, 0, 100).layer(1, 2.4, 0.2, 400).layer(2, 3.7, 1e-4, 1.8e5);
    return sample.layer(3, 1.9, 0.02, 90).medium(5, 0.1, 5);
  }

  private static Response wanted(Sample sample) {
    Response response = Response.spectra(2, sample.layers(), sample.wavelengths());
    response.weight = new double[2 * sample.layers()][];
    response.weight[1] = new double[] {1, 2, 3, 2, 1};
    response.weight[sample.layers() + 2] = new double[] {1, 1, 2, 2, 3};
    response.sum = new double[2];
    response.sumStandardError = new double[] {7, 7};
    return response;
  }

  /** Moves everything a search may move. */
  private static void move(Sample sample, SplittableRandom random) {
    Design design = sample.design;
    for (int l = 0; l < sample.layers(); l++) {
      design.thicknessNm[l] *= 0.9 + 0.2 * random.nextDouble();
    }
    sample.medium(2, 2.2 + random.nextDouble(), 0.1 * random.nextDouble());
  }

  @Test
  void anEvaluationAllocatesNothing() {
    Sample sample = device();
    Response response = wanted(sample);
    double[] slopes = new double[2 * sample.layers()];
    double[] drawn = sample.design.thicknessNm.clone();
    long fewest = Long.MAX_VALUE;
    try (Evaluator evaluator = sample.evaluator("fast", BOTH_WAYS)) {
      Gradient gradient = evaluator.ability(Gradient.class).orElseThrow();
      for (int round = 0; round < 8; round++) { // the first ones load classes and warm up
        long before = allocated();
        for (int i = 0; i < 50; i++) {
          sample.design.thicknessNm[1] = i % 10 == 9 ? 0 : drawn[1] + i;
          sample.design.n[2][0] = 2 + 0.001 * i;
          sample.design.revision[2] = Design.nextRevision();
          evaluator.evaluate(sample.design, response);
          gradient.evaluate(sample.design, response, slopes);
        }
        fewest = Math.min(fewest, allocated() - before);
      }
    }
    // Witness: the JVM's own count of bytes allocated by this thread. What an evaluation allocates
    // shows in every round; what the JVM allocates now and then for itself does not.
    assertThat(fewest).isZero();
  }

  private static long allocated() {
    return THREADS.getCurrentThreadAllocatedBytes();
  }

  @Test
  void aDesignIsAnsweredWithTheSameBitsWhateverCameBefore() {
    Sample sample = device();
    for (String kernel : List.of("fast", "reference")) {
      SplittableRandom random = new SplittableRandom(6);
      try (Evaluator used = sample.evaluator(kernel, BOTH_WAYS)) {
        for (int i = 0; i < 40; i++) {
          move(sample, random);
          sample.design.material[3] = i % 4 == 1 ? 2 : 4;
          double kept = sample.design.thicknessNm[2];
          sample.design.thicknessNm[2] = i % 3 == 1 ? 0 : kept;
          Response again = wanted(sample);
          Response anew = wanted(sample);
          used.evaluate(sample.design, again);
          try (Evaluator fresh = sample.evaluator(kernel, BOTH_WAYS)) {
            fresh.evaluate(sample.design, anew);
          }
          assertSameBits(again, anew);
          sample.design.thicknessNm[2] = kept;
        }
      }
    }
  }

  private static void assertSameBits(Response a, Response b) {
    assertThat(a.sum).containsExactly(b.sum);
    assertThat(Arrays.deepEquals(a.reflectance, b.reflectance)).isTrue();
    assertThat(Arrays.deepEquals(a.transmittance, b.transmittance)).isTrue();
    assertThat(Arrays.deepEquals(a.absorptance, b.absorptance)).isTrue();
  }

  @Test
  void manyIncidencesShareAKernelAndAnswerAsOne() {
    Sample sample = device();
    Incidence[] many = new Incidence[40];
    for (int i = 0; i < many.length; i++) {
      many[i] = Sample.at(2 * i, List.of(Polarisation.values()).get(i % 3));
    }
    try (Evaluator evaluator = sample.evaluator("fast", many)) {
      Response all = Response.spectra(40, sample.layers(), sample.wavelengths());
      evaluator.evaluate(sample.design, all);
      evaluator.evaluate(sample.design, all);
      for (int i = 0; i < many.length; i++) {
        Response one = sample.solve("fast", many[i]);
        assertThat(all.reflectance[i]).containsExactly(one.reflectance[0]);
        assertThat(all.absorptance[i * sample.layers() + 1]).containsExactly(one.absorptance[1]);
      }
    }
  }

  @Test
  void threadsFindTheSameBits() throws Exception {
    Sample sample = device();
    PreparedSolver prepared =
        new TransferMatrixSolver().prepare(sample.problem, sample.design, Sample.NONE);
    Callable<Double> task =
        () -> {
          double total = 0;
          Design own = Design.of(sample.problem);
          own.copyFrom(sample.design);
          Response response = wanted(sample);
          response.reflectance = null;
          response.transmittance = null;
          response.absorptance = null;
          try (Evaluator evaluator = prepared.newEvaluator()) {
            for (int i = 0; i < 3000; i++) { // long enough to be compiled meanwhile
              own.thicknessNm[1] = 300 + i % 100;
              evaluator.evaluate(own, response);
              total += response.sum[0] + response.sum[1];
            }
          }
          return total;
        };
    ExecutorService threads = Executors.newFixedThreadPool(3);
    try {
      double alone = task.call();
      for (Future<Double> each : threads.invokeAll(List.of(task, task, task))) {
        assertThat(each.get()).isEqualTo(alone);
      }
    } finally {
      threads.shutdown();
    }
  }

  @Test
  void onlyWantedRowsAreWritten() {
    Sample sample = device();
    Response all = wanted(sample);
    Response some = new Response();
    some.absorptance = new double[2 * sample.layers()][];
    some.absorptance[sample.layers() + 3] = new double[sample.wavelengths()];
    some.weight = all.weight;
    some.sum = new double[2];
    try (Evaluator evaluator = sample.evaluator("fast", BOTH_WAYS)) {
      evaluator.evaluate(sample.design, all);
      evaluator.evaluate(sample.design, some);
    }
    assertThat(some.sum).containsExactly(all.sum);
    assertThat(some.absorptance[sample.layers() + 3])
        .containsExactly(all.absorptance[sample.layers() + 3]);
    assertThat(all.sumStandardError).containsExactly(0, 0);
  }

  // Witness: the definition of the sums in the contract, by a plain loop.
  @Test
  void sumsAreWeightedSpectra() {
    Sample sample = device();
    Response response = wanted(sample);
    response.transmittanceWeight = new double[][] {{1, 0, 2, 0, 3}, null};
    try (Evaluator evaluator = sample.evaluator("fast", BOTH_WAYS)) {
      evaluator.evaluate(sample.design, response);
    }
    double expected = 0;
    for (int w = 0; w < 5; w++) {
      expected += response.weight[1][w] * response.absorptance[1][w];
      expected += response.transmittanceWeight[0][w] * response.transmittance[0][w];
    }
    assertThat(response.sum[0]).isCloseTo(expected, within(1e-14));
  }

  @Test
  void theDesignIsNotWritten() {
    Sample sample = device();
    Design copy = Design.of(sample.problem);
    copy.copyFrom(sample.design);
    try (Evaluator evaluator = sample.evaluator("fast", BOTH_WAYS)) {
      evaluator.evaluate(sample.design, wanted(sample));
    }
    assertThat(sample.design.thicknessNm).containsExactly(copy.thicknessNm);
    assertThat(sample.design.material).containsExactly(copy.material);
    assertThat(sample.design.revision).containsExactly(copy.revision);
    assertThat(Arrays.deepEquals(sample.design.n, copy.n)).isTrue();
    assertThat(Arrays.deepEquals(sample.design.k, copy.k)).isTrue();
  }

  @Test
  void numbersOutsideTheContractFailThatDesignAlone() {
    Sample sample = device();
    try (Evaluator evaluator = sample.evaluator("fast", BOTH_WAYS)) {
      sample.design.thicknessNm[1] = -1;
      assertThatExceptionOfType(EvaluationFailed.class)
          .isThrownBy(() -> evaluator.evaluate(sample.design, wanted(sample)))
          .withMessage(
              "layer \"layer-2\": thicknessNm must be finite and at least 0 nm but was -1.0");
      sample.design.thicknessNm[1] = Double.NaN;
      assertThatExceptionOfType(EvaluationFailed.class)
          .isThrownBy(() -> evaluator.evaluate(sample.design, wanted(sample)));
      sample.design.thicknessNm[1] = 100;
      sample.medium(2, 2, -0.5);
      assertThatExceptionOfType(EvaluationFailed.class)
          .isThrownBy(() -> evaluator.evaluate(sample.design, wanted(sample)))
          .withMessage(
              "material of layer \"layer-2\" at 350.0 nm: n must be in (0, 1e6] and k in [0, 1e6]"
                  + " but n was 2.0, k -0.5");
      sample.medium(2, 2, 0.5);
      evaluator.evaluate(sample.design, wanted(sample));
    }
  }

  @Test
  void theSolverIsFoundAsAService() {
    assertThat(ServiceLoader.load(OpticalSolver.class))
        .extracting(OpticalSolver::id)
        .contains("transfer-matrix");
  }

  @Test
  void unknownOptionsAreRefusedWithWhatIsAllowed() {
    Sample sample = device();
    assertThatExceptionOfType(UnsupportedProblem.class)
        .isThrownBy(() -> prepare(sample.problem.withOptions(Map.of("kernel", "Fast")), sample))
        .withMessage(
            "option kernel of solver transfer-matrix must be fast or reference but was \"Fast\"");
    assertThatExceptionOfType(UnsupportedProblem.class)
        .isThrownBy(() -> prepare(sample.problem.withOptions(Map.of("rays", "10")), sample))
        .withMessage(
            "option \"rays\" is unknown to solver transfer-matrix; it takes kernel: fast or"
                + " reference");
  }

  private static PreparedSolver prepare(Problem problem, Sample sample) {
    return new TransferMatrixSolver().prepare(problem, sample.design, Sample.NONE);
  }

  @Test
  void featuresAreRefused() {
    Sample sample = device();
    Feature texture = () -> "texture";
    Problem textured =
        new Problem(
            sample.problem.wavelengthNm(),
            sample.problem.incidentMaPerCm2(),
            List.of(new Layer("wafer", false, List.of(texture))),
            0,
            1,
            2,
            0,
            List.of(Incidence.normal()),
            1,
            0.1,
            Map.of());
    assertThatExceptionOfType(UnsupportedProblem.class)
        .isThrownBy(() -> prepare(textured, sample))
        .withMessageStartingWith("layer \"wafer\" has a texture, but solver transfer-matrix takes");
  }

  @Test
  void aLargeMixedTermIsAFinding() {
    Sample weak = Sample.of(new boolean[] {true}, 500).layer(0, 3.7, 1e-6, 1.8e5).medium(2, 0.1, 4);
    Sample strong = Sample.of(new boolean[] {true}, 500).layer(0, 2.4, 0.3, 200).medium(2, 0.1, 4);
    assertThat(prepare(weak.problem, weak).examine(weak.design)).isEmpty();
    List<Finding> findings = prepare(strong.problem, strong).examine(strong.design);
    assertThat(findings).extracting(Finding::code).containsExactly("mixed-term");
    assertThat(findings.get(0).where()).isEqualTo("layer layer-1");
  }
}
