package rankfall.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever happens to a spec, reading it ends in a spec or in faults at places of the file. */
class DamagedSpecTest {
  private static final String PIECES = "[]{}(),:#&*!|>'\"%@`-+/^=<\n\t \\0123abXEiλ.~?";
  private static final int ROUNDS = 1500;

  @ParameterizedTest
  @ValueSource(longs = {1, 20240611})
  void damageIsAFaultAtAPlaceOfTheFile(long seed) {
    Random chance = new Random(seed);
    int faulty = 0;
    for (int round = 0; round < ROUNDS; round++) {
      StringBuilder text =
          new StringBuilder(
              chance.nextBoolean() ? SpecReaderTest.TILTED_GYROSCOPE : SpecReaderTest.BENT_LATTICE);
      int damages = 1 + chance.nextInt(4);
      for (int k = 0; k < damages; k++) {
        damage(text, chance);
      }
      faulty += faultyDocuments(text.toString());
    }
    assertTrue(faulty > ROUNDS / 2, "seed " + seed);
  }

  private static void damage(StringBuilder text, Random chance) {
    int at = chance.nextInt(text.length());
    char piece = PIECES.charAt(chance.nextInt(PIECES.length()));
    switch (chance.nextInt(3)) {
      case 0 -> text.insert(at, piece);
      case 1 -> text.setCharAt(at, piece);
      default -> text.delete(at, Math.min(text.length() - 1, at + 1 + chance.nextInt(12)));
    }
  }

  private static int faultyDocuments(String text) {
    String[] lines = text.split("\r\n|\n|\r", -1);
    int faulty = 0;
    for (SpecResult result : SpecReader.read("f", text.getBytes(StandardCharsets.UTF_8))) {
      if (result instanceof SpecResult.Faulty found) {
        faulty++;
        assertTrue(found.diagnostics().size() <= 20, text);
        checkPlaces(found.diagnostics(), lines, text);
      }
    }
    return faulty;
  }

  private static void checkPlaces(List<Diagnostic> diagnostics, String[] lines, String text) {
    int before = 0;
    for (Diagnostic diagnostic : diagnostics) {
      Place place = diagnostic.place();
      assertEquals(lines[place.line() - 1], diagnostic.sourceLine(), text);
      int length = diagnostic.sourceLine().codePointCount(0, diagnostic.sourceLine().length());
      assertTrue(place.column() + place.length() - 1 <= Math.max(1, length + 1), text);
      assertTrue(place.line() >= before, text);
      assertTrue(!diagnostic.cause().isEmpty() && !diagnostic.headline().contains("\n"), text);
      before = place.line();
    }
  }
}
