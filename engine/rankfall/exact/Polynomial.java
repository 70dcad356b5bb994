package rankfall.exact;

import cc.redberry.rings.Rings;
import cc.redberry.rings.poly.multivar.Monomial;
import cc.redberry.rings.poly.multivar.MonomialOrder;
import cc.redberry.rings.poly.multivar.MultivariateDivision;
import cc.redberry.rings.poly.multivar.MultivariateGCD;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A polynomial with integer coefficients in the variables of one ring; immutable, equality is
 * mathematical equality.
 *
 * <p>Terms are ordered by descending graded-lexicographic order. Operations between polynomials of
 * different rings are refused.
 */
public final class Polynomial {
  private final Variables variables;
  private final MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> p;

  Polynomial(
      Variables variables, MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> owned) {
    this.variables = variables;
    this.p = owned;
  }

  /** The polynomial 0 of a ring. */
  public static Polynomial zero(Variables variables) {
    return new Polynomial(
        variables,
        MultivariatePolynomial.zero(Math.max(1, variables.count()), Rings.Z, MonomialOrder.GRLEX));
  }

  /** The polynomial 1 of a ring. */
  public static Polynomial one(Variables variables) {
    return constant(variables, BigInteger.ONE);
  }

  /** A constant of a ring. */
  public static Polynomial constant(Variables variables, BigInteger value) {
    Polynomial zero = zero(variables);
    return new Polynomial(variables, zero.p.createConstant(ring(value)));
  }

  /** A constant of a ring. */
  public static Polynomial constant(Variables variables, long value) {
    return constant(variables, BigInteger.valueOf(value));
  }

  /** The variable with the given position, from 0. */
  public static Polynomial variable(Variables variables, int index) {
    if (index < 0 || index >= variables.count()) {
      throw new IndexOutOfBoundsException("no variable " + index + " in " + variables.names());
    }
    return new Polynomial(
        variables,
        zero(variables)
            .p
            .createLinear(
                index,
                cc.redberry.rings.bigint.BigInteger.ZERO,
                cc.redberry.rings.bigint.BigInteger.ONE));
  }

  /** The variable with the given name. */
  public static Polynomial variable(Variables variables, String name) {
    return variable(variables, variables.index(name));
  }

  /** The sum of the given terms. */
  public static Polynomial of(Variables variables, List<Term> terms) {
    MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> sum = zero(variables).p;
    for (Term t : terms) {
      int[] e = new int[Math.max(1, variables.count())];
      for (int k = 0; k < t.exponents().size(); k++) {
        e[k] = t.exponents().get(k);
      }
      sum.add(new Monomial<>(e, ring(t.coefficient())));
    }
    return new Polynomial(variables, sum);
  }

  static cc.redberry.rings.bigint.BigInteger ring(BigInteger value) {
    return new cc.redberry.rings.bigint.BigInteger(value.toByteArray());
  }

  static BigInteger java(cc.redberry.rings.bigint.BigInteger value) {
    return new BigInteger(value.toByteArray());
  }

  MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> copy() {
    return p.clone();
  }

  /** The ring's variables. */
  public Variables variables() {
    return variables;
  }

  private void sameRing(Polynomial q) {
    if (variables != q.variables && !variables.equals(q.variables)) {
      throw new IllegalArgumentException(
          "different rings: " + variables.names() + " and " + q.variables.names());
    }
  }

  private Polynomial with(MultivariatePolynomial<cc.redberry.rings.bigint.BigInteger> owned) {
    return new Polynomial(variables, owned);
  }

  /** The sum. */
  public Polynomial plus(Polynomial q) {
    sameRing(q);
    return q.isZero() ? this : isZero() ? q : with(p.clone().add(q.p));
  }

  /** The difference. */
  public Polynomial minus(Polynomial q) {
    sameRing(q);
    return q.isZero() ? this : with(p.clone().subtract(q.p));
  }

