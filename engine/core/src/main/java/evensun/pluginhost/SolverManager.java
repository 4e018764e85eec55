package evensun.pluginhost;

import java.nio.file.Path;
import java.util.List;
import org.pf4j.AbstractPluginManager;
import org.pf4j.BasePluginRepository;
import org.pf4j.DefaultExtensionFactory;
import org.pf4j.DefaultPluginFactory;
import org.pf4j.DefaultVersionManager;
import org.pf4j.ExtensionFactory;
import org.pf4j.ExtensionFinder;
import org.pf4j.PluginDescriptor;
import org.pf4j.PluginDescriptorFinder;
import org.pf4j.PluginFactory;
import org.pf4j.PluginLoader;
import org.pf4j.PluginRepository;
import org.pf4j.PluginStatusProvider;
import org.pf4j.PropertiesPluginDescriptorFinder;
import org.pf4j.VersionManager;

/** PF4J, set up for solvers: no roots of its own, no status files, nothing of the host visible. */
final class SolverManager extends AbstractPluginManager {

  SolverManager() {
    super(Path.of(""));
    setSystemVersion(ContractVersion.current());
  }

  /** The finder forgets what it read whenever a plugin comes or goes. */
  @Override
  protected void initialize() {
    super.initialize();
    addPluginStateListener((SolverFinder) extensionFinder);
  }

  @Override
  protected PluginRepository createPluginRepository() {
    return new BasePluginRepository(List.of());
  }

  @Override
  protected PluginFactory createPluginFactory() {
    return new DefaultPluginFactory();
  }

  @Override
  protected ExtensionFactory createExtensionFactory() {
    return new DefaultExtensionFactory();
  }

  @Override
  protected PluginDescriptorFinder createPluginDescriptorFinder() {
    PropertiesPluginDescriptorFinder finder = new PropertiesPluginDescriptorFinder();
    return new PluginDescriptorFinder() {
      @Override
      public boolean isApplicable(Path path) {
        return true;
      }

      @Override
      public PluginDescriptor find(Path path) {
        return finder.find(read(path).main());
      }
    };
  }

  @Override
  protected ExtensionFinder createExtensionFinder() {
    return new SolverFinder(this);
  }

  @Override
  protected PluginStatusProvider createPluginStatusProvider() {
    return new PluginStatusProvider() {
      @Override
      public boolean isPluginDisabled(String id) {
        return false;
      }

      @Override
      public void disablePlugin(String id) {}

      @Override
      public void enablePlugin(String id) {}
    };
  }

  @Override
  protected PluginLoader createPluginLoader() {
    return new PluginLoader() {
      @Override
      public boolean isApplicable(Path path) {
        return true;
      }

      @Override
      public ClassLoader loadPlugin(Path path, PluginDescriptor descriptor) {
        return new SolverClassLoader(SolverManager.this, descriptor, read(path));
      }
    };
  }

  @Override
  protected VersionManager createVersionManager() {
    return new DefaultVersionManager();
  }

  private static PluginFile read(Path path) {
    try {
      return PluginFile.of(path);
    } catch (Rejection e) {
      throw new IllegalStateException(e);
    }
  }
}
