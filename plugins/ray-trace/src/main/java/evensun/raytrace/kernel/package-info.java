/** Fast loops over what light did: arrays of numbers, nothing allocated. */
package evensun.raytrace.kernel;
