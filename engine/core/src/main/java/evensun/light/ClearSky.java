package evensun.light;

import evensun.data.DataFile;

/**
 * Irradiance of a tilted plane under a clear sky by the simple spectral model of Bird and Riordan
 * (J. Clim. Appl. Meteorol. 25, 87 (1986)), on its 122 wavelengths from 300 to 4000 nm.
 *
 * <p>Direct light by Rayleigh scattering, aerosol, water vapour, ozone and mixed gases; diffuse
 * light from Rayleigh and aerosol scattering and from between ground and sky; the plane is tilted
 * towards the sun.
 */
public final class ClearSky {

  private static final double STANDARD_PRESSURE_HPA = 1013.25;
  private static final double ALBEDO_AT_400_NM = 0.945;
  private static final double ALBEDO_FALL = 0.095;
  private static final double FORWARD = Math.log(1 - 0.65);
  private static final double AFS = FORWARD * (1.459 + FORWARD * (0.1595 + FORWARD * 0.4129));
  private static final double BFS = FORWARD * (0.0783 + FORWARD * (-0.3824 - FORWARD * 0.5874));
  private static final double GROUND_AIR_MASS = 1.8;

  private final SkyConditions sky;
  private final double cosZenith;
  private final double cosIncidence;
  private final double ozoneMass;

  private ClearSky(SkyConditions sky) {
    this.sky = sky;
    double zenithDeg = SkyConditions.zenithDeg(sky.airMass());
    this.cosZenith = Math.cos(Math.toRadians(zenithDeg));
    this.cosIncidence = Math.cos(Math.toRadians(zenithDeg - sky.tiltDeg()));
    double height = 22.0 / 6370;
    this.ozoneMass = (1 + height) / Math.sqrt(cosZenith * cosZenith + 2 * height);
  }

  /** The spectrum under a sky; outside the atmosphere (air mass 0) the extraterrestrial table. */
  public static Spectrum of(SkyConditions sky) {
    DataFile table = DataFile.resource(ClearSky.class, "bird-riordan.csv");
    double[] nm = table.column(0);
    double[] outside = table.column(1);
    double[] irradiance = new double[nm.length];
    ClearSky model = sky.airMass() == 0 ? null : new ClearSky(sky);
    double[] water = table.column(2);
    double[] ozone = table.column(3);
    double[] gas = table.column(4);
    for (int i = 0; i < nm.length; i++) {
      irradiance[i] =
          model == null
              ? outside[i]
              : model.tilted(new Line(nm[i] / 1000, outside[i], water[i], ozone[i], gas[i]));
    }
    return Spectrum.of(
        "clear sky, air mass " + sky.airMass(), table.required("source"), nm, irradiance);
  }

  /**
   * One line of the table: wavelength in µm, irradiance outside, absorption coefficients in cm⁻¹.
   */
  private record Line(double um, double outside, double water, double ozone, double gas) {}

  /** Transmittances of one air mass. */
  private record Passage(
      double rayleigh,
      double aerosol,
      double aerosolAbsorbing,
      double aerosolScattering,
      double absorbing) {}

  private Passage passage(Line line, double airMass, double ozoneMass, double pressureMass) {
    double um = line.um();
    double exponent = um < 0.5 ? 1.0274 : 1.2060;
    double depth = sky.aerosolDepth500Nm() * Math.pow(um / 0.5, -exponent) * airMass;
    double log = Math.log(um / 0.4);
    double albedo = ALBEDO_AT_400_NM * Math.exp(-ALBEDO_FALL * log * log);
    double square = um * um;
    double wet = line.water() * sky.precipitableWaterCm() * airMass;
    double water = Math.exp(-0.2385 * wet / Math.pow(1 + 20.07 * wet, 0.45));
    double mixed = line.gas() * pressureMass;
    double gas = Math.exp(-1.41 * mixed / Math.pow(1 + 118.93 * mixed, 0.45));
    double ozone = Math.exp(-line.ozone() * sky.ozoneCm() * ozoneMass);
    return new Passage(
        Math.exp(-pressureMass / (square * square * (115.6406 - 1.335 / square))),
        Math.exp(-depth),
        Math.exp(-(1 - albedo) * depth),
        Math.exp(-albedo * depth),
        water * gas * ozone);
  }

  private double tilted(Line line) {
    double pressureMass = sky.airMass() * sky.pressureHpa() / STANDARD_PRESSURE_HPA;
    Passage p = passage(line, sky.airMass(), ozoneMass, pressureMass);
    double direct = line.outside() * p.rayleigh() * p.aerosol() * p.absorbing();
    double diffuse = diffuse(line, p, direct);
    double horizontal = direct * cosZenith + diffuse;
    double through = direct / line.outside();
    double cosTilt = Math.cos(Math.toRadians(sky.tiltDeg()));
    double around = through * cosIncidence / cosZenith;
    return direct * cosIncidence
        + diffuse * (around + 0.5 * (1 + cosTilt) * (1 - through))
        + 0.5 * horizontal * sky.groundAlbedoFraction() * (1 - cosTilt);
  }

  /** Diffuse irradiance of the horizontal plane. */
  private double diffuse(Line line, Passage p, double direct) {
    double forward = 1 - 0.5 * Math.exp((AFS + BFS * cosZenith) * cosZenith);
    double base = line.outside() * cosZenith * p.absorbing() * p.aerosolAbsorbing();
    double rayleigh = base * (1 - Math.pow(p.rayleigh(), 0.95)) * 0.5;
    double aerosol = base * Math.pow(p.rayleigh(), 1.5) * (1 - p.aerosolScattering()) * forward;
    double between = skyReflectance(line) * sky.groundAlbedoFraction();
    double ground = (direct * cosZenith + rayleigh + aerosol) * between / (1 - between);
    double correction = line.um() <= 0.45 ? Math.pow(line.um() + 0.55, 1.8) : 1;
    return (rayleigh + aerosol + ground) * correction;
  }

  private double skyReflectance(Line line) {
    double pressureMass = GROUND_AIR_MASS * sky.pressureHpa() / STANDARD_PRESSURE_HPA;
    Passage p = passage(line, GROUND_AIR_MASS, GROUND_AIR_MASS, pressureMass);
    double forward = 1 - 0.5 * Math.exp((AFS + BFS / GROUND_AIR_MASS) / GROUND_AIR_MASS);
    return p.absorbing()
        * p.aerosolAbsorbing()
        * (0.5 * (1 - p.rayleigh()) + (1 - forward) * p.rayleigh() * (1 - p.aerosolScattering()));
  }
}
