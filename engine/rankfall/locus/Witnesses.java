package rankfall.locus;

import java.math.BigInteger;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Rationals;

/** Which of several points a person would take. */
final class Witnesses {
  private Witnesses() {}

  /** The cell whose point has the lowest degree, then the smallest numbers. */
  static Cell shortest(List<Cell> cells) {
    return cells.stream()
        .min(
            Comparator.comparingInt((Cell c) -> degree(c))
                .thenComparing(Witnesses::size)
                .thenComparing(c -> c.point().toString()))
        .orElseThrow();
  }

  private static int degree(Cell c) {
    return c.point().coordinates().stream().mapToInt(AlgebraicNumber::degree).sum();
  }

  private static BigInteger size(Cell c) {
    BigInteger sum = BigInteger.ZERO;
    for (AlgebraicNumber x : c.point().coordinates()) {
      BigFraction q = x.rational().orElse(BigFraction.of(x.floor()));
      BigInteger d = Rationals.denominator(q).subtract(BigInteger.ONE);
      sum = sum.add(Rationals.numerator(q).abs().shiftLeft(2)).add(d.shiftLeft(3));
      sum = q.signum() < 0 ? sum.add(BigInteger.ONE) : sum;
    }
    return sum;
  }
}
