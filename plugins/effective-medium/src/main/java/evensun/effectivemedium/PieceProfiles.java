package evensun.effectivemedium;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;

/**
 * Absorption against depth of the layers as drawn. Depth counts from the mean plane of the upper
 * face. What a rough face absorbs for a layer on the far side of the mean plane is shown mirrored
 * on the near side, so that the integral over the layer stays its absorptance.
 */
final class PieceProfiles {

  private final Plan plan;
  private final ChannelMap channels;
  private final Fit fit;
  private final Booking[] bookings;
  private final DepthProfile below;

  PieceProfiles(Plan plan, ChannelMap channels, Fit fit, Booking[] bookings, DepthProfile below) {
    this.plan = plan;
    this.channels = channels;
    this.fit = fit;
    this.bookings = bookings;
    this.below = below;
  }

  /** As {@link DepthProfile#evaluate}, after the fit and the bookings were updated. */
  void evaluate(Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    int drawn = channels.drawn().indexOf(channel);
    if (drawn < 0) {
      throw new IllegalArgumentException(
          "no channel " + ChainedEvaluator.name(channel, plan) + " in this stack");
    }
    for (double[] row : into) {
      Arrays.fill(row, 0);
    }
    int l = channel.layer();
    double[] depths = inside(depthNm, design.thicknessNm[l]);
    double top = upperFaceNm(l);
    for (int i = 0; i < plan.body(l).pieces(); i++) {
      int piece = plan.firstPiece(l) + i;
      double bottom = top + fit.plain().thicknessNm[piece];
      boolean last = i == plan.body(l).pieces() - 1;
      double from = top;
      add(incidence, piece, drawn, depths, into, z -> z < bottom || last ? z - from : -1);
      top = bottom;
    }
    addFaces(incidence, l, drawn, depths, design.thicknessNm[l], into);
  }

  private static double[] inside(double[] depthNm, double thicknessNm) {
    return Arrays.stream(depthNm).map(z -> Math.max(0, Math.min(thicknessNm, z))).toArray();
  }

  /** Depth at which the body begins: below the half of a rough face that it gave way to. */
  private double upperFaceNm(int l) {
    for (int f = 0; f < plan.faces().size(); f++) {
      if (plan.faces().get(f).below() == l && plan.facePiece(f) >= 0) {
        return halfNm(f);
      }
    }
    return 0;
  }

  private double halfNm(int f) {
    return 0.5 * fit.plain().thicknessNm[plan.facePiece(f)];
  }

  private void addFaces(
      int incidence, int l, int drawn, double[] depths, double thicknessNm, double[][] into) {
    for (int f = 0; f < plan.faces().size(); f++) {
      int piece = plan.facePiece(f);
      boolean upper = plan.faces().get(f).below() == l;
      if (piece >= 0 && (upper || fit.above(f) == l)) {
        double half = halfNm(f);
        DoubleUnaryOperator distance = z -> upper ? z : thicknessNm - z;
        add(incidence, piece, drawn, depths, into, distance.andThen(x -> near(x, half, -x)));
        add(incidence, piece, drawn, depths, into, distance.andThen(x -> near(x, half, x)));
      }
    }
  }

  /** Depth in a rough layer, −1 for places beyond it. */
  private static double near(double distance, double half, double shift) {
    return distance < half ? half + shift : -1;
  }

  /** Adds what a piece absorbs for a channel, at those depths that lie in it. */
  private void add(
      int incidence,
      int piece,
      int drawn,
      double[] depths,
      double[][] into,
      DoubleUnaryOperator local) {
    double thickness = fit.plain().thicknessNm[piece];
    int[] at =
        IntStream.range(0, depths.length)
            .filter(z -> isIn(local.applyAsDouble(depths[z]), thickness))
            .toArray();
    Booking booking = bookings[channels.plainChannel(piece)];
    for (int e = 0; e < booking.count() && at.length > 0; e++) {
      if (booking.channel(e) == drawn) {
        double[] own = Arrays.stream(at).mapToDouble(z -> local.applyAsDouble(depths[z])).toArray();
        double[][] rows = new double[at.length][plan.problem().wavelengthCount()];
        below.evaluate(fit.plain(), incidence, Channel.of(piece), own, rows);
        for (int i = 0; i < at.length; i++) {
          booking.addShare(e, rows[i], into[at[i]]);
        }
      }
    }
  }

  private static boolean isIn(double depthNm, double thicknessNm) {
    return depthNm >= 0 && depthNm <= thicknessNm;
  }
}
