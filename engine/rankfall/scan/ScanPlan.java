package rankfall.scan;

import java.util.Optional;

/**
 * What is scanned, and what is wanted of it.
 *
 * @param atlas tells where points lie
 * @param direct computes single points
 * @param points which ones
 * @param table what is written of each; empty where points are only counted
 */
public record ScanPlan(
    Atlas atlas, DirectPoints direct, PointSet points, Optional<ScanPlan.Table> table) {
  /**
   * A table of points.
   *
   * @param columns what each row holds
   * @param cells writes cells
   * @param zipped whether each block becomes a gzip member (RFC 1952; members may follow each
   *     other)
   */
  public record Table(Columns columns, CellText cells, boolean zipped) {}
}
