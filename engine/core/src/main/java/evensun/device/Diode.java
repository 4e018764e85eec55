package evensun.device;

/**
 * Recombination and leakage of one subcell against its voltage; mutable, for one thread, allocates
 * nothing.
 *
 * <p>Four branches: a radiative one with ideality 1, a non-radiative one with an ideality of its
 * own, a shunt, and reverse breakdown. All currents in mA cm⁻², counted positive when they consume
 * photocurrent.
 */
final class Diode {

  /** Current of the breakdown branch at the breakdown voltage, in mA cm⁻². */
  static final double BREAKDOWN_MA_PER_CM2 = 1;

  /** The breakdown branch grows e-fold in this part of the breakdown voltage. */
  private static final double BREAKDOWN_SHARPNESS = 20;

  private static final double FLOOR = Math.exp(-BREAKDOWN_SHARPNESS);
  private static final int MOST_STEPS = 400;

  private double thermalV;
  private double radiative;
  private double nonRadiative;
  private double ideality;
  private double shuntMaPerV;
  private double breakdownV;

  /** Voltage of the last {@link #at} or {@link #solve}, in V. */
  double voltage;

  /** Current of all branches at {@link #voltage}. */
  double current;

  /** Its derivative with respect to voltage, mA cm⁻² V⁻¹. */
  double slope;

  /** Current of the two recombination branches alone. */
  double recombination;

  /** Its derivative with respect to voltage, mA cm⁻² V⁻¹. */
  double recombinationSlope;

  /**
   * Sets the branches.
   *
   * @param thermalV kT/q in V
   * @param radiative radiative saturation current, greater than 0
   * @param nonRadiative non-radiative saturation current, at least 0
   * @param ideality of the non-radiative branch
   * @param shuntOhmCm2 shunt resistance, infinite for none
   * @param breakdownV reverse breakdown voltage as a positive number, infinite for none
   */
  void set(
      double thermalV,
      double radiative,
      double nonRadiative,
      double ideality,
      double shuntOhmCm2,
      double breakdownV) {
    this.thermalV = thermalV;
    this.radiative = radiative;
    this.nonRadiative = nonRadiative;
    this.ideality = nonRadiative == 0 ? 1 : ideality;
    this.shuntMaPerV = 1000 / shuntOhmCm2;
    this.breakdownV = breakdownV;
  }

  /**
   * Non-radiative saturation current for which the radiative branch is the wanted part of all
   * recombination at open circuit.
   *
   * @param thermalV kT/q in V
   * @param radiative radiative saturation current in mA cm⁻²
   * @param efficiency external radiative efficiency, in (0, 1]
   * @param ideality of the non-radiative branch
   * @param oneSun photocurrent under one sun in mA cm⁻²; at 0 the limit of little light is taken
   */
  static double nonRadiativeMaPerCm2(
      double thermalV, double radiative, double efficiency, double ideality, double oneSun) {
    if (efficiency >= 1) {
      return 0;
    }
    double open = Math.log1p(efficiency * Math.max(oneSun, 0) / radiative);
    if (open < 1e-9) {
      return radiative * ideality * (1 - efficiency) / efficiency;
    }
    return (1 - efficiency) * oneSun / Math.expm1(open / ideality);
  }

  /** Whether nothing but recombination flows, so that the reverse current saturates. */
  boolean saturates() {
    return shuntMaPerV == 0 && Double.isInfinite(breakdownV);
  }

  /** Largest current the device can draw beyond the photocurrent, infinite with a leak. */
  double reverseLimitMaPerCm2() {
    return saturates() ? radiative + nonRadiative : Double.POSITIVE_INFINITY;
  }

  boolean breaksDown() {
    return !Double.isInfinite(breakdownV);
  }

