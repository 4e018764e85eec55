package evensun.effectivemedium;

import java.util.Arrays;

/** To which channels of the layers as drawn the light absorbed in one plain channel belongs. */
final class Booking {

  /** Stands for the exit medium: what is absorbed there counts as transmitted. */
  static final int EXIT = -1;

  private final int[] channel;
  private final double[][] share;
  private int count;

  /**
   * An empty booking.
   *
   * @param capacity largest number of entries
   */
  Booking(int capacity) {
    channel = new int[capacity];
    share = new double[capacity][];
  }

  /** A booking of everything to one channel. */
  static Booking whole(int channel) {
    Booking booking = new Booking(1);
    booking.add(channel, null);
    return booking;
  }

  void clear() {
    count = 0;
  }

  /**
   * Books a share.
   *
   * @param toChannel index of a channel as drawn, or {@link #EXIT}
   * @param row [w] share, null for everything; read when needed, not copied
   */
  void add(int toChannel, double[] row) {
    channel[count] = toChannel;
    share[count] = row;
    count++;
  }

  /** The only channel, when everything belongs to one; else −2. */
  int only() {
    return count == 1 && share[0] == null && channel[0] >= 0 ? channel[0] : -2;
  }

  int count() {
    return count;
  }

  int channel(int entry) {
    return channel[entry];
  }

  /** [w] share of an entry, null for everything. */
  double[] share(int entry) {
    return share[entry];
  }

  /** into[w] += share × row[w]. */
  void addShare(int entry, double[] row, double[] into) {
    double[] factor = share[entry];
    if (factor == null) {
      for (int w = 0; w < into.length; w++) {
        into[w] += row[w];
      }
    } else {
      for (int w = 0; w < into.length; w++) {
        into[w] += factor[w] * row[w];
      }
    }
  }

  @Override
  public String toString() {
    return Arrays.toString(channel) + " (" + count + ")";
  }
}
