package evensun.transfermatrix.kernel;

/**
 * A plane wave in the medium it comes from.
 *
 * @param sine sine of the angle to the normal, in [0, 1)
 * @param s share of the intensity that is s-polarised, in [0, 1]
 * @param p share of the intensity that is p-polarised, in [0, 1]
 */
public record Beam(double sine, double s, double p) {}
