package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class OpenCellsTest {
  private static final Variables ABC = new Variables(List.of("a", "b", "c"));

  private static List<Polynomial> polys(String... texts) {
    return Stream.of(texts).map(t -> Read.polynomial(ABC, t)).toList();
  }

  private static List<Integer> signs(List<Polynomial> polynomials, List<BigFraction> point) {
    return polynomials.stream().map(p -> p.at(point).signum()).toList();
  }

  private static Set<List<Integer>> patterns(List<Polynomial> p, List<Integer> variables) {
    Set<List<Integer>> out = new HashSet<>();
    for (List<BigFraction> x : OpenCells.samples(ABC, p, variables, 5000).orElseThrow()) {
      List<Integer> s = signs(p, x);
      assertTrue(s.stream().allMatch(k -> k != 0), x + " lies on a wall");
      out.add(s);
    }
    return out;
  }

  @Test
  void lineAndCircleMakeFourPieces() {
    assertEquals(4, patterns(polys("a^2 + b^2 - 1", "a - b"), List.of(0, 1)).size());
  }

  @Test
  void lensOfTwoCirclesIsFound() {
    List<Polynomial> p = polys("4*a^2 + 4*b^2 - 4", "(10*a - 19)^2 + 100*b^2 - 100");
    assertEquals(4, patterns(p, List.of(0, 1)).size());
  }

  @Test
  void planesMakeEightOctantsInSpace() {
    assertEquals(8, patterns(polys("a", "b", "c"), List.of(0, 1, 2)).size());
  }

  @Test
  void noPolynomialsMakeOnePiece() {
    assertEquals(1, OpenCells.samples(ABC, List.of(), List.of(0, 1), 10).orElseThrow().size());
    assertEquals(1, OpenCells.samples(ABC, List.of(), List.of(), 10).orElseThrow().size());
  }

  @Test
  void boundIsKept() {
    assertEquals(
        Optional.empty(), OpenCells.samples(ABC, polys("a", "b", "c"), List.of(0, 1, 2), 5));
  }

  static LongStream seeds() {
    return Sample.seeds(30);
  }

  /** No sign pattern of a random point off the walls is missed. */
  @ParameterizedTest
  @MethodSource("seeds")
  void everyPatternOfRandomPointsIsThere(long seed) {
    Sample s = new Sample(seed);
    Variables ab = new Variables(List.of("a", "b"));
    List<Polynomial> p = List.of(s.nonConstant(ab, 4, 3, 4), s.nonConstant(ab, 4, 2, 4));
    Set<List<Integer>> found = new HashSet<>();
    OpenCells.samples(ab, p, List.of(0, 1), 5000)
        .orElseThrow()
        .forEach(x -> found.add(signs(p, x)));
    assertNotEquals(Set.of(), found);
    for (int k = 0; k < 200; k++) {
      List<Integer> pattern = signs(p, s.point(2, 12));
      assertTrue(pattern.contains(0) || found.contains(pattern), p + " misses " + pattern);
    }
  }
}
