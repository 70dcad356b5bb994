package rankfall.report;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Quotient;
import rankfall.exact.Factorization;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Term;

/** Lays out the exact values of one family as formulas. */
final class Formulas {
  /** Above this width, in letters, a quotient is set in one line, which can break. */
  private static final int WIDEST_FRACTION = 28;

  private final Notation notation;

  Formulas(Notation notation) {
    this.notation = notation;
  }

  /** A name, a bracket of names, or a sign condition, given as text. */
  Formula text(String text) {
    return FormulaReader.read(notation, text);
  }

  /** A polynomial with its terms in their order. */
  Formula of(Polynomial p) {
    if (p.isZero()) {
      return new Formula.Number("0");
    }
    List<Formula.Signed> terms =
        p.terms().stream()
            .map(
                t ->
                    new Formula.Signed(
                        t.coefficient().signum() < 0, monomial(t, p.variables().names())))
            .toList();
    return sum(terms);
  }

  private Formula monomial(Term t, List<String> names) {
    List<Formula> factors = new ArrayList<>();
    BigInteger c = t.coefficient().abs();
    for (int k = 0; k < t.exponents().size(); k++) {
      int e = t.exponents().get(k);
      if (e > 0) {
        factors.add(power(text(names.get(k)), e == 1 ? "" : Integer.toString(e)));
      }
    }
    factors.sort(Comparator.comparingInt(Formulas::place));
    if (factors.isEmpty() || !c.equals(BigInteger.ONE)) {
      factors.add(0, new Formula.Number(c.toString()));
    }
    return product(factors);
  }

  /** Roots stand before letters, functions after them, as is the custom. */
  private static int place(Formula f) {
    if (f instanceof Formula.Root
        || (f instanceof Formula.Power p && p.base() instanceof Formula.Root)) {
      return 0;
    }
    return f instanceof Formula.Function ? 2 : 1;
  }

  /** A quotient of polynomials in lowest terms. */
  Formula of(RationalFunction f) {
    return f.denominator().isOne()
        ? of(f.numerator())
        : signedQuotient(of(f.numerator()), of(f.denominator()));
  }

  /** A product of powers. */
  Formula of(Factorization f) {
    return signed(f.unit().signum() < 0, unsigned(f));
  }

  private Formula unsigned(Factorization f) {
    List<Formula> factors = new ArrayList<>(powers(f));
    BigFraction unit = f.unit().abs();
    if (factors.isEmpty() || !unit.equals(BigFraction.ONE)) {
      factors.add(0, number(unit));
    }
    return product(factors);
  }

  private List<Formula> powers(Factorization f) {
    return f.factors().stream()
        .map(
            x ->
                power(
                    enclosed(of(x.base())),
                    x.multiplicity() == 1 ? "" : Integer.toString(x.multiplicity())))
        .toList();
  }

  /** A quotient of factored polynomials. */
  Formula of(Quotient q) {
    boolean plain =
        q.denominator().factors().isEmpty() && q.denominator().unit().equals(BigFraction.ONE);
    return plain
        ? of(q.numerator())
        : signed(
            q.numerator().unit().signum() * q.denominator().unit().signum() < 0,
            quotient(unsigned(q.numerator()), unsigned(q.denominator())));
  }

  private static Formula number(BigFraction positive) {
    Formula above = new Formula.Number(positive.getNumerator().toString());
    return positive.getDenominator().equals(BigInteger.ONE)
        ? above
        : quotient(above, new Formula.Number(positive.getDenominator().toString()));
  }

  /** A combination of basis elements, such as {@code 2 X - a Y}; 0 if all coefficients are. */
  Formula of(Combination c, List<String> basis) {
    List<Formula.Signed> terms = new ArrayList<>();
    for (int k = 0; k < c.coefficients().size(); k++) {
      terms.addAll(multiple(of(c.coefficients().get(k)), basis.get(k)));
    }
    return sum(terms);
  }

  /** The target side of a bracket: basis elements with rational functions before them. */
  Formula combination(List<RationalFunction> coefficients, List<String> names) {
    List<Formula.Signed> terms = new ArrayList<>();
    for (int k = 0; k < coefficients.size(); k++) {
      terms.addAll(multiple(of(coefficients.get(k)), names.get(k)));
    }
    return sum(terms);
  }

