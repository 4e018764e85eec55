package evensun.effectivemedium;

import static evensun.spi.MixingRule.BRUGGEMAN;
import static evensun.spi.MixingRule.LOOYENGA;
import static evensun.spi.MixingRule.LORENTZ_LORENZ;
import static evensun.spi.MixingRule.MAXWELL_GARNETT;
import static evensun.spi.MixingRule.REFRACTIVE_INDEX;
import static evensun.spi.MixingRule.WIENER_PARALLEL;
import static evensun.spi.MixingRule.WIENER_SERIES;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class MixingRulesTest {

  private static final Eps AIR = Eps.of(1);

  @ParameterizedTest
  @EnumSource(MixingRule.class)
  void aFractionOfOneIsTheComponentToTheLastBit(MixingRule rule) {
    // Limit: a mixture of one component is that component.
    Eps absorber = Eps.ofIndex(2.3, 0.4);
    for (int c = 0; c < 3; c++) {
      double[] f = new double[3];
      f[c] = 1;
      Eps[] components = {AIR, absorber, Eps.ofIndex(0.1, 4)};
      Blend blend = Mixing.blend(rule, Mixture.SPHERE, f, components);
      assertThat(blend.n(0)[0]).isEqualTo(components[c].root().re());
      assertThat(blend.k(0)[0]).isEqualTo(components[c].root().im());
      assertThat(blend.share(0, c)[0]).isEqualTo(1);
    }
  }

  @ParameterizedTest
  @EnumSource(MixingRule.class)
  void componentsThatAreEqualMixToThemselves(MixingRule rule) {
    // Limit: mixing a material with itself changes nothing.
    Random random = new Random(1);
    for (int i = 0; i < 200; i++) {
      Eps eps = Mixing.passive(random);
      double[] f = Mixing.fractions(random, 2 + random.nextInt(3));
      Eps[] same = new Eps[f.length];
      Arrays.fill(same, eps);
      assertThat(Mixing.mix(rule, f, same).distance(eps)).isLessThan(2e-14);
    }
  }

  @ParameterizedTest
  @EnumSource(MixingRule.class)
  void realMixturesStayWithinTheWienerBounds(MixingRule rule) {
    // Closed form: harmonic and arithmetic mean (Wiener 1912) bound every real mixture.
    Random random = new Random(2);
    for (int i = 0; i < 2000; i++) {
      double[] f = Mixing.fractions(random, 2 + random.nextInt(3));
      Eps[] components = realComponents(random, f.length);
      double mean = 0;
      double inverse = 0;
      for (int c = 0; c < f.length; c++) {
        mean += f[c] * components[c].re();
        inverse += f[c] / components[c].re();
      }
      Eps mixed = Mixing.mix(rule, f, components);
      assertThat(mixed.re()).isBetween((1 / inverse) * (1 - 1e-13), mean * (1 + 1e-13));
      assertThat(mixed.im()).isZero();
    }
  }

  @ParameterizedTest
  @EnumSource(
      value = MixingRule.class,
      names = {"BRUGGEMAN", "LOOYENGA", "MAXWELL_GARNETT"})
  void isotropicRulesStayWithinTheHashinShtrikmanBounds(MixingRule rule) {
    // Closed form: Hashin & Shtrikman, J. Appl. Phys. 33, 3125 (1962), for two components.
    Random random = new Random(3);
    for (int i = 0; i < 2000; i++) {
      double a = 1 + 15 * random.nextDouble();
      double b = 1 + 15 * random.nextDouble();
      double f = random.nextDouble();
      double one = hashinShtrikman(a, b, f);
      double other = hashinShtrikman(b, a, 1 - f);
      double mixed = Mixing.mix(rule, new double[] {1 - f, f}, Eps.of(a), Eps.of(b)).re();
      assertThat(mixed)
          .isBetween(Math.min(one, other) * (1 - 1e-13), Math.max(one, other) * (1 + 1e-13));
    }
  }

  /** Host a, inclusions b of fraction f. */
  private static double hashinShtrikman(double a, double b, double f) {
    return a + f / (1 / (b - a) + (1 - f) / (3 * a));
  }

  @Test
  void lorentzLorenzLeavesTheHashinShtrikmanBounds() {
    // By hand, a counter-example to the law above for 4 and 16 in equal parts: the lower bound is
    // 4 + 0.5/(1/12 + 0.5/12) = 8; Lorentz-Lorenz has (e - 1)/(e + 2) = (3/6 + 15/18)/2 = 2/3, e =
    // 7.
    double bound = hashinShtrikman(4, 16, 0.5);
    double mixed = Mixing.mix(LORENTZ_LORENZ, new double[] {0.5, 0.5}, Eps.of(4), Eps.of(16)).re();
    assertThat(mixed).isCloseTo(7, within(1e-12));
    assertThat(bound).isCloseTo(8, within(1e-12));
  }

  @ParameterizedTest
  @EnumSource(MixingRule.class)
  void mixturesOfPassiveComponentsArePassive(MixingRule rule) {
    // Law: no light is made, Im eps >= 0 with exp(-i omega t).
    Random random = new Random(4);
    for (int i = 0; i < 5000; i++) {
      double[] f = Mixing.fractions(random, 2 + random.nextInt(3));
      Eps[] components = passiveComponents(random, f.length);
      Blend blend = Mixing.blend(rule, Mixture.SPHERE, f, components);
      assertThat(blend.k(0)[0]).isGreaterThanOrEqualTo(0).isFinite();
      assertThat(blend.n(0)[0]).isGreaterThan(0).isFinite();
    }
  }

  @Test
  void bruggemanAndMaxwellGarnettAgreeToFirstOrder() {
    // Limit: both are dilute spheres to first order, so the difference falls as the square.
    Eps sphere = Eps.ofIndex(2.5, 0.3);
    double tenth = ruleDifference(1e-2, sphere);
    double hundredth = ruleDifference(1e-3, sphere);
    double thousandth = ruleDifference(1e-4, sphere);
    assertThat(tenth / hundredth).isCloseTo(100, within(10.0));
    assertThat(hundredth / thousandth).isCloseTo(100, within(1.0));
  }

  private static double ruleDifference(double f, Eps sphere) {
    double[] fractions = {1 - f, f};
    Eps bruggeman = Mixing.mix(BRUGGEMAN, fractions, AIR, sphere);
    return bruggeman.minus(Mixing.mix(MAXWELL_GARNETT, fractions, AIR, sphere)).abs();
  }

  @Test
  void spheresPercolateAtAThird() {
    // Closed form for perfect conductors in a host h: eps = h/(1 - 3f) below one third, and
    // eps_m (3f - 1)/2 above (Landauer, J. Appl. Phys. 23, 779 (1952)).
    Eps conductor = new Eps(1, 1e10);
    Eps host = Eps.of(2);
    for (double f : new double[] {0.1, 0.2, 0.3, 0.32}) {
      Eps mixed = Mixing.mix(BRUGGEMAN, new double[] {1 - f, f}, host, conductor);
      assertThat(mixed.distance(host.times(1 / (1 - 3 * f)))).isLessThan(1e-6);
    }
    for (double f : new double[] {0.35, 0.5, 0.9}) {
      Eps mixed = Mixing.mix(BRUGGEMAN, new double[] {1 - f, f}, host, conductor);
      assertThat(mixed.distance(conductor.times((3 * f - 1) / 2))).isLessThan(1e-6);
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.05, 0.2, 1.0 / 3, 0.7})
  void inclusionsPercolateAtTheirDepolarisationFactor(double p) {
    // Closed form for perfect conductors in a host h: eps = P h/(P - f) below f = P, from
    // f/P + (1 - f)(h - eps)/(eps + P(h - eps)) = 0; no finite solution above.
    Eps conductor = new Eps(1, 1e12);
    double below = 0.95 * p;
    double above = 1.05 * p;
    Eps finite = Mixing.mix(BRUGGEMAN, p, new double[] {1 - below, below}, AIR, conductor);
    Eps huge = Mixing.mix(BRUGGEMAN, p, new double[] {1 - above, above}, AIR, conductor);
    assertThat(finite.distance(Eps.of(p / (p - below)))).isLessThan(1e-6);
    assertThat(huge.abs()).isGreaterThan(1e9);
  }

  @Test
  void theDepolarisationFactorRunsFromParallelToSeries() {
    // Limits: P = 0 is the upper Wiener bound, P = 1 the lower one.
    Eps a = Eps.ofIndex(1.5, 0.01);
    Eps b = Eps.ofIndex(2.6, 0.2);
    double[] f = {0.35, 0.65};
    Eps needles = Mixing.mix(BRUGGEMAN, 1e-9, f, a, b);
    Eps discs = Mixing.mix(BRUGGEMAN, 1 - 1e-9, f, a, b);
    assertThat(needles.distance(Mixing.mix(WIENER_PARALLEL, f, a, b))).isLessThan(1e-7);
    assertThat(discs.distance(Mixing.mix(WIENER_SERIES, f, a, b))).isLessThan(1e-7);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 5})
  void bruggemanSolvesItsEquationInsideTheCone(int count) {
    // Law: the equation itself, evaluated apart from the kernel.
    Random random = new Random(5);
    for (int i = 0; i < 3000; i++) {
      double p = 0.05 + 0.9 * random.nextDouble();
      double[] f = Mixing.fractions(random, count);
      Eps[] components = passiveComponents(random, count);
      Eps mixed = Mixing.mix(BRUGGEMAN, p, f, components);
      assertThat(Mixing.bruggemanResidual(p, f, components, mixed)).isLessThan(1e-11);
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {3, 4, 5})
  void bruggemanSettlesForMetalsAlmostWithoutLoss(int count) {
    // Law: of the roots of the equation, evaluated apart from the kernel, one lies in the cone that
    // the components span (Denjoy-Wolff), here almost a half-plane.
    Random random = new Random(9);
    for (int i = 0; i < 3000; i++) {
      double p = 0.05 + 0.9 * random.nextDouble();
      double[] f = Mixing.fractions(random, count);
      Eps[] components = new Eps[count];
      for (int c = 0; c < count; c++) {
        components[c] = Mixing.almostReal(random);
      }
      Eps mixed = Mixing.mix(BRUGGEMAN, p, f, components);
      assertThat(Mixing.bruggemanResidual(p, f, components, mixed)).isLessThan(1e-9);
      double[] angles = Arrays.stream(components).mapToDouble(Eps::angle).sorted().toArray();
      assertThat(mixed.angle()).isBetween(angles[0] - 1e-9, angles[count - 1] + 1e-9);
    }
  }

  @Test
  void spheresOfAMetalWithoutLossAbsorbWhereTheyResonate() {
    // By hand: -5 and 2 in equal parts, 2 eps^2 + 1.5 eps + 10 = 0, eps = -0.375 + i
    // sqrt(77.75)/4; of the two roots the one that absorbs, as with a little loss in the metal.
    double[] f = {0.5, 0.25, 0.25};
    Eps mixed = Mixing.mix(BRUGGEMAN, f, Eps.of(-5), Eps.of(2), Eps.of(2));
    assertThat(mixed.distance(new Eps(-0.375, Math.sqrt(77.75) / 4))).isLessThan(1e-14);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4})
  void bruggemanTakesTheRootThatContinuityGives(int count) {
    // Independent calculation: the root followed from the pure first component, whatever it is.
    Random random = new Random(6);
    for (int i = 0; i < 25; i++) {
      double[] f = Mixing.fractions(random, count);
      Eps[] components = passiveComponents(random, count);
      Eps followed = Mixing.bruggemanByContinuity(Mixture.SPHERE, f, components);
      Eps mixed = Mixing.mix(BRUGGEMAN, f, components);
      assertThat(mixed.distance(followed)).isLessThan(1e-9);
    }
  }

  @Test
  void rowsAreTheirWavelengthsOneByOne() {
    // Independent calculation: every wavelength alone; the components swing between dielectric,
    // absorber and metal, and jump once.
    int wavelengths = 400;
    Blend rows = new Blend(BRUGGEMAN, -1, Mixture.SPHERE, 3, 1, wavelengths);
    double[][] n = new double[3][wavelengths];
    double[][] k = new double[3][wavelengths];
    for (int w = 0; w < wavelengths; w++) {
      n[0][w] = 1.5 + 0.2 * Math.sin(w / 30.0);
      n[1][w] = 2.5 + Math.sin(w / 17.0);
      k[1][w] = w < 200 ? 0.6 * Math.pow(Math.sin(w / 40.0), 2) : 3;
      n[2][w] = 0.1 + Math.pow(Math.cos(w / 60.0), 2);
      k[2][w] = 6 * Math.pow(Math.sin(w / 60.0), 2);
    }
    for (int c = 0; c < 3; c++) {
      rows.component(c, n[c], k[c], 1 + c);
    }
    double[] f = {0.4, 0.3, 0.3};
    rows.mix(0, f);
    for (int w = 0; w < wavelengths; w++) {
      Eps alone =
          Mixing.mix(
              BRUGGEMAN,
              f,
              Eps.ofIndex(n[0][w], k[0][w]),
              Eps.ofIndex(n[1][w], k[1][w]),
              Eps.ofIndex(n[2][w], k[2][w]));
      assertThat(Eps.ofIndex(rows.n(0)[w], rows.k(0)[w]).distance(alone)).isLessThan(1e-12);
    }
  }

  @Test
  void equalComponentsMayBeMerged() {
    // Law: whether a component is listed once or in two parts does not matter; two components are
    // solved in closed form, three by iteration.
    Random random = new Random(7);
    for (MixingRule rule : MixingRule.values()) {
      for (int i = 0; i < 300; i++) {
        double[] f = Mixing.fractions(random, 3);
        Eps a = Mixing.passive(random);
        Eps b = Mixing.passive(random);
        Eps split = Mixing.mix(rule, f, a, b, b);
        Eps merged = Mixing.mix(rule, new double[] {f[0], f[1] + f[2]}, a, b);
        assertThat(split.distance(merged)).as(rule.id()).isLessThan(1e-11);
      }
    }
  }

  @Test
  void porousSilicaByHand() {
    // By hand: n = 1.458, half air: (n^2 - 1)/(n^2 + 2) = 1.125764/4.125764 = 0.2728620; half of it
    // 0.1364310 = (e - 1)/(e + 2), e = 1.2728620/0.8635690 = 1.4739552, n = 1.2140656.
    Eps silica = Eps.of(1.458 * 1.458);
    Eps porous = Mixing.mix(LORENTZ_LORENZ, new double[] {0.5, 0.5}, silica, AIR);
    assertThat(Math.sqrt(porous.re())).isCloseTo(1.2140656, within(2e-7));
  }

  @Test
  void looyengaAndRefractiveIndexByHand() {
    // By hand: cube roots of 8 and 1 mix to 1.5 at a half, cubed 3.375; indices 3 and 1 mix to 2.
    double[] half = {0.5, 0.5};
    assertThat(Mixing.mix(LOOYENGA, half, Eps.of(8), AIR).re()).isCloseTo(3.375, within(1e-13));
    assertThat(Mixing.mix(REFRACTIVE_INDEX, half, Eps.of(9), AIR).re()).isCloseTo(4, within(1e-13));
  }

  @ParameterizedTest
  @EnumSource(
      value = MixingRule.class,
      names = {"WIENER_PARALLEL", "WIENER_SERIES"})
  void theLossesOfSheetsAddUpToTheLossOfTheMixture(MixingRule rule) {
    // Closed form: in sheets the field is uniform in each component (equal E, or equal D), so
    // Im eps = sum f_i Im eps_i |E_i/E|^2 and the share of one is its term over the sum.
    Random random = new Random(8);
    for (int i = 0; i < 200; i++) {
      double[] f = Mixing.fractions(random, 2);
      Eps[] components = {Mixing.passive(random), Eps.ofIndex(2, 0.5)};
      Blend blend = Mixing.blend(rule, Mixture.SPHERE, f, components);
      Eps mixed = Eps.ofIndex(blend.n(0)[0], blend.k(0)[0]);
      for (int c = 0; c < 2; c++) {
        double field = rule == WIENER_PARALLEL ? 1 : mixed.over(components[c]).abs();
        double expected = f[c] * components[c].im() * field * field / mixed.im();
        assertThat(blend.share(0, c)[0]).isCloseTo(expected, within(1e-11));
      }
    }
  }

  @Test
  void theLossOfSpheresIsSharedByTheirFields() {
    // By hand from f_i Im eps_i |3 eps/(eps_i + 2 eps)|^2, with eps taken as mixed.
    double[] f = {0.6, 0.4};
    Eps[] components = {Eps.ofIndex(2.4, 0.3), Eps.ofIndex(2.6, 0.02)};
    Blend blend = Mixing.blend(BRUGGEMAN, Mixture.SPHERE, f, components);
    Eps mixed = Eps.ofIndex(blend.n(0)[0], blend.k(0)[0]);
    double[] loss = new double[2];
    for (int c = 0; c < 2; c++) {
      double field = mixed.times(3).over(components[c].plus(mixed.times(2))).abs();
      loss[c] = f[c] * components[c].im() * field * field;
    }
    assertThat(blend.share(0, 0)[0]).isCloseTo(loss[0] / (loss[0] + loss[1]), within(1e-12));
    assertThat(blend.share(0, 0)[0] + blend.share(0, 1)[0]).isCloseTo(1, within(1e-15));
  }

  @Test
  void anAbsorberInAClearScaffoldTakesAllTheLight() {
    // Limit: what does not absorb takes nothing.
    Blend blend =
        Mixing.blend(
            BRUGGEMAN, Mixture.SPHERE, new double[] {0.5, 0.5}, Eps.of(6), Eps.ofIndex(2.4, 0.3));
    assertThat(blend.share(0, 0)[0]).isZero();
    assertThat(blend.share(0, 1)[0]).isEqualTo(1);
  }

  private static Eps[] realComponents(Random random, int count) {
    Eps[] components = new Eps[count];
    for (int c = 0; c < count; c++) {
      components[c] = Eps.of(1 + 15 * random.nextDouble());
    }
    return components;
  }

  private static Eps[] passiveComponents(Random random, int count) {
    Eps[] components = new Eps[count];
    for (int c = 0; c < count; c++) {
      components[c] = Mixing.passive(random);
    }
    return components;
  }
}
