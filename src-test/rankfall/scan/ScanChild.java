package rankfall.scan;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** A process that writes a table and may be killed. */
final class ScanChild {
  /** Fifteen blocks. */
  static final Grid GRID = new Grid(List.copyOf(GridText.grid("a=-1:1:2001,b=0:1:490").values()));

  private ScanChild() {}

  /**
   * Writes the table.
   *
   * @param arguments the file
   */
  public static void main(String[] arguments) throws IOException, InterruptedException {
    write(Path.of(arguments[0]), GRID, 2, true);
  }

  /** Writes all points of a set. */
  static void write(Path path, PointSet points, int threads, boolean resume)
      throws IOException, InterruptedException {
    write(path, points, Shard.WHOLE, threads, resume);
  }

  /** Writes a part of the points of a set. */
  static void write(Path path, PointSet points, Shard part, int threads, boolean resume)
      throws IOException, InterruptedException {
    boolean zipped = path.toString().endsWith(".gz");
    ScanRun run =
        new ScanRun(
            HandMade.plan(points, zipped),
            part.from(points.size()),
            part.to(points.size()),
            threads);
    Checkpoint.Claim claim =
        new Checkpoint.Claim(List.of("points " + points.text(), "part " + part));
    try (ScanFile file = ScanFile.open(path, claim, resume)) {
      if (!file.complete()) {
        run.run(file.blocks(), block -> file.append(block.rows()));
        file.finish();
      }
    }
  }
}
