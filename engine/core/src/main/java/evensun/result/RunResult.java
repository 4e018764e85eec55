package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Everything a run knows: {@code result.json} as records. A report is a function of this alone. In
 * the file the fields of {@link #found} stand at the top level.
 *
 * @param formatVersion version of the format, 1
 * @param kind {@code "design"} or {@code "assess"}
 * @param title title of the scenario
 * @param found the design found; of an assessment, the stack as drawn
 * @param asDrawn the stack as drawn, of a design run
 * @param search how the search went
 * @param materials every material used, in the order of the stack
 * @param spectrum the light used
 * @param depth generation against depth
 * @param angular angle dependence
 * @param sensitivities what a small change of each varied quantity does, largest first
 * @param whatIf the aim against each varied quantity
 * @param secondOpinion the found design evaluated in other ways
 * @param measured measured curves beside the model of the stack as drawn, if there are any
 * @param textured the design beside its flat twin, where boundaries are shaped or scatter
 * @param published published values beside those this program computed in the same run
 * @param findings what a reader should know, most severe first
 * @param cautions hazards and limits that apply to this stack
 * @param provenance how the result came about and how to repeat it
 */
public record RunResult(
    int formatVersion,
    String kind,
    String title,
    Outcome found,
    @Nullable Outcome asDrawn,
    @Nullable SearchRecord search,
    List<MaterialUse> materials,
    SpectrumUse spectrum,
    @Nullable List<DepthLayer> depth,
    @Nullable Angular angular,
    @Nullable List<Sensitivity> sensitivities,
    @Nullable List<WhatIf> whatIf,
    @Nullable List<Opinion> secondOpinion,
    @Nullable List<Measured> measured,
    @Nullable Textured textured,
    @Nullable List<Published> published,
    List<FindingRecord> findings,
    List<Caution> cautions,
    Provenance provenance) {

  /** The version of the format that this program writes. */
  public static final int FORMAT = 1;

  /** A result without measured curves and textures. */
  public RunResult(
      int formatVersion,
      String kind,
      String title,
      Outcome found,
      @Nullable Outcome asDrawn,
      @Nullable SearchRecord search,
      List<MaterialUse> materials,
      SpectrumUse spectrum,
      @Nullable List<DepthLayer> depth,
      @Nullable Angular angular,
      @Nullable List<Sensitivity> sensitivities,
      @Nullable List<WhatIf> whatIf,
      @Nullable List<Opinion> secondOpinion,
      List<FindingRecord> findings,
      List<Caution> cautions,
      Provenance provenance) {
    this(
        formatVersion,
        kind,
        title,
        found,
        asDrawn,
        search,
        materials,
        spectrum,
        depth,
        angular,
        sensitivities,
        whatIf,
        secondOpinion,
        null,
        null,
        null,
        findings,
        cautions,
        provenance);
  }
}
