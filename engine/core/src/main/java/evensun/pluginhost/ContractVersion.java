package evensun.pluginhost;

import evensun.spi.OpticalSolver;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import org.pf4j.DefaultVersionManager;
import org.pf4j.VersionManager;

/** Version of the solver contract that this host speaks, and what plugins say about it. */
public final class ContractVersion {

  private static final String CURRENT = load();

  /** Met only by a range without an upper end. */
  private static final String FAR_FUTURE = Integer.MAX_VALUE + ".0.0";

  private static final VersionManager VERSIONS = new DefaultVersionManager();

  private ContractVersion() {}

  /** The version, as in {@code 1.0.0}. */
  public static String current() {
    return CURRENT;
  }

  /** The range that a plugin built against this contract should require. */
  static String suggestedRange() {
    int major = Integer.parseInt(CURRENT.substring(0, CURRENT.indexOf('.')));
    return ">=" + CURRENT + " & <" + (major + 1) + ".0.0";
  }

  /**
   * Checks the range that a plugin requires.
   *
   * @throws Rejection when it is missing, unreadable, has no upper end or is not met
   */
  static void check(String requires) throws Rejection {
    String remedy =
        "write plugin.requires=" + suggestedRange() + " after testing with contract " + CURRENT;
    if (requires.isEmpty()) {
      throw new Rejection(
          "version-range-missing",
          "plugin.properties has no plugin.requires, the range of contract versions it was made for",
          remedy);
    }
    if (requires.matches("v?[\\d.]+") || isMet(FAR_FUTURE, requires)) {
      throw new Rejection(
          "version-range-open",
          "plugin.requires=" + requires + " has no upper end, so nothing protects it from changes",
          remedy);
    }
    if (!isMet(CURRENT, requires)) {
      throw new Rejection(
          "version-range-not-met",
          "it was made for contract " + requires + ", this is contract " + CURRENT,
          "get a version of the plugin for contract " + CURRENT + ", or rebuild it against that");
    }
  }

  private static boolean isMet(String version, String requires) throws Rejection {
    try {
      return VERSIONS.checkVersionConstraint(version, requires);
    } catch (RuntimeException e) {
      throw new Rejection(
          "version-range-unreadable",
          "plugin.requires=" + requires + " is no version range",
          "write plugin.requires=" + suggestedRange());
    }
  }

  private static String load() {
    try (InputStream in = OpticalSolver.class.getResourceAsStream("build.properties")) {
      Properties properties = new Properties();
      properties.load(in);
      return properties.getProperty("contract.version");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
