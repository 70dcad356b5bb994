package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/** A polynomial with integer coefficients in one nameless variable, not 0; immutable. */
final class Univariate {
  private static final Variables X = new Variables(List.of("x"));
  private final BigInteger[] c;

  private Univariate(BigInteger[] owned) {
    this.c = owned;
  }

  /** From coefficients, the constant one first; zeros at the end are dropped. */
  static Univariate of(List<BigInteger> coefficients) {
    int n = coefficients.size();
    while (n > 0 && coefficients.get(n - 1).signum() == 0) {
      n--;
    }
    if (n == 0) {
      throw new ArithmeticException("the polynomial 0 has no isolated roots");
    }
    return new Univariate(coefficients.subList(0, n).toArray(new BigInteger[0]));
  }

  /** From a polynomial in which at most one variable occurs. */
  static Univariate of(Polynomial p) {
    List<Integer> support = p.support();
    if (support.size() > 1) {
      throw new IllegalArgumentException("more than one variable occurs in " + p);
    }
    if (support.isEmpty()) {
      return of(List.of(p.constantValue()));
    }
    int v = support.get(0);
    BigInteger[] out = new BigInteger[p.degree(v) + 1];
    Arrays.fill(out, BigInteger.ZERO);
    for (Term t : p.terms()) {
      out[t.exponents().get(v)] = t.coefficient();
    }
    return new Univariate(out);
  }

  int degree() {
    return c.length - 1;
  }

  BigInteger coefficient(int k) {
    return c[k];
  }

  List<BigInteger> coefficients() {
    return List.of(c);
  }

  /** As a polynomial in x. */
  Polynomial polynomial() {
    List<Term> terms = new ArrayList<>();
    for (int k = 0; k < c.length; k++) {
      if (c[k].signum() != 0) {
        terms.add(new Term(c[k], List.of(k)));
      }
    }
    return Polynomial.of(X, terms);
  }

  /** Primitive, leading coefficient positive, every root simple. */
  Univariate squareFree() {
    if (degree() == 0) {
      return of(List.of(BigInteger.ONE));
    }
    Polynomial p = polynomial().primitive();
    return of(p.over(p.gcd(p.derivative(0)).primitive()));
  }

  /** The greatest common divisor, primitive. */
  Univariate gcd(Univariate q) {
    return of(polynomial().primitive().gcd(q.polynomial().primitive()).primitive());
  }

  /** {@code f(a - x)} times a positive integer. */
  Univariate mirrored(BigFraction a) {
    Polynomial at =
        Polynomial.of(X, List.of(new Term(Rationals.denominator(a).negate(), List.of(1))));
    at = at.plus(Polynomial.constant(X, Rationals.numerator(a)));
    Polynomial sum = Polynomial.zero(X);
    for (int k = 0; k < c.length; k++) {
      sum = sum.plus(at.pow(k).times(c[k].multiply(Rationals.denominator(a).pow(degree() - k))));
    }
    return of(sum);
  }

  Univariate derivative() {
    return of(polynomial().derivative(0));
  }

  /** The sign of the value at a rational number, by Horner's rule on integers. */
  int signAt(BigFraction at) {
    BigInteger n = Rationals.numerator(at);
    BigInteger d = Rationals.denominator(at);
    BigInteger sum = BigInteger.ZERO;
    BigInteger power = BigInteger.ONE;
    for (int k = degree(); k >= 0; k--) {
      sum = sum.multiply(n).add(c[k].multiply(power));
      power = power.multiply(d);
    }
    return sum.signum();
  }

  /** An enclosure of the values on an interval. */
  Interval on(Interval x) {
    Interval sum = Interval.of(BigFraction.ZERO);
    for (int k = degree(); k >= 0; k--) {
      sum = sum.times(x).plus(Interval.of(BigFraction.of(c[k])));
    }
    return sum;
  }

  /** Coefficients of {@code f(-x)}. */
  List<BigInteger> reflected() {
    List<BigInteger> out = new ArrayList<>();
    for (int k = 0; k < c.length; k++) {
      out.add(k % 2 == 0 ? c[k] : c[k].negate());
    }
    return Collections.unmodifiableList(out);
  }

  @Override
  public boolean equals(Object o) {
    return o instanceof Univariate q && Arrays.equals(c, q.c);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(c);
  }

  @Override
  public String toString() {
    return polynomial().toString();
  }
}
