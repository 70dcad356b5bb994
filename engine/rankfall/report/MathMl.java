package rankfall.report;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Writes formulas as MathML Core (W3C).
 *
 * <p>Browsers do not break a formula over lines. A long one is therefore cut before its operators
 * into pieces that follow one another like words.
 */
final class MathMl {
  /** Above this width, in letters, a formula is cut into pieces. */
  private static final int WIDEST_WHOLE = 26;

  private static final String CUT = "\ue000";
  private static final String TIMES = "<mo>&#x2062;</mo>";
  private static final String THIN = "<mspace width=\"0.17em\"></mspace>";

  private MathMl() {}

  /** A formula within a line of text. */
  static String inline(Formula f) {
    String row = f.fold(new Renderer());
    if (f.width() <= WIDEST_WHOLE) {
      return math(whole(row));
    }
    return Arrays.stream(row.split(CUT))
        .filter(piece -> !piece.isEmpty())
        .map(MathMl::math)
        .collect(Collectors.joining("<wbr/>", "<span class=\"long\">", "</span>"));
  }

  private static String math(String row) {
    return "<math><mrow>" + row + "</mrow></math>";
  }

  private static String whole(String row) {
    return row.replace(CUT, "");
  }

  /**
   * A square matrix as a table of formulas.
   *
   * @param rows the entries by rows
   */
  static String matrix(List<List<Formula>> rows) {
    Formula zero = new Formula.Number("0");
    return rows.stream()
        .map(
            row ->
                row.stream()
                    .map(
                        f ->
                            (f.equals(zero) ? "<mtd class=\"zero\">" : "<mtd>")
                                + "<mrow>"
                                + whole(f.fold(new Renderer()))
                                + "</mrow></mtd>")
                    .collect(Collectors.joining("", "<mtr>", "</mtr>\n")))
        .collect(Collectors.joining("", "<math display=\"block\"><mtable>\n", "</mtable></math>"));
  }

  private static final class Renderer implements Formula.Cases<String> {
    private String nested(Formula f) {
      return "<mrow>" + whole(f.fold(this)) + "</mrow>";
    }

    private String of(Formula f) {
      return f.fold(this);
    }

    private static String infix(String operator) {
      return CUT + "<mo form=\"infix\">" + Markup.escape(operator) + "</mo>";
    }

    private static String number(String digits) {
      return "<mn>" + Markup.escape(digits) + "</mn>";
    }

    @Override
    public String number(Formula.Number f) {
      return number(f.digits());
    }

    @Override
    public String letter(Formula.Letter f) {
      return "<mi>" + f.text() + "</mi>";
    }

    @Override
    public String word(Formula.Word f) {
      String text = Markup.escape(f.text());
      boolean name = f.text().codePoints().allMatch(c -> Character.isLetterOrDigit(c) || c == '_');
      return name ? "<mi mathvariant=\"normal\">" + text + "</mi>" : "<mtext>" + text + "</mtext>";
    }

    @Override
    public String subscript(Formula.Subscript f) {
      return "<msub><mrow>"
          + whole(of(f.base()))
          + "</mrow><mrow>"
          + f.below().stream()
              .map(b -> whole(of(b)))
              .collect(Collectors.joining("<mo separator=\"true\">,</mo>"))
          + "</mrow></msub>";
    }

    @Override
    public String power(Formula.Power f) {
      if (f.base() instanceof Formula.Subscript s) {
        String under = subscript(s);
        return "<msubsup>"
            + under.substring("<msub>".length(), under.length() - "</msub>".length())
            + number(f.exponent())
            + "</msubsup>";
      }
      return "<msup>" + nested(f.base()) + number(f.exponent()) + "</msup>";
    }

    @Override
    public String root(Formula.Root f) {
      return "<msqrt>" + nested(f.radicand()) + "</msqrt>";
    }

    @Override
    public String function(Formula.Function f) {
      String name = "<mi>" + f.name() + "</mi>";
      boolean spaced = !(f.argument() instanceof Formula.Group);
      return (f.exponent().isEmpty() ? name : "<msup>" + name + number(f.exponent()) + "</msup>")
          + "<mo>&#x2061;</mo>"
          + (spaced ? THIN : "")
          + nested(f.argument());
    }

    @Override
    public String product(Formula.Product f) {
      StringBuilder out = new StringBuilder(of(f.factors().get(0)));
      for (int k = 1; k < f.factors().size(); k++) {
        Formula left = f.factors().get(k - 1);
        Formula right = f.factors().get(k);
        boolean wide = left.width() + right.width() > WIDEST_WHOLE;
        out.append(TIMES)
            .append(isWordy(left) || isWordy(right) ? THIN : "")
            .append(wide ? CUT : "")
            .append(of(right));
      }
      return out.toString();
    }

    private static boolean isWordy(Formula f) {
      return f instanceof Formula.Word
          || f instanceof Formula.Function
          || f instanceof Formula.Bracket
          || (f instanceof Formula.Power p && isWordy(p.base()))
          || (f instanceof Formula.Subscript s && isWordy(s.base()));
    }

    @Override
    public String sum(Formula.Sum f) {
      StringBuilder out = new StringBuilder();
      for (Formula.Signed t : f.terms()) {
        if (out.isEmpty()) {
          out.append(t.negative() ? "<mo form=\"prefix\">\u2212</mo>" : "");
        } else {
          out.append(infix(t.negative() ? "\u2212" : "+"));
        }
        out.append(of(t.term()));
      }
      return out.toString();
    }

    @Override
    public String fraction(Formula.Fraction f) {
      return "<mfrac>" + nested(f.above()) + nested(f.below()) + "</mfrac>";
    }

    @Override
    public String slash(Formula.Slash f) {
      return of(f.left()) + CUT + "<mo form=\"infix\">/</mo>" + of(f.right());
    }

    @Override
    public String group(Formula.Group f) {
      String open = "<mo stretchy=\"false\" form=\"prefix\">(</mo>";
      String close = "<mo stretchy=\"false\" form=\"postfix\">)</mo>";
      boolean tall = f.inner() instanceof Formula.Fraction;
      String inner = of(f.inner());
      String left = tall ? "<mo form=\"prefix\">(</mo>" : open;
      String right = tall ? "<mo form=\"postfix\">)</mo>" : close;
      if (f.exponent().isEmpty()) {
        return left + inner + right;
      }
      return left + inner + "<msup>" + right + number(f.exponent()) + "</msup>";
    }

    @Override
    public String bracket(Formula.Bracket f) {
      return "<mo stretchy=\"false\" form=\"prefix\">[</mo>"
          + whole(of(f.left()))
          + "<mo separator=\"true\">,</mo>"
          + whole(of(f.right()))
          + "<mo stretchy=\"false\" form=\"postfix\">]</mo>";
    }

    @Override
    public String relation(Formula.Relation f) {
      return of(f.left()) + infix(f.comparison().seen()) + of(f.right());
    }

    @Override
    public String list(Formula.Sequence f) {
      return f.items().stream()
          .map(this::of)
          .collect(Collectors.joining("<mo separator=\"true\">,</mo>" + THIN + THIN + CUT));
    }
  }
}
