package rankfall.exact;

import cc.redberry.rings.Rational;
import cc.redberry.rings.Rings;
import cc.redberry.rings.bigint.BigInteger;
import cc.redberry.rings.poly.MultipleFieldExtension;
import cc.redberry.rings.poly.PolynomialFactorDecomposition;
import cc.redberry.rings.poly.multivar.Monomial;
import cc.redberry.rings.poly.multivar.MonomialOrder;
import cc.redberry.rings.poly.multivar.MultivariateFactorization;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import cc.redberry.rings.poly.univar.UnivariatePolynomial;
import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Factorization.Factor;

/**
 * Irreducible factors over a field of algebraic numbers that is given by a tower of rules.
 *
 * <p>The library works over one primitive element; coefficients are carried there and back.
 */
final class NumberFieldFactoring {
  private static final int TRIES = 6;

  private final Variables variables;
  private final List<Chain.Rule> rules;
  private final MultipleFieldExtension<
          Monomial<Rational<BigInteger>>,
          MultivariatePolynomial<Rational<BigInteger>>,
          UnivariatePolynomial<Rational<BigInteger>>>
      field;

  /**
   * Prepares the field.
   *
   * @param variables the ring
   * @param rules a tower over the rationals, from the bottom, at least one
   */
  NumberFieldFactoring(Variables variables, List<Chain.Rule> rules) {
    this.variables = variables;
    this.rules = List.copyOf(rules);
    MultipleFieldExtension<
            Monomial<Rational<BigInteger>>,
            MultivariatePolynomial<Rational<BigInteger>>,
            UnivariatePolynomial<Rational<BigInteger>>>
        e = MultipleFieldExtension.mkMultipleExtension(bottom(rules.get(0)));
    for (int k = 1; k < rules.size(); k++) {
      e = e.joinAlgebraicElement(storey(rules.get(k), e, k));
    }
    this.field = e;
  }

  private static UnivariatePolynomial<Rational<BigInteger>> bottom(Chain.Rule r) {
    List<Rational<BigInteger>> c = new ArrayList<>();
    for (Polynomial p : r.equation().coefficientsIn(r.variable())) {
      c.add(new Rational<>(Rings.Z, Polynomial.ring(p.constantValue())));
    }
    return univariate(c);
  }

  @SuppressWarnings("unchecked")
  private static UnivariatePolynomial<Rational<BigInteger>> univariate(
      List<Rational<BigInteger>> c) {
    return UnivariatePolynomial.create(Rings.Q, c.toArray(new Rational[0])).monic();
  }

  @SuppressWarnings("unchecked")
  private UnivariatePolynomial<MultivariatePolynomial<Rational<BigInteger>>> storey(
      Chain.Rule r,
      MultipleFieldExtension<
              Monomial<Rational<BigInteger>>,
              MultivariatePolynomial<Rational<BigInteger>>,
              UnivariatePolynomial<Rational<BigInteger>>>
          below,
      int height) {
    List<MultivariatePolynomial<Rational<BigInteger>>> c = new ArrayList<>();
    for (Polynomial p : r.equation().coefficientsIn(r.variable())) {
      c.add(element(p, height));
    }
    return UnivariatePolynomial.create(below, c.toArray(new MultivariatePolynomial[0])).monic();
  }

  /** A polynomial in the first {@code height} generators. */
  private MultivariatePolynomial<Rational<BigInteger>> element(Polynomial p, int height) {
    MultivariatePolynomial<Rational<BigInteger>> out =
        MultivariatePolynomial.zero(height, Rings.Q, MonomialOrder.DEFAULT);
    for (Term t : p.terms()) {
      int[] e = new int[height];
      for (int k = 0; k < height; k++) {
        e[k] = t.exponents().get(rules.get(k).variable());
      }
      out.add(new Monomial<>(e, new Rational<>(Rings.Z, Polynomial.ring(t.coefficient()))));
    }
    return out;
  }

  /**
   * The irreducible factors that are not constants of the field, with multiplicities.
   *
   * @param f not 0 in the field, reduced
   * @return each with its leading coefficient (graded-lexicographic in the other variables) made
   *     rational and its content removed
   */
  List<Factor> factors(Polynomial f) {
    var lifted = lifted(f);
    if (lifted.isConstant()) {
      return List.of();
    }
    Throwable last = null;
    for (int k = 0; k < TRIES; k++) {
      try {
        return checked(lifted, MultivariateFactorization.FactorInNumberField(lifted.clone()));
      } catch (NullPointerException
          | ArithmeticException
          | ArrayIndexOutOfBoundsException
          | AssertionError e) {
        last = e;
      }
    }
    throw new ArithmeticException("no factorization found of " + f + ": " + last);
  }

