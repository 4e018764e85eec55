package evensun.light;

import evensun.data.DataFile;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** The reference spectra that come with the program. */
public final class Spectra {

  private static final Map<String, String> FILES =
      Map.of("AM1.5G", "am1.5g.csv", "AM1.5D", "am1.5d.csv", "AM0", "am0.csv");

  private static final Map<String, Spectrum> LOADED = new ConcurrentHashMap<>();

  private Spectra() {}

  /** Names in the order people expect them. */
  public static List<String> names() {
    return List.of("AM1.5G", "AM1.5D", "AM0");
  }

  /** The spectrum of a name, exactly as written in {@link #names()}. */
  public static Optional<Spectrum> find(String name) {
    return FILES.containsKey(name)
        ? Optional.of(LOADED.computeIfAbsent(name, Spectra::load))
        : Optional.empty();
  }

  /**
   * The spectrum of a name.
   *
   * @throws IllegalArgumentException when there is none, naming those that there are
   */
  public static Spectrum named(String name) {
    return find(name)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "spectrum must be one of " + String.join(", ", names()) + " but was " + name));
  }

  private static Spectrum load(String name) {
    DataFile file = DataFile.resource(Spectra.class, FILES.get(name));
    return Spectrum.of(name, file.required("source"), file.column(0), file.column(1));
  }
}
