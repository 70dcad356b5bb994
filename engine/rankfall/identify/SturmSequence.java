package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Domain;
import rankfall.exact.Rationals;
import rankfall.lie.SignRule;

/**
 * Real roots of a polynomial over an ordered field, by Sturm's sequence (Basu, Pollack, Roy,
 * Algorithms in Real Algebraic Geometry, section 2.2.2).
 *
 * @param <E> the coefficients
 */
final class SturmSequence<E> {
  private static final BigFraction HALF = BigFraction.of(1, 2);
  private final Ground<E> ground;
  private final SignRule<E> signs;
  private final List<List<E>> sequence;

  private SturmSequence(Ground<E> ground, SignRule<E> signs, List<List<E>> sequence) {
    this.ground = ground;
    this.signs = signs;
    this.sequence = sequence;
  }

  /**
   * The sequence of a polynomial.
   *
   * @param coefficients the constant one first; irreducible over the field, of degree 2 or more, so
   *     that no rational number is a root
   */
  static <E> SturmSequence<E> of(Ground<E> ground, List<E> coefficients) {
    return of(ground, coefficients, derivative(ground, coefficients));
  }

  /**
   * The number of real roots in an interval at which another polynomial is positive, minus that of
   * those at which it is negative.
   *
   * @param coefficients the constant one first; irreducible over the field, of degree 2 or more
   * @param other coefficients of the other, the constant one first, not all 0
   * @param low below
   * @param high above
   */
  static <E> int weighted(
      Ground<E> ground, List<E> coefficients, List<E> other, BigFraction low, BigFraction high) {
    List<E> derivative = derivative(ground, coefficients);
    List<E> product = new ArrayList<>();
    for (int k = 0; k < derivative.size() + other.size() - 1; k++) {
      E sum = ground.domain().zero();
      for (int i = Math.max(0, k - other.size() + 1);
          i <= Math.min(k, derivative.size() - 1);
          i++) {
        sum = ground.domain().plus(sum, ground.domain().times(derivative.get(i), other.get(k - i)));
      }
      product.add(sum);
    }
    SturmSequence<E> queries = of(ground, coefficients, product);
    return queries.below(high) - queries.below(low);
  }

  private static <E> SturmSequence<E> of(Ground<E> ground, List<E> coefficients, List<E> second) {
    SturmSequence<E> out =
        new SturmSequence<>(ground, ground.signs().orElseThrow(), new ArrayList<>());
    out.sequence.add(out.normal(coefficients));
    List<E> next = out.normal(second);
    while (!next.isEmpty()) {
      out.sequence.add(next);
      int last = out.sequence.size() - 1;
      next = out.negativeRemainder(out.sequence.get(last - 1), out.sequence.get(last));
    }
    return out;
  }

  private static <E> List<E> derivative(Ground<E> ground, List<E> coefficients) {
    List<E> derivative = new ArrayList<>();
    for (int k = 1; k < coefficients.size(); k++) {
      E factor = ground.integer(BigInteger.valueOf(k));
      derivative.add(ground.domain().times(factor, coefficients.get(k)));
    }
    return derivative;
  }

  /** A positive multiple in normal form, without zeros at the end. */
  private List<E> normal(List<E> p) {
    List<E> entries = ground.domain().normal(p).entries();
    int n = entries.size();
    while (n > 0 && ground.domain().isZero(entries.get(n - 1))) {
      n--;
    }
    if (n == 0) {
      return List.of();
    }
    boolean same = signs.signum(entries.get(n - 1)) == signs.signum(p.get(n - 1));
    return entries.subList(0, n).stream().map(c -> same ? c : ground.domain().negate(c)).toList();
  }

  /** A positive multiple of {@code -(a mod b)}. */
  private List<E> negativeRemainder(List<E> a, List<E> b) {
    Domain<E> domain = ground.domain();
    List<E> rest = a;
    E lead = b.get(b.size() - 1);
    while (rest.size() >= b.size()) {
      int shift = rest.size() - b.size();
      E top = rest.get(rest.size() - 1);
      List<E> next = new ArrayList<>();
      for (int k = 0; k + 1 < rest.size(); k++) {
        E sum = domain.times(lead, rest.get(k));
        if (k >= shift) {
          sum = domain.plus(sum, domain.negate(domain.times(top, b.get(k - shift))));
        }
        next.add(signs.signum(lead) > 0 ? sum : domain.negate(sum));
      }
      rest = normal(next);
    }
    return rest.stream().map(domain::negate).toList();
  }

  /** The number of real roots. */
  int count() {
    return variations(infinite(-1)) - variations(infinite(1));
  }

  private List<Integer> infinite(int side) {
    return sequence.stream()
        .map(p -> signs.signum(p.get(p.size() - 1)) * (p.size() % 2 == 0 ? side : 1))
        .toList();
  }

  private static int variations(List<Integer> signs) {
    List<Integer> some = signs.stream().filter(s -> s != 0).toList();
    int count = 0;
    for (int k = 1; k < some.size(); k++) {
      count += some.get(k).equals(some.get(k - 1)) ? 0 : 1;
    }
    return count;
  }

  private int below(BigFraction x) {
    List<Integer> at = sequence.stream().map(p -> signs.signum(value(p, x))).toList();
    return variations(infinite(-1)) - variations(at);
  }

  /** The value at a rational number, times a positive integer. */
  private E value(List<E> p, BigFraction x) {
    Domain<E> domain = ground.domain();
    E sum = domain.zero();
    for (int k = 0; k < p.size(); k++) {
      BigInteger factor =
          Rationals.numerator(x).pow(k).multiply(Rationals.denominator(x).pow(p.size() - 1 - k));
      sum = domain.plus(sum, domain.times(ground.integer(factor), p.get(k)));
    }
    return sum;
  }

  /**
   * Rational numbers between the real roots; none is a root.
   *
   * @return ascending, one less than there are roots
   */
  List<BigFraction> separators() {
    int roots = count();
    BigFraction bound = bound();
    List<BigFraction> out = new ArrayList<>();
    for (int k = 1; k < roots; k++) {
      out.add(after(k, bound.negate(), bound));
    }
    return out;
  }

  /** A number such that all real roots lie between it and its negative. */
  BigFraction bound() {
    int roots = count();
    BigFraction bound = BigFraction.ONE;
    while (below(bound) - below(bound.negate()) < roots) {
      bound = bound.multiply(2);
    }
    return bound;
  }

  /** A number with exactly k roots below it, by bisection. */
  private BigFraction after(int k, BigFraction low, BigFraction high) {
    BigFraction middle = low.add(high).multiply(HALF);
    int found = below(middle);
    if (found == k) {
      return middle;
    }
    return found > k ? after(k, low, middle) : after(k, middle, high);
  }
}
