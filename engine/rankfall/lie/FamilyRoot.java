package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.Expression;

/**
 * A square root of a rational number, {@code factor * product of sqrt(prime)}.
 *
 * @param factor rational, 0 or more
 * @param primes different primes, ascending
 */
record FamilyRoot(BigFraction factor, List<BigInteger> primes) {
  /** Divisors are tried up to here; what is left below its square is then a prime. */
  private static final long LAST_TRIED = 1L << 20;

  FamilyRoot {
    primes = List.copyOf(primes);
  }

  /**
   * Takes squares out and splits the rest into primes.
   *
   * @throws FamilyFault if the number under the root holds large primes only
   */
  static FamilyRoot of(Expression.Root e) {
    BigFraction q = e.radicand();
    BigInteger rest = q.getNumerator().multiply(q.getDenominator());
    if (rest.signum() < 0) {
      throw new FamilyFault(e.place(), "the number under a root is negative");
    }
    BigInteger square = BigInteger.ONE;
    List<BigInteger> primes = new ArrayList<>();
    BigInteger whole = rest.sqrt();
    if (whole.multiply(whole).equals(rest)) {
      return new FamilyRoot(BigFraction.of(whole, q.getDenominator()), List.of());
    }
    for (long p = 2; p <= LAST_TRIED && p * p <= bound(rest); p += p == 2 ? 1 : 2) {
      BigInteger prime = BigInteger.valueOf(p);
      int times = 0;
      while (rest.mod(prime).signum() == 0) {
        rest = rest.divide(prime);
        times++;
      }
      square = square.multiply(prime.pow(times / 2));
      if (times % 2 == 1) {
        primes.add(prime);
      }
    }
    whole = rest.sqrt();
    if (whole.multiply(whole).equals(rest)) {
      square = square.multiply(whole);
    } else if (rest.compareTo(BigInteger.valueOf(LAST_TRIED * LAST_TRIED)) < 0) {
      primes.add(rest);
    } else {
      throw new FamilyFault(
          e.place(),
          "the number under the root has a prime factor that is too large to be found",
          "give the root as a constant with its minimal polynomial");
    }
    return new FamilyRoot(BigFraction.of(square, q.getDenominator()), primes);
  }

  private static long bound(BigInteger rest) {
    return rest.bitLength() < 63 ? rest.longValueExact() : Long.MAX_VALUE;
  }
}
