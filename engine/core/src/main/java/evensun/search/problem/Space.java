package evensun.search.problem;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;

/**
 * The box of values, seen as the unit cube: a gene in [0, 1] for each variable. A stepped variable
 * takes only genes that stand on a step, so that equal values have equal genes.
 */
public final class Space {

  private final List<Variable> variables;
  private final long[] stepCount;

  public Space(List<Variable> variables) {
    this.variables = List.copyOf(variables);
    stepCount = this.variables.stream().mapToLong(Variable::stepCount).toArray();
  }

  public int size() {
    return stepCount.length;
  }

  public List<Variable> variables() {
    return variables;
  }

  public boolean isStepped(int variable) {
    return variables.get(variable).step() > 0;
  }

  public boolean isChoice(int variable) {
    return variables.get(variable).isChoice();
  }

  /** Whether the variable has a single value. */
  public boolean isFixed(int variable) {
    Variable v = variables.get(variable);
    return v.low() == v.high() || isStepped(variable) && stepCount[variable] == 0;
  }

  boolean anyStepped() {
    return variables.stream().anyMatch(v -> v.step() > 0);
  }

  /** Number of steps between the bounds, 0 for a continuous variable. */
  public long stepCount(int variable) {
    return stepCount[variable];
  }

  /** The nearest legal gene. */
  public double snap(int variable, double gene) {
    double inside = Math.min(1, Math.max(0, gene));
    if (isFixed(variable)) {
      return 0;
    }
    if (!isStepped(variable)) {
      return inside;
    }
    long count = stepCount[variable];
    return (double) Math.round(inside * count) / count;
  }

  public double[] snap(double[] genes) {
    double[] snapped = new double[genes.length];
    for (int i = 0; i < snapped.length; i++) {
      snapped[i] = snap(i, genes[i]);
    }
    return snapped;
  }

  /** Values of legal genes. */
  public double[] values(double[] genes) {
    double[] values = new double[genes.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = value(i, snap(i, genes[i]));
    }
    return values;
  }

  /** Values without regard to the steps, for asking what rounding costs; choices stay choices. */
  public double[] relaxedValues(double[] genes) {
    double[] values = new double[genes.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = isChoice(i) ? value(i, snap(i, genes[i])) : between(i, genes[i]);
    }
    return values;
  }

  /** Value of a legal gene. */
  public double value(int variable, double gene) {
    if (!isStepped(variable)) {
      return between(variable, gene);
    }
    return onStep(variable, Math.round(gene * stepCount[variable]));
  }

  /** Decimal arithmetic, so that 40 plus three steps of 0.1 is 40.3 as people write it. */
  double onStep(int variable, long step) {
    Variable v = variables.get(variable);
    return BigDecimal.valueOf(v.low())
        .add(BigDecimal.valueOf(v.step()).multiply(BigDecimal.valueOf(step)))
        .doubleValue();
  }

  private double between(int variable, double gene) {
    Variable v = variables.get(variable);
    double value = v.low() + gene * span(variable);
    return Math.min(v.high(), Math.max(v.low(), value));
  }

  /** Distance of the values at genes 0 and 1; the last step may end below the upper bound. */
  public double span(int variable) {
    Variable v = variables.get(variable);
    double top = isStepped(variable) ? onStep(variable, stepCount[variable]) : v.high();
    return top - v.low();
  }

  double gene(int variable, double value) {
    double span = span(variable);
    if (span == 0) {
      return 0;
    }
    return Math.min(1, Math.max(0, (value - variables.get(variable).low()) / span));
  }

  public double[] genes(double[] values) {
    double[] genes = new double[values.length];
    for (int i = 0; i < genes.length; i++) {
      genes[i] = gene(i, values[i]);
    }
    return genes;
  }

  /** Whether a design lies within the bounds, up to rounding. */
  public boolean contains(double[] values) {
    for (int i = 0; i < values.length; i++) {
      Variable v = variables.get(i);
      if (!(values[i] >= v.low() && values[i] <= v.high())) {
        return false;
      }
    }
    return true;
  }

  public double[] drawn() {
    return variables.stream().mapToDouble(Variable::drawn).toArray();
  }

  /** Text that two searches share only when they may continue one another. */
  public String fingerprint() {
    return Arrays.toString(variables.stream().map(Variable::toString).toArray());
  }
}
