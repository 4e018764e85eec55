package evensun.material.dispersion;

/** Checks of parameters, one line each. */
final class Check {

  private Check() {}

  static double within(String name, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          name + " must be in [" + low + ", " + high + "] but was " + value);
    }
    return value;
  }
}
