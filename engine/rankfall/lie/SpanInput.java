package rankfall.lie;

import java.util.List;
import rankfall.exact.Domain;

/**
 * A family on a set or at a point, free of fractions: what its algebra is read from.
 *
 * @param <E> the elements
 */
public sealed interface SpanInput<E> {
  /** The ring of the entries. */
  Domain<E> domain();

  /** The names of the listed generators, in order. */
  List<String> names();

  /**
   * Generators given as matrices.
   *
   * @param domain the ring of the entries
   * @param order number of rows and of columns
   * @param generate whether brackets outside the span join it
   * @param matrices in the listed order
   */
  record Matrices<E>(Domain<E> domain, int order, boolean generate, List<SpanMatrix<E>> matrices)
      implements SpanInput<E> {
    /** Copies the list. */
    public Matrices {
      matrices = List.copyOf(matrices);
    }

    @Override
    public List<String> names() {
      return matrices.stream().map(SpanMatrix::name).toList();
    }
  }

  /**
   * Generators given by their brackets.
   *
   * @param names in the listed order
   * @param table their brackets; Jacobi's identity is not checked yet
   */
  record Table<E>(List<String> names, StructureConstants<E> table) implements SpanInput<E> {
    /** Copies the list. */
    public Table {
      names = List.copyOf(names);
    }

    @Override
    public Domain<E> domain() {
      return table.domain();
    }
  }
}
