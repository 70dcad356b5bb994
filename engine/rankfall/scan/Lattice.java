package rankfall.scan;

import java.util.List;

/**
 * Points in a fixed order, the values of each parameter over one denominator, so that a point is a
 * row of integers.
 */
public sealed interface Lattice extends PointSet permits Grid, Sample {
  /** The denominators, one a name. */
  List<Long> denominators();

  /** The greatest absolute value of a numerator, one a name. */
  List<Long> reaches();

  /** The name along which neighbours in the order lie, from 0; others change more seldom. */
  int inner();

  /** How many neighbours differ in {@link #inner} only: a line. */
  long lineLength();

  /**
   * The numerators of a point.
   *
   * @param number of the point, from 0
   * @param to takes one a name
   */
  void put(long number, long[] to);

  /**
   * The numerator of a point on {@link #inner}.
   *
   * @param number of the point, from 0
   */
  long innerAt(long number);
}
