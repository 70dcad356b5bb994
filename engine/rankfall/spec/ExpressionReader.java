package rankfall.spec;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.Expression.FunctionKind;
import rankfall.spec.Expression.Operator;

/**
 * Reads one expression by recursive descent.
 *
 * <pre>
 * sum      = product { ("+" | "-") product }
 * product  = signed { ("*" | "/") signed }
 * signed   = { "+" | "-" } power
 * power    = atom [ "^" exponent ]
 * exponent = ["-"] integer | "(" ["-"] integer ")"
 * atom     = number | name | function "(" sum ")" | "E" "(" integer "," integer ")" | "(" sum ")"
 * </pre>
 *
 * So {@code -a^2} is {@code -(a^2)} and {@code a/b*c} is {@code (a/b)*c}. A sum or product of more
 * than eight operands is built as a balanced tree of the same value, so that no reader of it needs
 * a deep stack.
 */
final class ExpressionReader {
  /** Parentheses and signs may be nested so deep. */
  static final int MAX_DEPTH = 200;

  /** The largest size of an exponent. */
  static final int MAX_EXPONENT = 64;

  private final ScalarText text;
  private final List<Token> tokens;
  private final Scope scope;
  private int at;
  private int depth;

  private ExpressionReader(ScalarText text, List<Token> tokens, Scope scope) {
    this.text = text;
    this.tokens = tokens;
    this.scope = scope;
  }

  /** An expression and the code points it takes, its parentheses counted in. */
  record Part(Expression expression, int from, int to) {}

  /**
   * Reads a whole scalar.
   *
   * @throws SpecFault at the first fault
   */
  static Expression read(ScalarText text, Scope scope) {
    return read(text, Tokenizer.tokens(text, 0, text.size()), scope);
  }

  /** Reads tokens of which the last one is END. */
  static Expression read(ScalarText text, List<Token> tokens, Scope scope) {
    ExpressionReader reader = new ExpressionReader(text, tokens, scope);
    if (reader.peek().kind() == Token.Kind.END) {
      throw SpecFault.of(
          reader.placeOf(reader.peek()), "an expression is missing in " + scope.setting());
    }
    Part part = reader.sum();
    if (reader.peek().kind() != Token.Kind.END) {
      throw reader.unexpected();
    }
    return part.expression();
  }

  private Token peek() {
    return tokens.get(at);
  }

  private Token take() {
    return tokens.get(at++);
  }

  private boolean takeIf(String symbol) {
    boolean found = peek().is(symbol);
    if (found) {
      at++;
    }
    return found;
  }

  private Place placeOf(Token token) {
    return text.place(token.from(), token.to());
  }

  private Part sum() {
    return chain("+", "-", Operator.PLUS, Operator.MINUS);
  }

  private Part product() {
    return chain("*", "/", Operator.TIMES, Operator.OVER);
  }

  private Part chain(String plain, String inverse, Operator direct, Operator opposite) {
    List<Part> parts = new ArrayList<>();
    List<Boolean> inverted = new ArrayList<>();
    parts.add(operand(direct));
    inverted.add(false);
    while (peek().is(plain) || peek().is(inverse)) {
      boolean isInverse = take().text().equals(inverse);
      Part part = operand(direct);
      if (isInverse && opposite == Operator.OVER) {
        checkDivisor(part);
      }
      parts.add(part);
      inverted.add(isInverse);
    }
    return new Balancer(text, direct, opposite, parts, inverted).whole();
  }

  private Part operand(Operator chained) {
    return chained == Operator.PLUS ? product() : signed();
  }

  private void checkDivisor(Part part) {
    Optional<BigFraction> value = RationalValue.of(part.expression());
    if (value.isPresent() && value.get().signum() == 0) {
      throw SpecFault.of(text.place(part.from(), part.to()), "division by 0");
    }
  }

  private Part signed() {
    Token sign = peek();
    if (takeIf("-")) {
      descend(sign);
      Part inner = signed();
      depth--;
      Place place = text.place(sign.from(), inner.to());
      return new Part(new Expression.Negation(inner.expression(), place), sign.from(), inner.to());
    }
    if (takeIf("+")) {
      descend(sign);
      Part inner = signed();
      depth--;
      return new Part(inner.expression(), sign.from(), inner.to());
    }
    return power();
  }

