package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Domain;
import rankfall.exact.Integers;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * Frees generators of fractions.
 *
 * @param domain the ring of the entries
 * @param integral a list of entries, and their common multiplier as its last element
 */
record FamilyInput<E>(Domain<E> domain, Function<List<RationalFunction>, List<E>> integral) {

  /** At the general point of a set. */
  static SpanInput<Polynomial> on(Family family, Chain chain) {
    return new FamilyInput<>(chain, f -> cleared(chain, f)).of(family);
  }

  /** At a rational point, over the algebraic numbers. */
  static SpanInput<Polynomial> algebraic(Family family, FamilyPoint point) {
    Chain chain = family.ring().constants();
    return new FamilyInput<Polynomial>(
            chain, f -> cleared(chain, f.stream().map(point::at).toList()))
        .of(family);
  }

  /** At a rational point, where no algebraic numbers occur. */
  static SpanInput<BigInteger> rational(Family family, FamilyPoint point) {
    List<BigFraction> at = point.values().stream().map(v -> v.orElseThrow()).toList();
    return new FamilyInput<BigInteger>(
            new Integers(), f -> cleared(f.stream().map(x -> x.at(at)).toList()))
        .of(family);
  }

  private static List<Polynomial> cleared(Chain chain, List<RationalFunction> f) {
    Polynomial common = chain.one();
    for (RationalFunction x : f) {
      common = common.times(x.denominator().over(common.gcd(x.denominator())));
    }
    List<Polynomial> out = new ArrayList<>();
    for (RationalFunction x : f) {
      out.add(x.numerator().times(common.over(x.denominator())));
    }
    out.add(common);
    return out;
  }

  private static List<BigInteger> cleared(List<BigFraction> f) {
    BigInteger common = BigInteger.ONE;
    for (BigFraction x : f) {
      common = common.multiply(x.getDenominator().divide(common.gcd(x.getDenominator())));
    }
    List<BigInteger> out = new ArrayList<>();
    for (BigFraction x : f) {
      out.add(x.getNumerator().multiply(common.divide(x.getDenominator())));
    }
    out.add(common);
    return out;
  }

  private SpanInput<E> of(Family family) {
    if (family.body() instanceof FamilyBody.Matrices m) {
      List<SpanMatrix<E>> out = new ArrayList<>();
      for (int g = 0; g < m.matrices().size(); g++) {
        out.add(matrix(family.names().get(g), m.order(), m.matrices().get(g)));
      }
      return new SpanInput.Matrices<>(domain, m.order(), m.generate(), out);
    }
    return table(family.names(), (FamilyBody.Brackets) family.body());
  }

  private SpanRows.Scaled<E> scaled(SortedMap<Integer, RationalFunction> row) {
    List<E> values = integral.apply(List.copyOf(row.values()));
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : row.keySet()) {
      out.put(k, values.get(at++));
    }
    return SpanRows.scaled(domain, out, values.get(at));
  }

  private SpanMatrix<E> matrix(String name, int order, FamilyBody.Entries m) {
    int shift = order * order;
    SortedMap<Integer, RationalFunction> flat = new TreeMap<>(m.re());
    m.im().forEach((k, v) -> flat.put(shift + k, v));
    SpanRows.Scaled<E> s = scaled(flat);
    SortedMap<Integer, E> im = new TreeMap<>();
    s.row().tailMap(shift).forEach((k, v) -> im.put(k - shift, v));
    return new SpanMatrix<>(name, s.row().headMap(shift), im, s.scale());
  }

  private SpanInput<E> table(List<String> names, FamilyBody.Brackets b) {
    int n = names.size();
    List<StructureConstants.Pair> pairs = List.copyOf(b.table().keySet());
    SortedMap<Integer, RationalFunction> flat = new TreeMap<>();
    for (int p = 0; p < pairs.size(); p++) {
      int at = p * n;
      b.table().get(pairs.get(p)).forEach((k, v) -> flat.put(at + k, v));
    }
    SpanRows.Scaled<E> s = scaled(flat);
    SortedMap<StructureConstants.Pair, SortedMap<Integer, E>> table = new TreeMap<>();
    s.row()
        .forEach(
            (at, v) ->
                table.computeIfAbsent(pairs.get(at / n), x -> new TreeMap<>()).put(at % n, v));
    return new SpanInput.Table<>(
        names,
        new StructureConstants<>(
            domain, n, table, s.scale(), Collections.nCopies(n, domain.one())));
  }
}
