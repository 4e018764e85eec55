package evensun.device.gaps;

import evensun.device.DeviceParameters;
import evensun.light.Spectrum;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What a bandgap map is made for.
 *
 * @param junctions one entry for each junction, two or three, the light meets the first one first
 * @param spectrum the light at one sun
 * @param device connection, temperature, concentration
 * @param fromEv lowest gap of the mesh in eV, greater than 0
 * @param toEv highest gap of the mesh in eV
 * @param stepEv mesh in eV, at least 0.001
 */
public record GapOptions(
    List<Junction> junctions,
    Spectrum spectrum,
    DeviceParameters device,
    double fromEv,
    double toEv,
    double stepEv) {

  /** Names of two junctions, the light meets the first one first. */
  public static final List<String> TWO = List.of("top", "bottom");

  /** Names of three junctions. */
  public static final List<String> THREE = List.of("top", "middle", "bottom");

  private static final int MOST_GAPS = 1000;

  /**
   * One junction.
   *
   * @param fixedEv its gap in eV, or empty when it varies
   * @param radiativeEfficiency external radiative efficiency at one sun, in (0, 1]; the
   *     non-radiative branch has ideality 1
   * @param coupling part of its recombination that the next junction collects, in [0, 1)
   * @param absorptance part of the light above its gap that it absorbs, in (0, 1]; it emits by as
   *     much less than a step does
   */
  public record Junction(
      OptionalDouble fixedEv, double radiativeEfficiency, double coupling, double absorptance) {

    /** Varies, radiative, uncoupled, absorbing everything. */
    public static final Junction IDEAL = new Junction(OptionalDouble.empty(), 1, 0, 1);

    public Junction {
      if (!(absorptance > 0 && absorptance <= 1)) {
        throw new IllegalArgumentException("absorptance must be in (0, 1] but was " + absorptance);
      }
    }

    /** The same with a fixed gap in eV. */
    public Junction fixedAt(double ev) {
      return new Junction(OptionalDouble.of(ev), radiativeEfficiency, coupling, absorptance);
    }
  }

  public GapOptions {
    junctions = List.copyOf(junctions);
    if (junctions.size() < 2 || junctions.size() > 3) {
      throw new IllegalArgumentException("a bandgap map has two or three junctions");
    }
    if (!(fromEv > 0 && toEv >= fromEv && stepEv >= 0.001)) {
      throw new IllegalArgumentException(
          "the mesh must have 0 < from <= to and a step of at least 0.001 eV");
    }
    if ((toEv - fromEv) / stepEv > MOST_GAPS - 1) {
      throw new IllegalArgumentException(
          "the mesh must have at most " + MOST_GAPS + " gaps; take a larger step");
    }
    double last = Double.POSITIVE_INFINITY;
    for (Junction junction : junctions) {
      double gap = junction.fixedEv().orElse(Double.NaN);
      if (gap >= last) {
        throw new IllegalArgumentException(
            "fixed gaps must fall from the top to the bottom but "
                + gap
                + " eV follows "
                + last
                + " eV");
      }
      last = Double.isNaN(gap) ? last : gap;
    }
  }

  /** Names of the junctions. */
  public List<String> names() {
    return junctions.size() == 2 ? TWO : THREE;
  }

  /** Indices of the junctions that vary. */
  List<Integer> varied() {
    List<Integer> varied = new ArrayList<>();
    for (int i = 0; i < junctions.size(); i++) {
      if (junctions.get(i).fixedEv().isEmpty()) {
        varied.add(i);
      }
    }
    return Collections.unmodifiableList(varied);
  }

  /** Gaps of the mesh in eV, rising, on multiples of the step. */
  double[] meshEv() {
    long first = (long) Math.ceil(fromEv / stepEv - 1e-9);
    long last = (long) Math.floor(toEv / stepEv + 1e-9);
    double[] mesh = new double[(int) Math.max(0, last - first + 1)];
    for (int i = 0; i < mesh.length; i++) {
      mesh[i] = Math.rint((first + i) * stepEv * 1e9) / 1e9;
    }
    return mesh;
  }
}
