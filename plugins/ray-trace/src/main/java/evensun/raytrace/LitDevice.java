package evensun.raytrace;

import evensun.raytrace.kernel.Attenuation;
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

/** One traced beam with coatings: where the light of a design goes. Owned by one thread. */
final class LitDevice implements AutoCloseable {

  /** First rows of {@link #shares}: reflected, transmitted, then the layers. */
  static final int REFLECTED = 0;

  static final int TRANSMITTED = 1;
  static final int LAYERS = 2;

  /**
   * [replicate][row][w] shares of the light before they are made to add up to one; where replicates
   * were not told apart, those of all stand in the first.
   */
  final double[][][] shares;

  /** [replicate][deepest medium][w] light that left at the top. */
  final double[][][] top;

  private final Problem problem;
  private final Traces.Traced traced;
  private final Device device;
  private final Forest forest;
  private final Angles angles;
  private final Slots slots;
  private final Coatings coatings;
  private final Weighing weighing = new Weighing();
  private final Attenuation[] attenuation; // [w]
  private final double[] absorbedFor; // [m] thickness in µm
  private final double[] alpha; // [m] per µm
  private final double[] booked;
  private final double[] met;

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
    shares = new double[replicates][LAYERS + problem.layerCount()][wavelengths];
    top = new double[replicates][device.mediaCount()][wavelengths];
    attenuation = forest.trees().stream().map(Attenuation::new).toArray(Attenuation[]::new);
    alpha = new double[device.mediaCount()];
    absorbedFor = new double[device.mediaCount()];
    Arrays.fill(absorbedFor, Double.NaN);
    booked = new double[slots.count()];
    met = new double[2 * (angles.count() + 1)];
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
      for (int w = 0; w < attenuation.length; w++) {
        pass(design, w);
      }
    }
  }

  private void pass(Design design, int w) {
    LightTree tree = forest.trees().get(w);
    fillAlphaPerUm(design, w);
    float[] absorbed = attenuation[w].absorbed;
    for (int leg = 0; leg < absorbed.length; leg++) {
      absorbed[leg] = (float) absorbed(tree, leg);
    }
    attenuation[w].settle(tree);
  }

  private double absorbed(LightTree tree, int leg) {
    double length = tree.fixedUm[leg];
    if (length == Double.POSITIVE_INFINITY) {
      return 1;
    }
    int medium = tree.slot[leg] - 1;
    return -Math.expm1(-alpha[medium] * (length + tree.perThickness[leg] * absorbedFor[medium]));
  }

  /** 0 in the incident medium. */
  private void fillAlphaPerUm(Design design, int w) {
    for (int m = 1; m < alpha.length; m++) {
      alpha[m] = alphaPerUm(design, m, w);
    }
  }

  /** Absorption coefficient of a medium per µm. */
  double alphaPerUm(Design design, int medium, int w) {
    double k = design.k[device.material(design, medium)][w];
    return 4 * Math.PI * k * 1000 / problem.wavelengthNm().at(w);
  }

  /** Follows the light of all wavelengths, replicate by replicate. */
  void solve(Polarisation polarisation) {
    int replicates = forest.replicates();
    for (int r = 0; r < replicates; r++) {
      solve(polarisation, r, r + 1);
    }
  }

  /** Follows the light of all wavelengths without telling replicates apart. */
  void solveTogether(Polarisation polarisation) {
    solve(polarisation, 0, forest.replicates());
  }

  private void solve(Polarisation polarisation, int from, int to) {
    double s = polarisation == Polarisation.S ? 1 : polarisation == Polarisation.P ? 0 : 0.5;
    for (double[] row : shares[from]) {
      Arrays.fill(row, 0);
    }
    for (int w = 0; w < attenuation.length; w++) {
      LightTree tree = forest.trees().get(w);
      double rayPower = 1.0 / (tree.rays * (to - from));
      double inS = s * rayPower;
      follow(w, tree.start[from], tree.start[to], inS, rayPower - inS, attenuation[w]);
      collect(w, shares[from], top[from]);
      coatings.keep(w, met);
    }
    coatings.addStaying(shares[from]);
  }

  /**
   * Follows the light of one wavelength and replicate; its legs can be read from {@link
   * #weighing()}.
   *
   * @param s power of every ray in s
   * @param p power of every ray in p
   * @param other what stays on the ways, as here or otherwise
   */
  void follow(int w, int r, double s, double p, Attenuation other) {
    int[] start = forest.trees().get(w).start;
    follow(w, start[r], start[r + 1], s, p, other);
  }

  private void follow(int w, int from, int to, double s, double p, Attenuation other) {
    Arrays.fill(booked, 0);
    Arrays.fill(met, 0);
    weighing.follow(
        forest.trees().get(w),
        angles.nodes().get(w),
        from,
        to,
        coatings.coating[w],
        other,
        s,
        p,
        booked,
        met);
  }

  Weighing weighing() {
    return weighing;
  }

  /** What stays on the ways of a wavelength. */
  Attenuation attenuation(int w) {
    return attenuation[w];
  }

  private void collect(int w, double[][] share, double[][] topShare) {
    for (int m = 0; m < device.mediaCount(); m++) {
      topShare[m][w] = booked[slots.top(m)];
      share[REFLECTED][w] += topShare[m][w];
      if (device.isInner(m)) {
        share[LAYERS + device.layer(m)][w] = booked[slots.in(m)];
      }
    }
    share[TRANSMITTED][w] = booked[slots.in(device.mediaCount() - 1)];
  }

  @Override
  public void close() {
    coatings.close();
  }
}
