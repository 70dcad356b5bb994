package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;

/** Seeded random values for properties; small, and often 0, 1 or -1. */
final class Sample {
  private final Random random;

  Sample(long seed) {
    this.random = new Random(seed);
  }

  static LongStream seeds(int count) {
    return LongStream.range(0, count);
  }

  /** Below the bound. */
  int below(int bound) {
    return random.nextInt(bound);
  }

  BigInteger integer(int bound) {
    return BigInteger.valueOf(random.nextInt(2 * bound + 1) - bound);
  }

  BigFraction fraction(int bound) {
    return BigFraction.of(integer(bound), BigInteger.valueOf(1 + random.nextInt(bound)));
  }

  List<BigFraction> point(int count, int bound) {
    return IntStream.range(0, count).mapToObj(k -> fraction(bound)).toList();
  }

  /** A polynomial with at most the given number of terms; may be 0 or constant. */
  Polynomial polynomial(Variables v, int terms, int degree, int bound) {
    List<Term> out = new ArrayList<>();
    for (int k = random.nextInt(terms + 1); k > 0; k--) {
      int left = random.nextInt(degree + 1);
      List<Integer> e = new ArrayList<>();
      for (int j = 0; j < v.count(); j++) {
        int d = random.nextInt(left + 1);
        left -= d;
        e.add(d);
      }
      BigInteger c = integer(bound);
      if (c.signum() != 0) {
        out.add(new Term(c, e));
      }
    }
    return Polynomial.of(v, out);
  }

  Polynomial nonZero(Variables v, int terms, int degree, int bound) {
    while (true) {
      Polynomial p = polynomial(v, terms, degree, bound);
      if (!p.isZero()) {
        return p;
      }
    }
  }

  Polynomial nonConstant(Variables v, int terms, int degree, int bound) {
    while (true) {
      Polynomial p = polynomial(v, terms, degree, bound);
      if (!p.isConstant()) {
        return p;
      }
    }
  }
}
