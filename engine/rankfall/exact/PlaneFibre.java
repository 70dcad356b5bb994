package rankfall.exact;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.apache.commons.numbers.fraction.BigFraction;

/** The points of curves and of finite sets above one point of the first axis. */
final class PlaneFibre {
  private final PlanePoint base;
  private final int y;
  private final List<Part> parts = new ArrayList<>();

  /** An irreducible polynomial in y over the base, and which sets it belongs to. */
  private static final class Part {
    private final Polynomial equation;
    private final Set<Integer> curves = new TreeSet<>();
    private boolean marked;

    private Part(Polynomial equation) {
      this.equation = equation;
    }
  }

  /**
   * A point above the base.
   *
   * @param at the point
   * @param curves numbers of the curves that pass through it
   * @param marked whether it belongs to one of the finite sets
   */
  record Node(PlanePoint at, Set<Integer> curves, boolean marked) {
    Node {
      curves = Set.copyOf(curves);
    }
  }

  private PlaneFibre(PlanePoint base, int y) {
    this.base = base;
    this.y = y;
  }

  /**
   * The points above a base, ascending.
   *
   * @param base a value of the first coordinate
   * @param y position of the second one
   * @param curves irreducible polynomials; those that do not hold y are left out
   * @param finite sets as {@link PlaneSets} gives them
   */
  static List<Node> nodes(
      PlanePoint base, int y, List<Polynomial> curves, List<List<Polynomial>> finite) {
    PlaneFibre f = new PlaneFibre(base, y);
    for (int k = 0; k < curves.size(); k++) {
      if (curves.get(k).contains(y)) {
        for (Polynomial g : f.factors(curves.get(k))) {
          f.part(g).curves.add(k);
        }
      }
    }
    for (List<Polynomial> set : finite) {
      f.mark(set);
    }
    return f.sorted();
  }

  private List<Polynomial> factors(Polynomial p) {
    return ChainFactoring.inVariable(base.chain(), base.placed(p), y);
  }

  private Part part(Polynomial g) {
    for (Part p : parts) {
      if (p.equation.equals(g)
          || (p.equation.degree(y) == g.degree(y) && vanishes(p.equation, g))) {
        return p;
      }
    }
    Part p = new Part(g);
    parts.add(p);
    return p;
  }

  /** Whether g vanishes at the roots of an irreducible polynomial. */
  private boolean vanishes(Polynomial irreducible, Polynomial g) {
    return above(irreducible).vanishes(g);
  }

  private Chain above(Polynomial equation) {
    Chain.Rule rule = new Chain.Rule(y, equation);
    List<Chain.Rule> rules = new ArrayList<>(base.chain().rules());
    rules.add(rule.isLinear() ? 0 : rules.size(), rule);
    return new Chain(base.chain().variables(), rules);
  }

  private void mark(List<Polynomial> set) {
    List<Polynomial> here =
        set.stream().map(base::placed).filter(p -> !base.chain().vanishes(p)).toList();
    if (here.isEmpty()) {
      throw new IllegalStateException("not a finite set: " + set);
    }
    for (Polynomial g : factors(here.get(0))) {
      Chain chain = above(g);
      if (here.stream().allMatch(chain::vanishes)) {
        part(g).marked = true;
      }
    }
  }

  private List<Node> sorted() {
    List<Node> out = new ArrayList<>();
    for (Part p : parts) {
      for (PlanePoint at : base.with(new Chain.Rule(y, p.equation))) {
        out.add(new Node(at, new HashSet<>(p.curves), p.marked));
      }
    }
    out.sort((a, b) -> a == b ? 0 : a.at.compareDifferent(y, b.at));
    return List.copyOf(out);
  }

  /** Rational numbers below, between and above the points of a fibre; 0 if there is none. */
  static List<BigFraction> between(int variable, List<PlanePoint> points) {
    if (points.isEmpty()) {
      return List.of(BigFraction.ZERO);
    }
    List<BigFraction> out = new ArrayList<>();
    BigFraction lowest = points.get(0).within(variable, BigFraction.ONE).lower();
    out.add(BigFraction.of(Rationals.floor(lowest)).subtract(BigFraction.ONE));
    for (int k = 1; k < points.size(); k++) {
      out.add(points.get(k - 1).between(variable, points.get(k)));
    }
    BigFraction highest = points.get(points.size() - 1).within(variable, BigFraction.ONE).upper();
    out.add(BigFraction.of(Rationals.ceil(highest)).add(BigFraction.ONE));
    return out;
  }
}
