package evensun.cli;

import evensun.result.Angular;
import evensun.result.RunResult;
import java.util.Locale;

/** Currents against the angle of incidence as a table for people. */
final class AngleTable {

  private AngleTable() {}

  static String text(RunResult result) {
    Angular angular = result.angular();
    if (angular == null) {
      return "no angles: the solver takes light along the normal only, or the grid has one wavelength\n\n";
    }
    StringBuilder text = new StringBuilder("angle (°)  reflected (mA cm⁻²)");
    angular.subcellMaPerCm2().keySet().forEach(name -> text.append("  ").append(name));
    text.append('\n');
    for (int i = 0; i < angular.angleDeg().size(); i++) {
      text.append(
          String.format(
              Locale.ROOT,
              "%9.1f  %20.2f",
              angular.angleDeg().get(i),
              angular.reflectedMaPerCm2().get(i)));
      for (var entry : angular.subcellMaPerCm2().entrySet()) {
        text.append(
            String.format(
                Locale.ROOT,
                "  %" + Math.max(5, entry.getKey().length()) + ".2f",
                entry.getValue().get(i)));
      }
      text.append('\n');
    }
    return text.append('\n').toString();
  }
}
