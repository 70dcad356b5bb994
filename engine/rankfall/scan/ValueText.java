package rankfall.scan;

import java.math.BigInteger;

/**
 * The texts of numerators over one denominator, those of the last values kept. One thread at a
 * time.
 */
final class ValueText {
  private static final int KEPT = 1 << 12;

  private final long denominator;
  private final boolean decimal;
  private final long[] numerators = new long[KEPT];
  private final byte[][] texts = new byte[KEPT][];

  /**
   * Texts of one column.
   *
   * @param denominator positive
   * @param decimal whether as decimals, else as fractions
   */
  ValueText(long denominator, boolean decimal) {
    this.denominator = denominator;
    this.decimal = decimal;
  }

  /** The text of a value. */
  byte[] of(long numerator) {
    int slot = (int) ((numerator * 0x9E3779B97F4A7C15L) >>> 52);
    byte[] known = texts[slot];
    if (known != null && numerators[slot] == numerator) {
      return known;
    }
    byte[] text = Bytes.of(decimal ? decimal(numerator) : fraction(numerator));
    numerators[slot] = numerator;
    texts[slot] = text;
    return text;
  }

  private String fraction(long numerator) {
    long g = gcd(Math.abs(numerator), denominator);
    long n = numerator / g;
    long d = denominator / g;
    return d == 1 ? Long.toString(n) : n + "/" + d;
  }

  private String decimal(long numerator) {
    return DecimalText.of(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
  }

  private static long gcd(long a, long b) {
    long x = a;
    long y = b;
    while (y != 0) {
      long rest = x % y;
      x = y;
      y = rest;
    }
    return x;
  }
}
