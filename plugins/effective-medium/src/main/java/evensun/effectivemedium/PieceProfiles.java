package evensun.effectivemedium;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import java.util.Arrays;

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
  private final double[] one = new double[1];
  private final double[][] row;

  PieceProfiles(Plan plan, ChannelMap channels, Fit fit, Booking[] bookings, DepthProfile below) {
    this.plan = plan;
    this.channels = channels;
    this.fit = fit;
    this.bookings = bookings;
    this.below = below;
    row = new double[1][plan.problem().wavelengthCount()];
  }

  /** As {@link DepthProfile#evaluate}, after the fit and the bookings were updated. */
  void evaluate(Design design, int incidence, Channel channel, double[] depthNm, double[][] into) {
    int drawn = channels.drawn().indexOf(channel);
    if (drawn < 0) {
      throw new IllegalArgumentException(
          "no channel " + ChainedEvaluator.name(channel, plan) + " in this stack");
    }
    double thickness = design.thicknessNm[channel.layer()];
    for (int z = 0; z < depthNm.length; z++) {
      Arrays.fill(into[z], 0);
      double depth = Math.max(0, Math.min(thickness, depthNm[z]));
      addBody(incidence, channel.layer(), drawn, depth, into[z]);
      addFaces(incidence, channel.layer(), drawn, depth, thickness, into[z]);
    }
  }

  private void addBody(int incidence, int l, int drawn, double depth, double[] into) {
    double top = upperFaceNm(l);
    int first = plan.firstPiece(l);
    int count = plan.body(l).pieces();
    for (int i = 0; i < count; i++) {
      double bottom = top + fit.plain().thicknessNm[first + i];
      if (depth >= top && (depth < bottom || i == count - 1 && depth <= bottom)) {
        add(incidence, first + i, depth - top, drawn, into);
        return;
      }
      top = bottom;
    }
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
      int incidence, int l, int drawn, double depth, double thickness, double[] into) {
    for (int f = 0; f < plan.faces().size(); f++) {
      if (plan.facePiece(f) < 0) {
        continue;
      }
      boolean upper = plan.faces().get(f).below() == l;
      boolean lower = fit.above(f) == l;
      double distance = upper ? depth : thickness - depth;
      if ((upper || lower) && distance < halfNm(f)) {
        add(incidence, plan.facePiece(f), halfNm(f) - distance, drawn, into);
        add(incidence, plan.facePiece(f), halfNm(f) + distance, drawn, into);
      }
    }
  }

  private void add(int incidence, int piece, double depthNm, int drawn, double[] into) {
    int plainChannel = channels.plainChannel(piece);
    Booking booking = bookings[plainChannel];
    for (int e = 0; e < booking.count(); e++) {
      if (booking.channel(e) == drawn) {
        one[0] = depthNm;
        below.evaluate(fit.plain(), incidence, Channel.of(piece), one, row);
        booking.addShare(e, row[0], into);
      }
    }
  }
}
