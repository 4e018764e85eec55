package evensun.testkit;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Response;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/** Intensities by the adding method, one wavelength after another; readable rather than quick. */
final class TwoBeamEvaluator implements Evaluator {

  private final Problem problem;
  private final Flaw flaw;
  private final int layers;
  private final double angleDeg;
  private double[][] down;
  private double[][] up;
  private double memory;

  TwoBeamEvaluator(Problem problem, Flaw flaw) {
    this.problem = problem;
    this.flaw = flaw;
    layers = problem.layerCount();
    double asked = problem.incidences().get(0).angleDeg();
    angleDeg = flaw == Flaw.KNOWS_NO_GRAZING_LIGHT ? Math.min(asked, 88) : asked;
    down = new double[layers][problem.wavelengthCount()];
    up = new double[layers][problem.wavelengthCount()];
  }

  @Override
  public void evaluate(Design design, Response into) {
    misbehave(design);
    double[] r = new double[problem.wavelengthCount()];
    double[] t = new double[problem.wavelengthCount()];
    double[][] a = new double[layers][problem.wavelengthCount()];
    for (int w = 0; w < r.length; w++) {
      wavelength(design, w, r, t, a);
    }
    spoil(design, r, t, a);
    write(into, r, t, a);
  }

  private void wavelength(Design design, int w, double[] r, double[] t, double[][] a) {
    Polarisation asked = problem.incidences().get(0).polarisation();
    boolean both = asked == Polarisation.UNPOLARISED && flaw != Flaw.TAKES_UNPOLARISED_FOR_S;
    for (int l = 0; l < layers; l++) {
      down[l][w] = 0;
      up[l][w] = 0;
    }
    if (both) {
      beams(design, w, true, 0.5, r, t, a);
      beams(design, w, false, 0.5, r, t, a);
    } else {
      beams(design, w, asked != Polarisation.P, 1, r, t, a);
    }
  }

  /** Adds one polarisation's share. */
  private void beams(
      Design d, int w, boolean s, double share, double[] r, double[] t, double[][] a) {
    int[] present = present(d);
    int faces = present.length + 1;
    double[] reflected = new double[faces];
    double[] below = new double[faces + 1];
    double[] pass = new double[faces + 1];
    for (int j = faces - 1; j >= 0; j--) {
      int lower = j == faces - 1 ? -1 : present[j];
      pass[j + 1] = lower < 0 ? 0 : pass(d, lower, w);
      reflected[j] =
          face(
              d,
              w,
              s,
              j == 0 ? problem.incidentMaterial() : d.material[present[j - 1]],
              lower < 0 ? problem.exitMaterial() : d.material[lower]);
      double round = pass[j + 1] * pass[j + 1] * below[j + 1];
      double through = (1 - reflected[j]) * (1 - reflected[j]);
      below[j] =
          reflected[j]
              + (round == 0 || through == 0 ? 0 : through * round / (1 - reflected[j] * round));
    }
    r[w] += share * below[0];
    double incoming = share;
    for (int j = 0; j < faces; j++) {
      double round = pass[j + 1] * pass[j + 1] * below[j + 1];
      // Behind total reflection there is no light, and nothing to divide by either.
      double entering =
          reflected[j] == 1 ? 0 : (1 - reflected[j]) * incoming / (1 - reflected[j] * round);
      if (j == faces - 1) {
        t[w] += entering;
      } else {
        double returning = entering * pass[j + 1] * below[j + 1];
        down[present[j]][w] += entering;
        up[present[j]][w] += returning;
        a[present[j]][w] += (entering + returning) * (1 - pass[j + 1]);
        incoming = entering * pass[j + 1];
      }
    }
  }

  private int[] present(Design d) {
    List<Integer> found = new ArrayList<>();
    for (int l = 0; l < layers; l++) {
      if (d.thicknessNm[l] != 0 || flaw == Flaw.KEEPS_ABSENT_LAYERS) {
        found.add(l);
      }
    }
    return found.stream().mapToInt(i -> i).toArray();
  }