  /** Fills the fields for a voltage. */
  void at(double v) {
    voltage = v;
    double one = Math.expm1(v / thermalV);
    recombination = radiative * one;
    recombinationSlope = radiative * (one + 1) / thermalV;
    if (nonRadiative > 0) {
      double other = Math.expm1(v / (ideality * thermalV));
      recombination += nonRadiative * other;
      recombinationSlope += nonRadiative * (other + 1) / (ideality * thermalV);
    }
    current = recombination + shuntMaPerV * v;
    slope = recombinationSlope + shuntMaPerV;
    if (breaksDown()) {
      double broken = BREAKDOWN_MA_PER_CM2 * Math.exp(-BREAKDOWN_SHARPNESS * (v / breakdownV + 1));
      current -= broken - BREAKDOWN_MA_PER_CM2 * FLOOR;
      slope += broken * BREAKDOWN_SHARPNESS / breakdownV;
    }
  }

  /**
   * Fills the fields for a total current. Below the reverse limit the voltage is minus infinity.
   *
   * @param wanted current of all branches in mA cm⁻²
   */
  void solve(double wanted) {
    if (!saturates()) {
      search(wanted, lower(wanted), upper(wanted));
    } else if (!(wanted > -(radiative + nonRadiative))) {
      saturated();
    } else if (ideality == 1) {
      one(wanted);
    } else if (ideality == 2) {
      two(wanted);
    } else {
      search(wanted, lower(wanted), upper(wanted));
    }
  }

  private void saturated() {
    voltage = Double.NEGATIVE_INFINITY;
    current = -(radiative + nonRadiative);
    slope = 0;
    recombination = current;
    recombinationSlope = 0;
  }

  private void one(double wanted) {
    double saturation = radiative + nonRadiative;
    voltage = thermalV * Math.log1p(wanted / saturation);
    closed(wanted, (wanted + saturation) / thermalV);
  }

  /** With ideality 2 the sum is a quadratic in exp(V/2V_t); the root is written without loss. */
  private void two(double wanted) {
    double c = wanted + radiative + nonRadiative;
    double x = 2 * c / (nonRadiative + Math.sqrt(nonRadiative * nonRadiative + 4 * radiative * c));
    voltage = 2 * thermalV * Math.log(x);
    closed(wanted, x * (radiative * x + 0.5 * nonRadiative) / thermalV);
  }

  private void closed(double wanted, double gradient) {
    current = wanted;
    recombination = wanted;
    slope = gradient;
    recombinationSlope = gradient;
  }

  /** No branch alone carries more than the whole, so each bounds the voltage from above. */
  private double upper(double wanted) {
    if (wanted <= 0) {
      return 0;
    }
    double bound = thermalV * Math.log1p(wanted / radiative);
    if (nonRadiative > 0) {
      bound = Math.min(bound, ideality * thermalV * Math.log1p(wanted / nonRadiative));
    }
    return shuntMaPerV > 0 ? Math.min(bound, wanted / shuntMaPerV) : bound;
  }

  private double lower(double wanted) {
    if (wanted >= 0) {
      return 0;
    }
    double bound = Double.NEGATIVE_INFINITY;
    if (shuntMaPerV > 0) {
      bound = wanted / shuntMaPerV;
    }
    if (breaksDown()) {
      double e = Math.log(FLOOR - wanted / BREAKDOWN_MA_PER_CM2);
      bound = Math.max(bound, -breakdownV * (1 + e / BREAKDOWN_SHARPNESS));
    }
    return saturates() ? reverseBound(wanted) : bound;
  }

  /** Without a leak: the branch with the larger ideality reaches a given part of its limit last. */
  private double reverseBound(double wanted) {
    double part = wanted / (radiative + nonRadiative);
    return Math.max(1, ideality) * thermalV * Math.log1p(part) * 1.000001;
  }

  /** Newton steps that may never leave the bracket; from above they fall onto the root. */
  private void search(double wanted, double from, double to) {
    double low = from;
    double high = to;
    at(high);
    for (int i = 0; i < MOST_STEPS; i++) {
      double excess = current - wanted;
      if (excess == 0) {
        return;
      }
      if (excess > 0) {
        high = voltage;
      } else {
        low = voltage;
      }
      double next = voltage - excess / slope;
      if (!(next >= low && next <= high)) {
        next = 0.5 * (low + high);
      }
      boolean done = Math.abs(next - voltage) <= 4e-16 * Math.abs(next) + 1e-300;
      at(next);
      if (done) {
        return;
      }
    }
  }
}
