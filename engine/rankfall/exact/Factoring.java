package rankfall.exact;

import cc.redberry.rings.poly.PolynomialFactorDecomposition;
import cc.redberry.rings.poly.multivar.MultivariateFactorization;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Factorization.Factor;

/**
 * Irreducible factors over the rationals.
 *
 * <p>The library fails now and then on unlucky evaluation points; a failed call is tried again,
 * then with the variables in other orders. Every answer is multiplied back and compared.
 */
public final class Factoring {
  private static final int TRIES = 6;

  /** Longer polynomials are worth a search for repeated factors first. */
  private static final int LONG = 30;

  private static final Comparator<Factor> BY_SIZE =
      Comparator.comparing((Factor x) -> x.base().totalDegree())
          .thenComparing(x -> x.base().termCount())
          .thenComparing(x -> x.base().toString());

  private Factoring() {}

  /**
   * The factorization over the rationals.
   *
   * @param f not 0
   * @return unit times powers of primitive irreducible polynomials
   * @throws ArithmeticException if f is 0, or if every try failed
   */
  public static Factorization overRationals(Polynomial f) {
    if (f.isZero()) {
      throw new ArithmeticException("0 has no factorization");
    }
    if (f.isConstant()) {
      return new Factorization(BigFraction.of(f.constantValue()), List.of());
    }
    List<Factor> powers = new ArrayList<>();
    Polynomial rest = f;
    for (int x : f.support()) {
      Polynomial v = Polynomial.variable(f.variables(), x);
      int e = 0;
      for (; rest.coefficient(x, 0).isZero(); e++) {
        rest = rest.over(v);
      }
      if (e > 0) {
        powers.add(new Factor(v, e));
      }
    }
    Factorization others = rest.termCount() > LONG ? ofLong(rest) : directly(rest);
    powers.addAll(others.factors());
    powers.sort(BY_SIZE);
    return new Factorization(others.unit(), powers);
  }

  private static Factorization directly(Polynomial f) {
    if (f.isConstant()) {
      return new Factorization(BigFraction.of(f.constantValue()), List.of());
    }
    Throwable last = null;
    for (int k = 0; k < TRIES * Math.max(1, f.variables().count()); k++) {
      try {
        return checked(f, attempt(f, k / TRIES));
      } catch (NullPointerException
          | ArithmeticException
          | ArrayIndexOutOfBoundsException
          | AssertionError e) {
        last = e;
      }
    }
    throw new ArithmeticException("no factorization found of " + f + ": " + last);
  }

  /**
   * The product of the different irreducible factors of f.
   *
   * @param f not 0
   * @return primitive; 1 for constants
   */
  public static Polynomial squareFreePart(Polynomial f) {
    Polynomial p = f.primitive();
    if (p.isConstant()) {
      return Polynomial.one(f.variables());
    }
    int x = p.support().stream().min(Comparator.comparingInt(p::degree)).orElseThrow();
    Polynomial content =
        p.coefficientsIn(x).stream().reduce(Polynomial.zero(f.variables()), Polynomial::gcd);
    Polynomial rest = p.over(content);
    return squareFreePart(content)
        .times(rest.over(rest.gcd(rest.derivative(x))).primitive())
        .primitive();
  }

  private static Factorization ofLong(Polynomial f) {
    PolynomialRoot.Power power = PolynomialRoot.power(f.primitive());
    if (power.exponent() == 1) {
      return throughSquareFreePart(f);
    }
    return checked(
        f,
        ofLong(power.base()).factors().stream()
            .map(x -> new Factor(x.base(), x.multiplicity() * power.exponent()))
            .toList());
  }

  private static Factorization throughSquareFreePart(Polynomial f) {
    if (f.termCount() <= LONG) {
      return directly(f);
    }
    Polynomial part = squareFreePart(f);
    if (part.equals(f.primitive())) {
      return directly(f);
    }
    Polynomial rest = f;
    List<Factor> out = new ArrayList<>();
    for (Factor x : directly(part).factors()) {
      int multiplicity = 0;
      for (var q = rest.dividedBy(x.base()); q.isPresent(); q = rest.dividedBy(x.base())) {
        rest = q.get();
        multiplicity++;
      }
      out.add(new Factor(x.base(), multiplicity));
    }
    return checked(f, out);
  }

  private static List<Factor> attempt(Polynomial f, int rotation) {
    int n = Math.max(1, f.variables().count());
    int[] there = IntStream.range(0, n).map(i -> (i + rotation) % n).toArray();
    int[] back = IntStream.range(0, n).map(i -> (i - rotation % n + n) % n).toArray();
    MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> p = f.primitive().copy();
    PolynomialFactorDecomposition<MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger>> d =
        MultivariateFactorization.FactorInZ(rotation == 0 ? p : p.mapVariables(there));
    List<Factor> out = new ArrayList<>();
    for (int k = 0; k < d.size(); k++) {
      var g = d.get(k).clone();
      Polynomial base =
          new Polynomial(f.variables(), rotation == 0 ? g : g.mapVariables(back)).primitive();
      if (!base.isConstant()) {
        out.add(new Factor(base, d.getExponent(k)));
      }
    }
    return out;
  }

  private static Factorization checked(Polynomial f, List<Factor> factors) {
    Polynomial product = Polynomial.one(f.variables());
    for (Factor x : factors) {
      product = product.times(x.base().pow(x.multiplicity()));
    }
    Polynomial rest = f.over(product);
    if (!rest.isConstant()) {
      throw new ArithmeticException("factors do not multiply back to " + f);
    }
    return new Factorization(BigFraction.of(rest.constantValue()), factors);
  }

  /** The irreducible factors of f without their multiplicities. */
  public static List<Polynomial> irreducible(Polynomial f) {
    return overRationals(f).factors().stream().map(Factor::base).toList();
  }
}
