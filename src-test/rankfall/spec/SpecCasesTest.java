package rankfall.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every spec in {@code cases} beside the whole text that a person sees for it. A document that is
 * read says so in one line. A new case needs its {@code .problems} file, written by hand.
 */
class SpecCasesTest {
  private static final Path CASES = Path.of("src-test/rankfall/spec/cases");
  private static final Path SEEN = Path.of("target/spec-cases");

  static Set<String> names() throws IOException {
    return namesEndingIn(".yaml");
  }

  private static Set<String> namesEndingIn(String end) throws IOException {
    try (Stream<Path> files = Files.list(CASES)) {
      return files
          .map(path -> path.getFileName().toString())
          .filter(name -> name.endsWith(end))
          .map(name -> name.substring(0, name.length() - end.length()))
          .collect(Collectors.toCollection(TreeSet::new));
    }
  }

  @Test
  void everyCaseHasItsPartner() throws IOException {
    assertTrue(names().size() >= 40);
    assertEquals(names(), namesEndingIn(".problems"));
  }

  @ParameterizedTest
  @MethodSource("names")
  void saysWhatIsWrong(String name) throws IOException {
    String file = name + ".yaml";
    StringBuilder seen = new StringBuilder();
    for (SpecResult result : SpecReader.read(file, Files.readAllBytes(CASES.resolve(file)))) {
      if (result instanceof SpecResult.Read read) {
        seen.append(read.spec().family()).append(" is read\n");
      } else {
        ((SpecResult.Faulty) result)
            .diagnostics()
            .forEach(diagnostic -> seen.append(DiagnosticText.of(diagnostic)));
      }
    }
    String wanted = Files.readString(CASES.resolve(name + ".problems"), StandardCharsets.UTF_8);
    if (!wanted.contentEquals(seen)) {
      Files.createDirectories(SEEN);
      Files.writeString(SEEN.resolve(name + ".problems"), seen, StandardCharsets.UTF_8);
    }
    assertEquals(wanted, seen.toString());
  }
}
