package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.OptionalInt;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * The real roots of a polynomial with integer coefficients in one variable, each once, isolated.
 *
 * <p>Descartes' rule of signs with bisection, on integers (Collins and Akritas 1976; Rouillier and
 * Zimmermann 2004). Roots are numbered from 0 in ascending order. An isolating interval is either a
 * point, which then is the root, or it holds exactly one root strictly between its ends; ends are
 * dyadic and may be roots themselves.
 */
public final class RealRoots {
  private final Univariate f;
  private final List<Interval> intervals;

  private RealRoots(Univariate squareFree, List<Interval> intervals) {
    this.f = squareFree;
    this.intervals = List.copyOf(intervals);
  }

  /**
   * {@return the roots of a polynomial}
   *
   * @param p not 0; at most one variable occurs in it
   * @throws ArithmeticException if p is 0
   * @throws IllegalArgumentException if two variables occur
   */
  public static RealRoots of(Polynomial p) {
    return of(Univariate.of(p));
  }

  /**
   * {@return the roots of a polynomial}
   *
   * @param coefficients the constant one first; not all 0
   * @throws ArithmeticException if all are 0
   */
  public static RealRoots of(List<BigInteger> coefficients) {
    return of(Univariate.of(coefficients));
  }

  static RealRoots of(Univariate p) {
    Univariate f = p.squareFree();
    List<Interval> out = new ArrayList<>();
    for (Interval r : positive(f.reflected())) {
      out.add(new Interval(r.upper().negate(), r.lower().negate()));
    }
    if (f.coefficient(0).signum() == 0) {
      out.add(Interval.of(BigFraction.ZERO));
    }
    out.addAll(positive(f.coefficients()));
    out.sort(Comparator.comparing(Interval::middle, Rationals::compare));
    return new RealRoots(f, out);
  }

  /** A piece of the search: f transformed so that the open interval becomes (0, 1). */
  private record Piece(BigInteger[] f, BigInteger at, int depth) {}

  private static List<Interval> positive(List<BigInteger> coefficients) {
    int zeros = 0;
    while (coefficients.get(zeros).signum() == 0) {
      zeros++;
    }
    BigInteger[] c = coefficients.subList(zeros, coefficients.size()).toArray(new BigInteger[0]);
    if (variations(c) == 0) {
      return List.of();
    }
    int bound = boundExponent(c);
    for (int k = 0; k < c.length; k++) {
      c[k] = bound >= 0 ? c[k].shiftLeft(bound * k) : c[k].shiftLeft(-bound * (c.length - 1 - k));
    }
    List<Interval> out = new ArrayList<>();
    Deque<Piece> open = new ArrayDeque<>();
    open.push(new Piece(c, BigInteger.ZERO, 0));
    while (!open.isEmpty()) {
      Piece p = open.pop();
      int v = variations(shifted(reversed(p.f)));
      if (v == 1) {
        out.add(
            new Interval(end(p.at, p.depth, bound), end(p.at.add(BigInteger.ONE), p.depth, bound)));
      } else if (v > 1) {
        BigInteger[] left = halved(p.f);
        BigInteger[] right = shifted(left);
        BigInteger at = p.at.shiftLeft(1);
        if (right[0].signum() == 0) {
          out.add(Interval.of(end(at.add(BigInteger.ONE), p.depth + 1, bound)));
          right = java.util.Arrays.copyOfRange(right, 1, right.length);
        }
        open.push(new Piece(left, at, p.depth + 1));
        open.push(new Piece(right, at.add(BigInteger.ONE), p.depth + 1));
      }
    }
    return out;
  }

  private static BigFraction end(BigInteger at, int depth, int bound) {
    int shift = bound - depth;
    return shift >= 0
        ? BigFraction.of(at.shiftLeft(shift))
        : BigFraction.of(at, BigInteger.ONE.shiftLeft(-shift));
  }

  /** An e with every positive root below 2^e (Cauchy's bound on the opposite coefficients). */
  private static int boundExponent(BigInteger[] c) {
    int n = c.length - 1;
    int sign = c[n].signum();
    int lead = c[n].bitLength() - 1;
    int e = Integer.MIN_VALUE;
    for (int k = 0; k < n; k++) {
      if (c[k].signum() == -sign) {
        int bits = c[k].bitLength() - lead;
        e = Math.max(e, Math.floorDiv(bits + (n - k) - 1, n - k));
      }
    }
    return e + 1;
  }

  private static int variations(BigInteger[] c) {
    int count = 0;
    int last = 0;
    for (BigInteger x : c) {
      int s = x.signum();
      if (s != 0) {
        count += last != 0 && s != last ? 1 : 0;
        last = s;
      }
    }
    return count;
  }

  private static BigInteger[] reversed(BigInteger[] c) {
    List<BigInteger> out = new ArrayList<>(List.of(c));
    Collections.reverse(out);
    return out.toArray(new BigInteger[0]);
  }

