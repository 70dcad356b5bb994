package rankfall.exact;

import java.util.ArrayList;
import java.util.List;

/**
 * An irreducible set of points, given at its general point by a triangular set of equations (a
 * chain in the sense of Ritt and Wu).
 *
 * <p>A rule says how one variable depends on the others. Linear rules {@code A*x + B} hold no
 * variable of another linear rule; the rules of higher degree form a tower, each irreducible over
 * the fractions of the ones before. All variables without a rule are free. The set is the closure
 * of the points that satisfy the rules and at which no initial (leading coefficient of a rule in
 * its variable) vanishes.
 *
 * <p>As a {@link Domain} this is the ring of polynomials on the set; only at the general point.
 *
 * @param variables the ring
 * @param rules linear ones in any order, then the tower from the bottom
 */
public record Chain(Variables variables, List<Rule> rules) implements Domain<Polynomial> {
  /** Copies the rules. */
  public Chain {
    rules = List.copyOf(rules);
  }

  /**
   * How a variable depends on others.
   *
   * @param variable its position
   * @param equation of degree 1 or more in the variable
   */
  public record Rule(int variable, Polynomial equation) {
    /** The degree in the variable. */
    public int degree() {
      return equation.degree(variable);
    }

    /** The leading coefficient in the variable; not 0 at the general point. */
    public Polynomial initial() {
      return equation.coefficient(variable, degree());
    }

    /** Whether the variable is given rationally. */
    public boolean isLinear() {
      return degree() == 1;
    }
  }

  /** The whole space. */
  public static Chain free(Variables variables) {
    return new Chain(variables, List.of());
  }

  /** The variables without a rule, ascending. */
  public List<Integer> freeVariables() {
    List<Integer> bound = rules.stream().map(Rule::variable).toList();
    List<Integer> out = new ArrayList<>();
    for (int v = 0; v < variables.count(); v++) {
      if (!bound.contains(v)) {
        out.add(v);
      }
    }
    return out;
  }

  /** The dimension of the set: the number of free variables. */
  public int dimension() {
    return variables.count() - rules.size();
  }

  /** The rules of degree 2 and more, from the bottom. */
  public List<Rule> tower() {
    return rules.stream().filter(r -> !r.isLinear()).toList();
  }

  /** The initials that are not constant. */
  public List<Polynomial> initials() {
    return rules.stream().map(Rule::initial).filter(p -> !p.isConstant()).toList();
  }

  /**
   * Polynomials brought to the free variables and the tower, multiplied by one common product of
   * initials.
   *
   * @param polynomials any
   * @return as many, each 0 exactly if it vanishes on the whole set
   */
  public List<Polynomial> reduced(List<Polynomial> polynomials) {
    List<Polynomial> out = polynomials;
    for (Rule r : rules) {
      if (r.isLinear()) {
        out = reducedBy(r, out);
      }
    }
    List<Rule> tower = tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      out = reducedBy(tower.get(k), out);
    }
    return out;
  }

  /** One polynomial reduced; 0 exactly if it vanishes on the whole set. */
  public Polynomial reduced(Polynomial p) {
    return reduced(List.of(p)).get(0);
  }

  /** Whether a polynomial vanishes on the whole set. */
  public boolean vanishes(Polynomial p) {
    return p.isZero() || reduced(p).isZero();
  }

  private static List<Polynomial> reducedBy(Rule r, List<Polynomial> polynomials) {
    int v = r.variable();
    int d = r.degree();
    int steps = polynomials.stream().mapToInt(p -> p.degree(v) - d + 1).max().orElse(0);
    if (steps <= 0) {
      return polynomials;
    }
    Polynomial initial = r.initial();
    Polynomial tail = r.equation().minus(initial.times(power(r.equation().variables(), v, d)));
    return polynomials.stream().map(p -> pseudoRemainder(p, v, d, initial, tail, steps)).toList();
  }

  private static Polynomial power(Variables variables, int v, int d) {
    return Polynomial.variable(variables, v).pow(d);
  }

  /** {@code initial^steps * p} reduced below degree d in v by {@code initial*v^d = -tail}. */
  private static Polynomial pseudoRemainder(
      Polynomial p, int v, int d, Polynomial initial, Polynomial tail, int steps) {
    boolean monic = initial.isOne();
    Polynomial rest = p;
    int done = 0;
    while (!rest.isZero() && rest.degree(v) >= d) {
      int e = rest.degree(v);
      Polynomial lead = rest.coefficient(v, e);
      Polynomial shift = power(p.variables(), v, e - d);
      Polynomial lower = rest.minus(lead.times(power(p.variables(), v, e)));
      rest = (monic ? lower : lower.times(initial)).minus(lead.times(tail).times(shift));
      done++;
    }
    return monic || rest.isZero() ? rest : rest.times(initial.pow(steps - done));
  }

  @Override
  public Polynomial zero() {
    return Polynomial.zero(variables);
  }

  @Override
  public Polynomial one() {
    return Polynomial.one(variables);
  }

  @Override
  public Polynomial plus(Polynomial a, Polynomial b) {
    return a.plus(b);
  }

  @Override
  public Polynomial times(Polynomial a, Polynomial b) {
    return a.times(b);
  }

  @Override
  public Polynomial negate(Polynomial a) {
    return a.negate();
  }

  @Override
  public boolean isZero(Polynomial a) {
    return a.isZero();
  }

  @Override
  public Normal<Polynomial> normal(List<Polynomial> row) {
    return normal(row, List.of());
  }

  /**
   * A row in normal form, found faster where the common factor is a product of known ones.
   *
   * @param row any entries
   * @param expected primitive factors that are likely; the answer is the same without them
   */
  public Normal<Polynomial> normal(List<Polynomial> row, List<Polynomial> expected) {
    List<Polynomial> entries = reduced(row);
    Polynomial content = commonFactor(entries, expected);
    if (content.isZero() || content.isOne()) {
      return new Normal<>(entries, one());
    }
    return new Normal<>(entries.stream().map(p -> p.over(content)).toList(), content);
  }

  private Polynomial commonFactor(List<Polynomial> entries, List<Polynomial> expected) {
    List<Polynomial> some = entries.stream().filter(p -> !p.isZero()).toList();
    return some.isEmpty() ? zero() : CommonFactor.of(some, expected);
  }

  @Override
  public List<Polynomial> cofactors(Polynomial a, Polynomial b) {
    Polynomial g = a.gcd(b);
    return List.of(a.over(g), b.over(g));
  }

  @Override
  public int weight(Polynomial a) {
    if (a.isConstant()) {
      return 0;
    }
    return a.termCount() == 1 ? a.totalDegree() : 100 * a.termCount() + a.totalDegree();
  }
}
