package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * Derivatives of weighted sums by all thicknesses: the intensities across thick media are
 * differentiated backwards, which says how much every packet's reflectance, transmittance and
 * absorptances count, and {@link PacketGradient} takes it from there.
 *
 * <p>Names ending in Bar are derivatives of the sum at hand by the quantity named.
 */
final class StackGradient {

  private final Intensities stack;
  private final PacketGradient front;
  private final PacketGradient rear;
  private final int wavelengths;
  private final boolean[] weighted; // [j]
  private final double[][] scaled; // [j][w] storage of weights times intensity
  private final double[][] weight; // [j] row of scaled, or null
  private final double[][] thickWeight; // [b][w]
  private final double[][] frontValue; // [b][w] weighted absorptance for unit intensity from above
  private final double[][] rearValue; // [b][w] the same from below
  private final double[][] enteringBar; // [b][w]
  private final double[][] passedBar;
  private final double[][] roundBar;
  private final double[][] echoBar;
  private final double[][] belowBar; // [b] is also that of the front reflectance of packet b
  private final double[][] frontTransmittanceBar; // [b] of packet b
  private final double[][] rearTransmittanceBar;
  private final double[][] rearReflectanceBar;
  private final double[] mixedBar;
  private final double[] transmittanceBar;

  StackGradient(Intensities stack, int layers, int thickLayers, int wavelengths) {
    this.stack = stack;
    this.wavelengths = wavelengths;
    front = new PacketGradient(stack.front, layers, wavelengths);
    rear = thickLayers == 0 ? null : new PacketGradient(stack.rear, layers, wavelengths);
    weighted = new boolean[layers + 2];
    scaled = new double[layers + 2][wavelengths];
    weight = new double[layers + 2][];
    int count = thickLayers + 2;
    thickWeight = new double[count][wavelengths];
    frontValue = new double[count][wavelengths];
    rearValue = new double[count][wavelengths];
    enteringBar = new double[count][wavelengths];
    passedBar = new double[count][wavelengths];
    roundBar = new double[count][wavelengths];
    echoBar = new double[count][wavelengths];
    belowBar = new double[count][wavelengths];
    frontTransmittanceBar = new double[count][wavelengths];
    rearTransmittanceBar = new double[count][wavelengths];
    rearReflectanceBar = new double[count][wavelengths];
    mixedBar = new double[wavelengths];
    transmittanceBar = new double[wavelengths];
  }

  /**
   * Adds the derivatives of all sums for the polarisation that was solved last.
   *
   * @param into [s*L + l] derivative per nm
   */
  void add(Optics optics, Weights weights, int layers, double[] into) {
    Layout layout = optics.layout;
    for (int j = 1; j <= layout.layerCount; j++) {
      weighted[j] = false;
      for (int s = 0; s < weights.sums; s++) {
        weighted[j] |= weights.absorptance[s][layout.layer[j]] != null;
      }
    }
    for (int b = 0; b < stack.packets; b++) {
      front.prepare(optics, stack.thick[b], stack.thick[b + 1], weighted);
      if (b < stack.packets - 1) {
        rear.prepare(optics, stack.thick[b + 1], stack.thick[b], weighted);
      }
    }
    for (int s = 0; s < weights.sums; s++) {
      double[] transmittance = weights.transmittance[s];
      backward(optics, weights.absorptance[s], transmittance);
      packets(optics, weights.absorptance[s], transmittance, into, s * layers);
    }
  }

  private void packets(
      Optics optics, double[][] absorptance, double[] transmittance, double[] into, int offset) {
    int last = stack.packets - 1;
    for (int b = 0; b <= last; b++) {
      int near = stack.thick[b];
      int far = stack.thick[b + 1];
      double[] intensity = stack.falling[b];
      scale(optics, near, far, absorptance, intensity);
      double[] onward = frontTransmittanceBar[b];
      if (b == last) {
        onward = transmittance == null ? null : transmittanceBar;
        if (onward != null) {
          WaveLoops.product(transmittance, intensity, onward, wavelengths);
        }
      }
      boolean lit = b > 0;
      if (lit) {
        WaveLoops.product(thickWeight[b], intensity, mixedBar, wavelengths);
      }
      front.add(
          optics, near, far, weight, onward, lit ? belowBar[b] : null, mixedBar, into, offset);
      if (b < last) {
        rear(optics, b, absorptance, into, offset);
        thick(optics, b + 1, into, offset);
      }
    }
  }

  private void rear(Optics optics, int b, double[][] absorptance, double[] into, int offset) {
    int near = stack.thick[b + 1];
    int far = stack.thick[b];
    double[] intensity = stack.returning[b + 1];
    scale(optics, far, near, absorptance, intensity);
    WaveLoops.product(thickWeight[b + 1], intensity, mixedBar, wavelengths);
    rear.add(
        optics,
        near,
        far,
        weight,
        rearTransmittanceBar[b],
        rearReflectanceBar[b],
        mixedBar,
        into,
        offset);
  }

  private void scale(
      Optics optics, int above, int below, double[][] absorptance, double[] intensity) {
    for (int j = above + 1; j < below; j++) {
      double[] row = absorptance[optics.layout.layer[j]];
      weight[j] = row == null ? null : scaled[j];
      if (row != null) {
        WaveLoops.product(row, intensity, scaled[j], wavelengths);
      }
    }
  }

