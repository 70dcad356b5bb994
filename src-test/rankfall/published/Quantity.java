package rankfall.published;

import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A polynomial with rational coefficients in a few irrational numbers, each reduced by its minimal
 * polynomial. Of one such number it is an element of a field and equality is equality of numbers;
 * of several, that holds if they are independent.
 *
 * @param terms non-zero coefficients by monomial; a monomial holds positive exponents by root
 */
record Quantity(Map<SortedMap<Root, Integer>, BigFraction> terms) {

  /** Zero. */
  static final Quantity ZERO = new Quantity(Map.of());

  /** One. */
  static final Quantity ONE = of(BigFraction.ONE);

  Quantity {
    terms = Map.copyOf(terms);
  }

  /**
   * An irrational number, or an indeterminate.
   *
   * @param name how texts write it
   * @param power what its n-th power is: coefficients of {@code x^0} to {@code x^(n-1)}; empty for
   *     an indeterminate, which satisfies nothing
   */
  record Root(String name, List<BigFraction> power) implements Comparable<Root> {
    Root {
      power = List.copyOf(power);
    }

    @Override
    public int compareTo(Root other) {
      return name.compareTo(other.name);
    }
  }

  static Quantity of(BigFraction value) {
    return value.signum() == 0 ? ZERO : new Quantity(Map.of(Collections.emptySortedMap(), value));
  }

  static Quantity of(Root root) {
    return new Quantity(Map.of(new TreeMap<>(Map.of(root, 1)), BigFraction.ONE));
  }

  boolean isZero() {
    return terms.isEmpty();
  }

  Quantity plus(Quantity other) {
    Map<SortedMap<Root, Integer>, BigFraction> sum = new HashMap<>(terms);
    other.terms.forEach((m, c) -> sum.merge(m, c, BigFraction::add));
    sum.values().removeIf(c -> c.signum() == 0);
    return new Quantity(sum);
  }

  Quantity negate() {
    return times(of(BigFraction.of(-1)));
  }

  Quantity minus(Quantity other) {
    return plus(other.negate());
  }

  Quantity times(Quantity other) {
    Quantity sum = ZERO;
    for (Map.Entry<SortedMap<Root, Integer>, BigFraction> a : terms.entrySet()) {
      for (Map.Entry<SortedMap<Root, Integer>, BigFraction> b : other.terms.entrySet()) {
        SortedMap<Root, Integer> monomial = new TreeMap<>(a.getKey());
        b.getKey().forEach((r, e) -> monomial.merge(r, e, Integer::sum));
        sum = sum.plus(reduced(monomial, a.getValue().multiply(b.getValue())));
      }
    }
    return sum;
  }

  /**
   * The quotient by a rational number.
   *
   * @throws ArithmeticException if the divisor is 0 or irrational
   */
  Quantity over(Quantity divisor) {
    if (divisor.terms.size() != 1 || !divisor.terms.containsKey(Collections.emptySortedMap())) {
      throw new ArithmeticException("division by 0 or by an irrational number");
    }
    return times(of(divisor.terms.get(Collections.emptySortedMap()).reciprocal()));
  }

  /** The power with an exponent of any sign; the zeroth is 1. */
  Quantity power(int exponent) {
    Quantity power = ONE;
    for (int k = 0; k < Math.abs(exponent); k++) {
      power = power.times(this);
    }
    return exponent < 0 ? ONE.over(power) : power;
  }

  /**
   * The coefficients as a polynomial in one indeterminate.
   *
   * @return of {@code x^0} upwards, the last one not 0
   */
  List<BigFraction> coefficients(Root x) {
    int degree = terms.keySet().stream().mapToInt(m -> m.getOrDefault(x, 0)).max().orElse(0);
    return IntStream.rangeClosed(0, degree)
        .mapToObj(
            k ->
                terms.getOrDefault(
                    k == 0 ? Collections.emptySortedMap() : new TreeMap<>(Map.of(x, k)),
                    BigFraction.ZERO))
        .toList();
  }

  private static Quantity reduced(SortedMap<Root, Integer> monomial, BigFraction coefficient) {
    for (Map.Entry<Root, Integer> factor : monomial.entrySet()) {
      Root root = factor.getKey();
      int degree = root.power().size();
      if (degree > 0 && factor.getValue() >= degree) {
        Quantity sum = ZERO;
        for (int k = 0; k < degree; k++) {
          BigFraction c = root.power().get(k).multiply(coefficient);
          if (c.signum() != 0) {
            SortedMap<Root, Integer> lower = new TreeMap<>(monomial);
            int exponent = factor.getValue() - degree + k;
            lower.remove(root);
            if (exponent > 0) {
              lower.put(root, exponent);
            }
            sum = sum.plus(reduced(lower, c));
          }
        }
        return sum;
      }
    }
    return new Quantity(Map.of(monomial, coefficient));
  }
}
