package evensun.evaluation;

import evensun.data.DecimalText;
import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.HeightMap;
import evensun.spi.IdealFace;
import evensun.spi.Mixture;
import evensun.spi.Profile;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedLayer.ResolvedComponent;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/** What results say about a layer in words: its material, and what is special about it. */
public final class LayerWords {

  private LayerWords() {}

  /** Material of a layer; of a mixed one, the materials of its components. */
  public static String material(ResolvedStack stack, ResolvedLayer layer) {
    if (!layer.isMixed()) {
      return stack.slots().get(layer.slot()).name();
    }
    Set<String> names = new LinkedHashSet<>();
    for (ResolvedComponent component : layer.components()) {
      names.add(stack.slots().get(component.slot()).name());
    }
    return String.join(" + ", names);
  }

  /**
   * Features of a layer.
   *
   * @param stack the stack
   * @param layer one of its layers
   * @param design whose fractions are told
   */
  public static List<String> features(ResolvedStack stack, ResolvedLayer layer, Design design) {
    List<String> words = new ArrayList<>();
    for (Feature feature : layer.features()) {
      if (feature instanceof Mixture mixture) {
        words.add(mixture(stack, layer, mixture, design));
      } else if (feature instanceof Grading grading) {
        words.add(grading(stack, layer, grading));
      } else if (feature instanceof Roughness roughness) {
        words.add(roughness(roughness));
      } else if (feature instanceof Texture texture) {
        words.add(texture(texture, design));
      } else if (feature instanceof Scatter scatter) {
        words.add(scatter(scatter));
      } else if (feature instanceof IdealFace) {
        words.add("boundary is the ideal of light trapping");
      }
    }
    return words;
  }

  private static String texture(Texture texture, Design design) {
    if (texture.heightMap().isPresent()) {
      HeightMap map = texture.heightMap().get();
      return text(
          "boundary shaped by a measured surface of %d × %d points, %s µm apart",
          map.columns(), map.rows(), map.pitchUm());
    }
    return text(
        "boundary of %s %s pointing %s, facets at %.2f°, base %s µm",
        texture.arrangement() == Texture.Arrangement.GRID ? "regular" : "scattered",
        texture.shape().id() + "s",
        texture.points().name().toLowerCase(Locale.ROOT),
        texture.facetAngleDeg().in(design),
        number(texture.baseUm()));
  }

  private static String scatter(Scatter scatter) {
    return text(
        "boundary scatters %s %% of its light, intensity by the cosine to the power %s",
        number(100 * (1 - scatter.specularFraction())), number(scatter.cosinePower()));
  }

  private static String number(double value) {
    return DecimalText.of(value, 6);
  }

  private static String mixture(
      ResolvedStack stack, ResolvedLayer layer, Mixture mixture, Design design) {
    double[] fractions = new double[mixture.components().size()];
    mixture.fractions(design, fractions);
    List<String> parts = new ArrayList<>();
    for (int c = 0; c < fractions.length; c++) {
      ResolvedComponent component = layer.components().get(c);
      parts.add(
          text(
              "%.1f %% %s (%s)",
              100 * fractions[c], component.name(), stack.slots().get(component.slot()).name()));
    }
    return "mixture by volume: " + String.join(", ", parts) + "; rule " + mixture.rule().id();
  }

  private static String grading(ResolvedStack stack, ResolvedLayer layer, Grading grading) {
    return "graded from "
        + stack.slots().get(layer.components().get(0).slot()).name()
        + " to "
        + stack.slots().get(layer.components().get(1).slot()).name()
        + ", profile "
        + profile(grading.profile())
        + ", rule "
        + grading.rule().id();
  }

  private static String profile(Profile profile) {
    if (profile instanceof Profile.Linear) {
      return "linear";
    }
    if (profile instanceof Profile.Power power) {
      return text("depth to the power %s", power.exponent());
    }
    if (profile instanceof Profile.Tanh tanh) {
      return text("tanh about %s of width %s", tanh.centre(), tanh.width());
    }
    if (profile instanceof Profile.MothEye eye) {
      return text(
          "%s of base fraction %.3f",
          eye.shape().name().toLowerCase(Locale.ROOT), eye.baseFraction());
    }
    return "by table";
  }

  private static String roughness(Roughness roughness) {
    return text(
        "%s face rough by %s nm rms, correlation length %s nm",
        roughness.face() == Side.FRONT ? "upper" : "lower",
        roughness.rmsNm(),
        roughness.correlationLengthNm());
  }

  private static String text(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
