package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Polarisation;
import evensun.spi.Response;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The fast kernel against its plain twin, which shares neither loops nor formulation with it. */
class TwinTest {

  private static final double ROUNDING = 2e-12;

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 7, 8, 181, 2000})
  void agreesForAnyNumberOfWavelengths(int wavelengths) {
    compare(5, wavelengths, wavelengths);
  }

  @ParameterizedTest
  @ValueSource(ints = {0, 1, 2, 60})
  void agreesForAnyNumberOfLayers(int layers) {
    compare(layers, 11, layers);
  }

  private static void compare(int layers, int wavelengths, long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    double[] nm = new double[wavelengths];
    for (int w = 0; w < wavelengths; w++) {
      nm[w] = 280 + 1500.0 * (w + 1) / (wavelengths + 1);
    }
    for (int trial = 0; trial < 6; trial++) {
      boolean[] incoherent = new boolean[layers];
      for (int l = 0; l < layers; l++) {
        incoherent[l] = trial % 2 == 1 && random.nextInt(4) == 0;
      }
      Sample sample = Sample.of(incoherent, nm);
      for (int m = 0; m < layers + 2; m++) {
        disperse(sample, m, random, m > 0);
      }
      for (int l = 0; l < layers; l++) {
        sample.design.thicknessNm[l] = (incoherent[l] ? 1e5 : 300) * random.nextDouble();
      }
      assertTwins(sample, trial < 2 ? 0 : 80 * random.nextDouble(), ROUNDING);
    }
  }

  private static void disperse(Sample sample, int m, SplittableRandom random, boolean absorbs) {
    double n = 1.2 + 2 * random.nextDouble();
    double k = absorbs ? Math.pow(10, -6 + 6 * random.nextDouble()) : 0;
    for (int w = 0; w < sample.wavelengths(); w++) {
      sample.design.n[m][w] = n + 0.3 * Math.sin(0.01 * w + m);
      sample.design.k[m][w] = k * (1 + Math.cos(0.02 * w + m));
    }
  }

  private static void assertTwins(Sample sample, double angleDeg, double tolerance) {
    for (Polarisation polarisation : Polarisation.values()) {
      Response fast = sample.solve("fast", Sample.at(angleDeg, polarisation));
      Response plain = sample.solve("reference", Sample.at(angleDeg, polarisation));
      // Witness: the reference kernel.
      assertThat(difference(fast.reflectance, plain.reflectance)).isLessThan(tolerance);
      assertThat(difference(fast.transmittance, plain.transmittance)).isLessThan(tolerance);
      assertThat(difference(fast.absorptance, plain.absorptance)).isLessThan(tolerance);
    }
  }

  /** Largest difference; NaN counts as infinite. */
  private static double difference(double[][] a, double[][] b) {
    double largest = 0;
    for (int i = 0; i < a.length; i++) {
      for (int w = 0; w < a[i].length; w++) {
        double difference = Math.abs(a[i][w] - b[i][w]);
        largest = difference <= largest ? largest : difference;
        if (Double.isNaN(difference)) {
          return Double.POSITIVE_INFINITY;
        }
      }
    }
    return largest;
  }

  @ParameterizedTest
  @CsvSource({
    "1e-9, 1, 0",
    "1e7, 1.5, 0",
    "1e7, 1.5, 1e-8",
    "1e7, 4, 8",
    "100, 1e-3, 0",
    "100, 1e-3, 20",
    "100, 1e4, 0",
    "100, 1e3, 1e4",
    "1e-300, 2, 1",
    "50, 1, 0"
  })
  void agreesForExtremeLayers(double nm, double n, double k) {
    for (int layer = 0; layer < 3; layer++) {
      Sample sample = Sample.of(3, 280, 1000, 2500);
      sample.layer(0, 2, 0.01, 80).layer(1, 1.5, 0, 200).layer(2, 3, 0.2, 100).medium(4, 1.5, 1);
      sample.layer(layer, n, k, nm);
      // n·d/λ is rounded to a double: beyond some thousand turns that is what limits agreement,
      // the more so the sharper the fringes are.
      double turns = 2 * n * nm / 280;
      double tolerance = Math.max(ROUNDING, 1e-15 * turns * Math.max(1, n));
      assertTwins(sample, 0, tolerance);
      assertTwins(sample, 60, tolerance);
    }
  }

  // Witness: the layer's matrix (Born & Wolf, section 1.6) in the limit q → 0 for s light, where it
  // is (1, -i k₀d; 0, 1): r = (η₀ - η - iη₀η k₀d)/(η₀ + η - iη₀η k₀d).
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aWaveMayRunAlongALayer(String kernel) {
    // n₀ sin θ equals the index of the layer: q = 0 there, the waves on and back are one.
    Sample sample = Sample.of(1, 500).medium(0, 2, 0).layer(0, 1, 0, 100).medium(2, 1.5, 0);
    double front = Math.sqrt(3);
    double behind = Math.sqrt(1.25);
    double cross = front * behind * 2 * Math.PI * 100 / 500;
    double expected =
        (Math.pow(front - behind, 2) + cross * cross)
            / (Math.pow(front + behind, 2) + cross * cross);
    Response found = sample.solve(kernel, Sample.at(30, Polarisation.S));
    assertThat(found.reflectance[0][0]).isCloseTo(expected, within(1e-9));
    assertThat(Sample.gap(found, 0)).isCloseTo(0, within(1e-9));
  }
}
