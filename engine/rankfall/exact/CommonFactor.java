package rankfall.exact;

import cc.redberry.rings.poly.univar.UnivariateGCD;
import cc.redberry.rings.poly.univar.UnivariatePolynomialZp64;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * A common factor of several polynomials: mostly the greatest one, found or ruled out cheaply.
 *
 * <p>Variables and integers are taken out by inspection. What is left is looked at modulo a prime
 * with all variables but one set to numbers: if these images have no common factor for any
 * variable, none is searched. A factor can be missed so, which costs nothing but longer rows.
 */
final class CommonFactor {
  private static final long PRIME = 2147483629L;

  private CommonFactor() {}

  /**
   * A common factor.
   *
   * @param polynomials none 0, at least one
   * @return divides all of them; leading coefficient positive
   */
  static Polynomial of(List<Polynomial> polynomials) {
    return of(polynomials, List.of());
  }

  /**
   * A common factor, some being expected: a division is cheaper than a search.
   *
   * @param polynomials none 0, at least one
   * @param expected factors that are likely, primitive; the answer is the same without them
   * @return divides all of the polynomials; leading coefficient positive
   */
  static Polynomial of(List<Polynomial> polynomials, List<Polynomial> expected) {
    Polynomial monomial = monomial(polynomials);
    List<Polynomial> rest = new ArrayList<>();
    for (Polynomial p : polynomials) {
      Polynomial q = p.over(monomial);
      if (q.isConstant()) {
        return monomial;
      }
      rest.add(q);
    }
    rest.sort(Comparator.comparingInt(Polynomial::termCount));
    if (rest.get(0).termCount() == 1 || !mayShareFactor(rest)) {
      return monomial;
    }
    Polynomial taken = monomial;
    for (Polynomial e : expected) {
      for (var q = quotients(rest, e); q.isPresent(); q = quotients(rest, e)) {
        rest = q.get();
        taken = taken.times(e);
        if (rest.stream().anyMatch(p -> p.termCount() == 1) || !mayShareFactor(rest)) {
          return taken;
        }
      }
    }
    return taken.times(searched(rest));
  }

  /** All polynomials over one; empty if it does not divide them all. */
  private static Optional<List<Polynomial>> quotients(List<Polynomial> all, Polynomial by) {
    List<Integer> support = by.support();
    if (by.termCount() == 1 || all.stream().anyMatch(p -> !p.support().containsAll(support))) {
      return Optional.empty();
    }
    List<Polynomial> out = new ArrayList<>();
    for (Polynomial p : all) {
      Optional<Polynomial> q = p.dividedBy(by);
      if (q.isEmpty()) {
        return Optional.empty();
      }
      out.add(q.get());
    }
    return Optional.of(out);
  }

  private static Polynomial searched(List<Polynomial> rest) {
    Polynomial g = rest.get(0);
    for (Polynomial p : rest) {
      if (p.dividedBy(g).isEmpty()) {
        g = g.gcd(p);
      }
      if (g.isConstant()) {
        return Polynomial.one(g.variables());
      }
    }
    return g;
  }

  private static Polynomial monomial(List<Polynomial> polynomials) {
    BigInteger content = BigInteger.ZERO;
    int[] least = null;
    for (Polynomial p : polynomials) {
      content = content.gcd(p.content());
      for (Term t : p.terms()) {
        List<Integer> e = t.exponents();
        if (least == null) {
          least = e.stream().mapToInt(Integer::intValue).toArray();
        }
        for (int v = 0; v < least.length; v++) {
          least[v] = Math.min(least[v], e.get(v));
        }
      }
    }
    List<Integer> exponents = new ArrayList<>();
    for (int e : least) {
      exponents.add(e);
    }
    return Polynomial.of(polynomials.get(0).variables(), List.of(new Term(content, exponents)));
  }

  private static boolean mayShareFactor(List<Polynomial> polynomials) {
    List<Integer> shared = new ArrayList<>(polynomials.get(0).support());
    polynomials.forEach(p -> shared.retainAll(p.support()));
    return shared.stream().anyMatch(x -> imagesShareFactor(polynomials, x));
  }

  private static boolean imagesShareFactor(List<Polynomial> polynomials, int x) {
    UnivariatePolynomialZp64 g = image(polynomials.get(0), x);
    for (Polynomial p : polynomials.subList(1, polynomials.size())) {
      if (g.isConstant()) {
        break;
      }
      g = UnivariateGCD.PolynomialGCD(g, image(p, x));
    }
    return !g.isConstant() || g.isZero();
  }

  private static UnivariatePolynomialZp64 image(Polynomial p, int x) {
    long[] coefficients = new long[p.degree(x) + 1];
    for (Term t : p.terms()) {
      long c = t.coefficient().mod(BigInteger.valueOf(PRIME)).longValue();
      for (int v = 0; v < t.exponents().size(); v++) {
        if (v != x) {
          for (int e = t.exponents().get(v); e > 0; e--) {
            c = c * (1009L * v + 12347L) % PRIME;
          }
        }
      }
      int at = t.exponents().get(x);
      coefficients[at] = (coefficients[at] + c) % PRIME;
    }
    return UnivariatePolynomialZp64.create(PRIME, coefficients);
  }
}
