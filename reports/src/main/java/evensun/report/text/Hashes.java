package evensun.report.text;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.HexFormat;

/** SHA-256 as pages need it. */
public final class Hashes {

  private static final int SHORT_BYTES = 4;

  private Hashes() {}

  /** The first eight digits of a file's hash. */
  public static String shortSha256(byte[] file) {
    return HexFormat.of().formatHex(digest().digest(file), 0, SHORT_BYTES);
  }

  /** A source of the content security policy: {@code 'sha256-…'}. */
  public static String policySource(String text) {
    byte[] hash = digest().digest(text.getBytes(StandardCharsets.UTF_8));
    return "'sha256-" + Base64.getEncoder().encodeToString(hash) + "'";
  }

  private static MessageDigest digest() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
