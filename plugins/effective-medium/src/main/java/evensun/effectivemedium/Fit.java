package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import evensun.spi.Problem;

/** The plain design that stands for a design: one per evaluator, one thread at a time. */
final class Fit {

  /** Index that stands for the incident medium where layers are counted. */
  static final int INCIDENT = -1;

  /** Shares of the two neighbours in a rough face. */
  private static final double[] HALVES = {0.5, 0.5};

  /**
   * Thickness of the layer that stands for a rough face over the rms height. A step of the index in
   * two halves, ±t/2 from the mean plane, has the second moment t²/4 of the height distribution, so
   * t is twice the rms height.
   */
  static final double THICKNESS_PER_RMS = 2;

  private final Plan plan;
  private final Design plain;

  /** [l] blend of a layer, null where it is of one material. */
  private final Blend[] blends;

  /** [f] blend of a rough face, null where it scatters. */
  private final Blend[] faceBlends;

  private final double[][] fractions;
  private final double[] ends = new double[2];
  private final double[] consumedNm;
  private final int[] above;

  Fit(Plan plan) {
    this.plan = plan;
    Problem problem = plan.problem();
    plain = new Design(plan.pieces().size(), plan.rows(), 0, problem.knobCount());
    blends = new Blend[problem.layerCount()];
    fractions = new double[blends.length][];
    for (int l = 0; l < blends.length; l++) {
      blends[l] = blend(plan.body(l), problem.wavelengthCount());
      if (plan.body(l) instanceof Body.Mixed mixed) {
        fractions[l] = new double[mixed.mixture().components().size()];
      }
      bindRows(plan.firstPiece(l), blends[l]);
    }
    faceBlends = new Blend[plan.faces().size()];
    for (int f = 0; f < faceBlends.length; f++) {
      if (plan.facePiece(f) >= 0) {
        faceBlends[f] =
            new Blend(MixingRule.BRUGGEMAN, -1, Mixture.SPHERE, 2, 1, problem.wavelengthCount());
        bindRows(plan.facePiece(f), faceBlends[f]);
      }
    }
    consumedNm = new double[blends.length];
    above = new int[faceBlends.length];
  }

  private static Blend blend(Body body, int wavelengths) {
    if (body instanceof Body.Mixed mixed) {
      Mixture m = mixed.mixture();
      return new Blend(
          m.rule(), m.host(), m.depolarisationFactor(), m.components().size(), 1, wavelengths);
    }
    if (body instanceof Body.Graded graded) {
      MixingRule rule = graded.grading().rule();
      int host = rule == MixingRule.MAXWELL_GARNETT ? 0 : -1;
      return new Blend(rule, host, Mixture.SPHERE, 2, graded.slices().count(), wavelengths);
    }
    return null;
  }

  /** The rows of a blend stay where they are; only their content changes. */
  private void bindRows(int firstPiece, Blend blend) {
    for (int i = 0; blend != null && i < blend.slots(); i++) {
      int row = plan.pieces().get(firstPiece + i).row();
      plain.n[row] = blend.n(i);
      plain.k[row] = blend.k(i);
      plain.material[firstPiece + i] = row;
    }
  }

  /** The plain design, valid until the next {@link #update}. */
  Design plain() {
    return plain;
  }

  /** Blend of a layer, null where it is of one material. */
  Blend blend(int layer) {
    return blends[layer];
  }

  /** Blend of a rough face, null where it scatters. */
  Blend faceBlend(int face) {
    return faceBlends[face];
  }

  /**
   * The nearest layer present above a rough face.
   *
   * @return index of the layer, or {@link #INCIDENT}
   */
  int above(int face) {
    return above[face];
  }

  /**
   * Fills the plain design.
   *
   * @throws EvaluationFailed where a fraction or a thickness does not allow it
   */
  void update(Design design) {
    System.arraycopy(design.knob, 0, plain.knob, 0, plain.knob.length);
    for (int m = 0; m < design.n.length; m++) {
      plain.n[m] = design.n[m];
      plain.k[m] = design.k[m];
      plain.revision[m] = design.revision[m];
    }
    for (int l = 0; l < blends.length; l++) {
      updateBody(design, l);
      consumedNm[l] = 0;
    }
    for (int f = 0; f < faceBlends.length; f++) {
      updateFace(design, f);
    }
    for (int l = 0; l < blends.length; l++) {
      setThickness(design, l);
    }
  }

