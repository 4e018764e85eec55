package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Side;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Laws that hold for every stack. */
class LawsTest {

  private static final List<Polarisation> ALL = List.of(Polarisation.values());

  /** Some layers incoherent, some of them absorbing weakly or strongly. */
  private static Sample mixedStack(SplittableRandom random) {
    int layers = 1 + random.nextInt(8);
    boolean[] incoherent = new boolean[layers];
    for (int l = 0; l < layers; l++) {
      incoherent[l] = random.nextDouble() < 0.3;
    }
    Sample sample = Sample.of(incoherent, 300, 550, 1100);
    sample.medium(0, 1 + random.nextDouble(), 0);
    for (int l = 0; l < layers; l++) {
      double nm = incoherent[l] ? 1000 + 2e5 * random.nextDouble() : 300 * random.nextDouble();
      sample.layer(l, 1, 0, nm);
      sample.randomMedium(random, l + 1);
      if (incoherent[l]) {
        double k = random.nextBoolean() ? 0 : Math.pow(10, -7 + 6.5 * random.nextDouble());
        sample.medium(l + 1, 1.4 + 2.5 * random.nextDouble(), k);
      }
    }
    sample.randomMedium(random, layers + 1);
    return sample;
  }

  // Witness: conservation of energy.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void whatComesInGoesSomewhere(String kernel) {
    SplittableRandom random = new SplittableRandom(11);
    for (int trial = 0; trial < 300; trial++) {
      Sample sample = mixedStack(random);
      Polarisation polarisation = ALL.get(random.nextInt(3));
      Response response = sample.solve(kernel, Sample.at(89 * random.nextDouble(), polarisation));
      for (int w = 0; w < sample.wavelengths(); w++) {
        assertThat(Sample.gap(response, w)).isCloseTo(0, within(1e-9));
      }
    }
  }

  // Witness: conservation of energy, at the faces of absorbing incoherent layers as design.md books
  // it: R = |r|², T = Re(Y_t)|1 + r|²/Re(Y_i), the rest to the layer.
  @ParameterizedTest
  @CsvSource({"3.7, 1e-7, 180000", "3.7, 1e-4, 10000", "2.4, 0.3, 3000", "1.5, 3, 2000"})
  void theLedgerClosesBesideAbsorbingIncoherentLayers(double n, double k, double nm) {
    for (String kernel : List.of("fast", "reference")) {
      Sample wafer = Sample.of(new boolean[] {false, true, false}, 400, 800);
      wafer.layer(0, 2, 0, 70).layer(1, n, k, nm).layer(2, 1.8, 0.02, 90).medium(4, 0.05, 4);
      for (double angleDeg : new double[] {0, 50}) {
        Response response = wafer.solve(kernel, Sample.at(angleDeg, Polarisation.UNPOLARISED));
        assertThat(Sample.gap(response, 0)).isCloseTo(0, within(1e-12));
        assertThat(Sample.gap(response, 1)).isCloseTo(0, within(1e-12));
      }
    }
  }

  // Witness: closed form of two faces. Light that reaches the rear face of a layer that absorbs
  // all of it on the second crossing: A = T₁(1 - a)(1 + aR) + T₁a·M, M = -2 (Im Y/Re Y) Im r.
  @Test
  void theMixedTermIsBookedToTheIncoherentLayer() {
    double n = 2.4;
    double k = 0.3;
    Sample slab = Sample.of(new boolean[] {true}, 500);
    slab.layer(0, n, k, 500).medium(2, 0.05, 3);
    double rearRe = ((n - 0.05) * (n + 0.05) + (k - 3) * (k + 3)) / (2.45 * 2.45 + 3.3 * 3.3);
    double rearIm = ((k - 3) * (n + 0.05) - (n - 0.05) * (k + 3)) / (2.45 * 2.45 + 3.3 * 3.3);
    double rear = rearRe * rearRe + rearIm * rearIm;
    double scale = 1 / ((1 + n) * (1 + n) + k * k);
    double frontIn = 4 * n * scale;
    double front = ((1 - n) * (1 - n) + k * k) * scale;
    double a = Math.exp(-4 * Math.PI * k * 500 / 500);
    double entering = frontIn / (1 - front * a * a * rear);
    // Seen from inside, r at the front face is (N - 1)/(N + 1); its imaginary part is 2k/|N + 1|².
    double mixedRear = -2 * k / n * rearIm;
    double mixedFront = -2 * k / n * 2 * k * scale;
    double expected =
        entering * ((1 - a) * (1 + a * rear) + a * mixedRear + a * a * rear * mixedFront);
    for (String kernel : List.of("fast", "reference")) {
      Response response = slab.solve(kernel, Incidence.normal());
      assertThat(response.absorptance[0][0]).isCloseTo(expected, within(1e-13));
    }
  }

  // Witness: reciprocity (Stokes; holds for absorbing layers between lossless media).
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void transmittanceIsTheSameFromBothSides(String kernel) {
    SplittableRandom random = new SplittableRandom(5);
    for (int trial = 0; trial < 200; trial++) {
      Sample sample = mixedStack(random);
      double n = 1 + random.nextDouble();
      sample.medium(sample.layers() + 1, n, 0);
      double front = sample.design.n[0][0];
      double sine = random.nextDouble() * Math.min(n, front);
      for (Polarisation polarisation : ALL) {
        double there = transmittance(sample, kernel, polarisation, sine / front, Side.FRONT);
        double back = transmittance(sample, kernel, polarisation, sine / n, Side.REAR);
        assertThat(back).isCloseTo(there, within(1e-11));
      }
    }
  }

  private static double transmittance(
      Sample sample, String kernel, Polarisation polarisation, double sine, Side side) {
    double angleDeg = Math.min(Math.toDegrees(Math.asin(sine)), 89);
    return sample.solve(kernel, new Incidence(angleDeg, polarisation, side)).transmittance[0][0];
  }

  // Witness: mean of the coherent solution (one linear system) over the phase of the slab at fixed
  // attenuation, a trapezoid sum that converges geometrically. Absorption in the slab includes the
  // mixed terms at its faces, however strong.
  @ParameterizedTest
  @CsvSource({
    "0, S, 0",
    "35, S, 0",
    "35, P, 0",
    "70, P, 0",
    "0, S, 0.001",
    "50, P, 0.001",
    "0, S, 0.3",
    "60, S, 0.3",
    "60, P, 0.3"
  })
  void anIncoherentLayerIsTheMeanOverItsPhase(
      double angleDeg, Polarisation polarisation, double k) {
    int phases = 96;
    Sample sample = Sample.of(new boolean[] {false, true, false}, 600);
    sample.layer(0, 2.1, 0.3, 40).layer(1, 1.9, k, 300).layer(2, 3.5, 0.4, 60);
    sample.medium(4, 0.1, 3.5);
    double[] mean = new double[5];
    for (int i = 0; i < phases; i++) {
      BoundaryValues coherent =
          new BoundaryValues(
              sample, 0, angleDeg, polarisation == Polarisation.P, 1, 2 * Math.PI * i / phases);
      mean[0] += coherent.reflectance / phases;
      mean[1] += coherent.transmittance / phases;
      for (int l = 0; l < 3; l++) {
        mean[2 + l] += coherent.absorptance[l] / phases;
      }
    }
    for (String kernel : List.of("fast", "reference")) {
      Response found = sample.solve(kernel, Sample.at(angleDeg, polarisation));
      assertThat(found.reflectance[0][0]).isCloseTo(mean[0], within(1e-12));
      assertThat(found.transmittance[0][0]).isCloseTo(mean[1], within(1e-12));
      for (int l = 0; l < 3; l++) {
        assertThat(found.absorptance[l][0]).isCloseTo(mean[2 + l], within(1e-12));
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void fortyLayersAndMillimetresOfAbsorberStayFinite(String kernel) {
    SplittableRandom random = new SplittableRandom(77);
    for (int trial = 0; trial < 30; trial++) {
      Sample sample = Sample.random(random, 40, 300, 700, 1200);
      for (int l = 0; l < 40; l += 7) {
        sample.design.thicknessNm[l] = 2e6;
      }
      Response response =
          sample.solve(kernel, Sample.at(80 * random.nextDouble(), Polarisation.UNPOLARISED));
      for (int w = 0; w < 3; w++) {
        // Witness: conservation of energy; shares are not negative.
        assertThat(Sample.gap(response, w)).isCloseTo(0, within(1e-9));
        for (double[] row : response.absorptance) {
          assertThat(row[w]).isGreaterThan(-1e-12);
        }
      }
    }
  }

  // Witness: an opaque absorber passes nothing and reflects as a half-space does (Fresnel).
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void amillimetreOfAbsorberIsAHalfSpace(String kernel) {
    Sample slab = Sample.of(1, 500).layer(0, 3.4, 0.7, 1e6).medium(2, 1.5, 0);
    Response response = slab.solve(kernel, Incidence.normal());
    double r = (2.4 * 2.4 + 0.49) / (4.4 * 4.4 + 0.49);
    assertThat(response.reflectance[0][0]).isCloseTo(r, within(1e-14));
    assertThat(response.absorptance[0][0]).isCloseTo(1 - r, within(1e-14));
    assertThat(response.transmittance[0][0]).isCloseTo(0, within(1e-18));
  }

  // Witness: at normal incidence s and p are one; unpolarised is the mean of both.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void unpolarisedLightIsTheMeanOfBoth(String kernel) {
    SplittableRandom random = new SplittableRandom(3);
    for (int trial = 0; trial < 50; trial++) {
      Sample sample = mixedStack(random);
      double angleDeg = trial == 0 ? 0 : 85 * random.nextDouble();
      Response s = sample.solve(kernel, Sample.at(angleDeg, Polarisation.S));
      Response p = sample.solve(kernel, Sample.at(angleDeg, Polarisation.P));
      Response both = sample.solve(kernel, Sample.at(angleDeg, Polarisation.UNPOLARISED));
      for (int l = 0; l < sample.layers(); l++) {
        assertThat(both.absorptance[l][1])
            .isCloseTo((s.absorptance[l][1] + p.absorptance[l][1]) / 2, within(1e-14));
      }
      assertThat(both.reflectance[0][1])
          .isCloseTo((s.reflectance[0][1] + p.reflectance[0][1]) / 2, within(1e-14));
    }
  }

  // Witness: a layer that is not there does nothing; the stack is drawn without it.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aLayerOfZeroThicknessIsAbsent(String kernel) {
    Sample with = Sample.of(new boolean[] {false, true, false, false}, 450, 900);
    with.layer(0, 2, 0.1, 50).layer(1, 3, 0, 0).layer(2, 5, 1, 0).layer(3, 1.7, 0.2, 120);
    with.medium(5, 3.5, 0.01);
    Sample without = Sample.of(2, 450, 900);
    without.layer(0, 2, 0.1, 50).layer(1, 1.7, 0.2, 120).medium(3, 3.5, 0.01);
    Incidence oblique = Sample.at(40, Polarisation.P);
    Response a = with.solve(kernel, oblique);
    Response b = without.solve(kernel, oblique);
    assertThat(a.reflectance[0]).containsExactly(b.reflectance[0]);
    assertThat(a.transmittance[0]).containsExactly(b.transmittance[0]);
    assertThat(a.absorptance[3]).containsExactly(b.absorptance[1]);
    assertThat(a.absorptance[1]).containsExactly(0, 0);
    assertThat(a.absorptance[2]).containsExactly(0, 0);
  }

  // Witness: the stack drawn upside down.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void lightFromTheRearMeetsTheStackUpsideDown(String kernel) {
    SplittableRandom random = new SplittableRandom(19);
    for (int trial = 0; trial < 30; trial++) {
      Sample sample = mixedStack(random);
      int layers = sample.layers();
      sample.medium(layers + 1, 1.3, trial % 2 == 0 ? 0 : 0.01);
      boolean[] incoherent = new boolean[layers];
      for (int l = 0; l < layers; l++) {
        incoherent[layers - 1 - l] = !sample.problem.layers().get(l).coherent();
      }
      Sample turned = Sample.of(incoherent, 300, 550, 1100);
      for (int m = 0; m < layers + 2; m++) {
        turned.medium(layers + 1 - m, sample.design.n[m][0], sample.design.k[m][0]);
      }
      for (int l = 0; l < layers; l++) {
        turned.design.thicknessNm[layers - 1 - l] = sample.design.thicknessNm[l];
      }
      Incidence rear = new Incidence(30, Polarisation.P, Side.REAR);
      Response a = sample.solve(kernel, rear);
      Response b = turned.solve(kernel, Sample.at(30, Polarisation.P));
      assertThat(a.reflectance[0]).containsExactly(b.reflectance[0]);
      assertThat(a.transmittance[0]).containsExactly(b.transmittance[0]);
      for (int l = 0; l < layers; l++) {
        assertThat(a.absorptance[l]).containsExactly(b.absorptance[layers - 1 - l]);
      }
    }
  }
}