  /** The product. */
  public Polynomial times(Polynomial q) {
    sameRing(q);
    if (isZero() || q.isOne()) {
      return this;
    }
    return q.isZero() || isOne() ? q : with(p.clone().multiply(q.p));
  }

  /** The product with an integer. */
  public Polynomial times(BigInteger k) {
    return with(p.clone().multiply(ring(k)));
  }

  /** The negative. */
  public Polynomial negate() {
    return with(p.clone().negate());
  }

  /**
   * A power.
   *
   * @param exponent 0 or more
   */
  public Polynomial pow(int exponent) {
    if (exponent < 0) {
      throw new IllegalArgumentException("negative exponent " + exponent);
    }
    Polynomial result = one(variables);
    Polynomial square = this;
    for (int e = exponent; e > 0; e >>= 1) {
      if ((e & 1) == 1) {
        result = result.times(square);
      }
      if (e > 1) {
        square = square.times(square);
      }
    }
    return result;
  }

  /** Whether this is 0. */
  public boolean isZero() {
    return p.isZero();
  }

  /** Whether this is 1. */
  public boolean isOne() {
    return p.isOne();
  }

  /** Whether no variable occurs. */
  public boolean isConstant() {
    return p.isConstant();
  }

  /**
   * The value of a constant polynomial.
   *
   * @throws IllegalStateException if a variable occurs
   */
  public BigInteger constantValue() {
    if (!isConstant()) {
      throw new IllegalStateException("not a constant: " + this);
    }
    return java(p.cc());
  }

  /** The number of terms. */
  public int termCount() {
    return p.size();
  }

  /** The total degree; 0 for constants, 0 included. */
  public int totalDegree() {
    return isZero() ? 0 : p.degreeSum() == 0 ? 0 : p.degree();
  }

  /** The degree in one variable; 0 if it does not occur. */
  public int degree(int variable) {
    return isZero() || variables.count() == 0 ? 0 : p.degree(variable);
  }

  /** Whether a variable occurs. */
  public boolean contains(int variable) {
    return degree(variable) > 0;
  }

  /** The positions of the variables that occur, ascending. */
  public List<Integer> support() {
    return IntStream.range(0, variables.count()).filter(this::contains).boxed().toList();
  }

  /** Terms by descending graded-lexicographic order. */
  public List<Term> terms() {
    List<Term> out = new ArrayList<>(p.size());
    for (var it = p.descendingIterator(); it.hasNext(); ) {
      var m = it.next();
      List<Integer> e = new ArrayList<>(variables.count());
      for (int k = 0; k < variables.count(); k++) {
        e.add(m.exponents[k]);
      }
      out.add(new Term(java(m.coefficient), e));
    }
    return out;
  }

  /** The coefficient of the first term in the text; 0 for the polynomial 0. */
  public BigInteger leadingCoefficient() {
    if (variables.numbers() == 0 || isZero()) {
      return java(p.lc());
    }
    return terms().stream().min(PolynomialText.order(variables)).orElseThrow().coefficient();
  }

  /** The coefficients in one variable, constant one first; their number is the degree plus 1. */
  public List<Polynomial> coefficientsIn(int variable) {
    return IntStream.rangeClosed(0, degree(variable))
        .mapToObj(k -> coefficient(variable, k))
        .toList();
  }

  /** The coefficient of a power of one variable, free of it. */
  public Polynomial coefficient(int variable, int exponent) {
    return with(p.coefficientOf(variable, exponent));
  }

  /** The derivative by one variable. */
  public Polynomial derivative(int variable) {
    return with(p.derivative(variable));
  }

  /** The greatest common divisor of the coefficients, not negative. */
  public BigInteger content() {
    return isZero() ? BigInteger.ZERO : java(p.content()).abs();
  }

  /** Free of a common integer factor, leading coefficient positive; 0 stays 0. */
  public Polynomial primitive() {
    if (isZero()) {
      return this;
    }
    BigInteger c = content();
    if (leadingCoefficient().signum() < 0) {
      c = c.negate();
    }
    return c.equals(BigInteger.ONE) ? this : with(p.clone().divideExact(ring(c)));
  }

