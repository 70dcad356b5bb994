package rankfall.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain.Rule;

/**
 * Real values for constants that a chain defines: each root of a tower is chosen among the real
 * ones of its rule. Signs of polynomials in these constants are exact.
 *
 * <p>Every coordinate is a real algebraic number over Q, found among the real roots of the norm of
 * its rule (Trager 1976); the roots that belong to the chosen values below are those at which the
 * rule, square-free at these values, changes its sign.
 */
public final class TowerPoint {
  private static final int STEP = 32;
  private final Chain chain;
  private final SortedMap<Integer, AlgebraicNumber> coordinates;
  private final List<Rule> linear;

  private TowerPoint(
      Chain chain, SortedMap<Integer, AlgebraicNumber> coordinates, List<Rule> linear) {
    this.chain = chain;
    this.coordinates = Collections.unmodifiableSortedMap(new TreeMap<>(coordinates));
    this.linear = List.copyOf(linear);
  }

  /**
   * {@return the point at which every chosen tower variable is the real root nearest to a number}
   *
   * @param chain rules; those of the chosen variables hold no variable but chosen ones
   * @param near a number for each tower variable that is to have a value; tower variables left out
   *     (such as the imaginary unit) have none, and a polynomial that holds them has no sign
   * @throws IllegalArgumentException if a rule has no real root, or two are equally near, or it
   *     holds a variable without a value
   */
  public static TowerPoint of(Chain chain, Map<Integer, BigFraction> near) {
    TowerPoint point = new TowerPoint(chain, new TreeMap<>(), List.of());
    for (Rule r : chain.tower()) {
      BigFraction value = near.get(r.variable());
      if (value != null) {
        point = point.with(r, nearest(point.roots(r), value, name(chain, r), r.equation()));
      }
    }
    return point.withLinear();
  }

  /** The point with given values of the tower variables, which satisfy the rules. */
  static TowerPoint of(Chain chain, SortedMap<Integer, AlgebraicNumber> coordinates) {
    return new TowerPoint(chain, coordinates, List.of()).withLinear();
  }

  /** Linear rules in the chosen variables give values too. */
  private TowerPoint withLinear() {
    TowerPoint point = this;
    for (Rule r : chain.rules()) {
      if (r.isLinear() && point.covers(r.equation(), r.variable())) {
        List<Rule> more = new ArrayList<>(point.linear);
        more.add(r);
        point = new TowerPoint(chain, point.coordinates, more);
      }
    }
    return point;
  }

  private static String name(Chain chain, Rule r) {
    return chain.variables().names().get(r.variable());
  }

  private static AlgebraicNumber nearest(
      List<AlgebraicNumber> roots, BigFraction value, String name, Polynomial rule) {
    if (roots.isEmpty()) {
      throw new IllegalArgumentException(name + " has no real value: " + rule + " = 0");
    }
    AlgebraicNumber best = roots.get(0);
    for (AlgebraicNumber r : roots.subList(1, roots.size())) {
      int c = compareSum(best, r, value.add(value));
      if (c == 0) {
        throw new IllegalArgumentException(
            "two values of " + name + " are equally near to " + Rationals.text(value));
      }
      best = c < 0 ? r : best;
    }
    return best;
  }

  /** The sign of a + b - sum. */
  private static int compareSum(AlgebraicNumber a, AlgebraicNumber b, BigFraction sum) {
    List<AlgebraicNumber> conjugates = AlgebraicNumber.rootsOf(b.minimalPolynomial());
    Univariate mirrored = Univariate.of(b.minimalPolynomial()).mirrored(sum);
    List<AlgebraicNumber> images = AlgebraicNumber.rootsOf(mirrored.polynomial());
    return a.compareTo(images.get(images.size() - 1 - conjugates.indexOf(b)));
  }

  /**
   * The points above this one, ascending in the variable of one more rule.
   *
   * @param r free of variables of linear rules; irreducible over the numbers of this point, or at
   *     least without multiple roots there
   */
  List<TowerPoint> extended(Rule r) {
    List<Rule> more = new ArrayList<>(chain.rules());
    more.add(r.isLinear() ? 0 : more.size(), r);
    Chain longer = new Chain(chain.variables(), more);
    if (r.isLinear()) {
      List<Rule> solved = new ArrayList<>(linear);
      solved.add(r);
      return List.of(new TowerPoint(longer, coordinates, solved));
    }
    TowerPoint above = new TowerPoint(longer, coordinates, linear);
    return roots(r).stream().map(a -> above.with(r, a)).toList();
  }

  /** The rules that define the numbers of this point. */
  Chain chain() {
    return chain;
  }

  private TowerPoint with(Rule r, AlgebraicNumber value) {
    SortedMap<Integer, AlgebraicNumber> more = new TreeMap<>(coordinates);
    more.put(r.variable(), value);
    return new TowerPoint(chain, more, linear);
  }

  private boolean covers(Polynomial p, int except) {
    return p.support().stream().allMatch(v -> v == except || coordinates.containsKey(v));
  }

  /**
   * The real values that the next rule allows at this point.
   *
   * @param r its equation holds its variable and variables with values here, and is irreducible
   *     over the field that these generate
   * @return ascending
   */
  List<AlgebraicNumber> roots(Rule r) {
    if (!covers(r.equation(), r.variable())) {
      throw new IllegalArgumentException(
          "the rule of "
              + name(chain, r)
              + " holds a variable without a real value: "
              + r.equation());
    }
    return new TowerRoots(this, r).all();
  }

  /** {@return the values of the tower variables, by position} */
  public SortedMap<Integer, AlgebraicNumber> coordinates() {
    return coordinates;
  }

