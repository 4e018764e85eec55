package evensun.device;

import evensun.light.Spectrum;
import evensun.result.Electrical;
import evensun.result.Electrical.CurvePoint;
import evensun.result.Electrical.SubcellElectrical;
import evensun.scenario.Connection;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/**
 * The electrical side of a device: from photocurrents to its curve, its maximum power, and what
 * each loss costs. Immutable and safe for threads.
 */
public final class DeviceModel {

  private static final int CURVE_POINTS = 121;
  private static final double DERIVATIVE_STEP_MA_PER_CM2 = 1e-3;

  private final List<SubcellParameters> subcells;
  private final DeviceParameters device;
  private final double irradianceWPerM2;
  private final @Nullable Spectrum spectrum;

  private DeviceModel(
      List<SubcellParameters> subcells,
      DeviceParameters device,
      double irradianceWPerM2,
      @Nullable Spectrum spectrum) {
    if (subcells.isEmpty()) {
      throw new IllegalArgumentException("a device needs at least one subcell");
    }
    if (!(irradianceWPerM2 > 0)) {
      throw new IllegalArgumentException(
          "irradiance must be greater than 0 W m⁻² but was " + irradianceWPerM2);
    }
    this.subcells = List.copyOf(subcells);
    this.device = device;
    this.irradianceWPerM2 = irradianceWPerM2;
    this.spectrum = spectrum;
  }

  /**
   * A device under a spectrum, whose limit starts the loss ladder.
   *
   * @param subcells in the order the light meets them, at least one
   * @param device the whole device
   * @param spectrum the light on the plane of the cell
   */
  public static DeviceModel of(
      List<SubcellParameters> subcells, DeviceParameters device, Spectrum spectrum) {
    return new DeviceModel(subcells, device, spectrum.totalWPerM2(), spectrum);
  }

  /**
   * A device of which only the irradiance is known; its ladder starts at the photocurrents.
   *
   * @param subcells in the order the light meets them, at least one
   * @param device the whole device
   * @param irradianceWPerM2 incident irradiance in W m⁻², greater than 0
   */
  public static DeviceModel of(
      List<SubcellParameters> subcells, DeviceParameters device, double irradianceWPerM2) {
    return new DeviceModel(subcells, device, irradianceWPerM2, null);
  }

  /** The subcells in the order the light meets them. */
  public List<SubcellParameters> subcells() {
    return subcells;
  }

  /** Temperature of the cell in K. */
  public double temperatureK() {
    return device.temperatureK();
  }

  /** The same device with other subcells, such as those of another bandgap. */
  public DeviceModel withSubcells(List<SubcellParameters> others) {
    return new DeviceModel(others, device, irradianceWPerM2, spectrum);
  }

  /** A fast worker for the aim of a search, for one thread. */
  public PowerModel newPowerModel() {
    return new PowerModel(subcells, device, irradianceWPerM2);
  }

  /**
   * Currents of the device at given voltages, in whatever light or bias.
   *
   * @param photocurrentMaPerCm2 [subcell] absorbed light in mA cm⁻², at least 0; the radiative
   *     efficiencies hold under it
   * @param voltageV [point] voltages at the terminals in V
   * @return [point] mA cm⁻², positive when the device delivers
   */
  public double[] currentMaPerCm2(double[] photocurrentMaPerCm2, double... voltageV) {
    DeviceOptics optics = DeviceOptics.ofCurrents(photocurrentMaPerCm2);
    DeviceState state = state(optics, pairing(optics, choose(optics)));
    Circuit circuit = state.circuit(state.collected(optics.photocurrents()));
    return Arrays.stream(voltageV).map(circuit::at).toArray();
  }

  /**
   * Which saturation currents suit a design.
   *
   * @param optics photocurrents, with spectra where there are any
   */
  public PairingChoice choose(DeviceOptics optics) {
    return Reciprocity.choose(optics, subcells, device);
  }

  private Pairing pairing(DeviceOptics optics, PairingChoice choice) {
    return Reciprocity.pairing(choice, optics, subcells, device);
  }

  /** Solves the device with the saturation currents that suit this design. */
  public DeviceAnalysis analyse(DeviceOptics optics) {
    return analyse(optics, choose(optics));
  }

