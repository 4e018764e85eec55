package evensun.scenario.reader;

import evensun.scenario.DiodeSpec;
import evensun.scenario.DiodeSpec.CollectingFace;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Shown;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds the electrical keys of one subcell. */
final class DiodeBinder {

  private static final Interval EFFICIENCY = Interval.above(0, 1, "");
  private static final Interval FRACTION = Interval.closed(0, 1, "");
  private static final Interval COUPLING = Interval.below(0, 1, "");
  private static final Interval IDEALITY = Interval.closed(0.5, 5, "");
  private static final Interval SHUNT = Interval.above(0, 1e15, "Ω cm²");
  private static final Interval DIFFUSION = Interval.above(0, 1e9, "nm");
  private static final Interval BREAKDOWN = Interval.above(0, 1000, "V");

  private DiodeBinder() {}

  static DiodeSpec bind(Fields subcell) {
    Map<String, CollectingFace> faces = new LinkedHashMap<>();
    faces.put("front", CollectingFace.FRONT);
    faces.put("rear", CollectingFace.REAR);
    Optional<CollectingFace> face = subcell.choice("collectingFace", faces);
    DiodeSpec spec =
        new DiodeSpec(
            subcell.number("externalRadiativeEfficiency", EFFICIENCY),
            subcell.number("idealityFactor", IDEALITY),
            subcell.number("shuntOhmCm2", SHUNT),
            subcell.number("collectionFraction", FRACTION),
            subcell.number("diffusionLengthNm", DIFFUSION),
            face,
            subcell.number("reverseBreakdownV", BREAKDOWN),
            subcell.number("luminescentCouplingFraction", COUPLING));
    checkCollection(subcell);
    checkCoupling(subcell, spec);
    return spec;
  }

  /** A diffusion length means nothing without the face it leads to, nor beside a fixed fraction. */
  private static void checkCollection(Fields subcell) {
    boolean length = subcell.has("diffusionLengthNm");
    if (length && subcell.has("collectionFraction")) {
      subcell.fault(
          subcell.place("diffusionLengthNm"),
          "collectionFraction and diffusionLengthNm both say what is collected; keep one");
    }
    if (length != subcell.has("collectingFace")) {
      subcell.fault(
          subcell.place(length ? "diffusionLengthNm" : "collectingFace"),
          length
              ? "diffusionLengthNm needs the face at which carriers are collected; write collectingFace: front or rear"
              : "collectingFace needs a diffusion length; write diffusionLengthNm");
    }
  }

  /** What leaves as light at the front cannot be collected by the next subcell as well. */
  private static void checkCoupling(Fields subcell, DiodeSpec spec) {
    OptionalDouble coupling = spec.luminescentCouplingFraction();
    OptionalDouble efficiency = spec.externalRadiativeEfficiency();
    if (coupling.isPresent()
        && efficiency.isPresent()
        && coupling.getAsDouble() + efficiency.getAsDouble() > 1 + 1e-12) {
      subcell.fault(
          subcell.place("luminescentCouplingFraction"),
          "luminescentCouplingFraction must be at most 1 − externalRadiativeEfficiency, "
              + Shown.number(Math.rint((1 - efficiency.getAsDouble()) * 1e12) / 1e12)
              + ", but was "
              + Shown.number(coupling.getAsDouble()));
    }
  }
}
