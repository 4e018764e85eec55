package evensun.effectivemedium;

import evensun.spi.Channel;
import evensun.spi.Grading;
import evensun.spi.Mixture;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.List;

/** The channels of the layers as drawn, and what those of the plain stack are to them. */
final class ChannelMap {

  private final Plan plan;
  private final List<Channel> plain;
  private final List<Channel> drawn = new ArrayList<>();
  private final int[] firstDrawn;

  /**
   * Lays out the channels.
   *
   * @param plan which plain layers stand for which layers
   * @param plain the channels of the solver below
   */
  ChannelMap(Plan plan, List<Channel> plain) {
    this.plan = plan;
    this.plain = List.copyOf(plain);
    firstDrawn = new int[plan.bodies().size()];
    for (int l = 0; l < firstDrawn.length; l++) {
      firstDrawn[l] = drawn.size();
      addChannels(l);
    }
  }

  private void addChannels(int l) {
    Body body = plan.body(l);
    if (body instanceof Body.Mixed mixed) {
      for (Mixture.Component component : mixed.mixture().components()) {
        drawn.add(new Channel(l, component.name()));
      }
    } else if (body instanceof Body.Graded graded) {
      Grading grading = graded.grading();
      drawn.add(new Channel(l, grading.upper().name()));
      drawn.add(new Channel(l, grading.lower().name()));
    } else {
      for (Channel channel : plain) {
        if (channel.layer() == plan.firstPiece(l)) {
          drawn.add(new Channel(l, channel.component()));
        }
      }
    }
  }

  /** Channels of the layers as drawn. */
  List<Channel> drawn() {
    return drawn;
  }

  /** Number of channels of the plain stack. */
  int plainCount() {
    return plain.size();
  }

  /** First channel of a layer as drawn. */
  int firstDrawn(int layer) {
    return firstDrawn[layer];
  }

  /** Channel of the plain stack that holds a whole piece. */
  int plainChannel(int piece) {
    int channel = plain.indexOf(Channel.of(piece));
    if (channel < 0) {
      throw new UnsupportedProblem(
          "the solver below does not answer for layer "
              + plan.pieces().get(piece).name()
              + " as a whole; choose another one with the option next");
    }
    return channel;
  }

  /**
   * Bookings of the plain channels, [plain channel]; those of rough faces are empty and filled for
   * each design.
   */
  Booking[] bookings(Fit fit) {
    Booking[] bookings = new Booking[plain.size()];
    for (int l = 0; l < firstDrawn.length; l++) {
      for (int i = 0; i < plan.body(l).pieces(); i++) {
        book(bookings, l, i, fit.blend(l));
      }
    }
    for (int f = 0; f < plan.faces().size(); f++) {
      if (plan.facePiece(f) >= 0) {
        bookings[plainChannel(plan.facePiece(f))] = new Booking(drawn.size() + 1);
      }
    }
    return bookings;
  }

  private void book(Booking[] bookings, int l, int slot, Blend blend) {
    int piece = plan.firstPiece(l) + slot;
    if (blend == null) {
      int next = firstDrawn[l];
      for (int c = 0; c < plain.size(); c++) {
        if (plain.get(c).layer() == piece) {
          bookings[c] = Booking.whole(next++);
        }
      }
      return;
    }
    Booking booking = new Booking(componentCount(l));
    for (int c = 0; c < componentCount(l); c++) {
      booking.add(firstDrawn[l] + c, blend.share(slot, c));
    }
    bookings[plainChannel(piece)] = booking;
  }

  /** Number of components of a layer, 1 where it is of one material. */
  int componentCount(int l) {
    Body body = plan.body(l);
    if (body instanceof Body.Mixed mixed) {
      return mixed.mixture().components().size();
    }
    return body instanceof Body.Graded ? 2 : 1;
  }
}
