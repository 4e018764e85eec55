package evensun.raytrace;

import evensun.raytrace.geometry.Relief;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.spi.Design;
import evensun.spi.Finding;
import evensun.spi.Problem;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;

/** What geometrical optics takes for granted, and how well a design grants it. */
final class Validity {

  /** Shapes narrower than so many wavelengths diffract noticeably (common practice). */
  private static final double WAVELENGTHS = 3;

  /** A film thicker than this share of the shapes rounds them (common practice). */
  private static final double FILM_SHARE = 0.1;

  /** Fringes wider than so many grid steps would be seen. */
  private static final double FRINGE_STEPS = 4;

  private final Problem problem;
  private final Design design;
  private final RayEvaluator evaluator;
  private final Traces.Traced traced;
  private final List<Finding> findings = new ArrayList<>();

  Validity(Problem problem, Design design, RayEvaluator evaluator) {
    this.problem = problem;
    this.design = design;
    this.evaluator = evaluator;
    traced = evaluator.ready(design, Beam.of(problem.incidences().get(0))).traced();
  }

  List<Finding> all() {
    for (int b = 0; b < traced.faces().size(); b++) {
      Face face = traced.faces().get(b);
      String where = traced.device().plainName(b) + " / " + traced.device().plainName(b + 1);
      face.relief().ifPresent(relief -> addRelief(relief, where));
      if (face.relief().isPresent()) {
        addFilms(b, face.relief().get());
        addRetracing(b, where);
      }
    }
    for (int m = 1; m < traced.device().mediaCount() - 1; m++) {
      addFringes(m);
    }
    addStatistics();
    return findings;
  }

  private double longestUm() {
    return problem.wavelengthNm().at(problem.wavelengthCount() - 1) / 1000;
  }

  private void addRelief(Relief relief, String where) {
    double ratio = relief.featureUm() / longestUm();
    findings.add(
        new Finding(
            "geometrical-optics",
            Severity.NOTE,
            where,
            Words.of(
                "rays take shapes of %s µm for planes without edges; that errs by more than the statistical errors stated with the results",
                relief.featureUm())));
    if (ratio < WAVELENGTHS) {
      findings.add(
          new Finding(
              "texture-near-wavelength",
              ratio < 1.5 ? Severity.SERIOUS : Severity.WARNING,
              where,
              Words.of(
                  "shapes of %s µm are %s times the longest wavelength of %s µm wide; below %s times, diffraction changes what rays predict",
                  relief.featureUm(), ratio, longestUm(), WAVELENGTHS)));
    }
  }

  private void addFilms(int boundary, Relief relief) {
    double total = 0;
    String names = "";
    for (int film : traced.device().boundaries().get(boundary).films()) {
      total += design.thicknessNm[film];
      names += (names.isEmpty() ? "" : ", ") + problem.layers().get(film).name();
    }
    double share = total / 1000 / relief.featureUm();
    if (share > FILM_SHARE) {
      findings.add(
          new Finding(
              "film-against-texture",
              Severity.WARNING,
              names,
              Words.of(
                  "films of together %s nm follow shapes %s µm wide; beyond %s %% of the width, tips and valleys are no longer flat facets with films of one thickness",
                  total, relief.featureUm(), 100 * FILM_SHARE)));
    }
  }

  private void addRetracing(int boundary, String where) {
    boolean moved =
        traced.device().boundaries().get(boundary).texture().stream()
            .anyMatch(texture -> texture.facetAngleDeg().knob().isPresent());
    if (moved) {
      findings.add(
          new Finding(
              "facet-angle-retraced",
              Severity.NOTE,
              where,
              Words.of(
                  "every new facet angle is traced anew, with %s meetings of rays and facets, and takes as long as tens of designs; an angle with a step, of %s values at most, is traced once for each",
                  traced.forest().meetings(), Traces.MOST_KEPT)));
    }
  }

  private void addFringes(int medium) {
    int last = problem.wavelengthCount() - 1;
    if (last == 0) {
      return;
    }
    double nm = problem.wavelengthNm().at(last);
    double step = nm - problem.wavelengthNm().at(last - 1);
    double n = design.n[traced.device().material(design, medium)][last];
    double thickness = 1000 * traced.device().thicknessUm(design, medium);
    double fringe = nm * nm / (2 * n * thickness);
    if (fringe > FRINGE_STEPS * step) {
      findings.add(
          new Finding(
              "thick-layer-interference",
              Severity.WARNING,
              traced.device().plainName(medium),
              Words.of(
                  "interference within a layer of %s nm is left out, though its fringes of %s nm would show on this grid; rays add intensities",
                  thickness, fringe)));
    }
  }

  private void addStatistics() {
    Estimate estimate = evaluator.estimate(design, 0);
    double largest = Current.largestError(problem, estimate);
    Facts facts = new Facts(problem, design, evaluator);
    findings.add(
        new Finding(
            "energy-balance",
            Severity.NOTE,
            "rays",
            Words.of(
                "the rays lose or make %s %% of the light before results are made to add up; currents have a standard error of at most %s mA cm⁻²",
                100 * facts.imbalance(evaluator.estimate(design, 0)), largest)));
    if (largest > 1.5 * problem.wantedErrorMaPerCm2()) {
      findings.add(
          new Finding(
              "ray-error",
              Severity.WARNING,
              "rays",
              Words.of(
                  "a current has a standard error of %s mA cm⁻², more than the wanted %s; set more rays in the options of solver ray-trace",
                  largest, problem.wantedErrorMaPerCm2())));
    }
  }
}
