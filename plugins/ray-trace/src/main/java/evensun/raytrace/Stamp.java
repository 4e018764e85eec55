package evensun.raytrace;

import evensun.raytrace.trace.Beam;
import evensun.spi.Design;
import evensun.spi.Problem;
import java.util.Arrays;

/** Tells without allocating that a design needs the same rays as the one before. */
final class Stamp {

  private final Problem problem;
  private final int[] octave; // [l] power of two below the thickness of an incoherent layer
  private final int[] material;
  private final long[] revision;
  private final double[] knob;
  private Beam beam;

  Stamp(Problem problem) {
    this.problem = problem;
    octave = new int[problem.layerCount()];
    material = new int[problem.layerCount()];
    revision = new long[problem.materialCount()];
    knob = new double[problem.knobCount()];
  }

  /** Whether whatever decides about rays is as it was when taken. */
  boolean matches(Design design, Beam other) {
    boolean same =
        other.equals(beam)
            && Arrays.equals(material, design.material)
            && Arrays.equals(revision, design.revision)
            && Arrays.equals(knob, design.knob);
    for (int l = 0; l < octave.length && same; l++) {
      same = octave[l] == octave(design, l);
    }
    return same;
  }

  void take(Design design, Beam other) {
    beam = other;
    System.arraycopy(design.material, 0, material, 0, material.length);
    System.arraycopy(design.revision, 0, revision, 0, revision.length);
    System.arraycopy(design.knob, 0, knob, 0, knob.length);
    for (int l = 0; l < octave.length; l++) {
      octave[l] = octave(design, l);
    }
  }

  private int octave(Design design, int l) {
    boolean coherent = problem.layers().get(l).coherent();
    return coherent ? 0 : Math.getExponent(design.thicknessNm[l] / 1000);
  }
}
