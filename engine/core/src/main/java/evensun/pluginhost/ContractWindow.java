package evensun.pluginhost;

/**
 * What plugins see of the host: the contract and PF4J. Everything else of the host's class path is
 * hidden, since a plugin that uses the host's libraries breaks when those change.
 */
final class ContractWindow extends ClassLoader {

  private static final ClassLoader HOST = ContractWindow.class.getClassLoader();

  ContractWindow() {
    super("contract", ClassLoader.getPlatformClassLoader());
  }

  static boolean shows(String className) {
    return className.startsWith("evensun.spi.") || className.startsWith("org.pf4j.");
  }

  @Override
  protected Class<?> findClass(String name) throws ClassNotFoundException {
    if (shows(name)) {
      return HOST.loadClass(name);
    }
    throw new ClassNotFoundException(name);
  }
}
