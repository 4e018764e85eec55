package evensun.raytrace.kernel;

/** Sends light along a tree, and books where it stays. Workspaces are owned by one thread. */
public final class Weighing {

  /** Numbers per node of a coating: R and T, each for s and p. */
  public static final int PER_NODE = 4;

  private double[] legs = new double[0]; // [2 · leg + polarisation] power at its start

  /** For the loop. */
  public Weighing() {}

  /**
   * Follows the light of some meetings.
   *
   * @param tree what it does
   * @param nodes where its meetings look up
   * @param from first meeting, of a replicate
   * @param to meeting after the last
   * @param coating [4 · node + quantity] R of s and p, T of s and p
   * @param attenuation what stays on the ways
   * @param rootS power of every ray in s
   * @param rootP power of every ray in p
   * @param booked [slot] out: power that stayed
   * @param met [2 · node + polarisation] out: power that met a coating there; one node more than
   *     the coating has
   */
  public void follow(
      LightTree tree,
      Nodes nodes,
      int from,
      int to,
      double[] coating,
      Attenuation attenuation,
      double rootS,
      double rootP,
      double[] booked,
      double[] met) {
    if (legs.length < 4 * tree.count) {
      legs = new double[4 * tree.count];
    }
    follow(
        from,
        to,
        tree.parent,
        tree.kept,
        attenuation.arriving,
        tree.slot,
        nodes.index,
        nodes.share,
        coating,
        attenuation.absorbed,
        rootS,
        rootP,
        booked,
        met);
  }

  /** One loop over local arrays: what a field would cost at every meeting is paid once. */
  private void follow(
      int from,
      int to,
      int[] parent,
      float[] kept,
      double[] arriving,
      byte[] slot,
      int[] index,
      float[] share,
      double[] coating,
      float[] absorbed,
      double rootS,
      double rootP,
      double[] booked,
      double[] met) {
    double[] power = legs;
    for (int e = from; e < to; e++) {
      int by = parent[e];
      double s0 = by < 0 ? rootS : power[2 * by];
      double p0 = by < 0 ? rootP : power[2 * by + 1];
      double turned = (1 - kept[e]) * (p0 - s0);
      double inS = arriving[e] * (s0 + turned);
      double inP = arriving[e] * (p0 - turned);
      double highS = inS * share[e];
      double highP = inP * share[e];
      double lowS = inS - highS;
      double lowP = inP - highP;
      int node = index[e];
      met[2 * node] += lowS;
      met[2 * node + 1] += lowP;
      met[2 * node + 2] += highS;
      met[2 * node + 3] += highP;
      int at = PER_NODE * node;
      double reflectedS = lowS * coating[at] + highS * coating[at + 4];
      double reflectedP = lowP * coating[at + 1] + highP * coating[at + 5];
      double throughS = lowS * coating[at + 2] + highS * coating[at + 6];
      double throughP = lowP * coating[at + 3] + highP * coating[at + 7];
      int leg = 2 * e;
      power[2 * leg] = reflectedS;
      power[2 * leg + 1] = reflectedP;
      power[2 * leg + 2] = throughS;
      power[2 * leg + 3] = throughP;
      booked[slot[leg]] += (reflectedS + reflectedP) * absorbed[leg];
      booked[slot[leg + 1]] += (throughS + throughP) * absorbed[leg + 1];
    }
  }

  /** Power at the start of a leg of the meetings followed last, both polarisations. */
  public double power(int leg) {
    return legs[2 * leg] + legs[2 * leg + 1];
  }
}
