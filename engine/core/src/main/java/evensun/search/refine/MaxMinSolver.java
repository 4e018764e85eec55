package evensun.search.refine;

import evensun.search.problem.Numbers;
import java.util.Arrays;

/**
 * Climbs to a local optimum of a {@link MaxMinModel} by sequential linear programming: within a
 * small box the functions are replaced by their tangents, the best point of the box follows from a
 * linear program, and the box grows or shrinks with how well it was predicted. The kink at which
 * another function becomes the smallest is thereby no obstacle (Madsen, J. Inst. Math. Appl. 16,
 * 321 (1975)). Once the curvature is known, {@link CurvedStep} bends the step.
 */
public final class MaxMinSolver {

  private final MaxMinModel model;
  private final LinearStep linear;
  private final CurvedStep curved;
  private Sample here;
  private double radius;

  /**
   * A climb from a point.
   *
   * @param penalty what one unit below zero of a function to be kept costs
   */
  public MaxMinSolver(MaxMinModel model, double[] start, double radius, double penalty) {
    this.model = model;
    this.radius = radius;
    linear = new LinearStep(model.size(), model.wanted(), model.kept(), penalty);
    curved = new CurvedStep(model.size(), model.wanted(), model.kept());
    here = sample(start.clone());
  }

  /**
   * Climbs and returns the best point.
   *
   * @param steps largest number of steps
   * @param smallest radius below which it ends
   */
  public double[] climb(int steps, double smallest) {
    for (int i = 0; i < steps && here.usable && radius > smallest; i++) {
      step();
    }
    return here.point;
  }

  private void step() {
    double[] straight = linear.best(here.point, here.rows, here.gradient, radius);
    if (!isWorthwhile(linear.gain())) {
      radius = 0;
      return;
    }
    double[] tangents = linear.tangents(straight, here.point, here.rows, here.gradient);
    double[] bent = curved.best(here.point, here.rows, here.gradient, straight, tangents);
    double[] target = bent == null ? straight : shortened(bent);
    double predicted = predicted(target);
    if (!isWorthwhile(predicted)) {
      target = bent == null ? halfWay(straight) : straight;
      predicted = linear.gain();
    }
    move(sample(target), predicted);
  }

  private boolean isWorthwhile(double gain) {
    return gain > 1e-10 * Math.max(1, Math.abs(here.merit));
  }

  private double predicted(double[] target) {
    double[] tangents = linear.tangents(target, here.point, here.rows, here.gradient);
    return linear.merit(tangents) - here.merit - curved.bend(here.point, target);
  }

  private double[] halfWay(double[] target) {
    double[] half = target.clone();
    for (int j = 0; j < half.length; j++) {
      half[j] = (half[j] + here.point[j]) / 2;
    }
    return half;
  }

  /** Not farther than the radius, and inside the whole box. */
  private double[] shortened(double[] target) {
    double share = Math.min(1, radius / Math.max(1e-300, Numbers.distance(target, here.point)));
    double[] inside = new double[target.length];
    for (int j = 0; j < inside.length; j++) {
      double moved = here.point[j] + share * (target[j] - here.point[j]);
      inside[j] = Math.min(1, Math.max(0, moved));
    }
    return inside;
  }

  private void move(Sample there, double predicted) {
    double ratio = there.usable ? (there.merit - here.merit) / predicted : -1;
    double length = Numbers.distance(there.point, here.point);
    if (there.usable) {
      curved.learn(here.point, there.point, here.gradient, there.gradient);
    }
    if (ratio > 0.05) {
      here = there;
    }
    radius =
        ratio > 0.7
            ? Math.min(0.5, Math.max(radius, 2 * length))
            : ratio < 0.3 ? 0.4 * length : radius;
  }

  private Sample sample(double[] point) {
    int rows = model.wanted() + model.kept();
    Sample sample = new Sample(point, new double[rows], new double[rows][model.size()]);
    sample.usable = model.at(point, sample.rows, sample.gradient) && sample.isFinite();
    sample.merit = linear.merit(sample.rows);
    return sample;
  }

  private static final class Sample {
    final double[] point;
    final double[] rows;
    final double[][] gradient;
    double merit;
    boolean usable;

    Sample(double[] point, double[] rows, double[][] gradient) {
      this.point = point;
      this.rows = rows;
      this.gradient = gradient;
    }

    boolean isFinite() {
      return Arrays.stream(rows).allMatch(Double::isFinite)
          && Arrays.stream(gradient).flatMapToDouble(Arrays::stream).allMatch(Double::isFinite);
    }
  }
}
