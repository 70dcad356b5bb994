package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;

/** Cuts the zeros of polynomials off a piece. */
final class Cutter {
  private final Splitter splitter;

  Cutter(Chain constants, Meter meter) {
    this.splitter = new Splitter(constants, meter);
  }

  /**
   * A piece cut up.
   *
   * @param rest where none of the polynomials vanishes
   * @param cut disjoint pieces that cover the other points
   */
  record Parts(Piece rest, List<Piece> cut) {}

  /** Cuts off the zeros of polynomials, one irreducible factor after the other. */
  Parts cut(Piece piece, List<Polynomial> watched) {
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
