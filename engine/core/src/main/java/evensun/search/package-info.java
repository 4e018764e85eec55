/**
 * Finding the best values of a few numbers; knows nothing of optics, plugins or scenarios. Here
 * stand the searches themselves, their settings and their saved state.
 */
@NullMarked
package evensun.search;

import org.jspecify.annotations.NullMarked;
