package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain.Rule;

/**
 * The real values that a rule allows above a point of a tower.
 *
 * @param point the point
 * @param rule its equation holds its variable and variables with values at the point, and is
 *     irreducible, or without multiple roots, there
 */
record TowerRoots(TowerPoint point, Rule rule) {
  private static final int STEP = 32;

  /** Ascending. */
  List<AlgebraicNumber> all() {
    Polynomial norm = rule.equation().primitive();
    List<Rule> tower = point.chain().tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      Rule below = tower.get(k);
      if (below.variable() != rule.variable() && norm.contains(below.variable())) {
        norm = norm.resultant(below.equation(), below.variable());
        norm = withoutContent(norm, rule.variable());
      }
    }
    List<AlgebraicNumber> candidates = AlgebraicNumber.rootsOf(norm);
    RealRoots isolated = RealRoots.of(norm);
    List<AlgebraicNumber> out = new ArrayList<>();
    for (int k = 0; k < candidates.size(); k++) {
      AlgebraicNumber a = candidates.get(k);
      boolean root =
          a.isRational()
              ? point.sign(specialised(a.rational().orElseThrow())) == 0
              : changesSign(between(norm, isolated, k));
      if (root) {
        out.add(a);
      }
    }
    return out;
  }

  /** An interval that isolates an irrational root; its ends are no roots. */
  private static Interval between(Polynomial norm, RealRoots isolated, int k) {
    Univariate f = Univariate.of(norm);
    BigFraction width = BigFraction.ONE;
    while (true) {
      Interval i = isolated.refined(k, width);
      if (f.signAt(i.lower()) != 0 && f.signAt(i.upper()) != 0) {
        return i;
      }
      width = width.divide(STEP);
    }
  }

  private boolean changesSign(Interval i) {
    return point.sign(specialised(i.lower())) * point.sign(specialised(i.upper())) < 0;
  }

  /** Free of factors in which the variable does not occur; they vanish at no point of the tower. */
  private static Polynomial withoutContent(Polynomial p, int variable) {
    Polynomial g = Polynomial.zero(p.variables());
    for (Polynomial c : p.coefficientsIn(variable)) {
      g = g.gcd(c);
    }
    return p.over(g);
  }

  /** The equation times a positive integer, with a number put in place of the variable. */
  private Polynomial specialised(BigFraction value) {
    Variables v = rule.equation().variables();
    List<Polynomial> c = rule.equation().coefficientsIn(rule.variable());
    Polynomial sum = Polynomial.zero(v);
    BigInteger n = Rationals.numerator(value);
    BigInteger d = Rationals.denominator(value);
    for (int k = 0; k < c.size(); k++) {
      sum = sum.plus(c.get(k).times(n.pow(k).multiply(d.pow(c.size() - 1 - k))));
    }
    return sum;
  }
}
