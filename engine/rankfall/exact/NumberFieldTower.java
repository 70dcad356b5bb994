package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Real algebraic numbers, each a variable with an equation that is irreducible over the numbers
 * before it, and an interval that tells which root is meant.
 *
 * <p>Factors over the tower come from the norm: the polynomial shifted by a combination of the
 * tower's numbers, its resultants taken down to the rationals, factored there, and common divisors
 * taken back (Trager 1976).
 *
 * @param chain its variables are the numbers; one rule each, from the bottom, none linear
 * @param roots one a number, in the order of the variables
 */
public record NumberFieldTower(Chain chain, List<ConstantRoot> roots) {
  private static final int STEPS = 16;
  private static final int NEAR_ROUNDS = 20;

  /** Copies the roots. */
  public NumberFieldTower {
    roots = List.copyOf(roots);
  }

  /** The rational numbers. */
  public static NumberFieldTower rational() {
    return new NumberFieldTower(Chain.free(new Variables(List.of())), List.of());
  }

  /**
   * A tower and one of its numbers.
   *
   * @param tower with the number in it
   * @param value the number, in the tower's variables
   */
  public record Extension(NumberFieldTower tower, RationalFunction value) {}

  /**
   * The tower with one more number.
   *
   * @param name its variable, where it needs one
   * @param coefficients of a polynomial, constant term first, last one not 0
   * @param near the real root nearest to this number is meant
   * @return the number is a new variable, unless it lies in this tower
   * @throws ArithmeticException if there is no real root, or two that are equally near
   */
  public Extension with(String name, List<BigFraction> coefficients, BigFraction near) {
    Variables x = new Variables(List.of(name));
    Polynomial given = integral(x, coefficients);
    ConstantRoot root = nearest(Factoring.irreducible(given), near);
    List<String> names = new ArrayList<>(chain.variables().names());
    names.add(name);
    Chain below = moved(new Variables(names));
    Polynomial over =
        integral(below.variables(), root.coefficients().stream().map(BigFraction::of).toList());
    return extended(below, chosen(below, factors(below, over), root), root);
  }

  private Extension extended(Chain below, Polynomial equation, ConstantRoot root) {
    int v = below.variables().count() - 1;
    if (equation.degree(v) == 1) {
      Polynomial above = inRing(equation.coefficient(v, 0).negate(), chain.variables());
      Polynomial under = inRing(equation.coefficient(v, 1), chain.variables());
      return new Extension(this, ChainFractions.canonical(chain, above, under));
    }
    List<Chain.Rule> rules = new ArrayList<>(below.rules());
    rules.add(new Chain.Rule(v, equation));
    List<ConstantRoot> all = new ArrayList<>(roots);
    all.add(root);
    NumberFieldTower tower = new NumberFieldTower(new Chain(below.variables(), rules), all);
    return new Extension(tower, RationalFunction.of(Polynomial.variable(below.variables(), v)));
  }

  private Chain moved(Variables to) {
    return new Chain(
        to,
        chain.rules().stream()
            .map(r -> new Chain.Rule(r.variable(), inRing(r.equation(), to)))
            .toList());
  }

  /**
   * A polynomial in another ring, by the names of its variables.
   *
   * @param p any
   * @param to holds all variables that occur in p
   * @return the same polynomial
   */
  public static Polynomial inRing(Polynomial p, Variables to) {
    List<Integer> support = p.support();
    List<Integer> at = support.stream().map(v -> to.index(p.variables().names().get(v))).toList();
    List<Term> out = new ArrayList<>();
    for (Term t : p.terms()) {
      List<Integer> e = new ArrayList<>(java.util.Collections.nCopies(to.count(), 0));
      for (int k = 0; k < support.size(); k++) {
        e.set(at.get(k), t.exponents().get(support.get(k)));
      }
      out.add(new Term(t.coefficient(), e));
    }
    return Polynomial.of(to, out);
  }

  /** The polynomial in the last variable, freed of denominators. */
  private static Polynomial integral(Variables ring, List<BigFraction> coefficients) {
    BigInteger d = BigInteger.ONE;
    for (BigFraction c : coefficients) {
      d = d.multiply(c.getDenominator()).divide(d.gcd(c.getDenominator()));
    }
    int v = ring.count() - 1;
    Polynomial sum = Polynomial.zero(ring);
    for (int k = 0; k < coefficients.size(); k++) {
      BigInteger c = coefficients.get(k).multiply(d).getNumerator();
      sum = sum.plus(Polynomial.variable(ring, v).pow(k).times(c));
    }
    return sum.primitive();
  }

  private static ConstantRoot nearest(List<Polynomial> irreducible, BigFraction near) {
    List<ConstantRoot> open = new ArrayList<>();
    for (Polynomial p : irreducible) {
      open.addAll(
          ConstantRoot.of(p.coefficientsIn(0).stream().map(Polynomial::constantValue).toList()));
    }
    if (open.isEmpty()) {
      throw new ArithmeticException("the polynomial has no real root");
    }
    for (int round = 0; round < NEAR_ROUNDS && open.size() > 1; round++) {
      BigFraction least =
          open.stream().map(r -> r.greatestDistance(near)).min(ConstantRoot.ORDER).orElseThrow();
      open =
          new ArrayList<>(
              open.stream()
                  .filter(r -> ConstantRoot.ORDER.compare(r.leastDistance(near), least) <= 0)
                  .map(r -> r.refined(STEPS))
                  .toList());
    }
    if (open.size() > 1) {
      throw new ArithmeticException("two real roots are equally near");
    }
    return open.get(0);
  }

