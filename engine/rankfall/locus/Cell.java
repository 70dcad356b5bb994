package rankfall.locus;

import rankfall.exact.RealSample;
import rankfall.lie.Family;
import rankfall.lie.Signature;

/**
 * A connected piece of the real points of a stratum on which all of some polynomials keep their
 * sign.
 *
 * @param point a point of it
 * @param algebra there
 * @param signature of the Killing form, the same all over the cell
 */
public record Cell(RealSample point, PointAlgebra<?> algebra, Signature signature) {

  /**
   * The cell of a point.
   *
   * @throws IllegalStateException if the algebra there has not the profile of the stratum
   */
  static Cell at(Family family, Strata.Stratum stratum, RealSample point) {
    PointAlgebra<?> algebra = PointAlgebra.at(family, point);
    Signature s = algebra.signature();
    Profile p = stratum.profile();
    if (algebra.constants().dimension() != p.dimension() || s.rank() != p.rank()) {
      throw new IllegalStateException(
          "dimension "
              + algebra.constants().dimension()
              + " and signature "
              + s
              + " at "
              + point
              + " in a stratum with "
              + p);
    }
    return new Cell(point, algebra, s);
  }
}
