package rankfall.exact;

/**
 * Resultants of polynomials in one of their variables.
 *
 * <p>By the subresultant sequence (Collins 1967; Brown and Traub 1971): all divisions are exact and
 * nothing is left to chance. The library's own algorithm fails on some sparse polynomials.
 */
final class Resultants {
  private Resultants() {}

  /** The resultant, up to sign; 0 if one of the polynomials is 0, 1 if both are constant. */
  static Polynomial of(Polynomial f, Polynomial g, int variable) {
    return f.isZero() || g.isZero()
        ? Polynomial.zero(f.variables())
        : bySubresultants(f, g, variable);
  }

  private static Polynomial bySubresultants(Polynomial f, Polynomial g, int variable) {
    Polynomial a = f.degree(variable) >= g.degree(variable) ? f : g;
    Polynomial b = f.degree(variable) >= g.degree(variable) ? g : f;
    Polynomial lead = Polynomial.one(f.variables());
    Polynomial h = lead;
    while (b.degree(variable) > 0) {
      int d = a.degree(variable) - b.degree(variable);
      Polynomial r = pseudoRemainder(a, b, variable);
      a = b;
      b = r.isZero() ? r : r.over(lead.times(h.pow(d)));
      lead = a.coefficient(variable, a.degree(variable));
      h = d == 0 ? h : lead.pow(d).over(h.pow(d - 1));
    }
    int n = a.degree(variable);
    return b.isZero() && n > 0 ? b : n == 0 ? lead : b.pow(n).over(h.pow(n - 1));
  }

  /** {@code lead(b)^(deg a - deg b + 1) * a} reduced by b. */
  private static Polynomial pseudoRemainder(Polynomial a, Polynomial b, int variable) {
    int d = b.degree(variable);
    Polynomial lead = b.coefficient(variable, d);
    Polynomial x = Polynomial.variable(a.variables(), variable);
    Polynomial r = a;
    int left = a.degree(variable) - d + 1;
    while (!r.isZero() && r.degree(variable) >= d) {
      int e = r.degree(variable);
      r = r.times(lead).minus(r.coefficient(variable, e).times(x.pow(e - d)).times(b));
      left--;
    }
    return r.times(lead.pow(left));
  }
}
