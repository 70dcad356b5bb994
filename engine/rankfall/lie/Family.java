package rankfall.lie;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.spec.Expression;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * What a spec says, over one ring.
 *
 * @param spec the spec
 * @param ring its variables and what holds between them at all points
 * @param names the listed generators, in order
 * @param body their matrices or brackets; the Hermitian convention is resolved
 * @param relations what vanishes at all points: conditions of the spec, then equations of functions
 * @param domain what bounds the points, in the order of the spec, then of functions
 * @param poles irreducible polynomials at whose zeros an entry is undefined, ascending by degree
 */
public record Family(
    Spec spec,
    FamilyRing ring,
    List<String> names,
    FamilyBody body,
    List<FamilyRelation> relations,
    List<FamilyCondition> domain,
    List<Polynomial> poles) {
  /** Copies the lists. */
  public Family {
    names = List.copyOf(names);
    relations = List.copyOf(relations);
    domain = List.copyOf(domain);
    poles = List.copyOf(poles);
  }

  /**
   * Evaluates all expressions of a spec.
   *
   * @param spec as read
   * @return the family
   * @throws SpecException with every fault found: division by 0 throughout, brackets that disagree,
   *     constants that are not determined, conditions that no point satisfies, and so on
   */
  public static Family of(Spec spec) throws SpecException {
    return FamilyReader.read(spec);
  }

  /**
   * The value of a number, such as a component of a covector.
   *
   * @param e an expression of the spec
   * @return over the ring of the family
   * @throws SpecException if it has no real value (real ground), or divides by 0
   */
  public rankfall.exact.RationalFunction value(Expression e) throws SpecException {
    return FamilyReader.value(spec, ring, e);
  }

  /**
   * The family on a set.
   *
   * @param chain over {@link FamilyRing#variables}, with the rules of {@link FamilyRing#constants}
   *     (or what they become on the set)
   * @return algebraic, or outside if an entry has a pole all over the set
   */
  public FamilySite on(Chain chain) {
    for (Polynomial p : poles) {
      if (chain.vanishes(p)) {
        return new FamilySite.Outside("entry has a pole: " + p + " = 0");
      }
    }
    return new FamilySite.Algebraic(chain, FamilyInput.on(this, chain));
  }

  /** The family at its general point, relations left aside. */
  public FamilySite generic() {
    return on(ring.identities());
  }

  /**
   * The family at a rational point.
   *
   * @param values by name of a variable; a parameter that is an argument of functions may be given
   *     as 0 instead of its functions
   * @return rational, algebraic, or outside with the reason
   */
  public FamilySite at(Map<String, BigFraction> values) {
    FamilyPoint point = FamilyPoint.of(ring, values);
    Optional<String> reason = point.reason().or(() -> point.outside(this));
    if (reason.isPresent()) {
      return new FamilySite.Outside(reason.get());
    }
    return ring.constants().rules().isEmpty()
        ? new FamilySite.Rational(FamilyInput.rational(this, point))
        : new FamilySite.Algebraic(ring.constants(), FamilyInput.algebraic(this, point));
  }
}
