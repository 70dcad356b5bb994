package rankfall.cli;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import rankfall.scan.Shard;

/**
 * What a call of {@code scan} asks for.
 *
 * @param points which points
 * @param out the table; empty where points are only counted
 * @param columns of the table; empty for all
 * @param resume whether to go on with an interrupted table
 * @param shard which part of the points
 * @param threads how many
 * @param budget for the analysis that comes first
 */
record ScanOrder(
    Points points,
    Optional<Path> out,
    Optional<List<String>> columns,
    boolean resume,
    Shard shard,
    int threads,
    Duration budget) {

  /** Which points. */
  sealed interface Points {}

  /** The default grid of the spec. */
  record DefaultGrid() implements Points {}

  /** A grid as written. */
  record Axes(String text) implements Points {}

  /** A sample, its ranges as written. */
  record Drawn(long size, long seed, String ranges) implements Points {}

  /** A file with a table of points. */
  record Listed(Path file) implements Points {}
}
