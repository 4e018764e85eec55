package evensun.evaluation;

import evensun.spi.Channel;
import evensun.stack.ResolvedStack;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * Reads one quantity of a design. Belongs to one thread when the quantity is the efficiency.
 *
 * @param quantity what is read
 * @param of indices of subcells or layers
 * @param weights one for each of them, for a sum of currents
 * @param large whether large values are bad, so that the largest of several is the worst
 * @param sum sum that a bench has to take along, for reflected, transmitted and parasitic light
 * @param efficiency what tells the efficiency
 */
record Gauge(
    Quantity quantity,
    List<Integer> of,
    List<Double> weights,
    boolean large,
    @Nullable LightSum sum,
    @Nullable Aim efficiency) {

  Gauge {
    of = List.copyOf(of);
    weights = List.copyOf(weights);
  }

  /**
   * A gauge for a stack.
   *
   * @param names subcells or layers, empty for all
   * @param weights one for each name; empty for ones
   * @param large whether large values are bad
   * @param efficiency tells the efficiency; needed for that quantity alone
   */
  static Gauge of(
      Quantity quantity,
      List<String> names,
      List<Double> weights,
      boolean large,
      Model model,
      @Nullable Aim efficiency) {
    List<Integer> of = indices(quantity, names, model.stack());
    List<Double> ones = weights.isEmpty() ? of.stream().map(i -> 1.0).toList() : weights;
    return new Gauge(quantity, of, ones, large, sum(quantity, of, names, model), efficiency);
  }

  private static List<Integer> indices(Quantity quantity, List<String> names, ResolvedStack stack) {
    List<String> known =
        quantity.of() == Quantity.Of.LAYERS
            ? stack.layers().stream().map(layer -> layer.name()).toList()
            : stack.subcells().stream().map(ResolvedSubcell::name).toList();
    List<Integer> indices = new ArrayList<>();
    (names.isEmpty() ? known : names).forEach(name -> indices.add(known.indexOf(name)));
    return indices;
  }

  private static @Nullable LightSum sum(
      Quantity quantity, List<Integer> layers, List<String> names, Model model) {
    List<ResolvedSubcell> subcells = model.stack().subcells();
    boolean exitCollects = subcells.stream().anyMatch(model::exitBelongsTo);
    return switch (quantity) {
      case REFLECTED -> LightSum.absorbed(model, channel -> true, true);
      case TRANSMITTED -> LightSum.absorbed(model, channel -> false, !exitCollects);
      case PARASITIC ->
          LightSum.absorbed(
              model,
              channel ->
                  isLost(channel, model) && (names.isEmpty() || layers.contains(channel.layer())),
              false);
      default -> null;
    };
  }

  private static boolean isLost(Channel channel, Model model) {
    return model.stack().subcells().stream().noneMatch(s -> model.belongsTo(channel, s));
  }

  /** What a bench has to take along. */
  List<LightSum> lightSums() {
    List<LightSum> sums = new ArrayList<>();
    if (sum != null) {
      sums.add(sum);
    }
    if (efficiency != null) {
      sums.addAll(efficiency.lightSums());
    }
    return sums;
  }

  /** The same for another thread. */
  Gauge forAnotherThread() {
    return efficiency == null
        ? this
        : new Gauge(quantity, of, weights, large, sum, efficiency.forAnotherThread());
  }

  /** Value of the quantity in its unit. */
  double value(Reading reading) {
    double[] currents = reading.photocurrentMaPerCm2();
    return switch (quantity) {
      case MISMATCH -> fold(currents, Math::max) - fold(currents, Math::min);
      case MATCHED_CURRENT -> fold(currents, Math::min);
      case PHOTOCURRENT -> worst(currents);
      case BANDGAP -> worst(reading.bandgapEv());
      case CURRENT_SUM -> weighted(currents);
      case THICKNESS -> weighted(reading.thicknessNm());
      case REFLECTED -> incident() - reading.sum(sum);
      case TRANSMITTED, PARASITIC -> reading.sum(sum);
      case EFFICIENCY -> efficiency.value(reading);
    };
  }

  private double incident() {
    return Arrays.stream(sum.weight().toArray()).sum();
  }

  private double worst(double[] row) {
    return fold(row, large ? Math::max : Math::min);
  }

  private double fold(double[] row, DoubleBinaryOperator operator) {
    return of.stream().mapToDouble(i -> row[i]).reduce(operator).orElseThrow();
  }

  private double weighted(double[] row) {
    return IntStream.range(0, of.size()).mapToDouble(j -> weights.get(j) * row[of.get(j)]).sum();
  }
}
