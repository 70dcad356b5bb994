package rankfall.exact;

import java.math.BigInteger;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Exact roots of polynomials that are perfect powers.
 *
 * <p>A determinant of a Killing form is often a power of a short polynomial; its root, coefficient
 * by coefficient in one variable after the other, costs far less than a greatest common divisor.
 */
final class PolynomialRoot {
  private PolynomialRoot() {}

  /**
   * The greatest k of which f is a k-th power up to sign, with the root.
   *
   * @param base to the power {@code exponent} is f or -f
   * @param exponent 1 or more
   */
  record Power(Polynomial base, int exponent) {}

  /**
   * Writes f as a power.
   *
   * @param f primitive, not constant
   */
  static Power power(Polynomial f) {
    int common = f.support().stream().mapToInt(f::degree).reduce(0, PolynomialRoot::gcd);
    for (int k = common; k > 1; k--) {
      if (common % k == 0) {
        Optional<Polynomial> root = root(f, k);
        if (root.isEmpty()) {
          root = root(f.negate(), k);
        }
        if (root.isPresent()) {
          return new Power(root.get(), k);
        }
      }
    }
    return new Power(f, 1);
  }

  private static int gcd(int a, int b) {
    return b == 0 ? a : gcd(b, a % b);
  }

  /**
   * The k-th root over the integers.
   *
   * @param k 1 or more
   * @return empty if f is no k-th power
   */
  static Optional<Polynomial> root(Polynomial f, int k) {
    if (f.isConstant()) {
      return integerRoot(f.constantValue(), k).map(r -> Polynomial.constant(f.variables(), r));
    }
    if (!mayBePower(f, k)) {
      return Optional.empty();
    }
    int x = f.support().stream().min(Comparator.comparingInt(f::degree)).orElseThrow();
    int degree = f.degree(x);
    if (degree % k != 0) {
      return Optional.empty();
    }
    return root(f.coefficient(x, degree), k)
        .flatMap(leading -> lift(f, k, x, leading))
        .filter(g -> g.pow(k).equals(f));
  }

  /** The other coefficients of the root: each solves an equation that is linear in it. */
  private static Optional<Polynomial> lift(Polynomial f, int k, int x, Polynomial leading) {
    int m = f.degree(x) / k;
    Polynomial variable = Polynomial.variable(f.variables(), x);
    Polynomial slope = leading.pow(k - 1).times(BigInteger.valueOf(k));
    Polynomial g = leading.times(variable.pow(m));
    for (int i = 1; i <= m; i++) {
      int power = m * k - i;
      Polynomial rest = f.coefficient(x, power).minus(g.pow(k).coefficient(x, power));
      Optional<Polynomial> next = rest.dividedBy(slope);
      if (next.isEmpty()) {
        return Optional.empty();
      }
      g = g.plus(next.get().times(variable.pow(m - i)));
    }
    return Optional.of(g);
  }

  /** A necessary condition: the value at one point is a k-th power. */
  private static boolean mayBePower(Polynomial f, int k) {
    int n = f.variables().count();
    List<BigFraction> point =
        IntStream.range(0, n).mapToObj(v -> BigFraction.of(2 + 3 * v % 7)).toList();
    return integerRoot(f.at(point).getNumerator(), k).isPresent();
  }

  private static Optional<BigInteger> integerRoot(BigInteger value, int k) {
    if (value.signum() < 0) {
      return k % 2 == 1 ? integerRoot(value.negate(), k).map(BigInteger::negate) : Optional.empty();
    }
    BigInteger low = BigInteger.ZERO;
    BigInteger high = BigInteger.ONE.shiftLeft(value.bitLength() / k + 1);
    while (low.compareTo(high) < 0) {
      BigInteger middle = low.add(high).add(BigInteger.ONE).shiftRight(1);
      if (middle.pow(k).compareTo(value) <= 0) {
        low = middle;
      } else {
        high = middle.subtract(BigInteger.ONE);
      }
    }
    return low.pow(k).equals(value) ? Optional.of(low) : Optional.empty();
  }
}
