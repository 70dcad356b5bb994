package rankfall.exact;

import cc.redberry.rings.Rational;
import cc.redberry.rings.Rings;
import cc.redberry.rings.bigint.BigInteger;
import cc.redberry.rings.poly.multivar.DegreeVector;
import cc.redberry.rings.poly.multivar.GroebnerBases;
import cc.redberry.rings.poly.multivar.Monomial;
import cc.redberry.rings.poly.multivar.MonomialOrder;
import cc.redberry.rings.poly.multivar.MultivariateDivision;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Reduced Groebner bases over the rationals, in graded reverse lexicographic order; algebraic
 * numbers of the ring stand in a block below the other variables, so that a basis never solves for
 * them.
 *
 * <p>Saturations and intersections are eliminations of one more variable (Cox, Little, O'Shea,
 * Ideals, Varieties, and Algorithms, ch. 4). The library's own quotients are wrong in a block
 * order, and its modular bases spend a tenth of a second looking for primes; so its plain
 * Buchberger algorithm runs over the rationals.
 */
public final class GroebnerBasis {
  private final Variables variables;
  private final List<Chain.Rule> numbers;
  private final Comparator<DegreeVector> order;

  /**
   * Bases in one ring.
   *
   * @param constants a chain whose rules for algebraic numbers belong to every ideal
   */
  public GroebnerBasis(Chain constants) {
    this.variables = constants.variables();
    this.numbers = ChainFactoring.numbers(constants);
    this.order = order(variables.count(), numbers.size());
    int first = variables.count() - numbers.size();
    if (numbers.stream().anyMatch(r -> r.variable() < first)) {
      throw new IllegalArgumentException("algebraic numbers come last in " + variables.names());
    }
  }

  /** One more variable first, above all others. */
  private static Comparator<DegreeVector> order(int variables, int numbers) {
    int all = Math.max(1, variables);
    return MonomialOrder.product(MonomialOrder.GREVLEX, 1, blocks(all - numbers, numbers), all);
  }

  private static Comparator<DegreeVector> blocks(int others, int numbers) {
    return numbers == 0 || others == 0
        ? MonomialOrder.GREVLEX
        : MonomialOrder.product(MonomialOrder.GREVLEX, others, MonomialOrder.GREVLEX, numbers);
  }

  /** A polynomial in the ring with one more variable, times a power of that variable. */
  private MultivariatePolynomial<Rational<BigInteger>> lifted(Polynomial p, int power) {
    int n = Math.max(1, variables.count());
    var out = MultivariatePolynomial.zero(n + 1, Rings.Q, order);
    for (Term t : p.terms()) {
      int[] e = new int[n + 1];
      e[0] = power;
      for (int k = 0; k < t.exponents().size(); k++) {
        e[k + 1] = t.exponents().get(k);
      }
      out.add(new Monomial<>(e, new Rational<>(Rings.Z, Polynomial.ring(t.coefficient()))));
    }
    return out;
  }

  /** What does not hold the additional variable, brought back. */
  private Polynomial lowered(MultivariatePolynomial<Rational<BigInteger>> p) {
    BigInteger denominator = BigInteger.ONE;
    for (var m : p) {
      BigInteger d = m.coefficient.denominator();
      denominator = denominator.divideExact(denominator.gcd(d)).multiply(d);
    }
    List<Term> out = new ArrayList<>();
    for (var m : p) {
      List<Integer> e = new ArrayList<>();
      for (int k = 0; k < variables.count(); k++) {
        e.add(m.exponents[k + 1]);
      }
      BigInteger c =
          m.coefficient.numerator().multiply(denominator.divideExact(m.coefficient.denominator()));
      out.add(new Term(Polynomial.java(c), e));
    }
    return Polynomial.of(variables, out).primitive();
  }

  private List<MultivariatePolynomial<Rational<BigInteger>>> lifted(List<Polynomial> generators) {
    List<MultivariatePolynomial<Rational<BigInteger>>> out = new ArrayList<>();
    generators.stream().filter(p -> !p.isZero()).forEach(p -> out.add(lifted(p, 0)));
    numbers.forEach(r -> out.add(lifted(r.equation(), 0)));
    return out;
  }

  private List<MultivariatePolynomial<Rational<BigInteger>>> basis(
      List<MultivariatePolynomial<Rational<BigInteger>>> generators) {
    return generators.isEmpty() ? List.of() : GroebnerBases.BuchbergerGB(generators, order);
  }

  /** The members of a basis that are free of the additional variable. */
  private List<Polynomial> eliminated(
      List<MultivariatePolynomial<Rational<BigInteger>>> generators) {
    Set<Integer> own = new HashSet<>(numbers.stream().map(Chain.Rule::variable).toList());
    List<Polynomial> out = new ArrayList<>();
    for (var p : basis(generators)) {
      if (!p.isZero() && p.degree(0) == 0) {
        Polynomial q = lowered(p);
        if (q.isConstant() || !own.containsAll(q.support())) {
          out.add(q);
        }
      }
    }
    out.sort(Comparator.comparing(Polynomial::totalDegree).thenComparing(Polynomial::toString));
    return out;
  }

