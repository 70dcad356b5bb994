package rankfall.exact;

import java.util.List;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A real point of a line or a plane: some coordinates rational, the others roots over them. Signs
 * of polynomials at it are exact; a variable of the ring that is no coordinate must not occur.
 */
public final class PlanePoint {
  private final List<Optional<BigFraction>> rational;
  private final TowerPoint roots;

  PlanePoint(List<Optional<BigFraction>> rational, TowerPoint roots) {
    this.rational = List.copyOf(rational);
    this.roots = roots;
  }

  /** The point whose only coordinates are the given constants. */
  static PlanePoint of(TowerPoint constants) {
    int n = constants.chain().variables().count();
    return new PlanePoint(java.util.Collections.nCopies(n, Optional.empty()), constants);
  }

  /** This point with one more coordinate. */
  PlanePoint with(int variable, BigFraction value) {
    List<Optional<BigFraction>> more = new java.util.ArrayList<>(rational);
    more.set(variable, Optional.of(value));
    return new PlanePoint(more, roots);
  }

  /** The points that add a root of a rule, ascending. */
  List<PlanePoint> with(Chain.Rule rule) {
    return roots.extended(rule).stream().map(r -> new PlanePoint(rational, r)).toList();
  }

  /** The rules of the coordinates that are no rational numbers put in place. */
  Chain chain() {
    return roots.chain();
  }

  /** A positive multiple of a polynomial, the rational coordinates put in place. */
  Polynomial placed(Polynomial p) {
    return p.support().stream().anyMatch(v -> rational.get(v).isPresent())
        ? p.partlyAt(rational).numerator()
        : p;
  }

  /**
   * {@return the exact sign of a polynomial: -1, 0 or 1}
   *
   * @param p holds coordinates of this point only
   */
  public int sign(Polynomial p) {
    return roots.sign(placed(p));
  }

  /**
   * {@return an interval that holds a coordinate}
   *
   * @param variable its position in the ring
   * @param width at most so wide; positive
   */
  public Interval within(int variable, BigFraction width) {
    return rational
        .get(variable)
        .map(Interval::of)
        .orElseGet(() -> roots.within(Polynomial.variable(chain().variables(), variable), width));
  }

  /**
   * {@return the sign of a coordinate minus a rational number}
   *
   * @param variable its position in the ring
   * @param value any
   */
  public int compare(int variable, BigFraction value) {
    if (rational.get(variable).isPresent()) {
      return Rationals.compare(rational.get(variable).get(), value);
    }
    Variables ring = chain().variables();
    return roots.sign(
        Polynomial.variable(ring, variable)
            .times(Rationals.denominator(value))
            .minus(Polynomial.constant(ring, Rationals.numerator(value))));
  }

  /**
   * {@return a rational number strictly between a coordinate of two points; they must differ in it,
   * this one being the lesser}
   */
  BigFraction between(int variable, PlanePoint greater) {
    BigFraction width = BigFraction.ONE;
    while (true) {
      BigFraction low = within(variable, width).upper();
      BigFraction high = greater.within(variable, width).lower();
      if (Rationals.compare(low, high) < 0) {
        return new Interval(low, high).simplestInside();
      }
      width = width.divide(16);
    }
  }

  /** Which of two points is less in a coordinate in which they differ. */
  int compareDifferent(int variable, PlanePoint b) {
    BigFraction width = BigFraction.ONE;
    while (true) {
      Interval x = within(variable, width);
      Interval y = b.within(variable, width);
      if (Rationals.compare(x.upper(), y.lower()) < 0) {
        return -1;
      }
      if (Rationals.compare(y.upper(), x.lower()) < 0) {
        return 1;
      }
      width = width.divide(16);
    }
  }

  /**
   * {@return a coordinate if it was given, or found, as a rational number}
   *
   * @param variable its position in the ring
   */
  public Optional<BigFraction> rational(int variable) {
    if (rational.get(variable).isPresent()) {
      return rational.get(variable);
    }
    for (Chain.Rule r : chain().rules()) {
      if (r.variable() == variable && r.isLinear() && r.equation().support().size() == 1) {
        return Optional.of(
            BigFraction.of(
                r.equation().coefficient(variable, 0).constantValue().negate(),
                r.initial().constantValue()));
      }
    }
    return Optional.empty();
  }
}
