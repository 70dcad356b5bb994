package rankfall.identify;

import java.util.List;

/**
 * A simple real Lie algebra.
 *
 * @param name the preferred name
 * @param otherNames names of the same algebra that are as right
 * @param type of its complexification, or of the complex algebra of which it is the real one
 * @param complex whether it is a complex algebra taken over the real numbers
 * @param character plus minus minus of the Killing form, which is dim p - dim k; 0 if complex
 */
public record RealForm(
    String name, List<String> otherNames, SimpleType type, boolean complex, int character) {
  /** Copies the names. */
  public RealForm {
    otherNames = List.copyOf(otherNames);
  }

  /** The dimension over the real numbers. */
  public int dimension() {
    return complex ? 2 * type.dimension() : type.dimension();
  }

  /** Whether the Killing form is negative definite. */
  public boolean compact() {
    return character == -dimension();
  }

  /** Whether a Cartan subalgebra acts diagonally over the real numbers. */
  public boolean split() {
    return !complex && character == type.rank();
  }
}
