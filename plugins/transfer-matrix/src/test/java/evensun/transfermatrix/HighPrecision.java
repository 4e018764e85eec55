package evensun.transfermatrix;

import java.util.Arrays;
import org.apache.commons.math3.dfp.Dfp;
import org.apache.commons.math3.dfp.DfpField;

/**
 * A stack at one wavelength in 60-digit arithmetic: characteristic matrices of the layers (Born
 * &amp; Wolf, section 1.6), multiplied out as written there, and intensities between packets added
 * up bounce by bounce. Shares no formula with the kernels.
 */
final class HighPrecision {

  private static final DfpField FIELD = new DfpField(60);
  private static final Dfp ZERO = FIELD.getZero();

  /** A complex number of 60 digits. */
  private record Big(Dfp re, Dfp im) {
    Big plus(Big b) {
      return new Big(re.add(b.re), im.add(b.im));
    }

    Big minus(Big b) {
      return new Big(re.subtract(b.re), im.subtract(b.im));
    }

    Big times(Big b) {
      return new Big(
          re.multiply(b.re).subtract(im.multiply(b.im)), re.multiply(b.im).add(im.multiply(b.re)));
    }

    Big over(Big b) {
      Dfp size = b.squared();
      Big top = times(new Big(b.re, b.im.negate()));
      return new Big(top.re.divide(size), top.im.divide(size));
    }

    Dfp squared() {
      return re.multiply(re).add(im.multiply(im));
    }

    Dfp timesConjugateRe(Big b) {
      return re.multiply(b.re).add(im.multiply(b.im));
    }

    Big root() {
      if (im.isZero()) {
        Dfp real = re.abs().sqrt();
        return re.lessThan(ZERO) ? new Big(ZERO, real) : new Big(real, ZERO);
      }
      Dfp size = squared().sqrt();
      Dfp x = size.add(re).divide(2).sqrt();
      Dfp y = size.subtract(re).divide(2).sqrt();
      return new Big(x, y);
    }
  }

  /** What a packet does with unit intensity from one side. */
  private static final class Packet {
    Dfp reflected;
    Dfp transmitted;
    Dfp mixed;
    final Dfp[] absorbed; // [j]

    Packet(int media) {
      absorbed = new Dfp[media];
    }
  }

  final Dfp[] absorptance;
  final Dfp reflectance;
  final Dfp transmittance;

  private final Big[] eta;
  private final Big[] wavePerNm;
  private final Dfp[] thicknessNm;
  private final int layers;

  /**
   * Solves a sample from the front.
   *
   * @param moved layer whose thickness is changed, or -1
   * @param byNm change of that thickness in nm
   */
  HighPrecision(Sample sample, int w, double angleDeg, boolean p, int moved, Dfp byNm) {
    layers = sample.layers();
    eta = new Big[layers + 2];
    wavePerNm = new Big[layers + 2];
    thicknessNm = new Dfp[layers + 2];
    Dfp angle = big(angleDeg).multiply(FIELD.getPi()).divide(180);
    Dfp tangential = big(sample.design.n[0][w]).multiply(angle.sin());
    Dfp k0 = FIELD.getPi().multiply(2).divide(big(sample.problem.wavelengthNm().at(w)));
    for (int j = 0; j < layers + 2; j++) {
      Big index = new Big(big(sample.design.n[j][w]), big(sample.design.k[j][w]));
      Big square = index.times(index);
      Big q = new Big(square.re.subtract(tangential.multiply(tangential)), square.im).root();
      eta[j] = p ? square.over(q) : q;
      wavePerNm[j] = new Big(q.re.multiply(k0), q.im.multiply(k0));
      thicknessNm[j] = j == 0 || j > layers ? ZERO : big(sample.design.thicknessNm[j - 1]);
      if (j > 0 && j - 1 == moved) {
        thicknessNm[j] = thicknessNm[j].add(byNm);
      }
    }
    absorptance = new Dfp[layers];
    Arrays.fill(absorptance, ZERO);
    Dfp[] ends = bounce(sample);
    reflectance = ends[0];
    transmittance = ends[1];
  }

  static Dfp big(double value) {
    return FIELD.newDfp(value);
  }

