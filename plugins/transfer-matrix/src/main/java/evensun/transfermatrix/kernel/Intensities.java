package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * One polarisation of a whole stack: coherent packets seen from both sides, intensities across the
 * thick media between them.
 *
 * <p>Thick medium b stands in front of packet b; medium 0 is the half-space the light comes from,
 * the last is the one behind.
 */
final class Intensities {

  /** Number of packets. */
  int packets;

  /** [b] place of thick medium b in the layout. */
  final int[] thick;

  final Waves front;
  final Waves rear; // null in a stack without incoherent layers

  /** [b][w] reflectance of all that lies below thick medium b. */
  final double[][] below;

  /** [b][w] what an intensity entering thick medium b brings back to the same face. */
  final double[][] round;

  /** [b][w] factor by which those round trips add up. */
  final double[][] echo;

  /** [b][w] intensity entering thick medium b from above. */
  final double[][] entering;

  /** [b][w] intensity on packet b from above. */
  final double[][] falling;

  /** [b][w] intensity on packet b - 1 from below. */
  final double[][] returning;

  private final int wavelengths;
  private final boolean[] followed; // [j]
  private final double[] start;
  private final double[] row;

  Intensities(int layers, int thickLayers, int wavelengths) {
    this.wavelengths = wavelengths;
    int count = thickLayers + 2;
    thick = new int[count];
    front = new Waves(1, layers, wavelengths);
    rear = thickLayers == 0 ? null : new Waves(-1, layers, wavelengths);
    below = new double[count][];
    round = new double[count][wavelengths];
    echo = new double[count][wavelengths];
    entering = new double[count][wavelengths];
    falling = new double[count][wavelengths];
    returning = new double[count][wavelengths];
    for (int b = 0; b < thickLayers; b++) {
      below[b] = new double[wavelengths];
    }
    followed = new boolean[layers + 2];
    start = new double[wavelengths];
    row = new double[wavelengths];
  }

  /**
   * Solves the stack for light of intensity {@code share}.
   *
   * @param into rows that will be wanted
   */
  void solve(Optics optics, double share, Spectra into) {
    split(optics.layout);
    for (int j = 1; j <= optics.layout.layerCount; j++) {
      followed[j] = optics.layout.coherent[j] && into.absorptance[optics.layout.layer[j]] != null;
    }
    for (int b = 0; b < packets; b++) {
      front.solve(optics, thick[b], thick[b + 1], followed);
      if (b < packets - 1) {
        rear.solve(optics, thick[b + 1], thick[b], followed);
      }
    }
    addUp(optics);
    sendDown(optics, share);
  }

  private void split(Layout layout) {
    packets = 0;
    for (int j = 1; j <= layout.layerCount + 1; j++) {
      if (!layout.coherent[j]) {
        thick[++packets] = j;
      }
    }
  }

  /** [w] share of an intensity that survives a crossing of thick medium b. */
  double[] passed(Optics optics, int b) {
    return optics.phases.size[optics.layout.layer[thick[b]]];
  }

  /** [b][w] reflectance of all below thick medium b; the last packet's own for the last. */
  double[] below(int b) {
    return b == packets - 1 ? front.reflectance[thick[b]] : below[b];
  }

  private void addUp(Optics optics) {
    for (int b = packets - 2; b >= 0; b--) {
      int near = thick[b];
      int next = thick[b + 1];
      IntensityLoops.round(passed(optics, b + 1), below(b + 1), round[b + 1], wavelengths);
      IntensityLoops.echo(rear.reflectance[next], round[b + 1], echo[b + 1], wavelengths);
      IntensityLoops.gather(
          front.reflectance[near],
          front.transmittance[near],
          rear.transmittance[next],
          round[b + 1],
          echo[b + 1],
          below[b],
          wavelengths);
    }
  }

  private void sendDown(Optics optics, double share) {
    Arrays.fill(falling[0], share);
    for (int b = 1; b < packets; b++) {
      double[] transmitted = front.transmittance[thick[b - 1]];
      WaveLoops.product(falling[b - 1], transmitted, echo[b], entering[b], wavelengths);
      WaveLoops.product(entering[b], passed(optics, b), falling[b], wavelengths);
      WaveLoops.product(entering[b], round[b], returning[b], wavelengths);
    }
  }

  /** Writes the wanted rows, or adds them to what is there. */
  void report(Optics optics, boolean add, Spectra into) {
    if (into.reflectance != null) {
      report(falling[0], below(0), add, into.reflectance);
    }
    if (into.transmittance != null) {
      int last = packets - 1;
      report(falling[last], front.transmittance[thick[last]], add, into.transmittance);
    }
    for (int b = 0; b < packets; b++) {
      reportPacket(optics, b, add, into);
      if (b > 0) {
        reportThick(optics, b, add, into);
      }
    }
  }

  private void report(double[] intensity, double[] fraction, boolean add, double[] out) {
    WaveLoops.product(intensity, fraction, add ? row : out, wavelengths);
    if (add) {
      WaveLoops.add(row, out, wavelengths);
    }
  }

  private void reportPacket(Optics optics, int b, boolean add, Spectra into) {
    int near = thick[b];
    int far = thick[b + 1];
    WaveLoops.product(falling[b], front.norm[near], start, wavelengths);
    for (int j = near + 1; j < far; j++) {
      double[] out = into.absorptance[optics.layout.layer[j]];
      if (out != null) {
        front.absorb(optics, j, far, start, add, out);
      }
    }
    if (b == packets - 1) {
      return;
    }
    WaveLoops.product(returning[b + 1], rear.norm[far], start, wavelengths);
    for (int j = near + 1; j < far; j++) {
      double[] out = into.absorptance[optics.layout.layer[j]];
      if (out != null) {
        rear.absorb(optics, j, near, start, true, out);
      }
    }
  }

  private void reportThick(Optics optics, int b, boolean add, Spectra into) {
    double[] out = into.absorptance[optics.layout.layer[thick[b]]];
    if (out == null) {
      return;
    }
    double[] target = add ? row : out;
    IntensityLoops.absorbed(
        passed(optics, b), entering[b], falling[b], below(b), target, wavelengths);
    IntensityLoops.addMixed(
        falling[b], front.mixed[thick[b]], returning[b], rear.mixed[thick[b]], target, wavelengths);
    if (add) {
      WaveLoops.add(row, out, wavelengths);
    }
  }
}
