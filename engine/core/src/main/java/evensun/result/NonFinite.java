package evensun.result;

import tools.jackson.databind.JsonNode;

/** JSON has no NaN: a number that is not finite is a defect of whoever filled in the result. */
final class NonFinite {

  private NonFinite() {}

  /** Throws, naming the first number below {@code path} that is not finite. */
  static void refuse(JsonNode node, String path) {
    if (node.isFloatingPointNumber() && !Double.isFinite(node.doubleValue())) {
      throw new IllegalArgumentException(
          "the result holds " + node.doubleValue() + " at " + path + ", where a number must stand");
    }
    if (node.isObject()) {
      node.properties().forEach(field -> refuse(field.getValue(), path + "/" + field.getKey()));
    }
    for (int i = 0; node.isArray() && i < node.size(); i++) {
      refuse(node.get(i), path + "/" + i);
    }
  }
}