  private List<Factor> checked(
      MultivariatePolynomial<UnivariatePolynomial<Rational<BigInteger>>> f,
      PolynomialFactorDecomposition<
              MultivariatePolynomial<UnivariatePolynomial<Rational<BigInteger>>>>
          d) {
    if (!d.multiply().equals(f)) {
      throw new ArithmeticException("factors do not multiply back");
    }
    List<Factor> out = new ArrayList<>();
    for (int k = 0; k < d.size(); k++) {
      if (!d.get(k).isConstant()) {
        addPowers(out, lowered(d.get(k).clone().monic()), d.getExponent(k));
      }
    }
    return out;
  }

  /** The library leaves some powers as they are, a^2 and (a - 2*b)^2 over b^2 + 1 among them. */
  private void addPowers(List<Factor> out, Polynomial base, int exponent) {
    if (base.termCount() == 1) {
      for (int v : base.support()) {
        out.add(new Factor(Polynomial.variable(base.variables(), v), exponent * base.degree(v)));
      }
      return;
    }
    List<Integer> numbers = rules.stream().map(Chain.Rule::variable).toList();
    int x = base.support().stream().filter(v -> !numbers.contains(v)).findFirst().orElseThrow();
    Chain chain = new Chain(variables, rules);
    Polynomial repeated = ChainGcd.of(chain, base, base.derivative(x), x);
    if (!repeated.contains(x)) {
      out.add(new Factor(base, exponent));
      return;
    }
    for (Factor f : factors(ChainGcd.quotient(chain, base, repeated, x))) {
      out.add(new Factor(f.base(), exponent * multiplicity(chain, base, f.base(), x)));
    }
  }

  private static int multiplicity(Chain chain, Polynomial base, Polynomial factor, int x) {
    Polynomial rest = base;
    int out = 0;
    while (rest.contains(x) && ChainGcd.of(chain, rest, factor, x).degree(x) == factor.degree(x)) {
      rest = ChainGcd.quotient(chain, rest, factor, x);
      out++;
    }
    return out;
  }

  /** f with coefficients in the simple extension. */
  private MultivariatePolynomial<UnivariatePolynomial<Rational<BigInteger>>> lifted(Polynomial f) {
    var out =
        MultivariatePolynomial.zero(
            Math.max(1, variables.count()), field.getSimpleExtension(), MonomialOrder.GRLEX);
    for (Term t : f.terms()) {
      int[] e = t.exponents().stream().mapToInt(Integer::intValue).toArray();
      int[] inner = new int[rules.size()];
      for (int k = 0; k < rules.size(); k++) {
        inner[k] = e[rules.get(k).variable()];
        e[rules.get(k).variable()] = 0;
      }
      MultivariatePolynomial<Rational<BigInteger>> c =
          MultivariatePolynomial.zero(rules.size(), Rings.Q, MonomialOrder.DEFAULT);
      c.add(new Monomial<>(inner, new Rational<>(Rings.Z, Polynomial.ring(t.coefficient()))));
      out.add(new Monomial<>(e, field.inverse(c)));
    }
    return out;
  }

  private Polynomial lowered(MultivariatePolynomial<UnivariatePolynomial<Rational<BigInteger>>> f) {
    RationalFunction sum = RationalFunction.of(Polynomial.zero(variables));
    for (var m : f) {
      for (var c : field.image(m.coefficient)) {
        List<Integer> e = new ArrayList<>();
        for (int v = 0; v < variables.count(); v++) {
          e.add(m.exponents[v]);
        }
        for (int k = 0; k < rules.size(); k++) {
          e.set(rules.get(k).variable(), c.exponents[k]);
        }
        Rational<BigInteger> q = c.coefficient;
        Polynomial term =
            Polynomial.of(variables, List.of(new Term(Polynomial.java(q.numerator()), e)));
        sum =
            sum.plus(
                RationalFunction.of(
                    term, Polynomial.constant(variables, Polynomial.java(q.denominator()))));
      }
    }
    return sum.numerator().primitive();
  }
}
