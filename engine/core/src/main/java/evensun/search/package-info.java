/** Finding the best values of a few numbers; knows nothing of optics, plugins or scenarios. */
@NullMarked
package evensun.search;

import org.jspecify.annotations.NullMarked;
