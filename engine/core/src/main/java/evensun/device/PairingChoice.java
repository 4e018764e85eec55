package evensun.device;

import evensun.spi.Finding;
import java.util.ArrayList;
import java.util.List;

/**
 * Which absorptance goes with which saturation current: one choice for all designs of a run, so
 * that a search ranks them by what its report says.
 *
 * @param reciprocal whether the saturation currents come from the subcells' own absorptance; else
 *     from a step edge at each bandgap
 * @param findings why reciprocity was refused
 */
public record PairingChoice(boolean reciprocal, List<Finding> findings) {

  public PairingChoice {
    findings = List.copyOf(findings);
  }

  /** Reciprocity only where both have it; a subcell's first refusal is told. */
  public PairingChoice and(PairingChoice other) {
    List<Finding> all = new ArrayList<>(findings);
    for (Finding finding : other.findings) {
      if (all.stream().noneMatch(f -> f.where().equals(finding.where()))) {
        all.add(finding);
      }
    }
    return new PairingChoice(reciprocal && other.reciprocal, all);
  }
}
