package evensun.transfermatrix.kernel.reference;

/**
 * A complex number, for the kernel that is to be read rather than to be fast.
 *
 * @param re real part
 * @param im imaginary part
 */
record Complex(double re, double im) {

  static final Complex ONE = new Complex(1, 0);
  static final Complex ZERO = new Complex(0, 0);

  Complex plus(Complex b) {
    return new Complex(re + b.re, im + b.im);
  }

  Complex minus(Complex b) {
    return new Complex(re - b.re, im - b.im);
  }

  Complex times(Complex b) {
    return new Complex(re * b.re - im * b.im, re * b.im + im * b.re);
  }

  Complex times(double factor) {
    return new Complex(re * factor, im * factor);
  }

  Complex over(Complex b) {
    double scale = 1 / b.squared();
    return new Complex((re * b.re + im * b.im) * scale, (im * b.re - re * b.im) * scale);
  }

  Complex conjugate() {
    return new Complex(re, -im);
  }

  /** |z|². */
  double squared() {
    return re * re + im * im;
  }

  /** exp(i z). */
  Complex expI() {
    double size = Math.exp(-im);
    return new Complex(size * Math.cos(re), size * Math.sin(re));
  }

  /**
   * The square root in the first quadrant, where a wave travels or decays away from its source;
   * {@code im} must not be negative.
   */
  Complex root() {
    double half = Math.hypot(re, im);
    if (re >= 0) {
      double x = Math.sqrt((half + re) / 2);
      return x == 0 ? ZERO : new Complex(x, im / (2 * x));
    }
    double y = Math.sqrt((half - re) / 2);
    return new Complex(im / (2 * y), y);
  }
}
