package evensun.verify;

import evensun.device.DeviceModel;
import evensun.device.DeviceParameters;
import evensun.device.SubcellParameters;
import evensun.light.Blackbody;
import evensun.light.Constants;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.result.Published;
import evensun.scenario.Connection;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.Services;
import java.util.ArrayList;
import java.util.List;

/** The published values that {@code evensun verify} computes. */
public final class PublishedValues {

  private static final String ASTM = "ASTM G173-03 tables";
  private static final String TABLE =
      "computed for this project from the ASTM G173-03 table, step absorptance";

  private PublishedValues() {}

  /**
   * All of them.
   *
   * @param thinFilms the solver of flat thin films
   * @param services what the host offers to it
   */
  public static List<PublishedValue> all(OpticalSolver thinFilms, Services services) {
    List<PublishedValue> values = new ArrayList<>(withoutRays(thinFilms, services));
    services.solver("ray-trace").ifPresent(r -> values.addAll(rays(new RayProbe(r, services))));
    return values;
  }

  /** All but those that rays are traced for, which take some seconds; parameters as above. */
  public static List<PublishedValue> withoutRays(OpticalSolver thinFilms, Services services) {
    List<PublishedValue> values = new ArrayList<>(light());
    values.addAll(glasses());
    values.addAll(silicon());
    values.addAll(limits());
    values.addAll(films(new ThinFilmProbe(thinFilms, services)));
    return values;
  }

  /** Values computed and compared. */
  public static List<Published> compared(List<PublishedValue> values) {
    return values.stream().map(PublishedValue::verdict).toList();
  }

  private static List<PublishedValue> light() {
    return List.of(
        value("AM1.5G, irradiance", "W m⁻²", 1000.37, 0.01, ASTM, () -> total("AM1.5G")),
        value("AM1.5D, irradiance", "W m⁻²", 900.14, 0.01, ASTM, () -> total("AM1.5D")),
        value("AM0, irradiance", "W m⁻²", 1347.93, 0.01, ASTM, () -> total("AM0")),
        value(
            "AM1.5G, current of 300 to 1200 nm",
            "mA cm⁻²",
            46.456,
            0.001,
            TABLE,
            () -> Spectra.named("AM1.5G").photonCurrentMaPerCm2(300, 1200)),
        value(
            "blackbody at 5772 K, irradiance over σT⁴",
            "",
            1,
            0.002,
            "Stefan–Boltzmann law, σ = 5.670374419e-8 W m⁻² K⁻⁴ (CODATA 2018)",
            () -> Blackbody.at(5772).totalWPerM2() / (5.670374419e-8 * Math.pow(5772, 4))));
  }

  private static double total(String name) {
    return Spectra.named(name).totalWPerM2();
  }

  private static List<PublishedValue> glasses() {
    return List.of(
        value(
            "fused silica, n at 587.56 nm",
            "",
            1.45846,
            1e-5,
            "Malitson, J. Opt. Soc. Am. 55, 1205 (1965)",
            () -> index("fused-silica", 587.56)),
        value(
            "sapphire (ordinary), n at 587.56 nm",
            "",
            1.7682,
            1e-4,
            "Malitson, J. Opt. Soc. Am. 52, 1377 (1962)",
            () -> index("sapphire", 587.56)),
        value(
            "borosilicate crown glass, n at 587.56 nm",
            "",
            1.5168,
            1e-4,
            "from memory",
            () -> index("borosilicate-crown-glass", 587.56)));
  }

  private static double index(String name, double nm) {
    return constants(name, nm)[0][0];
  }

  private static double[][] constants(String name, double... nm) {
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    double[][] rows = new double[2][nm.length];
    material.on(nm).fill(material.bandgapEv().orElse(0), rows[0], rows[1]);
    return rows;
  }

  private static List<PublishedValue> silicon() {
    String form = "computed from the table of Green, Sol. Energy Mater. Sol. Cells 92, 1305 (2008)";
    return List.of(
        value(
            "silicon, 180 µm, weak-absorption light trapping",
            "mA cm⁻²",
            43.926,
            0.01,
            "Tiedje et al., IEEE Trans. Electron Devices 31, 711 (1984); " + form,
            () -> trapped(180)),
        value(
            "silicon, 10 µm, weak-absorption light trapping",
            "mA cm⁻²",
            39.773,
            0.01,
            "Tiedje et al., IEEE Trans. Electron Devices 31, 711 (1984); " + form,
            () -> trapped(10)));
  }

  /** Current of A = α/(α + 1/(4n²W)) under AM1.5G on 300 to 1200 nm in 1 nm steps. */
  private static double trapped(double widthUm) {
    WavelengthGrid grid = WavelengthGrid.of(300, 1200, 1);
    double[] nm = grid.wavelengthNm();
    double[][] rows = constants("crystalline-silicon", nm);
    double[] bins = Spectra.named("AM1.5G").binsMaPerCm2(grid);
    double sum = 0;
    for (int w = 0; w < nm.length; w++) {
      double alphaPerNm = 4 * Math.PI * rows[1][w] / nm[w];
      double path = 4 * rows[0][w] * rows[0][w] * widthUm * 1000;
      sum += bins[w] * alphaPerNm / (alphaPerNm + 1 / path);
    }
    return sum;
  }

