package rankfall.scan;

import java.util.List;

/** Points in a fixed order. */
public sealed interface PointSet permits Lattice, PointList {
  /** The names of the values that a point has, in order. */
  List<String> names();

  /** How many points. */
  long size();

  /** One line that tells this set from every other one. */
  String text();
}
