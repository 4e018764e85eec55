package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.figure.Share;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.DepthLayer;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/** Generation against depth. */
public final class DepthSection {

  private static final double MICROMETRE_FROM_NM = 10_000;

  private DepthSection() {}

  /** The section; absent without depth profiles. */
  public static Optional<Section> of(RunResult result) {
    List<DepthLayer> layers =
        Objects.requireNonNullElse(result.depth(), List.<DepthLayer>of()).stream()
            .filter(layer -> layer.depthNm().size() > 1)
            .toList();
    if (layers.isEmpty()) {
      return Optional.empty();
    }
    List<Block.Plot> plots = new ArrayList<>();
    for (int i = 0; i < layers.size(); i++) {
      plots.add(Tables.plot(chart(result, layers.get(i), i)));
    }
    List<Block> blocks =
        List.of(
            new Block.Prose(
                "Generation rate below each layer's upper face, on a logarithmic scale."),
            new Block.Plots(plots));
    return Optional.of(new Section("depth", "Depth", heading(layers), blocks));
  }

  private static String heading(List<DepthLayer> layers) {
    DepthLayer most = layers.get(0);
    for (DepthLayer layer : layers) {
      most = peak(layer) > peak(most) ? layer : most;
    }
    return "Generation is densest in "
        + Clip.to(most.layer(), 50)
        + ": up to "
        + Numbers.withUnit(Numbers.significant(peak(most), 2), "cm⁻³ s⁻¹");
  }

  private static double peak(DepthLayer layer) {
    return layer.generationPerCm3S().stream().mapToDouble(Double::doubleValue).max().orElse(0);
  }

  private static Chart chart(RunResult result, DepthLayer layer, int index) {
    double peak = Math.max(peak(layer), 1);
    double least =
        layer.generationPerCm3S().stream()
            .filter(g -> g > peak * 1e-6)
            .mapToDouble(Double::doubleValue)
            .min()
            .orElse(peak / 10);
    double low = Math.pow(10, Math.floor(Math.log10(least)));
    double high = Math.pow(10, Math.ceil(Math.log10(peak)));
    boolean thick = layer.depthNm().get(layer.depthNm().size() - 1) >= MICROMETRE_FROM_NM;
    List<Double> depth =
        thick ? layer.depthNm().stream().map(nm -> nm / 1000).toList() : layer.depthNm();
    return new Chart(
        "depth-" + (index + 1),
        Kind.LINES,
        layer.layer(),
        Axis.linear("depth", thick ? "µm" : "nm", depth.get(0), depth.get(depth.size() - 1)),
        Axis.logarithmic("generation rate", "cm⁻³ s⁻¹", low, high),
        depth,
        List.of(Series.of(layer.layer(), role(result, layer.layer()), layer.generationPerCm3S())),
        List.of());
  }

  private static String role(RunResult result, String layer) {
    List<SubcellOutcome> subcells = result.found().subcells();
    for (int i = 0; i < subcells.size(); i++) {
      if (subcells.get(i).absorbers().contains(layer)) {
        return Share.subcellRole(i);
      }
    }
    return "muted";
  }
}
