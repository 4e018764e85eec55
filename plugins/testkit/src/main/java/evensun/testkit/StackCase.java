package evensun.testkit;

import evensun.spi.Design;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Samples;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * One stack under one light: what laws are tried on.
 *
 * @param wavelengthNm wavelengths in nm, evenly spaced
 * @param incident medium the light comes from, not absorbing
 * @param layers finite layers, the light meets the first first
 * @param exit medium behind them
 * @param angleDeg angle of incidence in degrees, in [0, 90)
 * @param polarisation polarisation of the light
 */
public record StackCase(
    Samples wavelengthNm,
    CaseMedium incident,
    List<CaseLayer> layers,
    CaseMedium exit,
    double angleDeg,
    Polarisation polarisation) {

  public StackCase {
    layers = List.copyOf(layers);
  }

  /** Number of finite layers. */
  public int layerCount() {
    return layers.size();
  }

  /** Number of wavelengths. */
  public int wavelengthCount() {
    return wavelengthNm.size();
  }

  /** This case with other layers. */
  public StackCase withLayers(List<CaseLayer> others) {
    return new StackCase(wavelengthNm, incident, others, exit, angleDeg, polarisation);
  }

  /** This case with one layer replaced by several, or by none. */
  public StackCase replacing(int layer, CaseLayer... by) {
    List<CaseLayer> others = new ArrayList<>(layers.subList(0, layer));
    others.addAll(Arrays.asList(by));
    others.addAll(layers.subList(layer + 1, layers.size()));
    return withLayers(others);
  }

  /** This case with other outer media. */
  public StackCase withMedia(CaseMedium otherIncident, CaseMedium otherExit) {
    return new StackCase(wavelengthNm, otherIncident, layers, otherExit, angleDeg, polarisation);
  }

  /** This case with other light. */
  public StackCase withLight(double otherAngleDeg, Polarisation other) {
    return new StackCase(wavelengthNm, incident, layers, exit, otherAngleDeg, other);
  }

  /** This case at other wavelengths, in nm. */
  public StackCase withWavelengthNm(Samples others) {
    return new StackCase(others, incident, layers, exit, angleDeg, polarisation);
  }

  /** Whether every solver has to take it: coherent layers and unpolarised light on the normal. */
  public boolean isPlain() {
    return angleDeg == 0
        && polarisation == Polarisation.UNPOLARISED
        && layers.stream().allMatch(CaseLayer::coherent);
  }

  /** What stays fixed, as a solver is asked; material 0 is the incident medium, 1 the exit. */
  public Problem problem() {
    List<Layer> finite = new ArrayList<>();
    for (int l = 0; l < layerCount(); l++) {
      finite.add(Layer.plain("layer-" + (l + 1), layers.get(l).coherent()));
    }
    double[] current = new double[wavelengthCount()];
    Arrays.fill(current, 1);
    return new Problem(
        wavelengthNm,
        Samples.of(current),
        finite,
        0,
        1,
        layerCount() + 2,
        0,
        List.of(new Incidence(angleDeg, polarisation, Side.FRONT)),
        1,
        1e-2,
        Map.of());
  }

  /** What may move, as a solver is asked. */
  public Design design() {
    Design design = Design.of(problem());
    fill(design, 0, incident);
    fill(design, 1, exit);
    for (int l = 0; l < layerCount(); l++) {
      fill(design, l + 2, layers.get(l).medium());
      design.material[l] = l + 2;
      design.thicknessNm[l] = layers.get(l).thicknessNm();
    }
    return design;
  }

  private void fill(Design design, int material, CaseMedium medium) {
    for (int w = 0; w < wavelengthCount(); w++) {
      design.n[material][w] = medium.nAt(wavelengthNm.at(w));
    }
    Arrays.fill(design.k[material], medium.k());
    design.revision[material] = Design.nextRevision();
  }
}
