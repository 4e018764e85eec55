package evensun.finding;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;

/** The explanations that come with the program. */
public final class Explanations {

  private static final String FOLDER = "evensun/finding/";
  private static final String ENDING = ".txt";
  private static final Pattern CODE = Pattern.compile("[a-z][a-z0-9-]*");

  private Explanations() {}

  /** The explanation of a code, if there is one. */
  public static Optional<Explanation> of(String code) {
    if (!CODE.matcher(code).matches()) {
      return Optional.empty();
    }
    try (InputStream in = Explanations.class.getResourceAsStream("/" + FOLDER + code + ENDING)) {
      return in == null
          ? Optional.empty()
          : Optional.of(
              Explanation.parse(code, new String(in.readAllBytes(), StandardCharsets.UTF_8)));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** All codes that have an explanation, sorted. */
  public static List<String> codes() {
    try {
      Path home =
          Path.of(Explanations.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      return Files.isDirectory(home) ? inFolder(home.resolve(FOLDER)) : inJar(home);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  private static List<String> inJar(Path jar) throws IOException {
    try (ZipFile zip = new ZipFile(jar.toFile())) {
      return codes(
          zip.stream()
              .map(ZipEntry::getName)
              .filter(name -> name.startsWith(FOLDER))
              .map(name -> name.substring(FOLDER.length())));
    }
  }

  private static List<String> inFolder(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return codes(files.map(file -> String.valueOf(file.getFileName())));
    }
  }

  private static List<String> codes(Stream<String> files) {
    return files
        .filter(name -> name.endsWith(ENDING) && name.indexOf('/') < 0)
        .map(name -> name.substring(0, name.length() - ENDING.length()))
        .sorted()
        .toList();
  }
}
