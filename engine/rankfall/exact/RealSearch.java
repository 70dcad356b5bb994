package rankfall.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.RealZeros.Condition;
import rankfall.exact.RealZeros.Relation;
import rankfall.exact.RealZeros.Verdict;

/**
 * The search behind {@link RealZeros}: every step replaces the set by others of which one has a
 * real point exactly if it has one.
 *
 * <p>Products branch; equations with terms of one sign, and definite quadrics, force their parts to
 * vanish; an equation linear in a variable is solved for it, with a branch where its coefficient
 * vanishes. A single irreducible equation f is decided by an open decomposition of the space along
 * one variable: f has a real zero at which it is smooth exactly if it has one above a sample point;
 * the other zeros satisfy the derivatives too.
 */
final class RealSearch {
  private static final int MOST_STEPS = 600;
  private static final int MOST_DEPTH = 40;
  private static final int MOST_CELLS = 4000;
  private static final List<BigFraction> SMALL =
      List.of(
          BigFraction.ZERO,
          BigFraction.ONE,
          BigFraction.of(-1),
          BigFraction.of(2),
          BigFraction.of(-2),
          BigFraction.of(1, 2),
          BigFraction.of(-1, 2));
  private static final Found NO = new Found(Verdict.NO, Optional.empty());
  private static final Found UNKNOWN = new Found(Verdict.UNKNOWN, Optional.empty());
  private final Variables ring;
  private int steps;

  RealSearch(Variables ring) {
    this.ring = ring;
  }

  /** A verdict, with a point where it is yes. */
  record Found(Verdict verdict, Optional<RealPoint> point) {
    static Found yes(RealPoint p) {
      return new Found(Verdict.YES, Optional.of(p));
    }
  }

  /** A branch: equations and conditions, and how to complete its points. */
  private interface Branch {
    Found solve();
  }

  private static Found any(List<Branch> branches) {
    Found out = NO;
    for (Branch b : branches) {
      Found f = b.solve();
      if (f.verdict() == Verdict.YES) {
        return f;
      }
      out = f.verdict() == Verdict.UNKNOWN ? f : out;
    }
    return out;
  }

  Found solve(List<Polynomial> equations, List<Condition> conditions, int depth) {
    if (++steps > MOST_STEPS || depth > MOST_DEPTH) {
      return UNKNOWN;
    }
    List<Condition> open = new ArrayList<>();
    for (Condition c : conditions) {
      Polynomial p = c.polynomial();
      if (p.isConstant()) {
        if (!holds(c, p.isZero() ? 0 : p.constantValue().signum())) {
          return NO;
        }
      } else if (c.relation() == Relation.NON_NEGATIVE) {
        return atBorder(equations, conditions, c, depth);
      } else if (!open.contains(c)) {
        open.add(c);
      }
    }
    Set<Polynomial> simple = new LinkedHashSet<>();
    for (Polynomial f : equations) {
      if (f.isConstant() && !f.isZero()) {
        return NO;
      }
      if (!f.isZero()) {
        List<Polynomial> factors = Factoring.irreducible(f);
        if (factors.size() > 1) {
          return any(
              factors.stream()
                  .map(
                      g ->
                          (Branch) () -> solve(replaced(equations, f, List.of(g)), open, depth + 1))
                  .toList());
        }
        simple.add(factors.get(0));
      }
    }
    return reduced(List.copyOf(simple), List.copyOf(open), depth);
  }

  private static boolean holds(Condition c, int sign) {
    return switch (c.relation()) {
      case POSITIVE -> sign > 0;
      case NON_NEGATIVE -> sign >= 0;
      case NON_ZERO -> sign != 0;
    };
  }

  private Found atBorder(
      List<Polynomial> equations, List<Condition> conditions, Condition c, int depth) {
    List<Condition> others = new ArrayList<>(conditions);
    others.remove(c);
    List<Polynomial> more = new ArrayList<>(equations);
    more.add(c.polynomial());
    List<Condition> inside = new ArrayList<>(others);
    inside.add(new Condition(c.polynomial(), Relation.POSITIVE));
    return any(
        List.of(() -> solve(equations, inside, depth + 1), () -> solve(more, others, depth + 1)));
  }

  private static List<Polynomial> replaced(
      List<Polynomial> equations, Polynomial f, List<Polynomial> by) {
    List<Polynomial> out = new ArrayList<>(equations);
    out.remove(f);
    out.addAll(by);
    return out;
  }

