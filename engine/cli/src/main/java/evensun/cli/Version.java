package evensun.cli;

import evensun.run.BuildInfo;
import picocli.CommandLine.IVersionProvider;

/** What {@code evensun --version} prints. */
final class Version implements IVersionProvider {

  @Override
  public String[] getVersion() {
    return new String[] {
      "evensun " + BuildInfo.version() + " (Java " + Runtime.version().feature() + ")"
    };
  }
}