  /** Coefficients of f(x + 1). */
  private static BigInteger[] shifted(BigInteger[] c) {
    BigInteger[] out = c.clone();
    for (int i = 0; i < out.length - 1; i++) {
      for (int j = out.length - 2; j >= i; j--) {
        out[j] = out[j].add(out[j + 1]);
      }
    }
    return out;
  }

  /** Coefficients of 2^n f(x/2). */
  private static BigInteger[] halved(BigInteger[] c) {
    BigInteger[] out = c.clone();
    for (int k = 0; k < out.length; k++) {
      out[k] = out[k].shiftLeft(out.length - 1 - k);
    }
    return out;
  }

  /** {@return the number of different real roots} */
  public int count() {
    return intervals.size();
  }

  /** {@return the isolating intervals, ascending; two may share an end} */
  public List<Interval> intervals() {
    return intervals;
  }

  /**
   * {@return an isolating interval of at most the given width}
   *
   * @param root its number
   * @param width positive
   */
  public Interval refined(int root, BigFraction width) {
    return refined(f, intervals.get(root), width);
  }

  static Interval refined(Univariate f, Interval isolating, BigFraction width) {
    if (width.signum() <= 0) {
      throw new IllegalArgumentException("a width must be positive, not " + width);
    }
    if (Rationals.compare(isolating.width(), width) <= 0) {
      return isolating;
    }
    int left = signRightOf(f, isolating.lower());
    Interval r = isolating;
    while (Rationals.compare(r.width(), width) > 0) {
      BigFraction m = r.middle();
      int s = f.signAt(m);
      if (s == 0) {
        return Interval.of(m);
      }
      r = s == left ? new Interval(m, r.upper()) : new Interval(r.lower(), m);
    }
    return r;
  }

  private static int signRightOf(Univariate f, BigFraction at) {
    int s = f.signAt(at);
    return s != 0 ? s : f.derivative().signAt(at);
  }

  /**
   * {@return the sign of a root minus a rational number}
   *
   * @param root its number
   * @param value any
   */
  public int compare(int root, BigFraction value) {
    return compare(f, intervals.get(root), value);
  }

  static int compare(Univariate f, Interval isolating, BigFraction value) {
    if (isolating.isPoint()) {
      return Rationals.compare(isolating.lower(), value);
    }
    if (Rationals.compare(value, isolating.lower()) <= 0) {
      return 1;
    }
    if (Rationals.compare(value, isolating.upper()) >= 0) {
      return -1;
    }
    int s = f.signAt(value);
    return s == 0 ? 0 : s == signRightOf(f, isolating.lower()) ? 1 : -1;
  }

  /**
   * {@return the number of roots in a closed interval}
   *
   * @param where ends included
   */
  public int countIn(Interval where) {
    int n = 0;
    for (int k = 0; k < count(); k++) {
      n += compare(k, where.lower()) >= 0 && compare(k, where.upper()) <= 0 ? 1 : 0;
    }
    return n;
  }

  /**
   * The number of the root nearest to a rational number.
   *
   * @param value any
   * @return empty if there is no root, or if two are equally near
   */
  public OptionalInt nearest(BigFraction value) {
    if (count() == 0) {
      return OptionalInt.empty();
    }
    int above = 0;
    while (above < count() && compare(above, value) < 0) {
      above++;
    }
    if (above == 0 || above == count() || compare(above, value) == 0) {
      return OptionalInt.of(above == count() ? above - 1 : above);
    }
    BigFraction twice = value.add(value);
    if (equallyNear(above - 1, above, twice)) {
      return OptionalInt.empty();
    }
    BigFraction width = BigFraction.ONE;
    while (true) {
      Interval sum = refined(above - 1, width).plus(refined(above, width));
      if (Rationals.compare(sum.upper(), twice) < 0) {
        return OptionalInt.of(above);
      }
      if (Rationals.compare(sum.lower(), twice) > 0) {
        return OptionalInt.of(above - 1);
      }
      width = width.divide(16);
    }
  }

  /** Two neighbours sum up to a number exactly if both are roots of gcd(f(x), f(twice - x)). */
  private boolean equallyNear(int left, int right, BigFraction twice) {
    Univariate g = f.gcd(f.mirrored(twice));
    return g.degree() > 0 && isRoot(g, left) && isRoot(g, right);
  }

  private boolean isRoot(Univariate divisor, int root) {
    RealRoots r = of(divisor);
    Interval i = intervals.get(root);
    if (i.isPoint()) {
      return divisor.signAt(i.lower()) == 0;
    }
    for (int k = 0; k < r.count(); k++) {
      if (r.compare(k, i.lower()) > 0 && r.compare(k, i.upper()) < 0) {
        return true;
      }
    }
    return false;
  }
}
