package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.Finding;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import evensun.spi.Problem;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/** Whether the descriptions chosen hold for a design; the thresholds are common practice. */
final class Validity {

  /** Largest total fraction of inclusions for which single spheres in a host are a fair picture. */
  private static final double DILUTE = 0.3;

  /** Distance of a metal's fraction from the percolation threshold that calls for care. */
  private static final double NEAR_PERCOLATION = 0.1;

  /** Largest ratio of the indices of two components for rules of low contrast. */
  private static final double LOW_CONTRAST = 2;

  private final Plan plan;
  private final Fit fit;
  private final Design design;
  private final List<Finding> findings = new ArrayList<>();

  private Validity(Plan plan, Fit fit, Design design) {
    this.plan = plan;
    this.fit = fit;
    this.design = design;
  }

  /**
   * Examines a design.
   *
   * @param plan the plan
   * @param fit updated to the design
   * @param design the design
   */
  static List<Finding> examine(Plan plan, Fit fit, Design design) {
    Validity validity = new Validity(plan, fit, design);
    for (int l = 0; l < plan.bodies().size(); l++) {
      if (design.thicknessNm[l] > 0) {
        validity.layer(l);
      }
    }
    for (RoughFace face : plan.faces()) {
      validity.face(face);
    }
    return validity.findings;
  }

  private void layer(int l) {
    if (plan.body(l) instanceof Body.Mixed mixed) {
      Mixture mixture = mixed.mixture();
      featureSize(l, mixture.featureSizeNm());
      percolation(l, mixture);
      ruleRange(l, mixture);
    } else if (plan.body(l) instanceof Body.Graded graded) {
      Grading grading = graded.grading();
      // An index profile describes an alloy, which has no grains to be compared with the light.
      if (grading.featureSizeNm().isPresent() || grading.rule() != MixingRule.REFRACTIVE_INDEX) {
        featureSize(l, grading.featureSizeNm());
      }
    }
  }

  private void featureSize(int l, OptionalDouble sizeNm) {
    if (sizeNm.isEmpty()) {
      findings.add(
          new Finding(
              "mixture-size-unknown",
              Severity.NOTE,
              plan.layerName(l),
              "no featureSizeNm is given, so grains or pores are taken to be far smaller than the"
                  + " wavelength; give it to have this checked"));
      return;
    }
    double worst = 0;
    int at = 0;
    Blend blend = fit.blend(l);
    for (int slot = 0; slot < blend.slots(); slot++) {
      for (int w = 0; w < plan.problem().wavelengthCount(); w++) {
        double ratio = Scales.ratio(plan.problem(), w, sizeNm.getAsDouble(), blend.n(slot)[w]);
        at = ratio > worst ? w : at;
        worst = Math.max(worst, ratio);
      }
    }
    if (worst > Scales.FINE) {
      findings.add(
          new Finding(
              "mixture-size",
              Severity.WARNING,
              plan.layerName(l),
              text(
                  "features of %s nm are %.2f of the wavelength in the layer at %s nm (an effective"
                      + " medium wants 0.1 or less); scattering inside is not described",
                  number(sizeNm.getAsDouble()), worst, number(wavelengthNm(at)))));
    }
  }

  private void percolation(int l, Mixture mixture) {
    if (mixture.rule() != MixingRule.BRUGGEMAN) {
      return;
    }
    double metal = 0;
    for (int c = 0; c < mixture.components().size(); c++) {
      metal += isMetal(mixture.components().get(c).material()) ? fit.blend(l).fraction(0, c) : 0;
    }
    double threshold = mixture.depolarisationFactor();
    if (metal > 0 && Math.abs(metal - threshold) < NEAR_PERCOLATION) {
      findings.add(
          new Finding(
              "mixture-percolation",
              Severity.WARNING,
              plan.layerName(l),
              text(
                  "a metal fills %.3f of the layer, near the percolation threshold of %.3f where"
                      + " the optical constants change abruptly and depend on how the grains touch",
                  metal, threshold)));
    }
  }

  private void ruleRange(int l, Mixture mixture) {
    switch (mixture.rule()) {
      case MAXWELL_GARNETT -> {
        double inclusions = 1 - fit.blend(l).fraction(0, mixture.host());
        if (inclusions > DILUTE) {
          ruleFinding(
              l,
              text(
                  "maxwell-garnett describes separate spheres in their host, up to a fraction"
                      + " of about 0.3, but the inclusions fill %.3f; use bruggeman",
                  inclusions));
        }
      }
      case LORENTZ_LORENZ, LOOYENGA, REFRACTIVE_INDEX -> contrast(l, mixture);
      default -> {}
    }
  }

