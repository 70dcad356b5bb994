package rankfall.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class SpecReaderTest {
  /** Every key that goes with matrices, in a family of our own. */
  static final String TILTED_GYROSCOPE =
      """
      family: tilted-gyroscope
      title: A gyroscope on a tilted table
      notes: |
        Two lines
        of notes.
      ground: real
      convention: direct
      parameters: [tilt, load, phi]
      where:
        - load > 0
        - tilt^2 + load^2 = 1
        - "tilt != 1/3"
      constants:
        w: {minimal: "z^3 - z - 1", near: 1.3247}
      abbreviations:
        K: "tilt*load - w"
        M: K^2 + sqrt(2)
      order: 3
      matrices:
        A: [[0, 0, 0], [0, 0, -tilt], [0, load, 0]]
        B: "cos(phi)*E(3,1) - 1/2*E(1,3)"
        C: 2*A - M*B + E(2,2)/4
      closure: generate
      torus: [C]
      covectors: {k1: {C: 2}, k2: {C: -tilt/2}}
      scan: {phi: [1/2, 1, 2e-1], tilt: {from: -2, to: 2, points: 17}}
      """;

  /** Every key that goes with brackets. */
  static final String BENT_LATTICE =
      """
      family: bent-lattice
      ground: complex
      convention: hermitian
      parameters: [α, m_1]
      brackets: |
        # rotations first
        [J, P] = i*α*Q + 2*J   # mixed
        [Q, J] = -i*P/m_1

        [J, J] = 0
        [P, J] = -i*α*Q - 2*J
      generators: [Q, P, J, Z]
      """;

  private static List<SpecResult> results(String text) {
    return SpecReader.read("file.yaml", text.getBytes(StandardCharsets.UTF_8));
  }

  private static Spec only(String text) throws SpecException {
    assertEquals(1, results(text).size());
    return results(text).get(0).orThrow();
  }

  private static List<Diagnostic> faults(SpecResult result) {
    return ((SpecResult.Faulty) result).diagnostics();
  }

  @Test
  void readsEveryKeyOfAMatrixFamily() throws SpecException {
    Spec spec = only(TILTED_GYROSCOPE);
    assertEquals("tilted-gyroscope", spec.family());
    assertEquals(Optional.of("A gyroscope on a tilted table"), spec.title());
    assertEquals(Optional.of("Two lines\nof notes.\n"), spec.notes());
    assertEquals(List.of("tilt", "load", "phi"), spec.parameters());
    assertEquals(
        List.of(Spec.Relation.GREATER, Spec.Relation.EQUAL, Spec.Relation.UNEQUAL),
        spec.where().stream().map(Spec.Condition::relation).toList());
    assertEquals("tilt != 1/3", spec.where().get(2).text());
    Spec.Constant constant = spec.constants().get(0);
    assertEquals(
        List.of(BigFraction.of(-1), BigFraction.of(-1), BigFraction.ZERO, BigFraction.ONE),
        constant.coefficients());
    assertEquals(BigFraction.of(13247, 10000), constant.near());
    assertEquals("((K^2)+root 2)", ExpressionText.of(spec.abbreviations().get(1).value()));
    Spec.Matrices matrices = (Spec.Matrices) spec.presentation();
    assertEquals(3, matrices.order());
    assertEquals(Spec.Closure.GENERATE, matrices.closure());
    assertEquals(List.of("A", "B", "C"), matrices.generators());
    assertEquals(
        "(((2*A)-(M*B))+(E2,2/4))",
        ExpressionText.of(((Spec.Combination) matrices.matrices().get(2).body()).value()));
    assertEquals(List.of("C"), spec.torus());
    assertEquals(List.of("k1", "k2"), List.copyOf(spec.covectors().keySet()));
    assertEquals("((-tilt)/2)", ExpressionText.of(spec.covectors().get("k2").get("C")));
    assertEquals(List.of("tilt", "phi"), List.copyOf(spec.scan().keySet()));
    assertEquals(17, spec.scan().get("tilt").size());
    assertEquals(BigFraction.of(-7, 4), spec.scan().get("tilt").get(1));
    assertEquals(
        List.of(BigFraction.of(1, 2), BigFraction.ONE, BigFraction.of(1, 5)),
        spec.scan().get("phi"));
    assertEquals(new Place("file.yaml", 1, 9, 16), spec.source().familyPlace());
    assertThrows(UnsupportedOperationException.class, () -> spec.scan().clear());
    assertThrows(UnsupportedOperationException.class, () -> spec.covectors().clear());
  }

  @Test
  void readsEveryKeyOfABracketFamily() throws SpecException {
    Spec spec = only(BENT_LATTICE);
    assertEquals(Spec.Ground.COMPLEX, spec.ground());
    assertEquals(Spec.Convention.HERMITIAN, spec.convention());
    Spec.Brackets brackets = (Spec.Brackets) spec.presentation();
    assertEquals(List.of("Q", "P", "J", "Z"), brackets.generators());
    assertEquals(
        List.of("J P (((i*α)*Q)+(2*J))", "Q J (((-i)*P)/m_1)", "P J ((((-i)*α)*Q)-(2*J))"),
        brackets.equations().stream()
            .map(e -> e.left() + " " + e.right() + " " + ExpressionText.of(e.value()))
            .toList());
    assertEquals(new Place("file.yaml", 8, 3, 17), brackets.equations().get(1).place());
  }

  @Test
  void generatorsStandInTheOrderInWhichTheyAppear() throws SpecException {
    Spec spec = only("family: f\nparameters: [a]\nbrackets: |\n  [X, Y] = a*Z\n  [T, X] = S - Y\n");
    assertEquals(List.of("X", "Y", "Z", "T", "S"), spec.presentation().generators());
  }

  @Test
  void anAbelianFamilyNeedsNoEquation() throws SpecException {
    Spec spec = only("family: f\ngenerators: [X, Y]\nbrackets: \"\"\n");
    assertEquals(List.of("X", "Y"), spec.presentation().generators());
    assertEquals(
        spec.presentation(), only("family: f\nbrackets:\ngenerators: [X, Y]\n").presentation());
  }

  @Test
  void theLetterEIsAGeneratorAmongBrackets() throws SpecException {
    Spec spec = only("family: f\nbrackets: \"[H, E] = 2*E\"\n");
    assertEquals(List.of("H", "E"), spec.presentation().generators());
  }

  @Test
  void twentyFaultsAreShownInTheOrderOfTheText() {
    String rows =
        IntStream.range(0, 30)
            .mapToObj(k -> "  X" + k + ": [[q" + k + "]]\n")
            .collect(Collectors.joining());
    List<Diagnostic> faults = faults(results("family: f\nmatrices:\n" + rows).get(0));
    assertEquals(20, faults.size());
    assertEquals(
        IntStream.rangeClosed(3, 22).boxed().toList(),
        faults.stream().map(d -> d.place().line()).toList());
  }

  @Test
  void fiveHundredAndTwelveGeneratorsAreReadAndOneMoreIsNot() throws SpecException {
    assertEquals(512, only(generators(512)).presentation().generators().size());
    assertEquals(
        "the family has 513 generators", faults(results(generators(513)).get(0)).get(0).cause());
  }

  private static String generators(int count) {
    return IntStream.range(0, count)
        .mapToObj(k -> "X" + k)
        .collect(Collectors.joining(", ", "family: f\nbrackets: \"\"\ngenerators: [", "]\n"));
  }

  @Test
  void fourMebibytesAreReadAndOneByteMoreIsNot() {
    String spec = "family: f\nbrackets: \"[X, Y] = Z\"\n";
    String filled = spec + ("#" + "x".repeat(62) + "\n").repeat(1 << 16);
    byte[] full = Arrays.copyOf(filled.getBytes(StandardCharsets.UTF_8), 4 * 1024 * 1024);
    assertTrue(SpecReader.read("f.yaml", full).get(0) instanceof SpecResult.Read);
    byte[] over = Arrays.copyOf(full, full.length + 1);
    assertEquals(
        "f.yaml:1:1: the file has 4194305 bytes; at most 4 MiB are read",
        faults(SpecReader.read("f.yaml", over).get(0)).get(0).headline());
  }

  @Test
  void listsNestedTooDeepAreOneFault() {
    String deep =
        "family: f\nnotes: " + "[".repeat(5000) + "\n---\nfamily: g\nbrackets: '[X, Y] = X'\n";
    List<SpecResult> results = results(deep);
    assertEquals(2, results.size());
    assertEquals("lists and mappings nested over 200 deep", faults(results.get(0)).get(0).cause());
    assertEquals(Optional.of("f"), ((SpecResult.Faulty) results.get(0)).family());
    assertTrue(results.get(1) instanceof SpecResult.Read);
  }

  @Test
  void otherEncodingsAndControlCharactersAreRefused() {
    byte[] latin = "family: f\ntitle: \u00e9\n".getBytes(StandardCharsets.ISO_8859_1);
    assertEquals(
        "the file is not UTF-8", faults(SpecReader.read("f.yaml", latin).get(0)).get(0).cause());
    assertEquals(
        new Place("file.yaml", 2, 9, 1),
        faults(results("family: f\ntitle: x\u0007y\n").get(0)).get(0).place());
  }

  @Test
  void aFaultyDocumentKeepsItsFamilyName() {
    SpecResult.Faulty broken = (SpecResult.Faulty) results("family: lost\nwhere: [\n").get(0);
    assertEquals(Optional.of("lost"), broken.family());
    SpecException thrown = assertThrows(SpecException.class, broken::orThrow);
    assertEquals(broken.diagnostics(), thrown.diagnostics());
  }

  @Test
  void emptyDocumentsBetweenSpecsArePassedOver() {
    String spec = "family: f\nbrackets: \"[X, Y] = Z\"\n";
    assertEquals(2, results("---\n---\n" + spec + "---\n# nothing\n---\n" + spec + "---\n").size());
  }

  @Test
  void longLinesAreShownInPart() {
    String line = "matrices: {X: [[" + "0, ".repeat(100) + "q]]}";
    Diagnostic fault = faults(results("family: f\n" + line + "\n").get(0)).get(0);
    Diagnostic unknown =
        new Diagnostic(new Place("f.yaml", 2, 317, 1), line, "unknown", Optional.empty());
    String[] shown = DiagnosticText.of(unknown).split("\n");
    assertEquals(2, fault.place().line());
    assertTrue(shown[1].length() < 120);
    assertEquals('q', shown[1].charAt(shown[2].indexOf('^')));
  }

  @Test
  void theDigestIsThatOfTheBytes() throws SpecException {
    // FIPS 180-4 gives the function; the value is that of "sha256sum" on the same bytes.
    String text = "family: f\nbrackets: \"[X, Y] = Z\"\n";
    assertEquals(
        "c6aa97cf171de35e3ac3aca04aae4146510564093e9cf90208717ad33620c62e",
        only(text).source().sha256());
  }

  @Test
  void theNearestNameCountsSwapsAsOneSlip() {
    assertEquals(1, Spelling.distance("alhpa", "alpha"));
    assertEquals(0, Spelling.distance("a", "a"));
    assertEquals(3, Spelling.distance("", "abc"));
    assertEquals(3, Spelling.distance("kitten", "sitting"));
    assertEquals(Optional.of("beta"), Spelling.meant("btea", List.of("alpha", "beta")));
    assertEquals(Optional.empty(), Spelling.meant("q", List.of("a")));
  }

  @Test
  void specsAreEqualAfterEveryReading() throws SpecException {
    List<Spec> twice = new ArrayList<>();
    twice.add(only(TILTED_GYROSCOPE));
    twice.add(only(TILTED_GYROSCOPE));
    assertEquals(twice.get(0), twice.get(1));
    assertEquals(Map.of(), only(BENT_LATTICE).scan());
  }
}
