package rankfall.scan;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Rationals;

/** The values of one parameter, all over one denominator. */
public sealed interface Axis {
  /** The parameter, or the function of a parameter such as {@code cos(t)}. */
  String name();

  /** How many values. */
  long size();

  /** The positive denominator. */
  long denominator();

  /**
   * A numerator.
   *
   * @param k the number of the value, from 0
   */
  long numerator(long k);

  /** The greatest absolute value of a numerator. */
  long reach();

  /** The axis as a grid names it: {@code a=-2:2:401} or {@code a=1/2;1;2}. */
  String text();

  /**
   * Values in equal steps, both ends included.
   *
   * @param name of the parameter
   * @param from the first value
   * @param to the last value, above the first
   * @param points how many, at least 2
   * @throws IllegalArgumentException if the values do not go up, are fewer than 2, or have no
   *     common denominator of 18 digits; the message is for the user
   */
  static Axis steps(String name, BigFraction from, BigFraction to, long points) {
    int order = Rationals.compare(from, to);
    if (points < 2 && order != 0) {
      throw new IllegalArgumentException(
          "the grid of '" + name + "' wants 2 points or more from one bound to the other");
    }
    if (order == 0) {
      throw new IllegalArgumentException(
          "the grid of '" + name + "' has a step of 0; give one value as " + name + "=1/2");
    }
    if (order > 0) {
      throw new IllegalArgumentException(
          "the bounds of '" + name + "' are reversed: " + text(from) + " is above " + text(to));
    }
    BigFraction step = to.subtract(from).divide(BigInteger.valueOf(points - 1));
    BigInteger d = lcm(Rationals.denominator(from), Rationals.denominator(step));
    return new Steps(
        name,
        fitting(name, over(from, d)),
        fitting(name, over(step, d)),
        points,
        fitting(name, d),
        fitting(name, over(from, d).abs().max(over(to, d).abs())));
  }

  /**
   * Listed values.
   *
   * @param name of the parameter
   * @param values at least one, in the order of the scan
   * @throws IllegalArgumentException if the list is empty, or there is no common denominator of 18
   *     digits; the message is for the user
   */
  static Axis values(String name, List<BigFraction> values) {
    if (values.isEmpty()) {
      throw new IllegalArgumentException("the grid of '" + name + "' has no values");
    }
    BigInteger d = values.stream().map(Rationals::denominator).reduce(BigInteger.ONE, Axis::lcm);
    List<Long> numerators = values.stream().map(v -> fitting(name, over(v, d))).toList();
    return new Values(name, numerators, fitting(name, d));
  }

  private static BigInteger over(BigFraction value, BigInteger denominator) {
    return Rationals.numerator(value).multiply(denominator.divide(Rationals.denominator(value)));
  }

  private static BigInteger lcm(BigInteger a, BigInteger b) {
    return a.multiply(b.divide(a.gcd(b)));
  }

  private static long fitting(String name, BigInteger value) {
    if (value.bitLength() > 62) {
      throw new IllegalArgumentException(
          "the values of '"
              + name
              + "' over their common denominator are longer than 18 digits;"
              + " give such points in a table");
    }
    return value.longValueExact();
  }

  private static String text(BigFraction value) {
    return Rationals.text(value);
  }

  /**
   * Values in equal steps.
   *
   * @param first the first numerator
   * @param step from one numerator to the next
   * @param size how many
   */
  record Steps(String name, long first, long step, long size, long denominator, long reach)
      implements Axis {
    @Override
    public long numerator(long k) {
      return first + k * step;
    }

    @Override
    public String text() {
      return name
          + "="
          + Axis.text(BigFraction.of(BigInteger.valueOf(first), BigInteger.valueOf(denominator)))
          + ":"
          + Axis.text(
              BigFraction.of(
                  BigInteger.valueOf(numerator(size - 1)), BigInteger.valueOf(denominator)))
          + ":"
          + size;
    }
  }

  /** Listed values. */
  record Values(String name, List<Long> numerators, long denominator) implements Axis {
    /** Copies the list. */
    public Values {
      numerators = List.copyOf(numerators);
    }

    @Override
    public long size() {
      return numerators.size();
    }

    @Override
    public long numerator(long k) {
      return numerators.get((int) k);
    }

    @Override
    public long reach() {
      return numerators.stream().mapToLong(Math::abs).max().orElseThrow();
    }

    @Override
    public String text() {
      return name
          + "="
          + numerators.stream()
              .map(
                  n ->
                      Axis.text(
                          BigFraction.of(BigInteger.valueOf(n), BigInteger.valueOf(denominator))))
              .collect(java.util.stream.Collectors.joining(";"));
    }
  }
}
