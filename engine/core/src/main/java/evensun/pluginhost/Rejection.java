package evensun.pluginhost;

/** Why one plugin does not load. */
final class Rejection extends Exception {

  private static final long serialVersionUID = 1;

  private final String code;
  private final String remedy;

  Rejection(String code, String reason, String remedy) {
    super(OneLine.of(reason), null, false, false);
    this.code = code;
    this.remedy = remedy;
  }

  String code() {
    return code;
  }

  String remedy() {
    return remedy;
  }
}
