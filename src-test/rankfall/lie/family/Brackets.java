package rankfall.lie.family;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.lie.StructureConstants;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/** Brackets of the basis as text, for tests. */
final class Brackets {
  private Brackets() {}

  static Family family(Specs specs) {
    Spec spec = specs.build();
    try {
      return Family.of(spec);
    } catch (SpecException e) {
      throw new AssertionError(e);
    }
  }

  static Span<Polynomial> generic(Family family) {
    return Span.of(((FamilySite.Algebraic) family.generic()).input());
  }

  static Span.Closed<Polynomial> closed(Family family) {
    return (Span.Closed<Polynomial>) generic(family);
  }

  /** {@code [X,Y] = 2*Z} and so on, in terms of the generators as listed. */
  static List<String> of(Family family) {
    return of(closed(family), family.ring().identities());
  }

  static List<String> of(Span.Closed<Polynomial> closed, Chain chain) {
    StructureConstants<Polynomial> c = closed.constants();
    List<String> out = new ArrayList<>();
    c.brackets()
        .forEach(
            (p, row) -> {
              SortedMap<Integer, String> terms = new TreeMap<>();
              row.forEach(
                  (k, v) ->
                      terms.put(
                          k,
                          ChainFractions.canonical(
                                  chain,
                                  v.times(c.scale().get(k)),
                                  c.denominator()
                                      .times(c.scale().get(p.left()))
                                      .times(c.scale().get(p.right())))
                              .toString()));
              out.add(line(closed.names(), p, terms));
            });
    return out;
  }

  static List<String> ofIntegers(Span.Closed<BigInteger> closed) {
    StructureConstants<BigInteger> c = closed.constants();
    List<String> out = new ArrayList<>();
    c.brackets()
        .forEach(
            (p, row) -> {
              SortedMap<Integer, String> terms = new TreeMap<>();
              row.forEach(
                  (k, v) ->
                      terms.put(
                          k,
                          quotient(
                              v.multiply(c.scale().get(k)),
                              c.denominator()
                                  .multiply(c.scale().get(p.left()))
                                  .multiply(c.scale().get(p.right())))));
              out.add(line(closed.names(), p, terms));
            });
    return out;
  }

  private static String quotient(BigInteger above, BigInteger below) {
    BigInteger g = above.gcd(below).multiply(BigInteger.valueOf(below.signum()));
    return above.divide(g) + (below.equals(g) ? "" : "/" + below.divide(g));
  }

  private static String line(
      List<String> names, StructureConstants.Pair p, SortedMap<Integer, String> terms) {
    List<String> sum = new ArrayList<>();
    terms.forEach((k, v) -> sum.add("(" + v + ")" + names.get(k)));
    return "[" + names.get(p.left()) + "," + names.get(p.right()) + "]=" + String.join("+", sum);
  }
}
