package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A point of an irreducible chain without free variables, as complex algebraic numbers.
 *
 * <p>Every coordinate is a root of the norm of its rule (Trager 1976). At given values below, a
 * rule of degree d has d roots among those of its variable's minimal polynomial; enclosures are
 * refined until all others are shown not to satisfy it. So the choice is consistent over all
 * coordinates.
 */
public final class ChainPoint {
  private static final int MOST_DEGREE = 40;
  private static final int REFINEMENTS = 6;
  private final Chain chain;
  private final List<Chain.Rule> order;

  private ChainPoint(Chain chain) {
    this.chain = chain;
    this.order = new ArrayList<>(chain.tower());
    chain.rules().stream().filter(Chain.Rule::isLinear).forEach(order::add);
  }

  /**
   * A point.
   *
   * @param chain irreducible, without free variables
   * @param numbers the real roots that are meant by algebraic numbers of the ring
   * @param realOnly whether all coordinates must be real
   * @param conditions signs that must hold, asked of real points only
   * @return one coordinate a variable; empty if there is no such point, if degrees are too great,
   *     or if enclosures did not decide
   */
  public static Optional<List<ComplexNumber>> of(
      Chain chain,
      Map<Integer, ConstantRoot> numbers,
      boolean realOnly,
      List<RealZeros.Condition> conditions) {
    if (chain.dimension() > 0) {
      throw new IllegalArgumentException("free variables are left: " + chain.freeVariables());
    }
    long degree = chain.tower().stream().mapToLong(Chain.Rule::degree).reduce(1, (a, b) -> a * b);
    return degree > MOST_DEGREE
        ? Optional.empty()
        : new ChainPoint(chain)
            .search(
                new TreeMap<>(),
                numbers,
                realOnly,
                p -> conditions.stream().allMatch(c -> holds(chain, c, p)));
  }

  private Optional<List<ComplexNumber>> search(
      SortedMap<Integer, ComplexNumber> below,
      Map<Integer, ConstantRoot> numbers,
      boolean realOnly,
      Predicate<SortedMap<Integer, ComplexNumber>> accept) {
    if (below.size() == order.size()) {
      return !realOnly || accept.test(below)
          ? Optional.of(List.copyOf(below.values()))
          : Optional.empty();
    }
    Chain.Rule r = order.get(below.size());
    for (ComplexNumber z : candidates(r, below)) {
      if ((!realOnly || z.isReal()) && isMeant(z, r, numbers)) {
        SortedMap<Integer, ComplexNumber> more = new TreeMap<>(below);
        more.put(r.variable(), z);
        Optional<List<ComplexNumber>> out = search(more, numbers, realOnly, accept);
        if (out.isPresent()) {
          return out;
        }
      }
    }
    return Optional.empty();
  }

  /** Whether a number of the ring is the root that is meant; other coordinates may be any. */
  private static boolean isMeant(
      ComplexNumber z, Chain.Rule r, Map<Integer, ConstantRoot> numbers) {
    ConstantRoot root = numbers.get(r.variable());
    if (root == null) {
      return true;
    }
    if (!z.isReal()) {
      return false;
    }
    ComplexNumber fine = z;
    while (true) {
      Interval i = fine.box().re();
      if (Rationals.compare(i.upper(), root.low()) < 0
          || Rationals.compare(root.high(), i.lower()) < 0) {
        return false;
      }
      if (root.low().equals(root.high())
          || (Rationals.compare(root.low(), i.lower()) <= 0
              && Rationals.compare(i.upper(), root.high()) <= 0)) {
        return true;
      }
      fine = fine.refined();
    }
  }

  /**
   * The values that a rule allows at given ones below: real ones first, greatest first, then the
   * upper half plane; none if they were not told apart.
   */
  private List<ComplexNumber> candidates(Chain.Rule r, SortedMap<Integer, ComplexNumber> below) {
    Univariate minimal = Univariate.of(minimal(r));
    ComplexRoots roots = ComplexRoots.of(minimal);
    SortedMap<Integer, ComplexNumber> at = below;
    for (int k = 0; k < REFINEMENTS; k++) {
      List<ComplexNumber> open = new ArrayList<>();
      for (int j = 0; j < roots.boxes().size(); j++) {
        ComplexNumber z = new ComplexNumber(minimal, roots, j);
        SortedMap<Integer, ComplexNumber> here = new TreeMap<>(at);
        here.put(r.variable(), z);
        if (value(r.equation(), here).mayBeZero()) {
          open.add(z);
        }
      }
      if (open.size() == r.degree()) {
        open.sort(ChainPoint::compare);
        return open;
      }
      roots = roots.refined();
      SortedMap<Integer, ComplexNumber> finer = new TreeMap<>();
      at.forEach((v, z) -> finer.put(v, z.refined()));
      at = finer;
    }
    return List.of();
  }

  /** Disjoint boxes, so an order; real numbers, then those above the real axis, by real part. */
  private static int compare(ComplexNumber a, ComplexNumber b) {
    if (a.isReal() != b.isReal()) {
      return a.isReal() ? -1 : 1;
    }
    int upper = b.box().im().middle().signum() - a.box().im().middle().signum();
    int left = Rationals.compare(b.box().re().middle(), a.box().re().middle());
    return upper != 0
        ? upper
        : left != 0 ? left : Rationals.compare(a.box().im().middle(), b.box().im().middle());
  }

  /** The minimal polynomial of a coordinate: the only factor of its rule's norm. */
  private Polynomial minimal(Chain.Rule r) {
    Polynomial norm = r.equation();
    List<Chain.Rule> tower = chain.tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      Chain.Rule below = tower.get(k);
      if (below.variable() != r.variable() && norm.contains(below.variable())) {
        norm = below.equation().resultant(norm, below.variable()).primitive();
      }
    }
    List<Polynomial> factors =
        Factoring.irreducible(norm).stream().filter(p -> p.contains(r.variable())).toList();
    if (factors.size() != 1 || factors.get(0).support().size() != 1) {
      throw new IllegalStateException("not an irreducible chain: " + chain.rules());
    }
    return factors.get(0);
  }

  private static ComplexBox value(Polynomial p, SortedMap<Integer, ComplexNumber> at) {
    ComplexBox sum = ComplexBox.of(BigFraction.ZERO);
    for (Term t : p.terms()) {
      ComplexBox product = ComplexBox.of(BigFraction.of(t.coefficient()));
      for (int v : p.support()) {
        for (int e = 0; e < t.exponents().get(v); e++) {
          product = product.times(at.get(v).box());
        }
      }
      sum = sum.plus(product);
    }
    return sum;
  }

  private static boolean holds(
      Chain chain, RealZeros.Condition c, SortedMap<Integer, ComplexNumber> point) {
    if (chain.vanishes(c.polynomial())) {
      return c.relation() == RealZeros.Relation.NON_NEGATIVE;
    }
    SortedMap<Integer, ComplexNumber> at = point;
    for (int k = 0; k < REFINEMENTS; k++) {
      ComplexBox v = value(c.polynomial(), at);
      if (!v.mayBeZero()) {
        return c.relation() == RealZeros.Relation.NON_ZERO || v.re().sign().orElse(0) > 0;
      }
      SortedMap<Integer, ComplexNumber> finer = new TreeMap<>();
      at.forEach((w, z) -> finer.put(w, z.refined()));
      at = finer;
    }
    return false;
  }
}
