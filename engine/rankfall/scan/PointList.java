package rankfall.scan;

import java.util.List;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Listed points, read one after the other.
 *
 * @param names of the values
 * @param size how many points
 * @param text tells this list from every other one
 * @param rows gives the points from the first one on
 */
public record PointList(List<String> names, long size, String text, Rows rows) implements PointSet {
  /** Copies the names. */
  public PointList {
    names = List.copyOf(names);
  }

  /** Reads points in their order. */
  @FunctionalInterface
  public interface Rows {
    /**
     * The next points.
     *
     * @param count at most so many
     * @return as many, or fewer at the end
     */
    List<Row> next(int count);
  }

  /**
   * A point.
   *
   * @param texts the values as given, one a name; empty where there is none
   * @param values exact, one a name; empty where the texts are no point
   */
  public record Row(List<String> texts, Optional<List<BigFraction>> values) {
    /** Copies the lists. */
    public Row {
      texts = List.copyOf(texts);
      values = values.map(List::copyOf);
    }
  }
}
