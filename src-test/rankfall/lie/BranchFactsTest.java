package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;

/** The same facts at the general point of a set of parameters, and where they may change. */
class BranchFactsTest {
  private static final Variables ANN = new Variables(List.of("a", "m", "n"));
  private static final Polynomial A = Polynomial.variable(ANN, 0);
  private static final Polynomial M = Polynomial.variable(ANN, 1);
  private static final Polynomial N = Polynomial.variable(ANN, 2);

  /** [e1,e2] = a e2 + n e3, [e3,e1] = m e2 - a e3 (Ellis and MacCallum 1969). */
  private static AlgebraFacts<Polynomial> bianchi(Chain chain) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
    c.put(new StructureConstants.Pair(0, 1), new TreeMap<>(java.util.Map.of(1, A, 2, N)));
    c.put(new StructureConstants.Pair(0, 2), new TreeMap<>(java.util.Map.of(1, M.negate(), 2, A)));
    Polynomial one = chain.one();
    return AlgebraFacts.of(new StructureConstants<>(chain, 3, c, one, List.of(one, one, one)));
  }

  private static Chain where(int variable, Polynomial equation) {
    return new Chain(ANN, List.of(new Chain.Rule(variable, equation)));
  }

  private static String profile(AlgebraFacts<?> f) {
    return f.killingRank()
        + " "
        + f.derivedSeries().dimensions()
        + f.lowerCentralSeries().dimensions()
        + " "
        + f.centre().dimension()
        + f.radical().dimension()
        + f.nilradical().dimension()
        + " "
        + f.unimodular();
  }

  @Test
  void generalMemberIsSolvableOfRankOne() {
    assertEquals("1 [3, 2, 0][3, 2] 032 false", profile(bianchi(Chain.free(ANN))));
  }

  /** h = 1: the Killing form is 0, the algebra still not nilpotent. */
  @Test
  void killingFormVanishesWhereHIsOne() {
    Chain h1 = where(1, A.times(A).minus(M.times(N)));
    assertEquals("0 [3, 2, 0][3, 2] 032 false", profile(bianchi(h1)));
  }

  /** h = -1 is class III, on a surface that is no graph of a polynomial. */
  @Test
  void derivedAlgebraFallsWhereHIsMinusOne() {
    Chain h = where(0, A.times(A).plus(M.times(N)));
    assertEquals("1 [3, 1, 0][3, 1] 132 false", profile(bianchi(h)));
  }

  @Test
  void unimodularWhereTheVectorVanishes() {
    assertEquals("1 [3, 2, 0][3, 2] 032 true", profile(bianchi(where(0, A))));
  }

  /** Every change of a dimension lies where one of the stated polynomials vanishes. */
  @Test
  void changesAreCoveredByTheStatedPolynomials() {
    AlgebraFacts<Polynomial> general = bianchi(Chain.free(ANN));
    Chain h = where(0, A.times(A).plus(M.times(N)));
    assertTrue(meets(h, general.derived().nonVanishing()));
    assertTrue(meets(h, general.centre().nonVanishing()));
    Chain one = where(1, A.times(A).minus(M.times(N)));
    assertTrue(meets(one, general.killingKernel().nonVanishing()));
    Chain nilpotent = new Chain(ANN, List.of(new Chain.Rule(0, A), new Chain.Rule(1, M)));
    assertEquals(3, bianchi(nilpotent).nilradical().dimension());
    assertTrue(meets(nilpotent, general.nilradical().nonVanishing()));
  }

  private static boolean meets(Chain chain, List<Polynomial> polynomials) {
    return polynomials.stream().anyMatch(chain::vanishes);
  }

  /** Where the only constant vanishes on the chain, every form is invariant. */
  @Test
  void invariantFormsOnAChain() {
    List<Integer> counts = new ArrayList<>();
    for (Chain chain :
        List.of(Chain.free(ANN), where(0, A), where(0, A.times(A).plus(M.times(N))))) {
      SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
      c.put(
          new StructureConstants.Pair(0, 1),
          new TreeMap<>(java.util.Map.of(2, A.times(A).plus(M.times(N)), 0, A.minus(A))));
      Polynomial one = chain.one();
      StructureConstants<Polynomial> constants =
          new StructureConstants<>(chain, 3, c, one, List.of(one, one, one));
      counts.add(InvariantForms.of(LieBracket.of(constants)).count());
    }
    assertEquals(List.of(3, 3, 6), counts);
  }

  /**
   * [x,y] = a y, [x,z] = m z, [y,z] = n t on a + m = 0: class A_{4,8}, which has an invariant form
   * of rank 4. The condition (a + m) B(y,z) = 0 says nothing there, though it looks like a lone
   * unknown.
   */
  @Test
  void conditionThatVanishesOnTheChainStrikesOutNothing() {
    Chain chain = where(1, A.plus(M));
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
    c.put(new StructureConstants.Pair(0, 1), new TreeMap<>(java.util.Map.of(1, A)));
    c.put(new StructureConstants.Pair(0, 2), new TreeMap<>(java.util.Map.of(2, M)));
    c.put(new StructureConstants.Pair(1, 2), new TreeMap<>(java.util.Map.of(3, N)));
    Polynomial one = chain.one();
    InvariantForms<Polynomial> forms =
        InvariantForms.of(
            LieBracket.of(new StructureConstants<>(chain, 4, c, one, List.of(one, one, one, one))));
    assertEquals(2, forms.count());
    assertEquals(new MaximalRank(4, true), forms.maximalRank());
  }
}
