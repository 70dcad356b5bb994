package rankfall.exact;

import java.util.List;

/**
 * Quotients of polynomials at the general point of a chain, written in one way.
 *
 * <p>The tower of a chain is a field over the fractions of the free variables, so every quotient
 * has a form whose denominator holds free variables only. It is found by Euclid's algorithm in one
 * tower variable after the other, from the top (common practice, no source).
 */
public final class ChainFractions {
  private ChainFractions() {}

  /**
   * The quotient in its canonical form, for example {@code sqrt(2)/2} for {@code 1/sqrt(2)}.
   *
   * @param chain the set
   * @param numerator above
   * @param denominator below; must not vanish on the set
   * @return equal to the quotient on the set; the denominator holds free variables only, the
   *     numerator is reduced by every rule
   * @throws ArithmeticException if the denominator vanishes on the set
   */
  public static RationalFunction canonical(
      Chain chain, Polynomial numerator, Polynomial denominator) {
    List<Polynomial> f = chain.reduced(List.of(numerator, denominator));
    if (f.get(1).isZero()) {
      throw new ArithmeticException("the denominator " + denominator + " vanishes on the set");
    }
    RationalFunction out = RationalFunction.of(f.get(0), f.get(1));
    List<Chain.Rule> tower = chain.tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      if (out.denominator().contains(tower.get(k).variable())) {
        out = freed(chain, tower.get(k), out);
      }
    }
    return out;
  }

  /**
   * The quotient in its canonical form.
   *
   * @param chain the set
   * @param f a quotient whose denominator does not vanish on the set
   * @return see {@link #canonical(Chain, Polynomial, Polynomial)}
   */
  public static RationalFunction canonical(Chain chain, RationalFunction f) {
    return canonical(chain, f.numerator(), f.denominator());
  }

  /** The same quotient, its denominator free of the variable of the rule (the highest in it). */
  private static RationalFunction freed(Chain chain, Chain.Rule rule, RationalFunction f) {
    int v = rule.variable();
    Pair upper = new Pair(rule.equation(), chain.zero());
    Pair lower = new Pair(f.denominator(), chain.one());
    while (lower.value.contains(v)) {
      Pair next = remainder(chain, upper, lower, v);
      if (next.value.isZero()) {
        throw new ArithmeticException("the rule " + rule.equation() + " is not irreducible");
      }
      upper = lower;
      lower = next;
    }
    List<Polynomial> out = chain.reduced(List.of(f.numerator().times(lower.cofactor), lower.value));
    return RationalFunction.of(out.get(0), out.get(1));
  }

  /** {@code value = cofactor * (given polynomial)} on the set. */
  private record Pair(Polynomial value, Polynomial cofactor) {}

  /** Pseudo-remainder in one variable, with cofactors, freed of a common factor. */
  private static Pair remainder(Chain chain, Pair a, Pair b, int v) {
    int degree = b.value.degree(v);
    Polynomial lead = b.value.coefficient(v, degree);
    Polynomial rest = a.value;
    Polynomial cofactor = a.cofactor;
    while (!rest.isZero() && rest.degree(v) >= degree) {
      Polynomial q = shifted(rest, v, degree);
      rest = rest.times(lead).minus(q.times(b.value));
      cofactor = cofactor.times(lead).minus(q.times(b.cofactor));
    }
    List<Polynomial> out = chain.normal(List.of(rest, cofactor)).entries();
    return new Pair(out.get(0), out.get(1));
  }

  /** The leading coefficient in a variable, times the power by which the degree is too high. */
  private static Polynomial shifted(Polynomial p, int v, int degree) {
    int e = p.degree(v);
    return p.coefficient(v, e).times(Polynomial.variable(p.variables(), v).pow(e - degree));
  }

  private static Polynomial pseudoRemainder(Polynomial a, Polynomial b, int v) {
    int degree = b.degree(v);
    Polynomial lead = b.coefficient(v, degree);
    Polynomial rest = a;
    while (!rest.isZero() && rest.degree(v) >= degree) {
      rest = rest.times(lead).minus(shifted(rest, v, degree).times(b));
    }
    return rest;
  }

  /** Reduced, its coefficients in a variable freed of a common factor. */
  private static Polynomial primitive(Chain chain, Polynomial p, int v) {
    List<Polynomial> c = chain.normal(p.coefficientsIn(v)).entries();
    Polynomial out = chain.zero();
    for (int k = 0; k < c.size(); k++) {
      out = out.plus(c.get(k).times(Polynomial.variable(p.variables(), v).pow(k)));
    }
    return out;
  }

  /**
   * A greatest common divisor in one variable, with coefficients in the field of the set.
   *
   * @param chain the set; no rule for the variable
   * @param a not 0 on the set
   * @param b not 0 on the set
   * @param variable the position of the variable
   * @return a common divisor of the greatest degree; its leading coefficient holds free variables
   *     of the chain only, and no integer divides it
   */
  public static Polynomial gcd(Chain chain, Polynomial a, Polynomial b, int variable) {
    Polynomial upper = chain.reduced(a);
    Polynomial lower = chain.reduced(b);
    while (!lower.isZero()) {
      Polynomial next =
          lower.contains(variable)
              ? primitive(chain, pseudoRemainder(upper, lower, variable), variable)
              : chain.zero();
      upper = lower;
      lower = next;
    }
    Polynomial lead = upper.coefficient(variable, upper.degree(variable));
    RationalFunction inverse = canonical(chain, chain.one(), lead);
    List<Polynomial> out =
        chain.reduced(List.of(upper.times(inverse.numerator()), inverse.denominator()));
    return RationalFunction.of(out.get(0), out.get(1)).numerator().primitive();
  }
}
