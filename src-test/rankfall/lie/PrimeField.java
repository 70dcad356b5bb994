package rankfall.lie;

import java.util.List;
import rankfall.exact.Domain;

/**
 * The integers modulo a prime below 2^31.
 *
 * @param prime the characteristic
 */
record PrimeField(long prime) implements Domain<Long> {
  @Override
  public Long zero() {
    return 0L;
  }

  @Override
  public Long one() {
    return 1L;
  }

  @Override
  public Long plus(Long a, Long b) {
    return (a + b) % prime;
  }

  @Override
  public Long times(Long a, Long b) {
    return a * b % prime;
  }

  @Override
  public Long negate(Long a) {
    return a == 0 ? 0 : prime - a;
  }

  @Override
  public boolean isZero(Long a) {
    return a == 0;
  }

  @Override
  public Normal<Long> normal(List<Long> row) {
    return new Normal<>(row, 1L);
  }

  @Override
  public List<Long> cofactors(Long a, Long b) {
    return List.of(a, b);
  }

  @Override
  public int weight(Long a) {
    return 0;
  }

  Long of(long value) {
    return Math.floorMod(value, prime);
  }
}
