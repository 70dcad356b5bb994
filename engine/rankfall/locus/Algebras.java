package rankfall.locus;

import java.util.List;
import rankfall.exact.Polynomial;

/** A family, asked at the general point of a piece. */
public interface Algebras {

  /**
   * The algebra at the general point.
   *
   * @param piece inside the points at which the entries are defined
   */
  Outcome on(Piece piece);

  /** What the span is at the general point of a piece. */
  sealed interface Outcome {
    /** What must not vanish for the same to hold at a special point of the piece. */
    List<Polynomial> nonVanishing();
  }

  /** The span is closed and Jacobi's identity holds. */
  record Closed(BranchAlgebra algebra, List<Polynomial> nonVanishing) implements Outcome {}

  /**
   * The span is not closed.
   *
   * @param dimension of the span
   * @param conditions which all vanish exactly at those points of the piece that are closed
   */
  record NotClosed(int dimension, List<Polynomial> conditions, List<Polynomial> nonVanishing)
      implements Outcome {}
}
