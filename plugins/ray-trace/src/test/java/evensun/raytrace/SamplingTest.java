package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Slots;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Knob;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;

class SamplingTest {

  private static Stacks device(int rays) {
    return PyramidTest.device(PyramidTest.pyramids(5)).rays(rays);
  }

  /** Witness: the law of large numbers; sixteen times the rays leave a quarter of the error. */
  @Test
  void theErrorFallsAtLeastAsTheSquareRootOfTheRays() {
    double few = 0;
    double many = 0;
    for (int seed = 0; seed < 4; seed++) {
      few += device(64).seed(seed).solve().sumStandardError[1];
      many += device(1024).seed(seed).solve().sumStandardError[1];
    }
    assertThat(many).isLessThan(1.3 * few / 4);
  }

  /** Witness: other rays. Independent seeds scatter as the stated errors say. */
  @Test
  void otherSeedsAgreeWithinTheStatedErrors() {
    double sum = 0;
    double squares = 0;
    double variance = 0;
    int seeds = 10;
    for (int seed = 0; seed < seeds; seed++) {
      Response response = device(256).seed(1000 * seed).solve();
      sum += response.sum[1];
      squares += response.sum[1] * response.sum[1];
      variance += Math.pow(response.sumStandardError[1], 2) / seeds;
    }
    double spread = (squares - sum * sum / seeds) / (seeds - 1);
    // The ratio of two estimates with 9 and about 70 degrees of freedom exceeds 3 once in 200.
    assertThat(spread / variance).isBetween(1 / 6.0, 3.0);
  }

