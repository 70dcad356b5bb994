package rankfall.lie;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;

/**
 * The span of matrices and its brackets by one row reduction: a column a basis element, then a
 * column a bracket; rows are the positions of the flattened matrices.
 */
final class SpanOfMatrices<E> {
  private final Domain<E> domain;
  private final int order;
  private final List<Integer> kept;
  private final List<SpanMatrix<E>> basis;

  private SpanOfMatrices(
      Domain<E> domain, int order, List<Integer> kept, List<SpanMatrix<E>> basis) {
    this.domain = domain;
    this.order = order;
    this.kept = List.copyOf(kept);
    this.basis = List.copyOf(basis);
  }

  static <E> Span<E> of(SpanInput.Matrices<E> input) {
    List<Integer> kept = independent(input.domain(), input.order(), input.matrices());
    SpanOfMatrices<E> span =
        new SpanOfMatrices<>(
            input.domain(), input.order(), kept, kept.stream().map(input.matrices()::get).toList());
    return (input.generate() ? span.generated() : span).result();
  }

  /** Positions of the first independent matrices. */
  private static <E> List<Integer> independent(
      Domain<E> domain, int order, List<SpanMatrix<E>> matrices) {
    List<SortedMap<Integer, E>> columns = matrices.stream().map(m -> flat(m, order)).toList();
    int n = columns.size();
    return Elimination.of(domain, SpanRows.transposed(columns), n, n, true).pivots();
  }

  private static <E> SortedMap<Integer, E> flat(SpanMatrix<E> m, int order) {
    SortedMap<Integer, E> out = new TreeMap<>(m.re());
    m.im().forEach((k, v) -> out.put(order * order + k, v));
    return out;
  }

  /** Brackets join the basis until none is left outside the span. */
  private SpanOfMatrices<E> generated() {
    List<SpanMatrix<E>> all = new ArrayList<>(basis);
    all.addAll(brackets().stream().map(b -> b.value).toList());
    List<Integer> chosen = independent(domain, order, all);
    return chosen.size() == basis.size()
        ? this
        : new SpanOfMatrices<>(
                domain, order, kept, chosen.stream().map(k -> normal(all.get(k))).toList())
            .generated();
  }

  private SpanMatrix<E> normal(SpanMatrix<E> m) {
    SpanRows.Scaled<E> s = SpanRows.scaled(domain, flat(m, order), m.scale());
    SortedMap<Integer, E> im = new TreeMap<>();
    s.row().tailMap(order * order).forEach((k, v) -> im.put(k - order * order, v));
    return new SpanMatrix<>(m.name(), s.row().headMap(order * order), im, s.scale());
  }

  /** The bracket of two basis elements. */
  private record Bracket<E>(int left, int right, SpanMatrix<E> value) {}

  private List<Bracket<E>> brackets() {
    List<Bracket<E>> out = new ArrayList<>();
    for (int i = 0; i < basis.size(); i++) {
      for (int j = i + 1; j < basis.size(); j++) {
        SpanMatrix<E> value = SpanCommutator.of(domain, order, basis.get(i), basis.get(j));
        if (!value.re().isEmpty() || !value.im().isEmpty()) {
          out.add(new Bracket<>(i, j, value));
        }
      }
    }
    return out;
  }

  private Span<E> result() {
    int n = basis.size();
    List<Bracket<E>> brackets = brackets();
    List<SortedMap<Integer, E>> columns = new ArrayList<>();
    basis.forEach(b -> columns.add(flat(b, order)));
    brackets.forEach(b -> columns.add(flat(b.value, order)));
    Echelon<E> e = Elimination.of(domain, SpanRows.transposed(columns), columns.size(), n, true);
    List<String> names = basis.stream().map(SpanMatrix::name).toList();
    List<E> nonVanishing = e.nonVanishing().stream().distinct().toList();
    if (e.rest().isEmpty()) {
      return new Span.Closed<>(constants(e, brackets), kept, names, nonVanishing);
    }
    List<Span.Missing<E>> missing = missing(e, brackets, columns);
    Set<E> conditions = new LinkedHashSet<>();
    missing.forEach(m -> conditions.addAll(m.rest().values()));
    return new Span.Open<>(List.copyOf(conditions), missing, kept, names, nonVanishing);
  }

