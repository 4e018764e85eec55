/**
 * From the located tree to the records of a scenario: one binder for each section of the file, and
 * the checks that need neither materials nor spectra nor solvers.
 */
@NullMarked
package evensun.scenario.reader;

import org.jspecify.annotations.NullMarked;
