package rankfall.lie;

import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What listed generators span at the general point of a set (or at a point): an algebra, or a span
 * that is not closed.
 *
 * @param <E> the elements
 */
public sealed interface Span<E> {
  /** Names of the basis: the first independent generators, then those that closure added. */
  List<String> names();

  /** Positions, from 0, of the listed generators that the basis holds. */
  List<Integer> kept();

  /**
   * Elements, none constant, such that the same basis and the same formulas serve wherever none of
   * them vanishes.
   */
  List<E> nonVanishing();

  /**
   * Finds a basis and its brackets.
   *
   * @param input generators or a table of brackets
   * @param <E> the elements
   * @return closed, or what is missing
   */
  static <E> Span<E> of(SpanInput<E> input) {
    if (input instanceof SpanInput.Matrices<E> m) {
      return SpanOfMatrices.of(m);
    }
    return SpanOfBrackets.of((SpanInput.Table<E>) input);
  }

  /**
   * An algebra.
   *
   * @param constants the brackets of the basis
   */
  record Closed<E>(
      StructureConstants<E> constants, List<Integer> kept, List<String> names, List<E> nonVanishing)
      implements Span<E> {
    /** Copies the lists. */
    public Closed {
      kept = List.copyOf(kept);
      names = List.copyOf(names);
      nonVanishing = List.copyOf(nonVanishing);
    }
  }

  /**
   * No algebra: a bracket leaves the span, or Jacobi's identity fails.
   *
   * @param conditions non-zero elements; where none of {@code nonVanishing} vanishes, the span is
   *     an algebra exactly at the points at which all conditions vanish
   * @param missing what leaves the span, or fails
   */
  record Open<E>(
      List<E> conditions,
      List<Missing<E>> missing,
      List<Integer> kept,
      List<String> names,
      List<E> nonVanishing)
      implements Span<E> {
    /** Copies the lists. */
    public Open {
      conditions = List.copyOf(conditions);
      missing = List.copyOf(missing);
      kept = List.copyOf(kept);
      names = List.copyOf(names);
      nonVanishing = List.copyOf(nonVanishing);
    }
  }

  /**
   * A direction that is missing.
   *
   * @param generators positions in the basis: two for a bracket that leaves the span, three for a
   *     failure of Jacobi's identity
   * @param rest a multiple of the part outside the span by position of the flattened matrix (real
   *     parts, then imaginary ones); for Jacobi a multiple of the cyclic sum by basis element
   */
  record Missing<E>(List<Integer> generators, SortedMap<Integer, E> rest) {
    /** Copies list and map. */
    public Missing {
      generators = List.copyOf(generators);
      rest = Collections.unmodifiableSortedMap(new TreeMap<>(rest));
    }
  }
}
