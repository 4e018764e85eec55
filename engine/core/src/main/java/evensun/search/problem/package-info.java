/**
 * What is searched, a box of numbers with aims and limits, and how designs are judged and compared.
 * {@link evensun.search.problem.Objective} and what it mentions are for callers of a search, the
 * rest for its parts.
 */
@NullMarked
package evensun.search.problem;

import org.jspecify.annotations.NullMarked;
