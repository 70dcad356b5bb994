package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A real root of an irreducible polynomial, known by an interval that holds no other root.
 *
 * @param coefficients constant term first
 * @param low below the root, or the root itself if it is rational
 * @param high above the root, or the root itself if it is rational
 */
public record ConstantRoot(List<BigInteger> coefficients, BigFraction low, BigFraction high) {
  /** The order of the numbers; the library's own is wrong for two negative numbers (1.2). */
  static final Comparator<BigFraction> ORDER = (a, b) -> a.subtract(b).signum();

  private static final BigFraction HALF = BigFraction.of(1, 2);

  /** Copies the coefficients. */
  public ConstantRoot {
    coefficients = List.copyOf(coefficients);
  }

  /** The real roots of an irreducible polynomial, ascending. */
  static List<ConstantRoot> of(List<BigInteger> irreducible) {
    if (irreducible.size() == 2) {
      BigFraction root = BigFraction.of(irreducible.get(0).negate(), irreducible.get(1));
      return List.of(new ConstantRoot(irreducible, root, root));
    }
    List<List<BigInteger>> sturm = sturm(irreducible);
    BigFraction bound = bound(irreducible);
    List<ConstantRoot> out = new ArrayList<>();
    split(irreducible, sturm, bound.negate(), bound, out);
    return out;
  }

  /** Cauchy's bound on the size of every root. */
  private static BigFraction bound(List<BigInteger> f) {
    BigInteger lead = f.get(f.size() - 1).abs();
    BigFraction most = BigFraction.ZERO;
    for (BigInteger c : f.subList(0, f.size() - 1)) {
      BigFraction q = BigFraction.of(c.abs(), lead);
      most = ORDER.compare(q, most) > 0 ? q : most;
    }
    return most.add(BigFraction.ONE);
  }

  private static void split(
      List<BigInteger> f,
      List<List<BigInteger>> sturm,
      BigFraction low,
      BigFraction high,
      List<ConstantRoot> out) {
    int roots = variations(sturm, low) - variations(sturm, high);
    if (roots == 1) {
      out.add(new ConstantRoot(f, low, high));
    } else if (roots > 1) {
      BigFraction middle = low.add(high).multiply(HALF);
      split(f, sturm, low, middle, out);
      split(f, sturm, middle, high, out);
    }
  }

  /** Sturm's sequence, each member freed of its content (Sturm 1829). */
  private static List<List<BigInteger>> sturm(List<BigInteger> f) {
    List<List<BigInteger>> out = new ArrayList<>();
    out.add(f);
    List<BigInteger> derivative = new ArrayList<>();
    for (int k = 1; k < f.size(); k++) {
      derivative.add(f.get(k).multiply(BigInteger.valueOf(k)));
    }
    out.add(derivative);
    while (out.get(out.size() - 1).size() > 1) {
      out.add(negativeRemainder(out.get(out.size() - 2), out.get(out.size() - 1)));
    }
    return out;
  }

  /** {@code -(a mod b)} times a positive number. */
  private static List<BigInteger> negativeRemainder(List<BigInteger> a, List<BigInteger> b) {
    List<BigInteger> rest = new ArrayList<>(a);
    int n = b.size() - 1;
    BigInteger lead = b.get(n);
    while (rest.size() > n) {
      int top = rest.size() - 1;
      BigInteger c = rest.get(top);
      BigInteger sign = BigInteger.valueOf(lead.signum());
      for (int k = 0; k <= top; k++) {
        BigInteger lower = k >= top - n ? b.get(k - top + n).multiply(c) : BigInteger.ZERO;
        rest.set(k, rest.get(k).multiply(lead).subtract(lower).multiply(sign));
      }
      while (!rest.isEmpty() && rest.get(rest.size() - 1).signum() == 0) {
        rest.remove(rest.size() - 1);
      }
    }
    BigInteger content = rest.stream().reduce(BigInteger.ZERO, BigInteger::gcd);
    return rest.stream().map(c -> c.divide(content).negate()).toList();
  }

  private static int variations(List<List<BigInteger>> sturm, BigFraction x) {
    int count = 0;
    int last = 0;
    for (List<BigInteger> f : sturm) {
      int s = value(f, x).signum();
      if (s != 0) {
        count += last != 0 && s != last ? 1 : 0;
        last = s;
      }
    }
    return count;
  }

  private static BigFraction value(List<BigInteger> f, BigFraction x) {
    BigFraction sum = BigFraction.ZERO;
    for (int k = f.size() - 1; k >= 0; k--) {
      sum = sum.multiply(x).add(f.get(k));
    }
    return sum;
  }

  /** The same root in an interval 2^steps times shorter. */
  ConstantRoot refined(int steps) {
    if (low.equals(high)) {
      return this;
    }
    BigFraction l = low;
    BigFraction h = high;
    int below = value(coefficients, low).signum();
    for (int k = 0; k < steps; k++) {
      BigFraction middle = l.add(h).multiply(HALF);
      if (value(coefficients, middle).signum() == below) {
        l = middle;
      } else {
        h = middle;
      }
    }
    return new ConstantRoot(coefficients, l, h);
  }

  /** The least distance of a point of the interval from x. */
  BigFraction leastDistance(BigFraction x) {
    return ORDER.compare(x, low) < 0
        ? low.subtract(x)
        : ORDER.compare(x, high) > 0 ? x.subtract(high) : BigFraction.ZERO;
  }

  /** The greatest distance of a point of the interval from x. */
  BigFraction greatestDistance(BigFraction x) {
    BigFraction a = low.subtract(x).abs();
    BigFraction b = high.subtract(x).abs();
    return ORDER.compare(a, b) > 0 ? a : b;
  }
}
