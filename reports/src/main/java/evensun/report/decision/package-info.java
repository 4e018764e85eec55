/**
 * The decision in words: the sentence, the verdict by stated rules, what would change it, what is
 * uncertain.
 */
@NullMarked
package evensun.report.decision;

import org.jspecify.annotations.NullMarked;
