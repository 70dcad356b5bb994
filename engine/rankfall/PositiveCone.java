package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Forms.Positivity;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Factorization;
import rankfall.exact.Polynomial;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;
import rankfall.lie.RestrictedForm;
import rankfall.locus.RealPoints;

/**
 * Where a form is positive definite: the squared lengths of orthogonal vectors are positive, that
 * is, the quotients of its leading principal minors (Sylvester's criterion).
 */
record PositiveCone(Family family, Chain chain) {

  /**
   * The points.
   *
   * @param positivity the conditions
   * @param certainlySomewhere whether a real point was found that satisfies them
   */
  record Answer(Positivity positivity, boolean certainlySomewhere) {}

  private static final Answer NOWHERE = new Answer(new Positivity(false, List.of()), false);

  /** The points of the set at which a form is positive definite. */
  Answer of(RestrictedForm form) {
    Optional<List<RestrictedForm.Orthogonal>> vectors = form.orthogonal();
    if (vectors.isEmpty()) {
      return NOWHERE;
    }
    List<SignCondition> conditions = new ArrayList<>();
    for (RestrictedForm.Orthogonal v : vectors.get()) {
      Polynomial p = v.squaredLength().numerator().times(v.squaredLength().denominator());
      if (!add(ChainFactoring.factorization(chain, p), conditions)) {
        return NOWHERE;
      }
    }
    RealZeros.Verdict verdict = exist(conditions, Optional.empty());
    if (verdict == RealZeros.Verdict.NO) {
      return NOWHERE;
    }
    return new Answer(new Positivity(true, minimal(conditions)), verdict == RealZeros.Verdict.YES);
  }

  /** Adds what makes a product positive; false if nothing does. */
  private boolean add(Factorization f, List<SignCondition> conditions) {
    int sign = f.unit().signum();
    Polynomial odd = chain.one();
    List<Polynomial> even = new ArrayList<>();
    for (Factorization.Factor x : f.factors()) {
      if (isNumber(x.base())) {
        sign *= x.multiplicity() % 2 == 0 ? 1 : family.ring().tower().sign(x.base());
      } else if (x.multiplicity() % 2 == 0) {
        even.add(x.base());
      } else {
        odd = odd.times(x.base());
      }
    }
    for (SignCondition known : conditions) {
      Optional<Polynomial> rest = odd.dividedBy(known.polynomial());
      if (rest.isPresent() && known.comparison() != Comparison.UNEQUAL) {
        odd = rest.get();
        sign *= known.comparison() == Comparison.LESS ? -1 : 1;
      }
    }
    if (odd.isConstant()) {
      if (sign * odd.constantValue().signum() < 0) {
        return false;
      }
    } else {
      sign *= odd.leadingCoefficient().signum();
      conditions.add(
          new SignCondition(odd.primitive(), sign > 0 ? Comparison.GREATER : Comparison.LESS));
    }
    even.stream()
        .map(p -> new SignCondition(p.primitive(), Comparison.UNEQUAL))
        .filter(c -> !conditions.contains(c))
        .forEach(conditions::add);
    return true;
  }

  private boolean isNumber(Polynomial p) {
    int own = family.ring().variables().indeterminates();
    return p.support().stream().allMatch(v -> v >= own);
  }

  /** Without those that follow from the others and the domain. */
  private List<SignCondition> minimal(List<SignCondition> conditions) {
    List<SignCondition> kept = new ArrayList<>(conditions);
    for (SignCondition c : conditions) {
      List<SignCondition> others = new ArrayList<>(kept);
      others.remove(c);
      if (exist(others, Optional.of(c)) == RealZeros.Verdict.NO) {
        kept = others;
      }
    }
    return kept;
  }

  /** Whether a real point of the set satisfies conditions, and fails another one. */
  private RealZeros.Verdict exist(List<SignCondition> holds, Optional<SignCondition> fails) {
    List<Polynomial> equations = new ArrayList<>();
    chain.rules().forEach(r -> equations.add(r.equation()));
    List<RealZeros.Condition> conditions = new ArrayList<>();
    chain
        .initials()
        .forEach(p -> conditions.add(new RealZeros.Condition(p, RealZeros.Relation.NON_ZERO)));
    for (SignCondition c : holds) {
      conditions.add(
          switch (c.comparison()) {
            case GREATER -> new RealZeros.Condition(c.polynomial(), RealZeros.Relation.POSITIVE);
            case LESS ->
                new RealZeros.Condition(c.polynomial().negate(), RealZeros.Relation.POSITIVE);
            default -> new RealZeros.Condition(c.polynomial(), RealZeros.Relation.NON_ZERO);
          });
    }
    if (fails.isPresent()) {
      Polynomial p = fails.get().polynomial();
      switch (fails.get().comparison()) {
        case GREATER ->
            conditions.add(new RealZeros.Condition(p.negate(), RealZeros.Relation.NON_NEGATIVE));
        case LESS -> conditions.add(new RealZeros.Condition(p, RealZeros.Relation.NON_NEGATIVE));
        default -> equations.add(p);
      }
    }
    return new RealPoints(family).under(equations, conditions).verdict();
  }
}
