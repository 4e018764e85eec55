package evensun.stack;

import evensun.scenario.Fault;
import evensun.scenario.FeatureSpec;
import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.scenario.FeatureSpec.GradingSpec;
import evensun.scenario.FeatureSpec.MixtureSpec;
import evensun.scenario.FeatureSpec.RoughnessSpec;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.Knob;
import evensun.spi.Mixture;
import evensun.spi.Parameter;
import evensun.spi.Roughness;
import evensun.spi.Side;
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
  private final List<ResolvedKnob> knobs = new ArrayList<>();

  FeatureResolver(Scenario scenario, MaterialSlots slots) {
    this.scenario = scenario;
    this.slots = slots;
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
    boolean coherent = spec.coherence() != LayerSpec.Coherence.INCOHERENT;
    List<ResolvedComponent> components = components(spec);
    int slot =
        components.isEmpty()
            ? slots.slot(spec.name(), spec.material(), spec.bandgapEv(), spec.place())
            : components.get(0).slot();
    List<Feature> features = new ArrayList<>();
    for (FeatureSpec feature : spec.features()) {
      features.add(feature(spec, feature, components));
    }
    return new ResolvedLayer(spec, slot, coherent, features, components);
  }

  /** A rough face of the exit medium: it stands on the last layer. */
  static Roughness exitFace(RoughnessSpec spec) {
    return new Roughness(spec.rmsNm(), spec.correlationLengthNm(), Side.REAR);
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
    int slot = slots.slot(user, material, component.bandgapEv(), component.place());
    return new ResolvedComponent(component.name(), slot);
  }

  private Feature feature(LayerSpec layer, FeatureSpec spec, List<ResolvedComponent> components) {
    if (spec instanceof MixtureSpec mixture) {
      return mixture(layer, mixture, components);
    }
    if (spec instanceof GradingSpec grading) {
      return grading(grading, components);
    }
    RoughnessSpec roughness = (RoughnessSpec) spec;
    return new Roughness(roughness.rmsNm(), roughness.correlationLengthNm(), Side.FRONT);
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
    Optional<VarySpec> vary =
        scenario.search().stream()
            .flatMap(search -> search.vary().stream())
            .filter(v -> v.key().equals(key))
            .findFirst();
    if (vary.isEmpty()) {
      return Parameter.fixed(component.fraction());
    }
    Knob knob = new Knob(knobs.size(), "fraction", "", vary.get().low(), vary.get().high());
    knobs.add(new ResolvedKnob(key, knob, component.fraction()));
    return Parameter.moved(component.fraction(), knob);
  }
}
