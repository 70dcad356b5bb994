package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;

/**
 * Cuts the zeros of polynomials into irreducible locally closed pieces.
 *
 * <p>Products are cut into their factors, equations linear in a variable are solved with a branch
 * on the coefficient, what remains becomes a tower of irreducible equations (characteristic sets of
 * Ritt and Wu; Wang, Elimination Methods, 2001, ch. 4). Every step divides a set into disjoint
 * parts, so the pieces are disjoint and cover exactly the zeros.
 */
public final class Splitter {
  private static final int UNWELCOME = 100_000;

  private final Chain constants;
  private final Set<Integer> numbers;
  private final Meter meter;
  private final Factors factors;
  private final Optional<Chain> near;

  /**
   * A splitter for one ring.
   *
   * @param constants the chain of the algebraic numbers of the ring
   * @param meter asked at every branch
   */
  public Splitter(Chain constants, Meter meter) {
    this(constants, meter, Optional.empty(), new Factors(constants));
  }

  private Splitter(Chain constants, Meter meter, Optional<Chain> near, Factors factors) {
    this.factors = factors;
    this.near = near;
    this.constants = constants;
    this.numbers = new HashSet<>(constants.rules().stream().map(Chain.Rule::variable).toList());
    this.meter = meter;
  }

  /**
   * A splitter that solves, where it can, only for variables whose coefficient does not vanish on a
   * set, so that its pieces serve near the general point of that set.
   *
   * @param near the general point of the set
   */
  Splitter near(Chain near) {
    return new Splitter(constants, meter, Optional.of(near), factors);
  }

  /** The factors that it remembers. */
  Factors factors() {
    return factors;
  }

  /**
   * The zeros of polynomials in the whole space.
   *
   * @param equations all vanish
   * @param nonZero none vanishes
   */
  public List<Piece> zeros(List<Polynomial> equations, List<Polynomial> nonZero) {
    return within(new Piece(constants, List.of()), equations, nonZero);
  }

  /**
   * The zeros of polynomials within a piece.
   *
   * @param piece where to look
   * @param equations all vanish
   * @param nonZero none vanishes
   * @return disjoint pieces that cover exactly these points
   */
  public List<Piece> within(Piece piece, List<Polynomial> equations, List<Polynomial> nonZero) {
    List<Piece> out = new ArrayList<>();
    List<Polynomial> off = new ArrayList<>(piece.nonZero());
    for (Polynomial p : nonZero) {
      if (p.isZero()) {
        return out;
      }
      if (!p.isConstant()) {
        off.addAll(factors.of(p));
      }
    }
    split(new State(piece.chain(), equations, off), out);
    return out;
  }

  /** A set on its way to pieces. */
  private record State(Chain chain, List<Polynomial> equations, List<Polynomial> nonZero) {
    State with(List<Polynomial> newEquations) {
      return new State(chain, newEquations, nonZero);
    }

    State off(List<Polynomial> more) {
      List<Polynomial> all = new ArrayList<>(nonZero);
      more.stream().filter(p -> !all.contains(p)).forEach(all::add);
      return new State(chain, equations, all);
    }

    State on(Chain newChain) {
      return new State(newChain, equations, nonZero);
    }
  }

  private void split(State start, List<Piece> out) {
    meter.branch();
    if (start.nonZero().stream().anyMatch(start.chain()::vanishes)) {
      return;
    }
    List<List<Polynomial>> products = new ArrayList<>();
    for (Polynomial e : start.equations()) {
      Polynomial r = start.chain().reduced(e);
      if (!r.isZero()) {
        List<Polynomial> factors = remaining(start, r);
        if (factors.isEmpty()) {
          return;
        }
        if (!products.contains(factors)) {
          products.add(factors);
        }
      }
    }
    if (products.isEmpty()) {
      out.add(new Piece(start.chain(), start.nonZero()));
      return;
    }
    products.sort(Comparator.comparingInt((List<Polynomial> f) -> f.size()));
    List<Polynomial> single =
        products.stream().filter(f -> f.size() == 1).map(f -> f.get(0)).toList();
    State state = start.with(products.stream().map(Splitter::product).toList());
    Optional<Linear> linear = cheapestLinear(state, single);
    if (linear.isPresent() && (linear.get().cost() <= 1 || single.size() == products.size())) {
      solve(state, linear.get(), out);
    } else if (single.size() < products.size()) {
      branch(state, products.get(single.size()), out);
    } else {
      climb(state, single, out);
    }
  }

  private static Polynomial product(List<Polynomial> factors) {
    return factors.stream().reduce(Polynomial::times).orElseThrow();
  }

