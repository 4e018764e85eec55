package evensun.search.problem;

import java.util.ArrayList;
import java.util.List;

/**
 * The first of several aims while every other one must not become worse than it is in some design:
 * the further aims turn into limits, behind those of the objective. A verdict still tells all aims.
 */
public final class KeptAims implements Objective {

  private final Objective inner;
  private final List<Double> floors;

  /**
   * An objective for the surroundings of a design.
   *
   * @param inner with one aim or several
   * @param at the design; it could be evaluated
   */
  public KeptAims(Objective inner, Verdict at) {
    this.inner = inner;
    floors = at.aims().subList(1, at.aims().size());
  }

  @Override
  public List<Variable> variables() {
    return inner.variables();
  }

  @Override
  public List<String> aims() {
    return inner.aims();
  }

  @Override
  public List<String> limits() {
    List<String> limits = new ArrayList<>(inner.limits());
    inner.aims().stream().skip(1).forEach(aim -> limits.add(aim + " as good as here"));
    return limits;
  }

  @Override
  public double tieResolution() {
    return inner.tieResolution();
  }

  @Override
  public Worker newWorker() {
    return on(inner.newWorker());
  }

  /** This objective on a worker of the inner one. */
  public Worker on(Worker worker) {
    return new KeptWorker(worker);
  }

  /** A verdict of the inner objective as one of this. */
  public Verdict kept(Verdict verdict) {
    if (verdict.isFailure()) {
      return verdict;
    }
    List<Double> slacks = new ArrayList<>(verdict.slacks());
    double violation = verdict.violation();
    for (int i = 0; i < floors.size(); i++) {
      double scale = Math.max(1e-6, Math.abs(floors.get(i)));
      double slack = (verdict.aims().get(i + 1) - floors.get(i)) / scale;
      slacks.add(slack);
      violation += Math.max(0, -slack);
    }
    return new Verdict(verdict.aims(), verdict.tieBreak(), violation, slacks, "");
  }

  /** A verdict of this objective as one of the inner one. */
  public Verdict released(Verdict verdict) {
    if (verdict.isFailure()) {
      return verdict;
    }
    int own = inner.limits().size();
    List<Double> slacks = verdict.slacks();
    double broken =
        slacks.subList(own, slacks.size()).stream().mapToDouble(s -> Math.max(0, -s)).sum();
    double violation = broken == 0 ? verdict.violation() : verdict.violation() - broken;
    return new Verdict(
        verdict.aims(), verdict.tieBreak(), Math.max(0, violation), slacks.subList(0, own), "");
  }

  private final class KeptWorker implements Worker {

    private final Worker worker;

    KeptWorker(Worker worker) {
      this.worker = worker;
    }

    @Override
    public Verdict judge(double[] values) {
      return kept(worker.judge(values));
    }

    @Override
    public boolean parts(double[] values, double[] parts, double[][] gradient) {
      return worker.parts(values, parts, gradient);
    }

    @Override
    public int partCount() {
      return worker.partCount();
    }

    @Override
    public void close() {
      worker.close();
    }
  }
}
