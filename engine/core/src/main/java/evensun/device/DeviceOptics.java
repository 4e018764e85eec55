package evensun.device;

import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.SubcellOutcome;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * What the optics say about a device: photocurrents, and with them the spectra that explain them.
 * Immutable once made.
 */
public final class DeviceOptics {

  private final double[] photocurrentMaPerCm2;
  private final double[] wavelengthNm;
  private final double[] incidentMaPerCm2;
  private final double[] reflectance;
  private final double[] transmittance;
  private final double[][] subcell;
  private final List<String> parasiticNames = new ArrayList<>();
  private final List<double[]> parasitic = new ArrayList<>();

  private DeviceOptics(double[] photocurrentMaPerCm2) {
    this.photocurrentMaPerCm2 = photocurrentMaPerCm2;
    wavelengthNm = new double[0];
    incidentMaPerCm2 = wavelengthNm;
    reflectance = wavelengthNm;
    transmittance = wavelengthNm;
    subcell = new double[photocurrentMaPerCm2.length][0];
  }

  private DeviceOptics(Spectral spectral, List<SubcellOutcome> subcells) {
    photocurrentMaPerCm2 = new double[subcells.size()];
    wavelengthNm = plain(spectral.wavelengthNm());
    incidentMaPerCm2 = plain(spectral.incidentMaPerCm2());
    reflectance = plain(spectral.reflectance());
    subcell = new double[subcells.size()][wavelengthNm.length];
    double[] beyond = plain(spectral.transmittance());
    Set<String> used = new HashSet<>();
    for (int s = 0; s < subcells.size(); s++) {
      Double current = subcells.get(s).photocurrentMaPerCm2();
      photocurrentMaPerCm2[s] = current == null ? 0 : current;
      for (String absorber : subcells.get(s).absorbers()) {
        used.add(absorber);
        List<Double> row = spectral.absorptance().get(absorber);
        add(row == null ? beyond : plain(row), subcell[s]);
        beyond = row == null ? new double[wavelengthNm.length] : beyond;
      }
    }
    transmittance = beyond;
    for (Map.Entry<String, List<Double>> row : spectral.absorptance().entrySet()) {
      if (!used.contains(row.getKey())) {
        parasiticNames.add(row.getKey());
        parasitic.add(plain(row.getValue()));
      }
    }
  }

  /**
   * Photocurrents alone.
   *
   * @param photocurrentMaPerCm2 [subcell] absorbed light in mA cm⁻²
   */
  public static DeviceOptics ofCurrents(double... photocurrentMaPerCm2) {
    return new DeviceOptics(photocurrentMaPerCm2.clone());
  }

  /**
   * Photocurrents with their spectra. An absorber that has no row of absorptance is the exit
   * medium, whose light is the transmittance.
   *
   * @param spectral spectra on the grid
   * @param subcells in the order the light meets them
   */
  public static DeviceOptics of(Spectral spectral, List<SubcellOutcome> subcells) {
    return new DeviceOptics(spectral, subcells);
  }

  int subcellCount() {
    return photocurrentMaPerCm2.length;
  }

  /** [subcell] absorbed light in mA cm⁻²; a fresh array. */
  double[] photocurrents() {
    return photocurrentMaPerCm2.clone();
  }

  /** Whether there are spectra on a grid of more than one wavelength. */
  boolean hasSpectra() {
    return wavelengthNm.length > 1;
  }

  int wavelengthCount() {
    return wavelengthNm.length;
  }

  double wavelengthNm(int w) {
    return wavelengthNm[w];
  }

  /** [w] in nm; a fresh array. */
  double[] wavelengthsNm() {
    return wavelengthNm.clone();
  }

  double incidentMaPerCm2(int w) {
    return incidentMaPerCm2[w];
  }

  double reflectance(int w) {
    return reflectance[w];
  }

  /** Light lost to an exit medium that belongs to no subcell. */
  double transmittance(int w) {
    return transmittance[w];
  }

  double absorptance(int s, int w) {
    return subcell[s][w];
  }

  List<String> parasiticNames() {
    return List.copyOf(parasiticNames);
  }

  double parasitic(int layer, int w) {
    return parasitic.get(layer)[w];
  }

  /** [w + 1] edges of the bins in nm. */
  double[] edgesNm() {
    int last = wavelengthNm.length - 1;
    double step = (wavelengthNm[last] - wavelengthNm[0]) / last;
    return WavelengthGrid.of(wavelengthNm[0], wavelengthNm[last], step).edgesNm();
  }

  /**
   * Photon current of each bin that a step absorber at each gap would take, the light meeting the
   * first one first.
   *
   * @return [subcell][w] in mA cm⁻²
   */
  double[][] stepBins(Spectrum spectrum, double[] bandgapEv) {
    double[] edges = edgesNm();
    double[][] bins = new double[bandgapEv.length][wavelengthNm.length];
    double[] bands = StepCurrents.edgesNm(spectrum, bandgapEv);
    for (int s = 0; s < bandgapEv.length; s++) {
      for (int w = 0; w < wavelengthNm.length; w++) {
        double from = Math.max(edges[w], bands[s]);
        double to = Math.min(edges[w + 1], bands[s + 1]);
        bins[s][w] = to > from ? spectrum.photonCurrentMaPerCm2(from, to) : 0;
      }
    }
    return bins;
  }

  private static void add(double[] from, double[] to) {
    Arrays.setAll(to, i -> to[i] + from[i]);
  }

  private static double[] plain(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
