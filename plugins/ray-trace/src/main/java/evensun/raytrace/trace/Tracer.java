package evensun.raytrace.trace;

import evensun.raytrace.geometry.Ray;
import evensun.raytrace.geometry.Relief;
import evensun.raytrace.kernel.LightTree;
import evensun.spi.Scatter;
import java.util.ArrayDeque;
import java.util.List;
import java.util.Queue;

/**
 * Follows rays of one wavelength through a device.
 *
 * <p>At every meeting both the reflected and the transmitted light are followed. Light that is
 * guessed to be weak goes on by lot, and stands for what does not: that keeps every mean right
 * whatever the coatings are. The guess takes faces without films. Where light comes to a relief
 * after crossing a layer, its place in the period is drawn: layers are thick and no two places of a
 * wafer alike, so that places do not follow from one another.
 */
final class Tracer {

  /** Guessed power below which light goes on by lot. */
  private static final double WEAK = 0.4;

  /**
   * Least share guessed for a leg that is possible: a film may send more light there than guessed.
   */
  private static final double LEAST_SHARE = 0.02;

  /** Optical depth after which no light is left: 3e-7 of it. */
  private static final double OPAQUE = 15;

  /** Cosine below which light runs along its layer and stays there. */
  private static final double LEVEL = 1e-6;

  /** Meetings of one ray after another; light still on its way then goes in circles and is lost. */
  private static final int MOST_MEETINGS = 5000;

  private final List<Face> faces;
  private final Slots slots;
  private final MediaRow media;
  private final Draws draws;
  private final TreeBuilder tree;
  private final BareFace bare = new BareFace();

  /** First in, first out: neighbours in a tree are then independent, which its loop is fast for. */
  private final Queue<Leg> open = new ArrayDeque<>();

  Tracer(List<Face> faces, MediaRow media, Draws draws, int replicates) {
    this.faces = faces;
    this.media = media;
    this.draws = draws;
    slots = new Slots(faces.size() + 1);
    tree = new TreeBuilder(replicates);
  }

  /** Follows rays, the same number in every replicate. */
  LightTree trace(Beam beam, int replicates, int rays, int firstPoint) {
    for (int r = 0; r < replicates; r++) {
      tree.beginReplicate(r);
      draws.begin(r, firstPoint);
      for (int i = 0; i < rays; i++) {
        Leg root = new Leg();
        draws.nextRay(root);
        beam.start(root, faces.size());
        if (arrives(root)) {
          open.add(root);
        }
      }
      while (!open.isEmpty()) {
        meet(open.remove());
      }
    }
    return tree.build(rays);
  }

  private boolean arrives(Leg leg) {
    place(leg);
    return travel(leg);
  }

  /** Puts a leg at the edge of the boundary it comes to. */
  private void place(Leg leg) {
    Relief relief = faces.get(leg.face).relief().orElse(null);
    leg.inRelief = relief != null;
    if (relief == null) {
      leg.ray.normalX = 0;
      leg.ray.normalY = 0;
      leg.ray.normalZ = 1;
      return;
    }
    leg.ray.x = relief.periodXUm() * leg.draw();
    leg.ray.y = relief.periodYUm() * leg.draw();
    leg.ray.z = leg.above ? relief.highUm() : relief.lowUm();
  }

  /** Moves a leg to its next meeting; false where it ends before. */
  private boolean travel(Leg leg) {
    if (leg.inRelief) {
      boolean met = faces.get(leg.face).relief().orElseThrow().next(leg.ray, leg.above);
      leg.fixedUm += leg.ray.travelledUm;
      if (!met && leg.ray.dz > 0 != leg.above || leg.ray.travelledUm > 1e15) {
        return end(leg, Slots.LOST);
      }
      if (isOpaque(leg)) {
        return end(leg, slots.in(leg.medium()));
      }
      return met || crosses(leg);
    }
    return true;
  }

  /** Takes a leg across the medium it is in, to the next boundary and on. */
  private boolean crosses(Leg leg) {
    boolean up = leg.ray.dz > 0;
    int next = up ? leg.face - 1 : leg.face + 1;
    if (next < 0) {
      return end(leg, slots.top(leg.deepest));
    }
    if (next == faces.size()) {
      return end(leg, slots.in(faces.size()));
    }
    double steep = Math.abs(leg.ray.dz);
    if (steep < LEVEL) {
      return end(leg, slots.in(leg.medium()));
    }
    Face upper = faces.get(Math.min(leg.face, next));
    Face lower = faces.get(Math.max(leg.face, next));
    leg.perThickness += 1 / steep;
    leg.fixedUm -= (upper.belowMeanUm() + lower.aboveMeanUm()) / steep;
    leg.face = next;
    leg.above = !up;
    return isOpaque(leg) ? end(leg, slots.in(leg.medium())) : arrives(leg);
  }

  private boolean end(Leg leg, int slot) {
    leg.slot = slot;
    leg.fixedUm = Double.POSITIVE_INFINITY;
    return false;
  }

  private boolean isOpaque(Leg leg) {
    return depth(leg) > OPAQUE;
  }

  /**
   * Optical depth of a leg, in no design of this trace less. Textures may reach through more of a
   * layer than the thickness it has at least by its power of two.
   */
  private double depth(Leg leg) {
    int m = leg.medium();
    double um = leg.fixedUm + leg.perThickness * media.leastUm()[m];
    return media.alphaPerUm(m) * Math.max(0, um);
  }

