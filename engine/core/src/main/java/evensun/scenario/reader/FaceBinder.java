package evensun.scenario.reader;

import evensun.scenario.FaceSpec;
import evensun.scenario.FaceSpec.HeightMapSpec;
import evensun.scenario.FaceSpec.IdealSpec;
import evensun.scenario.FaceSpec.RoughnessSpec;
import evensun.scenario.FaceSpec.ScatterSpec;
import evensun.scenario.FaceSpec.TextureSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.spi.Texture;
import evensun.spi.Texture.Arrangement;
import evensun.spi.Texture.Direction;
import evensun.spi.Texture.Shape;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds what is not flat about the upper face of a layer, or of the exit medium. */
final class FaceBinder {

  static final Interval FACET_ANGLE = new Interval(0, 90, true, true, "degrees");

  /** Angle of {111} facets of silicon to its {100} surface: arctan √2. */
  static final double PYRAMID_ANGLE_DEG = Math.toDegrees(Math.atan(Math.sqrt(2)));

  /** A usual size of etched pyramids (common practice). */
  static final double USUAL_BASE_UM = 5;

  /** Specular share of a boundary that only scatters. */
  private static final double ALL_SCATTERED = 0;

  /** Lambert's law. */
  private static final double LAMBERTIAN = 1;

  private static final Interval ROUGHNESS = Interval.closed(0, 1e4, "nm");
  private static final Interval CORRELATION_LENGTH = Interval.above(0, 1e7, "nm");
  private static final Interval BASE = Interval.above(0, 1e5, "µm");
  private static final Interval PITCH = Interval.above(0, 1e4, "µm");
  private static final Interval SPECULAR = Interval.closed(0, 1, "");
  private static final Interval COSINE_POWER = Interval.closed(0.1, 1000, "");

  private FaceBinder() {}

  /** What is not flat about the upper face of a layer. */
  static List<FaceSpec> bind(Fields layer) {
    List<FaceSpec> faces = new ArrayList<>();
    roughness(layer).ifPresent(faces::add);
    layer.section("texture").flatMap(FaceBinder::texture).ifPresent(faces::add);
    scatter(layer).ifPresent(faces::add);
    return faces;
  }

  /** 0 is a flat face. */
  private static Optional<RoughnessSpec> roughness(Fields layer) {
    OptionalDouble rmsNm = layer.number("roughnessNm", ROUGHNESS);
    OptionalDouble lengthNm = layer.number("correlationLengthNm", CORRELATION_LENGTH);
    if (rmsNm.isPresent() != lengthNm.isPresent()) {
      String missing = rmsNm.isPresent() ? "correlationLengthNm" : "roughnessNm";
      String present = rmsNm.isPresent() ? "roughnessNm" : "correlationLengthNm";
      String what =
          rmsNm.isPresent() ? "lateral correlation length" : "root mean square of the height";
      layer.fault(
          layer.place(present),
          present + " needs " + missing + " beside it, the " + what + " of the face in nm");
      return Optional.empty();
    }
    boolean rough = rmsNm.isPresent() && rmsNm.getAsDouble() != 0;
    return rough
        ? Optional.of(
            new RoughnessSpec(
                rmsNm.getAsDouble(), lengthNm.getAsDouble(), layer.place("roughnessNm")))
        : Optional.empty();
  }

  private static Optional<TextureSpec> texture(Fields fields) {
    int before = fields.faults().count();
    fields.require("shape", "pyramid, groove, dimple or height-map");
    Optional<Shape> shape = fields.choice("shape", shapes());
    fields.know("points", "arrangement", "facetAngleDeg", "baseUm", "table", "pitchUm");
    Optional<TextureSpec> texture =
        shape.map(s -> s == Shape.HEIGHT_MAP ? measured(fields) : repeated(fields, s));
    fields.finish();
    return fields.faults().count() > before ? Optional.empty() : texture;
  }

  private static TextureSpec repeated(Fields fields, Shape shape) {
    for (String key : List.of("table", "pitchUm")) {
      FeatureBinder.refuse(fields, key, "goes with shape: height-map");
    }
    double angleDeg =
        shape == Shape.DIMPLE
            ? fields.requiredNumber("facetAngleDeg", FACET_ANGLE)
            : fields.number("facetAngleDeg", FACET_ANGLE).orElse(PYRAMID_ANGLE_DEG);
    return new TextureSpec(
        shape,
        fields.choice("points", directions()).orElse(Direction.UP),
        fields.choice("arrangement", arrangements()).orElse(Arrangement.GRID),
        angleDeg,
        fields.number("baseUm", BASE).orElse(USUAL_BASE_UM),
        Optional.empty(),
        fields.place());
  }

  private static TextureSpec measured(Fields fields) {
    for (String key : List.of("points", "arrangement", "facetAngleDeg", "baseUm")) {
      FeatureBinder.refuse(fields, key, "says nothing about a measured surface");
    }
    Optional<String> table =
        fields.requiredText("table", "the name of a CSV file with a grid of heights in µm");
    double pitchUm = fields.requiredNumber("pitchUm", PITCH);
    HeightMapSpec map = new HeightMapSpec(table.orElse(""), pitchUm, fields.place("table"));
    return new TextureSpec(
        Shape.HEIGHT_MAP, Direction.UP, Arrangement.GRID, 0, 0, Optional.of(map), fields.place());
  }

  private static Optional<FaceSpec> scatter(Fields layer) {
    Optional<Node> node = layer.node("scatter");
    if (node.isEmpty()) {
      return Optional.empty();
    }
    if (node.get() instanceof Scalar word && word.text().equals("ideal")) {
      return Optional.of(new IdealSpec(layer.place("scatter")));
    }
    if (!(node.get() instanceof Mapping)) {
      layer.fault(
          layer.place("scatter"),
          "scatter must be {specularFraction: …, cosinePower: …} or the word ideal but was "
              + node.get().described());
      return Optional.empty();
    }
    return layer.section("scatter").flatMap(FaceBinder::scatterer);
  }

  private static Optional<FaceSpec> scatterer(Fields fields) {
    int before = fields.faults().count();
    ScatterSpec spec =
        new ScatterSpec(
            fields.number("specularFraction", SPECULAR).orElse(ALL_SCATTERED),
            fields.number("cosinePower", COSINE_POWER).orElse(LAMBERTIAN),
            fields.place());
    fields.finish();
    return fields.faults().count() > before ? Optional.empty() : Optional.of(spec);
  }

  private static Map<String, Shape> shapes() {
    Map<String, Shape> shapes = new LinkedHashMap<>();
    for (Shape shape : Shape.values()) {
      shapes.put(shape.id(), shape);
    }
    return shapes;
  }

  private static Map<String, Direction> directions() {
    Map<String, Direction> directions = new LinkedHashMap<>();
    directions.put("up", Texture.Direction.UP);
    directions.put("down", Texture.Direction.DOWN);
    return directions;
  }

  private static Map<String, Arrangement> arrangements() {
    Map<String, Arrangement> arrangements = new LinkedHashMap<>();
    arrangements.put("grid", Arrangement.GRID);
    arrangements.put("scattered", Arrangement.SCATTERED);
    return arrangements;
  }
}