  /** The factors of r that may vanish; none if r cannot vanish. */
  private List<Polynomial> remaining(State s, Polynomial r) {
    if (numbers.containsAll(r.support())) {
      return List.of();
    }
    List<Polynomial> out = new ArrayList<>();
    for (Polynomial f : factors.of(r)) {
      if (!s.nonZero().contains(f)) {
        out.add(f);
      }
    }
    return out;
  }

  private void branch(State s, List<Polynomial> factors, List<Piece> out) {
    List<Polynomial> others = new ArrayList<>(s.equations());
    others.remove(product(factors));
    for (int k = 0; k < factors.size(); k++) {
      List<Polynomial> equations = new ArrayList<>(others);
      equations.add(factors.get(k));
      split(s.with(equations).off(factors.subList(0, k)), out);
    }
  }

  // ---------------------------------------------------------------- equations linear in a variable

  private record Linear(Polynomial equation, int variable, int cost) {
    Polynomial slope() {
      return equation.coefficient(variable, 1);
    }

    Polynomial rest() {
      return equation.coefficient(variable, 0);
    }
  }

  private Optional<Linear> cheapestLinear(State s, List<Polynomial> equations) {
    Linear best = null;
    for (Polynomial e : equations) {
      for (int x : e.support()) {
        if (e.degree(x) == 1 && isFree(s.chain(), x)) {
          Linear l = new Linear(e, x, cost(s, e.coefficient(x, 1)) * 1000 + e.termCount());
          if (best == null || l.cost() < best.cost()) {
            best = l;
          }
        }
      }
    }
    return Optional.ofNullable(best)
        .map(l -> new Linear(l.equation(), l.variable(), l.cost() / 1000));
  }

  private boolean isFree(Chain chain, int x) {
    return chain.rules().stream().noneMatch(r -> r.variable() == x);
  }

  /** 0 for a number, 1 for what is known not to vanish, more for longer coefficients. */
  private int cost(State s, Polynomial slope) {
    if (numbers.containsAll(slope.support())) {
      return 0;
    }
    if (near.isPresent() && near.get().vanishes(slope)) {
      return UNWELCOME;
    }
    if (remaining(s, slope).isEmpty()) {
      return 1;
    }
    return 2 * slope.termCount() + slope.totalDegree();
  }

  private void solve(State s, Linear l, List<Piece> out) {
    List<Polynomial> others = new ArrayList<>(s.equations());
    others.remove(l.equation());
    if (l.cost() > 1) {
      List<Polynomial> degenerate = new ArrayList<>(others);
      degenerate.add(l.slope());
      degenerate.add(l.rest());
      split(s.with(degenerate), out);
    }
    List<Polynomial> off = l.cost() == 0 ? List.of() : factors.of(l.slope());
    List<Chain.Rule> demoted = storeysWith(s.chain(), l.variable());
    demoted.forEach(r -> others.add(r.equation()));
    Chain below = without(s.chain(), demoted);
    split(moved(s.with(others).off(off), withLinear(below, l.variable(), l.equation())), out);
  }

  /** The rules of the tower, numbers excepted, from the first one on that holds a variable. */
  private List<Chain.Rule> storeysWith(Chain chain, int x) {
    List<Chain.Rule> storeys = storeys(chain);
    for (int k = 0; k < storeys.size(); k++) {
      if (storeys.get(k).equation().contains(x)) {
        return storeys.subList(k, storeys.size());
      }
    }
    return List.of();
  }

  private List<Chain.Rule> storeys(Chain chain) {
    return chain.tower().stream().filter(r -> !numbers.contains(r.variable())).toList();
  }

  private static Chain without(Chain chain, List<Chain.Rule> rules) {
    return new Chain(
        chain.variables(), chain.rules().stream().filter(r -> !rules.contains(r)).toList());
  }

  /** Longer polynomials are not worth a factorization only to recognise their factors later. */
  private static boolean isShort(Polynomial p) {
    return p.termCount() <= 40 && p.totalDegree() <= 12;
  }

  /** The state on another chain, with what follows for the polynomials that do not vanish. */
  private State moved(State s, Chain chain) {
    List<Polynomial> known = new ArrayList<>();
    for (Polynomial p : s.nonZero()) {
      Polynomial r = chain.reduced(p);
      if (!r.isZero() && !r.equals(p) && isShort(r)) {
        known.addAll(factors.of(r));
      }
    }
    return s.on(chain).off(known);
  }

