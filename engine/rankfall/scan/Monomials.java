package rankfall.scan;

import java.math.BigInteger;
import java.util.List;

/** A sum of terms laid out for evaluation: a coefficient times powers of coordinates each. */
final class Monomials {
  private final BigInteger[] coefficients;
  private final double[] doubles;
  private final long[] longs;
  private final int[][] variables;
  private final int[][] exponents;

  /**
   * Lays out a polynomial; its coefficients as longs are right where they fit.
   *
   * @param p with integer coefficients
   */
  Monomials(IntegerPolynomial p) {
    this(p, p.terms().stream().mapToDouble(t -> t.coefficient().doubleValue()).toArray());
  }

  /**
   * Lays out a polynomial for its rounded values alone.
   *
   * @param p what its terms are
   * @param rounded their coefficients
   */
  Monomials(IntegerPolynomial p, double[] rounded) {
    List<IntegerPolynomial.Term> terms = p.terms();
    int n = terms.size();
    coefficients = new BigInteger[n];
    doubles = rounded.clone();
    longs = new long[n];
    variables = new int[n][];
    exponents = new int[n][];
    for (int t = 0; t < n; t++) {
      IntegerPolynomial.Term term = terms.get(t);
      int[] e = term.exponents();
      coefficients[t] = term.coefficient();
      longs[t] = term.coefficient().longValue();
      variables[t] = java.util.stream.IntStream.range(0, e.length).filter(v -> e[v] > 0).toArray();
      exponents[t] = java.util.Arrays.stream(variables[t]).map(v -> e[v]).toArray();
    }
  }

  /** The rounded values of the terms, one after the other. */
  double term(int t, Coordinates at) {
    double product = doubles[t];
    int[] v = variables[t];
    int[] e = exponents[t];
    for (int f = 0; f < v.length; f++) {
      product *= at.power(v[f], e[f]);
    }
    return product;
  }

  /** The number of terms. */
  int size() {
    return doubles.length;
  }

  /** The value, where {@link IntegerPolynomial#bound} excludes an overflow. */
  long longValue(Coordinates at) {
    long sum = 0;
    for (int t = 0; t < longs.length; t++) {
      long product = longs[t];
      int[] v = variables[t];
      int[] e = exponents[t];
      for (int f = 0; f < v.length; f++) {
        product *= at.longPower(v[f], e[f]);
      }
      sum += product;
    }
    return sum;
  }

  /** The value. */
  BigInteger value(Coordinates at) {
    BigInteger sum = BigInteger.ZERO;
    for (int t = 0; t < coefficients.length; t++) {
      BigInteger product = coefficients[t];
      for (int f = 0; f < variables[t].length; f++) {
        product = product.multiply(at.bigPower(variables[t][f], exponents[t][f]));
      }
      sum = sum.add(product);
    }
    return sum;
  }
}