  private void meet(Leg leg) {
    Ray ray = leg.ray;
    double along = ray.dx * ray.normalX + ray.dy * ray.normalY + ray.dz * ray.normalZ;
    double cosine = Math.min(1, Math.max(1e-9, leg.above ? -along : along));
    double kept = Directions.turn(leg);
    int table = leg.fresh ? 2 * faces.size() : 2 * leg.face + (leg.above ? 0 : 1);
    int event = tree.add(leg.parent, kept, leg.factor, table, cosine);
    double turned = (1 - kept) * (leg.guessP - leg.guessS);
    leg.guessS += turned;
    leg.guessP -= turned;
    if (faces.get(leg.face).ideal()) {
      splitIdeally(leg, event);
    } else {
      split(leg, event, cosine);
    }
  }

  private void split(Leg leg, int event, double cosine) {
    int from = leg.medium();
    int to = leg.above ? from + 1 : from - 1;
    double n1 = media.n()[from];
    double n2 = media.n()[to];
    bare.solve(n1, cosine, n2, media.k()[to]);
    double rs = guess(bare.s());
    double rp = guess(bare.p());
    Leg reflected = leg.next(event, 0, rs * leg.guessS, rp * leg.guessP);
    Directions.reflect(reflected, leg.ray);
    send(reflected, leg, cosine, 2 * n1 * cosine, n1);
    double sine = n1 / n2 * Math.sqrt(1 - cosine * cosine);
    if (sine < 1 || media.k()[to] > 0) {
      double ts = guess(1 - bare.s());
      double tp = guess(1 - bare.p());
      Leg through = leg.next(event, 1, ts * leg.guessS, tp * leg.guessP);
      Directions.refract(through, leg.ray, n1 / n2, cosine);
      through.deepest = Math.max(through.deepest, to);
      double beyond = n2 * Math.sqrt(Math.max(0, 1 - sine * sine));
      send(through, leg, cosine, n1 * cosine - beyond, n2);
    }
  }

  private static double guess(double share) {
    return LEAST_SHARE + (1 - LEAST_SHARE) * share;
  }

  /**
   * Sends a leg on from a facet, scattered where the boundary scatters.
   *
   * @param phase difference of n·cosine that a height of the boundary makes felt
   */
  private void send(Leg leg, Leg from, double cosine, double phase, double n) {
    Face face = faces.get(from.face);
    Scatter scatter = face.scatter().orElse(null);
    if (scatter != null && leg.draw() >= scatter.specularFraction()) {
      randomise(leg, scatter.cosinePower());
    }
    if (face.rmsUm() > 0) {
      roughen(leg, from, face, phase, n);
    }
    go(leg, from);
  }

  private void randomise(Leg leg, double power) {
    double cosine = Math.pow(1 - leg.draw(), 1 / (power + 1));
    double turn = 2 * Math.PI * leg.draw();
    Directions.around(leg, cosine, turn, leg.above);
  }

  /** Haze of a rough face of normal heights, as for {@link evensun.spi.Roughness}. */
  private void roughen(Leg leg, Leg from, Face face, double phase, double n) {
    double size = 2 * Math.PI * face.rmsUm() * phase / media.wavelengthUm();
    double lot = leg.draw();
    double u = leg.draw();
    double v = leg.draw();
    if (lot < -Math.expm1(-size * size)) {
      double waveNumber = 2 * Math.PI * n / media.wavelengthUm();
      Directions.blur(leg, from.ray, Math.sqrt(2) / face.correlationUm(), waveNumber, u, v);
    }
  }

  /** Everything couples in, 1 − 1/n² stays in; at the back everything is reflected. */
  private void splitIdeally(Leg leg, int event) {
    boolean back = leg.face == faces.size() - 1 && leg.face > 0;
    double stays = back ? 1 : leg.above ? 0 : 1 - IdealShare.leaving(media.n()[0], media.n()[1]);
    if (stays > 0) {
      Leg reflected = leg.next(event, 0, stays * leg.guessS, stays * leg.guessP);
      randomise(reflected, 1);
      go(reflected, leg);
    }
    if (stays < 1) {
      Leg through = leg.next(event, 1, (1 - stays) * leg.guessS, (1 - stays) * leg.guessP);
      through.above = !leg.above;
      through.deepest = Math.max(through.deepest, through.medium());
      randomise(through, 1);
      go(through, leg);
    }
  }

  /** Takes a leg to where it meets the next facet, and keeps what it does on the way. */
  private void go(Leg leg, Leg from) {
    Ray facet = from.ray;
    boolean met;
    if (leg.inRelief) {
      double off = 1e-8 * faces.get(leg.face).relief().orElseThrow().featureUm();
      leg.leave(facet.normalX, facet.normalY, facet.normalZ, off);
      met = travel(leg);
    } else {
      met = crosses(leg);
    }
    if (met) {
      leg.slot = slots.in(leg.medium());
    }
    tree.leg(leg.parent, leg.slot, leg.fixedUm, leg.perThickness);
    if (met && survives(leg)) {
      open.add(leg);
    }
  }

  private boolean survives(Leg leg) {
    double left = Math.exp(-depth(leg));
    leg.guessS *= left;
    leg.guessP *= left;
    double power = leg.guessS + leg.guessP;
    if (leg.meetings > MOST_MEETINGS) {
      return false;
    }
    if (power >= WEAK) {
      return true;
    }
    double chance = power / WEAK;
    leg.key = Draws.mixed(leg.key);
    if (Draws.unit(leg.key) >= chance) {
      return false;
    }
    leg.factor = 1 / chance;
    leg.guessS /= chance;
    leg.guessP /= chance;
    return true;
  }
}