  /** The chain with one more linear rule, put into the linear ones that it has. */
  private static Chain withLinear(Chain chain, int x, Polynomial equation) {
    Chain alone = new Chain(chain.variables(), List.of(new Chain.Rule(x, equation)));
    List<Chain.Rule> rules = new ArrayList<>();
    for (Chain.Rule r : chain.rules()) {
      rules.add(
          r.isLinear() && r.equation().contains(x)
              ? new Chain.Rule(r.variable(), cleared(alone.reduced(r.equation()), r.variable()))
              : r);
    }
    rules.add(0, new Chain.Rule(x, equation));
    return new Chain(chain.variables(), rules);
  }

  /** An equation without factors that are free of its own variable. */
  private static Polynomial cleared(Polynomial equation, int x) {
    Polynomial content =
        equation.coefficientsIn(x).stream()
            .reduce(Polynomial.zero(equation.variables()), Polynomial::gcd);
    return equation.over(content).primitive();
  }

  // ---------------------------------------------------------------- the tower

  /** All equations are irreducible and linear in no free variable. */
  private void climb(State s, List<Polynomial> equations, List<Piece> out) {
    Polynomial e =
        equations.stream()
            .min(
                Comparator.comparingInt((Polynomial p) -> p.support().size())
                    .thenComparing(Polynomial::totalDegree)
                    .thenComparing(Polynomial::termCount)
                    .thenComparing(Polynomial::toString))
            .orElseThrow();
    Optional<Integer> x =
        e.support().stream()
            .filter(v -> isFree(s.chain(), v) && storeysWith(s.chain(), v).isEmpty())
            .min(Comparator.comparingInt(e::degree));
    if (x.isPresent()) {
      raise(s, e, x.get(), out);
    } else {
      project(s, e, out);
    }
  }

  /** Adds the norm of an equation between free variables and tower, and opens the tower again. */
  private void project(State s, Polynomial e, List<Piece> out) {
    List<Chain.Rule> storeys = storeys(s.chain());
    Polynomial norm = e;
    for (int k = storeys.size() - 1; k >= 0; k--) {
      Chain.Rule r = storeys.get(k);
      if (norm.contains(r.variable())) {
        norm = s.chain().reduced(r.equation().resultant(norm, r.variable())).primitive();
      }
    }
    if (norm.isZero()) {
      throw new IllegalStateException("a tower that is not irreducible: " + s.chain().rules());
    }
    List<Polynomial> equations = new ArrayList<>(s.equations());
    storeys.forEach(r -> equations.add(r.equation()));
    equations.add(norm);
    split(moved(s.with(equations), without(s.chain(), storeys)), out);
  }

  /** Puts an equation on top of the tower, factor by factor. */
  private void raise(State s, Polynomial e, int x, List<Piece> out) {
    List<Polynomial> factors = ChainFactoring.inVariable(s.chain(), e, x);
    List<Polynomial> others = new ArrayList<>(s.equations());
    others.remove(e);
    Polynomial initial = e.coefficient(x, e.degree(x));
    List<Polynomial> off = new ArrayList<>();
    if (!remainingOrNone(s, initial).isEmpty()) {
      List<Polynomial> degenerate = new ArrayList<>(s.equations());
      degenerate.add(initial);
      split(s.with(degenerate), out);
    }
    addFactors(off, initial);
    boolean splits = factors.size() > 1 || factors.get(0).degree(x) < e.degree(x);
    if (splits) {
      Polynomial leading =
          factors.stream()
              .map(g -> g.coefficient(x, g.degree(x)))
              .reduce(Polynomial::times)
              .orElseThrow();
      State here = s.off(off);
      if (!remainingOrNone(here, leading).isEmpty()) {
        List<Polynomial> degenerate = new ArrayList<>(s.equations());
        degenerate.add(leading);
        split(here.with(degenerate), out);
      }
      addFactors(off, leading);
    }
    for (Polynomial g : splits ? factors : List.of(e)) {
      split(moved(s.with(others).off(off), raised(s.chain(), x, g)), out);
      addFactors(off, g);
    }
  }

  private static Chain raised(Chain chain, int x, Polynomial g) {
    if (g.degree(x) == 1) {
      return withLinear(chain, x, g);
    }
    List<Chain.Rule> rules = new ArrayList<>(chain.rules());
    rules.add(new Chain.Rule(x, g));
    return new Chain(chain.variables(), rules);
  }

  private List<Polynomial> remainingOrNone(State s, Polynomial p) {
    Polynomial r = s.chain().reduced(p);
    return r.isZero() ? List.of(r) : remaining(s, r);
  }

  private void addFactors(List<Polynomial> off, Polynomial p) {
    if (!numbers.containsAll(p.support())) {
      off.addAll(factors.of(p));
    }
  }
}
