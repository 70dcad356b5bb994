package rankfall.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.MatrixEntry;
import rankfall.Forms.Casimir;
import rankfall.Forms.Covector;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.UnitVector;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/** The formulas of torus, Casimir element and invariant forms, for the page and the appendix. */
record FormFormulas(Formulas formulas) {
  private static final Formula ONE = new Formula.Number("1");
  private static final Formula FORM = new Formula.Letter("B", "B");

  /** The elements of a torus, i times them where the form belongs to these. */
  List<Formula> elements(TorusForm t, boolean listedAreHermitian) {
    return t.elements().stream().map(e -> element(t, e, listedAreHermitian)).toList();
  }

  /** Names for combinations of these elements. */
  static List<String> names(TorusForm t, boolean listedAreHermitian) {
    return t.imaginary() && !listedAreHermitian
        ? t.elements().stream().map(e -> "i*" + e).toList()
        : t.elements();
  }

  private Formula element(TorusForm t, String name, boolean listedAreHermitian) {
    Formula x = formulas.text(name);
    if (t.imaginary() == listedAreHermitian) {
      return x;
    }
    Formula ix = Formulas.product(List.of(new Formula.Letter("i", "i"), x));
    return t.imaginary() ? ix : new Formula.Sum(List.of(new Formula.Signed(true, ix)));
  }

  /** A symmetric matrix by rows. */
  List<List<Formula>> matrix(int n, List<MatrixEntry> entries) {
    return SquareMatrix.of(n, entries, formulas).rows();
  }

  /** A vector of length 1. */
  Formula unit(UnitVector v, List<String> names) {
    Formula sum =
        formulas.combination(v.coefficients().stream().map(RationalFunction::of).toList(), names);
    Optional<RationalFunction> length = v.rationalLength();
    if (length.isPresent()) {
      RationalFunction inverse =
          RationalFunction.of(length.get().denominator(), length.get().numerator());
      Formula factor = formulas.of(inverse);
      return factor.equals(ONE) ? sum : Formulas.product(List.of(factor, Formulas.enclosed(sum)));
    }
    Formula root = new Formula.Root(formulas.of(v.squaredLength()));
    return Formulas.product(
        List.of(new Formula.Fraction(ONE, root), isSingle(v) ? sum : Formulas.enclosed(sum)));
  }

  private static boolean isSingle(UnitVector v) {
    return v.coefficients().stream().filter(c -> !c.isZero()).count() == 1;
  }

  /** The name of an element of the dual basis, counted from 0. */
  static Formula dual(int k) {
    return new Formula.Power(new Formula.Letter("e", "e"), Integer.toString(k + 1));
  }

  /** The element that the form assigns to a covector. */
  Formula sharp(Covector c, List<String> elements) {
    return formulas.combination(c.sharp(), elements);
  }

  /** The values of a covector or root on the elements. */
  Formula values(List<RationalFunction> values) {
    return new Formula.Group(Formulas.sequence(values.stream().map(formulas::of).toList()), "");
  }

  /** The name of a simple root, counted from 0. */
  static Formula root(int k) {
    return new Formula.Subscript(
        new Formula.Letter("\u03b1", "\\alpha"),
        List.of(new Formula.Number(Integer.toString(k + 1))));
  }

  /** The positive roots as sums of simple ones. */
  static Formula positive(Roots r) {
    List<Formula> out = new ArrayList<>();
    for (List<Integer> sum : r.positive()) {
      List<Formula.Signed> terms = new ArrayList<>();
      for (int k = 0; k < sum.size(); k++) {
        if (sum.get(k) > 0) {
          Formula times = new Formula.Number(Integer.toString(sum.get(k)));
          terms.add(
              new Formula.Signed(
                  false, sum.get(k) == 1 ? root(k) : new Formula.Product(List.of(times, root(k)))));
        }
      }
      out.add(terms.size() == 1 ? terms.get(0).term() : new Formula.Sum(terms));
    }
    return Formulas.sequence(out);
  }

  /** A matrix of integers. */
  static List<List<Formula>> integers(List<List<Integer>> rows) {
    return rows.stream().map(r -> r.stream().map(FormFormulas::integer).toList()).toList();
  }

  private static Formula integer(int k) {
    Formula size = new Formula.Number(Integer.toString(Math.abs(k)));
    return k < 0 ? new Formula.Sum(List.of(new Formula.Signed(true, size))) : size;
  }

  /** The Casimir element, a sum of products. */
  Formula casimir(Casimir c, List<String> basis) {
    List<Formula.Signed> terms = new ArrayList<>();
    for (MatrixEntry e : c.entries()) {
      terms.add(term(formulas.of(e.value()), square(basis.get(e.row()), basis.get(e.column()))));
    }
    return new Formula.Sum(terms);
  }

  private Formula square(String left, String right) {
    Formula x = formulas.text(left);
    Formula y = formulas.text(right);
    if (left.equals(right)) {
      return x instanceof Formula.Subscript s ? new Formula.Power(s, "2") : Formulas.power(x, "2");
    }
    return new Formula.Group(
        new Formula.Sum(
            List.of(
                new Formula.Signed(false, new Formula.Product(List.of(x, y))),
                new Formula.Signed(false, new Formula.Product(List.of(y, x))))),
        "");
  }

  private static Formula.Signed term(Formula coefficient, Formula product) {
    boolean negative = false;
    Formula size = coefficient;
    if (coefficient instanceof Formula.Sum s && s.terms().size() == 1) {
      negative = s.terms().get(0).negative();
      size = s.terms().get(0).term();
    }
    return new Formula.Signed(
        negative,
        size.equals(ONE)
            ? product
            : new Formula.Product(List.of(Formulas.enclosed(size), product)));
  }

  /** The values of the general member: {@code B(x, y) = c1}. */
  List<Formula> member(
      List<List<MatrixEntry>> basis, List<String> coefficients, List<String> names) {
    List<Formula> out = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      for (int j = i; j < names.size(); j++) {
        List<RationalFunction> values = new ArrayList<>();
        List<String> own = new ArrayList<>();
        for (int k = 0; k < basis.size(); k++) {
          int row = i;
          int column = j;
          int at = k;
          basis.get(k).stream()
              .filter(e -> e.row() == row && e.column() == column)
              .forEach(
                  e -> {
                    values.add(e.value());
                    own.add(coefficients.get(at));
                  });
        }
        if (!values.isEmpty()) {
          out.add(
              Formulas.equal(
                  value(FORM, names.get(i), names.get(j)), formulas.combination(values, own)));
        }
      }
    }
    return out;
  }

  /** The entries of an inverse matrix. */
  List<Formula> inverse(List<MatrixEntry> entries, List<String> names) {
    Formula inverse = new Formula.Power(FORM, "\u22121");
    return entries.stream()
        .map(
            e ->
                Formulas.equal(
                    value(inverse, names.get(e.row()), names.get(e.column())),
                    formulas.of(e.value())))
        .toList();
  }

  private Formula value(Formula form, String x, String y) {
    return new Formula.Product(
        List.of(
            form,
            new Formula.Group(
                new Formula.Sequence(List.of(formulas.text(x), formulas.text(y))), "")));
  }

  /** Polynomials that vanish. */
  Formula vanishing(List<Polynomial> equations) {
    return formulas.vanishing(equations);
  }
}