  private double pass(Design d, int layer, int w) {
    double thicknessNm = d.thicknessNm[layer];
    if (flaw == Flaw.CLIPS_THICKNESS) {
      thicknessNm = Math.min(thicknessNm, 50);
    }
    if (problem.layers().get(layer).features().stream().anyMatch(flaw::mistakes)) {
      thicknessNm *= 1.5;
    }
    if (flaw == Flaw.TAKES_NAN_FOR_ZERO && Double.isNaN(thicknessNm)) {
      thicknessNm = 0;
    }
    return Math.exp(-perNm(d, layer, w) * thicknessNm);
  }

  private double perNm(Design d, int layer, int w) {
    int m = d.material[layer];
    if (d.k[m][w] == 0) {
      // Keeps a NaN.
      return 0 * d.n[m][w];
    }
    return 4 * Math.PI / problem.wavelengthNm().at(w) * normal(d, m, w)[1];
  }

  /** sqrt(N² − n0² sin²θ) of a medium. */
  private double[] normal(Design d, int m, int w) {
    double sin = d.n[problem.incidentMaterial()][w] * Math.sin(Math.toRadians(angleDeg));
    double n = d.n[m][w];
    double k = d.k[m][w];
    double real = n * n - k * k - sin * sin;
    double size = Math.hypot(real, 2 * n * k);
    double root = Math.sqrt((size + Math.abs(real)) / 2);
    double other = root == 0 ? 0 : n * k / root;
    return real >= 0 ? new double[] {root, other} : new double[] {other, root};
  }

