package rankfall.locus;

import rankfall.exact.RealSample;
import rankfall.lie.Signature;

/**
 * A connected piece of the real points of a stratum on which all of some polynomials keep their
 * sign.
 *
 * @param point a point of it
 * @param algebra there
 * @param signature of the Killing form, the same all over the cell
 */
public record Cell(RealSample point, PointAlgebra<?> algebra, Signature signature) {}
