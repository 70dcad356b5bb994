package rankfall.lie;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.spec.Spec;
import rankfall.spec.Spec.Relation;

/**
 * Sorts the conditions of a spec into relations and domain.
 *
 * @param ring of the family
 * @param relations what has been found, added to
 * @param domain what has been found, added to
 */
record FamilyConditions(
    FamilyRing ring, List<FamilyRelation> relations, List<FamilyCondition> domain) {

  /** Adds the condition that a difference of two sides is in relation to 0. */
  void add(Spec.Condition c, Gaussian difference) {
    Gaussian d = ring.normal(difference);
    if (c.relation() == Relation.EQUAL) {
      addRelation(c, d.re().numerator());
      addRelation(c, d.im().numerator());
      return;
    }
    if (!d.isReal()) {
      throw new FamilyFault(
          c.place(),
          "a condition on the domain that is not real",
          "conditions compare real numbers");
    }
    if (ring.complex() && c.relation() != Relation.UNEQUAL) {
      throw new FamilyFault(c.place(), "an order relation over a complex ground", "use = or !=");
    }
    Polynomial p = polynomial(d.re(), c.relation());
    FamilyCondition condition = new FamilyCondition(p, c.relation(), c.text());
    if (!ring.isNumber(p)) {
      domain.add(condition);
    } else if (!condition.allows(sign(p))) {
      throw new FamilyFault(c.place(), "no point satisfies the condition " + c.text());
    }
  }

  private int sign(Polynomial number) {
    if (ring.complex()) {
      return ring.constants().vanishes(number) ? 0 : 1;
    }
    return ring.tower().sign(number);
  }

  private void addRelation(Spec.Condition c, Polynomial p) {
    if (p.isZero()) {
      return;
    }
    if (ring.isNumber(p)) {
      throw new FamilyFault(c.place(), "no point satisfies the condition " + c.text());
    }
    FamilyRelation relation = FamilyRelation.of(ring, p, FamilyRelation.Reason.SPEC);
    if (!relations.contains(relation)) {
      relations.add(relation);
    }
  }

  /** A polynomial of the same sign; where only 0 counts, the numerator. */
  private Polynomial polynomial(RationalFunction f, Relation relation) {
    Polynomial p =
        relation == Relation.UNEQUAL ? f.numerator() : f.numerator().times(f.denominator());
    BigInteger content = p.content();
    return content.signum() == 0 ? p : p.over(Polynomial.constant(ring.variables(), content));
  }

  /** Adds what holds between functions of a parameter. */
  void addFunctions() {
    for (Polynomial p : ring.functionRelations()) {
      relations.add(FamilyRelation.of(ring, p, FamilyRelation.Reason.FUNCTION));
    }
    ring.arguments()
        .forEach(
            (p, kinds) -> {
              if (kinds.contains(FamilyRing.Coordinates.EXPONENTIAL)) {
                RationalFunction e = ring.variable("exp(" + p + ")");
                domain.add(
                    ring.complex()
                        ? new FamilyCondition(e.numerator(), Relation.UNEQUAL, e + " != 0")
                        : new FamilyCondition(e.numerator(), Relation.GREATER, e + " > 0"));
              }
              if (kinds.contains(FamilyRing.Coordinates.HYPERBOLIC) && !ring.complex()) {
                RationalFunction c = ring.variable("cosh(" + p + ")");
                domain.add(
                    new FamilyCondition(
                        c.minus(ring.number(BigFraction.ONE)).numerator(),
                        Relation.GREATER_OR_EQUAL,
                        c + " >= 1"));
              }
            });
  }
}