  private void contrast(int l, Mixture mixture) {
    double worst = 1;
    boolean metal = false;
    for (Mixture.Component a : mixture.components()) {
      metal |= isMetal(a.material());
      for (Mixture.Component b : mixture.components()) {
        worst = Math.max(worst, contrast(a.material(), b.material()));
      }
    }
    if (metal || worst > LOW_CONTRAST) {
      String what =
          metal ? "one component is a metal" : text("their indices differ by a factor %.2f", worst);
      ruleFinding(
          l,
          mixture.rule().id()
              + " is for components that differ little, but "
              + what
              + "; use bruggeman");
    }
  }

  private void ruleFinding(int l, String message) {
    findings.add(new Finding("mixture-rule", Severity.WARNING, plan.layerName(l), message));
  }

  private double contrast(int a, int b) {
    double worst = 0;
    for (int w = 0; w < plan.problem().wavelengthCount(); w++) {
      worst = Math.max(worst, design.n[a][w] / design.n[b][w]);
    }
    return worst;
  }

  private boolean isMetal(int material) {
    for (int w = 0; w < plan.problem().wavelengthCount(); w++) {
      if (design.k[material][w] > design.n[material][w]) {
        return true;
      }
    }
    return false;
  }

  private void face(RoughFace face) {
    FaceOptics optics = new FaceOptics(plan, fit, design);
    between(face, optics);
    if (face.isMixedLayer()) {
      highFace(face, optics);
    } else if (face.roughness().rmsNm() > 0.2 * face.roughness().correlationLengthNm()) {
      findings.add(
          new Finding(
              "roughness-steep",
              Severity.WARNING,
              where(face),
              text(
                  "an rms height of %s nm over a correlation length of %s nm is steeper than scalar"
                      + " scattering describes (a fifth); treat the haze as a lower estimate",
                  number(face.roughness().rmsNm()),
                  number(face.roughness().correlationLengthNm()))));
    }
  }

  private void between(RoughFace face, FaceOptics optics) {
    Problem problem = plan.problem();
    int first = -1;
    int last = -1;
    for (int w = 0; w < problem.wavelengthCount(); w++) {
      double ratio =
          Scales.ratio(problem, w, face.roughness().correlationLengthNm(), optics.larger(face, w));
      boolean holds = face.isMixedLayer() ? ratio <= Scales.FINE : ratio >= Scales.COARSE;
      first = !holds && first < 0 ? w : first;
      last = holds ? last : w;
    }
    if (first < 0) {
      return;
    }
    int mean = Scales.meanWavelength(problem);
    findings.add(
        new Finding(
            "roughness-between",
            mean >= first && mean <= last ? Severity.WARNING : Severity.NOTE,
            where(face),
            text(
                "between %s and %s nm the correlation length of %s nm is neither far below nor far"
                    + " above the wavelength in the media; it is described by %s, the nearer of the"
                    + " two",
                number(wavelengthNm(first)),
                number(wavelengthNm(last)),
                number(face.roughness().correlationLengthNm()),
                face.isMixedLayer() ? "a mixed layer" : "scalar scattering")));
  }

  private void highFace(RoughFace face, FaceOptics optics) {
    double worst = 0;
    int at = 0;
    for (int w = 0; w < plan.problem().wavelengthCount(); w++) {
      double ratio =
          Scales.ratio(plan.problem(), w, face.roughness().rmsNm(), optics.larger(face, w));
      at = ratio > worst ? w : at;
      worst = Math.max(worst, ratio);
    }
    if (worst > Scales.FINE) {
      findings.add(
          new Finding(
              "roughness-high",
              Severity.WARNING,
              where(face),
              text(
                  "an rms height of %s nm is %.2f of the wavelength in the media at %s nm (one mixed"
                      + " layer wants 0.1 or less); describe the face by a grading",
                  number(face.roughness().rmsNm()), worst, number(wavelengthNm(at)))));
    }
  }

  private String where(RoughFace face) {
    return plan.layerName(face.below());
  }

  private double wavelengthNm(int w) {
    return plan.problem().wavelengthNm().at(w);
  }

  static String text(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }

  static String number(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e9
        ? Long.toString((long) value)
        : text("%.4g", value);
  }
}
