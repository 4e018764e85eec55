package evensun.material;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;

/**
 * The materials that come with the program; each is read when it is first asked for. Safe for
 * threads.
 */
public final class MaterialLibrary {

  private static final MaterialLibrary BUILT_IN = new MaterialLibrary(LibraryIndex.load());

  private final TreeMap<String, String> fileOf;
  private final Map<String, Material> loaded = new ConcurrentHashMap<>();

  private MaterialLibrary(Map<String, String> fileOf) {
    this.fileOf = new TreeMap<>(fileOf);
  }

  /** The built-in library. */
  public static MaterialLibrary builtIn() {
    return BUILT_IN;
  }

  /** All names, sorted; the short name of a material with several preparations is its default. */
  public List<String> names() {
    return List.copyOf(fileOf.keySet());
  }

  /** The material of a name, or empty. */
  public Optional<Material> find(String name) {
    String file = fileOf.get(name);
    return file == null
        ? Optional.empty()
        : Optional.of(loaded.computeIfAbsent(file, LibraryFile::material));
  }

  /** The record of a name without reading its numbers, or empty. */
  public Optional<MaterialRecord> record(String name) {
    return Optional.ofNullable(fileOf.get(name)).map(LibraryFile::record);
  }

  /**
   * Other sources or preparations of the same material: names that agree up to the first dot and
   * hold other data, those left out that are another doping or composition.
   */
  public List<String> alternatives(String name) {
    String family = family(name);
    String own = fileOf.get(name);
    if (own == null || LibraryFile.isDistinct(own)) {
      return List.of();
    }
    return fileOf.entrySet().stream()
        .filter(entry -> family(entry.getKey()).equals(family) && entry.getKey().contains("."))
        .filter(entry -> !entry.getValue().equals(own))
        .filter(entry -> !LibraryFile.isDistinct(entry.getValue()))
        .map(Map.Entry::getKey)
        .toList();
  }

  private static String family(String name) {
    int dot = name.indexOf('.');
    return dot < 0 ? name : name.substring(0, dot);
  }

  /** The known name nearest to one that is not known, for a suggestion. */
  public String nearest(String name) {
    return fileOf.keySet().stream()
        .min(Comparator.comparingInt(known -> Similarity.distance(name, known)))
        .orElseThrow();
  }
}
