package evensun.effectivemedium;

import evensun.spi.Feature;
import evensun.spi.Layer;
import evensun.spi.Problem;
import evensun.spi.Roughness;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/**
 * Which plain layers (pieces) stand for which layers as drawn; fixed during a search. The materials
 * of the plain stack are those of the problem, then one row per piece that is not of one material.
 */
final class Plan {

  /** Row of a piece that has the material of its layer. */
  static final int OWN_MATERIAL = -1;

  private final Problem problem;
  private final List<Body> bodies;
  private final List<RoughFace> faces;
  private final int[] firstPiece;
  private final int[] facePiece;
  private final List<Piece> pieces = new ArrayList<>();
  private int rows;

  /**
   * A piece of the plain stack.
   *
   * @param layer index of the layer it stands for; of a rough face, the layer below it
   * @param name name in the plain stack
   * @param row row of its optical constants, or {@link #OWN_MATERIAL}
   * @param coherent whether waves interfere inside
   * @param features handed on to the solver below
   */
  record Piece(int layer, String name, int row, boolean coherent, List<Feature> features) {}

  Plan(Problem problem, List<Body> bodies, List<RoughFace> faces) {
    this.problem = problem;
    this.bodies = List.copyOf(bodies);
    this.faces = List.copyOf(faces);
    this.rows = problem.materialCount();
    int layers = problem.layerCount();
    firstPiece = new int[layers];
    facePiece = new int[faces.size()];
    for (int l = 0; l < layers; l++) {
      addFace(l);
      firstPiece[l] = pieces.size();
      addBody(l);
    }
    addFace(layers);
  }

  private void addFace(int below) {
    for (int f = 0; f < faces.size(); f++) {
      if (faces.get(f).below() == below) {
        facePiece[f] = -1;
        if (faces.get(f).isMixedLayer()) {
          facePiece[f] = pieces.size();
          String name = below < bodies.size() ? problem.layers().get(below).name() : "exit";
          pieces.add(new Piece(below, name + ":roughness", rows++, true, List.of()));
        }
      }
    }
  }

  private void addBody(int l) {
    Layer layer = problem.layers().get(l);
    Body body = bodies.get(l);
    int count = body.pieces();
    for (int i = 0; i < count; i++) {
      String name = count == 1 ? layer.name() : layer.name() + ":" + (i + 1);
      int row = body instanceof Body.Plain ? OWN_MATERIAL : rows++;
      pieces.add(
          new Piece(l, name, row, layer.coherent(), handedOn(layer, i == 0, i == count - 1)));
    }
  }

  /** Features that stay: unknown ones on the upper piece, scattering faces where they are. */
  private List<Feature> handedOn(Layer layer, boolean upper, boolean lower) {
    Stream<Feature> kept =
        layer.features().stream()
            .filter(
                feature ->
                    feature instanceof Roughness roughness
                        ? scatters(roughness) && (roughness.face() == Side.FRONT ? upper : lower)
                        : upper && !isOwn(feature));
    return kept.toList();
  }

  private boolean scatters(Roughness roughness) {
    return faces.stream().anyMatch(f -> f.roughness() == roughness && !f.isMixedLayer());
  }

  /** Whether this solver resolves a feature itself. */
  static boolean isOwn(Feature feature) {
    return EffectiveMediumSolver.RESOLVED.contains(feature.kind());
  }

  Problem problem() {
    return problem;
  }

  Body body(int layer) {
    return bodies.get(layer);
  }

  List<Body> bodies() {
    return bodies;
  }

  List<RoughFace> faces() {
    return faces;
  }

  List<Piece> pieces() {
    return pieces;
  }

  /** First piece of a layer's body. */
  int firstPiece(int layer) {
    return firstPiece[layer];
  }

  /** Piece of a rough face, −1 for one that scatters. */
  int facePiece(int face) {
    return facePiece[face];
  }

  /** Number of rows of optical constants of the plain stack. */
  int rows() {
    return rows;
  }

  /** Name of a layer, or of the exit medium. */
  String layerName(int layer) {
    return layer < bodies.size() ? problem.layers().get(layer).name() : "exit medium";
  }

  /**
   * The plain problem.
   *
   * @param taken kinds of features that the solver below takes; others are left out
   */
  Problem plainProblem(Set<String> taken) {
    List<Layer> layers = new ArrayList<>();
    for (Piece piece : pieces) {
      List<Feature> features =
          piece.features().stream().filter(feature -> taken.contains(feature.kind())).toList();
      layers.add(new Layer(piece.name(), piece.coherent(), features));
    }
    return problem.withStack(layers, problem.incidentMaterial(), problem.exitMaterial(), rows);
  }
}
