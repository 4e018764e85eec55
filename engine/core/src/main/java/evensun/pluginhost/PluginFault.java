package evensun.pluginhost;

import java.util.Optional;

/** Tells whether something thrown is a defect of a plugin or one of ours. */
public final class PluginFault {

  /** Name of the class loader of the program itself; those of plugins have none. */
  private static final String OURS = "app";

  private PluginFault() {}

  /**
   * The class of a plugin in which something thrown came about.
   *
   * @param thrown what was thrown
   * @return the first class outside the JDK on the trace of the innermost cause, when it belongs to
   *     a plugin or to a library in one; else empty
   */
  public static Optional<String> place(Throwable thrown) {
    Throwable innermost = thrown;
    while (innermost.getCause() != null && innermost.getCause() != innermost) {
      Optional<String> outer = own(innermost);
      if (outer.isPresent()) {
        return outer;
      }
      innermost = innermost.getCause();
    }
    return own(innermost);
  }

  private static Optional<String> own(Throwable thrown) {
    for (StackTraceElement frame : thrown.getStackTrace()) {
      if (frame.getModuleName() == null) {
        return OURS.equals(frame.getClassLoaderName())
            ? Optional.empty()
            : Optional.of(frame.getClassName());
      }
    }
    return Optional.empty();
  }
}
