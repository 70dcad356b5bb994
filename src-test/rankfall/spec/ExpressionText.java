package rankfall.spec;

import java.math.BigInteger;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;

/** Writes an expression with all its parentheses, so that tests can see how it was read. */
final class ExpressionText implements Expression.Cases<String> {
  static String of(Expression e) {
    return e.fold(new ExpressionText());
  }

  private static String number(BigFraction value) {
    return value.getDenominator().equals(BigInteger.ONE)
        ? value.getNumerator().toString()
        : value.getNumerator() + "|" + value.getDenominator();
  }

  @Override
  public String number(Expression.Number e) {
    return number(e.value());
  }

  @Override
  public String name(Expression.Name e) {
    return e.name();
  }

  @Override
  public String root(Expression.Root e) {
    return "root " + number(e.radicand());
  }

  @Override
  public String function(Expression.Function e) {
    return e.kind().name().toLowerCase(Locale.ROOT)
        + e.argument().entrySet().stream()
            .map((Map.Entry<String, BigInteger> t) -> t.getValue() + t.getKey())
            .collect(Collectors.joining(",", "{", "}"));
  }

  @Override
  public String unit(Expression.MatrixUnit e) {
    return "E" + e.row() + "," + e.column();
  }

  @Override
  public String binary(Expression.Binary e) {
    String sign =
        switch (e.operator()) {
          case PLUS -> "+";
          case MINUS -> "-";
          case TIMES -> "*";
          case OVER -> "/";
        };
    return "(" + e.left().fold(this) + sign + e.right().fold(this) + ")";
  }

  @Override
  public String negation(Expression.Negation e) {
    return "(-" + e.operand().fold(this) + ")";
  }

  @Override
  public String power(Expression.Power e) {
    return "(" + e.base().fold(this) + "^" + e.exponent() + ")";
  }
}
