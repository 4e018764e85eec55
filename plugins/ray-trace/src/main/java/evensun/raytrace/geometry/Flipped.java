package evensun.raytrace.geometry;

/** A relief upside down: what pointed up points down. */
record Flipped(Relief upright) implements Relief {

  @Override
  public double periodXUm() {
    return upright.periodXUm();
  }

  @Override
  public double periodYUm() {
    return upright.periodYUm();
  }

  @Override
  public double lowUm() {
    return -upright.highUm();
  }

  @Override
  public double highUm() {
    return -upright.lowUm();
  }

  @Override
  public double meanUm() {
    return -upright.meanUm();
  }

  @Override
  public double featureUm() {
    return upright.featureUm();
  }

  @Override
  public boolean next(Ray ray, boolean above) {
    ray.flip();
    boolean met = upright.next(ray, !above);
    ray.flip();
    return met;
  }

  @Override
  public double heightUm(double xUm, double yUm) {
    return -upright.heightUm(xUm, yUm);
  }
}
