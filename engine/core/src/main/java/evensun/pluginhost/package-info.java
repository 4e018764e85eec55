/** Finding, loading and naming solver plugins; the only package that touches PF4J. */
@NullMarked
package evensun.pluginhost;

import org.jspecify.annotations.NullMarked;
