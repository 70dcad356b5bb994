package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Chain;
import rankfall.exact.ConstantRoot;
import rankfall.exact.Polynomial;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;

/** Real points of a family on closed sets and on strata. */
public final class RealPoints {
  private final Family family;
  private final Closures closures;

  /** Real points of one family. */
  public RealPoints(Family family) {
    this.family = family;
    this.closures = new Closures(family.ring().constants());
  }

  /** Whether the closure of a chain has a real point within the domain. */
  public RealZeros.Answer onClosure(Chain chain) {
    return SimplePoint.in(family, new Piece(chain, List.of()))
        .map(
            p ->
                new RealZeros.Answer(
                    RealZeros.Verdict.YES, p.stream().map(AlgebraicNumber::of).toList()))
        .orElseGet(() -> ask(closures.ideal(chain), List.of()));
  }

  /** Whether polynomials have a common real zero within the domain. */
  public RealZeros.Answer onZeros(List<Polynomial> polynomials) {
    return ask(polynomials, List.of());
  }

  /**
   * Whether polynomials have a common real zero within the domain that satisfies conditions.
   *
   * @param polynomials all vanish there
   * @param conditions all hold there
   */
  public RealZeros.Answer under(
      List<Polynomial> polynomials, List<RealZeros.Condition> conditions) {
    return ask(polynomials, List.of(), conditions);
  }

  /** Whether a stratum has a real point within the domain: one of its leaves has. */
  public RealZeros.Answer on(Strata.Stratum stratum) {
    boolean unknown = false;
    for (Leaf.Defined leaf : stratum.leaves()) {
      Optional<List<BigFraction>> point = SimplePoint.in(family, leaf.piece());
      if (point.isPresent()) {
        return new RealZeros.Answer(
            RealZeros.Verdict.YES, point.get().stream().map(AlgebraicNumber::of).toList());
      }
    }
    for (Leaf.Defined leaf : stratum.leaves()) {
      Chain chain = leaf.piece().chain();
      List<Polynomial> equations = chain.rules().stream().map(Chain.Rule::equation).toList();
      RealZeros.Answer answer = ask(equations, leaf.piece().nonZero());
      if (answer.verdict() == RealZeros.Verdict.YES) {
        return answer;
      }
      unknown |= answer.verdict() == RealZeros.Verdict.UNKNOWN;
    }
    List<AlgebraicNumber> nowhere = List.of();
    return new RealZeros.Answer(
        unknown ? RealZeros.Verdict.UNKNOWN : RealZeros.Verdict.NO, nowhere);
  }

  private RealZeros.Answer ask(List<Polynomial> equations, List<Polynomial> nonZero) {
    return ask(equations, nonZero, List.of());
  }

  private RealZeros.Answer ask(
      List<Polynomial> equations, List<Polynomial> nonZero, List<RealZeros.Condition> further) {
    List<Polynomial> all = new ArrayList<>(equations);
    family.ring().constants().rules().forEach(r -> all.add(r.equation()));
    List<RealZeros.Condition> conditions = new ArrayList<>(further);
    nonZero.forEach(p -> conditions.add(new RealZeros.Condition(p, RealZeros.Relation.NON_ZERO)));
    family.poles().stream()
        .filter(p -> !equations.contains(p))
        .forEach(p -> conditions.add(new RealZeros.Condition(p, RealZeros.Relation.NON_ZERO)));
    family.domain().forEach(c -> conditions.add(condition(c)));
    conditions.addAll(rootsOfConstants());
    return RealZeros.exist(family.ring().variables(), all, conditions);
  }

  /** Intervals that tell the root of each algebraic number from its conjugates. */
  private List<RealZeros.Condition> rootsOfConstants() {
    List<RealZeros.Condition> out = new ArrayList<>();
    List<ConstantRoot> roots = family.ring().tower().roots();
    for (int k = 0; k < roots.size(); k++) {
      int variable = family.ring().constants().rules().get(k).variable();
      Polynomial x = Polynomial.variable(family.ring().variables(), variable);
      out.add(above(x, roots.get(k).low()));
      out.add(above(x.negate(), roots.get(k).high().negate()));
    }
    return out;
  }

  private static RealZeros.Condition above(Polynomial x, BigFraction bound) {
    return new RealZeros.Condition(
        x.times(bound.getDenominator())
            .minus(Polynomial.constant(x.variables(), bound.getNumerator())),
        RealZeros.Relation.POSITIVE);
  }

  static RealZeros.Condition condition(FamilyCondition c) {
    Polynomial p = c.polynomial();
    return switch (c.relation()) {
      case UNEQUAL -> new RealZeros.Condition(p, RealZeros.Relation.NON_ZERO);
      case GREATER -> new RealZeros.Condition(p, RealZeros.Relation.POSITIVE);
      case GREATER_OR_EQUAL -> new RealZeros.Condition(p, RealZeros.Relation.NON_NEGATIVE);
      case LESS -> new RealZeros.Condition(p.negate(), RealZeros.Relation.POSITIVE);
      case LESS_OR_EQUAL -> new RealZeros.Condition(p.negate(), RealZeros.Relation.NON_NEGATIVE);
      case EQUAL -> throw new IllegalArgumentException("an equation bounds nothing");
    };
  }
}
