package evensun.effectivemedium;

/** A complex number, for readable expectations. */
record Eps(double re, double im) {

  static Eps of(double re) {
    return new Eps(re, 0);
  }

  static Eps ofIndex(double n, double k) {
    return new Eps(n * n - k * k, 2 * n * k);
  }

  Eps plus(Eps o) {
    return new Eps(re + o.re, im + o.im);
  }

  Eps minus(Eps o) {
    return plus(o.times(-1));
  }

  Eps times(double f) {
    return new Eps(re * f, im * f);
  }

  Eps times(Eps o) {
    return new Eps(re * o.re - im * o.im, re * o.im + im * o.re);
  }

  Eps over(Eps o) {
    double square = o.re * o.re + o.im * o.im;
    return new Eps((re * o.re + im * o.im) / square, (im * o.re - re * o.im) / square);
  }

  double abs() {
    return Math.hypot(re, im);
  }

  /** From the positive real axis, in (-pi, pi]. */
  double angle() {
    return Math.atan2(im, re);
  }

  /** Square root in the upper half plane. */
  Eps root() {
    double modulus = Math.sqrt(abs());
    double angle = Math.atan2(im, re) / 2;
    return new Eps(modulus * Math.cos(angle), modulus * Math.sin(angle));
  }

  double distance(Eps o) {
    return minus(o).abs() / o.abs();
  }
}
