package evensun.report.compare;

import evensun.result.RunResult;

/**
 * A result under the name it is compared by.
 *
 * @param name as the user gave it
 * @param result its result
 */
public record NamedRun(String name, RunResult result) {}
