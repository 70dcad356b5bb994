package rankfall.exact;

import java.util.List;

/**
 * An integral domain in which rows of a matrix may be scaled.
 *
 * <p>Sums and products need not be in normal form; {@link #normal} brings a whole row to normal
 * form at once, by one common non-zero factor, so that proportional rows stay proportional. Only
 * entries in normal form may be asked whether they are 0.
 *
 * @param <E> the elements; immutable
 */
public interface Domain<E> {
  /** The neutral element of addition. */
  E zero();

  /** The neutral element of multiplication. */
  E one();

  /** The sum. */
  E plus(E a, E b);

  /** The product. */
  E times(E a, E b);

  /** The negative. */
  E negate(E a);

  /** Whether an element in normal form is 0. */
  boolean isZero(E a);

  /**
   * A row in normal form, proportional to the given one.
   *
   * @param row any entries
   * @return entries of which each is tested for 0 correctly, freed of a common factor
   */
  Normal<E> normal(List<E> row);

  /**
   * Two elements freed of a common factor.
   *
   * @param a in normal form, not 0
   * @param b in normal form, not 0
   * @return {@code a/g} and {@code b/g} for some common divisor g
   */
  List<E> cofactors(E a, E b);

  /**
   * How unwelcome an element is as a pivot; constants cost 0.
   *
   * @param a in normal form, not 0
   */
  int weight(E a);

  /**
   * A row in normal form.
   *
   * @param entries as many as were given
   * @param content the common factor that was taken out
   * @param <E> the elements
   */
  record Normal<E>(List<E> entries, E content) {
    /** Copies the entries. */
    public Normal {
      entries = List.copyOf(entries);
    }
  }
}
