package evensun.effectivemedium;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EffectiveIndex;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.RaySection;
import evensun.spi.ReflectanceParts;
import evensun.spi.Response;
import java.util.Arrays;
import java.util.Optional;

/** Fits the plain design, asks the solver below and books its answer to the layers as drawn. */
final class ChainedEvaluator implements Evaluator {

  private final Plan plan;
  private final ChannelMap channels;
  private final Evaluator below;
  private final Fit fit;
  private final Booking[] bookings;
  private final FaceBookings faceBookings;
  private final Response plain = new Response();
  private final WeightRows weights;
  private final int channelCount;

  /** [i*plainCount + c] rows for what has to be shared out. */
  private final double[][] absorbed;

  private final double[][] absorbedError;

  /** Rows handed to the solver below: those above, or the caller's own. */
  private final double[][] absorptance;

  private final double[][] absorptanceError;

  ChainedEvaluator(Plan plan, ChannelMap channels, Evaluator below) {
    this.plan = plan;
    this.channels = channels;
    this.below = below;
    fit = new Fit(plan);
    bookings = channels.bookings(fit);
    faceBookings = new FaceBookings(plan, channels, fit, bookings);
    weights = new WeightRows(bookings, plan.problem().wavelengthCount());
    channelCount = channels.drawn().size();
    int rows = plan.problem().incidences().size() * bookings.length;
    absorbed = new double[rows][];
    absorbedError = new double[rows][];
    for (int r = 0; r < rows; r++) {
      if (bookings[r % bookings.length].only() < 0) {
        absorbed[r] = new double[plan.problem().wavelengthCount()];
        absorbedError[r] = new double[plan.problem().wavelengthCount()];
      }
    }
    absorptance = new double[rows][];
    absorptanceError = new double[rows][];
  }

  @Override
  public void evaluate(Design design, Response into) {
    prepare(design, into);
    below.evaluate(fit.plain(), plain);
    book(into);
  }

  /** Fits the plain design and points the plain response at the caller's rows where it can. */
  private void prepare(Design design, Response into) {
    update(design);
    plain.reflectance = into.reflectance;
    plain.transmittance = into.transmittance;
    plain.absorptance =
        into.absorptance == null ? exitRows(into) : route(into.absorptance, absorbed, absorptance);
    plain.absorptanceStandardError =
        into.absorptanceStandardError == null
            ? null
            : route(into.absorptanceStandardError, absorbedError, absorptanceError);
    weights.fill(into, channelCount, plain);
    plain.sum = into.sum;
    plain.sumStandardError = into.sumStandardError;
  }

  /** What transmittance needs when no absorptance is wanted: rough faces of the exit medium. */
  private double[][] exitRows(Response into) {
    boolean any = false;
    for (int r = 0; r < absorptance.length && into.transmittance != null; r++) {
      boolean exit = false;
      Booking booking = bookings[r % bookings.length];
      for (int e = 0; e < booking.count(); e++) {
        exit |= booking.channel(e) == Booking.EXIT;
      }
      absorptance[r] = exit ? absorbed[r] : null;
      any |= exit;
    }
    return any ? absorptance : null;
  }

  private void update(Design design) {
    fit.update(design);
    faceBookings.update();
  }

  /** The caller's row where all light of a plain channel goes there, a row of our own elsewhere. */
  private double[][] route(double[][] callers, double[][] own, double[][] routed) {
    for (int r = 0; r < routed.length; r++) {
      int only = bookings[r % bookings.length].only();
      int incidence = r / bookings.length;
      routed[r] = only >= 0 ? callers[incidence * channelCount + only] : wanted(callers, r, own);
    }
    return routed;
  }

  /** Our own row, null where nobody wants any part of it. */
  private double[] wanted(double[][] callers, int r, double[][] own) {
    Booking booking = bookings[r % bookings.length];
    int first = r / bookings.length * channelCount;
    for (int e = 0; e < booking.count(); e++) {
      int channel = booking.channel(e);
      if (channel == Booking.EXIT || callers[first + channel] != null) {
        return own[r];
      }
    }
    return null;
  }

  private void book(Response into) {
    if (into.absorptance != null) {
      share(absorptance, into.absorptance);
    }
    if (into.absorptanceStandardError != null) {
      share(absorptanceError, into.absorptanceStandardError);
    }
    if (into.transmittance != null) {
      addToExit(into.transmittance);
    }
  }