  /** |difference / sum|² of N²-weighted (p) or plain (s) normal components. */
  private double face(Design d, int w, boolean s, int upper, int lower) {
    double[] a = normal(d, upper, w);
    double[] b = normal(d, lower, w);
    if (!s) {
      double[] up = times(a, square(d, lower, w));
      b = times(b, square(d, upper, w));
      a = up;
    }
    double top = Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2);
    double bottom = Math.pow(a[0] + b[0], 2) + Math.pow(a[1] + b[1], 2);
    return top / bottom;
  }

  private static double[] square(Design d, int m, int w) {
    double n = d.n[m][w];
    double k = d.k[m][w];
    return new double[] {n * n - k * k, 2 * n * k};
  }

  private static double[] times(double[] a, double[] b) {
    return new double[] {a[0] * b[0] - a[1] * b[1], a[0] * b[1] + a[1] * b[0]};
  }

  private void write(Response into, double[] r, double[] t, double[][] a) {
    if (flaw == Flaw.REPLACES_ROWS && into.reflectance != null) {
      into.reflectance[0] = r;
    }
    copy(r, into.reflectance, 0);
    copy(t, into.transmittance, 0);
    for (int l = 0; l < layers; l++) {
      copy(a[l], into.absorptance, l);
    }
    if (flaw == Flaw.SUMS_ONLY_WITH_ERRORS && into.sumStandardError == null) {
      return;
    }
    for (int s = 0; into.sum != null && s < into.sum.length; s++) {
      double sum = flaw == Flaw.ADDS_TO_OLD_SUMS ? into.sum[s] : 0;
      for (int l = 0; l < layers; l++) {
        sum += product(into.weight[s * layers + l], a[l]);
      }
      if (flaw != Flaw.FORGETS_WHAT_IS_TRANSMITTED && into.transmittanceWeight != null) {
        sum += product(into.transmittanceWeight[s], t);
      }
      into.sum[s] = sum;
    }
  }

  private static void copy(double[] row, double[][] into, int index) {
    if (into != null && into[index] != null) {
      System.arraycopy(row, 0, into[index], 0, row.length);
    }
  }

  private static double product(double[] weight, double[] row) {
    double sum = 0;
    for (int w = 0; weight != null && w < row.length; w++) {
      sum += weight[w] * row[w];
    }
    return sum;
  }

  /** Flaws that show before the calculation. */
  private void misbehave(Design design) {
    switch (flaw) {
      case WRITES_TO_THE_DESIGN -> {
        if (layers > 0) {
          design.thicknessNm[0] = Math.rint(design.thicknessNm[0]) + 1;
        }
      }
      case HANGS -> {
        while (layers > 0 && Double.isNaN(design.thicknessNm[0])) {
          Thread.onSpinWait();
        }
      }
      case THROWS -> throw new ArrayIndexOutOfBoundsException("7");
      default -> {}
    }
  }

  /** Flaws of the result. */
  private void spoil(Design design, double[] r, double[] t, double[][] a) {
    for (int w = 0; w < r.length; w++) {
      switch (flaw) {
        case MAKES_LIGHT -> r[w] *= 1.001;
        case REFLECTS_TOO_MUCH -> move(t, r, w, 0.01);
        case JUMPS_OFF_THE_NORMAL -> move(t, r, w, angleDeg > 0 && angleDeg < 1 ? 0.1 : 0);
        case PREFERS_A_DIRECTION ->
            move(t, r, w, layers > 0 && design.n[0][w] < design.n[1][w] ? 0.1 : 0);
        case ABSORBS_IN_TRANSPARENT_LAYERS -> {
          if (layers > 0) {
            move(t, a[0], w, 1e-3);
          }
        }
        case REMEMBERS -> move(t, r, w, memory);
        default -> {}
      }
    }
    if (flaw == Flaw.SMOOTHS_OVER_WAVELENGTHS) {
      smooth(r);
      smooth(t);
      for (double[] row : a) {
        smooth(row);
      }
    }
    if (flaw == Flaw.SHARES_A_WORKSPACE) {
      // Long enough for another thread to write to the same row.
      down[0][0] = design.thicknessNm[0];
      pause();
      move(t, r, 0, down[0][0] == design.thicknessNm[0] ? 0 : 0.5);
    }
    memory = layers > 0 ? 1e-3 * design.thicknessNm[0] / 300_000 : 0;
  }

  private static void pause() {
    try {
      Thread.sleep(1);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void move(double[] from, double[] to, int w, double share) {
    to[w] += share * from[w];
    from[w] -= share * from[w];
  }

  private static void smooth(double[] row) {
    for (int w = row.length - 1; w > 0; w--) {
      row[w] = (row[w] + row[w - 1]) / 2;
    }
  }

  @Override
  public void evaluateAll(List<Design> designs, List<Response> into) {
    List<Response> order = new ArrayList<>(into);
    if (flaw == Flaw.SHUFFLES_A_BATCH) {
      Collections.reverse(order);
    }
    for (int i = 0; i < designs.size(); i++) {
      evaluate(designs.get(i), order.get(i));
    }
  }

  @Override
  public <A> Optional<A> ability(Class<A> type) {
    if (type == Gradient.class) {
      return Optional.of(type.cast((Gradient) this::slopes));
    }
    return type == DepthProfile.class
        ? Optional.of(type.cast((DepthProfile) this::profile))
        : Optional.empty();
  }

  /** By a difference of fourth order. */
  private void slopes(Design design, Response response, double[] into) {
    double stepNm = 0.1;
    Design moved = Design.of(problem);
    moved.copyFrom(design);
    double[] weights = {1.0 / 12, -8.0 / 12, 8.0 / 12, -1.0 / 12};
    double[] at = {-2, -1, 1, 2};
    java.util.Arrays.fill(into, 0);
    for (int l = 0; l < layers; l++) {
      for (int i = 0; i < at.length; i++) {
        moved.thicknessNm[l] = design.thicknessNm[l] + at[i] * stepNm;
        evaluate(moved, response);
        for (int s = 0; s < response.sum.length; s++) {
          into[s * layers + l] += weights[i] * response.sum[s] / stepNm;
        }
      }
      moved.thicknessNm[l] = design.thicknessNm[l];
    }
    if (flaw == Flaw.HAS_WRONG_SLOPES && layers > 0) {
      into[0] *= 1.001;
    }
    evaluate(design, response);
  }

  private void profile(
      Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    evaluate(design, new Response());
    int l = channel.layer();
    for (int z = 0; z < depthNm.length; z++) {
      for (int w = 0; w < problem.wavelengthCount(); w++) {
        double perNm = perNm(design, l, w);
        double left = design.thicknessNm[l] - depthNm[z];
        into[z][w] =
            perNm
                * (down[l][w] * Math.exp(-perNm * depthNm[z]) + up[l][w] * Math.exp(-perNm * left));
        if (flaw == Flaw.HALVES_THE_DEPTH_PROFILE) {
          into[z][w] /= 2;
        }
      }
    }
  }
}
