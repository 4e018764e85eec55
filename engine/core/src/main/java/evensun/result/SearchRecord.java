package evensun.result;

import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * How a search went.
 *
 * @param aim name of the aim
 * @param aimUnit unit of the aim
 * @param aimAsDrawn the aim of the stack as drawn; null where it could not be evaluated
 * @param aimFound the aim of the design found
 * @param stopped why it stopped: {@code converged}, {@code evaluations}, {@code time}, {@code
 *     failures} or {@code interrupted}
 * @param generations generations of the genetic algorithm
 * @param evaluations designs evaluated
 * @param failures designs that could not be evaluated
 * @param refinementGain what the local refinement added to the aim
 * @param history one entry per generation
 * @param variables what varied
 * @param optima distinct designs found, best first
 * @param constraints limits kept
 * @param front designs none of which is better in every aim, when several aims were given
 * @param notes what the search says about its result, in words
 * @param grid what an exhaustive grid found, where one was tried
 * @param stepCost what standing on the tool's steps costs, in the unit of the aim: against the best
 *     design nearby that disregards them; null where nothing stands on steps or it is not known
 * @param wanted {@code largest} or {@code smallest}, what is wanted of the aim
 * @param choices between which alternatives it chose
 */
public record SearchRecord(
    String aim,
    String aimUnit,
    @Nullable Double aimAsDrawn,
    double aimFound,
    String stopped,
    int generations,
    int evaluations,
    int failures,
    @Nullable Double refinementGain,
    List<Generation> history,
    List<VariableRecord> variables,
    List<Optimum> optima,
    List<ConstraintRecord> constraints,
    @Nullable Front front,
    List<String> notes,
    @Nullable Grid grid,
    @Nullable Double stepCost,
    String wanted,
    List<ChoiceRecord> choices) {

  public SearchRecord {
    choices = choices == null ? List.of() : List.copyOf(choices); // runs of earlier versions
  }

  /** A search without choices. */
  public SearchRecord(
      String aim,
      String aimUnit,
      @Nullable Double aimAsDrawn,
      double aimFound,
      String stopped,
      int generations,
      int evaluations,
      int failures,
      @Nullable Double refinementGain,
      List<Generation> history,
      List<VariableRecord> variables,
      List<Optimum> optima,
      List<ConstraintRecord> constraints,
      @Nullable Front front,
      List<String> notes,
      @Nullable Grid grid,
      @Nullable Double stepCost,
      String wanted) {
    this(
        aim,
        aimUnit,
        aimAsDrawn,
        aimFound,
        stopped,
        generations,
        evaluations,
        failures,
        refinementGain,
        history,
        variables,
        optima,
        constraints,
        front,
        notes,
        grid,
        stepCost,
        wanted,
        List.of());
  }

  /**
   * One generation.
   *
   * @param generation from 1
   * @param evaluations designs evaluated so far
   * @param best best aim so far
   * @param mean mean aim of the generation
   */
  public record Generation(int generation, int evaluations, double best, double mean) {}

  /**
   * A varied quantity.
   *
   * @param key as in the scenario
   * @param unit its unit
   * @param low lower bound
   * @param high upper bound
   * @param step step of the deposition tool, 0 for any value
   * @param drawn value as drawn
   * @param found value found
   * @param equallyGoodLow lower end of the range that is equally good, others re-optimised; null
   *     when it was not found within the evaluations allowed
   * @param equallyGoodHigh upper end of that range
   * @param bound {@code low} or {@code high} when the value stands on that bound, else null
   */
  public record VariableRecord(
      String key,
      String unit,
      double low,
      double high,
      double step,
      double drawn,
      double found,
      @Nullable Double equallyGoodLow,
      @Nullable Double equallyGoodHigh,
      @Nullable String bound) {}

  /**
   * A choice between alternatives, such as the materials of a layer.
   *
   * @param key as in the scenario
   * @param drawn alternative as drawn
   * @param found alternative found
   * @param alternatives all of them
   */
  public record ChoiceRecord(
      String key, String drawn, String found, List<AlternativeRecord> alternatives) {

    /** The alternative without a layer, of the choice whether it is there. */
    public static final String ABSENT = "absent";

    /** Whether it is about a layer being there, not about its material. */
    public boolean asksForPresence() {
      return key.endsWith(".present");
    }
  }

  /**
   * An alternative.
   *
   * @param name such as a material, or {@code present} and {@code absent}
   * @param aim the best aim found with it, all else chosen anew; null where none was found
   */
  public record AlternativeRecord(String name, @Nullable Double aim) {}

  /**
   * A distinct good design.
   *
   * @param aim its aim
   * @param values value of each quantity that varies in it by key
   * @param choices alternative of each choice that matters in it by key
   */
  public record Optimum(double aim, Map<String, Double> values, Map<String, String> choices) {

    public Optimum {
      choices = choices == null ? Map.of() : choices;
    }

    /** A design of a search without choices. */
    public Optimum(double aim, Map<String, Double> values) {
      this(aim, values, Map.of());
    }
  }

  /**
   * A limit.
   *
   * @param text as in the scenario
   * @param value value at the found design
   * @param active whether the limit binds
   */
  public record ConstraintRecord(String text, double value, boolean active) {}

  /**
   * A Pareto front.
   *
   * @param aims names of the aims
   * @param units their units
   * @param wanted {@code largest} or {@code smallest} for each aim
   * @param points the designs, the best in the first aim first
   * @param knee index of the point with the best compromise
   * @param shown index of the point that the rest of the result is about
   * @param asDrawn the aims of the stack as drawn; null where it could not be evaluated
   */
  public record Front(
      List<String> aims,
      List<String> units,
      List<String> wanted,
      List<FrontPoint> points,
      int knee,
      int shown,
      @Nullable List<Double> asDrawn) {}

  /**
   * A design on the front.
   *
   * @param aims value of each aim
   * @param values value of each quantity that varies in it by key
   * @param choices alternative of each choice that matters in it by key
   */
  public record FrontPoint(
      List<Double> aims, Map<String, Double> values, Map<String, String> choices) {

    public FrontPoint {
      choices = choices == null ? Map.of() : choices;
    }

    /** A design of a search without choices. */
    public FrontPoint(List<Double> aims, Map<String, Double> values) {
      this(aims, values, Map.of());
    }
  }

  /**
   * Every point of a grid over the ranges, its best points refined.
   *
   * @param points number of points of each varied quantity, in their order
   * @param evaluations designs evaluated
   * @param best its best design; null where none could be evaluated
   * @param better whether that is better than the design found by more than the tolerance
   * @param complete whether every point was seen; false when it was interrupted
   * @param asked whether it was asked for; else it was tried because it takes little time
   */
  public record Grid(
      List<Integer> points,
      long evaluations,
      @Nullable Optimum best,
      boolean better,
      boolean complete,
      boolean asked) {}
}
