/**
 * The plain twin of the fast kernel: complex numbers as objects, one wavelength after the other,
 * and reflection ratios where the fast kernel carries pairs of waves.
 */
package evensun.transfermatrix.kernel.reference;
