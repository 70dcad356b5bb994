package rankfall.spec;

import java.math.BigInteger;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.numbers.fraction.BigFraction;

/** Decimal notation as exact rational numbers: {@code 0.25} is 1/4, {@code 1e-3} is 1/1000. */
public final class ExactNumber {
  /** Digits of a number, and size of its power of ten, may go so far. */
  private static final int MAX_DIGITS = 5000;

  private static final Pattern DECIMAL =
      Pattern.compile("([0-9]*)(?:\\.([0-9]*))?(?:[eE]([+-]?[0-9]+))?");

  private ExactNumber() {}

  /**
   * Reads a rational number such as {@code -3/2}, {@code 0.25}, {@code 7} or {@code 1e-3}.
   *
   * @param text the number with an optional sign; numerator and denominator may be decimals
   * @return its exact value; empty if the text is no such number, divides by 0, or has over 5000
   *     digits
   */
  public static Optional<BigFraction> of(String text) {
    String number = text.strip();
    boolean negative = number.startsWith("-");
    String size = negative || number.startsWith("+") ? number.substring(1) : number;
    int slash = size.indexOf('/');
    Optional<BigFraction> top = unsigned(slash < 0 ? size : size.substring(0, slash));
    Optional<BigFraction> bottom =
        slash < 0 ? Optional.of(BigFraction.ONE) : unsigned(size.substring(slash + 1));
    if (top.isEmpty() || bottom.isEmpty() || bottom.get().signum() == 0) {
      return Optional.empty();
    }
    BigFraction value = top.get().divide(bottom.get());
    return Optional.of(negative ? value.negate() : value);
  }

  /** The value of digits with optional fraction and power of ten; empty if it is too long. */
  static Optional<BigFraction> unsigned(String text) {
    Matcher matcher = DECIMAL.matcher(text);
    if (text.length() > MAX_DIGITS || !matcher.matches()) {
      return Optional.empty();
    }
    String fraction = matcher.group(2) == null ? "" : matcher.group(2);
    String digits = matcher.group(1) + fraction;
    BigInteger power =
        new BigInteger(matcher.group(3) == null ? "0" : matcher.group(3))
            .subtract(BigInteger.valueOf(fraction.length()));
    if (digits.isEmpty() || power.abs().compareTo(BigInteger.valueOf(MAX_DIGITS)) > 0) {
      return Optional.empty();
    }
    BigInteger scale = BigInteger.TEN.pow(Math.abs(power.intValueExact()));
    BigInteger value = new BigInteger(digits);
    return Optional.of(
        power.signum() < 0 ? BigFraction.of(value, scale) : BigFraction.of(value.multiply(scale)));
  }
}
