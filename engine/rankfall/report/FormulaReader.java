package rankfall.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads the text form of formulas back for setting: names of variables such as {@code cos(2*t)},
 * brackets such as {@code [X,Y]}, sign conditions such as {@code a*b - 1 > 0}. Text of another
 * shape is set as it stands.
 */
final class FormulaReader {
  private static final Pattern TOKEN =
      Pattern.compile(
          "\\s*(?:(\\d+(?:\\.\\d+)?)|([\\p{L}][\\p{L}\\p{N}_]*)|(!=|<=|>=|[-+*/^()\\[\\],=<>]))");
  private static final List<String> FUNCTIONS =
      List.of("cos", "sin", "tan", "exp", "cosh", "sinh", "tanh");
  private static final int DEEPEST = 200;

  private final Notation notation;
  private final List<String> tokens;
  private int at;
  private int depth;

  private FormulaReader(Notation notation, List<String> tokens) {
    this.notation = notation;
    this.tokens = tokens;
  }

  /** The formula that a text stands for. */
  static Formula read(Notation notation, String text) {
    Optional<List<String>> tokens = tokens(text);
    if (tokens.isPresent()) {
      try {
        return new FormulaReader(notation, tokens.get()).whole();
      } catch (OtherShape e) {
        return new Formula.Word(text);
      }
    }
    return new Formula.Word(text);
  }

  /** Leaves the reader where a text is no formula. */
  private static final class OtherShape extends Exception {
    private static final long serialVersionUID = 1L;
  }

  private static Optional<List<String>> tokens(String text) {
    List<String> out = new ArrayList<>();
    String trimmed = text.strip();
    Matcher m = TOKEN.matcher(trimmed);
    int at = 0;
    while (at < trimmed.length()) {
      if (!m.find(at) || m.start() != at) {
        return Optional.empty();
      }
      out.add(m.group().strip());
      at = m.end();
    }
    return out.isEmpty() ? Optional.empty() : Optional.of(out);
  }

  private Formula whole() throws OtherShape {
    Formula left = sum();
    for (Formula.Comparison c : Formula.Comparison.values()) {
      if (take(c.typed())) {
        left = new Formula.Relation(left, c, sum());
        break;
      }
    }
    if (at < tokens.size()) {
      throw new OtherShape();
    }
    return left;
  }

  private boolean take(String token) {
    boolean there = at < tokens.size() && tokens.get(at).equals(token);
    at += there ? 1 : 0;
    return there;
  }

  private void expect(String token) throws OtherShape {
    if (!take(token)) {
      throw new OtherShape();
    }
  }

  private Formula sum() throws OtherShape {
    if (++depth > DEEPEST) {
      throw new OtherShape();
    }
    List<Formula.Signed> terms = new ArrayList<>();
    boolean negative = take("-");
    do {
      terms.add(new Formula.Signed(negative, term()));
      negative = false;
    } while (take("+") || (negative = take("-")));
    depth--;
    boolean plain = terms.size() == 1 && !terms.get(0).negative();
    return plain ? terms.get(0).term() : new Formula.Sum(terms);
  }

  private Formula term() throws OtherShape {
    List<Formula> factors = new ArrayList<>(List.of(power()));
    Optional<Formula> quotient = Optional.empty();
    while (true) {
      if (take("*")) {
        if (quotient.isPresent()) {
          factors.clear();
          factors.add(Formulas.enclosed(quotient.get()));
          quotient = Optional.empty();
        }
        factors.add(power());
      } else if (take("/")) {
        Formula above = quotient.orElseGet(() -> Formulas.product(factors));
        quotient = Optional.of(Formulas.quotient(above, power()));
      } else {
        return quotient.orElseGet(() -> Formulas.product(factors));
      }
    }
  }

  private Formula power() throws OtherShape {
    Formula base = atom();
    if (!take("^")) {
      return base;
    }
    String sign = take("-") ? "\u2212" : "";
    String exponent = next();
    if (!exponent.chars().allMatch(Character::isDigit)) {
      throw new OtherShape();
    }
    return Formulas.power(base, sign + exponent);
  }

  private String next() throws OtherShape {
    if (at >= tokens.size()) {
      throw new OtherShape();
    }
    return tokens.get(at++);
  }

  private Formula atom() throws OtherShape {
    String token = next();
    if (Character.isDigit(token.charAt(0))) {
      return new Formula.Number(token);
    }
    if (token.equals("(")) {
      Formula inner = sum();
      expect(")");
      return new Formula.Group(inner, "");
    }
    if (token.equals("[")) {
      Formula left = sum();
      expect(",");
      Formula right = sum();
      expect("]");
      return new Formula.Bracket(left, right);
    }
    if (!Character.isLetter(token.codePointAt(0))) {
      throw new OtherShape();
    }
    return take("(") ? call(token) : notation.name(token);
  }

  private Formula call(String name) throws OtherShape {
    Formula argument = sum();
    expect(")");
    if (name.equals("sqrt")) {
      return new Formula.Root(argument);
    }
    if (!FUNCTIONS.contains(name)) {
      throw new OtherShape();
    }
    boolean bare = !name.equals("exp") && !(argument instanceof Formula.Sum);
    return new Formula.Function(name, "", bare ? argument : new Formula.Group(argument, ""));
  }
}
