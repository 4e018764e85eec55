package evensun.transfermatrix.kernel.reference;

/**
 * A stack at one wavelength and polarisation, lit with unit intensity: waves inside packets of
 * coherent layers, intensities across the thick media between them (Katsidis &amp; Siapkas, Appl.
 * Opt. 41, 3978 (2002)).
 */
final class LitStack {

  final Slabs slabs;
  private final int packets;
  private final int[] thick; // [b] index of the thick medium in front of packet b, and the last
  private final int[] packetOf; // [j] packet of layer j, or the one in front of a thick medium
  private final Packet[] front; // [b] lit from the side of the light
  private final Packet[] rear; // [b] lit from the other side; none for the last
  private final double[] below; // [b] intensity back over on at the far face of thick medium b
  private final double[] entering; // [b] intensity on at the near face of thick medium b
  private final double[] falling; // [b] intensity on at the far face of thick medium b
  private final double[] returning; // [b] intensity back at the near face of thick medium b

  LitStack(Slabs slabs) {
    this.slabs = slabs;
    int media = slabs.layerCount + 2;
    thick = new int[media];
    packetOf = new int[media];
    int last = 0;
    for (int j = 1; j < media; j++) {
      packetOf[j] = last;
      if (slabs.thick(j)) {
        thick[++last] = j;
      }
    }
    packets = last;
    front = new Packet[packets];
    rear = new Packet[packets];
    below = new double[packets];
    entering = new double[packets + 1];
    falling = new double[packets];
    returning = new double[packets];
    solvePackets();
    addUp();
    sendDown();
  }

  private void solvePackets() {
    for (int b = 0; b < packets; b++) {
      front[b] = new Packet(slabs, thick[b], thick[b + 1]);
      if (b < packets - 1) {
        rear[b] = new Packet(slabs, thick[b + 1], thick[b]);
      }
    }
  }

  /** Share of the intensity on at the near face of thick medium b that comes back to it. */
  private double roundTrip(int b) {
    double passed = slabs.passed(thick[b]);
    return passed * passed * below[b];
  }

  private void addUp() {
    below[packets - 1] = front[packets - 1].reflectance;
    for (int b = packets - 2; b >= 0; b--) {
      double round = roundTrip(b + 1);
      double gathered = front[b].transmittance / (1 - rear[b].reflectance * round);
      below[b] = front[b].reflectance + gathered * round * rear[b].transmittance;
    }
  }

  private void sendDown() {
    entering[0] = 1;
    falling[0] = 1;
    for (int b = 1; b < packets; b++) {
      double round = roundTrip(b);
      entering[b] =
          falling[b - 1] * front[b - 1].transmittance / (1 - rear[b - 1].reflectance * round);
      falling[b] = entering[b] * slabs.passed(thick[b]);
      returning[b] = entering[b] * round;
    }
  }

  double reflectance() {
    return below[0];
  }

  double transmittance() {
    return falling[packets - 1] * front[packets - 1].transmittance;
  }

  /** Share of the light absorbed in layer j. */
  double absorptance(int j) {
    if (slabs.thick(j)) {
      int b = packetOf[j] + 1;
      return crossing(b) + mixed(b);
    }
    int b = packetOf[j];
    double fromFront = falling[b] * front[b].absorptance(j);
    return rear[b] == null ? fromFront : fromFront + returning[b + 1] * rear[b].absorptance(j);
  }

  /** Absorbed from the two intensities that cross thick medium b. */
  private double crossing(int b) {
    double lost = -Math.expm1(-2 * slabs.wavePerNm[thick[b]].im() * slabs.thicknessNm[thick[b]]);
    return lost * (entering[b] + falling[b] * below[b]);
  }

  /** What the waves at both faces of thick medium b share, in an absorbing medium. */
  private double mixed(int b) {
    return falling[b] * front[b].mixed + returning[b] * rear[b - 1].mixed;
  }

  /** Share of the light booked to incoherent layer j for waves at its faces not independent. */
  double mixedTerm(int j) {
    return mixed(packetOf[j] + 1);
  }

  /**
   * Share absorbed per nm at a depth of layer j.
   *
   * @param depthNm in nm from the face on the side of the light, in [0, thickness]
   */
  double absorbedPerNm(int j, double depthNm) {
    int b = packetOf[j];
    if (slabs.thick(j)) {
      return thickPerNm(b + 1, depthNm);
    }
    double fromFront = falling[b] * front[b].absorbedPerNm(slabs, thick[b], j, depthNm);
    if (rear[b] == null) {
      return fromFront;
    }
    double fromRear = slabs.thicknessNm[j] - depthNm;
    return fromFront + returning[b + 1] * rear[b].absorbedPerNm(slabs, thick[b + 1], j, fromRear);
  }

  /** Two exponentials, scaled so that the mixed term is spread over the depth as they are. */
  private double thickPerNm(int b, double depthNm) {
    int j = thick[b];
    double crossing = crossing(b);
    if (!(crossing > 0)) {
      return 0;
    }
    double alpha = 2 * slabs.wavePerNm[j].im();
    double on = entering[b] * Math.exp(-alpha * depthNm);
    double back = falling[b] * below[b] * Math.exp(-alpha * (slabs.thicknessNm[j] - depthNm));
    return alpha * (on + back) * (1 + mixed(b) / crossing);
  }
}
