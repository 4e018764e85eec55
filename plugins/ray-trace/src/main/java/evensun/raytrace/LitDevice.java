package evensun.raytrace;

import evensun.raytrace.kernel.FilmSums;
import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Slots;
import evensun.spi.Design;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Services;
import java.util.Arrays;
import java.util.List;

/** One traced beam with coatings: where the light of a design goes. Owned by one thread. */
final class LitDevice implements AutoCloseable {

  /** First rows of {@link #shares}: reflected, transmitted, then the layers. */
  static final int REFLECTED = 0;

  static final int TRANSMITTED = 1;
  static final int LAYERS = 2;

  /** [w][replicate][row] shares of the light before they are made to add up to one. */
  final double[][][] shares;

  /** [w][replicate][deepest medium] light that left at the top. */
  final double[][][] top;

  private final Problem problem;
  private final Traces.Traced traced;
  private final Device device;
  private final Forest forest;
  private final Angles angles;
  private final Slots slots;
  private final Coatings coatings;
  private final Weighing weighing = new Weighing();
  private final float[][] absorbed; // [w][leg]
  private final double[] absorbedFor; // [m] thickness in µm
  private final double[] booked;
  private final double[] met;
  private final double[] staying; // [film] of one table

  LitDevice(Problem problem, Traces.Traced traced, Services services) {
    this.problem = problem;
    this.traced = traced;
    device = traced.device();
    forest = traced.forest();
    angles = forest.angles();
    slots = new Slots(device.mediaCount());
    coatings = new Coatings(problem, device, angles, services);
    int wavelengths = problem.wavelengthCount();
    int replicates = forest.replicates();
    shares = new double[wavelengths][replicates][LAYERS + problem.layerCount()];
    top = new double[wavelengths][replicates][device.mediaCount()];
    absorbed = new float[wavelengths][];
    for (int w = 0; w < wavelengths; w++) {
      absorbed[w] = new float[2 * forest.trees().get(w).count];
    }
    absorbedFor = new double[device.mediaCount()];
    Arrays.fill(absorbedFor, Double.NaN);
    booked = new double[slots.count()];
    met = new double[2 * (angles.count() + 1)];
    staying = new double[problem.layerCount() + 1];
  }

  Traces.Traced traced() {
    return traced;
  }

  Coatings coatings() {
    return coatings;
  }

  /** Makes ready for a design. */
  void prepare(Design design) {
    coatings.refresh(design);
    boolean same = true;
    for (int m = 0; m < absorbedFor.length; m++) {
      double thickness = device.thicknessUm(design, m);
      same &= absorbedFor[m] == thickness;
      absorbedFor[m] = thickness;
    }
    if (!same) {
      for (int w = 0; w < absorbed.length; w++) {
        pass(design, w);
      }
    }
  }

  private void pass(Design design, int w) {
    LightTree tree = forest.trees().get(w);
    double[] alpha = alphaPerUm(design, w);
    for (int leg = 0; leg < absorbed[w].length; leg++) {
      absorbed[w][leg] = (float) absorbed(tree, leg, alpha);
    }
  }

  private double absorbed(LightTree tree, int leg, double[] alpha) {
    double length = tree.fixedUm[leg];
    if (length == Double.POSITIVE_INFINITY) {
      return 1;
    }
    int medium = tree.slot[leg] - 1;
    return -Math.expm1(-alpha[medium] * (length + tree.perThickness[leg] * absorbedFor[medium]));
  }

  /** [m] absorption coefficient per µm; 0 in the incident medium. */
  double[] alphaPerUm(Design design, int w) {
    double[] alpha = new double[device.mediaCount()];
    for (int m = 1; m < alpha.length; m++) {
      double k = design.k[device.material(design, m)][w];
      alpha[m] = 4 * Math.PI * k * 1000 / problem.wavelengthNm().at(w);
    }
    return alpha;
  }

  /** Follows the light of all wavelengths. */
  void solve(Polarisation polarisation) {
    double rayPower = 1.0 / forest.rays();
    double s = polarisation == Polarisation.S ? 1 : polarisation == Polarisation.P ? 0 : 0.5;
    for (int w = 0; w < shares.length; w++) {
      for (int r = 0; r < forest.replicates(); r++) {
        follow(w, r, s * rayPower, (1 - s) * rayPower);
      }
    }
  }

  /** Follows the light of one replicate; its legs can be read from {@link #weighing()}. */
  void follow(int w, int r, double s, double p) {
    Arrays.fill(booked, 0);
    Arrays.fill(met, 0);
    weighing.follow(
        forest.trees().get(w),
        angles.nodes().get(w),
        r,
        coatings.coating[w],
        absorbed[w],
        s,
        p,
        booked,
        met);
    collect(w, shares[w][r], top[w][r]);
  }

  Weighing weighing() {
    return weighing;
  }

  /** [w][leg] share that stays on the way. */
  float[][] absorbed() {
    return absorbed;
  }

  private void collect(int w, double[] share, double[] topShare) {
    Arrays.fill(share, 0);
    for (int m = 0; m < device.mediaCount(); m++) {
      topShare[m] = booked[slots.top(m)];
      share[REFLECTED] += topShare[m];
      if (device.isInner(m)) {
        share[LAYERS + device.layer(m)] = booked[slots.in(m)];
      }
    }
    share[TRANSMITTED] = booked[slots.in(device.mediaCount() - 1)];
    for (int table : angles.at().get(w)) {
      collectFilms(w, table, share);
    }
  }

  private void collectFilms(int w, int index, double[] share) {
    Angles.Table table = angles.tables().get(index);
    List<Integer> films = device.boundaries().get(table.boundary()).films();
    Arrays.fill(staying, 0);
    FilmSums.add(
        met,
        2 * table.first(),
        2 * table.cosines().length,
        coatings.absorbed[index][w],
        films.size() + 1,
        staying);
    for (int f = 0; f < films.size(); f++) {
      share[LAYERS + films.get(f)] += staying[f];
    }
    int medium = table.boundary() + (table.fromBelow() ? 1 : 0);
    if (device.isInner(medium)) {
      share[LAYERS + device.layer(medium)] += staying[films.size()];
    }
  }

  @Override
  public void close() {
    coatings.close();
  }
}
