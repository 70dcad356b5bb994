package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * The quadratic Casimir element: the sum of D^ij e_i e_j with D the inverse of the Killing matrix
 * (Humphreys, Introduction to Lie Algebras and Representation Theory, sec. 6.2; place from memory).
 *
 * <p>It commutes with a generator x exactly if D, as an element of the symmetric square, is killed
 * by ad x; that is checked for every generator before anybody sees it.
 *
 * @param coefficients D, symmetric
 */
public record CasimirElement(List<List<RationalFunction>> coefficients) {
  /** Copies the matrix. */
  public CasimirElement {
    coefficients = coefficients.stream().map(List::copyOf).toList();
  }

  /**
   * The element that belongs to a dual form.
   *
   * @param chain the set over which everything is given; all holds at its general point
   * @param constants brackets of the basis e_i
   * @param dual D
   * @throws IllegalStateException if the element does not commute with every generator
   */
  public static CasimirElement of(
      Chain chain, StructureConstants<Polynomial> constants, DualForm dual) {
    LieBracket<Polynomial> bracket = LieBracket.of(constants);
    List<SortedMap<Integer, Polynomial>> d = integral(chain, constants, dual);
    for (int x = 0; x < constants.dimension(); x++) {
      if (!isKilled(chain, bracket, d, x)) {
        throw new IllegalStateException(
            "self-check failed: the Casimir element does not commute with generator " + (x + 1));
      }
    }
    return new CasimirElement(dual.matrix());
  }

  /** A multiple of D in the basis y of the constants (y_i = scale_i e_i), without fractions. */
  private static List<SortedMap<Integer, Polynomial>> integral(
      Chain chain, StructureConstants<Polynomial> constants, DualForm dual) {
    int n = constants.dimension();
    List<List<RationalFunction>> m = new ArrayList<>();
    Polynomial common = chain.one();
    for (int i = 0; i < n; i++) {
      List<RationalFunction> row = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        Polynomial scale = constants.scale().get(i).times(constants.scale().get(j));
        RationalFunction f = dual.matrix().get(i).get(j);
        RationalFunction g = f.isZero() ? f : f.over(RationalFunction.of(scale));
        row.add(g);
        common = common.times(g.denominator().over(common.gcd(g.denominator())));
      }
      m.add(row);
    }
    List<SortedMap<Integer, Polynomial>> out = new ArrayList<>();
    for (List<RationalFunction> row : m) {
      SortedMap<Integer, Polynomial> sparse = new TreeMap<>();
      for (int j = 0; j < n; j++) {
        RationalFunction f = row.get(j);
        if (!f.isZero()) {
          sparse.put(j, f.numerator().times(common.over(f.denominator())));
        }
      }
      out.add(sparse);
    }
    return out;
  }

  /** Whether S + its transpose vanishes, S^aj the sum over i of C_xi^a D^ij. */
  private static boolean isKilled(
      Chain chain, LieBracket<Polynomial> bracket, List<SortedMap<Integer, Polynomial>> d, int x) {
    Vectors<Polynomial> vectors = new Vectors<>(chain);
    SortedMap<Integer, SortedMap<Integer, Polynomial>> sums = new TreeMap<>();
    for (int i = 0; i < d.size(); i++) {
      SortedMap<Integer, Polynomial> row = d.get(i);
      bracket
          .of(x, i)
          .forEach(
              (a, c) ->
                  row.forEach(
                      (j, v) ->
                          vectors.add(
                              sums.computeIfAbsent(Math.min(a, j), k -> new TreeMap<>()),
                              Math.max(a, j),
                              a.equals(j) ? c.times(v).plus(c.times(v)) : c.times(v))));
    }
    return sums.values().stream().allMatch(s -> s.values().stream().allMatch(chain::vanishes));
  }
}
