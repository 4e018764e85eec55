package evensun.light;

/** Physical constants, exact by the SI of 2019 (CODATA 2018/2019 values). */
public final class Constants {

  /** Elementary charge q in C. */
  public static final double ELEMENTARY_CHARGE_C = 1.602176634e-19;

  /** Planck constant h in J s. */
  public static final double PLANCK_JS = 6.62607015e-34;

  /** Speed of light in vacuum c in m s⁻¹. */
  public static final double LIGHT_SPEED_M_PER_S = 299792458.0;

  /** Boltzmann constant k in J K⁻¹. */
  public static final double BOLTZMANN_J_PER_K = 1.380649e-23;

  /** hc/q in eV nm: photon energy in eV is this over the vacuum wavelength in nm. */
  public static final double HC_EV_NM = PLANCK_JS * LIGHT_SPEED_M_PER_S / ELEMENTARY_CHARGE_C * 1e9;

  /** Cell temperature where none is set, in K. */
  public static final double CELL_TEMPERATURE_K = 298.15;

  private Constants() {}
}
