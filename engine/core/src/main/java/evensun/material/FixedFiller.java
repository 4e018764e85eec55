package evensun.material;

import evensun.spi.Finding;
import java.util.List;

/** Copies rows that do not change. */
final class FixedFiller implements Material.Filler {

  private final double[] n;
  private final double[] k;
  private final List<Finding> findings;

  FixedFiller(double[] n, double[] k, List<Finding> findings) {
    this.n = n;
    this.k = k;
    this.findings = List.copyOf(findings);
  }

  @Override
  public void fill(double bandgapEv, double[] n, double[] k) {
    System.arraycopy(this.n, 0, n, 0, this.n.length);
    System.arraycopy(this.k, 0, k, 0, this.k.length);
  }

  @Override
  public List<Finding> findings() {
    return findings;
  }
}
