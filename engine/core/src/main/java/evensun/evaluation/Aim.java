package evensun.evaluation;

/** What a search makes as large as possible, from the subcell currents and gaps of a design. */
public interface Aim {

  /** Name in scenarios. */
  String name();

  /** Unit of its value. */
  String unit();

  /**
   * Value of a design; larger is better.
   *
   * @param photocurrentMaPerCm2 [subcell]
   * @param bandgapEv [subcell], 0 where an absorber has none
   */
  double value(double[] photocurrentMaPerCm2, double[] bandgapEv);

  /** Whether the value is the smallest of the currents, so that their derivatives serve it. */
  default boolean isSmallestCurrent() {
    return false;
  }

  /** A second one for the same aim, for use by another thread. */
  default Aim forAnotherThread() {
    return this;
  }

  /** The smallest subcell current. */
  static Aim matchedCurrent() {
    return new Aim() {
      @Override
      public String name() {
        return "matched-current";
      }

      @Override
      public String unit() {
        return "mA cm⁻²";
      }

      @Override
      public double value(double[] photocurrentMaPerCm2, double[] bandgapEv) {
        double smallest = Double.POSITIVE_INFINITY;
        for (double current : photocurrentMaPerCm2) {
          smallest = Math.min(smallest, current);
        }
        return smallest;
      }

      @Override
      public boolean isSmallestCurrent() {
        return true;
      }
    };
  }

  /** The sum of the subcell currents. */
  static Aim currentSum() {
    return new Aim() {
      @Override
      public String name() {
        return "current-sum";
      }

      @Override
      public String unit() {
        return "mA cm⁻²";
      }

      @Override
      public double value(double[] photocurrentMaPerCm2, double[] bandgapEv) {
        double sum = 0;
        for (double current : photocurrentMaPerCm2) {
          sum += current;
        }
        return sum;
      }
    };
  }
}
