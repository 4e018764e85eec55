package evensun.run;

import evensun.evaluation.Bench;
import evensun.evaluation.Model;
import evensun.evaluation.Outcomes;
import evensun.result.Textured;
import evensun.result.Textured.Outline;
import evensun.result.Textured.RayPath;
import evensun.result.Textured.Section;
import evensun.scenario.Scenario;
import evensun.spi.RaySection;
import evensun.spi.Samples;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** A design beside the same one with flat boundaries, and a few of its rays. */
final class FlatTwin {

  /** Rays of a drawing. */
  private static final int RAYS = 5;

  /** Wavelength of a drawing in nm: light that reaches the rear of a silicon wafer. */
  private static final double SHOWN_NM = 1000;

  private FlatTwin() {}

  /** The comparison for a bench's present design; null where every boundary is flat. */
  static @Nullable Textured beside(Preparation preparation, Bench bench) {
    if (!preparation.stack().isShaped()) {
      return null;
    }
    SolverChoice choice = SolverChoice.unasked(preparation.stack().flattened(), preparation.host());
    try (Model model = preparation.flat(choice);
        Bench flat = model.newBench()) {
      flat.copyFrom(bench);
      return new Textured(
          Outcomes.of(flat, List.of()),
          choice.ids(),
          bench.ability(RaySection.class).map(rays -> section(rays, bench)).orElse(null));
    }
  }

  private static Section section(RaySection rays, Bench bench) {
    double[] wavelengthNm = bench.model().stack().grid().wavelengthNm();
    int w = nearest(wavelengthNm, SHOWN_NM);
    RaySection.View view = rays.view(bench.design(), 0, w, RAYS);
    return new Section(
        wavelengthNm[w],
        outlines(view.outlines(), bench.model().stack().scenario()),
        view.paths().stream().map(FlatTwin::path).toList());
  }

  /** Boundaries with the outer media by their names in the scenario. */
  private static List<Outline> outlines(List<RaySection.Outline> drawn, Scenario scenario) {
    List<Outline> outlines = new ArrayList<>();
    for (int i = 0; i < drawn.size(); i++) {
      RaySection.Outline o = drawn.get(i);
      String above = i == 0 ? scenario.incidentMedium().name() : o.above();
      String below = i == drawn.size() - 1 ? scenario.exit().name() : o.below();
      outlines.add(new Outline(above, below, boxed(o.xUm()), boxed(o.zUm())));
    }
    return outlines;
  }

  private static RayPath path(RaySection.Path path) {
    return new RayPath(
        path.ray(),
        path.startX(),
        path.startZ(),
        path.endX(),
        path.endZ(),
        path.startShare(),
        path.endShare());
  }

  private static int nearest(double[] wavelengthNm, double wantedNm) {
    int nearest = 0;
    for (int w = 1; w < wavelengthNm.length; w++) {
      if (Math.abs(wavelengthNm[w] - wantedNm) < Math.abs(wavelengthNm[nearest] - wantedNm)) {
        nearest = w;
      }
    }
    return nearest;
  }

  private static List<Double> boxed(Samples samples) {
    return Arrays.stream(samples.toArray()).boxed().toList();
  }
}
