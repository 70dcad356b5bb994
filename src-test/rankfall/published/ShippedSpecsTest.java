package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;

/** The families that ship are read without a fault and say where they come from. */
class ShippedSpecsTest {

  static Stream<Path> files() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("specs"))) {
      return files.sorted().toList().stream();
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("files")
  void everyFamilyIsReadAndNamesItsSource(Path file) throws IOException, SpecException {
    for (SpecResult result : SpecReader.read(file.toString(), Files.readAllBytes(file))) {
      Spec spec = result.orThrow();
      assertTrue(spec.title().isPresent(), spec.family());
      assertTrue(spec.notes().orElse("").contains("Source of the"), spec.family());
      if (!spec.scan().isEmpty()) {
        assertEquals(Set.copyOf(spec.parameters()), spec.scan().keySet(), spec.family());
      }
    }
  }

  @Test
  void seventeenFilesHoldEighteenFamiliesOfDifferentNames() throws IOException, SpecException {
    List<Path> files = files().toList();
    assertEquals(17, files.size());
    Set<String> names = new TreeSet<>();
    for (Path file : files) {
      for (SpecResult result : SpecReader.read(file.toString(), Files.readAllBytes(file))) {
        names.add(result.orThrow().family());
      }
    }
    assertEquals(18, names.size());
  }
}
