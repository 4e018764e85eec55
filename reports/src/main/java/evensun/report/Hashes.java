package evensun.report;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.HexFormat;

/** SHA-256 as pages need it. */
final class Hashes {

  private static final int SHORT_BYTES = 4;

  private Hashes() {}

  /** The first eight digits of a text's hash. */
  static String shortSha256(String text) {
    return HexFormat.of().formatHex(sha256(text), 0, SHORT_BYTES);
  }

  /** A source of the content security policy: {@code 'sha256-…'}. */
  static String policySource(String text) {
    return "'sha256-" + Base64.getEncoder().encodeToString(sha256(text)) + "'";
  }

  private static byte[] sha256(String text) {
    try {
      return MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