  /**
   * Solves the device.
   *
   * @param optics photocurrents, with spectra where there are any
   * @param choice where the saturation currents come from
   * @throws IllegalArgumentException when it has another number of subcells
   */
  public DeviceAnalysis analyse(DeviceOptics optics, PairingChoice choice) {
    if (optics.subcellCount() != subcells.size()) {
      throw new IllegalArgumentException(
          "the device has "
              + subcells.size()
              + " subcells but photocurrents of "
              + optics.subcellCount());
    }
    Pairing pairing = pairing(optics, choice);
    DeviceState state = state(optics, pairing);
    Electrical electrical = electrical(state, pairing, optics);
    List<Finding> findings = new ArrayList<>(pairing.findings());
    if (choice.reciprocal()) {
      findings.addAll(doubts(optics));
    }
    findings.addAll(DeviceFindings.of(state, optics, electrical));
    return new DeviceAnalysis(electrical, findings);
  }

  /** Reciprocity suited the designs it was chosen at; it may suit this one less. */
  private List<Finding> doubts(DeviceOptics optics) {
    return choose(optics).findings().stream()
        .map(
            f ->
                new Finding(
                    "reciprocity-doubtful",
                    Severity.WARNING,
                    f.where(),
                    f.message()
                        .replaceFirst(
                            ".*?: ",
                            "reciprocity, chosen for the run, is doubtful for this design: ")))
        .toList();
  }

  private DeviceState state(DeviceOptics optics, Pairing pairing) {
    DeviceState unlit =
        new DeviceState(
            subcells, device, pairing.saturationMaPerCm2(), List.of(), irradianceWPerM2);
    return unlit.withOneSun(
        Arrays.stream(unlit.collected(optics.photocurrents()))
            .map(current -> current / device.suns())
            .boxed()
            .toList());
  }

  private Electrical electrical(DeviceState state, Pairing pairing, DeviceOptics optics) {
    double[] photocurrent = optics.photocurrents();
    double[] collected = state.collected(photocurrent);
    Circuit circuit = state.atMaximum(collected);
    double power = circuit.power;
    List<SubcellElectrical> cells =
        OperatingPoints.of(state, collected, gains(state, photocurrent));
    boolean common = device.connection() != Connection.INDEPENDENT;
    Double open = common ? (Double) circuit.openCircuitV() : null;
    Double closed = common ? (Double) circuit.at(0) : null;
    return new Electrical(
        pairing.name(),
        device.connection().name().toLowerCase(Locale.ROOT),
        device.temperatureK(),
        open,
        closed,
        open == null || closed == null ? null : MismatchCost.fillFactor(power, open, closed),
        power,
        PowerModel.percent(power, irradianceWPerM2),
        independentPercent(state, collected),
        cells,
        open == null ? List.of() : curve(circuit, open),
        MismatchCost.of(state, photocurrent),
        Ladder.of(state, optics, spectrum),
        common ? OperatingPoints.limiting(state, collected) : null);
  }

  /**
   * The same subcells, each at its own best voltage. A series resistance is shared out so that the
   * same currents lose no more in it than in the device itself.
   */
  private double independentPercent(DeviceState state, double[] collected) {
    boolean series = device.connection() == Connection.SERIES;
    double ohmCm2 = device.seriesResistanceOhmCm2() / (series ? subcells.size() : 1);
    DeviceParameters independent =
        device.withConnection(Connection.INDEPENDENT).withSeriesResistance(ohmCm2);
    return state.withDevice(independent).efficiencyPercent(collected);
  }

  /** dη/dJ of each subcell: absolute percent per mA cm⁻² of absorbed light, its diode kept. */
  private double[] gains(DeviceState state, double[] photocurrent) {
    double[] gains = new double[photocurrent.length];
    for (int i = 0; i < gains.length; i++) {
      double h = Math.min(DERIVATIVE_STEP_MA_PER_CM2, 0.5 * photocurrent[i]);
      double up = moved(state, photocurrent, i, h > 0 ? h : DERIVATIVE_STEP_MA_PER_CM2);
      double down = moved(state, photocurrent, i, -h);
      gains[i] = (up - down) / (h > 0 ? 2 * h : DERIVATIVE_STEP_MA_PER_CM2);
    }
    return gains;
  }

  private static double moved(DeviceState state, double[] photocurrent, int i, double by) {
    double[] other = photocurrent.clone();
    other[i] += by;
    return state.efficiencyPercent(state.collected(other));
  }

  private static List<CurvePoint> curve(Circuit circuit, double openV) {
    List<CurvePoint> points = new ArrayList<>();
    for (int i = 0; i < CURVE_POINTS; i++) {
      double v = openV * i / (CURVE_POINTS - 1);
      points.add(new CurvePoint(v, circuit.at(v)));
    }
    return List.copyOf(points);
  }
}