  private List<Formula.Signed> multiple(Formula coefficient, String name) {
    boolean negative = false;
    Formula size = coefficient;
    if (coefficient instanceof Formula.Sum s && s.terms().size() == 1) {
      negative = s.terms().get(0).negative();
      size = s.terms().get(0).term();
    }
    if (size.equals(new Formula.Number("0"))) {
      return List.of();
    }
    Formula element = text(name);
    boolean one = size.equals(new Formula.Number("1"));
    return List.of(
        new Formula.Signed(negative, one ? element : product(List.of(enclosed(size), element))));
  }

  /** The spanning combinations of a kernel, with commas between. */
  Formula span(List<Combination> kernel, List<String> basis) {
    return sequence(kernel.stream().map(c -> of(c, basis)).toList());
  }

  /** All polynomials vanish; the whole space has the single equation {@code 0 = 0}. */
  Formula vanishing(List<Polynomial> equations) {
    Formula zero = new Formula.Number("0");
    return equations.isEmpty()
        ? new Formula.Relation(zero, Formula.Comparison.EQUAL, zero)
        : sequence(
            equations.stream()
                .map(p -> (Formula) new Formula.Relation(of(p), Formula.Comparison.EQUAL, zero))
                .toList());
  }

  /** A bracket of two basis elements. */
  Formula bracket(String left, String right) {
    return new Formula.Bracket(text(left), text(right));
  }

  /** Several formulas with commas between; one stays itself. */
  static Formula sequence(List<Formula> items) {
    return items.size() == 1 ? items.get(0) : new Formula.Sequence(items);
  }

  static Formula equal(Formula left, Formula right) {
    return new Formula.Relation(left, Formula.Comparison.EQUAL, right);
  }

  /** Factors side by side; a product or sum among them keeps its meaning. */
  static Formula product(List<Formula> factors) {
    return factors.size() == 1 ? factors.get(0) : new Formula.Product(factors);
  }

  /** A power, its exponent empty for 1; what is more than one symbol is put in parentheses. */
  static Formula power(Formula base, String exponent) {
    if (exponent.isEmpty()) {
      return base;
    }
    if (base instanceof Formula.Group g && g.exponent().isEmpty()) {
      return new Formula.Group(g.inner(), exponent);
    }
    if (base instanceof Formula.Function f && f.exponent().isEmpty() && !f.name().equals("exp")) {
      return new Formula.Function(f.name(), exponent, f.argument());
    }
    return isSymbol(base) ? new Formula.Power(base, exponent) : new Formula.Group(base, exponent);
  }

  private static boolean isSymbol(Formula f) {
    return f instanceof Formula.Letter
        || f instanceof Formula.Word
        || f instanceof Formula.Subscript
        || f instanceof Formula.Number
        || f instanceof Formula.Root;
  }

  /** A quotient: a fraction where it is short, else in one line with a slash. */
  static Formula quotient(Formula above, Formula below) {
    if (above.width() <= WIDEST_FRACTION && below.width() <= WIDEST_FRACTION) {
      return new Formula.Fraction(open(above), open(below));
    }
    return new Formula.Slash(
        enclosed(above),
        isSymbol(below) || below instanceof Formula.Group ? below : new Formula.Group(below, ""));
  }

  private static Formula signedQuotient(Formula above, Formula below) {
    if (above instanceof Formula.Sum s && s.terms().size() == 1) {
      return signed(s.terms().get(0).negative(), quotient(s.terms().get(0).term(), below));
    }
    return quotient(above, below);
  }

  private static Formula open(Formula f) {
    return f instanceof Formula.Group g && g.exponent().isEmpty() ? g.inner() : f;
  }

  static Formula enclosed(Formula f) {
    return f instanceof Formula.Sum
            || f instanceof Formula.Slash
            || f instanceof Formula.Relation
            || f instanceof Formula.Sequence
        ? new Formula.Group(f, "")
        : f;
  }

  private static Formula signed(boolean negative, Formula f) {
    return negative ? new Formula.Sum(List.of(new Formula.Signed(true, f))) : f;
  }

  private static Formula sum(List<Formula.Signed> terms) {
    if (terms.isEmpty()) {
      return new Formula.Number("0");
    }
    return terms.size() == 1 && !terms.get(0).negative()
        ? terms.get(0).term()
        : new Formula.Sum(terms);
  }
}
