package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain.Rule;

/**
 * An exact real point of a chain: one chosen among the real points of a chain without free
 * variables.
 *
 * <p>Linear rules give rational coordinates, or such as are rational functions of the tower's; the
 * tower holds the algebraic numbers of the ring and coordinates that are roots.
 */
public final class RealSample {
  private final Chain chain;
  private final TowerPoint tower;
  private final Optional<List<BigFraction>> rational;

  private RealSample(Chain chain, TowerPoint tower) {
    this.chain = chain;
    this.tower = tower;
    this.rational = rational(chain);
  }

  /**
   * A point.
   *
   * @param chain a rule for every variable
   * @param coordinates the real values of the tower variables
   */
  static RealSample of(Chain chain, SortedMap<Integer, AlgebraicNumber> coordinates) {
    return new RealSample(chain, TowerPoint.of(chain, new TreeMap<>(coordinates)));
  }

  /** All coordinates where each has a linear rule with rational coefficients. */
  private static Optional<List<BigFraction>> rational(Chain chain) {
    SortedMap<Integer, BigFraction> out = new TreeMap<>();
    for (Rule r : chain.rules()) {
      value(r).ifPresent(x -> out.put(r.variable(), x));
    }
    return out.size() == chain.variables().count()
        ? Optional.of(List.copyOf(out.values()))
        : Optional.empty();
  }

  private static Optional<BigFraction> value(Rule r) {
    Polynomial below = r.initial();
    Polynomial above = r.equation().coefficient(r.variable(), 0);
    return r.isLinear() && below.isConstant() && above.isConstant()
        ? Optional.of(BigFraction.of(above.constantValue().negate(), below.constantValue()))
        : Optional.empty();
  }

  /** {@return the equations of the point and its conjugates, a rule for every variable} */
  public Chain chain() {
    return chain;
  }

  /**
   * {@return the exact sign of a polynomial: -1, 0 or 1}
   *
   * @param p any polynomial of the ring
   */
  public int sign(Polynomial p) {
    return rational.isPresent() ? p.at(rational.get()).signum() : tower.sign(p);
  }

  /**
   * The coordinates that stand for no algebraic number of the ring.
   *
   * @return one each; empty if one of them is irrational
   */
  public Optional<List<BigFraction>> rationalCoordinates() {
    List<BigFraction> out = new ArrayList<>();
    for (int v = 0; v < chain.variables().indeterminates(); v++) {
      Optional<BigFraction> x = value(rule(v));
      if (x.isEmpty()) {
        return Optional.empty();
      }
      out.add(x.get());
    }
    return Optional.of(List.copyOf(out));
  }

  private Rule rule(int variable) {
    return chain.rules().stream().filter(r -> r.variable() == variable).findFirst().orElseThrow();
  }

  /** {@return all coordinates, one a variable of the ring} */
  public List<AlgebraicNumber> coordinates() {
    List<AlgebraicNumber> out = new ArrayList<>();
    for (int v = 0; v < chain.variables().count(); v++) {
      out.add(coordinate(v));
    }
    return List.copyOf(out);
  }

  private AlgebraicNumber coordinate(int v) {
    Rule r = rule(v);
    return value(r)
        .map(AlgebraicNumber::of)
        .orElseGet(
            () -> r.isLinear() ? tower.roots(r).get(0) : tower.coordinates().get(r.variable()));
  }

  /** The coordinates, as the reports write them. */
  @Override
  public String toString() {
    return coordinates().toString();
  }
}
