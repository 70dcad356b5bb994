package rankfall.spec;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** Reads one condition of {@code where}. */
final class ConditionReader {
  private static final Map<String, Spec.Relation> SIGNS =
      Map.of(
          "=", Spec.Relation.EQUAL,
          "!=", Spec.Relation.UNEQUAL,
          "<", Spec.Relation.LESS,
          "<=", Spec.Relation.LESS_OR_EQUAL,
          ">", Spec.Relation.GREATER,
          ">=", Spec.Relation.GREATER_OR_EQUAL);

  private ConditionReader() {}

  static Spec.Condition read(ScalarText text, Scope scope, Spec.Ground ground) {
    List<Token> tokens = Tokenizer.tokens(text, 0, text.size());
    List<Integer> signs = new ArrayList<>();
    for (int k = 0; k < tokens.size(); k++) {
      if (tokens.get(k).kind() == Token.Kind.SYMBOL && SIGNS.containsKey(tokens.get(k).text())) {
        signs.add(k);
      }
    }
    if (signs.isEmpty()) {
      throw SpecFault.of(
          text.place(), "a condition without a relation sign", "write one of = != < <= > >= in it");
    }
    Token sign = tokens.get(signs.get(0));
    if (signs.size() > 1) {
      Token second = tokens.get(signs.get(1));
      throw SpecFault.of(
          text.place(second.from(), second.to()),
          "a second relation sign in one condition",
          "write two conditions");
    }
    Expression left = side(text, tokens, 0, signs.get(0), scope);
    Expression right = side(text, tokens, signs.get(0) + 1, tokens.size() - 1, scope);
    Spec.Relation relation = SIGNS.get(sign.text());
    if (ground == Spec.Ground.COMPLEX
        && relation != Spec.Relation.EQUAL
        && relation != Spec.Relation.UNEQUAL) {
      throw SpecFault.of(
          text.place(sign.from(), sign.to()),
          "'" + sign.text() + "' has no meaning with 'ground: complex'",
          "only = and != have one");
    }
    checkCanHold(left, relation, right, text);
    return new Spec.Condition(left, relation, right, text.value().strip(), text.place());
  }

  private static Expression side(
      ScalarText text, List<Token> tokens, int from, int to, Scope scope) {
    List<Token> part = new ArrayList<>(tokens.subList(from, to));
    Token next = tokens.get(to);
    part.add(new Token(Token.Kind.END, "", next.from(), next.to()));
    return ExpressionReader.read(text, part, scope);
  }

  /** Between two numbers a relation holds everywhere or nowhere. */
  private static void checkCanHold(
      Expression left, Spec.Relation relation, Expression right, ScalarText text) {
    Optional<BigFraction> a = RationalValue.of(left);
    Optional<BigFraction> b = RationalValue.of(right);
    if (a.isEmpty() || b.isEmpty()) {
      return;
    }
    int order = a.get().subtract(b.get()).signum();
    boolean holds =
        switch (relation) {
          case EQUAL -> order == 0;
          case UNEQUAL -> order != 0;
          case LESS -> order < 0;
          case LESS_OR_EQUAL -> order <= 0;
          case GREATER -> order > 0;
          case GREATER_OR_EQUAL -> order >= 0;
        };
    if (!holds) {
      throw SpecFault.of(text.place(), "this condition never holds", "no parameter point is left");
    }
  }
}
