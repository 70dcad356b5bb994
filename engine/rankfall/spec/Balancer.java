package rankfall.spec;

import java.util.List;
import rankfall.spec.Expression.Operator;

/**
 * Builds the tree of a chain {@code p0 o1 p1 o2 p2 ...} of one kind of operation and its inverse:
 * from the left if it is short, else halved again and again. In a half that begins with an inverted
 * operand all operations are turned round, as in {@code a - b - c - d = (a - b) - (c + d)}.
 */
record Balancer(
    ScalarText text,
    Operator direct,
    Operator opposite,
    List<ExpressionReader.Part> parts,
    List<Boolean> inverted) {
  private static final int SHORT = 8;

  ExpressionReader.Part whole() {
    if (parts.size() > SHORT) {
      return half(0, parts.size());
    }
    ExpressionReader.Part result = parts.get(0);
    for (int k = 1; k < parts.size(); k++) {
      result = join(result, parts.get(k), inverted.get(k));
    }
    return result;
  }

  private ExpressionReader.Part half(int from, int to) {
    if (to - from == 1) {
      return parts.get(from);
    }
    int middle = (from + to) >>> 1;
    boolean turned = !inverted.get(middle).equals(inverted.get(from));
    return join(half(from, middle), half(middle, to), turned);
  }

  private ExpressionReader.Part join(
      ExpressionReader.Part left, ExpressionReader.Part right, boolean inverse) {
    Place place = text.place(left.from(), right.to());
    Expression joined =
        new Expression.Binary(
            inverse ? opposite : direct, left.expression(), right.expression(), place);
    return new ExpressionReader.Part(joined, left.from(), right.to());
  }
}
