package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;
import rankfall.lie.Subspace;

/**
 * An algebra modulo an ideal.
 *
 * @param constants up to a common factor that is not 0
 * @param assumed elements such that it is this one wherever none of them vanishes
 * @param <E> the numbers
 */
record Quotient<E>(StructureConstants<E> constants, List<E> assumed) {
  Quotient {
    assumed = List.copyOf(assumed);
  }

  /** The quotient by an ideal; its basis comes from the basis elements that are no pivots. */
  static <E> Quotient<E> of(LieBracket<E> bracket, Subspace<E> ideal) {
    Domain<E> domain = bracket.domain();
    Echelon<E> basis = Elimination.of(domain, ideal.basis(), bracket.dimension());
    List<Integer> kept = new ArrayList<>();
    for (int i = 0; i < bracket.dimension(); i++) {
      if (!basis.pivots().contains(i)) {
        kept.add(i);
      }
    }
    SortedMap<StructureConstants.Pair, SortedMap<Integer, E>> table = new TreeMap<>();
    for (int a = 0; a < kept.size(); a++) {
      for (int b = a + 1; b < kept.size(); b++) {
        SortedMap<Integer, E> full = bracket.of(kept.get(a), kept.get(b));
        SortedMap<Integer, E> row = new TreeMap<>();
        for (int c = 0; c < kept.size(); c++) {
          E value = coordinate(domain, basis, full, kept.get(c));
          if (!new Arithmetic<>(domain).vanishes(value)) {
            row.put(c, value);
          }
        }
        table.put(new StructureConstants.Pair(a, b), row);
      }
    }
    List<E> assumed = new ArrayList<>(ideal.nonVanishing());
    assumed.addAll(basis.nonVanishing());
    return new Quotient<>(
        new StructureConstants<>(
            domain,
            kept.size(),
            table,
            domain.one(),
            Collections.nCopies(kept.size(), domain.one())),
        assumed);
  }

  /** A coordinate when the pivots are cleared, times the product of all pivots. */
  private static <E> E coordinate(
      Domain<E> domain, Echelon<E> basis, SortedMap<Integer, E> v, int column) {
    Arithmetic<E> ring = new Arithmetic<>(domain);
    List<E> terms = new ArrayList<>();
    terms.add(domain.times(v.getOrDefault(column, domain.zero()), ring.product(pivots(basis, -1))));
    for (int i = 0; i < basis.rank(); i++) {
      E at = v.get(basis.pivots().get(i));
      E entry = basis.rows().get(i).get(column);
      if (at != null && entry != null) {
        E product = domain.times(domain.times(at, entry), ring.product(pivots(basis, i)));
        terms.add(domain.negate(product));
      }
    }
    return ring.sum(terms);
  }

  /** The pivots, one of them left out. */
  private static <E> List<E> pivots(Echelon<E> basis, int without) {
    List<E> out = new ArrayList<>();
    for (int k = 0; k < basis.rank(); k++) {
      if (k != without) {
        out.add(basis.rows().get(k).get(basis.pivots().get(k)));
      }
    }
    return out;
  }
}
