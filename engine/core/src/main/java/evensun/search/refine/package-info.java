/** Local refinement: from a good design to the top of its hill, with derivatives or without. */
@NullMarked
package evensun.search.refine;

import org.jspecify.annotations.NullMarked;
