package evensun.stack;

import evensun.scenario.FaceSpec;
import evensun.scenario.FaceSpec.RoughnessSpec;
import evensun.scenario.FaceSpec.ScatterSpec;
import evensun.scenario.FaceSpec.TextureSpec;
import evensun.scenario.Fault;
import evensun.scenario.FeatureSpec;
import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.scenario.FeatureSpec.GradingSpec;
import evensun.scenario.FeatureSpec.MixtureSpec;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.IdealFace;
import evensun.spi.Knob;
import evensun.spi.Mixture;
import evensun.spi.Parameter;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.stack.ResolvedLayer.ResolvedComponent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Finds the materials and the moved numbers of the features of layers. */
final class FeatureResolver {

  /** Word in a scenario for the medium that the light comes from. */
  private static final String AMBIENT = "ambient";

  private final Scenario scenario;
  private final MaterialSlots slots;
  private final SurfaceSource surfaces;
  private final List<ResolvedKnob> knobs = new ArrayList<>();

  FeatureResolver(Scenario scenario, MaterialSlots slots, SurfaceSource surfaces) {
    this.scenario = scenario;
    this.slots = slots;
    this.surfaces = surfaces;
  }

  /** Every number of a feature that the search moves. */
  List<ResolvedKnob> knobs() {
    return knobs;
  }

  /**
   * A layer with its features.
   *
   * @throws InputException with every fault of its features
   */
  ResolvedLayer layer(LayerSpec spec) {
    boolean coherent = spec.coherence().interferes();
    List<ResolvedComponent> components = components(spec);
    int slot =
        components.isEmpty()
            ? slots.slot(spec.name(), spec.material(), spec.gap(), spec.place())
            : components.get(0).slot();
    List<Feature> features = new ArrayList<>();
    for (FeatureSpec feature : spec.drawnFeatures()) {
      features.add(feature(spec, feature, components));
    }
    return new ResolvedLayer(spec, slot, coherent, features, components);
  }

  /**
   * What is not flat about the face of the exit medium, as it stands on the last layer.
   *
   * @param spec as drawn
   * @param films whether the last layer is a film of that boundary
   */
  Feature exitFace(FaceSpec spec, boolean films) {
    boolean ownFace = spec instanceof RoughnessSpec || !films;
    return face(scenario.exit().name(), spec, ownFace ? Side.REAR : Side.FRONT);
  }

  private List<ResolvedComponent> components(LayerSpec spec) {
    List<ResolvedComponent> components = new ArrayList<>();
    List<Fault> faults = new ArrayList<>();
    for (ComponentSpec component : spec.components()) {
      try {
        components.add(component(spec, component));
      } catch (InputException e) {
        faults.addAll(e.faults());
      }
    }
    if (!faults.isEmpty()) {
      throw new InputException(faults);
    }
    return components;
  }

  private ResolvedComponent component(LayerSpec layer, ComponentSpec component) {
    String material =
        component.material().equals(AMBIENT)
            ? scenario.incidentMedium().material()
            : component.material();
    // A porous layer has one material and a bandgap of its own, under the layer's name.
    boolean own = !layer.material().isEmpty() && component.name().equals("solid");
    String user = own ? layer.name() : layer.name() + "/" + component.name();
    int slot = slots.slot(user, material, component.gap(), component.place());
    return new ResolvedComponent(component.name(), slot);
  }

  private Feature feature(LayerSpec layer, FeatureSpec spec, List<ResolvedComponent> components) {
    if (spec instanceof MixtureSpec mixture) {
      return mixture(layer, mixture, components);
    }
    if (spec instanceof GradingSpec grading) {
      return grading(grading, components);
    }
    return face(layer.name(), (FaceSpec) spec, Side.FRONT);
  }

  private Feature face(String layer, FaceSpec spec, Side side) {
    if (spec instanceof RoughnessSpec roughness) {
      return new Roughness(roughness.rmsNm(), roughness.correlationLengthNm(), side);
    }
    if (spec instanceof ScatterSpec scatter) {
      return new Scatter(scatter.specularFraction(), scatter.cosinePower(), side);
    }
    return spec instanceof TextureSpec texture
        ? texture(layer, texture, side)
        : new IdealFace(side);
  }

  private Texture texture(String layer, TextureSpec spec, Side side) {
    return new Texture(
        spec.shape(),
        spec.points(),
        spec.arrangement(),
        moved(layer + ".texture.facetAngleDeg", spec.facetAngleDeg(), "facetAngleDeg", "degrees"),
        spec.baseUm(),
        spec.heightMap().map(surfaces::heightMap),
        side);
  }

  private static Grading grading(GradingSpec spec, List<ResolvedComponent> components) {
    ResolvedComponent from = components.get(0);
    ResolvedComponent to = components.get(1);
    return new Grading(
        new Grading.End(from.name(), from.slot()),
        new Grading.End(to.name(), to.slot()),
        spec.profile(),
        spec.rule(),
        spec.tolerance(),
        spec.featureSizeNm());
  }

  private Mixture mixture(LayerSpec layer, MixtureSpec spec, List<ResolvedComponent> components) {
    List<Mixture.Component> parts = new ArrayList<>();
    double fixed = 0;
    int host = -1;
    for (int c = 0; c < components.size(); c++) {
      ComponentSpec component = spec.components().get(c);
      Parameter fraction = fraction(layer, spec, component);
      fixed += fraction.knob().isPresent() ? 0 : fraction.value();
      host = component.name().equals(spec.host()) ? c : host;
      parts.add(new Mixture.Component(component.name(), components.get(c).slot(), fraction));
    }
    if (fixed == 0) {
      throw new InputException(
          spec.place(),
          "layer \"%s\": every component of the mixture varies or is drawn with a fraction of 0; one with a larger fraction must stay fixed and take the rest"
              .formatted(layer.name()));
    }
    return new Mixture(
        spec.rule(), scaled(parts), host, spec.depolarisationFactor(), spec.featureSizeNm());
  }

  /** Fractions as drawn may miss a sum of one by rounding in the file. */
  private static List<Mixture.Component> scaled(List<Mixture.Component> parts) {
    double sum = parts.stream().mapToDouble(part -> part.fraction().value()).sum();
    return parts.stream()
        .map(
            part ->
                new Mixture.Component(
                    part.name(),
                    part.material(),
                    new Parameter(part.fraction().value() / sum, part.fraction().knob())))
        .toList();
  }

  private Parameter fraction(LayerSpec layer, MixtureSpec spec, ComponentSpec component) {
    String key =
        spec.porous()
            ? layer.name() + (component.name().equals("pores") ? ".mixture.porosity" : "/")
            : layer.name() + "/" + component.name() + ".fraction";
    return moved(key, component.fraction(), "fraction", "");
  }

  /** A number of a feature: a knob where the search moves it. */
  private Parameter moved(String key, double drawn, String name, String unit) {
    Optional<VarySpec> vary =
        scenario.search().stream()
            .flatMap(search -> search.ranges().stream())
            .filter(v -> v.key().equals(key))
            .findFirst();
    if (vary.isEmpty()) {
      return Parameter.fixed(drawn);
    }
    Knob knob = new Knob(knobs.size(), name, unit, vary.get().low(), vary.get().high());
    knobs.add(new ResolvedKnob(key, knob, drawn));
    return Parameter.moved(drawn, knob);
  }
}
