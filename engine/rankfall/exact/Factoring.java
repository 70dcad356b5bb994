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
 * <p>The library fails now and then on unlucky evaluation points (with an {@code AssertionError}
 * where assertions are on); a failed call is tried again, then with the variables in other orders.
 * Every answer is multiplied back and compared.
 */
public final class Factoring {
  private static final int TRIES = 6;

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
    Throwable last = null;
    List<Factor> variables = variablesIn(f);
    Polynomial rest = f.over(product(f.variables(), variables));
    for (int k = 0; k < TRIES * Math.max(1, f.variables().count()); k++) {
      try {
        List<Factor> factors = new ArrayList<>(variables);
        factors.addAll(attempt(rest, k / TRIES));
        return checked(f, factors);
      } catch (NullPointerException
          | ArithmeticException
          | ArrayIndexOutOfBoundsException
          | AssertionError e) {
        last = e;
      }
    }
    throw new ArithmeticException("no factorization found of " + f + ": " + last);
  }

  /** The variables that divide f: taken out first, as the library leaves a power of one whole. */
  private static List<Factor> variablesIn(Polynomial f) {
    List<Factor> out = new ArrayList<>();
    for (int v : f.support()) {
      int variable = v;
      int e = f.terms().stream().mapToInt(t -> t.exponents().get(variable)).min().orElse(0);
      if (e > 0) {
        out.add(new Factor(Polynomial.variable(f.variables(), v), e));
      }
    }
    return out;
  }

  private static List<Factor> attempt(Polynomial f, int rotation) {
    if (f.isConstant()) {
      return List.of();
    }
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
    Polynomial rest = f.over(product(f.variables(), factors));
    if (!rest.isConstant()) {
      throw new ArithmeticException("factors do not multiply back to " + f);
    }
    List<Factor> out = new ArrayList<>(factors);
    out.sort(
        Comparator.comparing((Factor x) -> x.base().totalDegree())
            .thenComparing(x -> x.base().termCount())
            .thenComparing(x -> x.base().toString()));
    return new Factorization(BigFraction.of(rest.constantValue()), out);
  }

  private static Polynomial product(Variables variables, List<Factor> factors) {
    Polynomial product = Polynomial.one(variables);
    for (Factor x : factors) {
      product = product.times(x.base().pow(x.multiplicity()));
    }
    return product;
  }

  /** The irreducible factors of f without their multiplicities. */
  public static List<Polynomial> irreducible(Polynomial f) {
    return overRationals(f).factors().stream().map(Factor::base).toList();
  }
}
