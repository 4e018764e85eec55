package evensun.pluginhost;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.FutureTask;
import java.util.stream.Stream;

/** SHA-256 of what a plugin consists of. */
final class Fingerprint {

  private Fingerprint() {}

  /**
   * The hash of a plugin as it is now, worked out when the task runs. Of a file: hash of its
   * content, as {@code sha256sum} prints it. Of a folder: hash of the lines {@code <hash> <relative
   * path>} of all its files, sorted by path.
   *
   * @throws IOException when it cannot be read
   */
  static FutureTask<String> of(Path path) throws IOException {
    if (!Files.isDirectory(path)) {
      byte[] content = Files.readAllBytes(path);
      return new FutureTask<>(() -> hash(content));
    }
    Map<String, byte[]> contents = new LinkedHashMap<>();
    for (Path file : files(path)) {
      contents.put(path.relativize(file).toString().replace('\\', '/'), Files.readAllBytes(file));
    }
    return new FutureTask<>(() -> hash(contents));
  }

  private static List<Path> files(Path folder) throws IOException {
    try (Stream<Path> walk = Files.walk(folder)) {
      return walk.filter(Files::isRegularFile).sorted().toList();
    }
  }

  private static String hash(Map<String, byte[]> contents) {
    StringBuilder lines = new StringBuilder();
    contents.forEach((name, c) -> lines.append(hash(c)).append("  ").append(name).append('\n'));
    return hash(lines.toString().getBytes(StandardCharsets.UTF_8));
  }

  private static String hash(byte[] content) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
