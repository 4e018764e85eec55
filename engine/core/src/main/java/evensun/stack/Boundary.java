package evensun.stack;

import evensun.spi.Feature;
import evensun.spi.IdealFace;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * A boundary between two thick media (incident medium, incoherent layers, exit medium) with the
 * coherent films that lie on it.
 *
 * @param firstFilm index of its first film; the layer above that, if any, is the upper medium
 * @param below index of the lower medium, the number of layers for the exit medium; films end here
 * @param features what is not flat about the boundary as a whole
 */
public record Boundary(int firstFilm, int below, List<Feature> features) {

  /** Kinds of features that mean a boundary as a whole. */
  public static final Set<String> KINDS = Set.of(Texture.KIND, Scatter.KIND, IdealFace.KIND);

  public Boundary {
    features = List.copyOf(features);
  }

  /** Every boundary of a stack, in the order light meets them. */
  public static List<Boundary> of(List<ResolvedLayer> layers) {
    List<Boundary> boundaries = new ArrayList<>();
    int first = 0;
    for (int l = 0; l <= layers.size(); l++) {
      if (l == layers.size() || !layers.get(l).coherent()) {
        boundaries.add(new Boundary(first, l, features(layers, first, l)));
        first = l + 1;
      }
    }
    return boundaries;
  }

  private static List<Feature> features(List<ResolvedLayer> layers, int first, int below) {
    List<Feature> features = new ArrayList<>();
    for (int l = Math.max(0, first - 1); l <= below && l < layers.size(); l++) {
      for (Feature feature : layers.get(l).features()) {
        if (KINDS.contains(feature.kind()) && (l >= first) == (side(feature) == Side.FRONT)) {
          features.add(feature);
        }
      }
    }
    return features;
  }

  private static Side side(Feature feature) {
    if (feature instanceof Texture texture) {
      return texture.face();
    }
    return feature instanceof Scatter scatter ? scatter.face() : ((IdealFace) feature).face();
  }

  /** Whether a layer is a film of this boundary. */
  public boolean hasFilm(int layer) {
    return layer >= firstFilm && layer < below;
  }

  /** Its texture, if it has one. */
  public Optional<Texture> texture() {
    return features.stream().filter(Texture.class::isInstance).map(Texture.class::cast).findFirst();
  }
}
