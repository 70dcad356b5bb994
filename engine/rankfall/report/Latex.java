package rankfall.report;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Writes formulas as LaTeX for {@code amsmath}, without delimiters. Nothing is put between {@code
 * \left} and {@code \right}, so that a long formula may break before its operators; between the
 * factors of a product stands {@link #BREAK}.
 */
final class Latex {
  /** A place at which a line may end, if there is no better one. */
  static final String BREAK = "\\rankfallbreak ";

  /** Asks for a new page unless some lines are left, so that a heading keeps its table. */
  static final String ROOM = "\\rankfallroom";

  /** The definitions of {@link #BREAK} and {@link #ROOM}; harmless if they are given twice. */
  static final String DEFINITIONS =
      "\\providecommand{\\rankfallbreak}{\\penalty900 }\n"
          + "\\providecommand{\\rankfallroom}{\\par\\vskip 0pt plus 8\\baselineskip"
          + "\\penalty-200\\vskip 0pt plus -8\\baselineskip}";

  private static final int DIGITS_IN_A_ROW = 24;

  private Latex() {}

  /** The formula without delimiters. */
  static String of(Formula f) {
    return f.fold(new Renderer()).strip();
  }

  /** The formula within a line of text. */
  static String inline(Formula f) {
    return "$" + of(f) + "$";
  }

  /** A matrix in round parentheses, without delimiters; any size. */
  static String matrix(List<List<Formula>> rows) {
    return "\\begin{pmatrix}\n"
        + rows.stream()
            .map(row -> row.stream().map(Latex::of).collect(Collectors.joining(" & ")))
            .collect(Collectors.joining(" \\\\\n"))
        + "\n\\end{pmatrix}";
  }

  private static final class Renderer implements Formula.Cases<String> {
    private String of(Formula f) {
      return f.fold(this);
    }

    @Override
    public String number(Formula.Number f) {
      String d = f.digits();
      StringBuilder out = new StringBuilder();
      for (int k = 0; k < d.length(); k += DIGITS_IN_A_ROW) {
        out.append(k == 0 ? "" : BREAK).append(d, k, Math.min(d.length(), k + DIGITS_IN_A_ROW));
      }
      return out.toString();
    }

    @Override
    public String letter(Formula.Letter f) {
      return f.latex().startsWith("\\") && !f.latex().endsWith("}") ? f.latex() + " " : f.latex();
    }

    @Override
    public String word(Formula.Word f) {
      boolean name =
          f.text().chars().allMatch(c -> c < 128 && (Character.isLetterOrDigit(c) || c == '_'));
      return (name ? "\\mathrm{" : "\\text{") + LatexText.escape(f.text()) + "}";
    }

    @Override
    public String subscript(Formula.Subscript f) {
      return of(f.base()).strip()
          + "_{"
          + f.below().stream().map(b -> of(b).strip()).collect(Collectors.joining(","))
          + "}";
    }

    private static String exponent(String digits) {
      return digits.isEmpty() ? "" : "^{" + digits.replace('\u2212', '-') + "}";
    }

    @Override
    public String power(Formula.Power f) {
      return of(f.base()).strip() + exponent(f.exponent());
    }

    @Override
    public String root(Formula.Root f) {
      return "\\sqrt{" + of(f.radicand()).strip() + "}";
    }

    @Override
    public String function(Formula.Function f) {
      String argument = of(f.argument()).strip();
      String name = "\\" + f.name() + exponent(f.exponent());
      boolean needsSpace = f.exponent().isEmpty() && Character.isLetterOrDigit(argument.charAt(0));
      return name + (needsSpace ? " " : "") + argument + " ";
    }

    @Override
    public String product(Formula.Product f) {
      StringBuilder out = new StringBuilder(of(f.factors().get(0)));
      for (int k = 1; k < f.factors().size(); k++) {
        Formula left = f.factors().get(k - 1);
        Formula right = f.factors().get(k);
        boolean wide = k % 4 == 0 || left.width() + right.width() > 12;
        out.append(isWordy(left) || isWordy(right) ? "\\," : "").append(wide ? BREAK : "");
        boolean digits = left instanceof Formula.Number && right instanceof Formula.Number;
        out.append(digits ? "\\cdot " : "").append(of(right));
      }
      return out.toString();
    }

    private static boolean isWordy(Formula f) {
      return f instanceof Formula.Word
          || f instanceof Formula.Bracket
          || (f instanceof Formula.Power p && isWordy(p.base()))
          || (f instanceof Formula.Subscript s && isWordy(s.base()));
    }

    @Override
    public String sum(Formula.Sum f) {
      StringBuilder out = new StringBuilder();
      for (Formula.Signed t : f.terms()) {
        if (out.isEmpty()) {
          out.append(t.negative() ? "-" : "");
        } else {
          out.append(t.negative() ? " - " : " + ");
        }
        out.append(of(t.term()).strip());
      }
      return out.toString();
    }

    @Override
    public String fraction(Formula.Fraction f) {
      return "\\frac{" + of(f.above()).strip() + "}{" + of(f.below()).strip() + "}";
    }

    @Override
    public String slash(Formula.Slash f) {
      return of(f.left()).strip() + "/" + BREAK + of(f.right()).strip();
    }

    @Override
    public String group(Formula.Group f) {
      String inner = of(f.inner()).strip();
      boolean tall = f.inner() instanceof Formula.Fraction;
      return (tall ? "\\left(" + inner + "\\right)" : "(" + inner + ")") + exponent(f.exponent());
    }

    @Override
    public String bracket(Formula.Bracket f) {
      boolean nested = f.left() instanceof Formula.Bracket || f.right() instanceof Formula.Bracket;
      return "["
          + of(f.left()).strip()
          + ", "
          + (nested ? "\\allowbreak " : "")
          + of(f.right()).strip()
          + "]";
    }

    @Override
    public String relation(Formula.Relation f) {
      return of(f.left()).strip()
          + " "
          + f.comparison().latex().strip()
          + " "
          + of(f.right()).strip();
    }

    @Override
    public String list(Formula.Sequence f) {
      return f.items().stream()
          .map(x -> of(x).strip())
          .collect(Collectors.joining(",\\; \\allowbreak "));
    }
  }
}