  @Test
  void theSameSeedGivesTheSameBitsOnAnyThread() throws Exception {
    Stacks stack = device(64);
    double[] alone = stack.solve().sum;
    ExecutorService pool = Executors.newFixedThreadPool(3);
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver())) {
      List<Future<double[]>> answers = new ArrayList<>();
      for (int t = 0; t < 3; t++) {
        answers.add(pool.submit(() -> evaluate(prepared, stack)));
      }
      for (Future<double[]> answer : answers) {
        assertThat(answer.get()).containsExactly(alone);
      }
    } finally {
      pool.shutdownNow();
    }
  }

  /** Other designs in between: thinner wafers, thicker films. */
  private static double[] evaluate(PreparedSolver prepared, Stacks stack) {
    try (Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Stacks.wanted(stack.problem());
      Design design = stack.design();
      for (double share : new double[] {0.4, 0.9, 1}) {
        for (int l = 0; l < design.thicknessNm.length; l++) {
          design.thicknessNm[l] = share * stack.design().thicknessNm[l];
        }
        evaluator.evaluate(design, response);
      }
      return response.sum;
    }
  }

  /** Witness: the definition of a standard error over replicates of the difference. */
  @Test
  void designsOnCommonRaysDifferMorePreciselyThanTheyAreKnown() {
    Stacks stack = device(256);
    Problem problem = stack.problem();
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        RayEvaluator evaluator = (RayEvaluator) prepared.newEvaluator()) {
      Design design = stack.design();
      double[] first = replicates(evaluator, design, problem);
      design.thicknessNm[0] *= 0.9;
      design.thicknessNm[2] *= 1.2;
      double[] second = replicates(evaluator, design, problem);
      double mean = 0;
      double squares = 0;
      for (int r = 0; r < first.length; r++) {
        mean += (first[r] - second[r]) / first.length;
      }
      for (int r = 0; r < first.length; r++) {
        squares += Math.pow(first[r] - second[r] - mean, 2);
      }
      double error = Math.sqrt(squares / first.length / (first.length - 1));
      assertThat(Math.abs(mean)).isGreaterThan(0.01);
      assertThat(error).isLessThan(0.002);
    }
  }

  private static double[] replicates(RayEvaluator evaluator, Design design, Problem problem) {
    Estimate estimate = evaluator.estimate(design, 0);
    double[] currents = new double[estimate.replicate.length];
    for (int r = 0; r < currents.length; r++) {
      for (int w = 0; w < problem.wavelengthCount(); w++) {
        currents[r] +=
            problem.incidentMaPerCm2().at(w) * estimate.replicate[r][LitDevice.LAYERS + 1][w];
      }
    }
    return currents;
  }

  /**
   * Witness: energy. What is booked along rays and in their films is what came, less what was let
   * go by lot, plus what lots made up for.
   */
  @Test
  void everyFewRaysKeepTheirLedger() {
    Stacks stack = device(16);
    Problem problem = stack.problem();
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        RayEvaluator evaluator = (RayEvaluator) prepared.newEvaluator()) {
      LitDevice lit = evaluator.ready(stack.design(), Beam.of(Incidence.normal()));
      Forest forest = lit.traced().forest();
      lit.solve(Polarisation.UNPOLARISED);
      for (int w = 0; w < problem.wavelengthCount(); w++) {
        LightTree tree = forest.trees().get(w);
        for (int r = 0; r < forest.replicates(); r++) {
          lit.follow(w, r, 0.5, 0.5, lit.attenuation(w));
          double expected = 0;
          for (int e = tree.start[r]; e < tree.start[r + 1]; e++) {
            expected += arriving(lit, tree, w, e);
            expected -= gone(lit, tree, w, 2 * e) + gone(lit, tree, w, 2 * e + 1);
          }
          double booked = 0;
          for (double[] row : lit.shares[r]) {
            booked += row[w];
          }
          assertThat(booked * tree.rays).isCloseTo(expected, within(1e-9));
        }
      }
    }
  }

  /** What goes on from a leg, or is lost where tables let through what cannot pass. */
  private static double gone(LitDevice lit, LightTree tree, int w, int leg) {
    double absorbed = tree.slot[leg] == Slots.LOST ? 0 : lit.attenuation(w).absorbed[leg];
    return lit.weighing().power(leg) * (1 - absorbed);
  }

  private static double arriving(LitDevice lit, LightTree tree, int w, int e) {
    int from = tree.parent[e];
    if (from < 0) {
      return 1;
    }
    return lit.attenuation(w).arriving[e] * lit.weighing().power(from);
  }

  /** Witness: energy, where textures reach through nearly all of an opaque layer. */
  @Test
  void deepTexturesKeepTheLedger() {
    Texture deep =
        PyramidTest.texture(
            Texture.Shape.PYRAMID, Texture.Direction.UP, Texture.Arrangement.SCATTERED, 100);
    Response response = Stacks.at(300).thick("slab", Stacks.silicon(), 60, deep).rays(256).solve();
    double total =
        response.reflectance[0][0] + response.transmittance[0][0] + response.absorptance[0][0];
    assertThat(total).isCloseTo(1, within(1e-9));
  }

  /** Witness: reciprocity. Between transparent media light passes films equally well both ways. */
  @Test
  void coatingTablesAreReciprocal() {
    Stacks stack = device(64);
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        RayEvaluator evaluator = (RayEvaluator) prepared.newEvaluator()) {
      Design design = stack.design();
      Device device = evaluator.ready(design, Beam.of(Incidence.normal())).traced().device();
      int w = 44;
      double n = design.n[3][w];
      for (double outside : new double[] {0.95, 0.7, 0.4, 0.1}) {
        double inside = Math.sqrt(1 - (1 - outside * outside) / (n * n));
        FacetOptics optics = new FacetOptics(stack.problem(), device, design, Stacks.services(), w);
        double[] down = optics.at(0, false, outside);
        double[] up = optics.at(0, true, inside);
        assertThat(up[2]).isCloseTo(down[2], within(1e-5));
        assertThat(up[3]).isCloseTo(down[3], within(1e-5));
      }
    }
  }

  @Test
  void tablesHoldAnglesOfRegularArraysAsTheyAre() {
    Stacks stack = device(64);
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        RayEvaluator evaluator = (RayEvaluator) prepared.newEvaluator()) {
      LitDevice lit = evaluator.ready(stack.design(), Beam.of(Incidence.normal()));
      List<Angles.Table> tables = lit.traced().forest().angles().tables();
      double[] fresh = tables.get(tables.size() - 1).cosines();
      assertThat(fresh).hasSizeBetween(2, 3);
      assertThat(fresh[fresh.length - 1])
          .isCloseTo(Math.cos(Math.toRadians(180 - 3 * PyramidTest.FACET_DEG)), within(1e-9));
    }
  }

  /** Witness: a trace made anew for the angle. */
  @Test
  void aMovedFacetAngleIsTracedAnew() {
    Stacks moved = PyramidTest.device(pyramids(true, 40)).rays(64);
    Stacks drawn = PyramidTest.device(pyramids(false, 52)).rays(64);
    Design design = moved.design();
    design.knob[0] = 40;
    try (PreparedSolver prepared =
            new RayTraceSolver().prepare(moved.problem(), design, Stacks.services());
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Stacks.wanted(moved.problem());
      evaluator.evaluate(design, response);
      double before = response.sum[1];
      design.knob[0] = 52;
      evaluator.evaluate(design, response);
      assertThat(response.sum[1]).isEqualTo(drawn.solve().sum[1]).isNotEqualTo(before);
      assertThat(prepared.examine(design)).anyMatch(f -> f.code().equals("facet-angle-retraced"));
    }
  }

  private static Texture pyramids(boolean moved, double angleDeg) {
    return new Texture(
        Texture.Shape.PYRAMID,
        Texture.Direction.UP,
        Texture.Arrangement.GRID,
        moved
            ? Parameter.moved(angleDeg, new Knob(0, "facetAngleDeg", "°", 30, 60))
            : Parameter.fixed(angleDeg),
        5,
        Optional.empty(),
        Side.FRONT);
  }

  /** Witness: a beam turned by a quarter about a fourfold axis is the same beam. */
  @Test
  void lightAlongTheNormalKnowsNoPolarisationOnSquareArrays() {
    Stacks stack =
        device(512)
            .light(
                new Incidence(0, Polarisation.S, Side.FRONT),
                new Incidence(0, Polarisation.P, Side.FRONT));
    Response response = stack.solve();
    for (int w = 0; w < response.reflectance[0].length; w++) {
      assertThat(response.reflectance[1][w]).isCloseTo(response.reflectance[0][w], within(0.02));
    }
  }

  /** Witness: the definition of the wanted error, and rays spread evenly over the spectrum. */
  @Test
  void raysGoWhereTheyTellTheMost() {
    Stacks chosen = PyramidTest.device(PyramidTest.pyramids(5)).error(0.02);
    Response response = chosen.solve();
    for (double error : response.sumStandardError) {
      assertThat(error).isLessThan(0.03);
    }
    double rays = fact(chosen, "rayCount");
    Stacks even = device(8 * (int) Math.ceil(rays / 8));
    double evenError = even.solve().sumStandardError[1];
    double costs = fact(chosen, "meetingCount") / fact(even, "meetingCount");
    assertThat(costs * Math.pow(response.sumStandardError[1] / evenError, 2)).isLessThan(1);
  }

  private static double fact(Stacks stack, String key) {
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver())) {
      return prepared.describe(stack.design()).stream()
          .filter(fact -> fact.key().equals(key))
          .findFirst()
          .orElseThrow()
          .value();
    }
  }

  /** Witness: replicate by replicate, whose mean is the whole. */
  @Test
  void sumsDoNotDependOnWhetherTheirErrorsAreAskedFor() {
    Stacks stack = device(64);
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      Response apart = Stacks.wanted(stack.problem());
      evaluator.evaluate(stack.design(), apart);
      Response together = Stacks.wanted(stack.problem());
      together.sumStandardError = null;
      together.absorptanceStandardError = null;
      evaluator.evaluate(stack.design(), together);
      assertThat(together.sum).containsExactly(apart.sum, within(1e-12));
      assertThat(together.reflectance[0]).containsExactly(apart.reflectance[0], within(1e-12));
    }
  }

  /** Witness: currents in between; what rays add to the change stays within their error. */
  @Test
  void currentsChangeSmoothlyWithTheFacetAngle() {
    Stacks moved = PyramidTest.device(pyramids(true, 54)).rays(128);
    Design design = moved.design();
    design.knob[0] = 54;
    try (PreparedSolver prepared =
            new RayTraceSolver().prepare(moved.problem(), design, Stacks.services());
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Stacks.wanted(moved.problem());
      double[] current = new double[5];
      for (int i = 0; i < current.length; i++) {
        design.knob[0] = 53 + 0.5 * i;
        evaluator.evaluate(design, response);
        current[i] = response.sum[1];
      }
      for (int i = 1; i + 1 < current.length; i++) {
        double between = (current[i - 1] + current[i + 1]) / 2;
        assertThat(current[i]).isCloseTo(between, within(2 * response.sumStandardError[1]));
      }
    }
  }
}
