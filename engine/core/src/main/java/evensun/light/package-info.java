/** Spectra, wavelength grids and photon currents. */
@NullMarked
package evensun.light;

import org.jspecify.annotations.NullMarked;
