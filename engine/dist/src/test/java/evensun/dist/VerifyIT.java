package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

class VerifyIT {

  @TempDir Path folder;

  @Test
  void everyPublishedValueAgreesAndNamesItsSource() {
    Run run = new Program(folder).run("verify", "--format", "json");
    assertThat(run.status()).isZero();
    JsonNode values = JsonMapper.builder().build().readTree(run.out());
    assertThat(values.size()).isGreaterThanOrEqualTo(20);
    for (JsonNode value : values) {
      assertThat(value.get("agrees").asBoolean()).as(value.toString()).isTrue();
      assertThat(value.get("source").asString()).isNotBlank();
    }
  }
}
