package rankfall.locus;

/** A piece of the parameter space on all points of which the same is true. */
public sealed interface Leaf {
  /** The points. */
  Piece piece();

  /**
   * Points at which there is an algebra.
   *
   * @param piece the points
   * @param profile the same at all of them
   * @param algebra at the general point
   */
  record Defined(Piece piece, Profile profile, BranchAlgebra algebra) implements Leaf {}

  /**
   * Points at whose general one the span is not closed.
   *
   * @param piece among these points some may be closed; they lie in other leaves too
   * @param dimension of the span at all of them
   */
  record Open(Piece piece, int dimension) implements Leaf {}
}
