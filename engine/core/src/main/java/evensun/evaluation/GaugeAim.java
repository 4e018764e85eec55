package evensun.evaluation;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** A reported quantity as an aim. */
public final class GaugeAim implements Aim {

  private final String name;
  private final Gauge gauge;
  private final boolean smallest;

  private GaugeAim(String name, Gauge gauge, boolean smallest) {
    this.name = name;
    this.gauge = gauge;
    this.smallest = smallest;
  }

  /**
   * An aim.
   *
   * @param quantity what is wanted
   * @param name name of the aim; empty for that of the quantity and what it is of
   * @param of subcells or layers, empty for all
   * @param weights one for each of them; empty for ones
   * @param smallest whether it is to be small
   * @param efficiency tells the efficiency; needed for that quantity alone
   */
  public static GaugeAim of(
      Quantity quantity,
      String name,
      List<String> of,
      List<Double> weights,
      boolean smallest,
      Model model,
      @Nullable Aim efficiency) {
    String key = of.isEmpty() ? quantity.key() : String.join("+", of) + "." + quantity.key();
    return new GaugeAim(
        name.isEmpty() ? key : name,
        Gauge.of(quantity, of, weights, smallest, model, efficiency),
        smallest);
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public String unit() {
    return gauge.quantity().unit();
  }

  @Override
  public double value(Reading reading) {
    double value = gauge.value(reading);
    return smallest ? -value : value;
  }

  @Override
  public List<LightSum> lightSums() {
    return gauge.lightSums();
  }

  @Override
  public boolean isSmallest() {
    return smallest;
  }

  @Override
  public boolean isSmooth() {
    return gauge.quantity().isSmooth();
  }

  @Override
  public boolean isSmallestCurrent() {
    return gauge.quantity() == Quantity.MATCHED_CURRENT && !smallest;
  }

  @Override
  public Aim forAnotherThread() {
    return new GaugeAim(name, gauge.forAnotherThread(), smallest);
  }
}
