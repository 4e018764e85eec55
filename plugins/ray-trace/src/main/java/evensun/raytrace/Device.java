package evensun.raytrace;

import evensun.raytrace.geometry.Reliefs;
import evensun.raytrace.trace.Face;
import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.IdealFace;
import evensun.spi.Layer;
import evensun.spi.Problem;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The stack as rays see it: thick media, and boundaries between them with their films.
 *
 * <p>Medium 0 is the incident one, the last the exit medium; boundary b lies between media b and b
 * + 1.
 */
final class Device {

  private final Problem problem;
  private final List<Integer> thick = new ArrayList<>(); // [m - 1] layer of medium m
  private final List<Boundary> boundaries = new ArrayList<>();

  /**
   * A boundary.
   *
   * @param films its coherent layers, from top to bottom
   * @param features what shapes it
   */
  record Boundary(List<Integer> films, List<Feature> features) {

    <F extends Feature> Optional<F> one(Class<F> kind) {
      return features.stream().filter(kind::isInstance).map(kind::cast).findFirst();
    }

    Optional<Texture> texture() {
      return one(Texture.class);
    }

    boolean isIdeal() {
      return one(IdealFace.class).isPresent();
    }

    boolean isFlat() {
      return features.isEmpty();
    }
  }

  /**
   * The stack of a problem.
   *
   * @param absent [l] whether an incoherent layer is absent
   * @throws UnsupportedProblem where features do not go together
   */
  Device(Problem problem, boolean[] absent) {
    this.problem = problem;
    Boundary open = new Boundary(new ArrayList<>(), new ArrayList<>());
    for (int l = 0; l < problem.layerCount(); l++) {
      Layer layer = problem.layers().get(l);
      add(layer, Side.FRONT, open);
      if (layer.coherent()) {
        open.films().add(l);
      } else if (!absent[l]) {
        boundaries.add(open);
        thick.add(l);
        open = new Boundary(new ArrayList<>(), new ArrayList<>());
      }
      add(layer, Side.REAR, open);
    }
    boundaries.add(open);
    for (int b = 0; b < boundaries.size(); b++) {
      requireSense(b);
    }
  }

  private static void add(Layer layer, Side side, Boundary boundary) {
    for (Feature feature : layer.features()) {
      if (faceOf(feature) == side) {
        boundary.features().add(feature);
      }
    }
  }

  private static Side faceOf(Feature feature) {
    if (feature instanceof Texture texture) {
      return texture.face();
    } else if (feature instanceof Scatter scatter) {
      return scatter.face();
    } else if (feature instanceof IdealFace ideal) {
      return ideal.face();
    }
    return ((Roughness) feature).face();
  }

  private void requireSense(int b) {
    List<Feature> features = boundaries.get(b).features();
    List<String> shapes =
        features.stream().filter(f -> !(f instanceof Roughness)).map(Feature::kind).toList();
    if (shapes.size() > 1) {
      throw new UnsupportedProblem(
          "the boundary between %s and %s has %s; a boundary between two thick media takes one, leave all but one out"
              .formatted(name(b), name(b + 1), String.join(" and ", shapes)));
    }
    if (boundaries.get(b).isIdeal() && b > 0 && b < boundaries.size() - 1) {
      throw new UnsupportedProblem(
          "the boundary between %s and %s is an ideal face, but ideal faces are limits for the first and the last boundary of a stack; use scatter here"
              .formatted(name(b), name(b + 1)));
    }
    if (boundaries.get(b).isIdeal() && features.size() > 1) {
      throw new UnsupportedProblem(
          "the boundary between %s and %s is an ideal face and rough; leave one of them out"
              .formatted(name(b), name(b + 1)));
    }
  }

  /** Number of thick media, the outer two included. */
  int mediaCount() {
    return thick.size() + 2;
  }

  List<Boundary> boundaries() {
    return boundaries;
  }

  /** Layer of a medium between the outer two. */
  int layer(int medium) {
    return thick.get(medium - 1);
  }

  /** Medium of a thick layer, −1 where it is absent. */
  int medium(int layer) {
    int at = thick.indexOf(layer);
    return at < 0 ? -1 : at + 1;
  }

  boolean isInner(int medium) {
    return medium > 0 && medium <= thick.size();
  }

  /** Name of a medium for people. */
  String name(int medium) {
    if (medium == 0) {
      return "the incident medium";
    }
    return isInner(medium)
        ? "layer \"" + problem.layers().get(layer(medium)).name() + "\""
        : "the exit medium";
  }

  /** Name of a medium, without saying what it is. */
  String plainName(int medium) {
    if (medium == 0) {
      return "incident medium";
    }
    return isInner(medium) ? problem.layers().get(layer(medium)).name() : "exit medium";
  }

  /** Row of n and k of a medium. */
  int material(Design design, int medium) {
    if (medium == 0) {
      return problem.incidentMaterial();
    }
    return isInner(medium) ? design.material[layer(medium)] : problem.exitMaterial();
  }

  /** Thickness of a medium in µm, 0 for the outer two. */
  double thicknessUm(Design design, int medium) {
    return isInner(medium) ? design.thicknessNm[layer(medium)] / 1000 : 0;
  }

  /** Whether every boundary is a plane, so that no ray is needed. */
  boolean isFlat() {
    return boundaries.stream().allMatch(Boundary::isFlat);
  }

  /** The boundaries with their shapes in a design. */
  List<Face> faces(Design design) {
    List<Face> faces = new ArrayList<>();
    for (int b = 0; b < boundaries.size(); b++) {
      faces.add(face(boundaries.get(b), b, design));
    }
    return faces;
  }

  private Face face(Boundary boundary, int b, Design design) {
    double variance = 0;
    double correlationNm = 1;
    for (Feature feature : boundary.features()) {
      if (feature instanceof Roughness rough) {
        variance += rough.rmsNm() * rough.rmsNm();
        correlationNm = rough.correlationLengthNm();
      }
    }
    return new Face(
        boundary
            .texture()
            .map(t -> Reliefs.of(t, t.facetAngleDeg().in(design), problem.seed() + b)),
        boundary.one(Scatter.class),
        boundary.isIdeal(),
        Math.sqrt(variance) / 1000,
        correlationNm / 1000);
  }
}
