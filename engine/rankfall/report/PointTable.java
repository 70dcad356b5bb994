package rankfall.report;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.Iterator;
import java.util.Optional;
import rankfall.PointResult;
import rankfall.Points;

/**
 * A table of points as CSV, its header the names of parameters or of functions such as {@code
 * cos(t)}; each row is answered.
 */
public final class PointTable implements Iterator<PointResult> {
  private final Points points;
  private final PointRows rows;

  private PointTable(Points points, PointRows rows) {
    this.points = points;
    this.rows = rows;
  }

  /**
   * Reads a table row by row.
   *
   * @param points the family that is asked
   * @param table the text; stays open
   * @return the answers in the order of the rows; they throw {@link UncheckedIOException} if the
   *     table cannot be read on
   * @throws IOException if the table cannot be read
   * @throws IllegalArgumentException if the header does not determine points of the family
   */
  public static Iterator<PointResult> answers(Points points, Reader table) throws IOException {
    try {
      PointRows rows = new PointRows(table);
      Optional<String> misfit = points.misfit(rows.header());
      if (misfit.isPresent()) {
        throw new IllegalArgumentException("the header of the table: " + misfit.get());
      }
      return new PointTable(points, rows);
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
  }

  @Override
  public boolean hasNext() {
    return rows.hasNext();
  }

  @Override
  public PointResult next() {
    PointRows.Row row = rows.next();
    if (row instanceof PointRows.Broken b) {
      return points.unreadable(b.texts(), b.error());
    }
    return points.at(((PointRows.Numbers) row).values());
  }
}
