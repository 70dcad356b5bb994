package rankfall.exact;

import cc.redberry.rings.bigint.BigInteger;
import cc.redberry.rings.poly.multivar.DegreeVector;
import cc.redberry.rings.poly.multivar.Ideal;
import cc.redberry.rings.poly.multivar.Monomial;
import cc.redberry.rings.poly.multivar.MonomialOrder;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Reduced Groebner bases over the rationals, in graded reverse lexicographic order; algebraic numbers
 * of the ring stand in a block below the other variables, so that a basis never solves for them.
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
    this.order = order(variables, numbers.size());
    int first = variables.count() - numbers.size();
    if (numbers.stream().anyMatch(r -> r.variable() < first)) {
      throw new IllegalArgumentException("algebraic numbers come last in " + variables.names());
    }
  }

  private static Comparator<DegreeVector> order(Variables variables, int numbers) {
    int others = variables.count() - numbers;
    if (numbers == 0 || others == 0) {
      return MonomialOrder.GREVLEX;
    }
    return MonomialOrder.product(
        MonomialOrder.GREVLEX, others, MonomialOrder.GREVLEX, numbers);
  }

  private Ideal<Monomial<BigInteger>, MultivariatePolynomial<BigInteger>> ideal(
      List<Polynomial> generators) {
    List<MultivariatePolynomial<BigInteger>> g = new ArrayList<>();
    for (Polynomial p : generators) {
      if (!p.isZero()) {
        g.add(p.copy().setOrdering(order));
      }
    }
    numbers.forEach(r -> g.add(r.equation().copy().setOrdering(order)));
    if (g.isEmpty()) {
      return Ideal.empty(Polynomial.zero(variables).copy().setOrdering(order));
    }
    return Ideal.create(g, order);
  }

  private List<Polynomial> basis(
      Ideal<Monomial<BigInteger>, MultivariatePolynomial<BigInteger>> ideal) {
    Set<Integer> own = new HashSet<>(numbers.stream().map(Chain.Rule::variable).toList());
    List<Polynomial> out = new ArrayList<>();
    for (var p : ideal.getGroebnerBasis()) {
      Polynomial q =
          new Polynomial(variables, p.clone().setOrdering(MonomialOrder.GRLEX)).primitive();
      if (q.isConstant() ? !q.isZero() : !own.containsAll(q.support())) {
        out.add(q);
      }
    }
    out.sort(
        Comparator.comparing(Polynomial::totalDegree).thenComparing(Polynomial::toString));
    return out;
  }

  /**
   * The reduced basis of an ideal.
   *
   * @param generators any; an empty list gives the zero ideal
   * @return primitive polynomials by degree, then text; a single 1 for the whole ring; those of the
   *     algebraic numbers alone are left out
   */
  public List<Polynomial> reduced(List<Polynomial> generators) {
    return basis(ideal(generators));
  }

  /**
   * The basis of the saturation by a polynomial: what vanishes on the zeros of the ideal off that
   * polynomial's zeros, if the ideal is radical there.
   *
   * @param generators of the ideal
   * @param factors whose product is saturated by
   */
  public List<Polynomial> saturated(List<Polynomial> generators, List<Polynomial> factors) {
    var ideal = ideal(generators);
    boolean changed = true;
    while (changed) {
      changed = false;
      for (Polynomial f : factors) {
        var next = ideal.quotient(f.copy().setOrdering(order));
        if (!ideal.contains(next)) {
          ideal = next;
          changed = true;
        }
      }
    }
    return basis(ideal);
  }

  /**
   * The prime ideal of the closure of a chain.
   *
   * @param chain irreducible
   * @return its reduced basis
   */
  public List<Polynomial> of(Chain chain) {
    List<Polynomial> equations = chain.rules().stream().map(Chain.Rule::equation).toList();
    return chain.initials().isEmpty()
        ? reduced(equations)
        : saturated(
            equations,
            chain.initials().stream()
                .flatMap(p -> Factoring.irreducible(p).stream())
                .distinct()
                .toList());
  }

  /**
   * The basis of the ideal quotient: the polynomials whose product with a given one lies in the ideal.
   *
   * @param generators of the ideal
   * @param p not 0
   */
  public List<Polynomial> quotient(List<Polynomial> generators, Polynomial p) {
    return basis(ideal(generators).quotient(p.copy().setOrdering(order)));
  }

  /** Whether a power of a polynomial lies in the ideal. */
  public boolean radicalContains(List<Polynomial> generators, Polynomial p) {
    return ideal(generators).radicalContains(p.copy().setOrdering(order));
  }

  /** The intersection of two ideals. */
  public List<Polynomial> intersection(List<Polynomial> a, List<Polynomial> b) {
    return basis(ideal(a).intersection(ideal(b)));
  }
}