  /**
   * The quotient where it exists.
   *
   * @param q not 0
   * @return empty if q does not divide this over the integers
   */
  public Optional<Polynomial> dividedBy(Polynomial q) {
    sameRing(q);
    if (q.isZero()) {
      throw new ArithmeticException("division by the polynomial 0");
    }
    if (q.isOne() || isZero()) {
      return Optional.of(this);
    }
    return Optional.ofNullable(MultivariateDivision.divideOrNull(p, q.p)).map(this::with);
  }

  /**
   * The quotient of a division known to be exact.
   *
   * @throws ArithmeticException if it is not
   */
  public Polynomial over(Polynomial q) {
    return dividedBy(q)
        .orElseThrow(() -> new ArithmeticException("(" + this + ") / (" + q + ") is not exact"));
  }

  /** The greatest common divisor over the integers, leading coefficient positive. */
  public Polynomial gcd(Polynomial q) {
    sameRing(q);
    if (isZero() || q.isZero()) {
      Polynomial other = isZero() ? q : this;
      return other.isZero() || other.leadingCoefficient().signum() > 0 ? other : other.negate();
    }
    if (isConstant() || q.isConstant()) {
      return constant(variables, content().gcd(q.content()));
    }
    Polynomial g = with(MultivariateGCD.PolynomialGCD(p.clone(), q.p.clone()));
    return g.leadingCoefficient().signum() < 0 ? g.negate() : g;
  }

  /** The resultant with respect to one variable, up to sign. */
  public Polynomial resultant(Polynomial q, int variable) {
    sameRing(q);
    return Resultants.of(this, q, variable);
  }

  /** This with a polynomial put in place of a variable. */
  public Polynomial substitute(int variable, Polynomial value) {
    sameRing(value);
    return contains(variable) ? with(p.composition(variable, value.p)) : this;
  }

  /**
   * The value at a point.
   *
   * @param point one value a variable, in the order of the ring
   */
  public BigFraction at(List<BigFraction> point) {
    BigFraction sum = BigFraction.ZERO;
    for (Term t : terms()) {
      BigFraction product = BigFraction.of(t.coefficient());
      for (int k = 0; k < t.exponents().size(); k++) {
        if (t.exponents().get(k) > 0) {
          product = product.multiply(point.get(k).pow(t.exponents().get(k)));
        }
      }
      sum = sum.add(product);
    }
    return sum;
  }

  /**
   * This, times the least positive integer that makes it integral, with numbers put in place of
   * some variables.
   *
   * @param point a value a variable, or empty where the variable stays
   */
  public RationalFunction partlyAt(List<Optional<BigFraction>> point) {
    BigInteger denominator = BigInteger.ONE;
    for (int k = 0; k < variables.count(); k++) {
      if (point.get(k).isPresent()) {
        denominator = denominator.multiply(point.get(k).get().getDenominator().pow(degree(k)));
      }
    }
    List<Term> out = new ArrayList<>();
    for (Term t : terms()) {
      BigInteger c = t.coefficient().multiply(denominator);
      List<Integer> e = new ArrayList<>(t.exponents());
      for (int k = 0; k < variables.count(); k++) {
        if (point.get(k).isPresent() && e.get(k) > 0) {
          BigFraction v = point.get(k).get();
          c = c.divide(v.getDenominator().pow(e.get(k))).multiply(v.getNumerator().pow(e.get(k)));
          e.set(k, 0);
        }
      }
      out.add(new Term(c, e));
    }
    return RationalFunction.of(of(variables, out), constant(variables, denominator));
  }

  @Override
  public boolean equals(Object o) {
    return o instanceof Polynomial q && variables.equals(q.variables) && p.equals(q.p);
  }

  @Override
  public int hashCode() {
    return 31 * variables.hashCode() + p.hashCode();
  }

  /** The text of the reports: plain infix, descending graded-lexicographic order. */
  @Override
  public String toString() {
    return PolynomialText.of(this);
  }
}
