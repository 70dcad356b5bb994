package rankfall;

import java.util.List;

/**
 * The default grid of a family, counted.
 *
 * @param axes the values of each name; the last one changes fastest
 * @param counts how many points had which answer; in the order of strata and regions
 * @param points for each point in order its place in the counts; empty for a grid of more than 20
 *     000 points
 */
public record ScanCounts(List<ScanAxis> axes, List<ScanCount> counts, List<Integer> points) {
  /** Copies the lists. */
  public ScanCounts {
    axes = List.copyOf(axes);
    counts = List.copyOf(counts);
    points = List.copyOf(points);
  }
}
