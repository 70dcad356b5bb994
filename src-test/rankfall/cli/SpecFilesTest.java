package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class SpecFilesTest {
  @TempDir private Path folder;

  @Test
  void aFolderGivesItsSpecsSortedAndNothingElse() throws IOException {
    Files.createDirectories(folder.resolve("m"));
    for (String name : List.of("z.yaml", "a.yml", "m/b.yaml", "notes.txt", "yaml")) {
      Files.writeString(folder.resolve(name), "");
    }
    assertEquals(
        List.of(
            folder.resolve("a.yml"),
            folder.resolve("m").resolve("b.yaml"),
            folder.resolve("z.yaml")),
        SpecFiles.below(List.of(folder)));
  }

  @Test
  void aFileMayHaveAnyNameAndCountsOnce() throws IOException {
    Path first = Files.writeString(folder.resolve("z.txt"), "");
    Path second = Files.writeString(folder.resolve("a.yaml"), "");
    assertEquals(List.of(first, second), SpecFiles.below(List.of(first, folder, second)));
  }

  @Test
  void whatIsNotThereIsRefused() {
    assertThrows(
        NoSuchFileException.class, () -> SpecFiles.below(List.of(folder.resolve("none.yaml"))));
  }

  @Test
  void aFolderWithoutSpecsIsRefused() {
    assertThrows(NoSuchFileException.class, () -> SpecFiles.below(List.of(folder)));
  }
}
