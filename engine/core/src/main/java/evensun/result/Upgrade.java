package evensun.result;

import tools.jackson.databind.node.ObjectNode;

/**
 * Brings a result of an earlier format to the current one, step by step: a change of the format
 * adds a step here that turns version v into v + 1. Version 1 is the first, so there is no step
 * yet.
 */
final class Upgrade {

  private Upgrade() {}

  /** The tree in the current format. */
  static ObjectNode toCurrent(ObjectNode tree, String name) {
    var version = tree.get("formatVersion");
    if (!version.isIntegralNumber() || version.asInt(0) < 1) {
      throw new ResultFormatException(
          name + ": formatVersion must be a whole number from 1 but was " + version);
    }
    if (version.asInt() > RunResult.FORMAT) {
      throw new ResultFormatException(
          name
              + ": has format version "
              + version.asInt()
              + ", but this Evensun reads up to "
              + RunResult.FORMAT
              + "; use a newer Evensun");
    }
    return tree;
  }
}
