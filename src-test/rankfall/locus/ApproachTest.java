package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;
import rankfall.lie.StructureConstants;
import rankfall.lie.StructureConstants.Pair;

/** Rational functions near special points: which have a limit, and which. */
class ApproachTest {
  private static final Variables V = new Variables(List.of("x", "y", "z", "w"));
  private static final Polynomial X = Polynomial.variable(V, 0);
  private static final Polynomial Y = Polynomial.variable(V, 1);
  private static final Polynomial Z = Polynomial.variable(V, 2);
  private static final Polynomial W = Polynomial.variable(V, 3);
  private static final Polynomial ONE = Polynomial.one(V);
  private static final Chain SPACE = Chain.free(V);

  private static Chain.Rule rule(int variable, Polynomial equation) {
    return new Chain.Rule(variable, equation);
  }

  private static Chain chain(Chain.Rule... rules) {
    return new Chain(V, List.of(rules));
  }

  private static Approach.Answer answer(
      Chain general, Chain special, Polynomial above, Polynomial below) {
    GroebnerBasis bases = new GroebnerBasis(SPACE);
    return new Approach(bases, general, bases.of(general), special)
        .of(RationalFunction.of(above, below));
  }

  private static String value(Approach.Answer a) {
    return assertInstanceOf(Approach.Value.class, a).function().toString();
  }

  @Test
  void lowestTermsDecideInTheWholeSpace() {
    Chain origin = chain(rule(0, X), rule(1, Y));
    assertEquals("z", value(answer(SPACE, origin, X.times(Z), X)));
    assertEquals("0", value(answer(SPACE, origin, X, Z)));
    assertInstanceOf(Approach.Without.class, answer(SPACE, origin, ONE, X));
    assertInstanceOf(Approach.Without.class, answer(SPACE, origin, X, Y));
    assertInstanceOf(Approach.Without.class, answer(SPACE, origin, X.times(X), X.plus(Y.times(Y))));
  }

  /** On the circle (1 - x)/y = y/(1 + x): half-angle formula, common practice, no source. */
  @Test
  void halfAngleOnTheCircleHasALimitAtOnePointAndAPoleAtTheOther() {
    Chain circle = chain(rule(0, X.times(X).plus(Y.times(Y)).minus(ONE)));
    Chain right = chain(rule(0, X.minus(ONE)), rule(1, Y));
    Chain left = chain(rule(0, X.plus(ONE)), rule(1, Y));
    assertEquals("0", value(answer(circle, right, ONE.minus(X), Y)));
    assertInstanceOf(Approach.Without.class, answer(circle, left, ONE.minus(X), Y));
    Chain other = chain(rule(1, X.times(X).plus(Y.times(Y)).minus(ONE)));
    assertEquals("0", value(answer(other, right, ONE.minus(X), Y)));
    assertEquals("1/2", value(answer(other, right, ONE.minus(X), Y.times(Y))));
    assertInstanceOf(Approach.Without.class, answer(other, right, Y, ONE.minus(X)));
  }

  /**
   * The quadric cone x*y = z*w: x/z = w/y has a value on the plane x = z = 0, yet none at the
   * vertex, where the local ring is not factorial (Hartshorne, Algebraic Geometry, II.6, place from
   * memory).
   */
  @Test
  void functionOnTheQuadricConeChangesItsQuotient() {
    Chain cone = chain(rule(0, X.times(Y).minus(Z.times(W))));
    Chain plane = chain(rule(0, X), rule(2, Z));
    assertEquals("w/y", value(answer(cone, plane, X, Z)));
    Chain lines = chain(rule(0, X), rule(2, Z), rule(3, W));
    assertEquals("0", value(answer(cone, lines, X, Z)));
    Chain vertex = chain(rule(0, X), rule(1, Y), rule(2, Z), rule(3, W));
    assertInstanceOf(Approach.Unknown.class, answer(cone, vertex, X, Z));
  }

  /** On the cusp x^3 = y^2 the quotient y/x tends to 0 and is no quotient without a pole. */
  @Test
  void cuspIsNotDecided() {
    Chain cusp = chain(rule(1, Y.times(Y).minus(X.times(X).times(X))));
    Chain origin = chain(rule(0, X), rule(1, Y));
    assertInstanceOf(Approach.Unknown.class, answer(cusp, origin, Y, X));
    assertInstanceOf(Approach.Without.class, answer(cusp, origin, ONE, X));
    assertEquals("0", value(answer(cusp, origin, Y.times(Y), X)));
  }

  @Test
  void bracketsThatBreakJacobisIdentityAreRefusedLoudly() {
    SortedMap<Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
    c.put(new Pair(0, 1), new TreeMap<>(Map.of(0, ONE)));
    c.put(new Pair(1, 2), new TreeMap<>(Map.of(1, ONE)));
    StructureConstants<Polynomial> broken =
        new StructureConstants<>(SPACE, 3, c, ONE, List.of(ONE, ONE, ONE));
    assertThrows(ComponentForm.Mismatch.class, () -> Contraction.requireJacobi(SPACE, broken));
  }
}
