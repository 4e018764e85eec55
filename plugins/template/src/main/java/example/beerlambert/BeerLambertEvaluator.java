package example.beerlambert;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Problem;
import evensun.spi.Response;
import java.util.Arrays;

/**
 * A beam down and a beam up through every layer: weakened by exp(−4πk·d/λ) (Beer and Lambert),
 * split at every face by |(N1 − N2)/(N1 + N2)|² (Fresnel).
 */
final class BeerLambertEvaluator implements Evaluator {

  private final Problem problem;
  private final int layers;

  /** [j] the layers that are present, followed by the exit medium. */
  private final int[] media;

  /** [j] share reflected at the face above medium j; passed through medium j; sent back by it. */
  private final double[] face;

  private final double[] pass;
  private final double[] back;
  private final double[] absorbed;

  BeerLambertEvaluator(Problem problem) {
    this.problem = problem;
    layers = problem.layerCount();
    media = new int[layers + 1];
    face = new double[layers + 1];
    pass = new double[layers + 1];
    back = new double[layers + 1];
    absorbed = new double[layers];
  }

  @Override
  public void evaluate(Design design, Response into) {
    if (into.sum != null) {
      Arrays.fill(into.sum, 0);
    }
    if (into.sumStandardError != null) {
      Arrays.fill(into.sumStandardError, 0);
    }
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      int count = facesAndPasses(design, w);
      double reflected = upward(count);
      double transmitted = downward(count);
      for (int i = 0; i < problem.incidences().size(); i++) {
        set(into.reflectance, i, w, reflected);
        set(into.transmittance, i, w, transmitted);
        for (int l = 0; l < layers; l++) {
          set(into.absorptance, i * layers + l, w, absorbed[l]);
        }
      }
      addToSums(into, w, transmitted);
    }
  }

  /** Number of media below the incident one. */
  private int facesAndPasses(Design design, int w) {
    int count = 0;
    int above = problem.incidentMaterial();
    for (int l = 0; l <= layers; l++) {
      boolean exit = l == layers;
      // A layer of zero thickness is absent.
      if (exit || design.thicknessNm[l] != 0) {
        int material = exit ? problem.exitMaterial() : design.material[l];
        double k = design.k[material][w];
        media[count] = l;
        face[count] =
            face(design.n[above][w], design.k[above][w], design.n[material][w], k);
        pass[count] =
            exit
                ? 0
                : Math.exp(
                    -4 * Math.PI * k * design.thicknessNm[l] / problem.wavelengthNm().at(w));
        above = material;
        count++;
      }
    }
    return count;
  }

  private static double face(double n1, double k1, double n2, double k2) {
    double difference = (n1 - n2) * (n1 - n2) + (k1 - k2) * (k1 - k2);
    double sum = (n1 + n2) * (n1 + n2) + (k1 + k2) * (k1 + k2);
    return difference / sum;
  }

  /** What each medium sends back to its upper face, from the last to the first; the reflectance. */
  private double upward(int count) {
    double seen = 0;
    for (int j = count - 1; j >= 0; j--) {
      back[j] = pass[j] * pass[j] * seen;
      seen = face[j] + (1 - face[j]) * (1 - face[j]) * back[j] / (1 - face[j] * back[j]);
    }
    return seen;
  }

  /** What each layer absorbs, from the first to the last; the transmittance. */
  private double downward(int count) {
    Arrays.fill(absorbed, 0);
    double arriving = 1;
    for (int j = 0; j < count - 1; j++) {
      double entering = arriving * (1 - face[j]) / (1 - face[j] * back[j]);
      double returning = pass[j] == 0 ? 0 : entering * back[j] / pass[j];
      absorbed[media[j]] = (entering + returning) * (1 - pass[j]);
      arriving = entering * pass[j];
    }
    return arriving * (1 - face[count - 1]);
  }

  private void addToSums(Response into, int w, double transmitted) {
    for (int s = 0; into.sum != null && s < into.sum.length; s++) {
      for (int l = 0; into.weight != null && l < layers; l++) {
        double[] weight = into.weight[s * layers + l];
        into.sum[s] += weight == null ? 0 : weight[w] * absorbed[l];
      }
      if (into.transmittanceWeight != null && into.transmittanceWeight[s] != null) {
        into.sum[s] += into.transmittanceWeight[s][w] * transmitted;
      }
    }
  }

  /** Rows that nobody wants are null. */
  private static void set(double[][] rows, int row, int w, double value) {
    if (rows != null && rows[row] != null) {
      rows[row][w] = value;
    }
  }
}
