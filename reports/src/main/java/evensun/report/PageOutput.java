package evensun.report;

import gg.jte.TemplateOutput;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** Collects a page as UTF-8: texts of one alphabet are copied, not encoded letter by letter. */
final class PageOutput implements TemplateOutput {

  private byte[] page = new byte[1 << 14];
  private int length;

  @Override
  public void writeContent(String text) {
    writeBinaryContent(text.getBytes(StandardCharsets.UTF_8));
  }

  @Override
  public void writeContent(String text, int from, int to) {
    writeContent(text.substring(from, to));
  }

  @Override
  public void writeBinaryContent(byte[] text) {
    if (length + text.length > page.length) {
      page = Arrays.copyOf(page, Math.max(2 * page.length, length + text.length));
    }
    System.arraycopy(text, 0, page, length, text.length);
    length += text.length;
  }

  /** The page so far. */
  byte[] bytes() {
    return Arrays.copyOf(page, length);
  }
}
