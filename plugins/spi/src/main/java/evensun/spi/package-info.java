/**
 * The contract between Evensun and an optical solver.
 *
 * <p>A solver is a class that implements {@link evensun.spi.OpticalSolver}, is named in {@code
 * META-INF/services/evensun.spi.OpticalSolver} of its jar and has a public constructor without
 * arguments. It is prepared once per search, hands out one evaluator per thread, and each evaluator
 * then answers many designs without allocating anything.
 *
 * <p>Conventions: time factor exp(−iωt), so that a refractive index is n + ik with k ≥ 0 for a
 * medium that absorbs; wavelengths in vacuum, in nm; every array row starts at wavelength 0.
 * Letters in array shapes: w wavelength (of W), l finite layer (of L, the light meets layer 0
 * first), m material (of M), i incidence (of I), c channel (of C), s weighted sum (of S).
 *
 * <p>The contract grows by addition only: new abilities are new interfaces, interface methods are
 * added as {@code default}, a record that gains a component keeps its old constructor. It depends
 * on the JDK alone.
 */
package evensun.spi;
