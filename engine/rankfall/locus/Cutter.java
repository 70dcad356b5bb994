package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;

/** Cuts the zeros of polynomials off a piece. */
public final class Cutter {
  private final Splitter splitter;

  /**
   * For the pieces of one family.
   *
   * @param constants the chain of the algebraic numbers
   * @param meter ends the work early
   */
  public Cutter(Chain constants, Meter meter) {
    this.splitter = new Splitter(constants, meter);
  }

  /**
   * A piece cut up.
   *
   * @param rest where none of the polynomials vanishes
   * @param cut disjoint pieces that cover the other points
   */
  public record Parts(Piece rest, List<Piece> cut) {}

  /**
   * Cuts off the zeros of polynomials, one irreducible factor after the other.
   *
   * @param piece irreducible
   * @param watched in any number; those that vanish all over the piece are left aside
   * @return the rest and the pieces that were cut off
   */
  public Parts cut(Piece piece, List<Polynomial> watched) {
    SortedMap<String, Polynomial> factors = new TreeMap<>();
    for (Polynomial w : watched) {
      Polynomial r = piece.chain().reduced(w);
      if (!r.isConstant()) {
        for (Polynomial f : splitter.factors().of(r)) {
          if (!piece.nonZero().contains(f)) {
            factors.put(f.toString(), f);
          }
        }
      }
    }
    List<Polynomial> order = new ArrayList<>(factors.values());
    order.sort(
        Comparator.comparing(Polynomial::totalDegree)
            .thenComparing(Polynomial::termCount)
            .thenComparing(Polynomial::toString));
    List<Piece> cut = new ArrayList<>();
    for (int k = 0; k < order.size(); k++) {
      cut.addAll(splitter.within(piece, List.of(order.get(k)), order.subList(0, k)));
    }
    return new Parts(piece.without(order), cut);
  }
}
