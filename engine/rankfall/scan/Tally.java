package rankfall.scan;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * How many points had which finding.
 *
 * @param points by finding
 */
public record Tally(Map<Finding, Long> points) {
  /** Nothing counted yet. */
  public static final Tally NONE = new Tally(Map.of());

  /** Copies the map. */
  public Tally {
    points = Collections.unmodifiableMap(new LinkedHashMap<>(points));
  }

  /** The sum of both. */
  public Tally plus(Tally other) {
    Map<Finding, Long> out = new LinkedHashMap<>(points);
    other.points.forEach((f, n) -> out.merge(f, n, Long::sum));
    return new Tally(out);
  }

  /** How many points in all. */
  public long total() {
    return points.values().stream().mapToLong(Long::longValue).sum();
  }

  /** How many of them were computed by themselves. */
  public long direct() {
    return points.entrySet().stream()
        .filter(e -> e.getKey().direct())
        .mapToLong(Map.Entry::getValue)
        .sum();
  }

  /** How many of them could not be read. */
  public long unreadable() {
    return points.getOrDefault(Finding.without(Finding.Status.UNREADABLE), 0L);
  }
}
