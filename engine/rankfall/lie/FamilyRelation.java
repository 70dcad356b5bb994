package rankfall.lie;

import java.util.List;
import rankfall.exact.Factoring;
import rankfall.exact.Polynomial;

/**
 * A polynomial that vanishes at all points of a family.
 *
 * @param polynomial primitive and square-free, free of factors that are algebraic numbers
 * @param factors its irreducible factors over the rationals
 * @param reason why it vanishes
 */
public record FamilyRelation(Polynomial polynomial, List<Polynomial> factors, Reason reason) {
  /** Copies the factors. */
  public FamilyRelation {
    factors = List.copyOf(factors);
  }

  /** Why a polynomial vanishes. */
  public enum Reason {
    /** The spec says so. */
    SPEC,
    /** Functions of one parameter satisfy it. */
    FUNCTION
  }

  /** The relation p = 0; p is not 0 and no algebraic number. */
  static FamilyRelation of(FamilyRing ring, Polynomial p, Reason reason) {
    List<Polynomial> factors =
        Factoring.irreducible(p).stream().filter(f -> !ring.isNumber(f)).toList();
    Polynomial product =
        factors.stream().reduce(Polynomial.one(ring.variables()), Polynomial::times);
    return new FamilyRelation(product.primitive(), factors, reason);
  }
}
