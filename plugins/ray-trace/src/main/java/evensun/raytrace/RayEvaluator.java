package evensun.raytrace;

import evensun.raytrace.trace.Beam;
import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Problem;
import evensun.spi.RaySection;
import evensun.spi.ReflectanceParts;
import evensun.spi.Response;
import evensun.spi.Services;
import evensun.spi.Side;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Answers designs by re-weighting what rays do. */
final class RayEvaluator implements Evaluator, ReflectanceParts, DepthProfile, RaySection {

  private final Problem problem;
  private final Services services;
  private final Traces traces;
  private final DesignCheck check;
  private final Map<Traces.Traced, LitDevice> devices = new LinkedHashMap<>(16, 0.75f, true);
  private final Estimate estimate;
  private final Beam[] beams; // [i]
  private final Stamp stamp;
  private LitDevice last; // the device that the stamp is of

  RayEvaluator(Problem problem, Services services, Traces traces) {
    this.problem = problem;
    this.services = services;
    this.traces = traces;
    check = new DesignCheck(problem);
    stamp = new Stamp(problem);
    beams = problem.incidences().stream().map(Beam::of).toArray(Beam[]::new);
    int rows = LitDevice.LAYERS + problem.layerCount();
    estimate = new Estimate(rows, problem.wavelengthCount(), Options.REPLICATES);
  }

  @Override
  public void evaluate(Design design, Response into) {
    check.check(design);
    boolean errors = into.sumStandardError != null || into.absorptanceStandardError != null;
    for (int i = 0; i < beams.length; i++) {
      solve(ready(design, beams[i]), problem.incidences().get(i), errors);
      Rows.write(i, estimate.mean, estimate.error, into);
      if (i == 0 && into.sum != null) {
        sum(into);
      }
    }
  }

  /** The device of a design and a beam with its coatings. */
  LitDevice ready(Design design, Beam beam) {
    if (last == null || !stamp.matches(design, beam)) {
      last = device(traces.of(design, beam));
      stamp.take(design, beam);
    }
    check.checkFit(design, last.traced().device(), last.traced().faces());
    last.prepare(design);
    return last;
  }

  private LitDevice device(Traces.Traced traced) {
    LitDevice lit = devices.get(traced);
    if (lit == null) {
      lit = new LitDevice(problem, traced, services);
      devices.put(traced, lit);
      forgetOldest();
    }
    return lit;
  }

  private void forgetOldest() {
    Iterator<LitDevice> oldest = devices.values().iterator();
    while (devices.size() > Traces.MOST_KEPT && oldest.hasNext()) {
      oldest.next().close();
      oldest.remove();
    }
  }

  private void solve(LitDevice lit, Incidence incidence, boolean errors) {
    if (errors) {
      lit.solve(incidence.polarisation());
      estimate.take(lit.shares);
    } else {
      lit.solveTogether(incidence.polarisation());
      estimate.takeTogether(lit.shares);
    }
    if (incidence.side() == Side.REAR) {
      swapOuterRows();
    }
  }

  private void swapOuterRows() {
    swap(estimate.mean);
    swap(estimate.error);
    for (double[][] rows : estimate.replicate) {
      swap(rows);
    }
  }

  private static void swap(double[][] rows) {
    double[] first = rows[LitDevice.REFLECTED];
    rows[LitDevice.REFLECTED] = rows[LitDevice.TRANSMITTED];
    rows[LitDevice.TRANSMITTED] = first;
  }

  private void sum(Response into) {
    for (int s = 0; s < into.sum.length; s++) {
      into.sum[s] = Rows.sum(s, estimate.mean, into);
      if (into.sumStandardError != null) {
        into.sumStandardError[s] = error(s, into);
      }
    }
  }

  private double error(int sum, Response into) {
    double squares = 0;
    for (double[][] rows : estimate.replicate) {
      double off = Rows.sum(sum, rows, into) - into.sum[sum];
      squares += off * off;
    }
    int count = estimate.replicate.length;
    return Math.sqrt(squares / (count * (count - 1.0)));
  }

  /** Solves one incidence; the estimate is valid until the next call. */
  Estimate estimate(Design design, int incidence) {
    check.check(design);
    Incidence light = problem.incidences().get(incidence);
    solve(ready(design, beams[incidence]), light, true);
    return estimate;
  }

  @Override
  public void evaluate(Design design, int incidence, double[] neverEntered, double[] cameBack) {
    Incidence light = problem.incidences().get(incidence);
    Estimate found = estimate(design, incidence);
    LitDevice lit = ready(design, beams[incidence]);
    int absorber = Absorber.first(problem, lit.traced().device(), design);
    for (int w = 0; w < neverEntered.length; w++) {
      double never = 0;
      double all = 0;
      for (double[][] top : lit.top) {
        for (int m = 0; m < top.length; m++) {
          never += m < absorber ? top[m][w] : 0;
          all += top[m][w];
        }
      }
      double reflected = found.mean[LitDevice.REFLECTED][w];
      neverEntered[w] = all == 0 ? 0 : reflected * never / all;
      cameBack[w] = Math.max(0, reflected - neverEntered[w]);
    }
  }

  /**
   * {@inheritDoc}
   *
   * @throws EvaluationFailed for a film, of which rays know the whole alone
   */
  @Override
  public void evaluate(
      Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    if (problem.layers().get(channel.layer()).coherent()) {
      throw new EvaluationFailed(
          "solver ray-trace knows how much light layer \"%s\" absorbs, but not where in it; ask for thick layers"
              .formatted(problem.layers().get(channel.layer()).name()));
    }
    Incidence light = problem.incidences().get(incidence);
    double[] whole = estimate(design, incidence).mean[LitDevice.LAYERS + channel.layer()];
    LitDevice lit = ready(design, beams[incidence]);
    int medium = lit.traced().device().medium(channel.layer());
    Profile profile = medium < 0 ? null : new Profile(lit, design, medium, depthNm);
    for (int w = 0; w < whole.length; w++) {
      if (profile == null) {
        for (double[] row : into) {
          row[w] = 0;
        }
      } else {
        profile.solve(design, light.polarisation(), w, whole[w], into);
      }
    }
  }

  @Override
  public View view(Design design, int incidence, int wavelength, int rayCount) {
    check.check(design);
    return Section.of(problem, ready(design, beams[incidence]).traced(), design, services)
        .view(beams[incidence], wavelength, rayCount);
  }

  @Override
  public <A> Optional<A> ability(Class<A> type) {
    boolean offered =
        type == ReflectanceParts.class || type == DepthProfile.class || type == RaySection.class;
    return offered ? Optional.of(type.cast(this)) : Optional.empty();
  }

  @Override
  public void close() {
    devices.values().forEach(LitDevice::close);
  }
}
