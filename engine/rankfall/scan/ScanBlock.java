package rankfall.scan;

import java.util.List;

/** Points that are worked on together. */
sealed interface ScanBlock {
  /** Points of a lattice, by number: from the first to before the second. */
  record Range(Lattice lattice, long from, long to) implements ScanBlock {}

  /** Points of a list. */
  record Rows(List<PointList.Row> rows) implements ScanBlock {}
}
