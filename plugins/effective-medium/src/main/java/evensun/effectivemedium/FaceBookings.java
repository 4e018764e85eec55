package evensun.effectivemedium;

/**
 * Books what a rough face absorbs to its two neighbours, and there to their components. A neighbour
 * that cannot absorb (the incident medium) leaves everything to the other.
 */
final class FaceBookings {

  private final Plan plan;
  private final ChannelMap channels;
  private final Fit fit;
  private final Booking[] bookings;

  /** [f] channel of the plain stack, −1 for a face that scatters. */
  private final int[] plainChannel;

  /** [f][entry][w] shares, product of the face's and the neighbour's. */
  private final double[][][] shares;

  FaceBookings(Plan plan, ChannelMap channels, Fit fit, Booking[] bookings) {
    this.plan = plan;
    this.channels = channels;
    this.fit = fit;
    this.bookings = bookings;
    shares = new double[plan.faces().size()][][];
    plainChannel = new int[shares.length];
    int most = 1;
    for (int l = 0; l < plan.bodies().size(); l++) {
      most = Math.max(most, channels.componentCount(l));
    }
    for (int f = 0; f < shares.length; f++) {
      boolean mixed = plan.facePiece(f) >= 0;
      plainChannel[f] = mixed ? channels.plainChannel(plan.facePiece(f)) : -1;
      shares[f] = new double[mixed ? 2 * most : 0][plan.problem().wavelengthCount()];
    }
  }

  /** Fills the bookings of all rough faces after the fit was updated. */
  void update() {
    for (int f = 0; f < shares.length; f++) {
      if (plainChannel[f] >= 0) {
        update(f);
      }
    }
  }

  private void update(int f) {
    Booking booking = bookings[plainChannel[f]];
    booking.clear();
    int below = plan.faces().get(f).below();
    if (fit.above(f) == Fit.INCIDENT) {
      addSide(booking, f, below, null, false);
    } else {
      addSide(booking, f, fit.above(f), fit.faceBlend(f).share(0, 0), true);
      addSide(booking, f, below, fit.faceBlend(f).share(0, 1), false);
    }
  }

  /** Books one side's share, null for everything, to the channels of that neighbour. */
  private void addSide(Booking booking, int f, int layer, double[] side, boolean lowerEdge) {
    if (layer == plan.bodies().size()) {
      booking.add(Booking.EXIT, side);
      return;
    }
    Blend blend = fit.blend(layer);
    if (blend == null) {
      booking.add(channels.firstDrawn(layer), side);
      return;
    }
    int slot = lowerEdge ? blend.slots() - 1 : 0;
    for (int c = 0; c < channels.componentCount(layer); c++) {
      double[] row = shares[f][booking.count()];
      multiply(side, blend.share(slot, c), row);
      booking.add(channels.firstDrawn(layer) + c, row);
    }
  }

  private static void multiply(double[] side, double[] inner, double[] into) {
    for (int w = 0; w < into.length; w++) {
      into[w] = (side == null ? 1 : side[w]) * inner[w];
    }
  }
}