  private Dfp[] bounce(Sample sample) {
    int[] thick = new int[layers + 2];
    int packets = 0;
    for (int j = 1; j < layers + 2; j++) {
      if (j > layers || !sample.problem.layers().get(j - 1).coherent()) {
        thick[++packets] = j;
      }
    }
    Packet[] down = new Packet[packets];
    Packet[] up = new Packet[packets];
    for (int b = 0; b < packets; b++) {
      down[b] = packet(thick[b], thick[b + 1]);
      up[b] = b < packets - 1 ? packet(thick[b + 1], thick[b]) : null;
    }
    Dfp[] fromAbove = zeros(packets); // on packet b
    Dfp[] fromBelow = zeros(packets);
    fromAbove[0] = FIELD.getOne();
    Dfp[] ends = {ZERO, ZERO};
    Dfp left = FIELD.getOne();
    while (left.greaterThan(big(1e-35))) {
      Dfp[] above = zeros(packets);
      Dfp[] below = zeros(packets);
      for (int b = 0; b < packets; b++) {
        Dfp back = take(down[b], fromAbove[b], thick[b], thick[b], thick[b + 1]);
        Dfp on = fromAbove[b].multiply(down[b].transmitted);
        if (up[b] != null) {
          on = on.add(take(up[b], fromBelow[b], thick[b + 1], thick[b], thick[b + 1]));
          back = back.add(fromBelow[b].multiply(up[b].transmitted));
          above[b + 1] = above[b + 1].add(cross(thick[b + 1], on));
        } else {
          ends[1] = ends[1].add(on);
        }
        if (b > 0) {
          below[b - 1] = below[b - 1].add(cross(thick[b], back));
        } else {
          ends[0] = ends[0].add(back);
        }
      }
      fromAbove = above;
      fromBelow = below;
      left = ZERO;
      for (int b = 0; b < packets; b++) {
        left = left.add(fromAbove[b]).add(fromBelow[b]);
      }
    }
    return ends;
  }

  /** Books what a packet absorbs of an intensity; returns what it reflects. */
  private Dfp take(Packet packet, Dfp intensity, int medium, int above, int below) {
    for (int j = above + 1; j < below; j++) {
      absorptance[j - 1] = absorptance[j - 1].add(intensity.multiply(packet.absorbed[j]));
    }
    if (medium > 0) {
      absorptance[medium - 1] = absorptance[medium - 1].add(intensity.multiply(packet.mixed));
    }
    return intensity.multiply(packet.reflected);
  }

  /** Books what an intensity loses on its way across a thick medium; returns what is left. */
  private Dfp cross(int medium, Dfp intensity) {
    Dfp passed = wavePerNm[medium].im.multiply(thicknessNm[medium]).multiply(-2).exp();
    Dfp left = intensity.multiply(passed);
    absorptance[medium - 1] = absorptance[medium - 1].add(intensity.subtract(left));
    return left;
  }

  private static Dfp[] zeros(int count) {
    Dfp[] row = new Dfp[count];
    Arrays.fill(row, ZERO);
    return row;
  }

  private Packet packet(int near, int far) {
    int step = far > near ? 1 : -1;
    Big e = new Big(FIELD.getOne(), ZERO);
    Big h = eta[far];
    Dfp[] flux = new Dfp[layers + 2];
    flux[far] = e.timesConjugateRe(h);
    for (int j = far - step; j != near; j -= step) {
      Big[] trig = cosAndMinusISin(j);
      Big nextE = trig[0].times(e).plus(trig[1].times(h).over(eta[j]));
      h = trig[1].times(eta[j]).times(e).plus(trig[0].times(h));
      e = nextE;
      flux[j] = e.timesConjugateRe(h);
    }
    Big sum = eta[near].times(e).plus(h);
    Big r = eta[near].times(e).minus(h).over(sum);
    // Incident wave of unit amplitude: the field at the near face is 1 + r.
    Big one = new Big(FIELD.getOne(), ZERO);
    Dfp scale = one.plus(r).squared().divide(e.squared()).divide(eta[near].re);
    Packet packet = new Packet(layers + 2);
    for (int j = near + step; j != far; j += step) {
      packet.absorbed[j] = flux[j].subtract(flux[j + step]).multiply(scale);
    }
    packet.reflected = r.squared();
    packet.transmitted = flux[far].multiply(scale);
    packet.mixed = eta[near].im.divide(eta[near].re).multiply(r.im).multiply(-2);
    return packet;
  }

  /** cos δ and −i sin δ of δ = κd, from exp(±iδ). */
  private Big[] cosAndMinusISin(int j) {
    Dfp re = wavePerNm[j].re.multiply(thicknessNm[j]);
    Dfp im = wavePerNm[j].im.multiply(thicknessNm[j]);
    Dfp decay = im.negate().exp();
    Dfp growth = im.exp();
    Big on = new Big(re.cos().multiply(decay), re.sin().multiply(decay));
    Big back = new Big(re.cos().multiply(growth), re.sin().multiply(growth).negate());
    Big half = new Big(big(0.5), ZERO);
    return new Big[] {on.plus(back).times(half), back.minus(on).times(half)};
  }
}
