package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.Read;
import rankfall.exact.Variables;

/** Components of sets that are known from the literature or told by hand. */
class DecompositionTest {
  private static final List<List<String>> NOTHING = List.of();

  /**
   * A set and its components.
   *
   * @param source where the components come from
   * @param numbers equations of algebraic numbers, the last variables
   * @param components generators of each prime ideal, any
   */
  private record Case(
      String source,
      String variables,
      List<String> numbers,
      List<String> equations,
      List<List<String>> components) {
    @Override
    public String toString() {
      return source;
    }

    Variables ring() {
      return new Variables(List.of(variables.split(" ")), numbers.size());
    }

    Chain constants() {
      List<Chain.Rule> rules = new ArrayList<>();
      for (int k = 0; k < numbers.size(); k++) {
        rules.add(new Chain.Rule(ring().indeterminates() + k, read(numbers.get(k))));
      }
      return new Chain(ring(), rules);
    }

    Polynomial read(String text) {
      return Read.polynomial(ring(), text);
    }

    List<Polynomial> all(List<String> texts) {
      return texts.stream().map(this::read).toList();
    }
  }

  private static Case plain(
      String source, String variables, List<String> equations, List<List<String>> components) {
    return new Case(source, variables, List.of(), equations, components);
  }

  static Stream<Case> published() {
    return Stream.of(
        plain(
            "Cox, Little, O'Shea, ch. 4 par. 6 (from memory): an axis and (t^3, t^4, t^5)",
            "x y z",
            List.of("x*z - y^2", "x^3 - y*z"),
            List.of(List.of("x", "y"), List.of("x*z - y^2", "x^3 - y*z", "x^2*y - z^2"))),
        plain(
            "Cox, Little, O'Shea, ch. 4 par. 6, exercises (from memory): two curves",
            "x y z",
            List.of("x*z - y^2", "z^3 - x^5"),
            List.of(
                List.of("x*z - y^2", "x^3 - y*z", "x^2*y - z^2"),
                List.of("x*z - y^2", "x^3 + y*z", "x^2*y + z^2"))),
        plain(
            "Cox, Little, O'Shea, ch. 4 par. 3 (from memory): a plane and a line",
            "x y z",
            List.of("x*z", "y*z"),
            List.of(List.of("z"), List.of("x", "y"))),
        plain(
            "Sturmfels, Solving Systems of Polynomial Equations, 2002, ch. 5 (from memory)",
            "x y",
            List.of("x*y", "x^3 - x^2", "x^2*y - x*y"),
            List.of(List.of("x"), List.of("x - 1", "y"))),
        plain(
            "Laubenbacher, Swanson, Permanental ideals, 2000 (from memory): 2 x 3",
            "a b c d e f",
            List.of("a*e + b*d", "a*f + c*d", "b*f + c*e"),
            List.of(
                List.of("a", "b", "c"),
                List.of("d", "e", "f"),
                List.of("a", "d", "b*f + c*e"),
                List.of("b", "e", "a*f + c*d"),
                List.of("c", "f", "a*e + b*d"))),
        plain(
            "Diaconis, Eisenbud, Sturmfels 1998 (from memory): adjacent minors, 2 x 3",
            "a b c d e f",
            List.of("a*e - b*d", "b*f - c*e"),
            List.of(List.of("b", "e"), List.of("a*e - b*d", "a*f - c*d", "b*f - c*e"))),
        plain(
            "Diaconis, Eisenbud, Sturmfels 1998 (from memory): adjacent minors, 2 x 4",
            "a b c d e f g h",
            List.of("a*f - b*e", "b*g - c*f", "c*h - d*g"),
            List.of(
                List.of("b", "f", "c*h - d*g"),
                List.of("c", "g", "a*f - b*e"),
                List.of(
                    "a*f - b*e", "a*g - c*e", "a*h - d*e", "b*g - c*f", "b*h - d*f", "c*h - d*g"))),
        plain(
            "determinantal (Bruns, Vetter 1988): rank 1 of a symmetric 3 x 3 is irreducible",
            "a b c d e f",
            List.of("a*d - b^2", "a*e - b*c", "a*f - c^2", "b*e - c*d", "b*f - c*e", "d*f - e^2"),
            List.of(
                List.of(
                    "a*d - b^2", "a*e - b*c", "a*f - c^2", "b*e - c*d", "b*f - c*e", "d*f - e^2"))),
        plain(
            "Davenport 1987 (from memory): cyclic 4; sum and product of a + c and b + d are 0",
            "a b c d",
            List.of(
                "a + b + c + d",
                "a*b + b*c + c*d + d*a",
                "a*b*c + b*c*d + c*d*a + d*a*b",
                "a*b*c*d - 1"),
            List.of(List.of("a + c", "b + d", "c*d - 1"), List.of("a + c", "b + d", "c*d + 1"))));
  }