  /** {@code 1 - t*p} for the additional variable t. */
  private MultivariatePolynomial<Rational<BigInteger>> inverse(Polynomial p) {
    return lifted(Polynomial.one(variables), 0).subtract(lifted(p, 1));
  }

  /**
   * The reduced basis of an ideal.
   *
   * @param generators any; an empty list gives the zero ideal
   * @return primitive polynomials by degree, then text; a single 1 for the whole ring; those of the
   *     algebraic numbers alone are left out
   */
  public List<Polynomial> reduced(List<Polynomial> generators) {
    return eliminated(lifted(generators));
  }

  /**
   * The basis of the saturation by a polynomial: what vanishes on the zeros of the ideal off that
   * polynomial's zeros, if the ideal is radical there.
   *
   * @param generators of the ideal
   * @param factors whose product is saturated by
   */
  public List<Polynomial> saturated(List<Polynomial> generators, List<Polynomial> factors) {
    List<Polynomial> out = generators;
    for (Polynomial f : factors) {
      var more = lifted(out);
      more.add(inverse(f));
      out = eliminated(more);
    }
    return factors.isEmpty() ? reduced(generators) : out;
  }

  /**
   * The prime ideal of the closure of a chain.
   *
   * @param chain irreducible
   * @return its reduced basis
   */
  public List<Polynomial> of(Chain chain) {
    List<Polynomial> equations = chain.rules().stream().map(Chain.Rule::equation).toList();
    return saturated(
        equations,
        chain.initials().stream()
            .flatMap(p -> Factoring.irreducible(p).stream())
            .distinct()
            .toList());
  }

  /**
   * Those polynomials that do not lie in the ideal over the rationals.
   *
   * @param generators of the ideal
   * @param polynomials any
   * @return in the given order
   */
  public List<Polynomial> outside(List<Polynomial> generators, List<Polynomial> polynomials) {
    var basis = basis(lifted(generators));
    return polynomials.stream()
        .filter(p -> !p.isZero() && !MultivariateDivision.remainder(lifted(p, 0), basis).isZero())
        .toList();
  }

  /**
   * The normal form of a polynomial modulo an ideal over the rationals: the one polynomial that
   * differs from it by a member of the ideal and holds no monomial that a leading monomial of the
   * ideal divides.
   *
   * @param generators of the ideal
   * @param p any
   * @return a polynomial over a positive integer
   */
  public RationalFunction normalForm(List<Polynomial> generators, Polynomial p) {
    if (p.isZero()) {
      return RationalFunction.of(p);
    }
    var rest = MultivariateDivision.remainder(lifted(p, 0), basis(lifted(generators)));
    RationalFunction sum = RationalFunction.of(Polynomial.zero(variables));
    for (var m : rest) {
      List<Integer> e = new ArrayList<>();
      for (int k = 0; k < variables.count(); k++) {
        e.add(m.exponents[k + 1]);
      }
      Polynomial term =
          Polynomial.of(
              variables, List.of(new Term(Polynomial.java(m.coefficient.numerator()), e)));
      sum =
          sum.plus(
              RationalFunction.of(
                  term,
                  Polynomial.constant(variables, Polynomial.java(m.coefficient.denominator()))));
    }
    return sum;
  }

  /**
   * The basis of the ideal quotient: the polynomials whose product with a given one lies in the
   * ideal.
   *
   * @param generators of the ideal
   * @param p not 0
   */
  public List<Polynomial> quotient(List<Polynomial> generators, Polynomial p) {
    List<MultivariatePolynomial<Rational<BigInteger>>> parts = new ArrayList<>();
    generators.forEach(g -> parts.add(lifted(g, 1)));
    numbers.forEach(r -> parts.add(lifted(r.equation(), 1)));
    parts.add(lifted(p, 0).subtract(lifted(p, 1)));
    List<Polynomial> multiples = new ArrayList<>();
    for (var m : basis(parts)) {
      if (!m.isZero() && m.degree(0) == 0) {
        multiples.add(lowered(m).over(p.primitive()));
      }
    }
    return reduced(multiples);
  }

  /** Whether a power of a polynomial lies in the ideal (Rabinowitsch 1929). */
  public boolean radicalContains(List<Polynomial> generators, Polynomial p) {
    var more = lifted(generators);
    more.add(inverse(p));
    return eliminated(more).stream().anyMatch(Polynomial::isConstant);
  }

  /** The intersection of two ideals. */
  public List<Polynomial> intersection(List<Polynomial> a, List<Polynomial> b) {
    List<MultivariatePolynomial<Rational<BigInteger>>> parts = new ArrayList<>();
    a.forEach(p -> parts.add(lifted(p, 1)));
    b.forEach(p -> parts.add(lifted(p, 0).subtract(lifted(p, 1))));
    numbers.forEach(r -> parts.add(lifted(r.equation(), 0)));
    return eliminated(parts);
  }
}
