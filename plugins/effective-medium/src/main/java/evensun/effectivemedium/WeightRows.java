package evensun.effectivemedium;

import evensun.spi.Response;
import java.util.Arrays;

/** The weights of the plain channels: those of the channels as drawn by their shares. */
final class WeightRows {

  private final Booking[] bookings;
  private final int wavelengths;

  /** [s*plainCount + c] rows for weights that have to be put together. */
  private double[][] own = new double[0][];

  private double[][] routed = new double[0][];

  WeightRows(Booking[] bookings, int wavelengths) {
    this.bookings = bookings;
    this.wavelengths = wavelengths;
  }

  /**
   * Sets the weights of the plain response.
   *
   * @param from the caller's response
   * @param channelCount number of channels as drawn
   * @param plain the response handed to the solver below
   */
  void fill(Response from, int channelCount, Response plain) {
    plain.transmittanceWeight = from.transmittanceWeight;
    if (from.weight == null) {
      plain.weight = null;
      return;
    }
    int sums = from.weight.length / channelCount;
    grow(sums);
    for (int s = 0; s < sums; s++) {
      for (int c = 0; c < bookings.length; c++) {
        int r = s * bookings.length + c;
        int only = bookings[c].only();
        routed[r] =
            only >= 0 ? from.weight[s * channelCount + only] : mixed(from, channelCount, s, c);
      }
    }
    plain.weight = routed;
  }

  private double[] mixed(Response from, int channelCount, int s, int c) {
    Booking booking = bookings[c];
    double[] row = own[s * bookings.length + c];
    boolean any = false;
    for (int e = 0; e < booking.count(); e++) {
      double[] weight = weight(from, channelCount, s, booking.channel(e));
      if (weight != null) {
        if (!any) {
          Arrays.fill(row, 0);
        }
        any = true;
        booking.addShare(e, weight, row);
      }
    }
    return any ? row : null;
  }

  private static double[] weight(Response from, int channelCount, int s, int channel) {
    if (channel != Booking.EXIT) {
      return from.weight[s * channelCount + channel];
    }
    return from.transmittanceWeight == null ? null : from.transmittanceWeight[s];
  }

  /** Grows once, when a caller asks for another number of sums. */
  private void grow(int sums) {
    if (routed.length == sums * bookings.length) {
      return;
    }
    routed = new double[sums * bookings.length][];
    own = new double[sums * bookings.length][];
    for (int r = 0; r < own.length; r++) {
      if (bookings[r % bookings.length].only() < 0) {
        own[r] = new double[wavelengths];
      }
    }
  }
}