  static Stream<Case> byHand() {
    return Stream.of(
        plain(
            "y = 0 or 2x + 2z = 1 in the magnet of three spins (Katsura's equations)",
            "x y z",
            List.of("x + 2*y + 2*z - 1", "x^2 + 2*y^2 + 2*z^2 - x", "2*x*y + 2*y*z - y"),
            List.of(
                List.of("x - 1", "y", "z"),
                List.of("3*x - 1", "y", "3*z - 1"),
                List.of("28*z^2 - 4*z - 1", "2*x + 2*z - 1", "4*y + 2*z - 1"))),
        plain(
            "a cone beside two planes",
            "a n1 n2 n3",
            List.of("a*n1", "a^2 - n2*n3"),
            List.of(List.of("a", "n2"), List.of("a", "n3"), List.of("n1", "a^2 - n2*n3"))),
        plain(
            "a cone that lies in a hyperplane",
            "a n1 n2 n3",
            List.of("a*n1", "(a^2 - n2*n3)*n1^2*n2*n3"),
            List.of(List.of("a", "n2"), List.of("a", "n3"), List.of("n1"))),
        plain(
            "circle and line meet in two conjugate points",
            "x y",
            List.of("x^2 + y^2 - 1", "x - y"),
            List.of(List.of("x - y", "2*x^2 - 1"))),
        plain(
            "circle and line side by side",
            "x y",
            List.of("(x^2 + y^2 - 1)*(x - y)^2"),
            List.of(List.of("x^2 + y^2 - 1"), List.of("x - y"))),
        plain("no zeros", "x y", List.of("x*y - 1", "x"), NOTHING),
        plain("no equations", "x y", List.of("0"), List.of(List.of())),
        plain("x^2 + y^2 over Q", "x y", List.of("x^2 + y^2"), List.of(List.of("x^2 + y^2"))),
        new Case(
            "x^2 + y^2 where i is in the ring",
            "x y i",
            List.of("i^2 + 1"),
            List.of("x^2 + y^2"),
            List.of(List.of("x - i*y"), List.of("x + i*y"))),
        new Case(
            "x^2 - 2 and y^2 + 2 where a root of 2 is in the ring",
            "x y r",
            List.of("r^2 - 2"),
            List.of("x^2 - 2", "y^2 + 2"),
            List.of(List.of("x - r", "y^2 + 2"), List.of("x + r", "y^2 + 2"))),
        new Case(
            "x^4 - 10*x^2 + 1 splits over the roots of 2 and 3",
            "x r s",
            List.of("r^2 - 2", "s^2 - 3"),
            List.of("x^4 - 10*x^2 + 1"),
            List.of(
                List.of("x - r - s"),
                List.of("x - r + s"),
                List.of("x + r - s"),
                List.of("x + r + s"))),
        plain(
            "the same root twice",
            "x y",
            List.of("x^2 - 2", "y^2 - 2"),
            List.of(List.of("x^2 - 2", "x - y"), List.of("x^2 - 2", "x + y"))),
        plain(
            "different roots",
            "x y",
            List.of("x^2 - 2", "y^2 - 3"),
            List.of(List.of("x^2 - 2", "y^2 - 3"))),
        plain(
            "a root of 8 is twice a root of 2, in a parameter too",
            "t x y",
            List.of("x^2 - t^3 - t", "y^2 - 4*(t^3 + t)"),
            List.of(List.of("x^2 - t^3 - t", "y - 2*x"), List.of("x^2 - t^3 - t", "y + 2*x"))),
        plain(
            "a point of degree 4 and its inverse",
            "x y",
            List.of("x^4 - 10*x^2 + 1", "x*y - 1"),
            List.of(List.of("x^4 - 10*x^2 + 1", "y + x^3 - 10*x"))),
        plain(
            "an equation that is a square over the tower below",
            "t x y",
            List.of("x^2 - t^3 - t", "y^4 - 2*(t^3 + t)*y^2 + (t^3 + t)^2"),
            List.of(List.of("x^2 - t^3 - t", "y - x"), List.of("x^2 - t^3 - t", "y + x"))),
        plain(
            "an equation irreducible over Q that becomes a square over the tower",
            "t x y",
            List.of("x^3 - t^4 - t", "y^2 - 2*x^2*y + x*(t^4 + t)"),
            List.of(List.of("x^3 - t^4 - t", "y - x^2"))));
  }

  private static Decomposition decomposed(Case c) {
    return Decomposition.of(
        c.constants(), c.all(c.equations()), new Meter(Duration.ofSeconds(60), 100_000));
  }

  private static void check(Case c) {
    GroebnerBasis bases = new GroebnerBasis(c.constants());
    TreeSet<String> expected = new TreeSet<>();
    c.components().forEach(g -> expected.add(bases.reduced(c.all(g)).toString()));
    Decomposition d = decomposed(c);
    TreeSet<String> found = new TreeSet<>();
    d.components().forEach(x -> found.add(x.equations().toString()));
    assertEquals(expected, found);
    assertEquals(c.components().size(), d.components().size());
    assertInstanceOf(Decomposition.Certified.class, d.certificate());
  }

  @ParameterizedTest
  @MethodSource("published")
  void componentsArePublished(Case c) {
    check(c);
  }

  @ParameterizedTest
  @MethodSource("byHand")
  void componentsAreToldByHand(Case c) {
    check(c);
  }

