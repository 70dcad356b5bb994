package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** The text form of polynomials and of their quotients: infix with {@code * ^ /}. */
public final class PolynomialText {
  private PolynomialText() {}

  /**
   * The polynomial with its terms in descending graded-lexicographic order.
   *
   * @return for example {@code a^2 - 2*a*b + 1}
   */
  public static String of(Polynomial p) {
    if (p.isZero()) {
      return "0";
    }
    StringBuilder out = new StringBuilder();
    for (Term t : p.terms()) {
      boolean negative = t.coefficient().signum() < 0;
      if (out.isEmpty()) {
        out.append(negative ? "-" : "");
      } else {
        out.append(negative ? " - " : " + ");
      }
      out.append(unsigned(t, p.variables()));
    }
    return out.toString();
  }

  private static String unsigned(Term t, Variables variables) {
    List<String> factors = new ArrayList<>();
    BigInteger c = t.coefficient().abs();
    for (int k = 0; k < t.exponents().size(); k++) {
      int e = t.exponents().get(k);
      if (e > 0) {
        factors.add(variables.names().get(k) + (e > 1 ? "^" + e : ""));
      }
    }
    if (factors.isEmpty() || !c.equals(BigInteger.ONE)) {
      factors.add(0, c.toString());
    }
    return String.join("*", factors);
  }

  /**
   * The quotient in lowest terms.
   *
   * @return for example {@code (a + b)/(2*c)}
   */
  public static String of(RationalFunction f) {
    if (f.denominator().isOne()) {
      return of(f.numerator());
    }
    String above = of(f.numerator());
    String below = of(f.denominator());
    return (f.numerator().termCount() > 1 ? "(" + above + ")" : above)
        + "/"
        + (isAtom(f.denominator()) ? below : "(" + below + ")");
  }

  private static boolean isAtom(Polynomial p) {
    if (p.isConstant()) {
      return true;
    }
    Term only = p.terms().get(0);
    return p.termCount() == 1
        && only.coefficient().equals(BigInteger.ONE)
        && only.exponents().stream().filter(e -> e > 0).count() == 1;
  }
}
