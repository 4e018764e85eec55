package evensun.pluginhost;

/** A plugin that is needed is wrong or missing; ends with exit status 3. */
public final class PluginException extends RuntimeException {

  private static final long serialVersionUID = 1;

  /**
   * A plugin that cannot be used.
   *
   * @param message which plugin, why, and the remedy, in one line
   */
  public PluginException(String message) {
    super(message);
  }
}