  private void updateBody(Design design, int l) {
    Body body = plan.body(l);
    if (body instanceof Body.Mixed mixed) {
      mix(design, l, mixed.mixture());
    } else if (body instanceof Body.Graded graded) {
      grade(design, l, graded);
    } else {
      plain.material[plan.firstPiece(l)] = design.material[l];
    }
  }

  private void mix(Design design, int l, Mixture mixture) {
    Blend blend = blends[l];
    for (int c = 0; c < fractions[l].length; c++) {
      setComponent(design, blend, c, mixture.components().get(c).material());
    }
    try {
      mixture.fractions(design, fractions[l]);
    } catch (EvaluationFailed e) {
      throw new EvaluationFailed("layer \"" + plan.layerName(l) + "\": " + e.getMessage());
    }
    blend.mix(0, fractions[l]);
    plain.revision[plan.pieces().get(plan.firstPiece(l)).row()] = blend.revision(0);
  }

  private void grade(Design design, int l, Body.Graded graded) {
    Grading grading = graded.grading();
    Blend blend = blends[l];
    setComponent(design, blend, 0, grading.upper().material());
    setComponent(design, blend, 1, grading.lower().material());
    for (int i = 0; i < blend.slots(); i++) {
      ends[1] = graded.slices().share(i);
      ends[0] = 1 - ends[1];
      blend.mix(i, ends);
      plain.revision[plan.pieces().get(plan.firstPiece(l) + i).row()] = blend.revision(i);
    }
  }

  private static void setComponent(Design design, Blend blend, int c, int material) {
    blend.component(c, design.n[material], design.k[material], design.revision[material]);
  }

  private void updateFace(Design design, int f) {
    int below = plan.faces().get(f).below();
    above[f] = below - 1;
    while (above[f] >= 0 && design.thicknessNm[above[f]] == 0) {
      above[f]--;
    }
    int piece = plan.facePiece(f);
    if (piece < 0) {
      return;
    }
    double rms = plan.faces().get(f).roughness().rmsNm();
    boolean absent = below < blends.length && design.thicknessNm[below] == 0;
    plain.thicknessNm[piece] = absent ? 0 : THICKNESS_PER_RMS * rms;
    Blend blend = faceBlends[f];
    setNeighbour(design, blend, 0, above[f], true);
    setNeighbour(design, blend, 1, below, false);
    blend.mix(0, HALVES);
    plain.revision[plan.pieces().get(piece).row()] = blend.revision(0);
    if (!absent) {
      consume(above[f], rms);
      consume(below, rms);
    }
  }

  private void setNeighbour(Design design, Blend face, int c, int layer, boolean lowerEdge) {
    if (layer == INCIDENT || layer == blends.length) {
      Problem problem = plan.problem();
      int material = layer == INCIDENT ? problem.incidentMaterial() : problem.exitMaterial();
      setComponent(design, face, c, material);
    } else if (blends[layer] == null) {
      setComponent(design, face, c, design.material[layer]);
    } else {
      Blend blend = blends[layer];
      int slot = lowerEdge ? blend.slots() - 1 : 0;
      face.component(c, blend.n(slot), blend.k(slot), blend.revision(slot));
    }
  }

  private void consume(int layer, double nm) {
    if (layer >= 0 && layer < consumedNm.length) {
      consumedNm[layer] += nm;
    }
  }

  private void setThickness(Design design, int l) {
    double left = design.thicknessNm[l] - consumedNm[l];
    if (left < 0) {
      throw new EvaluationFailed(
          "layer \"%s\": its rough faces need %s nm, but it is %s nm thick"
              .formatted(plan.layerName(l), consumedNm[l], design.thicknessNm[l]));
    }
    int first = plan.firstPiece(l);
    if (plan.body(l) instanceof Body.Graded graded) {
      for (int i = 0; i < graded.slices().count(); i++) {
        plain.thicknessNm[first + i] = left * graded.slices().width(i);
      }
    } else {
      plain.thicknessNm[first] = left;
    }
  }
}
