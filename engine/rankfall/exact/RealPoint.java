package rankfall.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A point whose coordinates are rational functions of one real algebraic number.
 *
 * @param generator the number
 * @param values one a coordinate, quotients in one variable; no pole at the number
 */
record RealPoint(AlgebraicNumber generator, List<RationalFunction> values) {
  private static final Variables T = new Variables(List.of("x"));
  private static final Variables VALUE = new Variables(List.of("x", "v"));

  RealPoint {
    values = List.copyOf(values);
  }

  /** The point with the given coordinates, one of them replaced by an algebraic number. */
  static RealPoint of(List<BigFraction> point, int irrational, AlgebraicNumber value) {
    List<RationalFunction> out = new ArrayList<>();
    for (int k = 0; k < point.size(); k++) {
      out.add(
          k == irrational
              ? RationalFunction.of(Polynomial.variable(T, 0))
              : RationalFunction.of(T, point.get(k)));
    }
    return new RealPoint(value, out);
  }

  static RealPoint of(List<BigFraction> point) {
    return of(point, -1, AlgebraicNumber.of(BigFraction.ZERO));
  }

  /** The point with one coordinate set to {@code -b/a}, where a does not vanish. */
  RealPoint solved(int variable, Polynomial a, Polynomial b) {
    List<RationalFunction> out = new ArrayList<>(values);
    out.set(variable, value(b).negate().over(value(a)));
    return new RealPoint(generator, out);
  }

  private boolean isRational() {
    return values.stream().allMatch(RationalFunction::isConstant);
  }

  /** The point with the listed coordinates of this and the others of q; one must be rational. */
  Optional<RealPoint> joined(RealPoint q, Set<Integer> here) {
    if (!isRational() && !q.isRational() && !generator.equals(q.generator)) {
      return Optional.empty();
    }
    List<RationalFunction> out = new ArrayList<>();
    for (int k = 0; k < values.size(); k++) {
      out.add(here.contains(k) ? values.get(k) : q.values.get(k));
    }
    return Optional.of(new RealPoint(isRational() ? q.generator : generator, out));
  }

  private RationalFunction value(Polynomial p) {
    RationalFunction sum = RationalFunction.of(Polynomial.zero(T));
    for (Term t : p.terms()) {
      RationalFunction product = RationalFunction.of(Polynomial.constant(T, t.coefficient()));
      for (int k = 0; k < values.size(); k++) {
        if (t.exponents().get(k) > 0) {
          product = product.times(values.get(k).pow(t.exponents().get(k)));
        }
      }
      sum = sum.plus(product);
    }
    return sum;
  }

  /** The sign of a polynomial at the point. */
  int sign(Polynomial p) {
    if (isRational()) {
      return p.at(values.stream().map(RationalFunction::constantValue).toList()).signum();
    }
    RationalFunction v = value(p);
    return generator.signOf(v.numerator()) * generator.signOf(v.denominator());
  }

  List<AlgebraicNumber> coordinates() {
    return Collections.unmodifiableList(values.stream().map(this::number).toList());
  }

  private AlgebraicNumber number(RationalFunction f) {
    if (f.isConstant()) {
      return AlgebraicNumber.of(f.constantValue());
    }
    if (generator.isRational()) {
      return AlgebraicNumber.of(f.at(List.of(generator.rational().orElseThrow())));
    }
    Polynomial v = Polynomial.variable(VALUE, 1);
    Polynomial relation = moved(f.denominator()).times(v).minus(moved(f.numerator()));
    Polynomial norm = relation.resultant(moved(generator.minimalPolynomial()), 0);
    List<AlgebraicNumber> roots = AlgebraicNumber.rootsOf(norm);
    BigFraction width = BigFraction.ONE;
    while (true) {
      Interval x = generator.within(width);
      Interval below = Univariate.of(f.denominator()).on(x);
      if (!below.contains(BigFraction.ZERO)) {
        Interval y = Univariate.of(f.numerator()).on(x).over(below);
        List<AlgebraicNumber> fit =
            roots.stream()
                .filter(r -> r.compareTo(y.lower()) >= 0 && r.compareTo(y.upper()) <= 0)
                .toList();
        if (fit.size() == 1) {
          return fit.get(0);
        }
      }
      width = width.divide(256);
    }
  }

  private static Polynomial moved(Polynomial p) {
    List<Term> out = new ArrayList<>();
    for (Term t : p.terms()) {
      out.add(new Term(t.coefficient(), List.of(t.exponents().get(0), 0)));
    }
    return Polynomial.of(VALUE, out);
  }
}
