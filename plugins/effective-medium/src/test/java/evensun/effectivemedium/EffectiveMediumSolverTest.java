package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EffectiveIndex;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Profile;
import evensun.spi.Response;
import evensun.spi.Roughness;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.lang.management.ManagementFactory;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.ServiceLoader;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class EffectiveMediumSolverTest {

  private static final ThreadMXBean THREADS = (ThreadMXBean) ManagementFactory.getThreadMXBean();

  /** Everything at once: porous, filled, graded, rough inside and at an absorbing exit. */
  private static Stacks everything() {
    Stacks stack = Stacks.on(0.2, 3.5);
    int silica = stack.material(1.46, 0);
    int absorber = stack.material(2.4, 0.25);
    int scaffold = stack.material(2.5, 0.01);
    int dense = stack.material(2.0, 0.05);
    Parameter moved = stack.knob(0.55);
    return stack
        .layer("porous", 1, 0, 90, Stacks.porous(silica, 0.4))
        .layer("contact", 1.9, 0.02, 60, new Roughness(3, 15, Side.FRONT))
        .layer(
            "filled",
            1,
            0,
            300,
            Mixture.bruggeman(
                List.of(
                    new Mixture.Component("absorber", absorber, moved),
                    Mixture.Component.fixed("scaffold", scaffold, 0.4),
                    Mixture.Component.fixed("air", 0, 0.05))),
            new Roughness(4, 20, Side.FRONT))
        .layer(
            "graded",
            1,
            0,
            120,
            grading(absorber, dense, new Profile.Power(2)),
            new Roughness(5, 20, Side.FRONT),
            new Roughness(2, 20, Side.REAR));
  }

  private static Grading grading(int upper, int lower, Profile profile) {
    return new Grading(
        new Grading.End("upper", upper),
        new Grading.End("lower", lower),
        profile,
        MixingRule.BRUGGEMAN,
        Grading.DEFAULT_TOLERANCE,
        OptionalDouble.empty());
  }

  @Test
  void theServiceLoaderFindsTheSolver() {
    assertThat(ServiceLoader.load(OpticalSolver.class))
        .anyMatch(solver -> solver.id().equals("effective-medium"));
  }

  @Test
  void aMixtureIsAPlainLayerOfItsEffectiveIndex() {
    // By hand: equal parts of indices 3 and 1 mix to 2 by the refractive-index rule.
    Stacks mixed = Stacks.on(3.5, 0.1);
    int dense = mixed.material(3, 0);
    Mixture half =
        new Mixture(
            MixingRule.REFRACTIVE_INDEX,
            List.of(
                Mixture.Component.fixed("dense", dense, 0.5),
                Mixture.Component.fixed("air", 0, 0.5)),
            -1,
            Mixture.SPHERE,
            OptionalDouble.empty());
    mixed.layer("mixed", 1, 0, 130, half);
    Stacks plain = Stacks.on(3.5, 0.1).layer("plain", 2, 0, 130);
    assertThat(mixed.spectra().reflectance[0])
        .containsExactly(plain.spectra().reflectance[0], within(1e-14));
  }

  @Test
  void theLedgerClosesAtAnyAngle() {
    // Law: reflected + transmitted + absorbed = incident.
    for (Polarisation polarisation : Polarisation.values()) {
      for (double angle : new double[] {0, 35, 80}) {
        Response r = everything().oblique(angle, polarisation).spectra();
        for (int w = 0; w < r.reflectance[0].length; w++) {
          double total = r.reflectance[0][w] + r.transmittance[0][w];
          for (double[] row : r.absorptance) {
            assertThat(row[w]).isGreaterThanOrEqualTo(-1e-15);
            total += row[w];
          }
          assertThat(total).isCloseTo(1, within(1e-12));
        }
      }
    }
  }

  @Test
  void channelsNameTheComponents() {
    assertThat(everything().prepare().channels())
        .containsExactly(
            new Channel(0, "solid"),
            new Channel(0, "pores"),
            new Channel(1, ""),
            new Channel(2, "absorber"),
            new Channel(2, "scaffold"),
            new Channel(2, "air"),
            new Channel(3, "upper"),
            new Channel(3, "lower"));
  }

  @Test
  void weightedSumsAreThoseOfTheSpectra() {
    // Law: a sum is the weights times the spectra of the same design.
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Response spectra = stack.spectra(prepared, stack.design());
    Response sums = weighted(stack, prepared);
    prepared.newEvaluator().evaluate(stack.design(), sums);
    for (int s = 0; s < sums.sum.length; s++) {
      double expected = 0;
      for (int w = 0; w < stack.wavelengthNm.length; w++) {
        expected += sums.transmittanceWeight[s][w] * spectra.transmittance[0][w];
        for (int c = 0; c < spectra.absorptance.length; c++) {
          double[] row = sums.weight[s * spectra.absorptance.length + c];
          expected += row == null ? 0 : row[w] * spectra.absorptance[c][w];
        }
      }
      assertThat(sums.sum[s]).isCloseTo(expected, within(1e-13));
    }
  }

  private static Response weighted(Stacks stack, PreparedSolver prepared) {
    int channels = prepared.channels().size();
    Response sums = Response.sums(2, channels);
    for (int s = 0; s < 2; s++) {
      sums.transmittanceWeight[s] = new double[stack.wavelengthNm.length];
      for (int c = s; c < channels; c += 2) {
        sums.weight[s * channels + c] = new double[stack.wavelengthNm.length];
        for (int w = 0; w < stack.wavelengthNm.length; w++) {
          sums.weight[s * channels + c][w] = 1 + 0.1 * w + 0.03 * c;
          sums.transmittanceWeight[s][w] = 0.5 * s + 0.2;
        }
      }
    }
    return sums;
  }

  @Test
  void transmittanceAloneCountsTheRoughExitToo() {
    // Law: what is asked for does not change the answer.
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Response all = stack.spectra(prepared, stack.design());
    Response one = new Response();
    one.transmittance = new double[1][stack.wavelengthNm.length];
    prepared.newEvaluator().evaluate(stack.design(), one);
    assertThat(one.transmittance[0]).containsExactly(all.transmittance[0]);
  }

  @Test
  void thicknessDerivativesPassThrough() {
    // Independent calculation: central differences of the sums.
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Evaluator evaluator = prepared.newEvaluator();
    Gradient gradient = evaluator.ability(Gradient.class).orElseThrow();
    Response sums = weighted(stack, prepared);
    int layers = stack.layers.size();
    double[] slope = new double[2 * layers];
    Design design = stack.design();
    gradient.evaluate(design, sums, slope);
    double step = 1e-3;
    for (int l = 0; l < layers; l++) {
      double drawn = design.thicknessNm[l];
      design.thicknessNm[l] = drawn + step;
      evaluator.evaluate(design, sums);
      double[] up = sums.sum.clone();
      design.thicknessNm[l] = drawn - step;
      evaluator.evaluate(design, sums);
      design.thicknessNm[l] = drawn;
      for (int s = 0; s < 2; s++) {
        double expected = (up[s] - sums.sum[s]) / (2 * step);
        assertThat(slope[s * layers + l]).isCloseTo(expected, within(1e-8));
      }
    }
  }

  @Test
  void theIntegralOfAbsorptionOverDepthIsTheAbsorptance() {
    // Law of the contract, by the midpoint rule; the faces of rough layers fall between its cells.
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Response spectra = stack.spectra(prepared, stack.design());
    DepthProfile profile = prepared.newEvaluator().ability(DepthProfile.class).orElseThrow();
    for (int c = 0; c < prepared.channels().size(); c++) {
      Channel channel = prepared.channels().get(c);
      double[] integral = new double[stack.wavelengthNm.length];
      double cell = 0.05;
      int cells = (int) Math.round(stack.design().thicknessNm[channel.layer()] / cell);
      double[] depth = new double[cells];
      for (int i = 0; i < cells; i++) {
        depth[i] = (i + 0.5) * cell;
      }
      double[][] rows = new double[cells][stack.wavelengthNm.length];
      profile.evaluate(stack.design(), 0, channel, depth, rows);
      for (double[] row : rows) {
        for (int w = 0; w < row.length; w++) {
          integral[w] += row[w] * cell;
        }
      }
      assertThat(integral)
          .as(channel.toString())
          .containsExactly(spectra.absorptance[c], within(2e-5));
    }
  }

  @Test
  void theAnswerIsAFunctionOfTheDesignAlone() {
    // Law of the contract: same bits whatever was asked before.
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Evaluator used = prepared.newEvaluator();
    Response response = Response.spectra(1, prepared.channels().size(), 6);
    Design other = stack.design();
    for (double fraction : new double[] {0, 0.2, 1}) {
      other.knob[0] = fraction;
      other.thicknessNm[2] = 100 + 50 * fraction;
      used.evaluate(other, response);
    }
    used.evaluate(stack.design(), response);
    Response fresh = stack.spectra(prepared, stack.design());
    for (int c = 0; c < response.absorptance.length; c++) {
      assertThat(response.absorptance[c]).containsExactly(fresh.absorptance[c]);
    }
    assertThat(response.reflectance[0]).containsExactly(fresh.reflectance[0]);
  }

  @Test
  void evaluatingAllocatesNothing() {
    // Law of the contract; over a solver below that answers without doing anything.
    Stacks stack = everything();
    PreparedSolver prepared =
        new EffectiveMediumSolver()
            .prepare(stack.problem(), stack.design(), Stacks.services(new Silent()));
    Evaluator evaluator = prepared.newEvaluator();
    Response sums = weighted(stack, prepared);
    Response spectra = Response.spectra(1, prepared.channels().size(), 6);
    Design design = stack.design();
    long fewest = Long.MAX_VALUE;
    for (int round = 0; round < 12; round++) {
      long before = allocatedBytes();
      for (int i = 0; i < 500; i++) {
        design.knob[0] = 0.3 + 0.001 * (i % 100);
        design.thicknessNm[0] = 80 + i % 7;
        evaluator.evaluate(design, sums);
        evaluator.evaluate(design, spectra);
      }
      // What an evaluation allocates shows in every round; what the JVM allocates now and then for
      // itself does not.
      fewest = Math.min(fewest, allocatedBytes() - before);
    }
    assertThat(fewest).isZero();
  }

  private static long allocatedBytes() {
    return THREADS.getCurrentThreadAllocatedBytes();
  }

  /** Takes the place of transfer-matrix and leaves every answer as it is. */
  private record Silent() implements OpticalSolver {

    @Override
    public String id() {
      return "transfer-matrix";
    }

    @Override
    public Traits traits() {
      return Traits.plain();
    }

    @Override
    public PreparedSolver prepare(Problem problem, Design start, Services services) {
      List<Channel> channels =
          IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
      return new PreparedSolver() {
        @Override
        public List<Channel> channels() {
          return channels;
        }

        @Override
        public Evaluator newEvaluator() {
          return (design, into) -> {};
        }
      };
    }
  }

  @Test
  void theIdealPorousQuarterWaveCoatingReflectsNothing() {
    // Closed form: n = sqrt(n_glass) and n d = lambda/4 give R = 0 (Born & Wolf); silica of 1.46 is
    // thinned to sqrt(1.52) = 1.2329 by the porosity that Lorentz-Lorenz solves for:
    // 1 - f = (1.52 - 1)/(1.52 + 2) / ((1.46^2 - 1)/(1.46^2 + 2)).
    double solid = (0.52 / 3.52) / ((1.46 * 1.46 - 1) / (1.46 * 1.46 + 2));
    Stacks stack = Stacks.on(1.52, 0).at(600, 900);
    int silica = stack.material(1.46, 0);
    Mixture porous =
        new Mixture(
            MixingRule.LORENTZ_LORENZ,
            List.of(
                Mixture.Component.fixed("solid", silica, solid),
                Mixture.Component.fixed("pores", 0, 1 - solid)),
            -1,
            Mixture.SPHERE,
            OptionalDouble.of(5));
    Response r = stack.layer("coating", 1, 0, 600 / (4 * Math.sqrt(1.52)), porous).spectra();
    assertThat(r.reflectance[0][0]).isLessThan(1e-15);
    assertThat(r.reflectance[0][1]).isGreaterThan(1e-3);
  }

  @Test
  void aGradedLayerIsItsFineStackOfHandMadeSlices() {
    // Independent calculation: 2000 plain layers with the index at their middle.
    Stacks graded = Stacks.on(1.52, 0);
    graded.layer("graded", 1, 0, 250, indexGrading(0, 1, new Profile.Linear()));
    Stacks slices = Stacks.on(1.52, 0);
    for (int i = 0; i < 2000; i++) {
      slices.layer("slice-" + i, 1 + 0.52 * (i + 0.5) / 2000, 0, 250.0 / 2000);
    }
    assertThat(graded.spectra().reflectance[0])
        .containsExactly(slices.spectra().reflectance[0], within(Grading.DEFAULT_TOLERANCE));
  }

  private static Grading indexGrading(int upper, int lower, Profile profile) {
    return new Grading(
        new Grading.End("air", upper),
        new Grading.End("glass", lower),
        profile,
        MixingRule.REFRACTIVE_INDEX,
        Grading.DEFAULT_TOLERANCE,
        OptionalDouble.empty());
  }

  @Test
  void aThickerSmoothTransitionReflectsLess() {
    // Limit of a slow transition: at every wavelength reflectance falls with the thickness, from
    // Fresnel's 4.26 % (by hand (0.52/2.52)^2) until kinks at the ends of the profile are left.
    double[] last = {0.0426, 0.0426, 0.0426, 0.0426, 0.0426, 0.0426};
    for (double thicknessNm = 0; thicknessNm <= 800; thicknessNm += 25) {
      Stacks stack = Stacks.on(1.52, 0);
      stack.layer("graded", 1, 0, thicknessNm, indexGrading(0, 1, new Profile.Tanh(0.5, 0.2)));
      double[] reflectance = stack.spectra().reflectance[0];
      for (int w = 0; w < last.length; w++) {
        assertThat(reflectance[w]).isLessThan(Math.max(last[w], 1e-4));
        last[w] = reflectance[w];
      }
    }
  }

  @Test
  void aMothEyeReflectsLessThanAStep() {
    // Limits: no height is the bare face, 4.26 %; half a wavelength of taper leaves little of it.
    double[] mean = new double[2];
    for (int i = 0; i < 2; i++) {
      Stacks stack = Stacks.on(1.52, 0);
      Profile profile = new Profile.MothEye(Profile.Shape.PARABOLOID, 1);
      stack.layer("moth-eye", 1, 0, 400.0 * i, grading(0, 1, profile));
      for (double r : stack.spectra().reflectance[0]) {
        mean[i] += r / 6;
      }
    }
    assertThat(mean[0]).isCloseTo(0.04258, within(1e-5));
    assertThat(mean[1]).isLessThan(mean[0] / 30);
  }

  @Test
  void aTighterToleranceTakesMoreSlices() {
    assertThat(slices(1e-3)).isLessThan(slices(1e-6));
  }

  private static double slices(double tolerance) {
    Stacks stack = Stacks.on(3.5, 0.1);
    Grading drawn = indexGrading(0, 1, new Profile.Linear());
    Grading grading =
        new Grading(
            drawn.upper(),
            drawn.lower(),
            drawn.profile(),
            drawn.rule(),
            tolerance,
            OptionalDouble.empty());
    stack.layer("graded", 1, 0, 200, grading);
    return quantity(stack, "graded.sliceCount");
  }

  private static double quantity(Stacks stack, String key) {
    return stack.prepare().describe(stack.design()).stream()
        .filter(q -> q.key().equals(key))
        .findFirst()
        .orElseThrow()
        .value();
  }

  @Test
  void theEffectiveIndexOfAGradingRunsFromEndToEnd() {
    Stacks stack = Stacks.on(1.52, 0);
    stack.layer("graded", 1, 0, 250, indexGrading(0, 1, new Profile.Linear()));
    EffectiveIndex index =
        stack.prepare().newEvaluator().ability(EffectiveIndex.class).orElseThrow();
    double[] n = new double[6];
    double[] k = new double[6];
    // By hand: half way between air and glass the linear index is 1.26; a slice is an eighth or
    // less.
    index.evaluate(stack.design(), 0, 0.5, n, k);
    assertThat(n[0]).isCloseTo(1.26, within(0.52 / 8));
    index.evaluate(stack.design(), 0, 0, n, k);
    assertThat(n[0]).isCloseTo(1, within(0.52 / 8));
    index.evaluate(stack.design(), 0, 1, n, k);
    assertThat(n[0]).isCloseTo(1.52, within(0.52 / 8));
  }

  @Test
  void aMovedFractionLeavesTheRestToTheOthers() {
    // By hand: absorber moved to 0.1; scaffold and air keep 0.4 : 0.05 of the other 0.9.
    Stacks stack = everything();
    Design design = stack.design();
    design.knob[0] = 0.1;
    assertThat(stack.prepare().describe(design))
        .anyMatch(q -> q.key().equals("filled/scaffold.fraction") && near(q.value(), 0.8))
        .anyMatch(q -> q.key().equals("filled/air.fraction") && near(q.value(), 0.1));
  }

  private static boolean near(double value, double expected) {
    return Math.abs(value - expected) < 1e-12;
  }

  @Test
  void aFractionOutOfRangeFailsThatDesignAlone() {
    Stacks stack = everything();
    PreparedSolver prepared = stack.prepare();
    Design design = stack.design();
    design.knob[0] = 1.2;
    assertThatThrownBy(() -> stack.spectra(prepared, design))
        .isInstanceOf(EvaluationFailed.class)
        .hasMessage("layer \"filled\": the fraction of absorber must be in [0, 1] but was 1.2");
  }

  @Test
  void optionsNameTheSolverBelow() {
    Stacks stack = everything();
    stack.options = Map.of("next", "no-such-solver");
    assertThatThrownBy(stack::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining("names solver no-such-solver, which is not loaded");
    stack.options = Map.of("next", "effective-medium");
    assertThatThrownBy(stack::prepare).hasMessageContaining("names effective-medium itself");
  }
}
