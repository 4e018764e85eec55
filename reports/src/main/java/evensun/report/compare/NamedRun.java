package evensun.report.compare;

import evensun.report.text.Hashes;
import evensun.result.RunResult;

/**
 * A result under the name it is compared by.
 *
 * @param name as the user gave it
 * @param result its result
 * @param shortHash first digits of the hash of its file, as its own report names them
 */
public record NamedRun(String name, RunResult result, String shortHash) {

  /**
   * A stored result.
   *
   * @param file its file
   */
  public static NamedRun of(String name, RunResult result, byte[] file) {
    return new NamedRun(name, result, Hashes.shortSha256(file));
  }
}
