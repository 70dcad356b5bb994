package rankfall.published;

import java.math.BigInteger;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Exact value of a formula as the reports write it: {@code + - * / ^ ( )}, integers, names, {@code
 * sqrt(r)} and functions such as {@code cos(t)}, whose whole text is looked up as a name. Shares no
 * code with the program, so that a fault of its reader cannot hide here.
 */
final class ExactText {
  private static final Pattern TOKEN =
      Pattern.compile("\\s*(\\d+|\\p{L}[\\p{L}\\d_]*|[-+*/^()])", Pattern.UNICODE_CHARACTER_CLASS);

  private final String text;
  private final Map<String, Quantity> names;
  private int at;

  private ExactText(String text, Map<String, Quantity> names) {
    this.text = text;
    this.names = names;
  }

  /**
   * The value of a text.
   *
   * @param text the formula
   * @param names what its names and functions stand for
   * @return the value
   * @throws IllegalArgumentException for a text of another form, or with an unknown name
   * @throws ArithmeticException for a division by 0 or by an irrational number
   */
  static Quantity value(String text, Map<String, Quantity> names) {
    ExactText reader = new ExactText(text, names);
    Quantity value = reader.sum();
    if (!reader.peek().isEmpty()) {
      throw reader.unreadable();
    }
    return value;
  }

  private Quantity sum() {
    Quantity value = product();
    while (peek().equals("+") || peek().equals("-")) {
      value = take().equals("+") ? value.plus(product()) : value.minus(product());
    }
    return value;
  }

  private Quantity product() {
    Quantity value = signed();
    while (peek().equals("*") || peek().equals("/")) {
      value = take().equals("*") ? value.times(signed()) : value.over(signed());
    }
    return value;
  }

  private Quantity signed() {
    if (peek().equals("-")) {
      take();
      return signed().negate();
    }
    return power();
  }

  private Quantity power() {
    Quantity base = atom();
    if (!peek().equals("^")) {
      return base;
    }
    take();
    boolean enclosed = peek().equals("(");
    if (enclosed) {
      take();
    }
    boolean negative = peek().equals("-");
    if (negative) {
      take();
    }
    int exponent = Integer.parseInt(take());
    if (enclosed) {
      expect(")");
    }
    return base.power(negative ? -exponent : exponent);
  }

  private Quantity atom() {
    String token = take();
    if (token.equals("(")) {
      Quantity value = sum();
      expect(")");
      return value;
    }
    if (token.isEmpty()) {
      throw unreadable();
    }
    if (Character.isDigit(token.charAt(0))) {
      return Quantity.of(BigFraction.of(new BigInteger(token)));
    }
    String name = peek().equals("(") ? token + argument() : token;
    Quantity value = names.get(name);
    if (value == null) {
      throw new IllegalArgumentException("unknown name '" + name + "' in '" + text + "'");
    }
    return value;
  }

  private String argument() {
    StringBuilder argument = new StringBuilder();
    int depth = 0;
    do {
      String token = take();
      if (token.isEmpty()) {
        throw unreadable();
      }
      depth += token.equals("(") ? 1 : token.equals(")") ? -1 : 0;
      argument.append(token);
    } while (depth > 0);
    return argument.toString();
  }

  private void expect(String token) {
    if (!take().equals(token)) {
      throw unreadable();
    }
  }

  private String peek() {
    int start = at;
    String token = take();
    at = start;
    return token;
  }

  /** The next token; empty at the end. */
  private String take() {
    if (text.substring(at).isBlank()) {
      return "";
    }
    Matcher matcher = TOKEN.matcher(text).region(at, text.length());
    if (!matcher.lookingAt()) {
      throw unreadable();
    }
    at = matcher.end();
    return matcher.group(1);
  }

  private IllegalArgumentException unreadable() {
    return new IllegalArgumentException("cannot read '" + text + "' at " + at);
  }
}
