package rankfall.lie;

import rankfall.exact.Polynomial;
import rankfall.spec.Spec.Relation;

/**
 * {@code polynomial relation 0} bounds the points of a family.
 *
 * @param polynomial free of a common integer factor
 * @param relation never an equation
 * @param text as written in the spec, or in the variables of the ring where a function implies it
 */
public record FamilyCondition(Polynomial polynomial, Relation relation, String text) {
  /** Whether a sign (-1, 0, 1) of the polynomial satisfies the condition. */
  public boolean allows(int sign) {
    return switch (relation) {
      case EQUAL -> sign == 0;
      case UNEQUAL -> sign != 0;
      case LESS -> sign < 0;
      case LESS_OR_EQUAL -> sign <= 0;
      case GREATER -> sign > 0;
      case GREATER_OR_EQUAL -> sign >= 0;
    };
  }
}
