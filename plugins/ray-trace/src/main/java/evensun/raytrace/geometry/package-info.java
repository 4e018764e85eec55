/**
 * Shapes of boundaries, and where straight light meets them. Lengths in µm, z towards the light.
 */
package evensun.raytrace.geometry;
