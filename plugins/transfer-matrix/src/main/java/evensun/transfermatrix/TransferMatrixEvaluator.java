package evensun.transfermatrix;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Incidence;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.transfermatrix.kernel.Beam;
import evensun.transfermatrix.kernel.FastKernel;
import evensun.transfermatrix.kernel.Kernel;
import evensun.transfermatrix.kernel.Layout;
import evensun.transfermatrix.kernel.RowSums;
import evensun.transfermatrix.kernel.Spectra;
import evensun.transfermatrix.kernel.Weights;
import evensun.transfermatrix.kernel.reference.ReferenceKernel;
import java.util.Arrays;
import java.util.Optional;

/** Answers designs with a kernel of its own; allocates nothing with the fast kernel. */
final class TransferMatrixEvaluator implements Evaluator, Gradient, DepthProfile {

  /** Kernels keep what the materials decide for one beam; long angular tables share one kernel. */
  private static final int MOST_KERNELS = 16;

  private final Problem problem;
  private final int layers;
  private final int wavelengths;
  private final Stack stack;
  private final Incidence[] incidences;
  private final Beam[] beams;
  private final Kernel[] kernels; // [i] one per incidence, the last for all further ones
  private final boolean differentiable;
  private final Spectra rows;
  private Weights weights; // made when the first gradient is asked for
  private final double[] transmittance;
  private final double[][] absorptance;

  TransferMatrixEvaluator(Problem problem, Options.KernelKind kind) {
    this.problem = problem;
    layers = problem.layerCount();
    wavelengths = problem.wavelengthCount();
    stack = new Stack(problem);
    incidences = problem.incidences().toArray(new Incidence[0]);
    beams = Arrays.stream(incidences).map(Stack::beam).toArray(Beam[]::new);
    kernels = kernels(kind);
    differentiable = kind == Options.KernelKind.FAST;
    rows = new Spectra(layers);
    transmittance = new double[wavelengths];
    absorptance = new double[layers][wavelengths];
  }

  private Kernel[] kernels(Options.KernelKind kind) {
    Kernel[] owned = new Kernel[Math.min(incidences.length, MOST_KERNELS)];
    double[] nm = problem.wavelengthNm().toArray();
    Arrays.setAll(
        owned,
        i ->
            kind == Options.KernelKind.REFERENCE
                ? new ReferenceKernel(nm)
                : new FastKernel(nm, stack.coherent(), problem.materialCount()));
    return owned;
  }

  private Kernel kernel(int incidence) {
    return kernels[Math.min(incidence, kernels.length - 1)];
  }

  @Override
  public void evaluate(Design design, Response into) {
    stack.check(design);
    solveFrom(0, design, into);
  }

  /**
   * {@inheritDoc}
   *
   * <p>The derivative by a coherent layer of zero thickness is that from above; an incoherent one
   * appears at once, so its derivative is given as 0.
   */
  @Override
  public void evaluate(Design design, Response response, double[] into) {
    if (response.sum == null) {
      throw new IllegalArgumentException("a gradient needs a response that wants sums");
    }
    stack.check(design);
    want(response, 0);
    clearAbsent(design);
    setWeights(response);
    ((FastKernel) kernel(0))
        .differentiate(
            stack.layout(design, incidences[0].side(), true),
            beams[0],
            design.n,
            design.k,
            design.revision,
            rows,
            weights,
            into);
    sum(response);
    solveFrom(1, design, response);
  }

  private void setWeights(Response response) {
    int sums = response.sum.length;
    if (weights == null || weights.sums != sums) {
      weights = new Weights(sums, layers);
    }
    for (int s = 0; s < sums; s++) {
      for (int l = 0; l < layers; l++) {
        weights.absorptance[s][l] = row(response.weight, s * layers + l);
      }
      weights.transmittance[s] = row(response.transmittanceWeight, s);
    }
  }

  private void solveFrom(int first, Design design, Response into) {
    for (int i = first; i < incidences.length; i++) {
      want(into, i);
      if (wantsAnything()) {
        Layout layout = stack.layout(design, incidences[i].side(), false);
        clearAbsent(design);
        kernel(i).solve(layout, beams[i], design.n, design.k, design.revision, rows);
      }
      if (i == 0 && into.sum != null) {
        sum(into);
      }
    }
    if (into.sumStandardError != null) {
      Arrays.fill(into.sumStandardError, 0);
    }
  }

  /** Collects the rows of an incidence; for the first one also those that only sums need. */
  private void want(Response into, int i) {
    rows.reflectance = row(into.reflectance, i);
    rows.transmittance = row(into.transmittance, i);
    for (int l = 0; l < layers; l++) {
      rows.absorptance[l] = row(into.absorptance, i * layers + l);
    }
    if (i == 0 && into.sum != null) {
      wantWeighted(into);
    }
  }

  private void wantWeighted(Response into) {
    for (int s = 0; s < into.sum.length; s++) {
      for (int l = 0; l < layers; l++) {
        if (rows.absorptance[l] == null && row(into.weight, s * layers + l) != null) {
          rows.absorptance[l] = absorptance[l];
        }
      }
      if (rows.transmittance == null && row(into.transmittanceWeight, s) != null) {
        rows.transmittance = transmittance;
      }
    }
  }

  private static double[] row(double[][] rows, int index) {
    return rows == null ? null : rows[index];
  }

  private boolean wantsAnything() {
    boolean any = rows.reflectance != null || rows.transmittance != null;
    for (int l = 0; l < layers && !any; l++) {
      any = rows.absorptance[l] != null;
    }
    return any;
  }

  private void clearAbsent(Design design) {
    for (int l = 0; l < layers; l++) {
      if (design.thicknessNm[l] == 0 && rows.absorptance[l] != null) {
        Arrays.fill(rows.absorptance[l], 0);
      }
    }
  }

  private void sum(Response into) {
    for (int s = 0; s < into.sum.length; s++) {
      double total = dot(row(into.transmittanceWeight, s), rows.transmittance);
      for (int l = 0; l < layers; l++) {
        total += dot(row(into.weight, s * layers + l), rows.absorptance[l]);
      }
      into.sum[s] = total;
    }
  }

  private static double dot(double[] weight, double[] values) {
    return weight == null ? 0 : RowSums.dot(weight, values);
  }

  @Override
  public void evaluate(
      Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    stack.check(design);
    double thicknessNm = design.thicknessNm[channel.layer()];
    boolean front = incidences[incidence].side() == Side.FRONT;
    Layout layout = stack.layout(design, incidences[incidence].side(), false);
    double[] fromLight = depthNm.clone();
    for (int z = 0; z < depthNm.length; z++) {
      requireInside(depthNm[z], thicknessNm);
      fromLight[z] = front ? depthNm[z] : thicknessNm - depthNm[z];
      Arrays.fill(into[z], 0, wavelengths, 0);
    }
    for (int j = 1; j <= layout.layerCount; j++) {
      if (layout.layer[j] == channel.layer()) {
        new ReferenceKernel(problem.wavelengthNm().toArray())
            .depth(layout, beams[incidence], design.n, design.k, j, fromLight, into);
      }
    }
  }

  private static void requireInside(double depthNm, double thicknessNm) {
    if (!(depthNm >= 0 && depthNm <= thicknessNm)) {
      throw new IllegalArgumentException(
          "depthNm must be in [0, " + thicknessNm + "] nm but was " + depthNm);
    }
  }

  @Override
  public <A> Optional<A> ability(Class<A> type) {
    boolean offered = type == DepthProfile.class || (type == Gradient.class && differentiable);
    return offered ? Optional.of(type.cast(this)) : Optional.empty();
  }
}
