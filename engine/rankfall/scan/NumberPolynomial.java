package rankfall.scan;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/**
 * A polynomial in integer coordinates whose coefficients hold algebraic numbers.
 *
 * @param ring of the coefficients
 * @param parts what stands before each monomial of the numbers, by its exponents in the ring
 */
record NumberPolynomial(Variables ring, Map<List<Integer>, IntegerPolynomial> parts) {

  /** Whether no algebraic number occurs. */
  boolean isRational() {
    return parts.keySet().stream().allMatch(e -> e.stream().allMatch(k -> k == 0));
  }

  /** The polynomial, where no algebraic number occurs. */
  IntegerPolynomial rational() {
    return parts.values().stream().findFirst().orElse(new IntegerPolynomial(List.of()));
  }

  /** The degree in one coordinate. */
  int degree(int v) {
    return parts.values().stream().mapToInt(p -> p.degree(v)).max().orElse(0);
  }

  /** The total degree in the coordinates. */
  int degree() {
    return parts.values().stream().mapToInt(IntegerPolynomial::degree).max().orElse(0);
  }

  /**
   * The polynomial with rounded coefficients, by powers of one coordinate.
   *
   * @param inner the coordinate, or -1 for none
   * @param numbers rounds
   * @return empty where a coefficient cannot be rounded
   */
  Optional<List<Monomials>> rounded(int inner, NumberSigns numbers) {
    Map<List<Integer>, List<Term>> coefficients = new LinkedHashMap<>();
    parts.forEach(
        (number, p) -> {
          for (IntegerPolynomial.Term t : p.terms()) {
            coefficients
                .computeIfAbsent(boxed(t.exponents()), e -> new ArrayList<>())
                .add(new Term(t.coefficient(), number));
          }
        });
    int top = inner < 0 ? 0 : degree(inner);
    List<List<IntegerPolynomial.Term>> terms = new ArrayList<>();
    List<List<Double>> values = new ArrayList<>();
    for (int k = 0; k <= top; k++) {
      terms.add(new ArrayList<>());
      values.add(new ArrayList<>());
    }
    for (Map.Entry<List<Integer>, List<Term>> c : coefficients.entrySet()) {
      Polynomial number = Polynomial.of(ring, c.getValue());
      if (numbers.sign(number) != 0) {
        OptionalDouble value = numbers.near(number);
        if (value.isEmpty()) {
          return Optional.empty();
        }
        int[] e = c.getKey().stream().mapToInt(Integer::intValue).toArray();
        int power = inner < 0 ? 0 : e[inner];
        if (inner >= 0) {
          e[inner] = 0;
        }
        terms.get(power).add(new IntegerPolynomial.Term(BigInteger.ONE, e));
        values.get(power).add(value.getAsDouble());
      }
    }
    List<Monomials> out = new ArrayList<>();
    for (int k = 0; k <= top; k++) {
      out.add(
          new Monomials(
              new IntegerPolynomial(terms.get(k)),
              values.get(k).stream().mapToDouble(Double::doubleValue).toArray()));
    }
    return Optional.of(out);
  }

  private static List<Integer> boxed(int[] exponents) {
    return java.util.Arrays.stream(exponents).boxed().toList();
  }
}