  /** Shares out rows; shares of a standard error add up, since they stem from the same rays. */
  private void share(double[][] from, double[][] callers) {
    clearShared(callers);
    for (int r = 0; r < from.length; r++) {
      Booking booking = bookings[r % bookings.length];
      int first = r / bookings.length * channelCount;
      if (booking.only() >= 0 || from[r] == null) {
        continue;
      }
      for (int e = 0; e < booking.count(); e++) {
        int channel = booking.channel(e);
        if (channel != Booking.EXIT && callers[first + channel] != null) {
          booking.addShare(e, from[r], callers[first + channel]);
        }
      }
    }
  }

  /** Clears the rows of mixed layers: the solver below does not write them. */
  private void clearShared(double[][] callers) {
    for (int l = 0; l < plan.bodies().size(); l++) {
      if (fit.blend(l) != null) {
        int first = channels.firstDrawn(l);
        for (int c = first; c < first + channels.componentCount(l); c++) {
          for (int row = c; row < callers.length; row += channelCount) {
            if (callers[row] != null) {
              Arrays.fill(callers[row], 0);
            }
          }
        }
      }
    }
  }

  /** A rough face of an absorbing exit medium absorbs for it. */
  private void addToExit(double[][] transmittance) {
    for (int r = 0; r < absorptance.length; r++) {
      Booking booking = bookings[r % bookings.length];
      double[] row = transmittance[r / bookings.length];
      for (int e = 0; e < booking.count(); e++) {
        if (booking.channel(e) == Booking.EXIT && row != null && plain.absorptance != null) {
          booking.addShare(e, absorptance[r], row);
        }
      }
    }
  }

  @Override
  public <A> Optional<A> ability(Class<A> type) {
    if (type == EffectiveIndex.class) {
      return Optional.of(type.cast((EffectiveIndex) this::effectiveIndex));
    }
    if (type == Gradient.class) {
      return below.ability(Gradient.class).map(inner -> type.cast(gradient(inner)));
    }
    if (type == DepthProfile.class) {
      return below.ability(DepthProfile.class).map(inner -> type.cast(depthProfile(inner)));
    }
    if (type == ReflectanceParts.class) {
      return below.ability(ReflectanceParts.class).map(inner -> type.cast(parts(inner)));
    }
    if (type == RaySection.class) {
      return below.ability(RaySection.class).map(inner -> type.cast(section(inner)));
    }
    return Optional.empty();
  }

  private ReflectanceParts parts(ReflectanceParts inner) {
    return (design, incidence, neverEntered, cameBack) -> {
      update(design);
      inner.evaluate(fit.plain(), incidence, neverEntered, cameBack);
    };
  }

  private RaySection section(RaySection inner) {
    return (design, incidence, wavelength, rayCount) -> {
      update(design);
      return inner.view(fit.plain(), incidence, wavelength, rayCount);
    };
  }

  private Gradient gradient(Gradient inner) {
    GradientRows rows = new GradientRows(plan);
    return (design, response, into) -> {
      prepare(design, response);
      double[] plainInto = rows.plain(response.sum.length);
      inner.evaluate(fit.plain(), plain, plainInto);
      book(response);
      rows.gather(plainInto, response.sum.length, into);
    };
  }

  private DepthProfile depthProfile(DepthProfile inner) {
    PieceProfiles profiles = new PieceProfiles(plan, channels, fit, bookings, inner);
    return (design, incidence, channel, depthNm, into) -> {
      update(design);
      profiles.evaluate(design, incidence, channel, depthNm, into);
    };
  }

  private void effectiveIndex(
      Design design, int layer, double relativeDepth, double[] n, double[] k) {
    Blend blend = fit.blend(layer);
    if (blend == null) {
      throw new IllegalArgumentException("layer " + plan.layerName(layer) + " is of one material");
    }
    fit.update(design);
    int slot = plan.body(layer) instanceof Body.Graded g ? g.slices().at(relativeDepth) : 0;
    System.arraycopy(blend.n(slot), 0, n, 0, n.length);
    System.arraycopy(blend.k(slot), 0, k, 0, k.length);
  }

  /** The fit as last updated, for findings. */
  Fit fitTo(Design design) {
    update(design);
    return fit;
  }

  @Override
  public void close() {
    below.close();
  }

  /** For messages. */
  static String name(Channel channel, Plan plan) {
    String layer = plan.layerName(channel.layer());
    return channel.component().isEmpty() ? layer : layer + "/" + channel.component();
  }
}
