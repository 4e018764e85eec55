package evensun.stack;

import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.material.MaterialRangeException;
import evensun.scenario.FaceSpec;
import evensun.scenario.Fault;
import evensun.scenario.GridSpec;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec;
import evensun.scenario.MediumSpec;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.SubcellSpec;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Finds the materials and light of a scenario and checks what needs them; all faults together. */
public final class StackResolver {

  private final Scenario scenario;
  private final WavelengthGrid grid;
  private final MaterialSlots slots;
  private final FeatureResolver features;
  private final List<Fault> faults = new ArrayList<>();
  private final List<Finding> findings = new ArrayList<>();

  private StackResolver(Scenario scenario, MaterialSource materials, SurfaceSource surfaces) {
    this.scenario = scenario;
    GridSpec spec = scenario.grid();
    this.grid = WavelengthGrid.of(spec.fromNm(), spec.toNm(), spec.stepNm());
    this.slots = new MaterialSlots(materials);
    this.features = new FeatureResolver(scenario, slots, surfaces);
  }

  /**
   * Resolves a scenario.
   *
   * @param scenario as read
   * @param materials where its materials come from
   * @param surfaces where its measured surfaces come from
   * @param spectrum its light
   * @throws InputException with every fault found
   */
  public static ResolvedStack resolve(
      Scenario scenario, MaterialSource materials, SurfaceSource surfaces, Spectrum spectrum) {
    return new StackResolver(scenario, materials, surfaces).resolve(spectrum);
  }

  /** As above, for a scenario without measured surfaces. */
  public static ResolvedStack resolve(
      Scenario scenario, MaterialSource materials, Spectrum spectrum) {
    SurfaceSource none =
        spec -> {
          throw new InputException(spec.place(), "measured surfaces are not read here");
        };
    return resolve(scenario, materials, none, spectrum);
  }

  private ResolvedStack resolve(Spectrum spectrum) {
    int incident = medium(scenario.incidentMedium());
    List<ResolvedLayer> layers = new ArrayList<>();
    for (LayerSpec layer : scenario.stack()) {
      layers.add(layer(layer));
    }
    int exit = medium(scenario.exit());
    stopOnFaults();
    exitFaces(layers);
    new FaceRules(scenario, layers, faults, findings).check();
    checkOptics(spectrum, incident, layers);
    List<ResolvedSubcell> subcells = new ArrayList<>();
    for (SubcellSpec subcell : scenario.subcells()) {
      subcells.add(subcell(subcell, layers, exit));
    }
    stopOnFaults();
    return new ResolvedStack(
        scenario,
        grid,
        spectrum,
        slots.slots(),
        incident,
        layers,
        exit,
        subcells,
        features.knobs(),
        findings);
  }

  private int medium(MediumSpec medium) {
    try {
      return slots.slot(medium.name(), medium.material(), medium.gap(), medium.place());
    } catch (InputException e) {
      faults.addAll(e.faults());
      return 0;
    }
  }

  private ResolvedLayer layer(LayerSpec layer) {
    try {
      return features.layer(layer);
    } catch (InputException e) {
      faults.addAll(e.faults());
      return new ResolvedLayer(layer, 0, layer.coherence().interferes());
    }
  }

  private void exitFaces(List<ResolvedLayer> layers) {
    int last = layers.size() - 1;
    for (FaceSpec face : scenario.exit().faces()) {
      if (last < 0) {
        faults.add(
            new Fault(
                face.place(),
                "an exit medium whose face is not flat needs a layer above it; draw one of thickness 0"));
        continue;
      }
      try {
        ResolvedLayer layer = layers.get(last);
        layers.set(last, layer.withFeature(features.exitFace(face, layer.coherent())));
      } catch (InputException e) {
        faults.addAll(e.faults());
      }
    }
  }

  /** Checks that need n and k on the grid: range of the data, coherence, incident medium. */
  private void checkOptics(Spectrum spectrum, int incident, List<ResolvedLayer> layers) {
    double[] wavelengthNm = grid.wavelengthNm();
    List<MaterialSlot> all = slots.slots();
    for (int s = 0; s < all.size(); s++) {
      double[] n = new double[grid.size()];
      double[] k = new double[grid.size()];
      try {
        var filler = all.get(s).material().on(wavelengthNm);
        filler.fill(all.get(s).fillValue(), n, k);
        if (ResolvedStack.isUsed(all.get(s), scenario)) {
          findings.addAll(filler.findings());
        }
      } catch (MaterialRangeException e) {
        faults.add(new Fault(placeOf(all.get(s)), range(e, spectrum)));
        continue;
      }
      if (s == incident) {
        checkIncident(k);
      }
      checkCoherence(s, layers, n, k);
    }
  }

