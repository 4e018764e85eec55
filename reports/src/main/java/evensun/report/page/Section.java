package evensun.report.page;

import java.util.List;

/**
 * A section of the page.
 *
 * @param id unique on the page
 * @param nav its name in the table of contents
 * @param heading what was found, in a sentence
 * @param blocks what it holds
 */
public record Section(String id, String nav, String heading, List<Block> blocks) {

  /** Copies the blocks. */
  public Section {
    blocks = List.copyOf(blocks);
  }
}
