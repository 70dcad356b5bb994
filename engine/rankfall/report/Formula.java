package rankfall.report;

import java.util.List;

/**
 * A formula as it is set on paper. A tree says what is seen, not what is meant: parentheses are
 * nodes of their own.
 */
sealed interface Formula {

  /** Chooses the case of this node. */
  <T> T fold(Cases<T> cases);

  /** A rough width in letters, by which long formulas are told from short ones. */
  int width();

  /**
   * One method a kind of node.
   *
   * @param <T> the result
   */
  interface Cases<T> {
    T number(Number f);

    T letter(Letter f);

    T word(Word f);

    T subscript(Subscript f);

    T power(Power f);

    T root(Root f);

    T function(Function f);

    T product(Product f);

    T sum(Sum f);

    T fraction(Fraction f);

    T slash(Slash f);

    T group(Group f);

    T bracket(Bracket f);

    T relation(Relation f);

    T list(Sequence f);
  }

  /** Digits of a number that is not negative. */
  record Number(String digits) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.number(this);
    }

    @Override
    public int width() {
      return digits.length();
    }
  }

  /** A single letter, set in italics; {@code latex} is its command, or the letter itself. */
  record Letter(String text, String latex) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.letter(this);
    }

    @Override
    public int width() {
      return 1;
    }
  }

  /** A name of several letters, or any other text, set as one word. */
  record Word(String text) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.word(this);
    }

    @Override
    public int width() {
      return text.length();
    }
  }

  /** A base with something below. */
  record Subscript(Formula base, List<Formula> below) implements Formula {
    public Subscript {
      below = List.copyOf(below);
    }

    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.subscript(this);
    }

    @Override
    public int width() {
      return base.width() + below.stream().mapToInt(Formula::width).sum();
    }
  }

  /** A base with an integer exponent. */
  record Power(Formula base, String exponent) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.power(this);
    }

    @Override
    public int width() {
      return base.width() + exponent.length();
    }
  }

  /** A square root. */
  record Root(Formula radicand) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.root(this);
    }

    @Override
    public int width() {
      return radicand.width() + 1;
    }
  }

  /** A function by its name, with an exponent at the name (empty for 1), of an argument. */
  record Function(String name, String exponent, Formula argument) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.function(this);
    }

    @Override
    public int width() {
      return name.length() + exponent.length() + argument.width() + 1;
    }
  }

  /** Factors side by side. */
  record Product(List<Formula> factors) implements Formula {
    public Product {
      factors = List.copyOf(factors);
    }

    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.product(this);
    }

    @Override
    public int width() {
      return factors.stream().mapToInt(Formula::width).sum();
    }
  }

  /** A term with the sign before it. */
  record Signed(boolean negative, Formula term) {}

  /** Terms with their signs; the first shows its sign only if negative. */
  record Sum(List<Signed> terms) implements Formula {
    public Sum {
      terms = List.copyOf(terms);
    }

    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.sum(this);
    }

    @Override
    public int width() {
      return terms.stream().mapToInt(t -> t.term().width() + 3).sum() - 2;
    }
  }

  /** One above the other; short ones only, as it cannot break over lines. */
  record Fraction(Formula above, Formula below) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.fraction(this);
    }

    @Override
    public int width() {
      return Math.max(above.width(), below.width());
    }
  }

  /** One beside the other with a slash between. */
  record Slash(Formula left, Formula right) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.slash(this);
    }

    @Override
    public int width() {
      return left.width() + right.width() + 1;
    }
  }

  /** Round parentheses with an exponent, empty for 1. */
  record Group(Formula inner, String exponent) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.group(this);
    }

    @Override
    public int width() {
      return inner.width() + 2 + exponent.length();
    }
  }

  /** A Lie bracket. */
  record Bracket(Formula left, Formula right) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.bracket(this);
    }

    @Override
    public int width() {
      return left.width() + right.width() + 3;
    }
  }

  /** Two sides with a relation between. */
  record Relation(Formula left, Comparison comparison, Formula right) implements Formula {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.relation(this);
    }

    @Override
    public int width() {
      return left.width() + right.width() + 3;
    }
  }

  /** Formulas with commas between. */
  record Sequence(List<Formula> items) implements Formula {
    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.list(this);
    }

    @Override
    public int width() {
      return items.stream().mapToInt(f -> f.width() + 2).sum();
    }
  }

  /** The relations that occur, with what is typed, seen and commanded. */
  enum Comparison {
    EQUAL("=", "=", "="),
    UNEQUAL("!=", "\u2260", "\\neq "),
    LESS("<", "<", "<"),
    LESS_OR_EQUAL("<=", "\u2264", "\\leq "),
    GREATER(">", ">", ">"),
    GREATER_OR_EQUAL(">=", "\u2265", "\\geq ");

    private final String typed;
    private final String seen;
    private final String latex;

    Comparison(String typed, String seen, String latex) {
      this.typed = typed;
      this.seen = seen;
      this.latex = latex;
    }

    String typed() {
      return typed;
    }

    String seen() {
      return seen;
    }

    String latex() {
      return latex;
    }
  }
}
