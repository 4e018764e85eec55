package evensun.stack;

import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.scenario.Scenario;
import evensun.spi.Finding;
import java.util.Arrays;
import java.util.List;

/**
 * A scenario with its materials and light found: what the stack means physically.
 *
 * @param scenario what it was made from
 * @param grid the wavelengths
 * @param spectrum the light
 * @param slots every row of optical constants
 * @param incidentSlot row of the incident medium
 * @param layers the finite layers
 * @param exitSlot row of the exit medium
 * @param subcells in the order the light meets them
 * @param knobs numbers of features that the search moves, by their index in a design
 * @param findings what a reader should know already
 */
public record ResolvedStack(
    Scenario scenario,
    WavelengthGrid grid,
    Spectrum spectrum,
    List<MaterialSlot> slots,
    int incidentSlot,
    List<ResolvedLayer> layers,
    int exitSlot,
    List<ResolvedSubcell> subcells,
    List<ResolvedKnob> knobs,
    List<Finding> findings) {

  public ResolvedStack {
    slots = List.copyOf(slots);
    layers = List.copyOf(layers);
    subcells = List.copyOf(subcells);
    knobs = List.copyOf(knobs);
    findings = List.copyOf(findings);
  }

  /** Whether there is one wavelength only: spectra, no currents. */
  public boolean isMonochromatic() {
    return grid.size() == 1;
  }

  /** The rows of optical constants that a layer or a medium which is there uses. */
  public List<MaterialSlot> usedSlots() {
    return slots.stream().filter(slot -> isUsed(slot, scenario)).toList();
  }

  static boolean isUsed(MaterialSlot slot, Scenario scenario) {
    return slot.layers().stream().anyMatch(scenario::isThere);
  }

  /** Index that stands for the exit medium where layers are counted. */
  public int exitLayer() {
    return layers.size();
  }

  /** Name of a layer by index, the exit medium included. */
  public String layerName(int layer) {
    return layer == exitLayer() ? scenario.exit().name() : layers.get(layer).name();
  }

  /** [slot] the finite layer that a row of optical constants belongs to first, or −1. */
  public int[] layersOfSlots() {
    int[] layerOf = new int[slots.size()];
    Arrays.fill(layerOf, -1);
    for (int l = layers.size() - 1; l >= 0; l--) {
      layerOf[layers.get(l).slot()] = l;
      for (ResolvedLayer.ResolvedComponent component : layers.get(l).components()) {
        layerOf[component.slot()] = l;
      }
    }
    return layerOf;
  }

  /** Whether any boundary is shaped or scatters. */
  public boolean isShaped() {
    return Boundary.of(layers).stream().anyMatch(boundary -> !boundary.features().isEmpty());
  }

  /** This stack with every boundary flat and films of the same thickness. */
  public ResolvedStack flattened() {
    return new ResolvedStack(
        scenario,
        grid,
        spectrum,
        slots,
        incidentSlot,
        layers.stream().map(ResolvedLayer::flattened).toList(),
        exitSlot,
        subcells,
        knobs,
        findings);
  }
}
