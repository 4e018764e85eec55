package evensun.scenario;

import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * What to search.
 *
 * @param vary what may vary, in the order of the file
 * @param choices between which alternatives it may choose
 * @param limits what a design must keep
 * @param aims what is wanted: one, or several of which none is to be sacrificed to another
 * @param seed seed of the search
 * @param evaluations largest number of evaluations, if the scenario sets one
 * @param timeSeconds time the search may take, if the scenario sets one
 * @param place where it stands
 */
public record SearchSpec(
    List<VarySpec> vary,
    List<ChoiceSpec> choices,
    List<LimitSpec> limits,
    List<AimSpec> aims,
    long seed,
    OptionalInt evaluations,
    OptionalDouble timeSeconds,
    Place place) {

  public SearchSpec {
    vary = List.copyOf(vary);
    limits = List.copyOf(limits);
    choices = List.copyOf(choices);
    aims = List.copyOf(aims);
  }

  /** This search with another seed. */
  SearchSpec withSeed(long other) {
    return new SearchSpec(vary, choices, limits, aims, other, evaluations, timeSeconds, place);
  }

  /**
   * This search with every choice made: none is left.
   *
   * @param layers the stack with its choices made
   */
  SearchSpec settled(List<LayerSpec> layers) {
    return with(vary, List.of()).on(layers);
  }

  /**
   * This search on a stack: the thickness of a layer that is left out, and may not come back, does
   * not vary, nor what follows it.
   */
  public SearchSpec on(List<LayerSpec> layers) {
    Set<String> gone =
        layers.stream()
            .filter(layer -> !layer.present() && !mayBePresent(layer))
            .map(layer -> layer.name() + ".thicknessNm")
            .collect(Collectors.toSet());
    List<VarySpec> left =
        vary.stream().filter(v -> !gone.contains(v.key()) && !gone.contains(v.sameAs())).toList();
    return with(left, choices);
  }

  private boolean mayBePresent(LayerSpec layer) {
    return choices.stream()
        .anyMatch(choice -> choice.isPresence() && choice.layer().equals(layer.name()));
  }

  private SearchSpec with(List<VarySpec> otherVary, List<ChoiceSpec> otherChoices) {
    return new SearchSpec(
        otherVary, otherChoices, limits, aims, seed, evaluations, timeSeconds, place);
  }

  /**
   * A choice between alternatives that have no order.
   *
   * @param key such as {@code front-contact.material} or {@code spacer.present}
   * @param names materials, or {@code present} and {@code absent}; one alone is settled
   * @param drawn which of them is drawn
   * @param place where it stands
   */
  public record ChoiceSpec(String key, List<String> names, int drawn, Place place) {

    /** The alternative with the layer. */
    public static final String PRESENT = "present";

    /** The alternative without the layer. */
    public static final String ABSENT = "absent";

    public ChoiceSpec {
      names = List.copyOf(names);
    }

    /** The layer that is chosen for. */
    public String layer() {
      return key.substring(0, key.lastIndexOf('.'));
    }

    /** Whether it is about the layer being there, not about its material. */
    public boolean isPresence() {
      return key.endsWith(".present");
    }
  }

  /** Every quantity with its own range; that of a tied one follows from what it follows. */
  public List<VarySpec> ranges() {
    return vary.stream().map(this::withRange).toList();
  }

  private VarySpec withRange(VarySpec spec) {
    return vary.stream()
        .filter(leader -> spec.isTied() && leader.key().equals(spec.sameAs()))
        .findFirst()
        .map(leader -> spec.between(spec.ratio() * leader.low(), spec.ratio() * leader.high()))
        .orElse(spec);
  }

  /**
   * One quantity that may vary.
   *
   * @param key such as {@code perovskite.thicknessNm}
   * @param low lower bound in the unit of the key; of a tied quantity 0
   * @param high upper bound in the unit of the key, at least {@code low}; of a tied quantity 0
   * @param step what the deposition tool can set: values are {@code low} plus multiples; 0 for any
   * @param sameAs key of the quantity that this one follows, empty when it varies by itself
   * @param ratio what the followed value is multiplied by
   * @param place where it stands
   */
  public record VarySpec(
      String key, double low, double high, double step, String sameAs, double ratio, Place place) {

    /** Any value in a range. */
    public VarySpec(String key, double low, double high, Place place) {
      this(key, low, high, 0, "", 1, place);
    }

    VarySpec between(double newLow, double newHigh) {
      return new VarySpec(key, newLow, newHigh, step, sameAs, ratio, place);
    }

    /** Whether it follows another quantity. */
    public boolean isTied() {
      return !sameAs.isEmpty();
    }
  }

  /**
   * Something wanted.
   *
   * @param name as the scenario writes it when it is one of the named aims, else empty
   * @param quantity name of the quantity
   * @param of subcells or layers; empty for all that have the quantity
   * @param weights one for each of {@code of}; empty for ones
   * @param smallest whether it is to be small
   * @param place where it stands
   */
  public record AimSpec(
      String name,
      String quantity,
      List<String> of,
      List<Double> weights,
      boolean smallest,
      Place place) {

    public AimSpec {
      of = List.copyOf(of);
      weights = List.copyOf(weights);
    }
  }

  /**
   * A limit that a design must keep.
   *
   * @param quantity name of the quantity, such as {@code mismatchMaPerCm2}
   * @param of subcells or layers; empty for all that have the quantity
   * @param atLeast lower limit in the unit of the quantity, if set
   * @param atMost upper limit in the unit of the quantity, if set
   * @param place where it stands
   */
  public record LimitSpec(
      String quantity,
      List<String> of,
      OptionalDouble atLeast,
      OptionalDouble atMost,
      Place place) {

    public LimitSpec {
      of = List.copyOf(of);
    }
  }
}
