package evensun.pluginhost;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Stream;

/** SHA-256 of what a plugin consists of. */
final class Fingerprint {

  private static final int BLOCK = 1 << 16;

  private Fingerprint() {}

  /**
   * Of a file: hash of its content, as {@code sha256sum} prints it. Of a folder: hash of the lines
   * {@code <hash> <relative path>} of all its files, sorted by path.
   */
  static String of(Path path) throws IOException {
    if (!Files.isDirectory(path)) {
      return ofFile(path);
    }
    StringBuilder lines = new StringBuilder();
    for (Path file : files(path)) {
      String name = path.relativize(file).toString().replace('\\', '/');
      lines.append(ofFile(file)).append("  ").append(name).append('\n');
    }
    MessageDigest digest = sha256();
    return HexFormat.of()
        .formatHex(digest.digest(lines.toString().getBytes(StandardCharsets.UTF_8)));
  }

  private static List<Path> files(Path folder) throws IOException {
    try (Stream<Path> walk = Files.walk(folder)) {
      return walk.filter(Files::isRegularFile).sorted().toList();
    }
  }

  private static String ofFile(Path file) throws IOException {
    MessageDigest digest = sha256();
    byte[] block = new byte[BLOCK];
    try (InputStream in = Files.newInputStream(file)) {
      for (int n = in.read(block); n >= 0; n = in.read(block)) {
        digest.update(block, 0, n);
      }
    }
    return HexFormat.of().formatHex(digest.digest());
  }

  private static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
