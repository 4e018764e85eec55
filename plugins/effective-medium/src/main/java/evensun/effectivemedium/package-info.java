/** The effective-medium part of the plugins. */
package evensun.effectivemedium;
