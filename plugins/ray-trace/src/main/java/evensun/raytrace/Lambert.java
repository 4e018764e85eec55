package evensun.raytrace;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Directions of Lambertian light: Gauss nodes in the cosine, weighted with 2 cos θ. */
final class Lambert {

  private static final int NODES = 24;

  /** Cosines of the angle to the normal. */
  static final double[] COSINES = new double[NODES];

  /** Their weights, of sum 1. */
  static final double[] WEIGHTS = new double[NODES];

  static {
    GaussIntegrator rule = new GaussIntegratorFactory().legendre(NODES, 0, 1);
    for (int i = 0; i < NODES; i++) {
      COSINES[i] = rule.getPoint(i);
      WEIGHTS[i] = 2 * rule.getPoint(i) * rule.getWeight(i);
    }
  }

  private Lambert() {}
}
