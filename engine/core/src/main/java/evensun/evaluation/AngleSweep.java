package evensun.evaluation;

import evensun.result.Angular;
import evensun.spi.Incidence;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A design under light from several angles; the irradiance on the cell plane stays the same. */
public final class AngleSweep {

  private static final double LAST_DEG = 85;

  private AngleSweep() {}

  /** Directions every {@code stepDeg} degrees up to 85°, with the polarisation of the scenario. */
  public static List<Incidence> incidences(Model model, double stepDeg) {
    List<Incidence> incidences = new ArrayList<>();
    for (int i = 0; i * stepDeg <= LAST_DEG + 1e-9; i++) {
      incidences.add(
          new Incidence(
              Math.min(i * stepDeg, LAST_DEG),
              model.stack().scenario().light().polarisation(),
              Side.FRONT));
    }
    return incidences;
  }

  /**
   * Currents against angle.
   *
   * @param bench a bench of a model prepared for {@link #incidences}, set to the design
   */
  public static Angular of(Bench bench) {
    Model model = bench.model();
    Response response = bench.spectra();
    List<Double> angles = new ArrayList<>();
    List<Double> reflected = new ArrayList<>();
    Map<String, List<Double>> currents = new LinkedHashMap<>();
    model.stack().subcells().forEach(s -> currents.put(s.name(), new ArrayList<>()));
    int channels = model.channels().size();
    for (int i = 0; i < model.problem().incidences().size(); i++) {
      Ledger.check(response, i, channels, model.stack().grid().wavelengthNm());
      angles.add(model.problem().incidences().get(i).angleDeg());
      reflected.add(weighted(model, response.reflectance[i]));
      for (ResolvedSubcell subcell : model.stack().subcells()) {
        currents.get(subcell.name()).add(current(model, response, i, subcell));
      }
    }
    return new Angular(angles, reflected, currents);
  }

  private static double current(Model model, Response response, int i, ResolvedSubcell subcell) {
    int channels = model.channels().size();
    double sum = model.exitBelongsTo(subcell) ? weighted(model, response.transmittance[i]) : 0;
    for (int c = 0; c < channels; c++) {
      if (model.belongsTo(model.channels().get(c), subcell)) {
        sum += weighted(model, response.absorptance[i * channels + c]);
      }
    }
    return sum;
  }

  private static double weighted(Model model, double[] share) {
    double sum = 0;
    for (int w = 0; w < share.length; w++) {
      sum += share[w] * model.problem().incidentMaPerCm2().at(w);
    }
    return sum;
  }
}
