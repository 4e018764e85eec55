/** Running a job from a scenario to a folder of results: orchestration, files, provenance. */
@NullMarked
package evensun.run;

import org.jspecify.annotations.NullMarked;