  /**
   * {@return whether a polynomial holds only variables that have a value here}
   *
   * @param p any
   */
  public boolean covers(Polynomial p) {
    return p.support().stream()
        .allMatch(
            v -> coordinates.containsKey(v) || linear.stream().anyMatch(r -> r.variable() == v));
  }

  private void mustCover(Polynomial p) {
    for (int v : p.support()) {
      if (!covers(Polynomial.variable(p.variables(), v))) {
        throw new IllegalArgumentException(
            p.variables().names().get(v) + " has no real value here, so " + p + " has no sign");
      }
    }
  }

  /**
   * {@return the exact sign of a polynomial: -1, 0 or 1}
   *
   * @param p holds only variables that have a value here
   * @throws IllegalArgumentException if it holds another
   */
  public int sign(Polynomial p) {
    mustCover(p);
    if (p.isConstant()) {
      return p.isZero() ? 0 : p.constantValue().signum();
    }
    if (chain.vanishes(p)) {
      return 0;
    }
    Polynomial shorter =
        chain.rules().stream().allMatch(r -> r.initial().isOne()) ? chain.reduced(p) : p;
    BigFraction width = BigFraction.of(1, STEP);
    while (true) {
      OptionalInt s = on(shorter, width).sign();
      if (s.isPresent()) {
        return s.getAsInt();
      }
      width = width.multiply(width);
    }
  }

  /**
   * {@return the exact sign of a quotient: -1, 0 or 1}
   *
   * @param f holds only variables that have a value here
   * @throws ArithmeticException if the denominator vanishes
   */
  public int sign(RationalFunction f) {
    int below = sign(f.denominator());
    if (below == 0) {
      throw new ArithmeticException("pole of " + f);
    }
    return sign(f.numerator()) * below;
  }

  /**
   * Compares two values.
   *
   * @param p one polynomial
   * @param q another
   * @return the sign of {@code p - q}
   */
  public int compare(Polynomial p, Polynomial q) {
    return sign(p.minus(q));
  }

  /** An enclosure from coordinates of the given width. */
  private Interval on(Polynomial p, BigFraction width) {
    Map<Integer, Interval> x = new HashMap<>();
    coordinates.forEach((v, a) -> x.put(v, a.within(width)));
    for (Rule r : linear) {
      if (p.contains(r.variable())) {
        x.put(r.variable(), solved(r, width));
      }
    }
    return enclosure(p, x);
  }

  private Interval solved(Rule r, BigFraction width) {
    BigFraction w = width;
    while (true) {
      Interval below = on(r.initial(), w);
      if (!below.contains(BigFraction.ZERO)) {
        return on(r.equation().coefficient(r.variable(), 0), w)
            .times(Interval.of(BigFraction.ONE.negate()))
            .over(below);
      }
      w = w.divide(STEP);
    }
  }

  /** An enclosure of the values of a polynomial where its variables lie in intervals. */
  static Interval enclosure(Polynomial p, Map<Integer, Interval> x) {
    Interval sum = Interval.of(BigFraction.ZERO);
    for (Term t : p.terms()) {
      Interval product = Interval.of(BigFraction.of(t.coefficient()));
      for (int v : p.support()) {
        if (t.exponents().get(v) > 0) {
          product = product.times(x.get(v).pow(t.exponents().get(v)));
        }
      }
      sum = sum.plus(product);
    }
    return sum;
  }

  /**
   * {@return an interval that holds the value of a polynomial}
   *
   * @param p holds only variables that have a value here
   * @param width at most so wide; positive
   */
  public Interval within(Polynomial p, BigFraction width) {
    mustCover(p);
    BigFraction w = width;
    while (true) {
      Interval i = on(p, w);
      if (Rationals.compare(i.width(), width) <= 0) {
        return i;
      }
      w = w.divide(STEP);
    }
  }

  /**
   * {@return the greatest integer not above the value}
   *
   * @param p holds only variables that have a value here
   */
  public BigInteger floor(Polynomial p) {
    Interval i = within(p, BigFraction.of(1, 2));
    BigInteger low = Rationals.floor(i.lower());
    BigInteger high = Rationals.floor(i.upper());
    return high.equals(low) || sign(p.minus(Polynomial.constant(p.variables(), high))) < 0
        ? low
        : high;
  }

  /**
   * {@return the least integer not below the value}
   *
   * @param p holds only variables that have a value here
   */
  public BigInteger ceil(Polynomial p) {
    return floor(p.negate()).negate();
  }

  /**
   * {@return the value rounded to a decimal; halves are rounded up}
   *
   * @param p holds only variables that have a value here
   * @param digits after the point, 0 or more
   */
  public BigDecimal decimal(Polynomial p, int digits) {
    Polynomial half = Polynomial.one(p.variables());
    Polynomial twice = p.times(BigInteger.TEN.pow(digits).multiply(BigInteger.TWO)).plus(half);
    return new BigDecimal(floorOfHalf(twice), digits);
  }

  private BigInteger floorOfHalf(Polynomial twice) {
    return floor(twice).shiftRight(1);
  }

  /**
   * {@return a short rational number strictly between two different values}
   *
   * @param p one polynomial
   * @param q another
   * @throws IllegalArgumentException if the values are equal
   */
  public BigFraction between(Polynomial p, Polynomial q) {
    int c = compare(p, q);
    if (c == 0) {
      throw new IllegalArgumentException("nothing lies between equal values: " + p + ", " + q);
    }
    BigFraction width = BigFraction.ONE;
    while (true) {
      BigFraction low = within(c < 0 ? p : q, width).upper();
      BigFraction high = within(c < 0 ? q : p, width).lower();
      if (Rationals.compare(low, high) < 0) {
        return new Interval(low, high).simplestInside();
      }
      width = width.divide(STEP);
    }
  }
}
