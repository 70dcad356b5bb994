package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.RealZeros.Answer;
import rankfall.exact.RealZeros.Condition;
import rankfall.exact.RealZeros.Relation;
import rankfall.exact.RealZeros.Verdict;

class RealZerosTest {
  private static final Variables ABC = new Variables(List.of("a", "b", "c"));

  private static Polynomial poly(String text) {
    return Read.polynomial(ABC, text);
  }

  private static List<Polynomial> polys(String text) {
    return text.isBlank()
        ? List.of()
        : Stream.of(text.split(";")).map(RealZerosTest::poly).toList();
  }

  /** Conditions as {@code p > 0; q >= 0; r != 0}. */
  private static List<Condition> conditions(String text) {
    List<Condition> out = new ArrayList<>();
    for (String s : text.isBlank() ? new String[0] : text.split(";")) {
      Relation r =
          s.contains(">=")
              ? Relation.NON_NEGATIVE
              : s.contains("!=") ? Relation.NON_ZERO : Relation.POSITIVE;
      out.add(new Condition(poly(s.split(">=|!=|>")[0]), r));
    }
    return out;
  }

  /** Approximate values; exact zero is checked where the point is rational. */
  private static void assertOnSet(Answer a, List<Polynomial> eqs, List<Condition> conds) {
    assertEquals(3, a.point().size());
    List<BigFraction> near =
        a.point().stream()
            .map(x -> x.rational().orElseGet(() -> x.within(BigFraction.of(1, 1L << 50)).middle()))
            .toList();
    boolean rational = a.point().stream().allMatch(AlgebraicNumber::isRational);
    for (Polynomial f : eqs) {
      assertTrue(
          rational ? f.at(near).signum() == 0 : Math.abs(f.at(near).doubleValue()) < 1e-8,
          f + " at " + a.point());
    }
    for (Condition c : conds) {
      double v = c.polynomial().at(near).doubleValue();
      assertTrue(
          switch (c.relation()) {
            case POSITIVE -> v > 0;
            case NON_NEGATIVE -> v >= -1e-8;
            case NON_ZERO -> v != 0;
          },
          c + " at " + a.point());
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      nullValues = "none",
      textBlock =
          """
          a^2 + b^2 + 1                 | ''               | NO
          a^2 + b^2                     | ''               | YES
          a^2 + b^2                     | a != 0           | NO
          a^2 - 2*b^2                   | ''               | YES
          a^2 - 2*b^2                   | b > 0            | YES
          a^2 - 2*b^2                   | b > 0; a > 0; b - a > 0 | NO
          a^2 + b^2 - 1                 | ''               | YES
          a^2 + b^2 - 1                 | a - 2 > 0        | NO
          a^2 + b^2 - 1                 | a - 1 >= 0       | YES
          a^2 + b^2 - 1                 | a - 1 > 0        | NO
          a^2 + a*b + b^2               | a != 0           | NO
          a^2 + a*b + b^2               | ''               | YES
          a^2 + 2*a*b + b^2 + 1         | ''               | NO
          a^2 - b*c                     | b > 0; -c > 0    | NO
          a^2 - b*c                     | a != 0; -b > 0   | YES
          a^2 + b*c                     | b > 0; c > 0     | NO
          a*b + c^2                     | a > 0; b > 0     | NO
          a^4 + b^4 - c                 | -c > 0           | NO
          a^4 - 10*a^2 + 1              | ''               | YES
          a^4 + a + 1                   | ''               | NO
          a^4 + b^2 + a + 1             | ''               | NO
          a^2*b^4 + a^4*b^2 - 3*a^2*b^2 + 1 | ''           | YES
          a^2*b^4 + a^4*b^2 - 3*a^2*b^2 + 1 | a - 1 > 0    | NO
          a^2*b^4 + a^4*b^2 - 3*a^2*b^2 + 2 | ''           | NO
          a^2 - 2; b^2 - 3              | ''               | YES
          a^2 - 2; b^2 + a              | ''               | YES
          a^2 - 2; b^2 + a              | a > 0            | NO
          a^2 - 2; b^2 - a*c^2          | a > 0; c > 0     | YES
          a^2 + b^2 - 1; a^2 + b^2 - 4  | ''               | NO
          a^2 + b^2 - 1; a*b - 1        | ''               | NO
          a*b - 1                       | ''               | YES
          a*b - 1                       | a > 0; -b > 0    | NO
          a*b - c; a; c - 1             | ''               | NO
          a^3 - 2                       | ''               | YES
          b^2 - a^3 + a^2               | ''               | YES
          b^2 - a^3 + a^2               | a != 0; 1 - a > 0 | NO
          ''                            | a^2 + b^2 > 0    | YES
          ''                            | a*b - 1 > 0; -a > 0; b > 0 | NO
          ''                            | 1 - a^2 - b^2 > 0; a + b - 2 > 0 | NO
          ''                            | 1 - a^2 - b^2 >= 0; a - 1 >= 0 | YES
          ''                            | 0*a >= 0; a - a != 0 | NO
          """)
  void knownSets(String equations, String conditions, Verdict expected) {
    List<Polynomial> eqs = polys(equations);
    List<Condition> conds = conditions(conditions);
    Answer a = RealZeros.exist(ABC, eqs, conds);
    assertEquals(expected, a.verdict());
    if (expected == Verdict.YES && !equations.equals("a^2 - 2; b^2 - 3")) {
      assertOnSet(a, eqs, conds);
    } else {
      assertEquals(List.of(), a.point());
    }
  }

  @Test
  void pointOfAnIrrationalSetIsWrittenAsRoots() {
    Answer a = RealZeros.exist(ABC, polys("a^2 - 2*b^2"), conditions("b - 3 > 0; a > 0"));
    assertEquals(Verdict.YES, a.verdict());
    assertTrue(
        a.point().stream().anyMatch(x -> x.toString().startsWith("root(")), a.point().toString());
  }

  static LongStream seeds() {
    return Sample.seeds(60);
  }

  /** A set through a known rational point is never said to be empty, and its point lies on it. */
  @ParameterizedTest
  @MethodSource("seeds")
  void setThroughAPointIsNotEmpty(long seed) {
    Sample s = new Sample(seed);
    List<BigFraction> x =
        List.of(
            BigFraction.of(s.below(5) - 2),
            BigFraction.of(s.below(3) - 1),
            BigFraction.of(s.below(3)));
    List<Polynomial> eqs = new ArrayList<>();
    for (int k = 1 + s.below(2); k > 0; k--) {
      Polynomial f = s.polynomial(ABC, 4, 3, 3);
      eqs.add(f.minus(Polynomial.constant(ABC, f.at(x).getNumerator())));
    }
    List<Condition> conds = new ArrayList<>();
    Polynomial g = s.polynomial(ABC, 3, 2, 3);
    int sign = g.at(x).signum();
    conds.add(
        sign == 0
            ? new Condition(g, Relation.NON_NEGATIVE)
            : new Condition(sign > 0 ? g : g.negate(), Relation.POSITIVE));
    Answer a = RealZeros.exist(ABC, eqs, conds);
    assertNotEquals(Verdict.NO, a.verdict(), eqs + " " + conds + " at " + x);
    if (a.verdict() == Verdict.YES) {
      assertOnSet(a, eqs, conds);
    }
  }

  /** A positive sum of squares plus a positive number has no real zero, however it is written. */
  @ParameterizedTest
  @MethodSource("seeds")
  void positivePolynomialsHaveNoZero(long seed) {
    Sample s = new Sample(seed);
    Polynomial f = s.polynomial(ABC, 2, 1, 2);
    Polynomial g = s.polynomial(ABC, 2, 2, 2);
    Polynomial p = f.times(f).plus(g.times(g)).plus(Polynomial.constant(ABC, 1 + s.below(3)));
    assertNotEquals(Verdict.YES, RealZeros.exist(ABC, List.of(p), List.of()).verdict(), p + "");
  }
}
