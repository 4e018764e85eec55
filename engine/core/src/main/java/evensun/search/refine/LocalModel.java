package evensun.search.refine;

import evensun.search.problem.Verdict;
import java.util.Arrays;
import java.util.List;

/**
 * A {@link LocalProblem} as functions with derivatives. Usually the parts of the first aim are
 * wanted and the slacks of the limits kept; when the tie-break decides, or when a variable is to be
 * moved as far as it goes, that is wanted and the parts are kept above the floor. What the worker
 * offers no derivatives of, is differentiated by finite differences of verdicts.
 */
public final class LocalModel implements MaxMinModel {

  private static final double DIFFERENCE = 1e-5;

  private final LocalProblem problem;
  private final int[] free;
  private final int parts;
  private final int limits;
  private final boolean floored;
  private final int moved;
  private final double direction;
  private final double[] genes;
  private final double[] partRow;
  private final double[][] partGradient;

  public LocalModel(LocalProblem problem, int[] free, int limits) {
    this(problem, free, limits, -1, 0);
  }

  /**
   * A model in which a variable is to be moved as far as the floor lets it.
   *
   * @param moved index into {@code free}, or -1 for none
   * @param direction 1 for upward, -1 for downward
   */
  public LocalModel(LocalProblem problem, int[] free, int limits, int moved, double direction) {
    this.moved = moved;
    this.direction = direction;
    this.problem = problem;
    this.free = free;
    this.limits = limits;
    parts = problem.worker().partCount();
    floored = problem.floor() != Double.NEGATIVE_INFINITY;
    genes = problem.best().geneArray();
    partRow = new double[parts];
    partGradient = new double[parts][genes.length];
  }

  @Override
  public int size() {
    return free.length;
  }

  @Override
  public int wanted() {
    return floored ? 1 : parts;
  }

  @Override
  public int kept() {
    return limits + (floored ? parts : 0);
  }

  public double[] pointOf(double[] allGenes) {
    return Arrays.stream(free).mapToDouble(i -> allGenes[i]).toArray();
  }

  public double[] genesOf(double[] point) {
    double[] all = genes.clone();
    for (int j = 0; j < free.length; j++) {
      all[free[j]] = point[j];
    }
    return all;
  }

  @Override
  public boolean at(double[] point, double[] rows, double[][] gradient) {
    double[] all = genesOf(point);
    if (problem.left() <= 0 || !problem.parts(all, partRow, partGradient)) {
      return false;
    }
    for (int i = 0; i < parts; i++) {
      int row = floored ? 1 + i : i;
      rows[row] = floored ? partRow[i] - problem.floor() : partRow[i];
      for (int j = 0; j < free.length; j++) {
        gradient[row][j] = partGradient[i][free[j]];
      }
    }
    if (moved >= 0) {
      rows[0] = direction * point[moved];
      gradient[0][moved] = direction;
    }
    return limits == 0 && !isTieBreaking() || differences(point, all, rows, gradient);
  }

  private boolean isTieBreaking() {
    return floored && moved < 0;
  }

  private boolean differences(double[] point, double[] all, double[] rows, double[][] gradient) {
    Verdict here = problem.judgeRelaxed(all);
    boolean usable = read(here, rows);
    for (int j = 0; j < free.length && usable; j++) {
      double step = point[j] > 0.5 ? -DIFFERENCE : DIFFERENCE;
      double[] beside = all.clone();
      beside[free[j]] += step;
      double[] shifted = rows.clone();
      usable = read(problem.judgeRelaxed(beside), shifted);
      slopes(rows, shifted, step, j, gradient);
    }
    return usable;
  }

  private void slopes(double[] rows, double[] shifted, double step, int j, double[][] gradient) {
    if (isTieBreaking()) {
      gradient[0][j] = (shifted[0] - rows[0]) / step;
    }
    for (int i = rows.length - limits; i < rows.length; i++) {
      gradient[i][j] = (shifted[i] - rows[i]) / step;
    }
  }

  private boolean read(Verdict verdict, double[] rows) {
    if (verdict.isFailure() || verdict.slacks().size() != limits) {
      return false;
    }
    if (isTieBreaking()) {
      rows[0] = verdict.tieBreak();
    }
    List<Double> slacks = verdict.slacks();
    for (int i = 0; i < limits; i++) {
      rows[rows.length - limits + i] = slacks.get(i);
    }
    return true;
  }
}
