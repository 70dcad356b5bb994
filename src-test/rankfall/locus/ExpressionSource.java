package rankfall.locus;

import java.util.Map;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.Expression;

/**
 * Writes an expression as a spec may hold it, with other names.
 *
 * @param names what stands for a name; a name that is missing stays
 */
record ExpressionSource(Map<String, String> names) implements Expression.Cases<String> {

  String of(Expression e) {
    return "(" + e.fold(this) + ")";
  }

  private static String text(BigFraction q) {
    return "(" + q.getNumerator() + ")/(" + q.getDenominator() + ")";
  }

  @Override
  public String number(Expression.Number e) {
    return text(e.value());
  }

  @Override
  public String name(Expression.Name e) {
    return names.getOrDefault(e.name(), e.name());
  }

  @Override
  public String root(Expression.Root e) {
    return "sqrt(" + e.radicand().getNumerator() + "/" + e.radicand().getDenominator() + ")";
  }

  @Override
  public String function(Expression.Function e) {
    throw new IllegalArgumentException("not written here: " + e.kind());
  }

  @Override
  public String unit(Expression.MatrixUnit e) {
    return "E(" + e.row() + "," + e.column() + ")";
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
    return of(e.left()) + sign + of(e.right());
  }

  @Override
  public String negation(Expression.Negation e) {
    return "-" + of(e.operand());
  }

  @Override
  public String power(Expression.Power e) {
    return of(e.base()) + "^" + e.exponent();
  }
}
