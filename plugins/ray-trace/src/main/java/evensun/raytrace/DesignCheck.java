package evensun.raytrace;

import evensun.raytrace.trace.Face;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Feature;
import evensun.spi.Problem;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;

/** Refuses designs that cannot be evaluated. */
final class DesignCheck {

  private final Problem problem;
  private final long[] checked;
  private final boolean fromBehind;
  private final List<Shaped> shaped = new ArrayList<>();

  /** A texture with facets of one angle, and its layer. */
  private record Shaped(int layer, Texture texture) {}

  DesignCheck(Problem problem) {
    this.problem = problem;
    checked = new long[problem.materialCount()];
    fromBehind = problem.incidences().stream().anyMatch(i -> i.side() == Side.REAR);
    for (int l = 0; l < problem.layerCount(); l++) {
      for (Feature feature : problem.layers().get(l).features()) {
        if (feature instanceof Texture texture && texture.heightMap().isEmpty()) {
          shaped.add(new Shaped(l, texture));
        }
      }
    }
  }

  /**
   * Checks the numbers.
   *
   * @throws EvaluationFailed naming the layer or material, the rule and the value
   */
  void check(Design design) {
    for (int l = 0; l < problem.layerCount(); l++) {
      double nm = design.thicknessNm[l];
      if (!(nm >= 0 && nm < Double.POSITIVE_INFINITY)) {
        throw failed(
            "layer \"%s\": thicknessNm must be finite and at least 0 nm but was %s",
            problem.layers().get(l).name(), nm);
      }
    }
    for (int t = 0; t < shaped.size(); t++) {
      checkAngle(design, shaped.get(t));
    }
    for (int m = 0; m < checked.length; m++) {
      if (checked[m] != design.revision[m] || checked[m] == 0) {
        checkMaterial(design, m);
        checked[m] = design.revision[m];
      }
    }
    checkLightFromBehind(design);
  }

  private void checkAngle(Design design, Shaped one) {
    double angle = one.texture().facetAngleDeg().in(design);
    if (!(angle > 0 && angle < 90)) {
      throw failed(
          "layer \"%s\": facetAngleDeg must be in (0, 90) degrees but was %s",
          problem.layers().get(one.layer()).name(), angle);
    }
  }

  private void checkMaterial(Design design, int m) {
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      double n = design.n[m][w];
      double k = design.k[m][w];
      if (!(n > 0 && n <= 1e6 && k >= 0 && k <= 1e6)) {
        throw failed(
            "material number %d at %s nm: n must be in (0, 1e6] and k in [0, 1e6] but n was %s, k %s",
            m, problem.wavelengthNm().at(w), n, k);
      }
    }
  }

  private void checkLightFromBehind(Design design) {
    if (!fromBehind) {
      return;
    }
    for (double k : design.k[problem.exitMaterial()]) {
      if (k > 1e-6) {
        throw failed(
            "light cannot come from behind through an exit medium that absorbs; its k must be below 1e-6 but was %s",
            k);
      }
    }
  }

  /** Checks that films and layers fit to the shapes of a device. */
  void checkFit(Design design, Device device, List<Face> faces) {
    for (int b = 0; b < device.boundaries().size(); b++) {
      Face face = faces.get(b);
      if (face.relief().isPresent()) {
        checkFilms(design, device.boundaries().get(b), face.relief().get().featureUm());
      }
    }
    for (int m = 1; m < device.mediaCount() - 1; m++) {
      double reach = faces.get(m - 1).belowMeanUm() + faces.get(m).aboveMeanUm();
      double thickness = device.thicknessUm(design, m);
      if (thickness < reach) {
        throw failed(
            "%s is %s µm thick between mean planes, but the textures of its faces reach %s µm into it; make it thicker or the textures smaller",
            device.name(m), thickness, reach);
      }
    }
  }

  private void checkFilms(Design design, Device.Boundary boundary, double featureUm) {
    for (int f = 0; f < boundary.films().size(); f++) {
      int film = boundary.films().get(f);
      if (design.thicknessNm[film] > 1000 * featureUm) {
        throw failed(
            "layer \"%s\" is %s nm thick and follows a texture whose shapes are %s nm wide; a film must be thinner than the shapes it follows: make it thinner, or the texture coarser, or write coherence: incoherent if it fills the texture",
            problem.layers().get(film).name(), design.thicknessNm[film], 1000 * featureUm);
      }
    }
  }

  private static EvaluationFailed failed(String message, Object... values) {
    return new EvaluationFailed(Words.of(message, values));
  }
}