  private Part power() {
    Part base = atom();
    Part result = takeIf("^") ? raised(base) : base;
    checkNoHiddenProduct();
    return result;
  }

  private Part raised(Part base) {
    int exponent = exponent();
    int to = tokens.get(at - 1).to();
    Place place = text.place(base.from(), to);
    if (peek().is("^")) {
      throw SpecFault.of(placeOf(peek()), "a power of a power", "set parentheses, as in (a^2)^3");
    }
    Optional<BigFraction> value = RationalValue.of(base.expression());
    if (exponent <= 0 && value.isPresent() && value.get().signum() == 0) {
      throw SpecFault.of(
          place, exponent == 0 ? "0^0 has no value" : "division by 0: a negative power of 0");
    }
    return new Part(new Expression.Power(base.expression(), exponent, place), base.from(), to);
  }

  private int exponent() {
    boolean wrapped = takeIf("(");
    boolean negative = takeIf("-");
    Token token = peek();
    if (token.kind() != Token.Kind.NUMBER || !token.text().chars().allMatch(Character::isDigit)) {
      throw SpecFault.of(
          placeOf(token),
          "an exponent is an integer literal",
          "write a power such as a^2 or a^(-1)");
    }
    at++;
    boolean fits =
        new BigInteger(token.text().substring(0, Math.min(token.text().length(), 9)))
                    .compareTo(BigInteger.valueOf(MAX_EXPONENT))
                <= 0
            && token.text().length() <= 9;
    if (!fits) {
      throw SpecFault.of(
          placeOf(token), "the exponent is too large", "exponents go up to " + MAX_EXPONENT);
    }
    if (wrapped && !takeIf(")")) {
      throw SpecFault.of(
          placeOf(peek()), "an exponent is an integer literal", "close the parenthesis after it");
    }
    int size = Integer.parseInt(token.text());
    return negative ? -size : size;
  }

  /** After a factor no other factor may begin. */
  private void checkNoHiddenProduct() {
    Token next = peek();
    boolean factor =
        next.kind() == Token.Kind.NAME || next.kind() == Token.Kind.NUMBER || next.is("(");
    if (!factor) {
      return;
    }
    Token last = tokens.get(at - 1);
    String left = last.is(")") ? "(...)" : last.text();
    String right = next.is("(") ? "(...)" : next.text();
    throw SpecFault.of(
        text.place(last.from(), next.to()),
        "two factors stand side by side",
        "write " + left + "*" + right);
  }

  private Part atom() {
    Token token = take();
    return switch (token.kind()) {
      case NUMBER -> new Part(number(token), token.from(), token.to());
      case NAME -> named(token);
      case SYMBOL, END -> parenthesised(token);
    };
  }

  private Expression number(Token token) {
    BigFraction value =
        ExactNumber.unsigned(token.text())
            .orElseThrow(() -> SpecFault.of(placeOf(token), "the number is too long"));
    return new Expression.Number(value, placeOf(token));
  }

  private Part parenthesised(Token open) {
    if (!open.is("(")) {
      at--;
      throw unexpected();
    }
    descend(open);
    Part inner = sum();
    close(open);
    depth--;
    return new Part(inner.expression(), open.from(), tokens.get(at - 1).to());
  }

  private void close(Token open) {
    if (!takeIf(")")) {
      if (peek().kind() == Token.Kind.END) {
        throw SpecFault.of(placeOf(open), "this parenthesis is not closed", "add ')'");
      }
      throw unexpected();
    }
  }

  private void descend(Token token) {
    depth++;
    if (depth > MAX_DEPTH) {
      throw SpecFault.of(
          placeOf(token),
          "an expression nested over " + MAX_DEPTH + " deep",
          "give parts of it names under 'abbreviations'");
    }
  }

  private Part named(Token token) {
    Optional<FunctionKind> kind = Names.function(token.text());
    if (kind.isPresent()) {
      return function(token, kind.get());
    }
    if (token.text().equals("sqrt")) {
      return root(token);
    }
    if (token.text().equals("E") && scope.units().isPresent()) {
      return unit(token, scope.units().getAsInt());
    }
    if (peek().is("(") && peek().from() == token.to()) {
      throw noFunction(token);
    }
    scope.check(token.text(), placeOf(token));
    return new Part(new Expression.Name(token.text(), placeOf(token)), token.from(), token.to());
  }

