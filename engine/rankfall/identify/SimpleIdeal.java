package rankfall.identify;

import java.util.Optional;
import java.util.OptionalInt;

/**
 * A simple ideal of a semisimple algebra.
 *
 * @param kind over which field it is simple
 * @param dimension over the real numbers, or over the complex ones for a complex algebra
 * @param type of the algebra over the complex numbers; empty where no identity decided
 * @param character plus minus minus of its Killing form; empty for a complex algebra
 */
public record SimpleIdeal(
    Kind kind, int dimension, Optional<SimpleType> type, OptionalInt character) {

  /** Where a simple ideal comes from. */
  public enum Kind {
    /** A real algebra that stays simple over the complex numbers. */
    REAL,
    /** A complex algebra, taken over the real numbers. */
    COMPLEX_AS_REAL,
    /** A complex algebra. */
    COMPLEX
  }

  /** The dimension of a Cartan subalgebra, where the type is known. */
  public OptionalInt rank() {
    return type.isEmpty()
        ? OptionalInt.empty()
        : OptionalInt.of(kind == Kind.COMPLEX_AS_REAL ? 2 * type.get().rank() : type.get().rank());
  }
}
