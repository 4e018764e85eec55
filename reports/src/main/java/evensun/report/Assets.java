package evensun.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/**
 * What every page carries inside itself, and the policy that allows this and nothing else.
 *
 * @param css the style sheet
 * @param echarts the chart library
 * @param script the page's own script
 * @param policy content security policy with the hash of each
 */
public record Assets(String css, String echarts, String script, String policy) {

  /** Changes together with the version of the dependency; a test opens the resource. */
  private static final String ECHARTS =
      "/META-INF/resources/webjars/echarts/5.3.1/dist/echarts.min.js";

  /** Hash of that very file; hashing a megabyte anew would be a fifth of the time a page takes. */
  private static final String ECHARTS_POLICY =
      "'sha256-up/VQ00XWfwfCN9hDtxDmZk9PgDVs83dQvTPRnWK0p4='";

  private static final Assets LOADED = load();

  /** The assets, read once. */
  static Assets get() {
    return LOADED;
  }

  private static Assets load() {
    String css = text("/evensun/report/report.css");
    String echarts = text(ECHARTS);
    String script = text("/evensun/report/report.js");
    return new Assets(css, echarts, script, policy(css, script));
  }

  private static String policy(String css, String script) {
    return "default-src 'none'; script-src "
        + ECHARTS_POLICY
        + " "
        + Hashes.policySource(script)
        + "; style-src-elem "
        + Hashes.policySource(css)
        + "; style-src-attr 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'";
  }

  private static String text(String resource) {
    try (InputStream in = Assets.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("missing from the distribution: " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
