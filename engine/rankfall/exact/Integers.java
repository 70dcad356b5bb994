package rankfall.exact;

import java.math.BigInteger;
import java.util.List;

/** The ring of integers; rows are freed of the greatest common divisor of their entries. */
public record Integers() implements Domain<BigInteger> {
  @Override
  public BigInteger zero() {
    return BigInteger.ZERO;
  }

  @Override
  public BigInteger one() {
    return BigInteger.ONE;
  }

  @Override
  public BigInteger plus(BigInteger a, BigInteger b) {
    return a.add(b);
  }

  @Override
  public BigInteger times(BigInteger a, BigInteger b) {
    return a.multiply(b);
  }

  @Override
  public BigInteger negate(BigInteger a) {
    return a.negate();
  }

  @Override
  public boolean isZero(BigInteger a) {
    return a.signum() == 0;
  }

  @Override
  public Normal<BigInteger> normal(List<BigInteger> row) {
    BigInteger g = BigInteger.ZERO;
    for (BigInteger a : row) {
      g = g.gcd(a);
      if (g.equals(BigInteger.ONE)) {
        return new Normal<>(row, g);
      }
    }
    if (g.signum() == 0) {
      return new Normal<>(row, BigInteger.ONE);
    }
    BigInteger content = g;
    return new Normal<>(row.stream().map(a -> a.divide(content)).toList(), content);
  }

  @Override
  public List<BigInteger> cofactors(BigInteger a, BigInteger b) {
    BigInteger g = a.gcd(b);
    return List.of(a.divide(g), b.divide(g));
  }

  @Override
  public int weight(BigInteger a) {
    return 0;
  }
}