  private void checkCoherence(int slot, List<ResolvedLayer> layers, double[] n, double[] k) {
    for (ResolvedLayer layer : layers) {
      if (layer.slot() == slot && layer.coherent()) {
        try {
          CoherenceRule.check(layer.spec(), grid, n, k, thickestNm(layer.spec()))
              .ifPresent(findings::add);
        } catch (InputException e) {
          faults.addAll(e.faults());
        }
      }
    }
  }

  private double thickestNm(LayerSpec layer) {
    return Reach.of(scenario, layer.name() + ".thicknessNm", layer.drawnNm()).high();
  }

  private void checkIncident(double[] k) {
    double largest = 0;
    for (double value : k) {
      largest = Math.max(largest, value);
    }
    MediumSpec medium = scenario.incidentMedium();
    if (largest >= 1e-6) {
      faults.add(
          new Fault(
              medium.place(),
              "medium \"%s\": the incident medium must not absorb, but its extinction coefficient reaches %.3g; list it as a layer below air instead"
                  .formatted(medium.material(), largest)));
    } else if (largest > 0) {
      findings.add(
          new Finding(
              "incident-absorption-ignored",
              Severity.NOTE,
              medium.material(),
              "the extinction coefficient of the incident medium (at most %.2g) is taken as zero"
                  .formatted(largest)));
    }
  }

  private String range(MaterialRangeException e, Spectrum spectrum) {
    double lost = spectrum.photonCurrentMaPerCm2(grid.fromNm(), Math.min(e.fromNm(), grid.toNm()));
    lost = Math.max(0, lost);
    lost +=
        Math.max(0, spectrum.photonCurrentMaPerCm2(Math.max(e.toNm(), grid.fromNm()), grid.toNm()));
    return "%s; %.2f mA cm⁻² of the available current are at stake".formatted(e.getMessage(), lost);
  }

  private Place placeOf(MaterialSlot slot) {
    String layer = slot.layers().get(0).replaceFirst("/.*", "");
    return scenario.stack().stream()
        .filter(spec -> spec.name().equals(layer))
        .map(LayerSpec::place)
        .findFirst()
        .orElse(
            scenario.exit().name().equals(layer)
                ? scenario.exit().place()
                : scenario.incidentMedium().place());
  }

  private ResolvedSubcell subcell(SubcellSpec spec, List<ResolvedLayer> layers, int exit) {
    List<ResolvedSubcell.Absorber> absorbers = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    for (String absorber : spec.absorbers()) {
      int slash = absorber.indexOf('/');
      String layer = slash < 0 ? absorber : absorber.substring(0, slash);
      String component = slash < 0 ? "" : absorber.substring(slash + 1);
      int index = indexOf(layer, layers);
      if (index < 0 || !seen.add(absorber)) {
        faults.add(
            new Fault(
                spec.place(),
                "subcell \"%s\": absorber \"%s\" names no layer, or names one twice"
                    .formatted(spec.name(), absorber)));
      } else {
        int slot = index == layers.size() ? exit : slot(layers.get(index), component);
        absorbers.add(new ResolvedSubcell.Absorber(index, component, slot));
      }
    }
    return new ResolvedSubcell(spec.name(), absorbers);
  }

  private static int slot(ResolvedLayer layer, String component) {
    return layer.components().stream()
        .filter(c -> c.name().equals(component))
        .mapToInt(ResolvedLayer.ResolvedComponent::slot)
        .findFirst()
        .orElse(layer.slot());
  }

  private int indexOf(String layer, List<ResolvedLayer> layers) {
    for (int i = 0; i < layers.size(); i++) {
      if (layers.get(i).name().equals(layer)) {
        return i;
      }
    }
    return scenario.exit().name().equals(layer) ? layers.size() : -1;
  }

  private void stopOnFaults() {
    if (!faults.isEmpty()) {
      throw new InputException(faults);
    }
  }
}
