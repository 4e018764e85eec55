package evensun.testkit;

import evensun.spi.Polarisation;
import evensun.spi.Samples;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.stream.IntStream;

/** Cases to try laws on: seeded, small ones first. */
final class Cases {

  private static final long SEED = 20_260_101;
  private static final int COUNT = 60;
  private static final int MOST_LAYERS = 8;

  private final SplittableRandom random;

  private Cases(long seed) {
    random = new SplittableRandom(seed);
  }

  /** Whatever the solver claims. */
  static List<StackCase> claimedBy(Subject subject) {
    return made(Cases::any).stream().filter(subject::claims).toList();
  }

  /** Coherent layers and unpolarised light on the normal, which every solver takes. */
  static List<StackCase> plain() {
    return made(Cases::plainCase);
  }

  /** Those of the claimed cases that a law can be stated for. */
  static List<StackCase> claimedBy(Subject subject, Predicate<StackCase> fit) {
    return claimedBy(subject).stream().filter(fit).toList();
  }

  private static List<StackCase> made(Function<Cases, StackCase> maker) {
    Cases cases = new Cases(SEED);
    return IntStream.range(0, COUNT).mapToObj(i -> cases.sized(i, maker)).toList();
  }

  private int layers;

  private StackCase sized(int index, Function<Cases, StackCase> maker) {
    layers = 1 + index * MOST_LAYERS / COUNT;
    return maker.apply(this);
  }

  private StackCase any() {
    boolean oblique = random.nextBoolean();
    double angleDeg = oblique ? random.nextDouble(1, 85) : 0;
    Polarisation[] all = Polarisation.values();
    Polarisation polarisation = all[random.nextInt(all.length)];
    return stack(random.nextBoolean()).withLight(angleDeg, polarisation);
  }

  private StackCase plainCase() {
    return stack(false);
  }

  private StackCase stack(boolean mayBeThick) {
    List<CaseLayer> made = new ArrayList<>();
    for (int l = 0; l < layers; l++) {
      boolean thick = mayBeThick && random.nextInt(4) == 0;
      made.add(new CaseLayer(medium(), thick ? thickNm() : thinNm(), !thick));
    }
    CaseMedium incident = CaseMedium.of(random.nextBoolean() ? 1 : 1.5, 0);
    return new StackCase(wavelengthNm(), incident, made, medium(), 0, Polarisation.UNPOLARISED);
  }

  private double thinNm() {
    return rounded(Math.exp(random.nextDouble(Math.log(5), Math.log(800))), 10);
  }

  private double thickNm() {
    return rounded(random.nextDouble(20_000, 300_000), 1);
  }

  private CaseMedium medium() {
    double n = rounded(random.nextDouble(1.3, 3.8), 100);
    double slope = rounded(random.nextDouble(-0.2, 0), 100);
    double k = random.nextBoolean() ? 0 : roundedUp(Math.exp(random.nextDouble(-9, 0.5)));
    return new CaseMedium(n, slope, k);
  }

  /** Few digits, so that a failing case reads well. */
  private static double rounded(double value, double steps) {
    return Math.rint(value * steps) / steps;
  }

  private static double roundedUp(double value) {
    return Math.ceil(value * 1e5) / 1e5;
  }

  private Samples wavelengthNm() {
    int count = 1 + random.nextInt(9);
    double[] values = new double[count];
    for (int w = 0; w < count; w++) {
      values[w] = 300 + 100 * w;
    }
    return Samples.of(values);
  }
}
