/** Follows rays through a device and keeps what they do, for coatings still unknown. */
package evensun.raytrace.trace;
