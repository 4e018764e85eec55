package evensun.report.page;

import evensun.report.text.Hashes;
import gg.jte.Content;
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
public record Assets(String css, Content echarts, String script, String policy) {

  /** Changes together with the version of the dependency; a test opens the resource. */
  private static final String ECHARTS =
      "/META-INF/resources/webjars/echarts/5.3.1/dist/echarts.min.js";

  /** Hash of that very file; hashing a megabyte anew would be a fifth of the time a page takes. */
  private static final String ECHARTS_POLICY =
      "'sha256-up/VQ00XWfwfCN9hDtxDmZk9PgDVs83dQvTPRnWK0p4='";

  private static final Assets LOADED = load();

  /** The assets, read once. */
  public static Assets get() {
    return LOADED;
  }

  private static Assets load() {
    String css = text("/evensun/report/report.css");
    String script = text("/evensun/report/report.js");
    // As bytes: the page is bytes too, and a megabyte need not become text in between.
    byte[] echarts = bytes(ECHARTS);
    return new Assets(
        css, output -> output.writeBinaryContent(echarts), script, policy(css, script));
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
    return new String(bytes(resource), StandardCharsets.UTF_8);
  }

  private static byte[] bytes(String resource) {
    try (InputStream in = Assets.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("missing from the distribution: " + resource);
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
