package evensun.pluginhost;

import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Properties;
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

  private final Map<Path, PluginFile> files = new HashMap<>();

  SolverManager() {
    super(Path.of(""));
    setSystemVersion(ContractVersion.current());
  }

  /** Loads a plugin and returns its id. */
  String load(PluginFile file) {
    files.put(file.path(), file);
    return loadPlugin(file.path());
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
    return new PropertiesPluginDescriptorFinder() {
      @Override
      public boolean isApplicable(Path path) {
        return true;
      }

      /** Read already; PF4J would mount the jar as a file system for it. */
      @Override
      protected Properties readProperties(Path path) {
        return file(path).properties();
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
        return new SolverClassLoader(SolverManager.this, descriptor, file(path));
      }
    };
  }

  @Override
  protected VersionManager createVersionManager() {
    return new DefaultVersionManager();
  }

  private PluginFile file(Path path) {
    return Objects.requireNonNull(files.get(path), "only files are loaded that were read");
  }
}