  /**
   * The irreducible factors of a square-free polynomial in the last variable over a tower.
   *
   * @param below a rule for each other variable that occurs, from the bottom, none linear
   * @param f holds the last variable
   * @return each up to an element of the field
   */
  public static List<Polynomial> factors(Chain below, Polynomial f) {
    if (below.rules().isEmpty()) {
      return Factoring.irreducible(f);
    }
    Variables ring = below.variables();
    int v = ring.count() - 1;
    Polynomial x = Polynomial.variable(ring, v);
    for (int shift = 1; ; shift++) {
      Polynomial theta = Polynomial.zero(ring);
      BigInteger factor = BigInteger.valueOf(shift);
      for (Chain.Rule r : below.rules()) {
        theta = theta.plus(Polynomial.variable(ring, r.variable()).times(factor));
        factor = factor.multiply(BigInteger.valueOf(shift));
      }
      Polynomial norm = norm(below, f.substitute(v, x.minus(theta)));
      if (!norm.gcd(norm.derivative(v)).contains(v)) {
        List<Polynomial> out = new ArrayList<>();
        for (Polynomial g : Factoring.irreducible(norm)) {
          out.add(ChainFractions.gcd(below, f, g.substitute(v, x.plus(theta)), v));
        }
        return out;
      }
    }
  }

  private static Polynomial norm(Chain below, Polynomial f) {
    Polynomial out = f;
    for (int k = below.rules().size() - 1; k >= 0; k--) {
      Chain.Rule r = below.rules().get(k);
      out =
          out.contains(r.variable())
              ? r.equation().resultant(out, r.variable())
              : out.pow(r.degree());
    }
    return out.primitive();
  }

  /** The factor of which the root is a root; the others are shown not to vanish there. */
  private Polynomial chosen(Chain below, List<Polynomial> factors, ConstantRoot root) {
    List<ConstantRoot> at = new ArrayList<>(roots);
    at.add(root);
    List<Polynomial> open = factors;
    while (open.size() > 1) {
      List<ConstantRoot> now = at.stream().map(r -> r.refined(STEPS)).toList();
      open = open.stream().filter(p -> sign(p, now) == 0).toList();
      at = new ArrayList<>(now);
    }
    if (open.isEmpty() || open.get(0).degree(below.variables().count() - 1) < 1) {
      throw new IllegalStateException("no factor vanishes at the root");
    }
    return open.get(0);
  }

  /** The sign of a polynomial all over the intervals; 0 if its bounds do not tell. */
  private static int sign(Polynomial p, List<ConstantRoot> at) {
    Interval b = bounds(p, at);
    return b.lower().signum() > 0 ? 1 : b.upper().signum() < 0 ? -1 : 0;
  }

  /** Bounds of a polynomial all over the intervals. */
  private static Interval bounds(Polynomial p, List<ConstantRoot> at) {
    BigFraction low = BigFraction.ZERO;
    BigFraction high = BigFraction.ZERO;
    for (Term t : p.terms()) {
      BigFraction l = BigFraction.of(t.coefficient());
      BigFraction h = l;
      for (int k = 0; k < at.size(); k++) {
        for (int e = 0; e < t.exponents().get(k); e++) {
          List<BigFraction> ends =
              List.of(
                  l.multiply(at.get(k).low()),
                  l.multiply(at.get(k).high()),
                  h.multiply(at.get(k).low()),
                  h.multiply(at.get(k).high()));
          l = ends.stream().min(ConstantRoot.ORDER).orElseThrow();
          h = ends.stream().max(ConstantRoot.ORDER).orElseThrow();
        }
      }
      low = low.add(l);
      high = high.add(h);
    }
    return new Interval(low, high);
  }

  /**
   * A number of the tower, enclosed.
   *
   * @param p in any ring that names the tower's variables; no other variable may occur; not 0 as a
   *     number
   * @param bits how close
   * @return ends of one sign whose distance is at most 2^-bits times the end nearer to 0
   * @throws ArithmeticException if the number is 0
   */
  public Interval near(Polynomial p, int bits) {
    List<Polynomial> reduced = chain.reduced(List.of(inRing(p, chain.variables()), chain.one()));
    if (reduced.get(0).isZero()) {
      throw new ArithmeticException("0 has no relative bounds");
    }
    BigFraction scale = BigFraction.of(BigInteger.ONE, BigInteger.ONE.shiftLeft(bits));
    List<ConstantRoot> at = roots;
    while (true) {
      Interval b = bounds(reduced.get(0), at);
      BigFraction least = Rationals.min(b.lower().abs(), b.upper().abs());
      if (b.lower().signum() * b.upper().signum() > 0
          && Rationals.compare(b.width(), least.multiply(scale)) <= 0) {
        return b.over(Interval.of(BigFraction.of(reduced.get(1).constantValue())));
      }
      at = at.stream().map(r -> r.refined(STEPS)).toList();
    }
  }

  /**
   * The sign of a number of the tower, certified: 0 by the equations, else by intervals.
   *
   * @param p in any ring that names the tower's variables; no other variable may occur
   * @return -1, 0 or 1
   */
  public int sign(Polynomial p) {
    List<Polynomial> reduced = chain.reduced(List.of(inRing(p, chain.variables()), chain.one()));
    if (reduced.get(0).isZero()) {
      return 0;
    }
    List<ConstantRoot> at = roots;
    int sign = sign(reduced.get(0), at);
    while (sign == 0) {
      at = at.stream().map(r -> r.refined(STEPS)).toList();
      sign = sign(reduced.get(0), at);
    }
    return sign * reduced.get(1).constantValue().signum();
  }
}
