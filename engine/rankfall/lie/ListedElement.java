package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Elimination;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/** A listed generator as a combination of the basis of the span. */
public final class ListedElement {
  private ListedElement() {}

  /**
   * The coordinates of a generator.
   *
   * @param chain the set at whose general point the span is asked
   * @param input the family there
   * @param basis names of the basis
   * @param name of a listed generator
   * @return one a basis element; empty if the generator lies outside the span
   */
  public static Optional<List<RationalFunction>> in(
      Chain chain, SpanInput<Polynomial> input, List<String> basis, String name) {
    List<RationalFunction> out = new ArrayList<>();
    basis.forEach(b -> out.add(RationalFunction.of(b.equals(name) ? chain.one() : chain.zero())));
    if (basis.contains(name)) {
      return Optional.of(out);
    }
    if (!(input instanceof SpanInput.Matrices<Polynomial> m)) {
      return Optional.empty();
    }
    List<SpanMatrix<Polynomial>> kept =
        m.matrices().stream().filter(x -> basis.contains(x.name())).toList();
    SpanMatrix<Polynomial> asked =
        m.matrices().stream().filter(x -> x.name().equals(name)).findFirst().orElseThrow();
    List<SortedMap<Integer, Polynomial>> columns = new ArrayList<>();
    kept.forEach(x -> columns.add(flat(x, m.order())));
    columns.add(flat(asked, m.order()));
    List<SortedMap<Integer, Polynomial>> kernel =
        Elimination.of(chain, SpanRows.transposed(columns), columns.size()).kernel();
    if (kernel.size() != 1) {
      return Optional.empty();
    }
    SortedMap<Integer, Polynomial> v = kernel.get(0);
    Polynomial below = v.get(kept.size()).times(asked.scale());
    for (int k = 0; k < kept.size(); k++) {
      Polynomial x = v.get(k);
      if (x != null) {
        out.set(
            basis.indexOf(kept.get(k).name()),
            ChainFractions.canonical(chain, x.times(kept.get(k).scale()).negate(), below));
      }
    }
    return Optional.of(out);
  }

  private static SortedMap<Integer, Polynomial> flat(SpanMatrix<Polynomial> m, int order) {
    SortedMap<Integer, Polynomial> out = new TreeMap<>(m.re());
    m.im().forEach((k, v) -> out.put(order * order + k, v));
    return out;
  }
}
