/**
 * Mixing rules on rows of complex permittivity, by wavelength: primitive arrays, caller-owned
 * workspaces, no allocation, nothing of the contract.
 *
 * <p>A row of permittivity is two arrays, real and imaginary part, with the time factor exp(−iωt):
 * an imaginary part of at least 0 absorbs.
 */
package evensun.effectivemedium.kernel;
