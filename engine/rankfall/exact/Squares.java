package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * A polynomial of degree 2 as a sum of squares of linear ones with coefficients of one sign, and a
 * constant (Lagrange's completion of squares).
 *
 * @param sign of the coefficients of the squares, 1 or -1
 * @param roots the linear polynomials that are squared
 * @param constant the sign of what is left
 */
record Squares(int sign, List<Polynomial> roots, int constant) {
  Squares {
    roots = List.copyOf(roots);
  }

  /** Empty if the polynomial is of another degree, or takes both signs far out. */
  static Optional<Squares> of(Polynomial f) {
    if (f.totalDegree() != 2) {
      return Optional.empty();
    }
    List<Polynomial> roots = new ArrayList<>();
    int sign = 0;
    int scale = 1;
    Polynomial rest = f;
    while (!rest.isConstant()) {
      Polynomial g = rest;
      Optional<Integer> v =
          IntStream.range(0, f.variables().count())
              .filter(k -> g.degree(k) == 2)
              .boxed()
              .findFirst();
      if (v.isEmpty()) {
        return Optional.empty();
      }
      BigInteger c = g.coefficient(v.get(), 2).constantValue();
      Polynomial b = g.coefficient(v.get(), 1);
      int s = c.signum() * scale;
      if (sign != 0 && s != sign) {
        return Optional.empty();
      }
      sign = s;
      scale *= c.signum();
      roots.add(
          Polynomial.variable(f.variables(), v.get()).times(c.multiply(BigInteger.TWO)).plus(b));
      rest = g.coefficient(v.get(), 0).times(c.multiply(BigInteger.valueOf(4))).minus(b.times(b));
    }
    int constant = rest.isZero() ? 0 : rest.constantValue().signum() * scale;
    return Optional.of(new Squares(sign, roots, constant));
  }
}