  private static List<PublishedValue> limits() {
    return List.of(
        value(
            "one junction at 1.34 eV, limit",
            "%",
            33.7,
            0.1,
            "Rühle, Sol. Energy 130, 139 (2016)",
            () -> limit(1.34)),
        value("one junction at 1.12 eV, limit", "%", 33.48, 0.03, TABLE, () -> limit(1.12)),
        value("one junction at 1.424 eV, limit", "%", 33.17, 0.03, TABLE, () -> limit(1.424)),
        value("one junction at 1.70 eV, limit", "%", 29.03, 0.03, TABLE, () -> limit(1.70)),
        value(
            "two junctions in series at 1.60 / 0.94 eV, limit",
            "%",
            45.7,
            0.2,
            "from memory",
            () -> limit(1.60, 0.94)),
        value(
            "two junctions in series at 1.73 / 1.12 eV, limit",
            "%",
            45.1,
            0.2,
            "from memory",
            () -> limit(1.73, 1.12)),
        value(
            "three junctions in series at 1.90 / 1.37 / 0.93 eV, limit",
            "%",
            51.70,
            0.03,
            TABLE,
            () -> limit(1.90, 1.37, 0.93)));
  }

  /**
   * Detailed-balance efficiency of ideal junctions in series that absorb all light above their gap.
   */
  private static double limit(double... gapsEv) {
    Spectrum spectrum = Spectra.named("AM1.5G");
    List<SubcellParameters> subcells = new ArrayList<>();
    double[] currents = new double[gapsEv.length];
    double fromNm = spectrum.fromNm();
    for (int i = 0; i < gapsEv.length; i++) {
      double edgeNm = Constants.HC_EV_NM / gapsEv[i];
      currents[i] = spectrum.photonCurrentMaPerCm2(fromNm, edgeNm);
      fromNm = edgeNm;
      subcells.add(SubcellParameters.ideal("junction " + (i + 1), gapsEv[i]));
    }
    return DeviceModel.of(subcells, DeviceParameters.of(Connection.SERIES), spectrum)
        .newPowerModel()
        .efficiencyPercent(currents, gapsEv);
  }

  private static List<PublishedValue> films(ThinFilmProbe probe) {
    String fresnel = "Fresnel equations, Born & Wolf, Principles of Optics";
    double brewsterDeg = Math.toDegrees(Math.atan(1.5));
    return List.of(
        value("glass n = 1.5, reflectance", "%", 4, 1e-9, fresnel, () -> 100 * probe.bare(1.5)),
        value(
            "glass at Brewster's angle, p light, reflectance",
            "%",
            0,
            1e-9,
            fresnel,
            () -> 100 * probe.oblique(1.5, brewsterDeg, Polarisation.P)),
        value(
            "quarter-wave film of n = √1.5 on glass, reflectance",
            "%",
            0,
            1e-9,
            "Born & Wolf, Principles of Optics",
            () -> 100 * probe.coated(Math.sqrt(1.5), 600 / (4 * Math.sqrt(1.5)), 1.5)),
        value(
            "five quarter-wave pairs 2.3 / 1.38 on glass, reflectance",
            "%",
            100 * Math.pow((1.5 - ratio()) / (1.5 + ratio()), 2),
            1e-9,
            "closed form (n_s − (n_H/n_L)^2N)/(n_s + …), reciprocal, Born & Wolf",
            () -> 100 * probe.mirror(2.3, 1.38, 5, 1.5)));
  }

  /** (n_L/n_H)^2N of the mirror above. */
  private static double ratio() {
    return Math.pow(1.38 / 2.3, 10);
  }

  private static List<PublishedValue> rays(RayProbe probe) {
    String trapping =
        "exact integral over directions, computed from the table of Green, Sol. Energy Mater. Sol."
            + " Cells 92, 1305 (2008)";
    double[][] silicon = constants("crystalline-silicon", 600);
    double n = silicon[0][0];
    double k = silicon[1][0];
    return List.of(
        value(
            "silicon, 180 µm, ideal faces, by rays",
            "mA cm⁻²",
            44.079,
            0.03,
            trapping,
            () -> ideal(probe, 180)),
        value(
            "pyramids of bare silicon, reflectance at 600 nm, by rays",
            "%",
            100 * Facets.pyramids(n, k),
            0.1,
            "Fresnel equations at 54.74°, 15.79° and, for one ray in nine, 86.32° (geometry)",
            () -> 100 * probe.pyramids(n, k)));
  }

  private static double ideal(RayProbe probe, double widthUm) {
    WavelengthGrid grid = WavelengthGrid.of(300, 1200, 1);
    double[][] rows = constants("crystalline-silicon", grid.wavelengthNm());
    double[] bins = Spectra.named("AM1.5G").binsMaPerCm2(grid);
    return probe.idealCurrent(grid.wavelengthNm(), bins, rows[0], rows[1], widthUm);
  }

  private static PublishedValue value(
      String what,
      String unit,
      double published,
      double tolerance,
      String source,
      java.util.function.DoubleSupplier computation) {
    return new PublishedValue(what, unit, published, tolerance, source, computation);
  }
}
