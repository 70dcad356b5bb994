package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import rankfall.spec.SpecResult;

final class FamilyChoiceTest {
  private static final SpecResult FIRST = Specs.read("first", "x.yaml", 1);
  private static final SpecResult BAD = Specs.faulty("bad", "x.yaml");

  @Test
  void theOnlyDocumentNeedsNoName() {
    assertEquals(FIRST, FamilyChoice.of(List.of(FIRST), Optional.empty()));
  }

  @Test
  void aNameChoosesAlsoAFaultyDocument() {
    assertEquals(BAD, FamilyChoice.of(List.of(FIRST, BAD), Optional.of("bad")));
  }

  @Test
  void severalWithoutANameAreListed() {
    assertRefused(
        List.of(FIRST, BAD),
        Optional.empty(),
        "the file holds several families; choose one with --family: first, bad");
  }

  @Test
  void anUnknownNameIsRefused() {
    assertRefused(
        List.of(FIRST), Optional.of("none"), "the file holds no family 'none'; it holds first");
  }

  @Test
  void aNameTwiceIsRefused() {
    assertRefused(
        List.of(FIRST, FIRST), Optional.of("first"), "the file describes 'first' more than once");
  }

  private static void assertRefused(
      List<SpecResult> documents, Optional<String> name, String message) {
    IllegalArgumentException wrong =
        assertThrows(IllegalArgumentException.class, () -> FamilyChoice.of(documents, name));
    assertEquals(message, wrong.getMessage());
  }
}
