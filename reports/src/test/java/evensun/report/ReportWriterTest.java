package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

class ReportWriterTest {

  @Test
  void writesOnePage() throws IOException {
    String html = ReportWriter.write(SampleRuns.full());
    assertThat(html).startsWith("<!DOCTYPE html>");
    Files.createDirectories(Path.of("target/pages"));
    Files.writeString(Path.of("target/pages/full.html"), html);
    Files.writeString(
        Path.of("target/pages/assess.html"), ReportWriter.write(SampleRuns.assessment()));
  }
}
