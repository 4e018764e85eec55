package evensun.raytrace.kernel;

/** Sends light along a tree, and books where it stays. Workspaces are owned by one thread. */
public final class Weighing {

  private static final int RS = 0;
  private static final int RP = 1;
  private static final int TS = 2;
  private static final int TP = 3;

  /** Numbers per node of a coating: R and T, each for s and p. */
  public static final int PER_NODE = 4;

  private double[] legS = new double[0];
  private double[] legP = new double[0];

  /** For the loop. */
  public Weighing() {}

  /**
   * Follows the light of one replicate.
   *
   * @param tree what it does
   * @param nodes where its meetings look up
   * @param replicate index of the replicate
   * @param coating [4 · node + quantity] R of s and p, T of s and p
   * @param passed [2 · event + leg] share that is left at the end of a leg
   * @param rootS power of every ray in s
   * @param rootP power of every ray in p
   * @param booked [slot] out: power that stayed
   * @param met [2 · node + polarisation] out: power that met a coating there; one node more than
   *     the coating has
   */
  public void follow(
      LightTree tree,
      Nodes nodes,
      int replicate,
      double[] coating,
      double[] passed,
      double rootS,
      double rootP,
      double[] booked,
      double[] met) {
    if (legS.length < 2 * tree.count) {
      legS = new double[2 * tree.count];
      legP = new double[2 * tree.count];
    }
    for (int e = tree.start[replicate]; e < tree.start[replicate + 1]; e++) {
      meet(tree, nodes, e, coating, passed, rootS, rootP, booked, met);
    }
  }

  private void meet(
      LightTree tree,
      Nodes nodes,
      int e,
      double[] coating,
      double[] passed,
      double rootS,
      double rootP,
      double[] booked,
      double[] met) {
    int from = tree.parent[e];
    double s = from < 0 ? rootS : legS[from];
    double p = from < 0 ? rootP : legP[from];
    double turned = (1 - tree.kept[e]) * (p - s);
    double inS = tree.factor[e] * (s + turned);
    double inP = tree.factor[e] * (p - turned);
    int node = nodes.index[e];
    double share = nodes.share[e];
    double highS = inS * share;
    double highP = inP * share;
    double lowS = inS - highS;
    double lowP = inP - highP;
    met[2 * node] += lowS;
    met[2 * node + 1] += lowP;
    met[2 * node + 2] += highS;
    met[2 * node + 3] += highP;
    int at = PER_NODE * node;
    int next = at + PER_NODE;
    int leg = 2 * e;
    go(
        tree.slot[leg],
        leg,
        lowS * coating[at + RS] + highS * coating[next + RS],
        lowP * coating[at + RP] + highP * coating[next + RP],
        passed[leg],
        booked);
    go(
        tree.slot[leg + 1],
        leg + 1,
        lowS * coating[at + TS] + highS * coating[next + TS],
        lowP * coating[at + TP] + highP * coating[next + TP],
        passed[leg + 1],
        booked);
  }

  private void go(int slot, int leg, double s, double p, double passed, double[] booked) {
    legS[leg] = s * passed;
    legP[leg] = p * passed;
    booked[slot] += (s + p) * (1 - passed);
  }

  /** Power at the end of a leg of the replicate followed last, both polarisations. */
  public double arriving(int leg) {
    return legS[leg] + legP[leg];
  }
}
