package rankfall.lie;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import rankfall.exact.Domain;

/** Jacobi's identity for a table of brackets. */
final class SpanOfBrackets {
  private SpanOfBrackets() {}

  static <E> Span<E> of(SpanInput.Table<E> input) {
    StructureConstants<E> c = input.table();
    List<Integer> all = IntStream.range(0, c.dimension()).boxed().toList();
    List<E> nonVanishing =
        c.domain().weight(c.denominator()) > 0 ? List.of(c.denominator()) : List.of();
    List<Span.Missing<E>> missing = failures(c);
    if (missing.isEmpty()) {
      return new Span.Closed<>(c, all, input.names(), nonVanishing);
    }
    Set<E> conditions = new LinkedHashSet<>();
    missing.forEach(m -> conditions.addAll(m.rest().values()));
    return new Span.Open<>(List.copyOf(conditions), missing, all, input.names(), nonVanishing);
  }

  /** Three different positions, ascending. */
  private record Triple(int i, int j, int k) implements Comparable<Triple> {
    @Override
    public int compareTo(Triple o) {
      return i != o.i
          ? Integer.compare(i, o.i)
          : j != o.j ? Integer.compare(j, o.j) : Integer.compare(k, o.k);
    }
  }

  /** The non-zero cyclic sums [e_i, [e_j, e_k]] + ..., i less than j less than k. */
  private static <E> List<Span.Missing<E>> failures(StructureConstants<E> c) {
    Domain<E> domain = c.domain();
    SortedMap<Triple, SortedMap<Integer, E>> sums = new TreeMap<>();
    c.brackets()
        .forEach(
            (pair, inner) -> {
              for (int i = 0; i < c.dimension(); i++) {
                if (i != pair.left() && i != pair.right()) {
                  add(c, sums, i, pair, inner);
                }
              }
            });
    List<Span.Missing<E>> out = new ArrayList<>();
    sums.forEach(
        (t, sum) -> {
          SortedMap<Integer, E> rest = SpanRows.kept(domain, sum);
          if (!rest.isEmpty()) {
            out.add(new Span.Missing<>(List.of(t.i, t.j, t.k), rest));
          }
        });
    return out;
  }

  private static <E> void add(
      StructureConstants<E> c,
      SortedMap<Triple, SortedMap<Integer, E>> sums,
      int i,
      StructureConstants.Pair pair,
      SortedMap<Integer, E> inner) {
    Domain<E> domain = c.domain();
    int j = pair.left();
    int k = pair.right();
    boolean odd = j < i && i < k;
    Triple t = i < j ? new Triple(i, j, k) : odd ? new Triple(j, i, k) : new Triple(j, k, i);
    inner.forEach(
        (l, a) ->
            c.bracket(i, l)
                .forEach(
                    (m, b) -> {
                      E product = domain.times(a, b);
                      sums.computeIfAbsent(t, x -> new TreeMap<>())
                          .merge(m, odd ? domain.negate(product) : product, domain::plus);
                    }));
  }
}
