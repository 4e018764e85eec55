package evensun.pluginhost;

import org.pf4j.PluginClassLoader;
import org.pf4j.PluginDescriptor;
import org.pf4j.PluginManager;

/**
 * The plugin's own classes first; the contract always from the host, so that a plugin that bundles
 * the contract still speaks the host's.
 */
final class SolverClassLoader extends PluginClassLoader {

  SolverClassLoader(PluginManager manager, PluginDescriptor descriptor, PluginFile file) {
    super(manager, descriptor, new ContractWindow());
    file.classPath().forEach(path -> addFile(path.toFile()));
  }

  @Override
  protected boolean shouldDelegateToParent(String className) {
    return ContractWindow.shows(className);
  }
}
