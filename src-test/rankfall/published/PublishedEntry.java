package rankfall.published;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;

/**
 * One family of the published tables with everything that is said about it. The headers of the data
 * files define the keys.
 *
 * @param id name of the entry and of its family
 * @param source where the values come from
 * @param tier 1 or 2, see the data files
 * @param spec the text of the spec
 * @param solvedBy substitutions that solve the relations, by coordinate
 * @param points facts at exact points
 * @param killing the non-zero entries of the Killing matrix
 * @param determinant of the Killing matrix
 * @param conditions the irreducible factors of the determinant
 * @param restricted the non-zero entries of the form on the torus
 * @param dual the non-zero entries of its inverse
 * @param strata all strata
 * @param loci equations of the points with a closed span, or with Jacobi's identity, by key
 */
public record PublishedEntry(
    String id,
    String source,
    int tier,
    String spec,
    List<SortedMap<String, String>> solvedBy,
    List<Point> points,
    Optional<SortedMap<Cell, String>> killing,
    Optional<String> determinant,
    Optional<List<Condition>> conditions,
    Optional<SortedMap<Cell, String>> restricted,
    Optional<SortedMap<Cell, String>> dual,
    Optional<List<Stratum>> strata,
    Map<String, List<String>> loci) {

  /** The name of an entry is the name of its test. */
  @Override
  public String toString() {
    return id;
  }

  /**
   * Number of single statements of the entry: a fact at a point, a matrix entry, a determinant, a
   * condition and its multiplicity, the equations and the four numbers of a stratum, an equation of
   * a locus. An empty matrix or list says one thing: that nothing is there.
   *
   * @return the number, at least 1 for an entry that says anything
   */
  public int values() {
    return points.stream().mapToInt(Point::values).sum()
        + killing.map(m -> Math.max(1, m.size())).orElse(0)
        + restricted.map(m -> Math.max(1, m.size())).orElse(0)
        + dual.map(m -> Math.max(1, m.size())).orElse(0)
        + (determinant.isPresent() ? 1 : 0)
        + conditions.map(c -> Math.max(1, 2 * c.size())).orElse(0)
        + strata.map(s -> s.stream().mapToInt(x -> 1 + x.profile().size()).sum()).orElse(0)
        + loci.values().stream().mapToInt(List::size).sum();
  }

  /**
   * What is said about one exact point.
   *
   * @param at the coordinates: fractions by parameter or by function of a parameter
   * @param facts by name, as the data files write them; a list as {@code [3, 1]}, the two numbers
   *     of the invariant forms apart
   * @param world a name the source gives to the algebra at the point
   * @param fault why there is no algebra at the point; then there are no facts
   */
  public record Point(
      SortedMap<String, String> at,
      SortedMap<String, String> facts,
      Optional<String> world,
      Optional<Fault> fault) {

    public int values() {
      return (int) facts.keySet().stream().filter(k -> !k.equals("typeAliases")).count()
          + (fault.isPresent() ? 1 : 0);
    }
  }

  /** Why there is no algebra at a point. */
  public enum Fault {
    /** The span is not closed under the bracket, or Jacobi's identity fails. */
    CLOSURE,
    /** The point does not satisfy the relations of the spec. */
    RELATIONS,
    /** An entry has a pole there. */
    POLE,
    /** A condition of the spec that is no equation fails. */
    DOMAIN
  }

  /** A place in a symmetric matrix, from 1, {@code row <= column}. */
  public record Cell(int row, int column) implements Comparable<Cell> {
    public Cell {
      if (row < 1 || column < row) {
        throw new IllegalArgumentException("not in the upper triangle: " + row + " " + column);
      }
    }

    @Override
    public int compareTo(Cell other) {
      return row == other.row
          ? Integer.compare(column, other.column)
          : Integer.compare(row, other.row);
    }

    @Override
    public String toString() {
      return row + " " + column;
    }
  }

  /** An irreducible factor of the determinant, as printed, with its multiplicity. */
  public record Condition(String polynomial, int multiplicity) {}

  /**
   * A stratum.
   *
   * @param equations of the closure, {@code 0} for the whole
   * @param profile dimension, rank of the Killing form, dimensions of the derived algebra and
   *     centre
   */
  public record Stratum(String equations, List<Integer> profile) {
    public Stratum {
      profile = List.copyOf(profile);
    }
  }
}
