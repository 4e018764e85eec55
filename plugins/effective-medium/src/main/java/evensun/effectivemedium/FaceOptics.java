package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.Incidence;
import evensun.spi.Problem;
import evensun.spi.Side;

/** The two media at the rough faces of a design. */
final class FaceOptics {

  private final Plan plan;
  private final Fit fit;
  private final Design design;

  /** Optics of the faces of a plan; the fit was updated to the design. */
  FaceOptics(Plan plan, Fit fit, Design design) {
    this.plan = plan;
    this.fit = fit;
    this.design = design;
  }

  /** [w] refractive index just above a face. */
  double[] above(RoughFace face) {
    int layer = face.below() - 1;
    while (layer >= 0 && design.thicknessNm[layer] == 0) {
      layer--;
    }
    return index(layer, true);
  }

  /** [w] refractive index just below a face. */
  double[] below(RoughFace face) {
    return index(face.below(), false);
  }

  private double[] index(int layer, boolean lowerEdge) {
    Problem problem = plan.problem();
    if (layer == Fit.INCIDENT) {
      return design.n[problem.incidentMaterial()];
    }
    if (layer == problem.layerCount()) {
      return design.n[problem.exitMaterial()];
    }
    Blend blend = fit.blend(layer);
    if (blend == null) {
      return design.n[design.material[layer]];
    }
    return blend.n(lowerEdge ? blend.slots() - 1 : 0);
  }

  /** Larger refractive index of both sides. */
  double larger(RoughFace face, int w) {
    return Math.max(above(face)[w], below(face)[w]);
  }

  /** Photon-weighted mean of the haze in reflection for the first incidence. */
  double reflectedHaze(RoughFace face) {
    Problem problem = plan.problem();
    double[] near = near(face);
    return Scales.photonMean(
        problem,
        w ->
            Haze.reflected(
                face.roughness().rmsNm(),
                problem.wavelengthNm().at(w),
                Haze.nCos(near[w], nSin(w))));
  }

  /** Photon-weighted mean of the haze in transmission for the first incidence. */
  double transmittedHaze(RoughFace face) {
    Problem problem = plan.problem();
    double[] above = above(face);
    double[] below = below(face);
    return Scales.photonMean(
        problem,
        w ->
            Haze.transmitted(
                face.roughness().rmsNm(),
                problem.wavelengthNm().at(w),
                Haze.nCos(above[w], nSin(w)),
                Haze.nCos(below[w], nSin(w))));
  }

  private double[] near(RoughFace face) {
    return incidence().side() == Side.FRONT ? above(face) : below(face);
  }

  private Incidence incidence() {
    return plan.problem().incidences().get(0);
  }

  private double nSin(int w) {
    Problem problem = plan.problem();
    boolean front = incidence().side() == Side.FRONT;
    int medium = front ? problem.incidentMaterial() : problem.exitMaterial();
    return design.n[medium][w] * Math.sin(Math.toRadians(incidence().angleDeg()));
  }
}
