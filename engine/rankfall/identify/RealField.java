package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Chain;
import rankfall.exact.Factoring;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.exact.Variables;
import rankfall.lie.SignRule;

/**
 * A field of real algebraic numbers: polynomials on a chain, which name numbers, and their order.
 *
 * <p>A real number outside the field is told by a polynomial over the field of which it is a root
 * and by its order among the rationals: the norm of the polynomial has rational coefficients, and
 * comparison with rationals between its real roots leaves one of them.
 *
 * @param chain polynomials asked about hold only variables that have a rule
 * @param signs the order
 */
record RealField(Chain chain, SignRule<Polynomial> signs) {

  /** A real number, told by its order among the rationals. */
  @FunctionalInterface
  interface Cut {
    /** The sign of the number minus a rational. */
    int compare(BigFraction q);
  }

  /**
   * The field of a real algebra.
   *
   * @throws java.util.NoSuchElementException if it is complex
   */
  static RealField of(ExactAlgebra g) {
    return new RealField(g.chain(), g.signs().orElseThrow());
  }

  /** The sign of {@code a/b - q}. */
  int compare(Polynomial a, Polynomial b, BigFraction q) {
    Polynomial difference =
        a.times(Rationals.denominator(q)).minus(b.times(Rationals.numerator(q)));
    return signs.signum(difference) * signs.signum(b);
  }

  /**
   * A number of the field.
   *
   * @param a any
   * @param b not 0
   */
  AlgebraicNumber quotient(Polynomial a, Polynomial b) {
    return root(List.of(a.negate(), b), q -> compare(a, b, q));
  }

  /**
   * The positive square root of a positive number of the field.
   *
   * @param a of the same sign as b
   * @param b not 0
   */
  AlgebraicNumber squareRoot(Polynomial a, Polynomial b) {
    return root(List.of(a.negate(), chain.zero(), b), q -> compareRoot(a, b, q));
  }

  /** The sign of {@code sqrt(a/b) - q}. */
  int compareRoot(Polynomial a, Polynomial b, BigFraction q) {
    return q.signum() < 0 ? 1 : compare(a, b, q.multiply(q));
  }

  /**
   * A real root of a polynomial.
   *
   * @param coefficients constant one first, not all 0
   * @param cut tells which root; asked about rationals that are no root of the norm, unless the
   *     number is rational
   */
  AlgebraicNumber root(List<Polynomial> coefficients, Cut cut) {
    Variables ring = extended(chain, 1);
    int y = ring.count() - 1;
    List<Polynomial> reduced = chain.reduced(coefficients);
    Polynomial p = Polynomial.zero(ring);
    for (int k = 0; k < reduced.size(); k++) {
      Polynomial c = NumberFieldTower.inRing(reduced.get(k), ring);
      p = p.plus(c.times(Polynomial.variable(ring, y).pow(k)));
    }
    return chosen(AlgebraicNumber.rootsOf(norm(p)), cut);
  }

  /** The variables of the chain and a few more, which come last. */
  static Variables extended(Chain chain, int more) {
    List<String> names = new ArrayList<>(chain.variables().names());
    for (int k = 0; k < more; k++) {
      String name = "y";
      while (names.contains(name)) {
        name = name + "_";
      }
      names.add(name);
    }
    return new Variables(names);
  }

  private Polynomial norm(Polynomial p) {
    Polynomial out = Factoring.squareFreePart(p);
    List<Chain.Rule> tower = chain.tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      int v = tower.get(k).variable();
      if (out.contains(v)) {
        Polynomial rule = NumberFieldTower.inRing(tower.get(k).equation(), p.variables());
        out = rule.resultant(out, v);
      }
    }
    return out.primitive();
  }

  private static AlgebraicNumber chosen(List<AlgebraicNumber> roots, Cut cut) {
    for (int k = 0; k + 1 < roots.size(); k++) {
      if (cut.compare(AlgebraicNumber.between(roots.get(k), roots.get(k + 1))) < 0) {
        return roots.get(k);
      }
    }
    if (roots.isEmpty()) {
      throw new IllegalArgumentException("no real root");
    }
    return roots.get(roots.size() - 1);
  }
}
