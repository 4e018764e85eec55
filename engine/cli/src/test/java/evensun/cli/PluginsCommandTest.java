package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The list of plugins as people and scripts see it. Loading itself is tested in the host. */
class PluginsCommandTest {

  @TempDir Path folder;
  private final ByteArrayOutputStream out = new ByteArrayOutputStream();
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();

  @Test
  void aCorruptJarIsListedWithReasonAndRemedy() throws IOException {
    Files.writeString(folder.resolve("broken.jar"), "no zip");
    assertThat(run("plugins", "--plugins", folder.toString())).isEqualTo(3);
    assertThat(out.toString(StandardCharsets.UTF_8))
        .contains("broken.jar", "it is no jar", "copy or build it again");
    assertThat(err.size()).isZero();
  }

  @Test
  void asJsonItIsOneDocument() throws IOException {
    Files.writeString(folder.resolve("broken.jar"), "no zip");
    run("plugins", "--format", "json", "--plugins", folder.toString());
    JsonNode json = JsonMapper.builder().build().readTree(out.toByteArray());
    assertThat(json.get("loaded")).isEmpty();
    assertThat(json.get("rejected").get(0).get("code").asString()).isEqualTo("not-a-jar");
  }

  @Test
  void aFolderThatIsNotThereIsWrongInput() {
    assertThat(run("plugins", "--plugins", folder.resolve("absent").toString())).isEqualTo(2);
    assertThat(err.toString(StandardCharsets.UTF_8)).startsWith("--plugins: there is no ");
  }

  private int run(String... args) {
    Console console =
        new Console(
            new ByteArrayInputStream(new byte[0]),
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            false,
            false);
    return Main.run(console, args);
  }
}