  /**
   * Columns of which no two neighbours vanish: Fibonacci's numbers count the components (Diaconis,
   * Eisenbud, Sturmfels 1998, from memory).
   */
  @Test
  void adjacentMinorsOfTwoByFive() {
    List<String> minors = new ArrayList<>();
    for (int k = 1; k < 5; k++) {
      minors.add("x" + k + "*y" + (k + 1) + " - x" + (k + 1) + "*y" + k);
    }
    Case c = plain("2 x 5", "x1 x2 x3 x4 x5 y1 y2 y3 y4 y5", minors, NOTHING);
    Decomposition d = decomposed(c);
    assertEquals(5, d.components().size());
    assertInstanceOf(Decomposition.Certified.class, d.certificate());
    d.components().forEach(x -> assertEquals(6, x.chain().dimension()));
  }

  /**
   * A symmetric matrix and a vector in its kernel. Three equations in nine variables leave
   * dimension 6 or more: the vector is 0, or the matrix has rank 2 (5 + 1); rank 1 (3 + 2) is too
   * small.
   */
  @Test
  void kernelsOfSymmetricMatrices() {
    Case c =
        plain(
            "n.a = 0",
            "a b c d e f x y z",
            List.of("a*x + b*y + c*z", "b*x + d*y + e*z", "c*x + e*y + f*z"),
            NOTHING);
    long before = System.nanoTime();
    Decomposition d = decomposed(c);
    assertTrue(System.nanoTime() - before < 5e9, "slow");
    assertEquals(2, d.components().size());
    assertInstanceOf(Decomposition.Certified.class, d.certificate());
    TreeSet<String> found = new TreeSet<>();
    for (Decomposition.Component x : d.components()) {
      assertEquals(6, x.chain().dimension());
      found.add(x.equations().toString());
    }
    assertTrue(found.contains("[x, y, z]"), found.toString());
    Polynomial determinant = c.read("a*(d*f - e^2) - b*(b*f - c*e) + c*(b*e - c*d)");
    assertEquals(
        1,
        d.components().stream()
            .filter(x -> x.equations().contains(determinant.primitive()))
            .count());
  }

  /** What must not vanish is part of the check: the axis alone is left. */
  @Test
  void exclusionsDropComponents() {
    Case c = plain("", "x y z", List.of("x*z - y^2", "x^3 - y*z"), NOTHING);
    Decomposition d =
        Decomposition.of(
            c.constants(),
            c.all(c.equations()),
            List.of(c.read("x^3 - y*z + x")),
            new Meter(Duration.ofSeconds(60), 1000));
    assertEquals(1, d.components().size());
    assertEquals("[x*z - y^2, x^2*y - z^2, x^3 - y*z]", sorted(d.components().get(0)));
  }

  private static String sorted(Decomposition.Component c) {
    return new TreeSet<>(c.equations().stream().map(Polynomial::toString).toList()).toString();
  }

  private static DecompositionCheck checker(Case c) {
    return new DecompositionCheck(
        c.constants(), new GroebnerBasis(c.constants()), new Meter(Duration.ofSeconds(60), 1000));
  }

  private static void refuses(Case c, List<Decomposition.Component> components) {
    assertThrows(
        IllegalStateException.class,
        () -> checker(c).of(c.all(c.equations()), List.of(), components));
  }

  /**
   * The check must refuse: a missing component, a double one, one that is none, a reducible one.
   */
  @Test
  void wrongDecompositionsAreRefused() {
    Case c = plain("", "x y z", List.of("x*z", "y*z"), NOTHING);
    Decomposition d = decomposed(c);
    assertEquals(2, d.components().size());
    refuses(c, d.components().subList(0, 1));
    refuses(c, d.components().subList(1, 2));
    refuses(c, List.of());
    refuses(c, List.of(d.components().get(0), d.components().get(0)));
    Chain line = new Chain(c.ring(), List.of(new Chain.Rule(0, c.read("x - 1"))));
    List<Decomposition.Component> more = new ArrayList<>(d.components());
    more.add(new Decomposition.Component(line, List.of(c.read("x - 1"))));
    refuses(c, more);
    Case two = plain("", "x y", List.of("x^2 - 4"), NOTHING);
    Chain reducible = new Chain(two.ring(), List.of(new Chain.Rule(0, two.read("x^2 - 4"))));
    refuses(two, List.of(new Decomposition.Component(reducible, List.of(two.read("x^2 - 4")))));
  }

  /** Forty-nine points in a plane: the cover is not proved, and the answer says so. */
  @Test
  void whatIsTooLargeIsNotCertified() {
    StringBuilder f = new StringBuilder("x");
    StringBuilder g = new StringBuilder("y");
    for (int k = 1; k < 7; k++) {
      f.append("*(x - ").append(k).append(")");
      g.append("*(y - ").append(k).append(")");
    }
    Case c = plain("", "x y", List.of(f.toString(), g.toString()), NOTHING);
    Decomposition d = decomposed(c);
    assertEquals(49, d.components().size());
    Decomposition.NotCertified n =
        assertInstanceOf(Decomposition.NotCertified.class, d.certificate());
    assertEquals("49 components with 98 generators are too many", n.reason());
  }
}
