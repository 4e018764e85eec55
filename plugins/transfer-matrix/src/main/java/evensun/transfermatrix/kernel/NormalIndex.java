package evensun.transfermatrix.kernel;

/**
 * The square of the index along the normal, q² = N² − (n₀ sin θ)², in a form that loses nothing at
 * grazing incidence: (N − n₀)(N + n₀) + (n₀ cos θ)².
 */
public final class NormalIndex {

  /** Smallest |q²/N²| of a finite layer: at q = 0 the two waves that span its field are one. */
  public static final double LEAST_LAYER = 1e-12;

  /** The same for the half-spaces, where one wave is enough. */
  public static final double LEAST_HALF_SPACE = 1e-30;

  private NormalIndex() {}

  /** Re q². */
  public static double squareRe(double n, double k, double incident, double cosine) {
    double normal = incident * cosine;
    return (n - incident) * (n + incident) - k * k + normal * normal;
  }

  /** Im q². */
  public static double squareIm(double n, double k) {
    return 2 * n * k;
  }
}
