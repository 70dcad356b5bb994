package rankfall.exact;

import java.util.List;

/**
 * Whether a set given by equations and sign conditions has a real point.
 *
 * <p>Answers are proved; what the search does not settle within its bounds is {@code UNKNOWN}.
 */
public final class RealZeros {
  private RealZeros() {}

  /** The three answers. */
  public enum Verdict {
    /** There is a point. */
    YES,
    /** There is none. */
    NO,
    /** The bounds of the search were met first. */
    UNKNOWN
  }

  /** How a polynomial compares with 0. */
  public enum Relation {
    /** Greater than 0. */
    POSITIVE,
    /** 0 or greater. */
    NON_NEGATIVE,
    /** Not 0. */
    NON_ZERO
  }

  /**
   * A sign condition.
   *
   * @param polynomial what is compared with 0; negate it for the opposite
   * @param relation how
   */
  public record Condition(Polynomial polynomial, Relation relation) {}

  /**
   * An answer.
   *
   * @param verdict whether there is a point
   * @param point where one was found and all its coordinates lie in one field of degree at most
   *     that of one root: a coordinate a variable of the ring; else empty
   */
  public record Answer(Verdict verdict, List<AlgebraicNumber> point) {
    /**
     * Copies the point.
     *
     * @param verdict whether there is a point
     * @param point coordinates or empty
     */
    public Answer {
      point = List.copyOf(point);
    }
  }

  /**
   * {@return whether there is a real point, and one where it was found}
   *
   * @param ring the ring of all polynomials
   * @param equations all are to vanish
   * @param conditions all are to hold
   */
  public static Answer exist(
      Variables ring, List<Polynomial> equations, List<Condition> conditions) {
    RealSearch.Found f = new RealSearch(ring).solve(equations, conditions, 0);
    return new Answer(f.verdict(), f.point().map(RealPoint::coordinates).orElse(List.of()));
  }
}