  private void thick(Optics optics, int b, double[] into, int offset) {
    int j = stack.thick[b];
    double[] decay = optics.media.decayPerNm[optics.media.place(optics.layout, j)];
    WaveLoops.product(passedBar[b], stack.passed(optics, b), decay, mixedBar, wavelengths);
    into[offset + optics.layout.layer[j]] += MediumRows.DECAY_PARTS * RowSums.total(mixedBar);
  }

  /** Derivatives of the sum by what the packets do. */
  private void backward(Optics optics, double[][] absorptance, double[] transmittance) {
    int last = stack.packets - 1;
    if (last == 0) {
      return;
    }
    values(optics, absorptance, transmittance);
    for (int b = last; b > 0; b--) {
      sentDown(optics, b, b == last);
    }
    Arrays.fill(belowBar[0], 0);
    for (int b = 1; b <= last; b++) {
      addedUp(optics, b);
    }
  }

  private void values(Optics optics, double[][] absorptance, double[] transmittance) {
    int last = stack.packets - 1;
    for (int b = 0; b <= last; b++) {
      int near = stack.thick[b];
      int far = stack.thick[b + 1];
      Arrays.fill(frontValue[b], 0);
      Arrays.fill(rearValue[b], 0);
      for (int j = near + 1; j < far; j++) {
        double[] row = absorptance[optics.layout.layer[j]];
        if (row != null) {
          addValue(row, front.flux[j], front.flux[j + 1], frontValue[b]);
          if (b < last) {
            addValue(row, rear.flux[j], rear.flux[j - 1], rearValue[b]);
          }
        }
      }
      double[] row = b == 0 ? null : absorptance[optics.layout.layer[near]];
      copyOrZero(row, thickWeight[b]);
    }
    if (transmittance != null) {
      double[] transmitted = stack.front.transmittance[stack.thick[last]];
      GradientLoops.multiplyAdd(
          transmittance, transmitted, frontValue[last], frontValue[last], wavelengths);
    }
  }

  private void addValue(double[] weight, double[] in, double[] out, double[] into) {
    for (int w = 0; w < wavelengths; w++) {
      into[w] += weight[w] * (in[w] - out[w]);
    }
  }

  private void copyOrZero(double[] row, double[] into) {
    if (row == null) {
      Arrays.fill(into, 0);
    } else {
      System.arraycopy(row, 0, into, 0, wavelengths);
    }
  }

  /** Undoes the way down through thick medium b. */
  private void sentDown(Optics optics, int b, boolean last) {
    double[] passed = stack.passed(optics, b);
    double[] below = stack.below(b);
    double[] mixedBelow = stack.front.mixed[stack.thick[b]];
    double[] mixedAbove = stack.rear.mixed[stack.thick[b]];
    double[] transmitted = stack.front.transmittance[stack.thick[b]];
    double[] onPacket = stack.front.transmittance[stack.thick[b - 1]];
    for (int w = 0; w < wavelengths; w++) {
      double t = thickWeight[b][w];
      double lost = t * (1 - passed[w]);
      double onward = last ? 0 : enteringBar[b + 1][w] * transmitted[w] * stack.echo[b + 1][w];
      double fallingBar = frontValue[b][w] + lost * below[w] + t * mixedBelow[w] + onward;
      double returningBar = rearValue[b - 1][w] + t * mixedAbove[w];
      double entering = stack.entering[b][w];
      double falling = stack.falling[b][w];
      enteringBar[b][w] = lost + fallingBar * passed[w] + returningBar * stack.round[b][w];
      roundBar[b][w] = returningBar * entering;
      passedBar[b][w] = fallingBar * entering - t * (entering + falling * below[w]);
      belowBar[b][w] = lost * falling;
      double arriving = enteringBar[b][w] * stack.falling[b - 1][w];
      frontTransmittanceBar[b - 1][w] = arriving * stack.echo[b][w];
      echoBar[b][w] = arriving * onPacket[w];
    }
  }

  /** Undoes the adding of reflections at thick medium b. */
  private void addedUp(Optics optics, int b) {
    double[] passed = stack.passed(optics, b);
    double[] below = stack.below(b);
    double[] onward = stack.front.transmittance[stack.thick[b - 1]];
    double[] backward = stack.rear.transmittance[stack.thick[b]];
    double[] behind = stack.rear.reflectance[stack.thick[b]];
    for (int w = 0; w < wavelengths; w++) {
      double bar = belowBar[b - 1][w];
      double round = stack.round[b][w];
      double echo = stack.echo[b][w];
      frontTransmittanceBar[b - 1][w] += bar * backward[w] * round * echo;
      rearTransmittanceBar[b - 1][w] = bar * onward[w] * round * echo;
      double echoes = (echoBar[b][w] + bar * onward[w] * backward[w] * round) * echo * echo;
      rearReflectanceBar[b - 1][w] = echoes * round;
      double rounds = roundBar[b][w] + bar * onward[w] * backward[w] * echo + echoes * behind[w];
      passedBar[b][w] += 2 * passed[w] * below[w] * rounds;
      belowBar[b][w] += passed[w] * passed[w] * rounds;
    }
  }
}
