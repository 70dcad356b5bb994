package rankfall.exact;

import java.util.List;

/** Greatest common divisors of polynomials in one variable over the field of a chain. */
final class ChainGcd {
  private ChainGcd() {}

  /**
   * The greatest common divisor by Euclid's algorithm with pseudo-remainders.
   *
   * @param chain an irreducible chain in which x is free
   * @param a in normal form
   * @param b in normal form
   * @param x the main variable; the others count as elements of the field
   * @return some non-zero multiple by an element of the field; free of x if a and b are coprime
   */
  static Polynomial of(Chain chain, Polynomial a, Polynomial b, int x) {
    Polynomial f = primitive(chain, a, x);
    Polynomial g = primitive(chain, b, x);
    while (!g.isZero()) {
      if (!g.contains(x)) {
        return chain.one();
      }
      Polynomial rest = f;
      while (!rest.isZero() && rest.degree(x) >= g.degree(x)) {
        int d = rest.degree(x) - g.degree(x);
        Polynomial shift = Polynomial.variable(chain.variables(), x).pow(d);
        rest =
            primitive(
                chain,
                rest.times(g.coefficient(x, g.degree(x)))
                    .minus(g.times(rest.coefficient(x, rest.degree(x))).times(shift)),
                x);
      }
      f = g;
      g = rest;
    }
    return f;
  }

  /**
   * The quotient of a division that is exact over the field of the chain.
   *
   * @return some non-zero multiple of it by an element of the field
   */
  static Polynomial quotient(Chain chain, Polynomial a, Polynomial b, int x) {
    Polynomial rest = a;
    Polynomial out = chain.zero();
    Polynomial lead = b.coefficient(x, b.degree(x));
    while (!rest.isZero() && rest.degree(x) >= b.degree(x)) {
      Polynomial c = rest.coefficient(x, rest.degree(x));
      Polynomial shift =
          Polynomial.variable(chain.variables(), x).pow(rest.degree(x) - b.degree(x));
      List<Polynomial> next =
          chain.reduced(
              List.of(
                  rest.times(lead).minus(b.times(c).times(shift)),
                  out.times(lead).plus(c.times(shift))));
      rest = next.get(0);
      out = next.get(1);
    }
    return primitive(chain, out, x);
  }

  /** A multiple by an element of the field, reduced and without a common factor free of x. */
  private static Polynomial primitive(Chain chain, Polynomial p, int x) {
    Polynomial r = chain.reduced(p);
    if (r.isZero()) {
      return r;
    }
    Polynomial content = r.coefficientsIn(x).stream().reduce(chain.zero(), Polynomial::gcd);
    return r.over(content);
  }
}