  private SpecFault noFunction(Token token) {
    Role role = scope.known().get(token.text());
    if (role != null) {
      return SpecFault.of(
          placeOf(token),
          "'" + token.text() + "' is " + role.phrase() + ", not a function",
          "a product is written " + token.text() + "*(...)");
    }
    if (token.text().equals("E")) {
      return SpecFault.of(
          placeOf(token),
          "a matrix unit cannot stand in " + scope.setting(),
          "write it in a combination such as Lz: \"E(1,2)\"");
    }
    String cause = "there is no function '" + token.text() + "' and no way to call one";
    String all = "the functions are " + String.join(", ", Names.functionNames());
    return SpecFault.of(
        placeOf(token),
        cause,
        Spelling.meant(token.text(), Names.functionNames())
            .map(name -> "did you mean '" + name + "'?")
            .orElse(all));
  }

  /** The argument of a function in its parentheses. */
  private Part argument(Token name, String example) {
    Token open = peek();
    if (!takeIf("(")) {
      throw SpecFault.of(
          placeOf(name),
          "'" + name.text() + "' stands without its argument",
          "write it in parentheses, as in " + example);
    }
    descend(open);
    Part inner = sum();
    close(open);
    depth--;
    return inner;
  }

  private Part root(Token name) {
    Part inner = argument(name, "sqrt(2)");
    int to = tokens.get(at - 1).to();
    BigFraction radicand = Radicand.of(inner.expression(), text.place(inner.from(), inner.to()));
    return new Part(new Expression.Root(radicand, text.place(name.from(), to)), name.from(), to);
  }

  private Part function(Token name, FunctionKind kind) {
    Part inner = argument(name, name.text() + "(t)");
    int to = tokens.get(at - 1).to();
    SortedMap<String, BigInteger> combination =
        IntegerCombination.of(
            inner.expression(), text.place(inner.from(), inner.to()), name.text(), scope);
    return new Part(
        new Expression.Function(kind, combination, text.place(name.from(), to)), name.from(), to);
  }

  private Part unit(Token name, int order) {
    if (!takeIf("(")) {
      throw SpecFault.of(
          placeOf(name), "'E' stands without row and column", "write a matrix unit as E(2,1)");
    }
    Token row = index();
    Token column = takeIf(",") ? index() : missing("','");
    if (!takeIf(")")) {
      missing("')'");
    }
    int to = tokens.get(at - 1).to();
    Place place = text.place(name.from(), to);
    if (!inside(row, order) || !inside(column, order)) {
      throw SpecFault.of(
          place,
          text.slice(name.from(), to) + " does not lie in a matrix of order " + order,
          "rows and columns go from 1 to " + order);
    }
    Expression unit =
        new Expression.MatrixUnit(
            Integer.parseInt(row.text()), Integer.parseInt(column.text()), place);
    return new Part(unit, name.from(), to);
  }

  private Token index() {
    Token token = take();
    if (token.kind() != Token.Kind.NUMBER || !token.text().chars().allMatch(Character::isDigit)) {
      throw SpecFault.of(
          placeOf(token), "row and column are integers", "write a matrix unit as E(2,1)");
    }
    return token;
  }

  private Token missing(String what) {
    throw SpecFault.of(placeOf(peek()), what + " is missing", "write a matrix unit as E(2,1)");
  }

  private static boolean inside(Token index, int order) {
    BigInteger value =
        new BigInteger(index.text().substring(0, Math.min(12, index.text().length())));
    return value.signum() > 0
        && index.text().length() <= 12
        && value.compareTo(BigInteger.valueOf(order)) <= 0;
  }

  private SpecFault unexpected() {
    Token token = peek();
    if (token.kind() == Token.Kind.END) {
      return SpecFault.of(
          placeOf(token), "the expression in " + scope.setting() + " breaks off", "complete it");
    }
    if (token.is("*") && at > 0 && tokens.get(at - 1).is("*")) {
      return SpecFault.of(placeOf(token), "'**' is not read", "write '^'");
    }
    return SpecFault.of(
        placeOf(token), "'" + token.text() + "' is not expected here in " + scope.setting());
  }
}
