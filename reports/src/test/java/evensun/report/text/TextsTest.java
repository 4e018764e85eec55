package evensun.report.text;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Keys in words, shortened texts, marked terms; expectations by hand. */
class TextsTest {

  @ParameterizedTest
  @CsvSource({
    "perovskite.thicknessNm, perovskite thickness",
    "a.b/air.volumeFraction, a.b/air volume fraction",
    "top.bandgapEv, top bandgap",
    "plain, plain"
  })
  void keysAreSpokenAsWords(String key, String words) {
    assertThat(Keys.words(key)).isEqualTo(words);
  }

  @Test
  void clippingNeverSplitsAnEmoji() {
    assertThat(Clip.to("\ud83c\udf1e\ud83c\udf1e\ud83c\udf1e", 2)).isEqualTo("\ud83c\udf1e…");
    assertThat(Clip.to(" a \n b ", 10)).isEqualTo("a b");
  }

  @Test
  void aTermIsMarkedOnceAndOnlyAsAWord() {
    var spans = Terms.mark("Mismatch and mismatch, but not mismatched: the matched current.");
    assertThat(spans.stream().filter(span -> span.term() != null).map(Terms.Span::text))
        .containsExactly("Mismatch", "matched current");
    assertThat(String.join("", spans.stream().map(Terms.Span::text).toList()))
        .isEqualTo("Mismatch and mismatch, but not mismatched: the matched current.");
  }

  @Test
  void noCharacterCanEndAStringOfAStyleSheet() {
    assertThat(CssText.quoted("a'\"};<")).isEqualTo("'\\61 \\27 \\22 \\7d \\3b \\3c '");
  }
}
