package evensun.report.figure;

import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.Parasitic;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The available current, split in the light's order.
 *
 * @param incidentMaPerCm2 available, mA cm⁻²
 * @param shares reflected first, exit medium last
 */
public record Budget(double incidentMaPerCm2, List<Share> shares) {

  private static final Set<String> CLEAR = Set.of("air", "vacuum");

  /** Copies the shares. */
  public Budget {
    shares = List.copyOf(shares);
  }

  /** The budget of an outcome; empty where there are no currents. */
  public static Optional<Budget> of(Outcome outcome) {
    Losses losses = outcome.losses();
    Double incident = outcome.incidentMaPerCm2();
    if (losses == null || incident == null) {
      return Optional.empty();
    }
    return Optional.of(new Budget(incident, split(outcome, losses)));
  }

  private static List<Share> split(Outcome outcome, Losses losses) {
    Map<String, Share> byChannel = new LinkedHashMap<>();
    outcome.spectral().absorptance().keySet().forEach(channel -> byChannel.put(channel, NONE));
    int count = 0;
    for (Parasitic parasitic : losses.parasitic()) {
      String role = Share.parasiticRole(count++);
      byChannel.put(
          parasitic.layer(),
          new Share(
              parasitic.layer(), role, parasitic.maPerCm2(), parasitic.standardErrorMaPerCm2()));
    }
    for (int i = 0; i < outcome.subcells().size(); i++) {
      place(outcome.subcells().get(i), Share.subcellRole(i), byChannel);
    }
    List<Share> shares = new ArrayList<>();
    shares.add(
        new Share(
            "reflected",
            "reflected",
            losses.reflectedMaPerCm2(),
            losses.reflectedStandardErrorMaPerCm2()));
    byChannel.values().stream().filter(share -> share != NONE).forEach(shares::add);
    exitShare(outcome, losses).ifPresent(shares::add);
    return shares;
  }

  private static final Share NONE = new Share("", "", 0);

  /** A subcell with several absorbers stands where the light meets the first. */
  private static void place(SubcellOutcome subcell, String role, Map<String, Share> byChannel) {
    Double current = subcell.photocurrentMaPerCm2();
    if (current == null) {
      return;
    }
    String first =
        byChannel.keySet().stream()
            .filter(subcell.absorbers()::contains)
            .findFirst()
            .orElse("subcell " + subcell.name());
    byChannel.put(first, new Share(subcell.name(), role, current, subcell.standardErrorMaPerCm2()));
  }

  private static Optional<Share> exitShare(Outcome outcome, Losses losses) {
    Optional<StackEntry> exit =
        outcome.stack().stream().filter(entry -> entry.role().equals("exit")).findFirst();
    boolean collects = exit.map(entry -> entry.subcell() != null).orElse(false);
    if (collects && losses.transmittedMaPerCm2() == 0) {
      return Optional.empty();
    }
    return Optional.of(
        new Share(
            exit.map(Budget::exitLabel).orElse("transmitted"),
            "exit",
            losses.transmittedMaPerCm2(),
            losses.transmittedStandardErrorMaPerCm2()));
  }

  /** What people are shown for light that enters the exit medium. */
  public static String exitLabel(StackEntry exit) {
    return CLEAR.contains(exit.material())
        ? "transmitted into " + exit.material()
        : "absorbed in " + exit.name() + " (exit)";
  }

  /** The sum of all shares in mA cm⁻², which is the available current. */
  public double totalMaPerCm2() {
    return shares.stream().mapToDouble(Share::maPerCm2).sum();
  }

  /** What the subcells collect together, mA cm⁻². */
  public double collectedMaPerCm2() {
    return shares.stream().filter(Share::collected).mapToDouble(Share::maPerCm2).sum();
  }

  /** Whether the shares carry statistical errors. */
  public boolean isStatistical() {
    return shares.stream().anyMatch(share -> share.standardErrorMaPerCm2() != null);
  }

  /** The losses, in the light's order. */
  public List<Share> losses() {
    return shares.stream().filter(share -> !share.collected()).toList();
  }

  /** The share of that label, zero where there is none. */
  public double of(String label) {
    return shares.stream()
        .filter(share -> share.label().equals(label))
        .mapToDouble(Share::maPerCm2)
        .sum();
  }
}
