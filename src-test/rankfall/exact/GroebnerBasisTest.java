package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class GroebnerBasisTest {
  private static final Variables RING = new Variables(List.of("x", "y", "z"));
  private static final GroebnerBasis PLAIN = new GroebnerBasis(Chain.free(RING));
  private static final Variables WITH_I = new Variables(List.of("x", "y", "i"), 1);
  private static final GroebnerBasis COMPLEX =
      new GroebnerBasis(
          new Chain(WITH_I, List.of(new Chain.Rule(2, Read.polynomial(WITH_I, "i^2 + 1")))));

  private static List<Polynomial> in(Variables ring, String... texts) {
    return List.of(texts).stream().map(t -> Read.polynomial(ring, t)).toList();
  }

  private static Polynomial one(Variables ring, String text) {
    return Read.polynomial(ring, text);
  }

  static LongStream seeds() {
    return Sample.seeds(40);
  }

  /** Cox, Little, O'Shea, ch. 2 par. 6 (from memory): the twisted cubic, graded order. */
  @Test
  void twistedCubic() {
    assertEquals(
        "[x*y - z, x*z - y^2, x^2 - y]", PLAIN.reduced(in(RING, "y - x^2", "z - x^3")).toString());
  }

  @Test
  void edges() {
    assertEquals(List.of(), PLAIN.reduced(List.of()));
    assertEquals(List.of(), PLAIN.reduced(in(RING, "0")));
    assertEquals(in(RING, "1"), PLAIN.reduced(in(RING, "x", "x - 1")));
    assertEquals(List.of(), COMPLEX.reduced(List.of()));
    assertEquals(in(WITH_I, "1"), COMPLEX.reduced(in(WITH_I, "i - 2")));
    Variables none = new Variables(List.of());
    assertEquals(List.of(), new GroebnerBasis(Chain.free(none)).reduced(List.of()));
  }

  /** With a number in the ring: a line through conjugate points is cut off, its mirror is left. */
  @Test
  void saturationKeepsTheNumbersApart() {
    assertEquals(
        in(WITH_I, "x - i*y"), COMPLEX.saturated(in(WITH_I, "y*(x - i*y)"), in(WITH_I, "y")));
    assertEquals(
        in(WITH_I, "x - i*y"), COMPLEX.saturated(in(WITH_I, "x^2 + y^2"), in(WITH_I, "x + i*y")));
    assertEquals(
        in(WITH_I, "x^2 + y^2"),
        COMPLEX.intersection(in(WITH_I, "x - i*y"), in(WITH_I, "x + i*y")));
  }

  @Test
  void radicals() {
    assertTrue(PLAIN.radicalContains(in(RING, "x^2*y"), one(RING, "x*y")));
    assertFalse(PLAIN.radicalContains(in(RING, "x^2*y"), one(RING, "x")));
    assertTrue(COMPLEX.radicalContains(in(WITH_I, "(x - i*y)^3"), one(WITH_I, "x^2 + y^2")));
    assertFalse(COMPLEX.radicalContains(in(WITH_I, "x^2 + y^2"), one(WITH_I, "x - i*y")));
    assertEquals(
        in(RING, "x"), PLAIN.outside(in(RING, "x^2", "y"), in(RING, "x", "x^3 - y*z", "0")));
  }

  /** What lies in both ideals lies in the intersection, and the other way about. */
  @ParameterizedTest
  @MethodSource("seeds")
  void intersectionIsTheCommonPart(long seed) {
    Sample s = new Sample(seed);
    List<Polynomial> a = List.of(s.nonConstant(RING, 3, 2, 2), s.nonConstant(RING, 2, 2, 2));
    List<Polynomial> b = List.of(s.nonConstant(RING, 3, 2, 2), s.nonConstant(RING, 2, 2, 2));
    List<Polynomial> both = PLAIN.intersection(a, b);
    assertEquals(List.of(), PLAIN.outside(a, both));
    assertEquals(List.of(), PLAIN.outside(b, both));
    Polynomial product = a.get(s.below(2)).times(b.get(s.below(2)));
    assertEquals(List.of(), PLAIN.outside(both, List.of(product)));
  }

  /** Multiplying by a factor and saturating by it gives the ideal back, where that is prime. */
  @ParameterizedTest
  @MethodSource("seeds")
  void saturationUndoesProducts(long seed) {
    Sample s = new Sample(seed);
    Polynomial y = one(RING, "y");
    Polynomial x = one(RING, "x");
    Polynomial z = one(RING, "z");
    Polynomial f = s.polynomial(RING, 3, 2, 3);
    List<Polynomial> graph = List.of(x.minus(z.pow(s.below(3))), y.minus(z.pow(1 + s.below(2))));
    Chain chain =
        new Chain(RING, List.of(new Chain.Rule(0, graph.get(0)), new Chain.Rule(1, graph.get(1))));
    boolean inside = f.isZero() || chain.vanishes(f);
    List<Polynomial> times = graph.stream().map(f::times).toList();
    List<Polynomial> back = PLAIN.saturated(times, List.of(f));
    assertEquals(inside ? in(RING, "1") : PLAIN.reduced(graph), back);
  }
}