  /** Goes on with irreducible equations and open conditions. */
  private Found reduced(List<Polynomial> equations, List<Condition> conditions, int depth) {
    KnownSigns known = KnownSigns.of(conditions);
    for (Condition c : conditions) {
      if (c.relation() == Relation.POSITIVE
          && known.sign(c.polynomial()).filter(s -> s < 0).isPresent()) {
        return NO;
      }
    }
    for (Polynomial f : equations) {
      if (known.isNowhereZero(f)) {
        return NO;
      }
      if (f.termCount() > 1 && known.sign(f).isPresent()) {
        List<Polynomial> terms =
            f.terms().stream().map(t -> Polynomial.of(ring, List.of(t))).toList();
        return solve(replaced(equations, f, terms), conditions, depth + 1);
      }
      Optional<Squares> squares = Squares.of(f);
      if (squares.isPresent()) {
        if (squares.get().constant() == squares.get().sign()) {
          return NO;
        }
        if (squares.get().constant() == 0) {
          return solve(replaced(equations, f, squares.get().roots()), conditions, depth + 1);
        }
      }
      if (f.support().size() == 1 && RealRoots.of(f).count() == 0) {
        return NO;
      }
    }
    Optional<Linear> linear = Linear.simplest(equations);
    if (linear.isPresent()) {
      return eliminated(linear.get(), equations, conditions, depth);
    }
    if (equations.isEmpty()) {
      return inside(conditions);
    }
    return equations.size() == 1
        ? single(equations.get(0), conditions, depth)
        : several(equations, conditions, depth);
  }

  private Found eliminated(
      Linear l, List<Polynomial> equations, List<Condition> conditions, int depth) {
    Branch solved =
        () -> {
          List<Polynomial> eqs = new ArrayList<>();
          for (Polynomial f : equations) {
            if (!f.equals(l.equation())) {
              eqs.add(l.into(f));
            }
          }
          List<Condition> conds = new ArrayList<>();
          for (Condition c : conditions) {
            Polynomial p = c.polynomial();
            conds.add(new Condition(l.keepingSign(p), c.relation()));
          }
          conds.add(new Condition(l.a(), Relation.NON_ZERO));
          Found f = solve(eqs, conds, depth + 1);
          return f.point().isEmpty()
              ? f
              : Found.yes(f.point().get().solved(l.variable(), l.a(), l.b()));
        };
    if (l.a().isConstant()) {
      return solved.solve();
    }
    return any(
        List.of(
            solved,
            () ->
                solve(
                    replaced(equations, l.equation(), List.of(l.a(), l.b())),
                    conditions,
                    depth + 1)));
  }

  private List<Integer> support(List<Polynomial> equations, List<Condition> conditions) {
    Set<Integer> out = new TreeSet<>();
    equations.forEach(f -> out.addAll(f.support()));
    conditions.forEach(c -> out.addAll(c.polynomial().support()));
    return List.copyOf(out);
  }

  private static boolean allHold(List<Condition> conditions, RealPoint point) {
    return conditions.stream().allMatch(c -> holds(c, point.sign(c.polynomial())));
  }

  /** Open conditions alone. */
  private Found inside(List<Condition> conditions) {
    List<Integer> variables = support(List.of(), conditions);
    Optional<RealPoint> quick = firstOf(grid(variables), conditions);
    if (quick.isPresent()) {
      return Found.yes(quick.get());
    }
    List<Polynomial> walls = conditions.stream().map(Condition::polynomial).toList();
    Optional<List<List<BigFraction>>> samples =
        OpenCells.samples(ring, walls, variables, MOST_CELLS);
    return samples.isEmpty()
        ? UNKNOWN
        : firstOf(samples.get(), conditions).map(Found::yes).orElse(NO);
  }

  private static Optional<RealPoint> firstOf(
      List<List<BigFraction>> points, List<Condition> conditions) {
    return points.stream().map(RealPoint::of).filter(p -> allHold(conditions, p)).findFirst();
  }

  /** One irreducible equation with open conditions. */
  private Found single(Polynomial f, List<Condition> conditions, int depth) {
    int v = f.support().stream().min(Comparator.comparingInt(f::degree)).orElseThrow();
    List<Polynomial> all = new ArrayList<>(List.of(f));
    conditions.forEach(c -> all.add(c.polynomial()));
    List<Integer> base = support(List.of(f), conditions).stream().filter(w -> w != v).toList();
    Optional<RealPoint> quick = above(f, v, conditions, grid(base));
    if (quick.isPresent()) {
      return Found.yes(quick.get());
    }
    Optional<List<List<BigFraction>>> samples =
        OpenCells.projection(OpenCells.irreducible(all), v)
            .flatMap(p -> OpenCells.samples(ring, p, base, MOST_CELLS));
    if (samples.isEmpty()) {
      return UNKNOWN;
    }
    Optional<RealPoint> point = above(f, v, conditions, samples.get());
    if (point.isPresent()) {
      return Found.yes(point.get());
    }
    List<Polynomial> singular = new ArrayList<>(List.of(f));
    f.support().forEach(w -> singular.add(f.derivative(w)));
    return f.support().size() == 1 ? NO : solve(singular, conditions, depth + 1);
  }

