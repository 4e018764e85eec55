/** The ray-trace part of the plugins. */
package evensun.raytrace;
