package evensun.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.InputException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunFolderTest {

  @TempDir Path temporary;

  @Test
  void aFolderThatIsNotEmptyIsRefusedWithoutForce() throws IOException {
    Files.writeString(temporary.resolve("mine.txt"), "mine");
    assertThatThrownBy(() -> RunFolder.create(temporary, false))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("is not empty")
        .hasMessageContaining("--force");
  }

  @Test
  void forceReplacesWhatEvensunWroteAndNothingElse() throws IOException {
    Path folder = temporary.resolve("run");
    RunFolder first = RunFolder.create(folder, false);
    first.write("tables/old.csv", "old");
    Files.writeString(folder.resolve("mine.txt"), "mine");

    RunFolder.create(folder, true);

    assertThat(folder.resolve("tables/old.csv")).doesNotExist();
    assertThat(folder.resolve("mine.txt")).hasContent("mine");
  }

  @Test
  void aListThatNamesFilesOutsideDeletesNothingThere() throws IOException {
    Path outside = Files.writeString(temporary.resolve("outside.txt"), "keep");
    Path folder = temporary.resolve("run");
    RunFolder.create(folder, false);
    Files.writeString(folder.resolve(RunFolder.LIST), "../outside.txt\n");

    RunFolder.create(folder, true);

    assertThat(outside).hasContent("keep");
  }

  @Test
  void aFileIsNeverHalfWritten() throws IOException {
    RunFolder run = RunFolder.create(temporary.resolve("run"), false);
    run.write("result.json", "{}");
    run.write("result.json", "{\"a\": 1}");
    assertThat(run.file("result.json")).hasContent("{\"a\": 1}");
    try (var files = Files.list(run.path())) {
      assertThat(files.map(p -> p.getFileName().toString()))
          .containsExactlyInAnyOrder("result.json", RunFolder.LIST);
    }
  }

  @Test
  void aFileInPlaceOfTheFolderIsRefused() throws IOException {
    Path file = Files.writeString(temporary.resolve("file"), "");
    assertThatThrownBy(() -> RunFolder.create(file, true))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("is a file, a folder is needed");
    assertThatThrownBy(() -> RunFolder.create(file.resolve("below"), false))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("cannot be written");
  }

  @Test
  void twoRunsOfOneSecondGoToDifferentFolders() throws IOException {
    Instant now = Instant.parse("2026-01-02T03:04:05Z");
    Path first = RunFolder.defaultFolder(temporary, "cell", now);
    assertThat(first).isEqualTo(temporary.resolve("evensun-runs/cell-20260102T030405Z"));
    Files.createDirectories(first);
    assertThat(RunFolder.defaultFolder(temporary, "cell", now))
        .isEqualTo(temporary.resolve("evensun-runs/cell-20260102T030405Z-2"));
  }

  @Test
  void aFolderThatIsNoRunCannotBeOpened() {
    assertThatThrownBy(() -> RunFolder.open(temporary))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("is not the folder of a run");
  }
}
