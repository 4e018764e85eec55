/**
 * The located tree of an input file and the small tools that bind it: every value keeps its line,
 * every fault is collected instead of thrown. Nothing in here knows what a scenario is.
 */
@NullMarked
package evensun.scenario.tree;

import org.jspecify.annotations.NullMarked;
