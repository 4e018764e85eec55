package evensun.pluginhost;

import evensun.spi.Traits;
import java.nio.file.Path;

/**
 * A plugin that is ready for use.
 *
 * @param id name of the plugin, unique among the loaded ones
 * @param version its own version
 * @param requires range of contract versions it was made for
 * @param description one line in the author's words, empty where there is none
 * @param file the jar or folder it was loaded from
 * @param sha256 hash of that jar, or of all files of that folder
 * @param solverId name of its solver in scenarios, unique among the loaded ones
 * @param traits what the solver takes and offers
 */
public record LoadedPlugin(
    String id,
    String version,
    String requires,
    String description,
    Path file,
    String sha256,
    String solverId,
    Traits traits) {}