  /** Coordinates of one column in the basis, times a common denominator. */
  private record Coordinates<E>(SortedMap<Integer, E> values, E denominator) {}

  private Coordinates<E> coordinates(Echelon<E> e, int column, E denominator) {
    SortedMap<Integer, E> values = new TreeMap<>();
    for (int k = 0; k < basis.size(); k++) {
      E v = e.rows().get(k).get(column);
      if (v != null) {
        values.put(k, domain.times(v, multiplier(denominator, e.rows().get(k).get(k))));
      }
    }
    return new Coordinates<>(values, denominator);
  }

  /** {@code denominator / pivot}, where the pivot divides the denominator. */
  private E multiplier(E denominator, E pivot) {
    List<E> c = domain.cofactors(denominator, pivot);
    return domain.times(c.get(0), c.get(1)); // c.get(1) is 1 or -1
  }

  private E commonMultiple(Echelon<E> e, List<Integer> columns) {
    E out = domain.one();
    for (int k = 0; k < basis.size(); k++) {
      SortedMap<Integer, E> row = e.rows().get(k);
      if (columns.stream().anyMatch(row::containsKey)) {
        out = domain.times(out, domain.cofactors(row.get(k), out).get(0));
      }
    }
    return out;
  }

  private StructureConstants<E> constants(Echelon<E> e, List<Bracket<E>> brackets) {
    int n = basis.size();
    List<Integer> all = IntStream.range(n, n + brackets.size()).boxed().toList();
    E common = commonMultiple(e, all);
    SortedMap<Integer, E> flat = new TreeMap<>();
    for (int b = 0; b < brackets.size(); b++) {
      int at = b * n;
      coordinates(e, n + b, common).values.forEach((k, v) -> flat.put(at + k, v));
    }
    SpanRows.Scaled<E> normal = SpanRows.scaled(domain, flat, common);
    SortedMap<StructureConstants.Pair, SortedMap<Integer, E>> table = new TreeMap<>();
    normal
        .row()
        .forEach(
            (at, v) -> {
              Bracket<E> b = brackets.get(at / n);
              table
                  .computeIfAbsent(
                      new StructureConstants.Pair(b.left, b.right), x -> new TreeMap<>())
                  .put(at % n, v);
            });
    return new StructureConstants<>(
        domain, n, table, normal.scale(), basis.stream().map(SpanMatrix::scale).toList());
  }

  /** Brackets that leave the span: what is left of them after their part inside is taken away. */
  private List<Span.Missing<E>> missing(
      Echelon<E> e, List<Bracket<E>> brackets, List<SortedMap<Integer, E>> columns) {
    List<Span.Missing<E>> out = new ArrayList<>();
    for (int b = 0; b < brackets.size(); b++) {
      int column = basis.size() + b;
      if (e.rest().stream().noneMatch(r -> r.containsKey(column))) {
        continue;
      }
      Bracket<E> bracket = brackets.get(b);
      Coordinates<E> c = coordinates(e, column, commonMultiple(e, List.of(column)));
      SortedMap<Integer, E> rest = new TreeMap<>();
      columns.get(column).forEach((p, v) -> rest.put(p, domain.times(c.denominator, v)));
      c.values.forEach(
          (k, x) ->
              columns
                  .get(k)
                  .forEach(
                      (p, v) -> rest.merge(p, domain.negate(domain.times(x, v)), domain::plus)));
      List<E> units = List.of(basis.get(bracket.left).scale(), basis.get(bracket.right).scale());
      SortedMap<Integer, E> freed = new TreeMap<>();
      SpanRows.kept(domain, rest)
          .forEach((p, v) -> freed.put(p, SpanRows.without(domain, v, units)));
      out.add(new Span.Missing<>(List.of(bracket.left, bracket.right), freed));
    }
    return out;
  }
}
