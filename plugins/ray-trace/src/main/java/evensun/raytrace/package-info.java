/**
 * The solver {@code ray-trace}: textured, scattering and thick devices by rays, the thin films on
 * every facet by the {@code transfer-matrix} solver.
 */
package evensun.raytrace;
