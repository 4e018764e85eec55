package evensun.stack;

import evensun.scenario.FaceSpec;
import evensun.scenario.FaceSpec.IdealSpec;
import evensun.scenario.FaceSpec.RoughnessSpec;
import evensun.scenario.FaceSpec.TextureSpec;
import evensun.scenario.Fault;
import evensun.scenario.LayerSpec;
import evensun.scenario.LayerSpec.Coherence;
import evensun.scenario.Scenario;
import evensun.spi.Finding;
import evensun.spi.Severity;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Checks that what shapes and scatters at boundaries goes together with the stack around it. */
final class FaceRules {

  private final Scenario scenario;
  private final List<ResolvedLayer> layers;
  private final List<Boundary> boundaries;
  private final List<Fault> faults;
  private final List<Finding> findings;

  FaceRules(
      Scenario scenario, List<ResolvedLayer> layers, List<Fault> faults, List<Finding> findings) {
    this.scenario = scenario;
    this.layers = layers;
    this.boundaries = Boundary.of(layers);
    this.faults = faults;
    this.findings = findings;
  }

  /** A face with the layer it is written in. */
  private record Written(String layer, FaceSpec face) {}

  void check() {
    for (int b = 0; b < boundaries.size(); b++) {
      List<Written> written = written(boundaries.get(b));
      onlyOne(b, written);
      ideal(b, written);
      films(b);
    }
    for (int b = 1; b < boundaries.size(); b++) {
      thick(b);
      planarising(b);
    }
  }

  private List<Written> written(Boundary boundary) {
    List<Written> written = new ArrayList<>();
    for (int l = boundary.firstFilm(); l <= boundary.below() && l < layers.size(); l++) {
      LayerSpec layer = layers.get(l).spec();
      layer.features().stream()
          .filter(f -> f instanceof FaceSpec && !(f instanceof RoughnessSpec))
          .forEach(face -> written.add(new Written(layer.name(), (FaceSpec) face)));
    }
    if (boundary.below() == layers.size()) {
      scenario.exit().faces().stream()
          .filter(face -> !(face instanceof RoughnessSpec))
          .forEach(face -> written.add(new Written(scenario.exit().name(), face)));
    }
    return written;
  }

  private void onlyOne(int b, List<Written> written) {
    for (int i = 1; i < written.size(); i++) {
      fault(
          written.get(i),
          "the boundary between "
              + between(b)
              + " has a texture or scatter already, in layer \""
              + written.get(0).layer()
              + "\"; either means the whole boundary with all its films, keep one");
    }
  }

  private void ideal(int b, List<Written> written) {
    for (Written one : written) {
      if (one.face() instanceof IdealSpec && b > 0 && b < boundaries.size() - 1) {
        fault(
            one,
            "scatter: ideal is the limit of an outer boundary, but this one lies between "
                + between(b));
      }
    }
  }

  /** Films that follow facets are thinner than the facets are high. */
  private void films(int b) {
    Optional<Texture> texture = boundaries.get(b).texture();
    double filmsNm = 0;
    for (int l = boundaries.get(b).firstFilm(); l < boundaries.get(b).below(); l++) {
      filmsNm += thickness(l).high();
    }
    if (texture.isPresent() && filmsNm > 0) {
      double heightNm = 1e3 * Relief.ofOneShapeUm(texture.get(), angle(texture.get()).low());
      if (filmsNm >= heightNm) {
        Written one =
            written(boundaries.get(b)).stream()
                .filter(w -> w.face() instanceof TextureSpec)
                .findFirst()
                .orElseThrow();
        fault(
            one,
            "texture must be higher than its films are thick, "
                + shown(filmsNm)
                + " nm together where they are thickest, but is "
                + shown(heightNm)
                + " nm high; make it larger or write planarises: true at the film that fills it");
      }
    }
  }

  /** The mean planes of two boundaries are further apart than their textures reach. */
  private void thick(int b) {
    int l = boundaries.get(b - 1).below();
    double fromAbove =
        boundaries
            .get(b - 1)
            .texture()
            .map(t -> Relief.of(t, angle(t).high()).belowUm())
            .orElse(0.0);
    double fromBelow =
        boundaries.get(b).texture().map(t -> Relief.of(t, angle(t).high()).aboveUm()).orElse(0.0);
    double reachNm = 1e3 * (fromAbove + fromBelow);
    double thinnestNm = thickness(l).low();
    if (reachNm > 0 && thinnestNm <= reachNm) {
      LayerSpec layer = layers.get(l).spec();
      faults.add(
          new Fault(
              layer.place(),
              "layer \"%s\": thicknessNm, counted between mean planes, must exceed the %s nm that the textures of its faces reach into it but was %s"
                  .formatted(layer.name(), shown(reachNm), shown(thinnestNm))));
    }
  }

  private void planarising(int b) {
    LayerSpec layer = layers.get(boundaries.get(b - 1).below()).spec();
    if (layer.coherence() != Coherence.PLANARISES) {
      return;
    }
    if (boundaries.get(b).texture().isEmpty()) {
      faults.add(
          new Fault(
              layer.place(),
              "layer \"%s\": planarises: true needs a texture below it, but the boundary between %s is flat"
                  .formatted(layer.name(), between(b))));
    } else if (boundaries.get(b - 1).texture().isPresent()) {
      faults.add(
          new Fault(
              layer.place(),
              "layer \"%s\": planarises: true makes its upper face flat, but the boundary between %s has a texture"
                  .formatted(layer.name(), between(b - 1))));
    } else {
      findings.add(
          new Finding(
              "planarised-interference-ignored",
              Severity.NOTE,
              layer.name(),
              "fills the texture below it, so that its thickness differs from place to place about %s nm; intensities add in it, interference is left out"
                  .formatted(shown(layer.thicknessNm()))));
    }
  }

  private Reach thickness(int l) {
    LayerSpec layer = layers.get(l).spec();
    return Reach.of(scenario, layer.name() + ".thicknessNm", layer.drawnNm());
  }

  private static Reach angle(Texture texture) {
    double drawn = texture.facetAngleDeg().value();
    return texture
        .facetAngleDeg()
        .knob()
        .map(knob -> new Reach(Math.min(drawn, knob.low()), Math.max(drawn, knob.high())))
        .orElse(new Reach(drawn, drawn));
  }

  private String between(int b) {
    int above = boundaries.get(b).firstFilm() - 1;
    int below = boundaries.get(b).below();
    return "\"%s\" and \"%s\""
        .formatted(
            above < 0 ? scenario.incidentMedium().name() : layers.get(above).name(),
            below < layers.size() ? layers.get(below).name() : scenario.exit().name());
  }

  private void fault(Written one, String message) {
    faults.add(new Fault(one.face().place(), "layer \"%s\": %s".formatted(one.layer(), message)));
  }

  private static String shown(double nm) {
    return String.format(Locale.ROOT, "%.0f", nm);
  }
}
