package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
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
    List<Term> terms = new ArrayList<>(p.terms());
    terms.sort(order(p.variables()));
    for (Term t : terms) {
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
    int own = variables.indeterminates();
    addPowers(factors, t, variables, own, variables.count());
    addPowers(factors, t, variables, 0, own);
    if (factors.isEmpty() || !c.equals(BigInteger.ONE)) {
      factors.add(0, c.toString());
    }
    return String.join("*", factors);
  }

  private static void addPowers(
      List<String> factors, Term t, Variables variables, int from, int to) {
    for (int k = from; k < to; k++) {
      int e = t.exponents().get(k);
      if (e > 0) {
        factors.add(variables.names().get(k) + (e > 1 ? "^" + e : ""));
      }
    }
  }

  /**
   * The order of terms: descending graded-lexicographic in the variables, algebraic numbers
   * counting as coefficients and deciding last.
   *
   * @param variables the ring of the terms
   */
  static Comparator<Term> order(Variables variables) {
    int own = variables.indeterminates();
    return (s, t) -> {
      int c = compare(t.exponents().subList(0, own), s.exponents().subList(0, own));
      int all = variables.count();
      return c != 0 ? c : compare(t.exponents().subList(own, all), s.exponents().subList(own, all));
    };
  }

  private static int compare(List<Integer> a, List<Integer> b) {
    int c =
        Integer.compare(
            a.stream().mapToInt(Integer::intValue).sum(),
            b.stream().mapToInt(Integer::intValue).sum());
    for (int k = 0; c == 0 && k < a.size(); k++) {
      c = Integer.compare(a.get(k), b.get(k));
    }
    return c;
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
