package evensun.transfermatrix;

import evensun.spi.Design;
import evensun.spi.Finding;
import evensun.spi.Incidence;
import evensun.spi.Problem;
import evensun.spi.Severity;
import evensun.transfermatrix.kernel.Layout;
import evensun.transfermatrix.kernel.reference.ReferenceKernel;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Finds where the picture of independent intensities in an absorbing medium is strained.
 *
 * <p>Incident and reflected waves at the face of an absorbing medium share a mixed flux. For an
 * incoherent layer it is booked to that layer; where it is large, the layer absorbs too much to be
 * called incoherent.
 */
final class MixedTerms {

  private static final double NOTABLE_FRACTION = 1e-3;

  private MixedTerms() {}

  static List<Finding> examine(Problem problem, Design design) {
    List<Finding> findings = new ArrayList<>();
    ReferenceKernel kernel = new ReferenceKernel(problem.wavelengthNm().toArray());
    Stack stack = new Stack(problem);
    stack.check(design);
    double[] largest = new double[problem.layerCount()];
    for (Incidence incidence : problem.incidences()) {
      Layout layout = stack.layout(design, incidence.side(), false);
      kernel.mixedTerms(layout, Stack.beam(incidence), design.n, design.k, largest);
    }
    for (int l = 0; l < largest.length; l++) {
      if (largest[l] > NOTABLE_FRACTION) {
        findings.add(finding(problem.layers().get(l).name(), largest[l]));
      }
    }
    return findings;
  }

  private static Finding finding(String layer, double fraction) {
    return new Finding(
        "mixed-term",
        Severity.WARNING,
        "layer " + layer,
        String.format(
            Locale.ROOT,
            "up to %.2g %% of the light is booked to this incoherent layer for waves that are not"
                + " independent at its faces; the layer absorbs strongly within a wavelength of a"
                + " face: write coherence: coherent if it is thin, or take the share as uncertain",
            100 * fraction));
  }
}
