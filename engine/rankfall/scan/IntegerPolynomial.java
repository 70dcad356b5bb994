package rankfall.scan;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * A polynomial with integer coefficients in integer coordinates.
 *
 * @param terms none with coefficient 0
 */
record IntegerPolynomial(List<Term> terms) {
  /** Copies the list. */
  IntegerPolynomial {
    terms = List.copyOf(terms);
  }

  /**
   * A coefficient and one exponent a coordinate; not to be modified.
   *
   * @param coefficient not 0
   * @param exponents 0 or more
   */
  record Term(BigInteger coefficient, int[] exponents) {
    int degree() {
      int sum = 0;
      for (int e : exponents) {
        sum += e;
      }
      return sum;
    }
  }

  /** The degree in one coordinate. */
  int degree(int v) {
    return terms.stream().mapToInt(t -> t.exponents[v]).max().orElse(0);
  }

  /** The total degree. */
  int degree() {
    return terms.stream().mapToInt(Term::degree).max().orElse(0);
  }

  /**
   * The coefficients by powers of one coordinate, constant one first, each without it.
   *
   * @param inner the coordinate, or -1 for none: one coefficient, the polynomial itself
   */
  List<IntegerPolynomial> along(int inner) {
    if (inner < 0) {
      return List.of(this);
    }
    List<IntegerPolynomial> out = new ArrayList<>();
    for (int k = 0; k <= degree(inner); k++) {
      List<Term> part = new ArrayList<>();
      for (Term t : terms) {
        if (t.exponents[inner] == k) {
          int[] e = t.exponents.clone();
          e[inner] = 0;
          part.add(new Term(t.coefficient, e));
        }
      }
      out.add(new IntegerPolynomial(part));
    }
    return out;
  }

  /**
   * A bound for the absolute value of all partial sums and products, in whatever order.
   *
   * @param reaches the greatest absolute value of each coordinate
   */
  BigInteger bound(List<Long> reaches) {
    BigInteger sum = BigInteger.ZERO;
    for (Term t : terms) {
      BigInteger product = t.coefficient.abs();
      for (int v = 0; v < reaches.size(); v++) {
        BigInteger reach = BigInteger.valueOf(Math.max(1, reaches.get(v)));
        product = product.multiply(reach.pow(t.exponents[v]));
      }
      sum = sum.add(product);
    }
    return sum;
  }
}