  private static Optional<RealPoint> above(
      Polynomial f, int v, List<Condition> conditions, List<List<BigFraction>> points) {
    for (List<BigFraction> p : points) {
      for (AlgebraicNumber root : OpenCells.roots(List.of(f), p, v)) {
        RealPoint q = RealPoint.of(p, v, root);
        if (allHold(conditions, q)) {
          return Optional.of(q);
        }
      }
    }
    return Optional.empty();
  }

  /** Points with small coordinates, at most a few dozen. */
  private List<List<BigFraction>> grid(List<Integer> variables) {
    List<List<BigFraction>> out = new ArrayList<>();
    out.add(Collections.nCopies(ring.count(), BigFraction.ZERO));
    int width = variables.size() <= 2 ? SMALL.size() : 3;
    for (int v : variables) {
      List<List<BigFraction>> next = new ArrayList<>();
      for (List<BigFraction> p : out) {
        for (BigFraction x : SMALL.subList(0, out.size() > 80 ? 2 : width)) {
          List<BigFraction> q = new ArrayList<>(p);
          q.set(v, x);
          next.add(q);
        }
      }
      out = next.size() > 400 ? next.subList(0, 400) : next;
    }
    return out;
  }

  /** Several equations, none linear in a variable. */
  private Found several(List<Polynomial> equations, List<Condition> conditions, int depth) {
    Set<Integer> first = new TreeSet<>(equations.get(0).support());
    while (grow(first, equations, conditions)) {
      continue;
    }
    List<Polynomial> here = equations.stream().filter(f -> meets(f, first)).toList();
    if (here.size() < equations.size()) {
      List<Polynomial> there = equations.stream().filter(f -> !meets(f, first)).toList();
      Found f =
          solve(
              here,
              conditions.stream().filter(c -> meets(c.polynomial(), first)).toList(),
              depth + 1);
      if (f.verdict() == Verdict.NO) {
        return f;
      }
      Found g =
          solve(
              there,
              conditions.stream().filter(c -> !meets(c.polynomial(), first)).toList(),
              depth + 1);
      return g.verdict() == Verdict.YES ? new Found(f.verdict(), joined(f, g, first)) : g;
    }
    for (Polynomial f : equations) {
      if (single(f, conditions, depth + MOST_DEPTH / 4).verdict() == Verdict.NO) {
        return NO;
      }
    }
    for (int i = 0; i < equations.size(); i++) {
      for (int j = 0; j < i; j++) {
        Polynomial f = equations.get(i);
        Polynomial g = equations.get(j);
        for (int v : f.support()) {
          if (g.contains(v)) {
            Polynomial r = f.resultant(g, v);
            if (r.isConstant()) {
              return NO;
            }
            List<Polynomial> factors = Factoring.irreducible(r);
            if (factors.stream().noneMatch(equations::contains)) {
              return any(
                  factors.stream()
                      .map(
                          x ->
                              (Branch)
                                  () ->
                                      solve(
                                          replaced(equations, r, List.of(x)),
                                          conditions,
                                          depth + 1))
                      .toList());
            }
          }
        }
      }
    }
    return cut(equations, conditions, depth);
  }

  private static boolean meets(Polynomial p, Set<Integer> variables) {
    return p.support().stream().anyMatch(variables::contains);
  }

  /** Adds the variables that occur together with some of the set; false if there are none. */
  private static boolean grow(
      Set<Integer> variables, List<Polynomial> equations, List<Condition> conditions) {
    boolean more = false;
    List<Polynomial> all = new ArrayList<>(equations);
    conditions.forEach(c -> all.add(c.polynomial()));
    for (Polynomial p : all) {
      more |= meets(p, variables) && variables.addAll(p.support());
    }
    return more;
  }

  /** The point with some coordinates of one and the others of another, where one is rational. */
  private static Optional<RealPoint> joined(Found f, Found g, Set<Integer> first) {
    return f.point().flatMap(p -> g.point().flatMap(q -> p.joined(q, first)));
  }

  /** Looks for a point with a small rational coordinate. */
  private Found cut(List<Polynomial> equations, List<Condition> conditions, int depth) {
    for (int v : support(equations, conditions)) {
      for (BigFraction x : SMALL) {
        Polynomial at =
            Polynomial.variable(ring, v)
                .times(Rationals.denominator(x))
                .minus(Polynomial.constant(ring, Rationals.numerator(x)));
        Found f = solve(replaced(equations, at, List.of(at)), conditions, depth + 8);
        if (f.verdict() == Verdict.YES) {
          return f;
        }
      }
    }
    return UNKNOWN;
  }
}
